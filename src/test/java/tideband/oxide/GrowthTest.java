package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.integration.IterativeLegendreGaussIntegrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

class GrowthTest {
    /** What all the steps of a hold together may leave: the error allowed in one, twenty times over. */
    private static final double INTEGRATION_NM = 20 * Growth.TOLERANCE_NM;

    private static final Bath TITANIUM = BathPresets.usual(Metal.TITANIUM);
    private static final double UNLIMITED_AMPS = 1e6;

    private static double[] of(double... values) {
        return values;
    }

    private static double[] films(Growth growth, int count) {
        double[] films = new double[count];
        Arrays.setAll(films, growth::filmNm);
        return films;
    }

    /**
     * Reference: {@code i0 exp(beta E)} held at 50 V across the film, from the film at 1 mA/cm², at full efficiency: check
     * values worked out beforehand by a separate integration of the pairs in {@link FieldPair}, to their printed digits.
     * Films within 0.5 %. Currents within 3 %: 0.25 % of film moves ln i by 1 %, and the smallest has two digits.
     */
    @ParameterizedTest
    @CsvSource({
        "TA2O5,  83.1,  86.0,  89.7,  95.8, 101.2, 0.295, 0.069, 0.0083",
        "NB2O5, 115.0, 118.4, 123.2, 131.4, 138.8, 0.355, 0.089, 0.0108",
        "TIO2,  100.0, 103.3, 108.3, 117.0, 125.1, 0.389, 0.102, 0.0129"
    })
    void fiftyVoltHold(
            FieldPair pair,
            double at0s,
            double at10s,
            double at60s,
            double at600s,
            double at3600s,
            double milliAmps10s,
            double milliAmps60s,
            double milliAmps600s) {
        Bath bath = pair.bath();
        double startNm = 50 * pair.nmPerVolt(1e-3);
        assertThat(startNm).isCloseTo(at0s, within(0.005 * at0s));
        double supplyVolts = 50 - bath.nativeNm() / bath.nmPerVolt();
        Growth growth = new Growth(bath, UNLIMITED_AMPS, of(startNm), of(1));
        double[] times = {10, 60, 600, 3600};
        double[] filmNm = {at10s, at60s, at600s, at3600s};
        double[] milliAmps = {milliAmps10s, milliAmps60s, milliAmps600s};
        double timeS = 0;
        for (int i = 0; i < times.length; i++) {
            growth.advance(times[i] - timeS, supplyVolts, supplyVolts);
            timeS = times[i];
            assertThat(growth.filmNm(0)).isCloseTo(filmNm[i], within(0.005 * filmNm[i]));
            if (i < milliAmps.length) {
                assertThat(growth.amps() * 1e3).isCloseTo(milliAmps[i], within(0.03 * milliAmps[i]));
            }
        }
    }

    /** Reference: the law's own integral {@code t = ∫ dd / growth(d)} at steady film volts, by Gauss-Legendre quadrature. */
    @ParameterizedTest
    @EnumSource(FieldPair.class)
    void timeIsTheIntegralOfReciprocalGrowth(FieldPair pair) {
        Bath bath = pair.bath();
        double nativeVolts = bath.nativeNm() / bath.nmPerVolt();
        for (double filmVolts : of(5, 30, 90)) {
            double startNm = filmVolts * pair.nmPerVolt(1e-2);
            UnivariateFunction secondsPerNm = filmNm -> 1
                    / (1e3 * pair.i0AmpsPerCm2 * Math.exp(pair.betaCmPerVolt * filmVolts / (filmNm * 1e-7)))
                    / bath.metal().filmNmPerMilliCoulombPerCm2();
            for (double holdS : of(1, 30, 1000)) {
                Growth growth = new Growth(bath, UNLIMITED_AMPS, of(startNm), of(1));
                growth.advance(holdS, filmVolts - nativeVolts, filmVolts - nativeVolts);
                double endNm = growth.filmNm(0);
                double exactS = new IterativeLegendreGaussIntegrator(8, 1e-12, 1e-12)
                        .integrate(100_000, secondsPerNm, startNm, endNm);
                double errorNm = (exactS - holdS) / secondsPerNm.value(endNm);
                assertThat(errorNm).isCloseTo(0, within(INTEGRATION_NM));
            }
        }
    }

    /** Property: at the supply's limit film grows by charge alone, {@code d = d0 + eta M / (z F rho) · Q / A}. */
    @ParameterizedTest
    @EnumSource(Metal.class)
    void underTheLimitFilmIsCharge(Metal metal) {
        Bath bath = BathPresets.usual(metal);
        double amps = 0.02;
        double areaCm2 = 20;
        double holdS = 50;
        Growth growth = new Growth(bath, amps, of(bath.nativeNm()), of(areaCm2));
        growth.advance(holdS, 150, 150);
        double chargeMilliCoulombPerCm2 = 1e3 * amps * holdS / areaCm2;
        double grownNm = bath.efficiency() * metal.filmNmPerMilliCoulombPerCm2() * chargeMilliCoulombPerCm2;
        assertThat(growth.filmNm(0)).isCloseTo(bath.nativeNm() + grownNm, within(1e-6));
        assertThat(growth.amps()).isCloseTo(amps, within(1e-12));
        assertThat(growth.peakAmps()).isCloseTo(amps, within(1e-12));
        assertThat(growth.terminalVolts()).isLessThan(150);
    }

