package tideband.sheet;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.TreeMap;
import tideband.bench.BenchPlan;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.sheet.Mark.Anchor;

/**
 * Dip gauges to cut out, at full size: a strip an immersion, its zero level with the end that is down, with a line at
 * every depth of the pull. A gauge longer than a page comes in parts that overlap.
 */
final class GaugePages {
    static final double CHECK_MM = 100;
    static final String CHECK_WORDS = "Measure this before use: exactly 100 mm.";

    private static final double STRIP_MM = 38;
    private static final double GAP_MM = 7;
    private static final double OVERLAP_MM = 20;
    private static final double HEAD_MM = 38;
    private static final double FOOT_MM = 36;
    private static final double LABEL_MM = Flow.mm(11);

    private final Flow flow;
    private final BenchPlan plan;

    GaugePages(Flow flow, BenchPlan plan) {
        this.flow = flow;
        this.plan = plan;
    }

    /**
     * A part of a strip that fits a page.
     *
     * @param immersion which immersion, 0-based
     * @param part which part, 0-based from the bottom
     * @param parts how many parts the strip has
     * @param fromMm depth at its lower end in mm
     * @param toMm depth at its upper end
     */
    private record Part(int immersion, int part, int parts, double fromMm, double toMm) {}

    void draw() {
        flow.freshPage();
        double room = flow.bottomMm() - flow.yMm() - HEAD_MM - FOOT_MM;
        int perPage = (int) Math.floor((flow.widthMm() + GAP_MM) / (STRIP_MM + GAP_MM));
        List<Part> parts = parts(room);
        for (int i = 0; i < parts.size(); i++) {
            if (i % perPage == 0) {
                if (i > 0) {
                    flow.newPage();
                }
                head();
                check();
            }
            double left = flow.leftMm() + i % perPage * (STRIP_MM + GAP_MM);
            strip(parts.get(i), left, flow.bottomMm() - FOOT_MM);
        }
        flow.down(flow.bottomMm() - flow.yMm());
    }

    private List<Part> parts(double roomMm) {
        List<Part> parts = new ArrayList<>();
        for (int i = 0; i < plan.pulls().size(); i++) {
            double lengthMm = plan.pulls().get(i).rows().stream()
                            .mapToDouble(Row::depthMm)
                            .max()
                            .orElse(0)
                    + 8;
            int count = lengthMm <= roomMm ? 1 : (int) Math.ceil((lengthMm - OVERLAP_MM) / (roomMm - OVERLAP_MM));
            double each = (lengthMm + (count - 1) * OVERLAP_MM) / count;
            for (int j = 0; j < count; j++) {
                double from = j * (each - OVERLAP_MM);
                parts.add(new Part(i, j, count, from, from + each));
            }
        }
        return parts;
    }

    private void head() {
        double top = flow.yMm();
        flow.pen().words("Dip gauges, full size", flow.leftMm(), top + 6, Flow.mm(20), true, Anchor.START);
        double y = top + 13;
        for (String line : Typeface.wrap(
                "Print at 100 %, not fitted to the page. Cut out, sleeve in clear plastic, fix to the holder beside the"
                        + " piece with 0 level with the end that is down. The bath's flat surface, away from the"
                        + " meniscus, reads the depth. The numbers at the right are the marks of the pull.",
                LABEL_MM, false, flow.widthMm())) {
            flow.pen().words(line, flow.leftMm(), y, LABEL_MM);
            y += LABEL_MM * 1.25;
        }
    }

    private void check() {
        Pen pen = flow.pen();
        double y = flow.bottomMm() - 8;
        double left = flow.leftMm();
        pen.line(left, y, left + CHECK_MM, y, 0.5);
        for (int i = 0; i <= CHECK_MM; i++) {
            pen.line(left + i, y, left + i, y - (i % 10 == 0 ? 6 : i % 5 == 0 ? 4 : 2.5), i % 10 == 0 ? 0.3 : 0.15);
        }
        pen.words("0", left, y + 4.8, LABEL_MM, true, Anchor.MIDDLE);
        pen.words("50", left + CHECK_MM / 2, y + 4.8, LABEL_MM, true, Anchor.MIDDLE);
        pen.words("100", left + CHECK_MM, y + 4.8, LABEL_MM, true, Anchor.MIDDLE);
        double y2 = y - 9;
        pen.words(CHECK_WORDS, left, y2, Flow.mm(13), true, Anchor.START);
        pen.words("If not, print", left + CHECK_MM + 8, y - 1, LABEL_MM);
        pen.words("again at 100 %.", left + CHECK_MM + 8, y + 4, LABEL_MM);
    }

