package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.design.Design;
import tideband.plan.Cost;
import tideband.plan.Immersion;
import tideband.pull.Pull;
import tideband.sheet.Mark.Anchor;

/** What comes before the first immersion: cautions, things to lay out, the metal made ready, the coupon. */
final class Preparation {
    private Preparation() {}

    /** The cautions, one in a frame of its own, big. */
    static void cautions(Flow flow, BenchPlan plan) {
        flow.freshPage();
        flow.chapter("Before anything else");
        for (Caution caution : plan.cautions()) {
            double head = Flow.mm(16);
            double body = Flow.mm(Flow.BODY_PT);
            double indent = 17;
            double room = flow.widthMm() - indent - 4;
            List<String> headLines = Typeface.wrap(caution.heading(), head, true, room);
            List<String> bodyLines = Typeface.wrap(caution.text(), body, false, room);
            double height = 5 + headLines.size() * head * 1.15 + bodyLines.size() * body * 1.25;
            flow.need(height);
            Pen pen = flow.pen();
            double top = flow.yMm();
            pen.box(flow.leftMm(), top, flow.widthMm(), height, Ink.outline(Ink.BLACK, 0.7));
            warningSign(pen, flow.leftMm() + 8.5, top + 3);
            double base = top + 2 + head;
            for (String line : headLines) {
                pen.words(line, flow.leftMm() + indent, base, head, true, Anchor.START);
                base += head * 1.15;
            }
            base += body - head + 0.6;
            for (String line : bodyLines) {
                pen.words(line, flow.leftMm() + indent, base, body);
                base += body * 1.25;
            }
            flow.down(height + 3);
        }
    }

    private static void warningSign(Pen pen, double middleMm, double topMm) {
        pen.shape(
                List.of(
                        new Point(middleMm, topMm),
                        new Point(middleMm + 5.8, topMm + 10),
                        new Point(middleMm - 5.8, topMm + 10)),
                Ink.fill(Ink.BLACK));
        pen.words("!", middleMm, topMm + 8.9, Flow.mm(20), true, Anchor.MIDDLE, Ink.WHITE);
    }

    /** What must lie ready, by this plan. */
    static void layOut(Flow flow, BenchPlan plan) {
        flow.need(100);
        flow.chapter("Lay out");
        for (String thing : things(plan)) {
            flow.act(thing);
        }
    }

    static List<String> things(BenchPlan plan) {
        Design design = plan.design();
        Cost cost = plan.plan().cost();
        String metal = design.metal().key() + ", " + design.finish().key();
        double deepestMm = plan.pulls().stream()
                .flatMap(p -> p.rows().stream())
                .mapToDouble(r -> r.depthMm())
                .max()
                .orElse(0);
        double mostAmps =
                plan.pulls().stream().mapToDouble(Pull::currentLimitAmps).max().orElse(0);
        List<String> things = new ArrayList<>();
        things.add("The piece (" + metal + "; " + Wording.piece(design.piece()) + "), its ends marked A and B on the"
                + " holder or by a tag.");
        things.add("Two coupons or more of the same metal and finish.");
        things.add(
                "Holder, contact and rack of the same metal as the piece; no other metal gets wet, bar the cathode.");
        things.add("Bath: " + design.bath().name() + ", deep enough to lower the piece "
                + Figures.plain(Math.ceil(deepestMm), 0) + " mm and keep it off the bottom.");
        things.add(
                "Cathode that the bath does not attack (stainless steel or titanium, common practice), along the whole"
                        + " depth.");
        things.add("Supply for " + Figures.volts(SummaryPage.highestVolts(plan), design.supply()) + " V and "
                + Figures.plain(mostAmps, 2) + " A, its current limit working, a meter on its terminals.");
        int runs = cost.runsMaskedFirst() + cost.runsMaskedOver();
        if (runs > 0) {
            things.add("Mask that this bath does not lift, for " + Figures.count(runs, "run") + ", "
                    + Figures.plain(Math.ceil(cost.maskedLengthMm()), 0)
                    + " mm in all: tape creeps 0.2 to 1 mm, brushed lacquer 0.1 to 0.5 mm, wax 0.5 to 2 mm (common"
                    + " practice). Its remover, wipes, a fine blade of plastic or wood.");
        }
        things.add(
                "Dip gauge from the last pages of this sheet, checked against a ruler and sleeved in clear plastic.");
        things.add("Clock that shows seconds. A second person to read it aloud, where a pull has many marks.");
        things.add(
                "Clean water for two rinses, drying air or lint-free cloth, clean gloves, eye protection, eye wash.");
        things.add("Degreaser: alkaline cleaner or acetone away from flames. No chlorinated solvent, no methanol.");
        if (plan.plan().cost().turns() > 0) {
            things.add("A way to grip either end: the piece is turned end for end "
                    + Figures.count(plan.plan().cost().turns(), "time") + ".");
        }
        return things;
    }

    /** The metal made ready, and the coupon. */
    static void prepare(Flow flow, BenchPlan plan) {
        Design design = plan.design();
        flow.need(110);
        flow.chapter("Prepare");
        flow.step("Finish and clean the piece");
        flow.act("Bring the piece and the coupons to the " + design.finish().key()
                + " finish. The finish changes the colour, so all get the same.");
        flow.act("Degrease, rinse, and watch the water run off: it must run as one sheet, with no drops or dry spots."
                + " Otherwise degrease again.");
        flow.act("From here on clean gloves only. A finger mark shows in the colour.");
        flow.act("Grip the piece in its holder: contact tight, same metal, dry for the top "
                + Figures.plain(design.holding().dryMm(), 1) + " mm. Keep the holder out of the bath.");
        if (!plan.plan().immersions().isEmpty()) {
            coupon(flow, plan);
        }
    }

    private static void coupon(Flow flow, BenchPlan plan) {
        Design design = plan.design();
        flow.step("Coupon first");
        Immersion first = plan.plan().immersions().get(0);
        int index = first.finishes().get(0);
        BenchBand band = plan.bands().get(index);
        boolean thickAtA = band.aSide().filmNm() >= band.bSide().filmNm();
        double volts = thickAtA ? band.aSideVolts() : band.bSideVolts();
        flow.act("Anodize a coupon in this bath at " + Figures.volts(volts, design.supply()) + " V, held "
                + Figures.plain(design.pull().holdS(), 0) + " s from the moment the volts are set. It should show "
                + Wording.colour(thickAtA ? band.aSide() : band.bSide()) + ", as band " + (index + 1) + " "
                + band.name() + " does.");
        chipLine(flow, thickAtA ? band.aSide().srgbHex() : band.bSide().srgbHex(), "the colour to expect");
        flow.act("If it shows another colour, do not start: fit the bath to coupons, plan again, print again.");
        flow.text(
                "The numbers of an unfitted bath are common practice and can be a tenth or two off; one coupon is worth"
                        + " more than any table.",
                11,
                false,
                9);
    }

    private static void chipLine(Flow flow, String hex, String words) {
        flow.need(11);
        flow.pen().chip(List.of(hex), flow.leftMm() + 9, flow.yMm(), 24, 8);
        flow.pen().words(words, flow.leftMm() + 36, flow.yMm() + 5.5, Flow.mm(11));
        flow.down(11.5);
    }
}