    /** Reference: Dormand-Prince 8(5,3) of Commons Math on equations typed a second time; see {@link ReferenceGrowth}. */
    @ParameterizedTest
    @CsvSource({"60, 60, 30", "90, 90, 300", "0, 80, 30", "10, 90, 20", "40, 5, 30"})
    void agreesWithAnotherIntegrator(double fromVolts, double toVolts, double durationS) {
        for (Metal metal : Metal.values()) {
            for (double limitAmps : of(0.05, 2)) {
                for (double ohm : of(0, 2, 200)) {
                    Bath bath = BathPresets.usual(metal).withResistanceOhm(ohm);
                    for (double[] startNm :
                            List.of(of(bath.nativeNm()), of(bath.nativeNm(), 40, 41, 90, 160), of(70, 60, 50, 50))) {
                        agrees(bath, limitAmps, startNm, fromVolts, toVolts, durationS);
                    }
                }
            }
        }
    }

    private static void agrees(
            Bath bath, double limitAmps, double[] startNm, double fromVolts, double toVolts, double durationS) {
        double[] areaCm2 = startNm.clone();
        Arrays.setAll(areaCm2, j -> 1 + 2.5 * j);
        ReferenceGrowth reference =
                new ReferenceGrowth(bath, limitAmps, areaCm2, t -> fromVolts + (toVolts - fromVolts) * t / durationS);
        Growth growth = new Growth(bath, limitAmps, startNm, areaCm2);
        growth.advance(durationS, fromVolts, toVolts);
        assertThat(films(growth, startNm.length))
                .as("%s, %s A", bath, limitAmps)
                .containsExactly(reference.after(startNm, 0, durationS), within(INTEGRATION_NM));
    }

    /** Reference: as above, while a piece is drawn out and its volts go up: areas shrink, one after the other goes dry. */
    @Test
    void agreesWhileTheAreaChanges() {
        double[] startNm = of(3, 3, 60, 110);
        Growth growth = new Growth(TITANIUM, 0.4, startNm, of(8, 8, 8, 8));
        double[] expected = startNm;
        for (int leg = 0; leg < 4; leg++) {
            double fromVolts = 20 + 15 * leg;
            double[] areaCm2 = of(leg == 3 ? 0 : 8 - 3 * leg, 8 - leg, 8, 8);
            for (int patch = 0; patch < areaCm2.length; patch++) {
                growth.setAreaCm2(patch, areaCm2[patch]);
            }
            growth.advance(5, fromVolts, fromVolts + 10);
            expected = new ReferenceGrowth(TITANIUM, 0.4, areaCm2, t -> fromVolts + 2 * t).after(expected, 0, 5);
            assertThat(films(growth, 4)).containsExactly(expected, within(INTEGRATION_NM));
        }
    }

    /** Property: cutting a hold into pieces changes nothing beyond the integration's error. */
    @Test
    void aHoldMayBeCut() {
        Growth whole = new Growth(TITANIUM, 2, of(3, 50), of(5, 5));
        whole.advance(30, 20, 80);
        Growth cut = new Growth(TITANIUM, 2, of(3, 50), of(5, 5));
        for (int i = 0; i < 300; i++) {
            cut.advance(0.1, 20 + 0.2 * i, 20 + 0.2 * (i + 1));
        }
        assertThat(films(cut, 2)).containsExactly(films(whole, 2), within(INTEGRATION_NM));
    }

    /** Property: within a step the film runs as if the step had ended there. */
    @Test
    void filmWithinAStep() {
        Growth growth = new Growth(TITANIUM, 2, of(3), of(5));
        growth.advance(3, 60, 60);
        Growth before = growth.copy();
        double stepS = growth.step(10, 60, 0);
        assertThat(growth.filmWithinStepNm(0, 0)).isEqualTo(before.filmNm(0));
        assertThat(growth.filmWithinStepNm(0, 1)).isEqualTo(growth.filmNm(0));
        for (double share : of(0.25, 0.5, 0.75)) {
            Growth part = before.copy();
            part.advance(share * stepS, 60, 60);
            assertThat(growth.filmWithinStepNm(0, share)).isCloseTo(part.filmNm(0), within(INTEGRATION_NM));
        }
    }

    /** Property: film never shrinks, and one too thick for the volts does not grow either. */
    @ParameterizedTest
    @ValueSource(doubles = {0.5, 10, 40})
    void aThickerFilmKeeps(double volts) {
        Growth growth = new Growth(TITANIUM, 2, of(150, 3), of(5, 5));
        growth.advance(600, volts, volts);
        assertThat(growth.filmNm(0)).isBetween(150.0, 150.001);
        assertThat(growth.filmNm(1)).isGreaterThan(3);
    }

