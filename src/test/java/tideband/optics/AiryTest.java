package tideband.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Book sections are from memory; every expected number of the closed forms also follows from the formula beside it. */
class AiryTest {

    private static final Complex GLASS = new Complex(1.52);
    private static final Complex FLUORIDE = new Complex(1.38);
    /** Titanium at 550 nm, Mash and Motulevich (1973). */
    private static final Complex TITANIUM = new Complex(2.245, 2.925);

    private static double normal(Complex film, Complex substrate, double filmNm, double wavelengthNm) {
        return Airy.reflectance(film, substrate, filmNm, wavelengthNm, 0, Polarisation.S);
    }

    /** Reference: Fresnel; Hecht, Optics, chapter 4: R = ((n−1)/(n+1))². */
    @Test
    void bareGlass() {
        assertThat(normal(GLASS, new Complex(1.5), 0, 550)).isCloseTo(0.04, within(1e-12));
        assertThat(normal(FLUORIDE, GLASS, 0, 550)).isCloseTo(0.0425800, within(5e-8));
    }

    /** Reference: Macleod, antireflection coatings; Hecht, chapter 9: R = ((n0 ns − n1²)/(n0 ns + n1²))². */
    @Test
    void quarterWaves() {
        assertThat(normal(FLUORIDE, GLASS, 550 / (4 * 1.38), 550)).isCloseTo(0.0126008, within(5e-8));
        assertThat(normal(new Complex(2.40), GLASS, 550 / (4 * 2.40), 550)).isCloseTo(0.3392102, within(5e-8));
    }

    /** Reference: Macleod, absentee layer: a half wave is not seen. */
    @Test
    void halfWaveIsAbsent() {
        assertThat(normal(FLUORIDE, GLASS, 550 / (2 * 1.38), 550)).isCloseTo(0.0425800, within(5e-8));
    }

    /**
     * Reference: Born and Wolf, optics of metals: R = ((n−1)² + k²)/((n+1)² + k²); constants at 550 nm of Mash and Motulevich
     * (1973), Weaver et al. (1973) and Werner et al. (2009, calculated).
     */
    @ParameterizedTest
    @CsvSource({"2.245,2.925,0.529489", "2.920616,2.871192,0.505294", "2.384207,1.901856,0.367161"})
    void bareMetals(double n, double k, double expected) {
        assertThat(normal(FLUORIDE, new Complex(n, k), 0, 550)).isCloseTo(expected, within(5e-7));
    }

    /** Reference: Born and Wolf, 1.5.3, Brewster's angle: R_p = 0, R_s = ((n²−1)/(n²+1))². */
    @Test
    void brewster() {
        double angle = Math.toDegrees(Math.atan(1.5));
        Complex n = new Complex(1.5);
        assertThat(Airy.reflectance(n, n, 0, 550, angle, Polarisation.P)).isCloseTo(0, within(1e-15));
        assertThat(Airy.reflectance(n, n, 0, 550, angle, Polarisation.S)).isCloseTo(0.147928994, within(5e-10));
    }

    /** Reference: at 45° Fresnel's formulas give R_p = R_s². */
    @Test
    void fortyFiveDegrees() {
        Complex n = new Complex(1.5);
        assertThat(Airy.reflectance(n, n, 0, 550, 45, Polarisation.S)).isCloseTo(0.0920133630, within(5e-11));
        assertThat(Airy.reflectance(n, n, 0, 550, 45, Polarisation.P)).isCloseTo(0.0084664590, within(5e-11));
    }

    /** Reference: F. Abelès, J. Phys. Radium 11, 310 (1950): at tan θ = n1 the p-reflectance does not depend on the film. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 1, 37.3, 100, 215.9, 1000})
    void abelesCondition(double filmNm) {
        double onGlass = Math.toDegrees(Math.atan(1.38));
        assertThat(Airy.reflectance(FLUORIDE, GLASS, filmNm, 550, onGlass, Polarisation.P))
                .isCloseTo(0.000688637, within(5e-10));
        double onMetal = Math.toDegrees(Math.atan(2.4));
        assertThat(Airy.reflectance(new Complex(2.4), TITANIUM, filmNm, 550, onMetal, Polarisation.P))
                .isCloseTo(0.252158373, within(5e-10));
    }

    /** Reference: limit of Airy's formula: a film of no thickness, or of its neighbour's index, is not there. */
    @Property(tries = 300)
    void filmsThatAreNotThere(@ForAll @DoubleRange(min = 0, max = 89) double angle, @ForAll Polarisation way) {
        double bare = Airy.reflectance(new Complex(2.4), TITANIUM, 0, 550, angle, way);
        assertThat(Airy.reflectance(new Complex(2.4), TITANIUM, 1e-9, 550, angle, way))
                .isCloseTo(bare, within(1e-8));
        assertThat(Airy.reflectance(Complex.ONE, TITANIUM, 80, 550, angle, way)).isCloseTo(bare, within(1e-12));
        assertThat(Airy.reflectance(TITANIUM, TITANIUM, 80, 550, angle, way)).isCloseTo(bare, within(1e-12));
    }

