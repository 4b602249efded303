package tideband.colour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import com.github.ajalt.colormath.WhitePoint;
import com.github.ajalt.colormath.model.LAB;
import com.github.ajalt.colormath.model.RGB;
import com.github.ajalt.colormath.model.XYZ;
import com.github.ajalt.colormath.model.XYZColorSpace;
import com.github.ajalt.colormath.model.XYZColorSpaces;
import com.github.ajalt.colormath.model.XYZKt;
import com.github.ajalt.colormath.model.xyY;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class SrgbTest {

    private static final float[] BRADFORD = {
        0.8951f, 0.2664f, -0.1614f, -0.7502f, 1.7135f, 0.0367f, 0.0389f, -0.0685f, 1.0296f
    };
    private static final float[] BRADFORD_INVERSE = {
        0.9869929f, -0.1470543f, 0.1599627f, 0.4323053f, 0.5183603f, 0.0492912f, -0.0085287f, 0.0400428f, 0.9684867f
    };

    /** Reference: the matrix of IEC 61966-2-1:1999, equation 7 of its amendment 1, printed to 4 decimals. */
    @ParameterizedTest
    @CsvSource({"#ff0000,0.4124,0.2126,0.0193", "#00ff00,0.3576,0.7152,0.1192", "#0000ff,0.1805,0.0722,0.9505"})
    void primariesAreTheStandards(String hex, double x, double y, double z) {
        Xyz primary = Srgb.ofHex(hex).lab().toXyz(Srgb.WHITE);
        assertThat(primary.x()).isCloseTo(100 * x, within(0.0051));
        assertThat(primary.y()).isCloseTo(100 * y, within(0.0051));
        assertThat(primary.z()).isCloseTo(100 * z, within(0.0051));
    }

    /** Reference: the general-purpose library colormath 3.6.1 (single precision), XYZ of D65 to CIELAB and sRGB. */
    @Property(tries = 2000)
    void agreesWithColormathUnderD65(
            @ForAll @DoubleRange(min = 0.02, max = 0.98) double red,
            @ForAll @DoubleRange(min = 0.02, max = 0.98) double green,
            @ForAll @DoubleRange(min = 0.02, max = 0.98) double blue) {
        XYZ theirXyz = new RGB(
                        (float) red,
                        (float) green,
                        (float) blue,
                        1f,
                        com.github.ajalt.colormath.model.RGBColorSpaces.INSTANCE.getSRGB())
                .toXYZ();
        Xyz xyz =
                new Xyz(100 * (double) theirXyz.getX(), 100 * (double) theirXyz.getY(), 100 * (double) theirXyz.getZ());
        LAB theirLab = theirXyz.toLAB();
        Lab lab = Lab.of(xyz, Srgb.WHITE);
        assertThat(lab.lightness()).isCloseTo(theirLab.getL(), within(2e-3));
        assertThat(lab.a()).isCloseTo(theirLab.getA(), within(2e-2));
        assertThat(lab.b()).isCloseTo(theirLab.getB(), within(2e-2));
        Srgb srgb = Srgb.of(xyz);
        assertThat(srgb.inGamut()).isTrue();
        assertThat(srgb.red()).isCloseTo(red, within(2e-4));
        assertThat(srgb.green()).isCloseTo(green, within(2e-4));
        assertThat(srgb.blue()).isCloseTo(blue, within(2e-4));
    }

    /**
     * Reference: colormath's adaptation from the same white, given the Bradford matrix of ICC.1:2022 annex E and its inverse in
     * the usual 7 digits (its own default is another transform), then its sRGB.
     */
    @Property(tries = 500)
    void agreesWithColormathThroughBradford(
            @ForAll Illuminant light,
            @ForAll Observer observer,
            @ForAll @DoubleRange(min = 0.2, max = 0.6) double level,
            @ForAll @DoubleRange(min = -0.1, max = 0.1) double tilt) {
        Viewing viewing = Viewing.of(light, observer);
        double[] reflectance = new double[SpectralGrid.COUNT];
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            reflectance[i] = level + tilt * (i - 40) / 40.0;
        }
        Xyz xyz = viewing.xyz(reflectance);
        Xyz white = viewing.white();
        double sum = white.x() + white.y() + white.z();
        XYZColorSpace own = XYZKt.XYZColorSpace(
                new WhitePoint("own", new xyY((float) (white.x() / sum), (float) (white.y() / sum), 1f)));
        RGB theirs = own.invoke((float) xyz.x() / 100, (float) xyz.y() / 100, (float) xyz.z() / 100, 1f)
                .adaptTo(XYZColorSpaces.INSTANCE.getXYZ65(), BRADFORD, BRADFORD_INVERSE)
                .toSRGB();
        Srgb ours = viewing.srgb(xyz);
        assertThat(ours.red()).isCloseTo(theirs.getR(), within(5e-4));
        assertThat(ours.green()).isCloseTo(theirs.getG(), within(5e-4));
        assertThat(ours.blue()).isCloseTo(theirs.getB(), within(5e-4));
    }

    /**
     * Reference: the usual D50 to D65 Bradford matrix for the whites of ASTM E308, to 7 decimals (from memory; the test above
     * stands on its own).
     */
    @Test
    void bradfordFromD50ToD65() {
        Matrix3 matrix = Bradford.between(new Xyz(96.422, 100, 82.521), new Xyz(95.047, 100, 108.883));
        assertThat(matrix.m00()).isCloseTo(0.9555766, within(1e-6));
        assertThat(matrix.m01()).isCloseTo(-0.0230393, within(1e-6));
        assertThat(matrix.m02()).isCloseTo(0.0631636, within(1e-6));
        assertThat(matrix.m10()).isCloseTo(-0.0282895, within(1e-6));
        assertThat(matrix.m11()).isCloseTo(1.0099416, within(1e-6));
        assertThat(matrix.m12()).isCloseTo(0.0210077, within(1e-6));
        assertThat(matrix.m20()).isCloseTo(0.0122982, within(1e-6));
        assertThat(matrix.m21()).isCloseTo(-0.0204830, within(1e-6));
        assertThat(matrix.m22()).isCloseTo(1.3299098, within(1e-6));
    }

    /** Property: every 8 bit colour survives the way to CIELAB and back. */
    @Property(tries = 3000)
    void hexSurvivesTheRoundTrip(@ForAll @IntRange(min = 0, max = 0xffffff) int rgb) {
        String hex = "#" + Integer.toHexString(0x1000000 | rgb).substring(1);
        Srgb there = Srgb.ofHex(hex);
        Srgb back = Srgb.of(there.lab());
        assertThat(back.hex()).isEqualTo(hex);
        assertThat(back.inGamut()).isTrue();
    }

    /** Property: CIELAB and back is the identity, in the straight part too. */
    @Property(tries = 1000)
    void labSurvivesTheRoundTrip(
            @ForAll @DoubleRange(min = 0, max = 100) double lightness,
            @ForAll @DoubleRange(min = -100, max = 100) double a,
            @ForAll @DoubleRange(min = -100, max = 100) double b) {
        Xyz white = Viewing.daylight().white();
        Lab back = Lab.of(new Lab(lightness, a, b).toXyz(white), white);
        assertThat(back.lightness()).isCloseTo(lightness, within(1e-9));
        assertThat(back.a()).isCloseTo(a, within(1e-9));
        assertThat(back.b()).isCloseTo(b, within(1e-9));
    }

    /** Property: a colour that does not fit keeps its lightness and hue, loses chroma, and ends on the edge of what fits. */
    @Property(tries = 2000)
    void gamutMappingKeepsLightnessAndHue(
            @ForAll @DoubleRange(min = 1, max = 99) double lightness,
            @ForAll @DoubleRange(min = 0, max = 359.9) double hue,
            @ForAll @DoubleRange(min = 20, max = 160) double chroma) {
        double a = chroma * Math.cos(Math.toRadians(hue));
        double b = chroma * Math.sin(Math.toRadians(hue));
        Srgb screen = Srgb.of(new Lab(lightness, a, b));
        Lab shown = screen.lab();
        assertThat(shown.lightness()).isCloseTo(lightness, within(1e-4));
        // Hue within 0.001 units across: a·b' − b·a' is chroma times the distance off the line of that hue.
        assertThat((a * shown.b() - b * shown.a()) / chroma).isCloseTo(0, within(1e-3));
        assertThat(shown.chroma()).isLessThanOrEqualTo(chroma + 1e-6);
        if (!screen.inGamut()) {
            assertThat(shown.chroma()).isLessThan(chroma);
            Lab fuller = shown.withChromaTimes(1.0001);
            assertThat(Srgb.of(fuller).inGamut()).isFalse();
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"ff0000", "#ff00", "#ff00000", "#gg0000", "", "#FF000 "})
    void refusesWhatIsNoHexColour(String text) {
        assertThatThrownBy(() -> Srgb.ofHex(text))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("six hexadecimal digits")
                .hasMessageContaining(text);
    }

    @Test
    void refusesImpossibleColours() {
        assertThatThrownBy(() -> Srgb.of(new Lab(101, 0, 0)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("lightness must be from 0 to 100");
        assertThatThrownBy(() -> new Lab(Double.NaN, 0, 0)).hasMessageContaining("NaN");
        assertThatThrownBy(() -> new Xyz(0, Double.POSITIVE_INFINITY, 0)).hasMessageContaining("Infinity");
        assertThatThrownBy(() -> new Srgb(0, 1.1, 0, true)).hasMessageContaining("1.1");
    }

    /** Property: hue angles run from 0 to below 360. */
    @Test
    void hueStaysBelowAFullCircle() {
        assertThat(new Lab(50, 10, -1e-17).hueDegrees()).isZero();
        assertThat(new Lab(50, 0, -10).hueDegrees()).isCloseTo(270, within(1e-12));
    }
}
