package tideband.plan;

/**
 * A run of neighbouring bands, masked or stripped together.
 *
 * @param first index of its first band, counted from end A, 0-based
 * @param last index of its last band, inclusive
 */
public record Run(int first, int last) {

    /** Refuses runs that end before they start. */
    public Run {
        if (first < 0 || last < first) {
            throw new IllegalArgumentException(
                    "a run goes from 0 or more up to its last band, but was " + first + " to " + last);
        }
    }
}
