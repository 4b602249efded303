package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.design.Band;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Holding;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Wanted;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.plan.Cost;
import tideband.plan.Immersion;
import tideband.plan.Plan;
import tideband.pull.Pull;
import tideband.pull.Row;

class CautionsTest {
    /**
     * Reference: 15 V (IEC 60204-1, 6.4.1), 30 and 60 V (IEC 60364-4-41, 414.4.5), 120 V (IEC 61558-1:2005, 3.7.16); each
     * holds above its level, not at it.
     */
    @ParameterizedTest
    @CsvSource({
        "15, ''",
        "15.1, Wet hands",
        "30, Wet hands",
        "30.1, No wet contact",
        "60, No wet contact",
        "60.1, Guard and interlock",
        "120, Guard and interlock",
        "120.1, Outside extra-low voltage"
    })
    void electricCautionFollowsTheHighestVolts(double volts, String expected) {
        List<String> electric = headings(Metal.TITANIUM, "phosphate", volts, 300).stream()
                .filter(h -> h.matches(".*over \\d+ V"))
                .toList();
        if (expected.isEmpty()) {
            assertThat(electric).isEmpty();
        } else {
            assertThat(electric).singleElement().asString().startsWith(expected);
        }
    }

    /** Property: by what the name says, and with care where it says nothing. */
    @ParameterizedTest
    @CsvSource({
        "sulfuric, Acid bath",
        "Phosphoric acid 1 M, Acid bath",
        "phosphate, Alkaline bath",
        "TSP 10 g/L, Alkaline bath",
        "bicarbonate, Alkaline bath",
        "borax, Borate bath",
        "my old bucket, Bath: read its safety data sheet"
    })
    void chemicalCautionFollowsTheBath(String bath, String expected) {
        List<String> chemical = headings(Metal.TITANIUM, bath, 20, 100).stream()
                .filter(h -> h.contains("ath") && !h.contains("ceiling") && !h.contains("cathode"))
                .toList();
        assertThat(chemical).containsExactly(expected);
    }

    /**
     * Reference: 0.449 L of hydrogen an ampere hour at 20 °C (Faraday's law with the ideal gas): 2 A for half an hour are
     * one ampere hour, told as a bound and so rounded up.
     */
    @Test
    void hydrogenIsComputedFromTheCharge() {
        Pull pull = new Pull(List.of(row(0, 20), row(1800, 20)), 2, 2, List.of());
        Caution hydrogen = Cautions.of(design(Metal.TITANIUM, "phosphate", 100), plan(), List.of(pull)).stream()
                .filter(c -> c.heading().startsWith("Hydrogen"))
                .findFirst()
                .orElseThrow();
        assertThat(hydrogen.text())
                .startsWith("At most 0.45 L over the whole plan")
                .contains("from 4 % in air");
    }

    /** Property: 0.8 of the ceiling is the planner's own level. */
    @Test
    void ceilingAndAlloyAreNamedOnlyWhereTheyApply() {
        assertThat(headings(Metal.TITANIUM, "phosphate", 80, 100)).noneMatch(h -> h.contains("ceiling"));
        assertThat(headings(Metal.TITANIUM, "phosphate", 80.1, 100)).anyMatch(h -> h.contains("ceiling"));
        assertThat(headings(Metal.TI_6AL_4V, "phosphate", 20, 100)).anyMatch(h -> h.contains("Ti-6Al-4V"));
        assertThat(headings(Metal.NIOBIUM, "phosphate", 20, 100)).noneMatch(h -> h.contains("Ti-6Al-4V"));
    }

    /** Property: chloride is warned of in every plan, and cautions defer to codes. */
    @Test
    void chlorideIsNeverAdvised() {
        for (double volts : new double[] {5, 25, 50, 90, 130}) {
            List<Caution> cautions = cautions(Metal.TANTALUM, "sulfuric", volts, 200);
            assertThat(cautions).anyMatch(c -> c.heading().equals("Never salt"));
            assertThat(cautions).anyMatch(c -> c.text().contains("local rules"));
            assertThat(cautions.stream().filter(c -> c.heading().matches(".*over \\d+ V")))
                    .allMatch(c -> c.text().contains("codes") && c.text().contains("licensed"));
        }
    }

    @Test
    void eachImmersionHasItsPull() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Cautions.of(design(Metal.TITANIUM, "phosphate", 100), plan(), List.of()))
                .withMessageContaining("0 for 1 immersions");
    }

    private static List<String> headings(Metal metal, String bath, double volts, double ceilingV) {
        return cautions(metal, bath, volts, ceilingV).stream()
                .map(Caution::heading)
                .toList();
    }

    private static List<Caution> cautions(Metal metal, String bath, double volts, double ceilingV) {
        Pull pull = new Pull(List.of(row(0, 0), row(30, volts)), 1, 0.5, List.of());
        return Cautions.of(design(metal, bath, ceilingV), plan(), List.of(pull));
    }

    private static Row row(double timeS, double volts) {
        return new Row(timeS, volts, 50, 48, 0, 20, Row.Act.HOLD);
    }

    private static Plan plan() {
        Immersion only = new Immersion(End.A, List.of(), List.of(), List.of(), List.of(0), 50, List.of());
        return new Plan(List.of(only), List.of(), new Cost(1, 0, 0, 0, 0, 0, 4), 4, true, OptionalDouble.empty());
    }

    private static Design design(Metal metal, String bath, double ceilingV) {
        return new Design(
                "Lantern hook",
                metal,
                Finish.POLISHED,
                Illuminant.D65,
                Observer.CIE_1931_2_DEGREE,
                new Piece(new Section.Round(), List.of(new Station(0, 5), new Station(60, 5))),
                new Holding(EnumSet.allOf(End.class), 10),
                List.of(new Band("tip", 0, 60, new Wanted.Film(50, 50), Edge.SOFT)),
                new Bath(bath, metal, 1.8, 27.7, 3, 0.9, 2, ceilingV, 1, "a fixture"),
                new Supply(200, 2, 0.1, 10),
                Optional.empty(),
                BenchTimes.USUAL,
                Order.THICKER_FIRST,
                PullSettings.USUAL);
    }
}