    /**
     * Reference: extrema against thickness of a clear film on metal, closed form with p = arg r12 (effect of p: R. Charrière et
     * al. on local extrema of oxidised metals): d_min = λ(2π − p)/(4π n1), R = ((b ∓ a)/(1 ∓ ab))².
     */
    @Test
    void extremaAgainstThickness() {
        Complex oxide = new Complex(2.435844);
        assertThat(normal(oxide, TITANIUM, 37.08916, 550)).isCloseTo(0.0211502, within(5e-8));
        assertThat(normal(oxide, TITANIUM, 93.53776, 550)).isCloseTo(0.6031177, within(5e-8));
        for (double off : new double[] {-0.1, 0.1}) {
            assertThat(normal(oxide, TITANIUM, 37.08916 + off, 550)).isGreaterThan(0.0211502);
            assertThat(normal(oxide, TITANIUM, 93.53776 + off, 550)).isLessThan(0.6031177);
        }
    }

    /**
     * Reference: S. J. Byrnes, "Multilayer optical calculations", arXiv:1603.02720, basic test of the accompanying code: two
     * absorbing layers, 0.1 rad. The kernel's own boundaries and phases, joined twice, must give the published amplitudes.
     */
    @ParameterizedTest
    @CsvSource({
        "S,-0.60331226568845775,-0.093522181653632019,0.37273208839139516",
        "P,0.60102654255772481,0.094489146845323682,0.37016110373044969"
    })
    void publishedTwoLayerStack(Polarisation way, double re, double im, double reflectance) {
        Complex[] n = {Complex.ONE, new Complex(2, 4), new Complex(3, 0.3), new Complex(1, 0.1)};
        double sine = Math.sin(0.1);
        Complex second =
                Airy.phasePerNm(n[2], sine, 100).multiply(3).multiply(Complex.I).exp();
        Complex first =
                Airy.phasePerNm(n[1], sine, 100).multiply(2).multiply(Complex.I).exp();
        Complex inner = joined(
                Airy.boundary(n[1], n[2], sine, way),
                Airy.boundary(n[2], n[3], sine, way).multiply(second));
        Complex whole = joined(Airy.boundary(n[0], n[1], sine, way), inner.multiply(first));
        assertThat(whole.getReal()).isCloseTo(re, within(1e-14));
        assertThat(whole.getImaginary()).isCloseTo(im, within(1e-14));
        assertThat(Airy.squared(whole)).isCloseTo(reflectance, within(1e-14));
    }

    private static Complex joined(Complex outer, Complex returned) {
        return outer.add(returned).divide(outer.multiply(returned).add(1));
    }

    /** Reference: the same published stack, for the second formulation that the next tests lean on; r, t, R and T. */
    @Test
    void secondFormulationGivesThePublishedStack() {
        Complex[] n = {Complex.ONE, new Complex(2, 4), new Complex(3, 0.3), new Complex(1, 0.1)};
        CharacteristicMatrix s = CharacteristicMatrix.of(n, new double[] {2, 3}, 100, 0.1, Polarisation.S);
        CharacteristicMatrix p = CharacteristicMatrix.of(n, new double[] {2, 3}, 100, 0.1, Polarisation.P);
        assertThat(s.reflected().getReal()).isCloseTo(-0.603312265688458, within(1e-14));
        assertThat(s.transmitted().getImaginary()).isCloseTo(0.169219361693831, within(1e-14));
        assertThat(s.reflectance()).isCloseTo(0.372732088391395, within(1e-14));
        assertThat(s.transmittance()).isCloseTo(0.226044912470793, within(1e-14));
        assertThat(p.reflected().getReal()).isCloseTo(0.601026542557725, within(1e-14));
        assertThat(p.reflectance()).isCloseTo(0.370161103730450, within(1e-14));
    }