    /** Property: with the supply off nothing grows, nothing flows, and time passes in one step. */
    @Test
    void supplyOff() {
        Growth growth = new Growth(TITANIUM, 2, of(3, 80), of(5, 5));
        growth.advance(10, 40, 40);
        double[] films = films(growth, 2);
        assertThat(growth.step(1000, 0, 0)).isEqualTo(1000);
        growth.advance(1000, 0, 0);
        assertThat(films(growth, 2)).isEqualTo(films);
        assertThat(growth.amps()).isZero();
        assertThat(growth.terminalVolts()).isZero();
        assertThat(growth.filmWithinStepNm(0, 0.5)).isEqualTo(films[0]);
    }

    /** Property: the peak is the current of the moment the volts go up, though it is gone before the first step ends. */
    @Test
    void thePeakIsSeenAtEveryJump() {
        Growth growth = new Growth(TITANIUM, 100, of(50), of(10));
        growth.advance(30, 30, 30);
        Growth settled = growth.copy();
        settled.settle(60);
        double jumpAmps = settled.amps();
        assertThat(jumpAmps).isGreaterThan(growth.peakAmps());
        growth.advance(30, 60, 60);
        assertThat(growth.peakAmps()).isEqualTo(jumpAmps);
        assertThat(growth.amps()).isLessThan(jumpAmps / 100);
    }

    /** Property: a bare patch of no area is dry: it keeps its film and costs the others nothing. */
    @Test
    void aPatchOfNoAreaIsDry() {
        Growth alone = new Growth(TITANIUM, 2, of(100), of(5));
        alone.advance(30, 60, 60);
        Growth growth = new Growth(TITANIUM, 2, of(3, 100), of(0, 5));
        growth.advance(30, 60, 60);
        assertThat(films(growth, 2)).containsExactly(3, alone.filmNm(0));
        growth.setAreaCm2(1, 0);
        growth.advance(30, 90, 90);
        assertThat(films(growth, 2)).containsExactly(3, alone.filmNm(0));
    }

    /** Property: next to no area beside thick films catches up to where larger areas would be, and no farther. */
    @Test
    void aSpeckCatchesUp() {
        for (double limitAmps : of(2, 1000)) {
            Growth speck = new Growth(TITANIUM, limitAmps, of(3, 100), of(1e-6, 5));
            Growth patch = new Growth(TITANIUM, limitAmps, of(3, 100), of(1e-3, 5));
            speck.advance(30, 60, 60);
            patch.advance(30, 60, 60);
            assertThat(speck.filmNm(0)).isCloseTo(patch.filmNm(0), within(0.05));
        }
    }

    /** Property: a copy shares nothing, and another limit takes hold at once. */
    @Test
    void copiesAreTheirOwn() {
        Growth growth = new Growth(TITANIUM, 2, of(3), of(10));
        growth.advance(0.05, 60, 60);
        Growth copy = growth.copy();
        Growth throttled = growth.copyWithLimit(0.01);
        double filmNm = growth.filmNm(0);
        copy.advance(5, 60, 60);
        throttled.advance(5, 60, 60);
        assertThat(growth.filmNm(0)).isEqualTo(filmNm);
        assertThat(throttled.amps()).isCloseTo(0.01, within(1e-12));
        growth.advance(5, 60, 60);
        assertThat(growth.filmNm(0)).isEqualTo(copy.filmNm(0));
    }

    /** Property: what cannot be is refused by name, value and unit. */
    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY, -1})
    void refusesWhatCannotBe(double bad) {
        assertThatThrownBy(() -> new Growth(TITANIUM, bad, of(3), of(1))).hasMessageContaining("limitAmps must be");
        assertThatThrownBy(() -> new Growth(TITANIUM, 1, of(bad), of(1))).hasMessageContaining("filmNm must be");
        assertThatThrownBy(() -> new Growth(TITANIUM, 1, of(3), of(bad))).hasMessageContaining("areaCm2 must be");
        Growth growth = new Growth(TITANIUM, 1, of(3), of(1));
        assertThatThrownBy(() -> growth.setAreaCm2(0, bad)).hasMessageContaining("areaCm2 must be");
        assertThatThrownBy(() -> growth.advance(bad, 1, 1)).hasMessageContaining("durationS must be");
        assertThatThrownBy(() -> growth.advance(1, bad, 1)).hasMessageContaining("voltsFrom and voltsTo must be");
        assertThatThrownBy(() -> growth.advance(1, 1, bad)).hasMessageContaining("voltsFrom and voltsTo must be");
        assertThatThrownBy(() -> new Growth(TITANIUM, 1, of(3), of(1, 1)))
                .hasMessageContaining("one film and one area");
    }
}
