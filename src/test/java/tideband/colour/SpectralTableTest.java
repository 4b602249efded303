package tideband.colour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SpectralTableTest {

    @ParameterizedTest
    @ValueSource(strings = {"observer-1931.csv", "observer-1964.csv", "illuminants.csv"})
    void coversTheGridAndNothingElse(String resource) {
        SpectralTable table = SpectralTable.read(SpectralTable.class, resource);
        String column = resource.startsWith("ill") ? "D65" : "ybar";
        assertThat(table.header()).contains("CIE");
        assertThat(table.firstNm()).isEqualTo(SpectralGrid.wavelengthNm(0));
        assertThat(table.lastNm()).isEqualTo(SpectralGrid.wavelengthNm(SpectralGrid.COUNT - 1));
        for (double outside : new double[] {379.999, 780.001, Double.NaN}) {
            assertThatThrownBy(() -> table.at(column, outside))
                    .isInstanceOf(IllegalArgumentException.class)
                    .hasMessageContaining("wavelengthNm must be from 380.0 to 780.0")
                    .hasMessageContaining(String.valueOf(outside));
        }
    }

    @Test
    void isLinearBetweenRows() {
        SpectralTable table = SpectralTable.read(SpectralTable.class, "observer-1931.csv");
        // Reference: ISO/CIE 11664-1:2019, 1931 observer: ȳ(550) = 0.9949501, ȳ(555) = 1, ȳ(560) = 0.995.
        assertThat(table.at("ybar", 555)).isEqualTo(1);
        assertThat(table.at("ybar", 560)).isEqualTo(0.995);
        assertThat(table.at("ybar", 557)).isCloseTo(1 - 0.4 * 0.005, within(1e-15));
    }

    @Test
    void refusesUnknownColumnsAndMissingFiles() {
        SpectralTable table = SpectralTable.read(SpectralTable.class, "illuminants.csv");
        assertThatThrownBy(() -> table.at("C", 500))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("no column C");
        assertThatThrownBy(() -> SpectralTable.read(SpectralTable.class, "nothing.csv"))
                .isInstanceOf(IllegalStateException.class)
                .hasMessageContaining("nothing.csv is missing");
    }
}
