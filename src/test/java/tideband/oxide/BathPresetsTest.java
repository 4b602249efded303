package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class BathPresetsTest {

    // Reference: the ranges published for the ratio, in nm/V. Titanium in 1 M acids and in phosphates, 1.4 to 2.8 (Sul
    // et al.,
    // Med. Eng. Phys. 23, 329, 2001); NaHCO3 1.8 to 2.0 (J. Mater. Sci. 53, 7294, 2018); Ti-6Al-4V 1.7 to 2.4 about the
    // 2.2 of
    // Int. J. Biomater. 2015, 395657 at 20 to 60 V, less for the weak bath; niobium 2.2 to 2.8 and tantalum 1.6 to 2.0,
    // from
    // memory. Ceilings: Ti-6Al-4V forms anatase from 70 V in 1 M sulfuric acid (Coatings 7, 39, 2017).
    @ParameterizedTest
    @CsvSource({
        "TITANIUM, phosphate, 1.4, 2.8, 100",
        "TITANIUM, sulfuric, 1.4, 2.8, 80",
        "TITANIUM, bicarbonate, 1.8, 2.0, 100",
        "TITANIUM, carbonate, 1.4, 2.8, 100",
        "TI_6AL_4V, phosphate, 1.7, 2.4, 100",
        "TI_6AL_4V, sulfuric, 1.7, 2.4, 70",
        "TI_6AL_4V, bicarbonate, 1.7, 2.4, 100",
        "TI_6AL_4V, carbonate, 1.4, 2.4, 100",
        "NIOBIUM, phosphate, 2.2, 2.8, 100",
        "NIOBIUM, sulfuric, 2.2, 2.8, 100",
        "TANTALUM, phosphate, 1.6, 2.0, 150",
        "TANTALUM, sulfuric, 1.6, 2.0, 150"
    })
    void ratiosLieInThePublishedRanges(Metal metal, String name, double low, double high, double ceiling) {
        Bath bath = BathPresets.named(metal, name).orElseThrow();
        assertThat(bath.nmPerVolt()).isBetween(low, high);
        assertThat(bath.ceilingVolts()).isEqualTo(ceiling);
    }

    // Regression: the values the program starts from.
    @ParameterizedTest
    @CsvSource({
        "TITANIUM, phosphate, 1.80",
        "TITANIUM, sulfuric, 1.65",
        "TITANIUM, bicarbonate, 1.90",
        "TITANIUM, carbonate, 1.45",
        "NIOBIUM, phosphate, 2.45",
        "TANTALUM, sulfuric, 1.77"
    })
    void ratiosAsAgreed(Metal metal, String name, double nmPerVolt) {
        assertThat(BathPresets.named(metal, name).orElseThrow().nmPerVolt()).isEqualTo(nmPerVolt);
    }

    @ParameterizedTest
    @EnumSource(Metal.class)
    void everyPresetIsWhole(Metal metal) {
        List<Bath> baths = BathPresets.of(metal);
        assertThat(baths).extracting(Bath::name).doesNotHaveDuplicates();
        assertThat(BathPresets.usual(metal)).isEqualTo(baths.get(0));
        for (Bath bath : baths) {
            assertThat(bath.metal()).isEqualTo(metal);
            assertThat(bath.fieldSlope()).isEqualTo(metal.fieldSlope());
            assertThat(bath.nativeNm()).isEqualTo(metal.nativeNm());
            assertThat(bath.efficiency()).isEqualTo(metal.efficiency());
            assertThat(bath.indexScale()).isEqualTo(1);
            assertThat(bath.source()).endsWith("A starting point until a coupon has been run.");
            assertThat((bath.name() + bath.source()).toLowerCase(Locale.ROOT)).doesNotContain("chlorid", "salt");
            assertThat(BathPresets.named(metal, bath.name())).contains(bath);
        }
        assertThat(BathPresets.named(metal, "Phosphate")).isEmpty();
    }

    @Test
    void alloyIsTitaniumRaisedByFivePercent() {
        for (Bath titanium : BathPresets.of(Metal.TITANIUM)) {
            Bath alloy = BathPresets.named(Metal.TI_6AL_4V, titanium.name()).orElseThrow();
            assertThat(alloy.nmPerVolt() / titanium.nmPerVolt()).isCloseTo(1.05, within(1e-12));
        }
    }
}
