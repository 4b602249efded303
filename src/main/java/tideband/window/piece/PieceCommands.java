package tideband.window.piece;

import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableValue;
import tideband.window.action.Command;
import tideband.window.work.TiltModel;

/** What the user can do with the picture of the piece. */
final class PieceCommands {
    private final PieceModel model;

    /**
     * The commands of a model.
     *
     * @param model the model
     */
    PieceCommands(PieceModel model) {
        this.model = model;
    }

    /**
     * All of them, in the order of their menu.
     *
     * @return the commands
     */
    List<Command> all() {
        DoubleProperty tilt = model.tiltDegProperty();
        ObservableBooleanValue always = new SimpleBooleanProperty(true);
        return List.of(
                view(
                        "tilt-more",
                        plain("Tilt more"),
                        "Alt+Page Up",
                        "Tilts the piece by 5 degrees more; its colours change as the real ones do.",
                        tilt.lessThan(TiltModel.MOST_DEG),
                        () -> tilt.set(Math.min(TiltModel.MOST_DEG, tilt.get() + PieceModel.TILT_STEP_DEG))),
                view(
                        "tilt-less",
                        plain("Tilt less"),
                        "Alt+Page Down",
                        "Tilts the piece by 5 degrees less.",
                        tilt.greaterThan(0),
                        () -> tilt.set(Math.max(0, tilt.get() - PieceModel.TILT_STEP_DEG))),
                view(
                        "tilt-none",
                        plain("Straight on"),
                        "Alt+Home",
                        "Shows the piece straight on, as colours are planned.",
                        tilt.greaterThan(0),
                        () -> tilt.set(0)),
                view(
                        "compare-next",
                        Bindings.createStringBinding(
                                () -> "Show piece: "
                                        + model.comparisonProperty()
                                                .get()
                                                .next()
                                                .text(),
                                model.comparisonProperty()),
                        "Alt+C",
                        "Shows the colours predicted, then those wanted, then both, one above the other.",
                        always,
                        () -> model.comparisonProperty()
                                .set(model.comparisonProperty().get().next())),
                view(
                        "lamps-next",
                        Bindings.createStringBinding(
                                () -> "Light piece: "
                                        + model.lampsProperty().get().next().text(),
                                model.lampsProperty()),
                        "Alt+L",
                        "Lights the piece evenly, then with one lamp, then with two.",
                        always,
                        () -> model.lampsProperty()
                                .set(model.lampsProperty().get().next())),
                view(
                        "difference",
                        Bindings.when(model.differenceShownProperty())
                                .then("Hide difference")
                                .otherwise("Show difference"),
                        "Alt+D",
                        "Shows or hides the difference between wanted and predicted along the piece, in dE00.",
                        always,
                        () -> model.differenceShownProperty()
                                .set(!model.differenceShownProperty().get())));
    }

    private static ObservableValue<String> plain(String name) {
        return new SimpleStringProperty(name);
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
}
