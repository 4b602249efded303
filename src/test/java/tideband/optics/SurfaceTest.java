package tideband.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.SpectralGrid;
import tideband.colour.Viewing;
import tideband.colour.Xyz;

class SurfaceTest {

    private static final Viewing DAYLIGHT = Viewing.daylight();

    private static double plain(FilmSystem system, double filmNm, double nm, double angle) {
        Complex film = system.filmIndex(nm);
        Complex metal = system.metalIndex(nm);
        return (Airy.reflectance(film, metal, filmNm, nm, angle, Polarisation.S)
                        + Airy.reflectance(film, metal, filmNm, nm, angle, Polarisation.P))
                / 2;
    }

    /**
     * Regression: air/oxide/metal values of our own, on which three separately written formulations agreed to 5e-16; columns
     * 25, 50, 100, 150 nm head-on.
     */
    @ParameterizedTest
    @CsvSource({
        "titanium,450,0.015118,0.471115,0.277799,0.588965",
        "titanium,550,0.156002,0.171354,0.595423,0.021150",
        "titanium,650,0.282698,0.032496,0.571212,0.434159",
        "niobium,450,0.061870,0.319759,0.397915,0.453633",
        "niobium,550,0.200397,0.063656,0.554656,0.068414",
        "niobium,650,0.270109,0.013766,0.497010,0.437791"
    })
    void regressionOfFilmsOnMetal(String metal, int nm, double at25, double at50, double at100, double at150) {
        Surface mirror = new Surface(FilmSystem.of(metal, 1), Finish.MIRROR, 0);
        int place = (int) ((nm - SpectralGrid.FIRST_NM) / SpectralGrid.STEP_NM);
        assertThat(mirror.reflectance(25)[place]).isCloseTo(at25, within(1e-6));
        assertThat(mirror.reflectance(50)[place]).isCloseTo(at50, within(1e-6));
        assertThat(mirror.reflectance(100)[place]).isCloseTo(at100, within(1e-6));
        assertThat(mirror.reflectance(150)[place]).isCloseTo(at150, within(1e-6));
    }

    /** Regression: our own values at 45°, 50 nm, s and p, three formulations alike to 5e-16. */
    @ParameterizedTest
    @CsvSource({
        "titanium,450,0.534081,0.348327",
        "titanium,550,0.149865,0.140725",
        "titanium,650,0.002472,0.082140",
        "niobium,450,0.356656,0.216933",
        "niobium,550,0.035458,0.069327",
        "niobium,650,0.013697,0.057150"
    })
    void regressionAtAnAngle(String metal, double nm, double s, double p) {
        FilmSystem system = FilmSystem.of(metal, 1);
        int place = (int) ((nm - SpectralGrid.FIRST_NM) / SpectralGrid.STEP_NM);
        assertThat(Airy.reflectance(system.filmIndex(nm), system.metalIndex(nm), 50, nm, 45, Polarisation.S))
                .isCloseTo(s, within(1e-6));
        assertThat(Airy.reflectance(system.filmIndex(nm), system.metalIndex(nm), 50, nm, 45, Polarisation.P))
                .isCloseTo(p, within(1e-6));
        assertThat(new Surface(system, Finish.MIRROR, 45).reflectance(50)[place])
                .isCloseTo((s + p) / 2, within(1e-6));
    }

    /** Property: a mirror is the plain kernel, unpolarised light being the mean of s and p; film 0 is bare metal exactly. */
    @ParameterizedTest
    @CsvSource({"titanium,0", "niobium,0", "tantalum,0", "titanium,30", "niobium,60", "tantalum,85"})
    void mirrorIsThePlainKernel(String metal, double angle) {
        FilmSystem system = FilmSystem.of(metal, 0.97);
        Surface mirror = new Surface(system, Finish.MIRROR, angle);
        for (double film : new double[] {0, 0.3, 25, 101.7, 250}) {
            double[] reflectance = mirror.reflectance(film);
            for (int i = 0; i < SpectralGrid.COUNT; i++) {
                double nm = SpectralGrid.wavelengthNm(i);
                assertThat(reflectance[i]).isCloseTo(plain(system, film, nm, angle), within(1e-14));
                if (film == 0 && angle == 0) {
                    double bare = Airy.reflectance(Complex.ONE, system.metalIndex(nm), 0, nm, 0, Polarisation.S);
                    assertThat(reflectance[i]).isEqualTo(bare);
                }
            }
        }
    }

