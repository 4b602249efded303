package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.match.FilmColour;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.sheet.Table.Cell;
import tideband.sheet.Table.Line;

/** The steps of one immersion: turn, strip, mask, lower, pull, rinse, look. */
final class ImmersionSteps {
    /** How far past the sheet volts may be raised to reach a colour: common practice, no source. */
    private static final double MOST_RAISE = 1.05;

    /** Film short of and past the wanted one, by which the colours of a miss are shown. */
    private static final double SHORT = 0.93;

    private static final double PAST = 1.07;

    private final Flow flow;
    private final BenchPlan plan;
    private final Colours colours;
    private final int index;
    private final Immersion immersion;
    private final Pull pull;

    ImmersionSteps(Flow flow, BenchPlan plan, Colours colours, int index) {
        this.flow = flow;
        this.plan = plan;
        this.colours = colours;
        this.index = index;
        this.immersion = plan.plan().immersions().get(index);
        this.pull = plan.pulls().get(index);
    }

    void draw() {
        flow.freshPage();
        flow.chapter("Immersion " + (index + 1) + " of "
                + plan.plan().immersions().size() + ": end " + immersion.endDown() + " down");
        flow.figures(List.of(
                new Flow.Figure(Figures.fixed(pull.rows().get(0).depthMm(), 1) + " mm", "start depth"),
                new Flow.Figure(volts(firstVolts()) + " V", "first volts"),
                new Flow.Figure(Figures.plain(pull.currentLimitAmps(), 3) + " A", "set current limit"),
                new Flow.Figure(Figures.clock(pull.durationS()), "pull, min:s")));
        new BathPicture(plan, colours, index, flow.rightMm() - BathPicture.WIDTH_MM, flow.yMm()).draw(flow.pen());
        flow.inset(BathPicture.WIDTH_MM + 4, BathPicture.HEIGHT_MM);
        ready();
        lower();
        flow.clearInset();
        pullTable();
        look();
    }

    private double firstVolts() {
        return pull.rows().stream()
                .mapToDouble(Row::volts)
                .filter(v -> v > 0)
                .findFirst()
                .orElse(0);
    }

    private String volts(double volts) {
        return Figures.volts(volts, plan.design().supply());
    }

    private void ready() {
        flow.step(
                immersion.maskedBefore().isEmpty() && immersion.strippedBefore().isEmpty() ? "Ready" : "Masks");
        if (index > 0 && plan.plan().immersions().get(index - 1).endDown() != immersion.endDown()) {
            flow.act("Turn the piece end for end: end " + immersion.endDown() + " goes down.");
        } else if (index == 0) {
            flow.act("Hang the piece with end " + immersion.endDown() + " down.");
        }
        for (Run run : immersion.strippedBefore()) {
            flow.act("Strip " + Wording.run(plan, run) + ". Clean off all residue.");
        }
        for (Run run : immersion.maskedBefore()) {
            flow.act("Mask " + Wording.run(plan, run) + ". Press the edges down.");
        }
        if (immersion.masked().isEmpty()) {
            flow.act("Nothing is masked now.");
        } else {
            flow.act("Check: masked now are " + Wording.bands(plan, immersion.masked()) + ", and nothing else.");
        }
        for (String why : immersion.why()) {
            flow.text(why, 11, false, 9);
        }
    }

    private void lower() {
        flow.step("Lower, supply off");
        flow.act("Supply off. Lower until the gauge for immersion " + (index + 1) + " reads "
                + Figures.fixed(pull.rows().get(0).depthMm(), 1) + " mm.");
        flow.act("Set the current limit to " + Figures.plain(pull.currentLimitAmps(), 3) + " A. Expect up to "
                + Figures.plain(pull.peakAmps(), 3) + " A.");
        flow.act("Guard closed, hands clear.");
    }

