package tideband.colour;

/**
 * CIE tristimulus values, scaled so that the perfect reflector has {@code Y = 100}.
 *
 * @param x tristimulus value X
 * @param y tristimulus value Y, the luminance factor in per cent
 * @param z tristimulus value Z
 */
public record Xyz(double x, double y, double z) {

    /** Refuses values that are no numbers. */
    public Xyz {
        if (!(Double.isFinite(x) && Double.isFinite(y) && Double.isFinite(z))) {
            throw new IllegalArgumentException("X, Y, Z must be finite, but were " + x + ", " + y + ", " + z);
        }
    }
}
