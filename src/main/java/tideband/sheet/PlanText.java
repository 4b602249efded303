package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.design.Design;
import tideband.oxide.Bath;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.trial.TrialBand;

/** A plan in plain text, to be read in a terminal: what it costs, film and volts a band, each immersion, the cautions. */
public final class PlanText {
    private static final int WIDTH = 96;
    private static final int LONGEST_NAME = 24;

    private final BenchPlan plan;
    private final Design design;
    private final StringBuilder out = new StringBuilder();

    private PlanText(BenchPlan plan) {
        this.plan = plan;
        this.design = plan.design();
    }

    /**
     * The plan as text.
     *
     * @param plan the plan
     * @return lines that end in a line feed
     */
    public static String of(BenchPlan plan) {
        return new PlanText(plan).text();
    }

    private String text() {
        head();
        bands();
        for (int i = 0; i < plan.plan().immersions().size(); i++) {
            immersion(i);
        }
        for (Run run : plan.plan().strippedAtEnd()) {
            line("");
            said("", "Last of all strip " + Wording.run(plan, run) + ".");
        }
        line("");
        line("Cautions");
        for (Caution caution : plan.cautions()) {
            said("  ", caution.heading() + ". " + caution.text());
        }
        return out.toString();
    }

    private void head() {
        Bath bath = design.bath();
        line(design.title());
        said(
                "",
                design.metal().key() + ", " + design.finish().key() + "; " + Wording.piece(design.piece()) + "; "
                        + Wording.light(design));
        said(
                "",
                "Bath " + bath.name() + ": " + Figures.plain(bath.nmPerVolt(), 3) + " nm/V at 0.1 mA/cm\u00b2, ceiling "
                        + Figures.plain(bath.ceilingVolts(), 1) + " V. " + bath.source());
        line("");
        said("", "Bench cost: " + Wording.cost(plan) + ". Pull times are not part of it.");
        said("", SummaryPage.upper(Wording.proof(plan)) + "." + Wording.saved(plan));
    }

    private void bands() {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of(
                "", "band", "mm from A", "film nm", "volts", "colour (order)", "trial nm", "dE00 film", "dE00 worst"));
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            TrialBand trial = plan.trial().bands().get(i);
            String trialNm = Figures.fixed(trial.aSideNm(), 1)
                    + (band.fade() ? " \u2192 " + Figures.fixed(trial.bSideNm(), 1) : "");
            rows.add(List.of(
                    Integer.toString(i + 1),
                    cut(band.name()),
                    Wording.span(band),
                    band.bare() ? "bare" : Wording.film(band),
                    Wording.volts(band, design),
                    Wording.colour(band),
                    trialNm,
                    Figures.fixed(band.wantedDe00(), 1),
                    Figures.fixed(trial.de00Worst(), 1)));
        }
        line("");
        line("Bands, from end A to end B");
        table(rows);
        said(
                "  ",
                "dE00 is the CIEDE2000 difference from the drawing: of the film chosen, then of the worst place in the"
                        + " trial, waterline blur left out.");
    }

    private void immersion(int index) {
        Immersion immersion = plan.plan().immersions().get(index);
        Pull pull = plan.pulls().get(index);
        line("");
        line("Immersion " + (index + 1) + " of " + plan.plan().immersions().size() + ": end " + immersion.endDown()
                + " down, finishes " + Wording.bands(plan, immersion.finishes()) + ", in the bath "
                + Figures.clock(pull.durationS()) + " min:s");
        if (index > 0 && plan.plan().immersions().get(index - 1).endDown() != immersion.endDown()) {
            said("  ", "Turn the piece end for end.");
        }
        for (Run run : immersion.strippedBefore()) {
            said("  ", "Strip " + Wording.run(plan, run) + ".");
        }
        for (Run run : immersion.maskedBefore()) {
            said("  ", "Mask " + Wording.run(plan, run) + ".");
        }
        said(
                "  ",
                immersion.masked().isEmpty()
                        ? "Nothing is masked."
                        : "Masked: " + Wording.bands(plan, immersion.masked()) + ".");
        for (String why : immersion.why()) {
            said("  ", why);
        }
        for (String note : pull.notes()) {
            said("  ", "Note: " + note);
        }
        said(
                "  ",
                "Set the current limit to " + Figures.plain(pull.currentLimitAmps(), 3) + " A; expect up to "
                        + Figures.plain(pull.peakAmps(), 3) + " A.");
        marks(pull);
    }

    private void marks(Pull pull) {
        List<List<String>> rows = new ArrayList<>();
        rows.add(List.of("clock", "volts", "depth mm", "line nm", "do"));
        for (HandMark mark : HandMark.of(pull, design.supply())) {
            Row row = mark.row();
            rows.add(List.of(
                    Figures.clock(row.timeS()),
                    mark.volts(design.supply()),
                    row.lineMm() == 0 ? "out" : Figures.fixed(row.depthMm(), 1),
                    Figures.fixed(row.filmNm(), 1),
                    mark.sentence()));
        }
        table(rows);
    }

    private static String cut(String name) {
        String clean = Typeface.clean(name);
        return clean.codePointCount(0, clean.length()) <= LONGEST_NAME
                ? clean
                : clean.substring(0, clean.offsetByCodePoints(0, LONGEST_NAME - 1)) + "\u2026";
    }

    /** Columns as wide as their widest field, two spaces between. */
    private void table(List<List<String>> rows) {
        for (List<String> row : rows) {
            StringBuilder text = new StringBuilder(" ");
            for (int column = 0; column < row.size(); column++) {
                int at = column;
                int width = rows.stream()
                        .mapToInt(r -> r.get(at).codePointCount(0, r.get(at).length()))
                        .max()
                        .orElse(0);
                String field = row.get(column);
                text.append(' ').append(field).append(" ".repeat(width - field.codePointCount(0, field.length()) + 1));
            }
            line(text.toString().stripTrailing());
        }
    }

    /** A paragraph, broken at spaces; lines after the first stand two spaces further in. */
    private void said(String indent, String sentence) {
        StringBuilder row = new StringBuilder(indent);
        boolean begun = false;
        for (String word : Typeface.tied(sentence).split(" +", -1)) {
            if (begun && row.length() + 1 + word.length() > WIDTH) {
                line(row.toString());
                row = new StringBuilder(indent + "  ");
                begun = false;
            }
            row.append(begun ? " " : "").append(word);
            begun = true;
        }
        line(row.toString());
    }

    private void line(String text) {
        out.append(Typeface.clean(text).replace(Typeface.NO_BREAK, " ")).append('\n');
    }
}
