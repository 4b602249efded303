package tideband.design;

/**
 * A band as drawn.
 *
 * @param name its name
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param wanted what it is to be
 * @param edge the edge at {@code toMm}; of no account on the last band
 */
public record Band(String name, double fromMm, double toMm, Wanted wanted, Edge edge) {

    /** Refuses bands without length. */
    public Band {
        if (!(fromMm >= 0 && toMm > fromMm && Double.isFinite(toMm))) {
            throw new IllegalArgumentException(
                    "fromMm must be at least 0 and toMm finite and above it, but they were " + fromMm + " and " + toMm);
        }
    }
}
