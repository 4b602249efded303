package tideband.colour;

import java.util.HexFormat;
import java.util.Locale;
import java.util.regex.Pattern;

/**
 * A colour for the screen, in sRGB (IEC 61966-2-1).
 *
 * @param red encoded red, 0 to 1
 * @param green encoded green, 0 to 1
 * @param blue encoded blue, 0 to 1
 * @param inGamut whether this is the colour asked for; if not, its chroma had to be lowered to fit
 */
public record Srgb(double red, double green, double blue, boolean inGamut) {

    /**
     * The white of sRGB, D65 of the 2 degree observer by its chromaticity 0.3127, 0.3290 (IEC 61966-2-1, 4.1), with
     * {@code Y = 100}.
     */
    public static final Xyz WHITE = ofChromaticity(0.3127, 0.3290, 100);

    private static final Matrix3 TO_XYZ = primaries();
    private static final Matrix3 FROM_XYZ = TO_XYZ.inverse();
    /** Linear light may stray from 0 to 1 by this much through rounding and still counts as inside. */
    private static final double ROUNDING = 1e-9;
    /** Halvings of the chroma when it is lowered; 2⁻⁴⁰ of it is far below what a display can step. */
    private static final int HALVINGS = 40;

    private static final Pattern HEX = Pattern.compile("#[0-9a-fA-F]{6}");

    /** Refuses channels outside 0 to 1. */
    public Srgb {
        if (!(red >= 0 && red <= 1 && green >= 0 && green <= 1 && blue >= 0 && blue <= 1)) {
            throw new IllegalArgumentException(
                    "sRGB channels must be from 0 to 1, but were " + red + ", " + green + ", " + blue);
        }
    }

    /** Primaries of IEC 61966-2-1, 4.1, scaled so that equal full channels give the white. */
    private static Matrix3 primaries() {
        Xyz red = ofChromaticity(0.64, 0.33, 1);
        Xyz green = ofChromaticity(0.30, 0.60, 1);
        Xyz blue = ofChromaticity(0.15, 0.06, 1);
        Matrix3 columns =
                new Matrix3(red.x(), green.x(), blue.x(), red.y(), green.y(), blue.y(), red.z(), green.z(), blue.z());
        Xyz amounts = columns.inverse().times(WHITE);
        return columns.times(Matrix3.diagonal(amounts.x(), amounts.y(), amounts.z()));
    }

    private static Xyz ofChromaticity(double x, double y, double luminance) {
        return new Xyz(luminance * x / y, luminance, luminance * (1 - x - y) / y);
    }

    /**
     * The screen colour of tristimulus values against {@link #WHITE}.
     *
     * @param colour X, Y, Z with Y = 100 for white
     * @return the colour, or the one of the same lightness and hue with as much chroma as fits
     * @throws IllegalArgumentException for a colour lighter than white or darker than black
     */
    public static Srgb of(Xyz colour) {
        Xyz linear = FROM_XYZ.times(colour);
        return fits(linear) ? encode(linear, true) : lowered(Lab.of(colour, WHITE));
    }

    /**
     * The screen colour of a CIELAB colour against {@link #WHITE}.
     *
     * @param colour L*, a*, b*
     * @return the colour, or the one of the same lightness and hue with as much chroma as fits
     * @throws IllegalArgumentException for a lightness outside 0 to 100
     */
    public static Srgb of(Lab colour) {
        return of(colour.toXyz(WHITE));
    }

    /** Largest share of the chroma that fits, by bisection at constant lightness and hue. */
    private static Srgb lowered(Lab wanted) {
        Xyz best = FROM_XYZ.times(wanted.withChromaTimes(0).toXyz(WHITE));
        if (!fits(best)) {
            throw new IllegalArgumentException(
                    "lightness must be from 0 to 100 for a screen colour, but was " + wanted.lightness());
        }
        double low = 0;
        double high = 1;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (low + high) / 2;
            Xyz linear = FROM_XYZ.times(wanted.withChromaTimes(middle).toXyz(WHITE));
            if (fits(linear)) {
                best = linear;
                low = middle;
            } else {
                high = middle;
            }
        }
        return encode(best, false);
    }

    private static boolean fits(Xyz linear) {
        return fits(linear.x()) && fits(linear.y()) && fits(linear.z());
    }

    private static boolean fits(double channel) {
        return channel >= -ROUNDING && channel <= 1 + ROUNDING;
    }

    private static Srgb encode(Xyz linear, boolean inGamut) {
        return new Srgb(encode(linear.x()), encode(linear.y()), encode(linear.z()), inGamut);
    }

    /** Transfer function of IEC 61966-2-1, equations 6 and 7. */
    private static double encode(double linear) {
        double within = Math.min(1, Math.max(0, linear));
        return within <= 0.0031308 ? 12.92 * within : 1.055 * Math.pow(within, 1 / 2.4) - 0.055;
    }

    private static double decode(double encoded) {
        return encoded <= 0.04045 ? encoded / 12.92 : Math.pow((encoded + 0.055) / 1.055, 2.4);
    }

    /**
     * Reads {@code #rrggbb}.
     *
     * @param hex number sign and six hexadecimal digits
     * @return the colour
     * @throws IllegalArgumentException for anything else
     */
    public static Srgb ofHex(String hex) {
        if (!HEX.matcher(hex).matches()) {
            throw new IllegalArgumentException("a colour must be # and six hexadecimal digits, but was " + hex);
        }
        int rgb = HexFormat.fromHexDigits(hex, 1, 7);
        return new Srgb((rgb >> 16) / 255.0, ((rgb >> 8) & 0xff) / 255.0, (rgb & 0xff) / 255.0, true);
    }

    /**
     * Writes {@code #rrggbb}.
     *
     * @return number sign and six lower-case hexadecimal digits, each channel rounded to 8 bits
     */
    public String hex() {
        return String.format(Locale.ROOT, "#%02x%02x%02x", eightBits(red), eightBits(green), eightBits(blue));
    }

    private static long eightBits(double channel) {
        return Math.round(channel * 255);
    }

    /**
     * The appearance this colour stands for.
     *
     * @return CIELAB against {@link #WHITE}
     */
    public Lab lab() {
        return Lab.of(TO_XYZ.times(new Xyz(decode(red), decode(green), decode(blue))), WHITE);
    }
}
