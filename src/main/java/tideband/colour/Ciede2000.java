package tideband.colour;

/**
 * The CIEDE2000 colour difference (ISO/CIE 11664-6:2014) with {@code kL = kC = kH = 1}.
 *
 * <p>Steps and special cases follow G. Sharma, W. Wu and E. N. Dalal, Color Research and Application 30, 21 (2005),
 * equations 2 to 22: hues of neutrals count as 0, and a hue difference of exactly 180° takes the first branch.
 */
public final class Ciede2000 {

    /** 25⁷, of the chroma weighting in equations 4 and 20. */
    private static final double TWENTY_FIVE_TO_7 = 6_103_515_625.0;

    private Ciede2000() {}

    /**
     * How far two colours are apart.
     *
     * @param first a colour
     * @param second another, against the same white
     * @return the difference dE00, 0 for equal colours; the same both ways
     */
    public static double between(Lab first, Lab second) {
        double meanChroma = (first.chroma() + second.chroma()) / 2;
        double g = 0.5 * (1 - Math.sqrt(toSeventhShare(meanChroma)));
        double a1 = (1 + g) * first.a();
        double a2 = (1 + g) * second.a();
        double c1 = Math.hypot(a1, first.b());
        double c2 = Math.hypot(a2, second.b());
        boolean neutral = c1 * c2 == 0;
        double h1 = hue(a1, first.b());
        double h2 = hue(a2, second.b());

        double dL = second.lightness() - first.lightness();
        double dC = c2 - c1;
        double dHue = neutral ? 0 : hueStep(h1, h2);
        double dH = 2 * Math.sqrt(c1 * c2) * sinDegrees(dHue / 2);

        double meanL = (first.lightness() + second.lightness()) / 2;
        double meanC = (c1 + c2) / 2;
        double meanHue = neutral ? h1 + h2 : meanHue(h1, h2);
        double t = 1
                - 0.17 * cosDegrees(meanHue - 30)
                + 0.24 * cosDegrees(2 * meanHue)
                + 0.32 * cosDegrees(3 * meanHue + 6)
                - 0.20 * cosDegrees(4 * meanHue - 63);
        double fromMid = (meanL - 50) * (meanL - 50);
        double sL = 1 + 0.015 * fromMid / Math.sqrt(20 + fromMid);
        double sC = 1 + 0.045 * meanC;
        double sH = 1 + 0.015 * meanC * t;
        double blue = (meanHue - 275) / 25;
        double rotation = -2 * Math.sqrt(toSeventhShare(meanC)) * sinDegrees(60 * Math.exp(-blue * blue));

        double l = dL / sL;
        double c = dC / sC;
        double h = dH / sH;
        return Math.sqrt(Math.max(0, l * l + c * c + h * h + rotation * c * h));
    }

    private static double toSeventhShare(double chroma) {
        double cubed = chroma * chroma * chroma;
        double seventh = cubed * cubed * chroma;
        return seventh / (seventh + TWENTY_FIVE_TO_7);
    }

    private static double hue(double a, double b) {
        double degrees = Math.toDegrees(Math.atan2(b, a));
        return degrees < 0 ? degrees + 360 : degrees;
    }

    private static double hueStep(double h1, double h2) {
        double step = h2 - h1;
        if (Math.abs(step) <= 180) {
            return step;
        }
        return step > 180 ? step - 360 : step + 360;
    }

    private static double meanHue(double h1, double h2) {
        double sum = h1 + h2;
        if (Math.abs(h1 - h2) <= 180) {
            return sum / 2;
        }
        return sum < 360 ? (sum + 360) / 2 : (sum - 360) / 2;
    }

    private static double sinDegrees(double degrees) {
        return Math.sin(Math.toRadians(degrees));
    }

    private static double cosDegrees(double degrees) {
        return Math.cos(Math.toRadians(degrees));
    }
}
