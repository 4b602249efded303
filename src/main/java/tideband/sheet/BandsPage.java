package tideband.sheet;

import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.sheet.Table.Cell;
import tideband.sheet.Table.Line;
import tideband.trial.TrialBand;

/** The bands in a table: as drawn, as predicted, and the film and volts between. */
final class BandsPage {
    private BandsPage() {}

    static void draw(Flow flow, BenchPlan plan, Colours colours) {
        flow.freshPage();
        flow.chapter("The bands");
        Table table = new Table(
                flow,
                List.of(
                        new Table.Column("no.", 10),
                        new Table.Column("band, mm from end A", 43),
                        new Table.Column("film nm", 27),
                        new Table.Column("volts", 27),
                        new Table.Column("colour as drawn (order)", 43),
                        new Table.Column("trial", 15),
                        new Table.Column("\u0394E00 film / worst", 19)),
                13);
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            TrialBand trial = plan.trial().bands().get(i);
            String edge = i == plan.bands().size() - 1 ? "" : band.crispAtB() ? ", crisp edge" : ", soft edge";
            table.row(List.of(
                    Cell.of(Integer.toString(i + 1), 15, true),
                    new Cell(
                            List.of(),
                            List.of(
                                    new Line(Typeface.fit(band.name(), Flow.mm(12), true, 80), 12, true),
                                    new Line(Wording.span(band) + edge, 11, false))),
                    pair(band, Wording.film(band), band.bare() ? "bare" : ""),
                    pair(band, Wording.volts(band, plan.design()), ""),
                    new Cell(
                            Wording.wantedHexes(band, colours, Wording.CHIP_STEPS),
                            List.of(new Line(Wording.colour(band), 12, false))),
                    new Cell(Wording.predictedHexes(plan, band, colours), List.of()),
                    Cell.of(
                            Figures.fixed(band.wantedDe00(), 1) + " / " + Figures.fixed(trial.de00Worst(), 1),
                            11,
                            false)));
        }
        table.draw();
        flow.down(3);
        flow.text(
                "\u0394E00 is the CIEDE2000 difference from the drawing: for the film chosen, then for the worst place of"
                        + " the band in the trial (waterline blur left out). About 1 is just seen side by side.",
                11,
                false,
                0);
    }

    private static Cell pair(BenchBand band, String text, String instead) {
        return Cell.of(instead.isEmpty() ? text : instead, band.fade() ? 12 : 15, true);
    }
}
