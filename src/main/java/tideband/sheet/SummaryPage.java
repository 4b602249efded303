package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.oxide.Bath;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.sheet.Mark.Anchor;

/** The first page: what is made, of what, with what, and what it costs. */
final class SummaryPage {
    /** A longer title ends in an ellipsis. */
    private static final double LONGEST_TITLE_LINES = 2.5;

    private final Flow flow;
    private final BenchPlan plan;
    private final Colours colours;

    SummaryPage(Flow flow, BenchPlan plan, Colours colours) {
        this.flow = flow;
        this.plan = plan;
        this.colours = colours;
    }

    void draw() {
        Design design = plan.design();
        String title = Typeface.fit(design.title(), Flow.mm(26), true, LONGEST_TITLE_LINES * flow.widthMm());
        for (String line : Typeface.wrap(title, Flow.mm(26), true, flow.widthMm())) {
            flow.down(Flow.mm(26));
            flow.pen().words(line, flow.leftMm(), flow.yMm(), Flow.mm(26), true, Anchor.START);
            flow.down(1.8);
        }
        flow.down(2);
        flow.text(
                "Anodizing in colour: " + design.metal().key() + ", "
                        + design.finish().key() + " finish",
                14,
                false,
                0);
        picture();
        flow.figures(List.of(
                new Flow.Figure(Integer.toString(plan.plan().immersions().size()), "immersions"),
                new Flow.Figure(Figures.volts(highestVolts(plan), design.supply()) + " V", "highest volts"),
                new Flow.Figure(Figures.clock(bathSeconds()), "in the bath, min:s"),
                new Flow.Figure(Figures.plain(plan.plan().cost().minutes(), 1) + " min", "bench cost")));
        for (List<String> fact : facts()) {
            fact(fact.get(0), fact.get(1));
        }
    }

    private void picture() {
        flow.down(2);
        LevelPicture picture = new LevelPicture(plan, colours, flow.leftMm(), flow.widthMm(), 45);
        double top = flow.yMm() + 14;
        double size = Flow.mm(11);
        picture.numbers(
                flow.pen(), flow.yMm() + size, top, top + picture.acrossMm() + 14, top + picture.acrossMm() + 26, size);
        picture.predicted(flow.pen(), top);
        picture.edges(flow.pen(), top);
        picture.ruler(flow.pen(), top + picture.acrossMm() + 5);
        flow.down(14 + picture.acrossMm() + (picture.numbersBelow(size) ? 30 : 14));
        flow.text("As predicted, " + picture.scale() + ". Numbers name the bands of the table.", 11, false, 0);
        flow.down(2);
    }

    private void fact(String label, String value) {
        double size = Flow.mm(Flow.BODY_PT);
        double indent = 34;
        List<String> lines = Typeface.wrap(value, size, false, flow.widthMm() - indent);
        flow.need(lines.size() * size * 1.28 + 2);
        flow.pen().words(label, flow.leftMm(), flow.yMm() + size, size, true, Anchor.START);
        flow.text(value, Flow.BODY_PT, false, indent);
    }

    private List<List<String>> facts() {
        Design design = plan.design();
        Bath bath = design.bath();
        List<List<String>> facts = new ArrayList<>();
        facts.add(List.of("Piece", Wording.piece(design.piece())));
        facts.add(List.of("Colours seen in", Wording.light(design)));
        facts.add(List.of(
                "Bath",
                bath.name() + ": " + Figures.plain(bath.nmPerVolt(), 3) + " nm/V at 0.1 mA/cm\u00b2, field slope "
                        + Figures.plain(bath.fieldSlope(), 2) + ", native film " + Figures.plain(bath.nativeNm(), 2)
                        + " nm, efficiency " + Figures.plain(bath.efficiency(), 3) + ", "
                        + Figures.plain(bath.resistanceOhm(), 2) + " ohm, ceiling "
                        + Figures.plain(bath.ceilingVolts(), 1) + " V"
                        + (bath.indexScale() == 1 ? "" : ", index scale " + Figures.plain(bath.indexScale(), 4))
                        + ". Source: " + bath.source()));
        facts.add(List.of(
                "Supply",
                "up to " + Figures.plain(design.supply().maxVolts(), 1) + " V and "
                        + Figures.plain(design.supply().maxAmps(), 2) + " A, dial steps of "
                        + Figures.plain(design.supply().dialVolts(), 3) + " V"
                        + (Double.isFinite(design.supply().slewVoltsPerS())
                                ? ", at most " + Figures.plain(design.supply().slewVoltsPerS(), 2) + " V/s"
                                : "")));
        facts.add(List.of(
                "Vessel",
                design.vessel()
                        .map(v -> "inside cross-section " + Figures.plain(v.areaMm2() / 100, 1)
                                + " cm\u00b2: the level falls as the piece leaves, and hand travel allows for it")
                        .orElse("wide: the level is taken to stay where it is")));
        facts.add(List.of("Bench cost", Wording.cost(plan) + ". Pull times are not part of it."));
        facts.add(List.of("How sure", upper(Wording.proof(plan)) + "." + Wording.saved(plan)));
        return facts;
    }

    private double bathSeconds() {
        return plan.pulls().stream().mapToDouble(Pull::durationS).sum();
    }

    /** The highest volts of all pulls. */
    static double highestVolts(BenchPlan plan) {
        return plan.pulls().stream()
                .flatMap(p -> p.rows().stream())
                .mapToDouble(Row::volts)
                .max()
                .orElse(0);
    }

    /** A sentence's first letter made a capital. */
    static String upper(String sentence) {
        return Character.toUpperCase(sentence.charAt(0)) + sentence.substring(1);
    }
}