    /** Property: the fast series gives each film's colour as computed alone, through several fresh starts. */
    @ParameterizedTest
    @EnumSource
    void seriesIsThePlainColour(Finish finish) {
        for (String metal : List.of("titanium", "niobium", "tantalum")) {
            Surface surface = new Surface(FilmSystem.of(metal, 1), finish, 20);
            List<Xyz> series = FilmSeries.colours(surface, DAYLIGHT, 0.7, 400);
            for (int i = 0; i < series.size(); i++) {
                Xyz alone = DAYLIGHT.xyz(surface.reflectance(i * 0.7));
                assertThat(series.get(i).x()).isCloseTo(alone.x(), within(1e-10));
                assertThat(series.get(i).y()).isCloseTo(alone.y(), within(1e-10));
                assertThat(series.get(i).z()).isCloseTo(alone.z(), within(1e-10));
            }
        }
    }

    /** Property: with all three numbers 0 a finish is the mirror; with all above 0 chroma falls as the surface roughens. */
    @Test
    void rougherIsDuller() {
        assertThat(Finish.MIRROR.tiltDegrees()).isZero();
        assertThat(Finish.MIRROR.filmSpread()).isZero();
        assertThat(Finish.MIRROR.scatteredShare()).isZero();
        FilmSystem system = FilmSystem.of("titanium", 1);
        double last = Double.POSITIVE_INFINITY;
        for (Finish finish : Finish.values()) {
            double chroma = DAYLIGHT.lab(DAYLIGHT.xyz(new Surface(system, finish, 0).reflectance(147)))
                    .chroma();
            assertThat(chroma).isLessThan(last);
            last = chroma;
        }
    }

    /**
     * Property: the points chosen for the spreads suffice: three times as many move no colour by 0.05 dE00, or by 0.5 where
     * some facets are seen at grazing angles.
     */
    @ParameterizedTest
    @CsvSource({"0,0.05", "30,0.05", "60,0.5"})
    void quadratureHasConverged(double angle, double tolerance) {
        FilmSystem system = FilmSystem.of("niobium", 1);
        Finish finish = Finish.BLASTED;
        Surface surface = new Surface(system, finish, angle);
        List<Facet> fine = Surface.facets(system, finish, angle, 21, 21);
        for (double film : new double[] {20, 45, 90, 155, 230}) {
            Lab coarse = DAYLIGHT.lab(DAYLIGHT.xyz(surface.reflectance(film)));
            Lab exact = DAYLIGHT.lab(DAYLIGHT.xyz(averaged(fine, finish.scatteredShare(), film)));
            assertThat(Ciede2000.between(coarse, exact)).isLessThan(tolerance);
        }
    }

    private static double[] averaged(List<Facet> facets, double scattered, double film) {
        double[] re = new double[SpectralGrid.COUNT];
        double[] im = new double[SpectralGrid.COUNT];
        double[] one = new double[SpectralGrid.COUNT];
        double[] sum = new double[SpectralGrid.COUNT];
        for (Facet facet : facets) {
            facet.seed(film, re, im);
            facet.reflect(re, im, one);
            for (int i = 0; i < SpectralGrid.COUNT; i++) {
                sum[i] += facet.share * ((1 - scattered) * one[i] + scattered * facet.outer[i]);
            }
        }
        return sum;
    }