    /** Reference: the second formulation, for any clear or absorbing film and metal, any angle. */
    @Property(tries = 2000)
    void agreesWithTheSecondFormulation(
            @ForAll @DoubleRange(min = 1.1, max = 3) double n1,
            @ForAll @DoubleRange(min = 0, max = 0.5) double k1,
            @ForAll @DoubleRange(min = 0.2, max = 4) double n2,
            @ForAll @DoubleRange(min = 0, max = 5) double k2,
            @ForAll @DoubleRange(min = 0, max = 400) double filmNm,
            @ForAll @DoubleRange(min = 380, max = 780) double wavelengthNm,
            @ForAll @DoubleRange(min = 0, max = 89) double angle) {
        Complex film = new Complex(n1, k1);
        Complex metal = new Complex(n2, k2);
        for (Polarisation way : Polarisation.values()) {
            double other = CharacteristicMatrix.of(
                            new Complex[] {Complex.ONE, film, metal},
                            new double[] {filmNm},
                            wavelengthNm,
                            Math.toRadians(angle),
                            way)
                    .reflectance();
            double ours = Airy.reflectance(film, metal, filmNm, wavelengthNm, angle, way);
            assertThat(ours).isCloseTo(other, within(1e-10));
            assertThat(ours).isBetween(0.0, 1 + 1e-12);
        }
    }

    /** Property: what a clear film on a clear substrate does not reflect it lets through: R + T = 1. */
    @Property(tries = 1000)
    void clearStacksLoseNothing(
            @ForAll @DoubleRange(min = 1.1, max = 3) double n1,
            @ForAll @DoubleRange(min = 1.1, max = 4) double n2,
            @ForAll @DoubleRange(min = 0, max = 400) double filmNm,
            @ForAll @DoubleRange(min = 0, max = 89) double angle) {
        Complex film = new Complex(n1);
        Complex substrate = new Complex(n2);
        for (Polarisation way : Polarisation.values()) {
            double through = CharacteristicMatrix.of(
                            new Complex[] {Complex.ONE, film, substrate},
                            new double[] {filmNm},
                            550,
                            Math.toRadians(angle),
                            way)
                    .transmittance();
            assertThat(Airy.reflectance(film, substrate, filmNm, 550, angle, way) + through)
                    .isCloseTo(1, within(1e-10));
        }
    }

    /**
     * Regression: our own values for tantalum by the unshifted calculated set of Werner et al. (2009) with the oxide of Gao et al.
     * (2012), three formulations alike to 5e-16; 25, 50, 100, 150 nm head-on, then 50 nm at 45° s and p.
     */
    @ParameterizedTest
    @CsvSource({
        "450,3.169811,2.166965,2.204562,1.58e-4,0.124990,0.094302,0.437108,0.066649,0.085590,0.060937",
        "550,2.384207,1.901856,2.157262,2.1e-5,0.118028,0.027360,0.431746,0.146273,0.019352,0.029018",
        "650,1.420969,2.689237,2.132408,0,0.320546,0.118512,0.592711,0.579835,0.063310,0.187119"
    })
    void regressionOfTantalum(
            double nm,
            double n,
            double k,
            double oxideN,
            double oxideK,
            double at25,
            double at50,
            double at100,
            double at150,
            double s,
            double p) {
        Complex metal = new Complex(n, k);
        Complex oxide = new Complex(oxideN, oxideK);
        assertThat(normal(oxide, metal, 25, nm)).isCloseTo(at25, within(1e-6));
        assertThat(normal(oxide, metal, 50, nm)).isCloseTo(at50, within(1e-6));
        assertThat(normal(oxide, metal, 100, nm)).isCloseTo(at100, within(1e-6));
        assertThat(normal(oxide, metal, 150, nm)).isCloseTo(at150, within(1e-6));
        assertThat(Airy.reflectance(oxide, metal, 50, nm, 45, Polarisation.S)).isCloseTo(s, within(1e-6));
        assertThat(Airy.reflectance(oxide, metal, 50, nm, 45, Polarisation.P)).isCloseTo(p, within(1e-6));
    }

    /** Property: head-on the two polarisations reflect alike. */
    @ParameterizedTest
    @EnumSource
    void headOnBothPolarisationsAreAlike(Polarisation way) {
        assertThat(Airy.reflectance(new Complex(2.4, 0.01), TITANIUM, 60, 550, 0, way))
                .isCloseTo(normal(new Complex(2.4, 0.01), TITANIUM, 60, 550), within(1e-15));
    }

    @Test
    void refusesWhatCannotBe() {
        for (double film : new double[] {-1, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> normal(GLASS, GLASS, film, 550))
                    .hasMessage("filmNm must be finite and at least 0, but was " + film);
        }
        for (double wavelength : new double[] {0, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> normal(GLASS, GLASS, 1, wavelength))
                    .hasMessage("wavelengthNm must be finite and above 0, but was " + wavelength);
        }
        for (double angle : new double[] {-1, 90, Double.NaN}) {
            assertThatThrownBy(() -> Airy.reflectance(GLASS, GLASS, 1, 550, angle, Polarisation.S))
                    .hasMessage("angleDegrees must be from 0 to below 90, but was " + angle);
        }
    }
}
