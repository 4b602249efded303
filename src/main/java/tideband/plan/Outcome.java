package tideband.plan;

import java.util.List;

/** What planning came to. */
public sealed interface Outcome {

    /**
     * The drawing can be made, like this.
     *
     * @param plan the plan
     */
    record Planned(Plan plan) implements Outcome {}

    /**
     * The drawing cannot be made as it is held.
     *
     * @param hindrances what stands in the way, band by band from end A; at least one
     */
    record Impossible(List<Hindrance> hindrances) implements Outcome {

        /**
         * Copies the list, so that the value cannot change.
         *
         * @param hindrances at least one
         */
        public Impossible {
            hindrances = List.copyOf(hindrances);
            if (hindrances.isEmpty()) {
                throw new IllegalArgumentException("an impossible drawing names at least one hindrance");
            }
        }
    }
}
