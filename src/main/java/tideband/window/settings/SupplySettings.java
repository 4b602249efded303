package tideband.window.settings;

import java.util.List;
import java.util.OptionalDouble;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.oxide.Supply;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Measure;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;

/** What the power supply can do. */
final class SupplySettings {
    private static final String VOLT = "V";

    private SupplySettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Supply",
                () -> new Measure.Plain(VOLT, 3).number(make.design().supply().maxVolts()) + " V, "
                        + new Measure.Plain("A", 3)
                                .number(make.design().supply().maxAmps()) + " A",
                List.of(maxVolts(make), maxAmps(make), dial(make), slew(make)));
    }

    private static Setting maxVolts(DesignSettings make) {
        return make.number(
                new About(
                        "supply volts",
                        "Highest volts",
                        "What the supply gives at most. The bath's ceiling counts too; the lower of the two is kept."),
                Terms.ALWAYS,
                new Measure.Plain(VOLT, 3),
                Bounds.of(Limits.SUPPLY_VOLTS, Supply.USUAL.maxVolts()),
                design -> design.supply().maxVolts(),
                volts -> volts < make.design().supply().dialVolts()
                        ? "must be at least one step of the dial, "
                                + new Measure.Plain(VOLT, 3)
                                        .number(make.design().supply().dialVolts())
                                + " V"
                        : "",
                (design, volts) -> {
                    Supply old = design.supply();
                    return set(design, new Supply(volts, old.maxAmps(), old.dialVolts(), old.slewVoltsPerS()));
                });
    }

    private static Setting maxAmps(DesignSettings make) {
        return make.number(
                new About(
                        "supply amps",
                        "Current limit",
                        "Up to here the supply holds its set volts; beyond, it holds this current and the volts sag."),
                new Measure.Plain("A", 3),
                Bounds.of(Limits.SUPPLY_AMPS, Supply.USUAL.maxAmps()),
                design -> design.supply().maxAmps(),
                (design, amps) -> {
                    Supply old = design.supply();
                    return set(design, new Supply(old.maxVolts(), amps, old.dialVolts(), old.slewVoltsPerS()));
                });
    }

    private static Setting dial(DesignSettings make) {
        return make.number(
                new About("dial step", "Dial step", "The smallest step of volts its dial can be set by."),
                Terms.ALWAYS,
                new Measure.Plain(VOLT, 3),
                Bounds.of(Limits.DIAL_VOLTS, Supply.USUAL.dialVolts()),
                design -> design.supply().dialVolts(),
                volts -> volts > make.design().supply().maxVolts()
                        ? "must not be above the supply's highest volts, "
                                + new Measure.Plain(VOLT, 3)
                                        .number(make.design().supply().maxVolts())
                                + " V"
                        : "",
                (design, volts) -> {
                    Supply old = design.supply();
                    return set(design, new Supply(old.maxVolts(), old.maxAmps(), volts, old.slewVoltsPerS()));
                });
    }

    private static Setting slew(DesignSettings make) {
        return make.number(
                new About(
                        "supply slew",
                        "Fastest change",
                        "How fast its volts can change. Type jumps where they follow the dial at once."),
                new Measure.Plain("V/s", 3),
                new Bounds(
                        () -> Limits.SLEW_VOLTS_PER_S, () -> OptionalDouble.of(Supply.USUAL.slewVoltsPerS()), "jumps"),
                design -> design.supply().slewVoltsPerS(),
                (design, slew) -> {
                    Supply old = design.supply();
                    return set(design, new Supply(old.maxVolts(), old.maxAmps(), old.dialVolts(), slew));
                });
    }

    private static Design set(Design design, Supply supply) {
        return DesignEdits.supply(design, supply);
    }
}