    private void strip(Part part, double leftMm, double bottomMm) {
        Pen pen = flow.pen();
        double height = part.toMm() - part.fromMm();
        double top = bottomMm - height;
        pen.box(leftMm, top, STRIP_MM, height, Ink.outline(Ink.BLACK, 0.3));
        String end = plan.plan().immersions().get(part.immersion()).endDown().name();
        String name = "imm. " + (part.immersion() + 1) + ", end " + end;
        String which = part.parts() == 1 ? "" : "part " + (part.part() + 1) + " of " + part.parts();
        pen.words(name, leftMm + STRIP_MM - 1, top - 2 - (which.isEmpty() ? 0 : 4.6), LABEL_MM, true, Anchor.END);
        pen.words(which, leftMm + STRIP_MM - 1, top - 2, LABEL_MM, false, Anchor.END);
        pen.words(
                part.part() == 0 ? "0: end " + end : "lay join on join",
                leftMm + STRIP_MM / 2,
                bottomMm + 5,
                LABEL_MM,
                part.part() == 0,
                Anchor.MIDDLE);
        if (part.part() > 0) {
            join(bottomMm - OVERLAP_MM / 2, leftMm);
        }
        if (part.part() + 1 < part.parts()) {
            join(top + OVERLAP_MM / 2, leftMm);
        }
        for (int mm = (int) Math.ceil(part.fromMm()); mm <= part.toMm(); mm++) {
            double y = bottomMm - (mm - part.fromMm());
            double tick = mm % 10 == 0 ? 4 : mm % 5 == 0 ? 2.8 : 1.6;
            pen.line(leftMm, y, leftMm + tick, y, mm % 10 == 0 ? 0.25 : 0.12);
            if (mm % 10 == 0 && y - top > 2 && bottomMm - y > 2) {
                pen.words(Integer.toString(mm), leftMm + 4.4, y + 0.9, Flow.mm(7), false, Anchor.START, Ink.GREY);
            }
        }
        marks(part, leftMm, bottomMm);
    }

    /** Where two parts of a strip are laid on each other. */
    private void join(double yMm, double leftMm) {
        double right = leftMm + STRIP_MM;
        flow.pen().dashed(leftMm, yMm, leftMm + 12, yMm, 0.4, 1.5, Ink.BLACK);
        flow.pen().line(right, yMm, right + 6, yMm, 0.4);
        flow.pen().words("join", right + 0.5, yMm - 0.7, Flow.mm(8), true, Anchor.START);
    }

    /** A heavy line at every depth of the pull, labelled as densely as the labels fit. */
    private void marks(Part part, double leftMm, double bottomMm) {
        TreeMap<Double, List<Integer>> byDepth = new TreeMap<>(Comparator.reverseOrder());
        Pull pull = plan.pulls().get(part.immersion());
        for (HandMark mark : HandMark.of(pull, plan.design().supply())) {
            double depth = Math.rint(mark.row().depthMm() * 20) / 20;
            if (depth >= part.fromMm() && depth <= part.toMm()) {
                byDepth.computeIfAbsent(depth, d -> new ArrayList<>()).add(mark.number());
            }
        }
        double pitch = LABEL_MM * 1.15;
        double room = part.toMm() - part.fromMm();
        int most = Math.max(1, (int) Math.floor(room / (pitch + 0.1)));
        int step = (byDepth.size() + most - 1) / most;
        List<Double> depths = List.copyOf(byDepth.keySet());
        List<Double> labelled = new ArrayList<>();
        List<Double> wishes = new ArrayList<>();
        for (int i = 0; i < depths.size(); i++) {
            double y = bottomMm - (depths.get(i) - part.fromMm());
            flow.pen().line(leftMm, y, leftMm + 4, y, 0.5);
            flow.pen().line(leftMm + 9.6, y, leftMm + 11.5, y, 0.5);
            if (i % step == 0) {
                labelled.add(depths.get(i));
                wishes.add(y);
            }
        }
        List<Double> middles =
                Labels.spread(wishes, labelled.stream().map(d -> pitch).toList(), 0.1, bottomMm - room, bottomMm);
        for (int i = 0; i < labelled.size(); i++) {
            double y = middles.get(i);
            flow.pen().line(leftMm + 11.5, wishes.get(i), leftMm + 14, y, 0.2);
            flow.pen()
                    .words(
                            Figures.fixed(labelled.get(i), 1),
                            leftMm + 25,
                            y + LABEL_MM * 0.36,
                            LABEL_MM,
                            true,
                            Anchor.END);
            List<Integer> marks = byDepth.get(labelled.get(i));
            String range =
                    marks.size() == 1 ? "" + marks.get(0) : marks.get(0) + "\u2013" + marks.get(marks.size() - 1);
            flow.pen().words(range, leftMm + STRIP_MM - 1, y + LABEL_MM * 0.36, LABEL_MM, false, Anchor.END);
        }
    }
}