    private void pullTable() {
        List<HandMark> marks = HandMark.of(pull, plan.design().supply());
        flow.need(36 + 11.5 * Math.min(marks.size(), 8));
        flow.step("Pull: follow the clock");
        for (String note : pull.notes()) {
            flow.text(note, 11, false, 0);
        }
        flow.text("Each row is a mark: be there when the clock shows it, then do what the row says.", 11, false, 0);
        Table table = new Table(
                flow,
                List.of(
                        new Table.Column("mark", 14),
                        new Table.Column("clock min:s", 19),
                        new Table.Column("volts V", 25),
                        new Table.Column("depth mm", 25),
                        new Table.Column("hand travel", 18),
                        new Table.Column("film and colour at the line", 37),
                        new Table.Column("do", 40)),
                11.5);
        for (HandMark mark : marks) {
            Row row = mark.row();
            FilmColour colour = colours.ofFilm(row.filmNm());
            List<Line> act = new ArrayList<>(List.of(new Line(mark.act(), 14, true)));
            if (!mark.leadsTo().isEmpty()) {
                act.add(new Line(mark.leadsTo(), 11, false));
            }
            table.row(List.of(
                    Cell.of(Integer.toString(mark.number()), 11, false),
                    Cell.of(Figures.clock(row.timeS()), 17, true),
                    Cell.of(mark.volts(plan.design().supply()), 20, true),
                    Cell.of(row.lineMm() == 0 ? "out" : Figures.fixed(row.depthMm(), 1), 18, true),
                    Cell.of(Figures.fixed(row.travelMm(), 1), 12, false),
                    new Cell(
                            List.of(colour.srgbHex()),
                            List.of(
                                    new Line(Figures.fixed(row.filmNm(), 1) + " nm", 11, false),
                                    new Line(Wording.colour(colour), 11, false))),
                    new Cell(List.of(), act)));
        }
        table.draw();
        flow.down(4);
    }

    private void look() {
        flow.step("Rinse, dry, look");
        flow.act("Supply off, 0 V on its meter. Lift out, rinse twice in clean water, dry. Clean gloves.");
        flow.act("Look at it dry, in " + plan.design().light().key() + " light or daylight, beside this table.");
        Table table = new Table(
                flow,
                List.of(
                        new Table.Column("band", 40),
                        new Table.Column("right", 43),
                        new Table.Column("short of it", 35),
                        new Table.Column("past it", 35),
                        new Table.Column("again at, at most", 25)),
                13);
        for (int band : immersion.finishes()) {
            table.row(judged(band));
        }
        table.draw();
        flow.down(4);
        flow.act(
                "Short of its colour: same masks, same depth, hold once more at the same volts. If the colour stops before"
                        + " it is there, raise by half a volt at a time, to the last column at most; every wet unmasked place"
                        + " grows along.");
        flow.act(
                "Past its colour: film never shrinks. Accept it, or have the film taken off by trained staff, finish the"
                        + " metal again and begin again.");
    }

    private List<Cell> judged(int index) {
        BenchBand band = plan.bands().get(index);
        Design design = plan.design();
        boolean thickAtA = band.aSide().filmNm() >= band.bSide().filmNm();
        FilmColour thick = thickAtA ? band.aSide() : band.bSide();
        double volts = thickAtA ? band.aSideVolts() : band.bSideVolts();
        double most = Math.min(
                volts * MOST_RAISE,
                Math.min(design.bath().ceilingVolts(), design.supply().maxVolts()));
        String side = band.fade() ? " at end " + (thickAtA ? "A" : "B") : "";
        return List.of(
                new Cell(
                        List.of(),
                        List.of(
                                new Line(index + 1 + " " + Typeface.fit(band.name(), Flow.mm(12), true, 60), 12, true),
                                new Line(Wording.span(band) + " mm", 11, false))),
                new Cell(
                        Wording.wantedHexes(band, colours, Wording.CHIP_STEPS),
                        List.of(new Line(Wording.colour(band), 11, false))),
                miss(thick.filmNm() * SHORT, side),
                miss(thick.filmNm() * PAST, side),
                new Cell(
                        List.of(),
                        List.of(
                                new Line(volts(volts) + " V", 13, true),
                                new Line("\u2264 " + volts(Math.max(volts, most)) + " V", 12, false))));
    }

    private Cell miss(double filmNm, String side) {
        FilmColour colour = colours.ofFilm(filmNm);
        return new Cell(List.of(colour.srgbHex()), List.of(new Line(Wording.colour(colour) + side, 11, false)));
    }
}
