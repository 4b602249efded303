package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.Test;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.plan.Immersion;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.trial.Dip;
import tideband.trial.Trial;
import tideband.trial.TrialCell;
import tideband.trial.TrialRun;
import tideband.trial.Wish;

/** Property: the trial does not know what the plan meant, so a plan spoilt in one place shows it in the right bands. */
final class WrongPlansShowTest {
    /** A miss that no dial of 0.1 V accounts for, as a share of the film. */
    private static final double CLEARLY_OFF = 0.03;

    /** Thin between thick: the middle has to be masked while its neighbours are made, or made after them. */
    private static final String VALLEY = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern bracket", "metal": "titanium",
              "piece": { "shape": "round", "stations": [ { "at_mm": 0, "size_mm": 5 }, { "at_mm": 120, "size_mm": 5 } ] },
              "holding": { "ends_down": ["A", "B"], "dry_mm": 8 },
              "bands": [
                { "name": "foot", "to_mm": 30, "film_nm": 60, "edge": "crisp" },
                { "name": "rail", "to_mm": 60, "film_nm": 140, "edge": "crisp" },
                { "name": "neck", "to_mm": 90, "film_nm": 40, "edge": "soft" },
                { "name": "stub", "to_mm": 120, "bare": true }
              ],
              "bench": { "order": "%s" }
            }
            """;

    /** Two levels pulled as a stair in one immersion. */
    private static final String STAIR = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern peg", "metal": "niobium",
              "piece": { "shape": "flat", "thickness_mm": 2, "stations": [ { "at_mm": 0, "size_mm": 9 }, { "at_mm": 90, "size_mm": 9 } ] },
              "holding": { "ends_down": ["A"], "dry_mm": 8 },
              "bands": [
                { "name": "tip", "to_mm": 30, "film_nm": 150, "edge": "soft" },
                { "name": "shank", "to_mm": 60, "film_nm": 90, "edge": "soft" },
                { "name": "stub", "to_mm": 90, "bare": true }
              ]
            }
            """;

    @Test
    void aMaskLeftOut() {
        BenchPlan plan = plan(VALLEY.formatted("thicker-first"));
        List<Dip> dips = dips(plan);
        int immersed = 0;
        for (int i = 0; i < dips.size(); i++) {
            for (int band : plan.plan().immersions().get(i).masked()) {
                Dip.Cover cover = cover(plan, band);
                List<Dip.Cover> left = new ArrayList<>(dips.get(i).covers());
                left.remove(cover);
                List<Dip> spoilt = replaced(
                        dips, i, new Dip(dips.get(i).down(), left, dips.get(i).pull()));
                double lineMm = dips.get(i).pull().rows().get(0).lineMm();
                // A mask above the waterline is there for a crisp edge only.
                boolean under = plan.design().piece().fromEnd(dips.get(i).down(), cover.fromMm()) < lineMm;
                assertThat(bandsOff(plan, spoilt)).isEqualTo(under ? List.of(band) : List.of());
                immersed += under ? 1 : 0;
            }
        }
        assertThat(immersed).isPositive();
    }

    /** The pulls swapped, each under the masks meant for the other. */
    @Test
    void twoPullsSwapped() {
        BenchPlan plan = plan(VALLEY.formatted("least-minutes"));
        List<Dip> dips = dips(plan);
        assertThat(dips).hasSize(2);
        List<Dip> spoilt = List.of(
                new Dip(dips.get(0).down(), dips.get(0).covers(), dips.get(1).pull()),
                new Dip(dips.get(1).down(), dips.get(1).covers(), dips.get(0).pull()));
        assertThat(bandsOff(plan, spoilt)).contains(0, 2);
    }

    /** Thick film does not grow at fewer volts, so whole immersions swapped, with their masks, give nearly the same. */
    @Test
    void twoImmersionsSwappedWithTheirMasks() {
        BenchPlan plan = plan(VALLEY.formatted("least-minutes"));
        List<Dip> dips = new ArrayList<>(dips(plan));
        Collections.reverse(dips);
        assertThat(bandsOff(plan, dips)).isEmpty();
    }

    @Test
    void voltsFivePerCentHigh() {
        BenchPlan plan = plan(STAIR);
        List<Dip> dips = dips(plan);
        for (int i = 0; i < dips.size(); i++) {
            List<Dip> spoilt =
                    replaced(dips, i, withRows(dips.get(i), row -> at(row, row.lineMm(), 1.05 * row.volts())));
            assertThat(bandsOff(plan, spoilt))
                    .containsExactlyElementsOf(plan.plan().immersions().get(i).finishes());
        }
    }

    @Test
    void aLineThreeMillimetresHigh() {
        BenchPlan plan = plan(STAIR);
        Dip dip = dips(plan).get(0);
        Trial spoilt = carryOut(
                plan, List.of(withRows(dip, row -> at(row, row.lineMm() == 30 ? 33 : row.lineMm(), row.volts()))));
        // The first 3 mm of the shank, next to the tip, now stay down for the tip's volts.
        assertThat(filmNmAt(plan.trial(), 31.5)).isCloseTo(90, withinPercentage(2));
        assertThat(filmNmAt(spoilt, 31.5)).isGreaterThan(140);
        assertThat(filmNmAt(spoilt, 35)).isCloseTo(90, withinPercentage(2));
        assertThat(spoilt.bands().get(1).de00Worst())
                .isGreaterThan(plan.trial().bands().get(1).de00Worst() + 10);
        assertThat(bandsOff(plan, List.of(withRows(dip, row -> row)))).isEmpty();
    }

    private static BenchPlan plan(String json) {
        Reading<Design> reading = DesignFile.read(json.getBytes(StandardCharsets.UTF_8), Optional.empty());
        Design design = ((Reading.Read<Design>) reading).value();
        return ((Work.Worked) BenchPlanner.work(design)).plan();
    }

    private static Dip.Cover cover(BenchPlan plan, int band) {
        return new Dip.Cover(
                plan.bands().get(band).fromMm(), plan.bands().get(band).toMm());
    }

    private static List<Dip> dips(BenchPlan plan) {
        List<Dip> dips = new ArrayList<>();
        for (int i = 0; i < plan.pulls().size(); i++) {
            Immersion immersion = plan.plan().immersions().get(i);
            List<Dip.Cover> covers =
                    immersion.masked().stream().map(band -> cover(plan, band)).toList();
            dips.add(new Dip(immersion.endDown(), covers, plan.pulls().get(i)));
        }
        return dips;
    }

    private static List<Dip> replaced(List<Dip> dips, int place, Dip other) {
        List<Dip> changed = new ArrayList<>(dips);
        changed.set(place, other);
        return changed;
    }

    private static Dip withRows(Dip dip, UnaryOperator<Row> change) {
        Pull pull = dip.pull();
        List<Row> rows = pull.rows().stream().map(change).toList();
        return new Dip(
                dip.down(), dip.covers(), new Pull(rows, pull.currentLimitAmps(), pull.peakAmps(), pull.notes()));
    }

    private static Row at(Row row, double lineMm, double volts) {
        return new Row(row.timeS(), volts, lineMm, row.depthMm(), row.travelMm(), row.filmNm(), row.act());
    }

    private static Trial carryOut(BenchPlan plan, List<Dip> dips) {
        Design design = plan.design();
        Colours colours = Colours.of(design);
        double nativeNm = design.bath().nativeNm();
        List<Wish> wishes = plan.bands().stream()
                .map(band -> new Wish(
                        band.fromMm(),
                        band.toMm(),
                        band.bare() ? nativeNm : band.aSide().filmNm(),
                        band.bare() ? nativeNm : band.bSide().filmNm(),
                        Optional.empty()))
                .toList();
        return new TrialRun(
                        design.piece(),
                        wishes,
                        colours.palette(),
                        colours.viewing().white())
                .carryOut(design.bath(), design.supply().maxAmps(), dips);
    }

    private static List<Double> filmsNm(BenchPlan plan, List<Dip> dips) {
        return carryOut(plan, dips).bands().stream().map(band -> band.aSideNm()).toList();
    }

    private static double wantedNm(BenchPlan plan, BenchBand drawn) {
        return drawn.bare() ? plan.design().bath().nativeNm() : drawn.aSide().filmNm();
    }

    private static double filmNmAt(Trial trial, double atMm) {
        return trial.cells().stream()
                .filter(cell -> cell.fromMm() <= atMm && atMm <= cell.toMm())
                .mapToDouble(TrialCell::filmNm)
                .findFirst()
                .orElseThrow();
    }

    /** The bands whose film a trial finds clearly off, bare ones included. */
    private static List<Integer> bandsOff(BenchPlan plan, List<Dip> dips) {
        List<Double> films = filmsNm(plan, dips);
        List<Integer> off = new ArrayList<>();
        for (int band = 0; band < films.size(); band++) {
            double wanted = wantedNm(plan, plan.bands().get(band));
            if (Math.abs(films.get(band) - wanted) > CLEARLY_OFF * wanted) {
                off.add(band);
            }
        }
        return off;
    }
}
