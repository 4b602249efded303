package tideband.window.settings;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tideband.design.Range;
import tideband.window.comfort.ComfortModel;
import tideband.window.comfort.LengthUnit;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.SwitchSetting;
import tideband.window.entry.Terms;

/** What makes the window comfortable; none of it is part of the design, so none of it is a step to undo. */
final class ComfortSettings {
    private ComfortSettings() {}

    static Group of(ComfortModel comfort) {
        return new Group(
                "Comfort",
                () -> comfort.unit().symbol() + ", "
                        + comfort.textPercentProperty().get() + " %",
                List.of(unit(comfort), text(comfort), dark(comfort), sounds(comfort)));
    }

    private static ChoiceSetting<LengthUnit> unit(ComfortModel comfort) {
        List<Choice<LengthUnit>> units = List.of(
                new Choice<>(
                        LengthUnit.MILLIMETRE, "Millimetres", "Lengths in mm; either unit may be typed with its sign."),
                new Choice<>(LengthUnit.INCH, "Inches", "Lengths in inches of 25.4 mm; films stay in nm."));
        return new ChoiceSetting<>(
                new About("unit of length", "Lengths", "The unit lengths are shown and typed in."),
                Terms.ALWAYS,
                () -> units,
                () -> Optional.of(LengthUnit.MILLIMETRE),
                () -> Optional.of(comfort.unit()),
                unit -> {
                    comfort.unitProperty().set(unit);
                    return "";
                });
    }

    private static NumberSetting text(ComfortModel comfort) {
        return new NumberSetting(
                new About("size of text", "Size of text", "Everything grows with it."),
                Terms.ALWAYS,
                new Measure.Plain("%", 0),
                Bounds.of(new Range(ComfortModel.SMALLEST_TEXT, ComfortModel.LARGEST_TEXT), ComfortModel.SMALLEST_TEXT),
                () -> OptionalDouble.of(comfort.textPercentProperty().get()),
                percent -> percent == Math.rint(percent) ? "" : "must be a whole number",
                percent -> comfort.textPercentProperty().set((int) percent));
    }

    private static SwitchSetting dark(ComfortModel comfort) {
        return new SwitchSetting(
                new About("dark window", "Dark window", "Light on dark, for a dim workshop."),
                Terms.ALWAYS,
                false,
                comfort.darkProperty()::get,
                comfort.darkProperty()::set);
    }

    private static SwitchSetting sounds(ComfortModel comfort) {
        return new SwitchSetting(
                new About("sounds", "Sounds", "Sounds while pacing a pull; everything they say is shown too."),
                Terms.ALWAYS,
                true,
                () -> !comfort.mutedProperty().get(),
                on -> comfort.mutedProperty().set(!on));
    }
}
