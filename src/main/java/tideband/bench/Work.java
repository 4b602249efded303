package tideband.bench;

import java.util.List;

/** What comes of working out a design. */
public sealed interface Work {

    /**
     * The design can be made, and this is how.
     *
     * @param plan everything the bench needs
     */
    record Worked(BenchPlan plan) implements Work {}

    /**
     * The design cannot be made as it is drawn.
     *
     * @param obstacles each reason with the nearest change that would work, at least one
     */
    record CannotBeMade(List<Obstacle> obstacles) implements Work {
        // Copies the list, so that the value cannot change; refuses a refusal without a reason.
        public CannotBeMade {
            obstacles = List.copyOf(obstacles);
            if (obstacles.isEmpty()) {
                throw new IllegalArgumentException("a design that cannot be made has at least one obstacle");
            }
        }
    }
}
