package tideband.sheet;

import java.util.List;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.plan.Run;
import tideband.sheet.Table.Cell;

/**
 * The step sheet: a PDF to follow at the bench, read at arm's length with gloves on.
 *
 * <p>In this order: what is made and what it costs; the cautions; the bands; what to lay out; the numbered steps, with the
 * piece in the bath and the timing table of every pull; sign-off; dip gauges at full size, each page with a ruler to check
 * the printer by.
 */
public final class StepSheetPdf {
    private StepSheetPdf() {}

    /**
     * The step sheet as a PDF file.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @param paper the paper it is to be printed on
     * @return the file's bytes, the same for the same plan
     */
    public static byte[] bytes(BenchPlan plan, Colours colours, Paper paper) {
        return PdfWriter.bytes(plan.design().title() + ": step sheet", pages(plan, colours, paper));
    }

    static List<Drawing> pages(BenchPlan plan, Colours colours, Paper paper) {
        Flow flow = new Flow(paper, plan.design().title());
        new SummaryPage(flow, plan, colours).draw();
        Preparation.cautions(flow, plan);
        BandsPage.draw(flow, plan, colours);
        Preparation.layOut(flow, plan);
        Preparation.prepare(flow, plan);
        for (int i = 0; i < plan.plan().immersions().size(); i++) {
            new ImmersionSteps(flow, plan, colours, i).draw();
        }
        finish(flow, plan);
        signOff(flow, plan);
        if (!plan.pulls().isEmpty()) {
            new GaugePages(flow, plan).draw();
        }
        return flow.pages();
    }

    private static void finish(Flow flow, BenchPlan plan) {
        flow.freshPage();
        flow.chapter("Finish");
        flow.step("Strip, clean, compare");
        for (Run run : plan.plan().strippedAtEnd()) {
            flow.act("Strip " + Wording.run(plan, run) + ".");
        }
        flow.act(
                "Take off all residue with the mask's own remover, rinse, dry, and degrease once more: a trace of grease"
                        + " shifts the colour seen.");
        flow.act("Compare the dry piece with the table of bands and with the signed sample, if there is one.");
        flow.act("Supply off at the mains, bath covered and labelled, rinses disposed of by local rules.");
        flow.down(4);
    }

    private static void signOff(Flow flow, BenchPlan plan) {
        flow.need(70);
        flow.chapter("Signed off");
        Table table = new Table(
                flow,
                List.of(
                        new Table.Column("what", 62),
                        new Table.Column("date and time", 38),
                        new Table.Column("found", 46),
                        new Table.Column("signed", 32)),
                15);
        table.row(box("Cautions read, guards checked"));
        table.row(box("Coupon right (volts, colour)"));
        for (int i = 0; i < plan.plan().immersions().size(); i++) {
            table.row(box("Immersion " + (i + 1) + " done and looked at"));
        }
        table.row(box("Piece accepted"));
        table.draw();
    }

    private static List<Cell> box(String what) {
        Cell empty = new Cell(List.of(), List.of());
        return List.of(Cell.of(what, Flow.BODY_PT, true), empty, empty, empty);
    }
}
