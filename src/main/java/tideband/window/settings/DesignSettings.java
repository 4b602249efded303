package tideband.window.settings;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.DoubleFunction;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import tideband.design.Design;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Terms;

/**
 * Makes settings of the design. Each edit is a step of its own, named after what is set, and an edit the design does not
 * take is a fault and no step.
 *
 * @param drawing the drawing
 * @param comfort what suits the user
 */
record DesignSettings(DrawingModel drawing, ComfortModel comfort) {
    /** What is said where a design does not take an edit and no better reason is known. */
    static final String NOT_TAKEN = "cannot be set so in this design; undo the last edit or choose another value";

    Design design() {
        return drawing.design();
    }

    Measure length() {
        return Measure.length(comfort);
    }

    String text(double mm) {
        return comfort.unit().text(mm);
    }

    NumberSetting number(
            About about,
            Measure measure,
            Bounds bounds,
            ToDoubleFunction<Design> value,
            BiFunction<Design, Double, Design> edit) {
        return number(about, Terms.ALWAYS, measure, bounds, value, number -> "", edit);
    }

    NumberSetting number(
            About about,
            Terms terms,
            Measure measure,
            Bounds bounds,
            ToDoubleFunction<Design> value,
            DoubleFunction<String> wrong,
            BiFunction<Design, Double, Design> edit) {
        DoubleFunction<String> alsoWrong = number -> {
            String fault = wrong.apply(number);
            if (!fault.isEmpty() || value.applyAsDouble(design()) == number) {
                return fault;
            }
            return edit.apply(design(), number).equals(design()) ? NOT_TAKEN : "";
        };
        return new NumberSetting(
                about,
                terms,
                measure,
                bounds,
                () -> OptionalDouble.of(value.applyAsDouble(design())),
                alsoWrong,
                number -> drawing.change(stepName(about), design -> edit.apply(design, number)));
    }

    <T> ChoiceSetting<T> choice(
            About about,
            List<Choice<T>> choices,
            T usual,
            Function<Design, T> value,
            BiFunction<Design, T, Design> edit) {
        return choice(about, choices, Optional.of(usual), value, thing -> NOT_TAKEN, edit);
    }

    <T> ChoiceSetting<T> choice(
            About about,
            List<Choice<T>> choices,
            Optional<T> usual,
            Function<Design, T> value,
            Function<T, String> whyNotTaken,
            BiFunction<Design, T, Design> edit) {
        return new ChoiceSetting<>(
                about, Terms.ALWAYS, () -> choices, () -> usual, () -> Optional.of(value.apply(design())), thing -> {
                    // What is chosen already keeps its details, as a tube keeps its bore.
                    boolean taken = value.apply(design()).equals(thing)
                            || drawing.change(stepName(about), design -> edit.apply(design, thing));
                    return taken ? "" : whyNotTaken.apply(thing);
                });
    }

    static String stepName(About about) {
        return "Set " + about.thing();
    }
}
