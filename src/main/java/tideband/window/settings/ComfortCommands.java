package tideband.window.settings;

import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableValue;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.comfort.LengthUnit;

/** What the user can do from anywhere to be comfortable, and the way to the settings. */
final class ComfortCommands {
    private static final int TEXT_STEP = 25;

    private final ComfortModel comfort;
    private final Runnable goToSettings;

    ComfortCommands(ComfortModel comfort, Runnable goToSettings) {
        this.comfort = comfort;
        this.goToSettings = goToSettings;
    }

    List<Command> all() {
        ObservableBooleanValue always = new ReadOnlyBooleanWrapper(true);
        ObservableBooleanValue canGrow = Bindings.lessThan(comfort.textPercentProperty(), ComfortModel.LARGEST_TEXT);
        ObservableBooleanValue canShrink =
                Bindings.greaterThan(comfort.textPercentProperty(), ComfortModel.SMALLEST_TEXT);
        return List.of(
                view(
                        "bench-settings",
                        named("Bench settings"),
                        "F7",
                        "Goes to the settings of piece, metal, bath, supply, holder, vessel, hand and bench times.",
                        always,
                        goToSettings),
                view(
                        "larger-text",
                        named("Larger text"),
                        "Shortcut+plus",
                        "Makes everything larger, up to twice its size.",
                        canGrow,
                        () -> step(TEXT_STEP)),
                view(
                        "smaller-text",
                        named("Smaller text"),
                        "Shortcut+minus",
                        "Makes everything smaller, down to its plain size.",
                        canShrink,
                        () -> step(-TEXT_STEP)),
                view(
                        "plain-text",
                        named("Plain text size"),
                        "Shortcut+0",
                        "Shows everything at its plain size.",
                        canShrink,
                        () -> comfort.textPercentProperty().set(ComfortModel.SMALLEST_TEXT)),
                view(
                        "switch-unit",
                        Bindings.createStringBinding(
                                () -> comfort.unit() == LengthUnit.MILLIMETRE
                                        ? "Lengths in inches"
                                        : "Lengths in millimetres",
                                comfort.unitProperty()),
                        "Shortcut+U",
                        "Changes the unit lengths are shown and typed in.",
                        always,
                        () -> comfort.unitProperty()
                                .set(
                                        comfort.unit() == LengthUnit.MILLIMETRE
                                                ? LengthUnit.INCH
                                                : LengthUnit.MILLIMETRE)),
                view(
                        "switch-dark",
                        Bindings.when(comfort.darkProperty())
                                .then("Light window")
                                .otherwise("Dark window"),
                        "Shortcut+Shift+L",
                        "Changes between dark on light and light on dark.",
                        always,
                        () -> comfort.darkProperty().set(!comfort.darkProperty().get())),
                view(
                        "switch-sounds",
                        Bindings.when(comfort.mutedProperty()).then("Sounds on").otherwise("Sounds off"),
                        "Shortcut+Shift+U",
                        "Switches the sounds; everything they say is shown too.",
                        always,
                        () -> comfort.mutedProperty()
                                .set(!comfort.mutedProperty().get())));
    }

    private void step(int percent) {
        int next = comfort.textPercentProperty().get() + percent;
        comfort.textPercentProperty()
                .set(Math.min(Math.max(next, ComfortModel.SMALLEST_TEXT), ComfortModel.LARGEST_TEXT));
    }

    private static Command view(
            String id,
            ObservableValue<String> name,
            String key,
            String help,
            ObservableBooleanValue possible,
            Runnable act) {
        return new Command(id, Command.Menu.VIEW, name, key, help, possible, act);
    }

    private static ObservableValue<String> named(String name) {
        return new ReadOnlyStringWrapper(name);
    }
}
