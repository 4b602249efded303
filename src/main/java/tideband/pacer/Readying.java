package tideband.pacer;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Caution;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.sheet.Figures;

/** What is done before the clock goes: the hands are still free, the supply is off. */
final class Readying {
    private final PaceScript script;
    private final BenchPlan plan;
    private final Immersion immersion;
    private final Pull pull;

    Readying(PaceScript script) {
        this.script = script;
        this.plan = script.plan();
        this.immersion = plan.plan().immersions().get(script.immersion());
        this.pull = plan.pulls().get(script.immersion());
    }

    List<Step> steps() {
        List<Step> steps = new ArrayList<>();
        steps.add(new Step(
                "SUPPLY OFF", "Supply off, its meter at 0 V. Nothing is switched on before the clock says so."));
        cautions(steps);
        steps.add(new Step(
                "AIR AND EYES",
                "The air moves away from your face, no flame or spark near the bath. Goggles and clean dry gloves on;"
                        + " eye wash within reach. Bath stirred, at its temperature, cathode in place."));
        hang(steps);
        masks(steps);
        for (String note : script.notes()) {
            steps.add(new Step("KNOW THIS PULL", note));
        }
        ready(steps, 0);
        return steps;
    }

    /** The gravest, which the plan puts first, for itself; the others together. */
    private void cautions(List<Step> steps) {
        List<Caution> cautions = plan.cautions();
        if (cautions.isEmpty()) {
            return;
        }
        steps.add(new Step(cautions.get(0).heading(), cautions.get(0).text()));
        if (cautions.size() > 1) {
            steps.add(new Step(
                    "CAUTIONS",
                    cautions.subList(1, cautions.size()).stream()
                            .map(caution -> caution.heading() + ". " + caution.text())
                            .collect(Collectors.joining("\n"))));
        }
    }

    List<Step> stepsAgain(double fromS) {
        List<Step> steps = new ArrayList<>();
        steps.add(new Step("SUPPLY OFF", "Supply off, its meter at 0 V."));
        steps.add(masked());
        if (fromS > 0) {
            Moment moment = script.at(fromS);
            steps.add(new Step(
                    "GO ON AT " + Figures.clock(fromS),
                    "The pull goes on where it was broken off: mark "
                            + moment.now().mark().number() + ", " + moment.now().line() + ", "
                            + Figures.plain(moment.leftS(), 1)
                            + " s of it left. Wet the piece evenly first: rinse water"
                            + " must run off as one sheet."));
        }
        for (String note : script.notes()) {
            steps.add(new Step("KNOW THIS PULL", note));
        }
        ready(steps, fromS);
        return steps;
    }

    private void hang(List<Step> steps) {
        int index = script.immersion();
        String end = "End " + immersion.endDown() + " down";
        if (index == 0) {
            steps.add(new Step(
                    "HANG", "Hang the piece with end " + immersion.endDown() + " down, its contact tight and dry."));
        } else if (plan.plan().immersions().get(index - 1).endDown() != immersion.endDown()) {
            steps.add(new Step(
                    "TURN", "Turn the piece end for end: end " + immersion.endDown() + " goes down. Contact tight."));
        } else {
            steps.add(new Step("HANG", end + ", as before. Contact tight and dry."));
        }
    }

    private void masks(List<Step> steps) {
        for (Run run : immersion.strippedBefore()) {
            steps.add(new Step("STRIP", "Strip " + run(run) + ". Clean off all residue."));
        }
        for (Run run : immersion.maskedBefore()) {
            steps.add(new Step("MASK", "Mask " + run(run) + ". Press the edges down."));
        }
        steps.add(masked());
    }

    private Step masked() {
        if (immersion.masked().isEmpty()) {
            return new Step("CHECK: NO MASK", "Nothing is masked now.");
        }
        String bands = immersion.masked().stream()
                .map(i -> (i + 1) + " " + plan.bands().get(i).name())
                .collect(Collectors.joining(", "));
        return new Step("CHECK MASKS", "Masked now are " + bands + ", and nothing else.");
    }

    /** The same words as on the step sheet. */
    private String run(Run run) {
        BenchBand first = plan.bands().get(run.first());
        BenchBand last = plan.bands().get(run.last());
        String names = run.first() == run.last()
                ? "band " + (run.first() + 1) + " " + first.name()
                : "bands " + (run.first() + 1) + " " + first.name() + " to " + (run.last() + 1) + " " + last.name();
        return names + " (" + Figures.plain(first.fromMm(), 1) + " to " + Figures.plain(last.toMm(), 1)
                + " mm from end A)";
    }

    private void ready(List<Step> steps, double fromS) {
        Moment moment = script.at(fromS);
        String depth = Figures.fixed(moment.setting().depthMm(), 1) + " mm";
        steps.add(new Step(
                "LOWER to " + depth,
                "Supply still off. Lower the piece until the gauge for immersion " + (script.immersion() + 1)
                        + " reads " + depth + "."));
        steps.add(new Step("SET THE SUPPLY", dial(moment)));
        steps.add(new Step(
                "HANDS CLEAR",
                "Guard closed, hands clear of bath, piece and leads, one hand at the switch. When you confirm, the"
                        + " count-in starts, and then the first call: " + first(moment)));
    }

    private String dial(Moment moment) {
        String limit = "Output still off. Current limit at " + Figures.plain(pull.currentLimitAmps(), 3) + " A, ";
        String expect = " Expect up to " + Figures.plain(pull.peakAmps(), 3) + " A.";
        Row.Act act = moment.now().mark().row().act();
        if (act == Row.Act.FOLLOW) {
            return "Output still off. Volts and current limit as the note for this fade says; its meter will show "
                    + Figures.fixed(moment.setting().volts(), 1) + " V.";
        }
        if (!moment.live()) {
            return limit + "volts at 0." + expect;
        }
        String volts = Figures.volts(moment.setting().volts(), plan.design().supply());
        return limit + "volts dialled to " + volts + " V." + expect;
    }

    private static String first(Moment moment) {
        boolean supplyFirst = moment.live() && !moment.now().words().startsWith("ON");
        return (supplyFirst ? "supply ON, volts " + moment.volts() + ", " : "")
                + moment.now().line() + ".";
    }
}
