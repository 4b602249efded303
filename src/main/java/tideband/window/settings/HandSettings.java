package tideband.window.settings;

import java.util.List;
import tideband.design.Design;
import tideband.design.FadeStyle;
import tideband.design.Limits;
import tideband.design.PullSettings;
import tideband.edit.DesignEdits;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.Measure;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;

/** How the piece is drawn out. */
final class HandSettings {
    private HandSettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Hand and fades",
                () -> make.design().pull().fade().key(),
                List.of(fade(make), step(make), slowest(make), fastest(make), hold(make)));
    }

    private static Setting fade(DesignSettings make) {
        return make.choice(
                new About("fade style", "Fades", "How a fade is pulled."),
                List.of(
                        new Choice<>(
                                FadeStyle.RAMPED,
                                "Ramped",
                                "The hand draws evenly and the volts change with time: for a supply that follows a table."),
                        new Choice<>(
                                FadeStyle.FIXED_VOLTS,
                                "Fixed volts",
                                "The volts stay, the current limit is the throttle, and the depth changes with time."),
                        new Choice<>(
                                FadeStyle.STEPPED,
                                "Stepped",
                                "Steps of the dial at marks, as many as keep neighbouring steps alike to the eye.")),
                PullSettings.USUAL.fade(),
                design -> design.pull().fade(),
                (design, fade) -> {
                    PullSettings old = design.pull();
                    return set(
                            design,
                            new PullSettings(
                                    old.holdS(), fade, old.stepDe00(), old.slowestMmPerS(), old.fastestMmPerS()));
                });
    }

    private static Setting step(DesignSettings make) {
        return make.number(
                new About(
                        "largest step of a fade",
                        "Largest step",
                        "Of a stepped fade: the most neighbouring steps may differ (CIEDE2000). Less is smoother and takes"
                                + " more steps."),
                new Measure.Plain("dE00", 3),
                Bounds.of(Limits.STEP_DE00, PullSettings.USUAL.stepDe00()),
                design -> design.pull().stepDe00(),
                (design, step) -> {
                    PullSettings old = design.pull();
                    return set(
                            design,
                            new PullSettings(old.holdS(), old.fade(), step, old.slowestMmPerS(), old.fastestMmPerS()));
                });
    }

    private static Setting slowest(DesignSettings make) {
        return make.number(
                new About("slowest hand", "Slowest hand", "The slowest your hand, or your hoist, draws steadily."),
                Terms.ALWAYS,
                Measure.speed(make.comfort()),
                Bounds.of(Limits.HAND_MM_PER_S, PullSettings.USUAL.slowestMmPerS()),
                design -> design.pull().slowestMmPerS(),
                speed -> speed < make.design().pull().fastestMmPerS()
                        ? ""
                        : "must be below the fastest, "
                                + speedText(make, make.design().pull().fastestMmPerS()),
                (design, speed) -> {
                    PullSettings old = design.pull();
                    return set(
                            design,
                            new PullSettings(old.holdS(), old.fade(), old.stepDe00(), speed, old.fastestMmPerS()));
                });
    }

    private static Setting fastest(DesignSettings make) {
        return make.number(
                new About("fastest hand", "Fastest hand", "The fastest your hand, or your hoist, draws steadily."),
                Terms.ALWAYS,
                Measure.speed(make.comfort()),
                Bounds.of(Limits.HAND_MM_PER_S, PullSettings.USUAL.fastestMmPerS()),
                design -> design.pull().fastestMmPerS(),
                speed -> speed > make.design().pull().slowestMmPerS()
                        ? ""
                        : "must be above the slowest, "
                                + speedText(make, make.design().pull().slowestMmPerS()),
                (design, speed) -> {
                    PullSettings old = design.pull();
                    return set(
                            design,
                            new PullSettings(old.holdS(), old.fade(), old.stepDe00(), old.slowestMmPerS(), speed));
                });
    }

    private static Setting hold(DesignSettings make) {
        return make.number(
                new About(
                        "hold",
                        "Hold",
                        "How long a level is held from the moment its volts are first set. Longer holds grow a little more."),
                new Measure.Plain("s", 3),
                Bounds.of(Limits.HOLD_S, PullSettings.USUAL.holdS()),
                design -> design.pull().holdS(),
                (design, seconds) -> {
                    PullSettings old = design.pull();
                    return set(
                            design,
                            new PullSettings(
                                    seconds, old.fade(), old.stepDe00(), old.slowestMmPerS(), old.fastestMmPerS()));
                });
    }

    private static String speedText(DesignSettings make, double mmPerS) {
        Measure speed = Measure.speed(make.comfort());
        return speed.number(mmPerS) + " " + speed.symbol();
    }

    private static Design set(Design design, PullSettings pull) {
        return DesignEdits.pull(design, pull);
    }
}
