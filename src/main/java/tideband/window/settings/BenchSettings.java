package tideband.window.settings;

import java.util.List;
import java.util.function.BiFunction;
import java.util.function.ToDoubleFunction;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.design.Order;
import tideband.edit.DesignEdits;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.Measure;
import tideband.window.entry.Setting;

/** What each act at the bench costs, and the rule for the order. */
final class BenchSettings {
    private BenchSettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Bench times",
                () -> make.design().order().key(),
                List.of(
                        minutes(
                                make,
                                new About(
                                        "immersion minutes",
                                        "Immersion",
                                        "One visit to the bath, without the pull itself."),
                                BenchTimes::immersionMin,
                                (t, min) ->
                                        new BenchTimes(min, t.maskMin(), t.maskOverMin(), t.stripMin(), t.turnMin())),
                        minutes(
                                make,
                                new About(
                                        "mask minutes",
                                        "Mask",
                                        "Masking one run of neighbouring bands before the first immersion."),
                                BenchTimes::maskMin,
                                (t, min) -> new BenchTimes(
                                        t.immersionMin(), min, t.maskOverMin(), t.stripMin(), t.turnMin())),
                        minutes(
                                make,
                                new About(
                                        "mask over minutes",
                                        "Mask over colour",
                                        "Masking one run after the first immersion: it then lies over fresh colour."),
                                BenchTimes::maskOverMin,
                                (t, min) ->
                                        new BenchTimes(t.immersionMin(), t.maskMin(), min, t.stripMin(), t.turnMin())),
                        minutes(
                                make,
                                new About("strip minutes", "Strip", "Taking one run of masking off."),
                                BenchTimes::stripMin,
                                (t, min) -> new BenchTimes(
                                        t.immersionMin(), t.maskMin(), t.maskOverMin(), min, t.turnMin())),
                        minutes(
                                make,
                                new About("turn minutes", "Turn", "Turning the piece end for end in its holder."),
                                BenchTimes::turnMin,
                                (t, min) -> new BenchTimes(
                                        t.immersionMin(), t.maskMin(), t.maskOverMin(), t.stripMin(), min)),
                        order(make)));
    }

    private static Setting minutes(
            DesignSettings make,
            About about,
            ToDoubleFunction<BenchTimes> value,
            BiFunction<BenchTimes, Double, BenchTimes> edit) {
        return make.number(
                about,
                new Measure.Plain("min", 3),
                Bounds.of(Limits.BENCH_MIN, value.applyAsDouble(BenchTimes.USUAL)),
                design -> value.applyAsDouble(design.bench()),
                (design, min) -> DesignEdits.bench(design, edit.apply(design.bench(), min)));
    }

    private static Setting order(DesignSettings make) {
        return make.choice(
                new About("order of immersions", "Order", "Which plans are looked for; the cheapest is taken."),
                List.of(
                        new Choice<>(
                                Order.THICKER_FIRST,
                                "Thicker first",
                                "The thickest new film never rises from one immersion to the next. The plan says how many"
                                        + " minutes the other order would save."),
                        new Choice<>(Order.LEAST_MINUTES, "Least minutes", "Any order; only the minutes count.")),
                Order.THICKER_FIRST,
                Design::order,
                DesignEdits::order);
    }
}
