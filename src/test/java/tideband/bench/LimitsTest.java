package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.design.Design;
import tideband.pull.Row;

/** Property: what bath, supply and hand cannot do is said, with the change that would do, and that change does. */
final class LimitsTest {
    private static final String STUB = ", { \"name\": \"stub\", \"to_mm\": 100, \"bare\": true }";

    private static Design rod(String band, String members) {
        return DesignTexts.rod(100, band + STUB, members);
    }

    private static Obstacle only(Design design) {
        Work work = BenchPlanner.work(design);
        assertThat(work).isInstanceOf(Work.CannotBeMade.class);
        List<Obstacle> obstacles = ((Work.CannotBeMade) work).obstacles();
        assertThat(obstacles).hasSize(1);
        return obstacles.get(0);
    }

    private static BenchPlan made(Design design) {
        Work work = BenchPlanner.work(design);
        assertThat(work).isInstanceOf(Work.Worked.class);
        BenchPlan plan = ((Work.Worked) work).plan();
        assertThat(new TrialCheck(plan, Colours.of(design).palette()).faults()).isEmpty();
        return plan;
    }

    /** The change is taken, and the design made, within two goes: the second is for the wet area, unknown to the first. */
    private static void changeWorks(Design design) {
        Design changed = Advice.taken(design, List.of(only(design)));
        if (BenchPlanner.work(changed) instanceof Work.CannotBeMade again) {
            changed = Advice.taken(changed, again.obstacles());
        }
        made(changed);
    }

    /** The titanium phosphate preset's ceiling is 100 V: common practice, no source. */
    @Test
    void aFilmBeyondTheCeiling() {
        Design design = rod("{ \"name\": \"tip\", \"to_mm\": 60, \"film_nm\": 240 }", "");
        Obstacle obstacle = only(design);
        assertThat(obstacle.where()).isEqualTo("band \"tip\"");
        assertThat(obstacle.reason()).contains("ceiling", "100.0 V");
        changeWorks(design);
    }

    @Test
    void aFilmBeyondTheSupply() {
        Design design =
                rod("{ \"name\": \"tip\", \"to_mm\": 60, \"film_nm\": 150 }", ", \"supply\": { \"max_volts\": 60 }");
        Obstacle obstacle = only(design);
        assertThat(obstacle.reason()).contains("supply", "60.0 V");
        changeWorks(design);
        double volts =
                Double.parseDouble(obstacle.change().replaceAll(".*use a supply of at least ([0-9.]+) V.*", "$1"));
        made(rod(
                "{ \"name\": \"tip\", \"to_mm\": 60, \"film_nm\": 150 }",
                ", \"supply\": { \"max_volts\": " + (volts + 1) + " }"));
    }

    @Test
    void voltsBeyondTheCeiling() {
        Design design = rod("{ \"name\": \"tip\", \"to_mm\": 60, \"volts\": 110 }", "");
        assertThat(only(design).reason()).contains("110.0 V", "100.0 V");
        changeWorks(design);
    }

    @Test
    void voltsBelowTheDial() {
        Design design =
                rod("{ \"name\": \"tip\", \"to_mm\": 60, \"volts\": 0.2 }", ", \"supply\": { \"dial_volts\": 0.5 }");
        assertThat(only(design).reason()).contains("0.200 V", "0.500 V");
        changeWorks(design);
    }

    /** Faraday: 9.6 cm² to 150 nm take at least 9.6 · 147 · 1.836 / 0.9 mC = 2.9 C, and 0.05 A give 1.5 C in 30 s. */
    @Test
    void tooFewAmps() {
        String band = "{ \"name\": \"tip\", \"to_mm\": 60, \"film_nm\": 150 }";
        Design design = rod(band, ", \"supply\": { \"max_amps\": 0.05 }");
        Obstacle obstacle = only(design);
        assertThat(obstacle.reason()).contains("0.050 A are not enough");
        changeWorks(design);
        double amps =
                Double.parseDouble(obstacle.change().replaceAll(".*use a supply of at least ([0-9.]+) A.*", "$1"));
        assertThat(amps).isBetween(0.09, 0.13);
        made(rod(band, ", \"supply\": { \"max_amps\": " + amps + " }"));
    }

    @Test
    void aFilmTooThinToHold() {
        Design design =
                rod("{ \"name\": \"tip\", \"to_mm\": 60, \"film_nm\": 3.5 }", ", \"supply\": { \"dial_volts\": 1 }");
        assertThat(only(design).reason()).contains("too thin", "3.0 nm");
        changeWorks(design);
    }

    @Test
    void aBandUnderEveryHolder() {
        Design design = DesignTexts.rod(100, "{ \"name\": \"all\", \"to_mm\": 100, \"film_nm\": 80 }", "");
        assertThat(only(design).change()).contains("shorten the dry length to 0 mm");
        changeWorks(design);
    }

    /** A fade so short that the slowest hand would have to grow film faster than the volts allow. */
    @ParameterizedTest
    @ValueSource(strings = {"ramped", "fixed-volts"})
    void aSteepFadeIsMadeInSteps(String style) {
        Design design = rod(
                "{ \"to_mm\": 20, \"film_nm\": 170, \"edge\": \"soft\" },"
                        + " { \"to_mm\": 22, \"film_nm\": [170, 60], \"edge\": \"soft\" },"
                        + " { \"to_mm\": 60, \"film_nm\": 60 }",
                ", \"pull\": { \"slowest_mm_s\": 2, \"fade\": \"" + style + "\" }");
        BenchPlan plan = made(design);
        assertThat(plan.pulls().get(0).notes()).anyMatch(note -> note.contains("pulled in steps"));
        assertThat(plan.pulls().get(0).rows()).noneMatch(row -> row.act() == Row.Act.FADE);
    }

    @Test
    void aGentleFadeIsNotMadeInSteps() {
        Design design = rod(
                "{ \"to_mm\": 20, \"film_nm\": 150, \"edge\": \"soft\" },"
                        + " { \"to_mm\": 60, \"film_nm\": [150, 60], \"edge\": \"soft\" },"
                        + " { \"to_mm\": 80, \"film_nm\": 60 }",
                "");
        BenchPlan plan = made(design);
        assertThat(plan.pulls().get(0).notes()).isEmpty();
        assertThat(plan.pulls().get(0).rows()).anyMatch(row -> row.act() == Row.Act.FADE);
    }

    /** The most bands a design may have, as a stair. */
    @Test
    void sixtyBands() {
        String bands = IntStream.range(0, 59)
                .mapToObj(i ->
                        "{ \"to_mm\": " + (i + 1) * 3 + ", \"film_nm\": " + (170 - 2 * i) + ", \"edge\": \"soft\" }")
                .collect(Collectors.joining(", "));
        BenchPlan plan = made(DesignTexts.rod(200, bands + ", { \"to_mm\": 200, \"bare\": true }", ""));
        assertThat(plan.bands()).hasSize(60);
    }
}
