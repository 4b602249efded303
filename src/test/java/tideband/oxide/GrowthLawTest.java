package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class GrowthLawTest {

    /**
     * Reference: Faraday's law, {@code q = z F rho / M}, worked out by hand from F = 96 485.33 C/mol (CODATA 2018), molar
     * masses by IUPAC's atomic weights and the densities 3.8, 4.6 and 8.0 g/cm³ the program takes; all digits as printed.
     */
    @ParameterizedTest
    @CsvSource({"TITANIUM, 1.836, 0.545", "NIOBIUM, 1.670, 0.599", "TANTALUM, 1.747, 0.572"})
    void chargeGrowsFilmByFaradaysLaw(Metal metal, double milliCoulombPerCm2PerNm, double nmPerSAtOneMilliAmp) {
        assertThat(1 / metal.filmNmPerMilliCoulombPerCm2()).isCloseTo(milliCoulombPerCm2PerNm, within(0.0005));
        GrowthLaw full = new GrowthLaw(BathPresets.usual(metal).withEfficiency(1));
        assertThat(full.growthNmPerS(1)).isCloseTo(nmPerSAtOneMilliAmp, within(0.0005));
        GrowthLaw half = new GrowthLaw(BathPresets.usual(metal).withEfficiency(0.5));
        assertThat(half.growthNmPerS(1)).isCloseTo(nmPerSAtOneMilliAmp / 2, within(0.0005));
    }

    /**
     * Reference: nm/V against current density of the published form of the law, {@code beta / ln(i / i0)}, with the derived
     * pairs of {@link FieldPair}; 10, 1, 0.1, 0.01 and 0.001 mA/cm², digits as worked out by hand. The tantalum row may be
     * set beside the 1.60 and 1.66 nm/V at 10 and 1 mA/cm² in L. Young, Anodic Oxide Films (1961; from memory).
     */
    @ParameterizedTest
    @CsvSource({
        "TA2O5, 1.562, 1.662, 1.775, 1.905, 2.055",
        "NB2O5, 2.161, 2.299, 2.456, 2.635, 2.843",
        "TIO2,  1.858, 2.000, 2.167, 2.363, 2.599"
    })
    void filmAVoltFallsWithCurrent(FieldPair pair, double at10, double at1, double at01, double at001, double at0001) {
        GrowthLaw law = new GrowthLaw(pair.bath());
        double[] expected = {at10, at1, at01, at001, at0001};
        double milliAmps = 10;
        for (double nmPerVolt : expected) {
            // The third digit of i0, not printed, moves the ratio by up to 0.0005.
            assertThat(100 / law.filmVolts(100, milliAmps)).isCloseTo(nmPerVolt, within(0.001));
            milliAmps /= 10;
        }
    }

    /** Property: at its reference current a bath has its ratio, whatever the film. */
    @ParameterizedTest
    @EnumSource(Metal.class)
    void theRatioHoldsAtTheReferenceCurrent(Metal metal) {
        for (Bath bath : BathPresets.of(metal)) {
            GrowthLaw law = new GrowthLaw(bath);
            for (double filmNm : new double[] {5, 50, 150}) {
                assertThat(law.filmVolts(filmNm, GrowthLaw.REFERENCE_MA_PER_CM2) * bath.nmPerVolt())
                        .isCloseTo(filmNm, within(1e-12 * filmNm));
            }
        }
    }

    /** Property: volts, current and growth are each other's inverses. */
    @ParameterizedTest
    @EnumSource(FieldPair.class)
    void theLawCanBeTurnedRound(FieldPair pair) {
        GrowthLaw law = new GrowthLaw(pair.bath());
        for (double milliAmps = 1e-6; milliAmps < 1e3; milliAmps *= 7) {
            double volts = law.filmVolts(80, milliAmps);
            assertThat(law.currentMilliAmpsPerCm2(volts, 80)).isCloseTo(milliAmps, within(1e-11 * milliAmps));
            assertThat(law.currentForGrowth(law.growthNmPerS(milliAmps)))
                    .isCloseTo(milliAmps, within(1e-14 * milliAmps));
            double byPair = pair.i0AmpsPerCm2 * 1e3 * Math.exp(pair.betaCmPerVolt * volts / 80e-7);
            assertThat(law.currentMilliAmpsPerCm2(volts, 80)).isCloseTo(byPair, within(1e-10 * byPair));
        }
    }
}
