package tideband.window.order;

import java.util.List;
import java.util.stream.Collectors;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.piece.End;
import tideband.plan.Run;
import tideband.pull.Pull;

/** What the cards say. */
final class CardWords {
    private final BenchPlan plan;
    private final BenchFigures figures;

    // What one card says: a headline, a few figures, and a sentence without its full stop.
    record Said(String headline, List<String> figures, String sentence) {}

    CardWords(BenchPlan plan, BenchFigures figures) {
        this.plan = plan;
        this.figures = figures;
    }

    Said turn(End down) {
        return new Said(
                "Turn",
                List.of("end " + down + " down"),
                "turn the piece end for end, so that end " + down + " goes down");
    }

    Said strip(Run run) {
        return new Said("Strip", names(run), "strip " + full(run) + " and clean off all residue");
    }

    Said mask(Run run) {
        return new Said("Mask", names(run), "mask " + full(run) + " and press the edges down");
    }

    Said stripAll(List<Run> runs) {
        String names = runs.stream().map(run -> names(run).get(0)).collect(Collectors.joining("; "));
        return new Said(
                "Strip all",
                List.of(names, "rinse, dry, look"),
                "strip " + runs.stream().map(this::full).collect(Collectors.joining("; "))
                        + ", clean, rinse, dry and look");
    }

    Said inTheBath(Stage stage, Pull pull, End down) {
        // At the end the meniscus still holds on while the gauge is already above its zero.
        String depth = stage.toLineMm() == 0 ? "out" : figures.depth(stage.toDepthMm());
        String depths = stage.toLineMm() == 0
                ? figures.depth(stage.fromDepthMm()) + " \u2192 out"
                : figures.depths(stage.fromDepthMm(), stage.toDepthMm());
        String volts = figures.volts(stage.toVolts());
        String range = figures.volts(stage.fromVolts(), stage.toVolts());
        String seconds = BenchFigures.seconds(stage.seconds());
        String limit = BenchFigures.amps(pull.currentLimitAmps());
        String before = stage.drawS() == 0 ? "" : drawn(stage, stage.fromDepthMm()) + ", then ";
        return switch (stage.kind()) {
            case DIP ->
                new Said(
                        "Dip",
                        List.of(depth, "supply off", "limit " + limit),
                        "dip with end " + down + " down to " + depth + ", supply off, current limit set to " + limit);
            case HOLD -> hold(stage, depth, volts, seconds);
            case HOLDS ->
                new Said(
                        stage.holds() + " holds",
                        List.of(depths, range, seconds),
                        stage.holds() + " holds, drawn out with the supply off between them, from "
                                + figures.depth(stage.fromDepthMm()) + " at " + figures.volts(stage.fromVolts())
                                + " to "
                                + depth + " at " + volts + ", " + seconds + " in all");
            case FADE ->
                new Said(
                        "Fade",
                        List.of(depths, range, seconds),
                        before + "draw out evenly from " + figures.depth(stage.fromDepthMm()) + " to " + depth
                                + " while volts go from " + figures.volts(stage.fromVolts()) + " to " + volts + ", "
                                + seconds);
            case FOLLOW ->
                new Said(
                        "Follow",
                        List.of(depths, BenchFigures.meter(stage.fromVolts(), stage.toVolts()), seconds),
                        before + "draw out from " + figures.depth(stage.fromDepthMm()) + " to " + depth
                                + " so that each mark is passed at its time, the meter climbing from "
                                + figures.volts(stage.fromVolts()) + " to " + volts + ", " + seconds);
            case LIFT ->
                new Said(
                        "Lift out",
                        List.of("supply off", "rinse, dry"),
                        "supply off, lift the piece out in " + seconds + ", rinse and dry it");
            case TURN, STRIP, MASK, STRIP_ALL ->
                throw new IllegalArgumentException("no act in the bath: " + stage.kind());
        };
    }

    private String drawn(Stage stage, double toDepthMm) {
        return "supply off, draw out to " + figures.depth(toDepthMm) + " in " + BenchFigures.seconds(stage.drawS());
    }

    private Said hold(Stage stage, String depth, String volts, String seconds) {
        boolean drawn = stage.drawS() > 0;
        String set = stage.raiseS() > 0
                ? "raise evenly to " + volts + " in " + BenchFigures.seconds(stage.raiseS())
                : "set " + volts;
        String how = drawn ? drawn(stage, stage.toDepthMm()) + ", then " + set : "at " + depth + ", " + set;
        return new Said(
                drawn ? "Draw, hold" : "Hold", List.of(depth, volts, seconds), how + " and hold for " + seconds);
    }

    private List<String> names(Run run) {
        BenchBand first = plan.bands().get(run.first());
        BenchBand last = plan.bands().get(run.last());
        String names = run.first() == run.last()
                ? first.name()
                : first.name() + (run.last() == run.first() + 1 ? ", " : " to ") + last.name();
        return List.of(names, figures.depths(first.fromMm(), last.toMm()).replace(" \u2192 ", " \u2013 "));
    }

    private String full(Run run) {
        BenchBand first = plan.bands().get(run.first());
        BenchBand last = plan.bands().get(run.last());
        String names = run.first() == run.last()
                ? first.name()
                : first.name() + (run.last() == run.first() + 1 ? " and " : " to ") + last.name();
        return names + ", " + figures.depth(first.fromMm()) + " to " + figures.depth(last.toMm()) + " from end A";
    }
}
