package tideband.colour;

/**
 * A colour in CIELAB (ISO/CIE 11664-4), against the white of the light it is seen in.
 *
 * @param lightness L*, 0 (black) to 100 (the perfect reflector)
 * @param a a*, green (below 0) to red
 * @param b b*, blue (below 0) to yellow
 */
public record Lab(double lightness, double a, double b) {

    /** Above this ratio to white the cube root applies: (6/29)³, ISO/CIE 11664-4. */
    private static final double LINEAR_BELOW = 216.0 / 24389.0;
    /** Slope of the straight part: (29/3)³, ISO/CIE 11664-4. */
    private static final double KAPPA = 24389.0 / 27.0;

    /** Refuses values that are no numbers. */
    public Lab {
        if (!(Double.isFinite(lightness) && Double.isFinite(a) && Double.isFinite(b))) {
            throw new IllegalArgumentException(
                    "L*, a*, b* must be finite, but were " + lightness + ", " + a + ", " + b);
        }
    }

    /**
     * The CIELAB colour of tristimulus values.
     *
     * @param colour tristimulus values
     * @param white those of the perfect reflector in the same light
     * @return L*, a*, b*
     */
    public static Lab of(Xyz colour, Xyz white) {
        double fx = compressed(colour.x() / white.x());
        double fy = compressed(colour.y() / white.y());
        double fz = compressed(colour.z() / white.z());
        return new Lab(116 * fy - 16, 500 * (fx - fy), 200 * (fy - fz));
    }

    private static double compressed(double ratio) {
        return ratio > LINEAR_BELOW ? Math.cbrt(ratio) : (KAPPA * ratio + 16) / 116;
    }

    /**
     * The tristimulus values of this colour.
     *
     * @param white those of the perfect reflector in the same light
     * @return X, Y, Z
     */
    public Xyz toXyz(Xyz white) {
        double fy = (lightness + 16) / 116;
        return new Xyz(
                white.x() * expanded(fy + a / 500), white.y() * expanded(fy), white.z() * expanded(fy - b / 200));
    }

    private static double expanded(double f) {
        double cube = f * f * f;
        return cube > LINEAR_BELOW ? cube : (116 * f - 16) / KAPPA;
    }

    /**
     * How colourful it is.
     *
     * @return chroma C*, 0 for a neutral
     */
    public double chroma() {
        return Math.hypot(a, b);
    }

    /**
     * Its hue.
     *
     * @return hue angle h in degrees, 0 (red) through 90 (yellow), 180 (green) and 270 (blue) to below 360
     */
    public double hueDegrees() {
        double degrees = Math.toDegrees(Math.atan2(b, a));
        // The remainder turns a sum that rounds to 360 into 0.
        return degrees < 0 ? (degrees + 360) % 360 : degrees;
    }

    /**
     * The same lightness and hue with the chroma scaled.
     *
     * @param factor factor on the chroma, at least 0
     * @return the changed colour
     */
    public Lab withChromaTimes(double factor) {
        return new Lab(lightness, a * factor, b * factor);
    }
}