    /** Property: the facets of a surface stand for all of it, also where some are turned away. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 10, 45, 85})
    void facetsStandForTheWholeSurface(double angle) {
        for (Finish finish : Finish.values()) {
            double whole = new Surface(FilmSystem.of("titanium", 1), finish, angle)
                    .facets().stream().mapToDouble(facet -> facet.share).sum();
            assertThat(whole).isCloseTo(1, within(1e-12));
        }
    }

    /** Property: no surface reflects more than falls on it or less than nothing. */
    @ParameterizedTest
    @EnumSource
    void reflectsAShare(Finish finish) {
        for (String metal : List.of("titanium", "niobium", "tantalum")) {
            Surface surface = new Surface(FilmSystem.of(metal, 1), finish, 40);
            for (double film = 0; film <= 300; film += 7) {
                for (double share : surface.reflectance(film)) {
                    assertThat(share).isBetween(0.0, 1.0);
                }
            }
        }
    }

    /**
     * Reference: H. E. Bennett and J. O. Porteus, J. Opt. Soc. Am. 51, 123 (1961): 1 − exp(−(4πσ/λ)²) at 550 nm for the
     * roughness each finish is said to have.
     */
    @ParameterizedTest
    @CsvSource({"MIRROR,0", "POLISHED,5", "SATIN,10", "BLASTED,16"})
    void scatteredShareFollowsFromRoughness(Finish finish, double roughnessNm) {
        double lost = 1 - Math.exp(-Math.pow(4 * Math.PI * roughnessNm / 550, 2));
        assertThat(finish.scatteredShare()).isCloseTo(lost, within(5e-4));
    }

    /**
     * Reference: extrema move with angle by √(1 − sin²θ/n²) (any optics textbook): 0.9326 for n = 2.4 at 60°. The phase at the
     * metal moves too, so the interval between two darkest films is compared, in which it cancels.
     */
    @ParameterizedTest
    @CsvSource({"30,0.978", "45,0.956", "60,0.933", "75,0.915"})
    void extremaMoveWithAngle(double angle, double factor) {
        double headOn = darkest(0, 140, 250) - darkest(0, 10, 100);
        double tilted = darkest(angle, 140, 250) - darkest(angle, 10, 100);
        assertThat(headOn / tilted).isCloseTo(factor, within(1e-3));
    }

    private static double darkest(double angle, double fromNm, double toNm) {
        Complex film = new Complex(2.4);
        Complex metal = new Complex(2.245, 2.925);
        double best = fromNm;
        double least = 1;
        for (double nm = fromNm; nm < toNm; nm += 0.01) {
            double reflected = Airy.reflectance(film, metal, nm, 550, angle, Polarisation.S);
            if (reflected < least) {
                least = reflected;
                best = nm;
            }
        }
        return best;
    }

    @Test
    void refusesWhatCannotBe() {
        FilmSystem system = FilmSystem.of("titanium", 1);
        for (double angle : new double[] {-0.1, 85.1, Double.NaN}) {
            assertThatThrownBy(() -> new Surface(system, Finish.MIRROR, angle))
                    .hasMessageContaining("viewing angle must be from 0 to 85.0 degrees")
                    .hasMessageContaining(String.valueOf(angle));
        }
        Surface surface = new Surface(system, Finish.MIRROR, 0);
        assertThatThrownBy(() -> surface.reflectance(Double.NaN)).hasMessageContaining("filmNm");
        for (double step : new double[] {0, -1, Double.NaN, Double.POSITIVE_INFINITY}) {
            assertThatThrownBy(() -> FilmSeries.colours(surface, DAYLIGHT, step, 2))
                    .hasMessage("stepNm must be finite and above 0, but was " + step);
        }
        assertThatThrownBy(() -> FilmSeries.colours(surface, DAYLIGHT, 1, 0))
                .hasMessage("count must be at least 1, but was 0");
    }

    @Test
    void finishKeysGoBothWays() {
        for (Finish finish : Finish.values()) {
            assertThat(Finish.ofKey(finish.key())).isEqualTo(finish);
        }
        assertThatThrownBy(() -> Finish.ofKey("matt"))
                .hasMessage("finish must be one of mirror, polished, satin, blasted, but was matt");
    }
}
