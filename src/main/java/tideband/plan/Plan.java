package tideband.plan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A plan: the immersions in order, what they cost, and how surely nothing costs less.
 *
 * @param immersions the immersions in order
 * @param strippedAtEnd the runs stripped after the last immersion
 * @param cost the cost, itemised
 * @param lowerBoundMin no plan under this order costs less, in minutes
 * @param proven whether the cost equals the lower bound
 * @param savedByOtherOrderMin for a thicker-first plan, the minutes that least-minutes would save, where known
 */
public record Plan(
        List<Immersion> immersions,
        List<Run> strippedAtEnd,
        Cost cost,
        double lowerBoundMin,
        boolean proven,
        OptionalDouble savedByOtherOrderMin) {

    /** Copies the lists, so that the value cannot change. */
    public Plan {
        immersions = List.copyOf(immersions);
        strippedAtEnd = List.copyOf(strippedAtEnd);
    }

    /**
     * Whether the other order would pay, in a sentence.
     *
     * @return the sentence, where it is known
     */
    public Optional<String> otherOrder() {
        if (savedByOtherOrderMin.isEmpty()) {
            return Optional.empty();
        }
        double savedMin = savedByOtherOrderMin.getAsDouble();
        return Optional.of(
                savedMin > 0
                        ? "The order least-minutes would save " + Wording.minutes(savedMin) + "."
                        : "The order least-minutes would save nothing.");
    }
}
