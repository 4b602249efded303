package tideband.optics;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.apache.commons.math3.complex.Complex;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.SpectralGrid;

class DispersionTest {

    /** Property: every set spans what colour is summed over, is told from its source, and is refused just outside. */
    @ParameterizedTest
    @ValueSource(strings = {"titanium", "niobium", "tantalum", "titanium-oxide", "niobium-oxide", "tantalum-oxide"})
    void refusesWavelengthsOutsideTheTable(String material) {
        Dispersion set = Dispersion.read(material + ".csv");
        assertThat(set.firstNm()).isLessThanOrEqualTo(SpectralGrid.wavelengthNm(0));
        assertThat(set.lastNm()).isGreaterThanOrEqualTo(SpectralGrid.wavelengthNm(SpectralGrid.COUNT - 1));
        assertThat(set.source()).containsPattern("\\(\\d{4}\\)");
        double[] outside = {set.firstNm() - 0.001, set.lastNm() + 0.001, Double.NaN};
        for (double nm : outside) {
            assertThatThrownBy(() -> set.at(nm))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessageContaining("wavelengthNm must be from " + set.firstNm() + " to " + set.lastNm())
                    .hasMessageContaining(String.valueOf(nm));
        }
    }

    /** Property: the published rows are absorbing or clear, never amplifying, and the index is a real one. */
    @ParameterizedTest
    @ValueSource(strings = {"titanium", "niobium", "tantalum", "titanium-oxide", "niobium-oxide", "tantalum-oxide"})
    void absorbsOrIsClear(String material) {
        Dispersion set = Dispersion.read(material + ".csv");
        for (double nm : SpectralGrid.wavelengthsNm()) {
            assertThat(set.at(nm).getReal()).isPositive();
            assertThat(set.at(nm).getImaginary()).isNotNegative();
        }
    }

    /** Reference: rows of the sets named in the files' headers, at 550 nm. */
    @ParameterizedTest
    @CsvSource({
        "titanium,2.245,2.925",
        "niobium,2.920616,2.871192",
        "tantalum,2.723961,1.933365",
        "titanium-oxide,2.435844,5.395e-8",
        "niobium-oxide,2.360317,3e-6",
        "tantalum-oxide,2.157262,2.1e-5"
    })
    void holdsThePublishedRows(String material, double n, double k) {
        assertThat(Dispersion.read(material + ".csv").at(550)).isEqualTo(new Complex(n, k));
    }

    @Test
    void isLinearBetweenRows() {
        // Reference: Mash and Motulevich (1973): 550 nm 2.245 + 2.925i, 560 nm 2.270 + 2.940i.
        Complex between = Dispersion.read("titanium.csv").at(552.5);
        assertThat(between.getReal()).isCloseTo(2.25125, within(1e-12));
        assertThat(between.getImaginary()).isCloseTo(2.92875, within(1e-12));
    }

    @Test
    void titaniumIsHeldBelow400AndSaysSo() {
        Dispersion titanium = Dispersion.read("titanium.csv");
        assertThat(titanium.at(380)).isEqualTo(titanium.at(400));
        assertThat(titanium.source()).contains("380 and 390 are NOT published");
        assertThat(Dispersion.read("tantalum.csv").source()).contains("DERIVED, not a published set");
    }

    @Test
    void indexScaleTouchesOnlyN() {
        FilmSystem plain = FilmSystem.of("tantalum", 1);
        FilmSystem scaled = FilmSystem.of("tantalum", 0.95);
        assertThat(scaled.filmIndex(450).getReal()).isCloseTo(0.95 * 2.204562, within(1e-12));
        assertThat(scaled.filmIndex(450).getImaginary())
                .isEqualTo(plain.filmIndex(450).getImaginary());
        assertThat(scaled.metalIndex(450)).isEqualTo(plain.metalIndex(450));
    }

    @Test
    void refusesUnknownMetalsAndScales() {
        assertThatThrownBy(() -> FilmSystem.of("zirconium", 1)).hasMessageContaining("not for zirconium");
        for (double scale : new double[] {0.4, 1.6, Double.NaN}) {
            assertThatThrownBy(() -> FilmSystem.of("niobium", scale))
                    .hasMessage("indexScale must be from 0.5 to 1.5, but was " + scale);
        }
    }
}
