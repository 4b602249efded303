package tideband.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.OptionalInt;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Srgb;
import tideband.colour.Viewing;
import tideband.design.Fault;
import tideband.design.Reading;

class ColourTextTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "#3a3f8f | #3a3f8f",
                "  3A3F8F | #3a3f8f",
                "lab(45, 10, -38) | lab(45, 10, -38)",
                "LAB (45.50;-0;\u221238.2) | lab(45.5, 0, -38.2)",
                "lab(0 200 -200 | lab(0, 200, -200)",
                "lab(100,1e1,0) | lab(100, 10, 0)",
            })
    void readsWhatPeopleType(String typed, String text) {
        assertThat(read(typed).text()).isEqualTo(text);
        assertThat(read(text)).isEqualTo(read(typed));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "  ", "#3a3f8", "#3a3f8fa", "blue", "lab", "lab()", "lab(1,2)", "lab(1,2,3,4)", "lab(,,)"})
    void refusesWhatIsNone(String typed) {
        assertThat(ColourText.read(typed)).isInstanceOf(Reading.Faulty.class);
    }

    @Test
    void namesEveryNumberAtFault() {
        assertThat(ColourText.read("lab(101, x, -200.1)"))
                .isEqualTo(new Reading.Faulty<>(List.of(
                        new Fault("L", "is 101", "L must be a number from 0 to 100"),
                        new Fault("a", "is no number", "a must be a number from -200 to 200"),
                        new Fault("b", "is -200.1", "b must be a number from -200 to 200"))));
    }

    @Test
    void aScreenColourStandsForSomethingElseInEachLight() {
        Viewing lamp = Viewing.of(Illuminant.A, Observer.CIE_1931_2_DEGREE);
        ColourText colour = read("#3a3f8f");
        assertThat(colour.wanted(lamp, OptionalInt.of(2)).lab()).isEqualTo(lamp.lab(Srgb.ofHex("#3a3f8f")));
        assertThat(colour.labIn(lamp)).isNotEqualTo(colour.labIn(Viewing.daylight()));
        assertThat(read("lab(45, 10, -38)").labIn(lamp)).isEqualTo(new Lab(45, 10, -38));
    }

    private static ColourText read(String typed) {
        return ((Reading.Read<ColourText>) ColourText.read(typed)).value();
    }
}
