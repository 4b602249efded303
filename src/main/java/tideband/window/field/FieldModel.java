package tideband.window.field;

import java.util.List;
import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyLongProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.value.ObservableValue;
import tideband.edit.Selection;
import tideband.match.Match;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.drawing.Viewport;
import tideband.window.work.Glance;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/**
 * Decides all about the field: what of the drawing is in view, what can be taken hold of where, what hand and keyboard do
 * to the drawing, and what is said about it. All places are in px from the field's upper left corner.
 */
public final class FieldModel {
    private final FieldState state;
    private final FieldShown shown;
    private final FieldHand hand;
    private final FieldSight sight;
    private final FieldKeyboard keyboard;
    private final FieldEdits edits;
    private final Nudges nudges;
    private final ObjectProperty<Runnable> exactValues = new SimpleObjectProperty<>(() -> {});
    private final ReadOnlyStringWrapper spoken = new ReadOnlyStringWrapper();

    /**
     * A field over a drawing.
     *
     * @param drawing the drawing
     * @param work its colours and volts
     * @param tilt the colours as seen
     * @param comfort unit of length and size of text
     * @param matches films that come near a wanted colour, to be marked
     * @param take told of the mark that is clicked
     * @param glance the immersion pointed at
     * @param faulty indices of bands that cannot be made
     */
    public FieldModel(
            DrawingModel drawing,
            WorkModel work,
            TiltModel tilt,
            ComfortModel comfort,
            ObservableValue<List<Match>> matches,
            Consumer<Match> take,
            ObservableValue<Optional<Glance>> glance,
            ObservableValue<List<Integer>> faulty) {
        this.state = new FieldState(drawing, work, tilt, comfort);
        this.shown = new FieldShown(state, matches, glance, faulty);
        this.nudges = new Nudges(state);
        this.edits = new FieldEdits(state);
        this.hand = new FieldHand(state, shown, edits, nudges, take);
        this.sight = new FieldSight(state);
        this.keyboard = new FieldKeyboard(state, nudges);
        drawing.designProperty().addListener((value, before, after) -> {
            // What could not be done was said of the drawing as it was.
            state.say("");
            designChanged();
        });
        drawing.selectionProperty().addListener((value, before, after) -> selectionChanged(before, after));
        work.coloursProperty().addListener((value, before, after) -> {
            designChanged();
            state.changed(Layer.GROUND);
        });
        tilt.paletteProperty().addListener((value, before, after) -> state.changed(Layer.GROUND));
        state.viewport.addListener((value, before, after) -> hand.viewChanged());
        state.scale.addListener((value, before, after) -> hand.viewChanged());
        comfort.unitProperty().addListener((value, before, after) -> {
            state.changed(Layer.GROUND);
            spoken.set(speak());
        });
        comfort.textPercentProperty().addListener((value, before, after) -> designChanged());
        spoken.set(speak());
    }

    private void designChanged() {
        state.designChanged();
        hand.designChanged();
        spoken.set(speak());
    }

    private void selectionChanged(Selection before, Selection after) {
        if (!before.focus().equals(after.focus())) {
            state.say("");
            nudges.pause();
        }
        spoken.set(speak());
        state.changed(Layer.DRAWING);
        state.changed(Layer.OVERLAY);
    }

    private static String counted(int bands) {
        return bands == 1 ? "1 band" : bands + " bands";
    }

    private String speak() {
        return state.focus()
                .filter(p -> p.band() < state.design().bands().size())
                .map(p -> state.words.part(state.design(), state.films(), p))
                .orElse(state.design().title() + ", "
                        + counted(state.design().bands().size()) + ". Press Page Down to go to the first.");
    }

    /**
     * The stretch of the piece in view; the view of the piece below shares it.
     *
     * @return a property that is never null
     */
    public ReadOnlyObjectProperty<Viewport> viewportProperty() {
        return state.viewport.getReadOnlyProperty();
    }

    /**
     * The films in view.
     *
     * @return a property that is never null
     */
    public ReadOnlyObjectProperty<NmScale> scaleProperty() {
        return state.scale.getReadOnlyProperty();
    }

    /**
     * What is under the hand or being moved, in numbers.
     *
     * @return a property, empty when there is nothing to read
     */
    public ReadOnlyStringProperty readingProperty() {
        return state.reading.getReadOnlyProperty();
    }

    /**
     * What could not be done, why, and what to do; empty when all went well.
     *
     * @return a property
     */
    public ReadOnlyStringProperty messageProperty() {
        return state.message.getReadOnlyProperty();
    }

    /**
     * The part that has the focus with its numbers, for those who do not see it.
     *
     * @return a property that changes with focus and drawing
     */
    public ReadOnlyStringProperty spokenProperty() {
        return spoken.getReadOnlyProperty();
    }

    /**
     * What opens the exact values of what has the focus, as Enter does.
     *
     * @return a property to be set by who has such a form
     */
    public ObjectProperty<Runnable> exactValuesProperty() {
        return exactValues;
    }

    /**
     * Counts the changes of a layer.
     *
     * @param layer the layer
     * @return a property that rises whenever the layer must be painted anew
     */
    public ReadOnlyLongProperty changesProperty(Layer layer) {
        return state.changes(layer).getReadOnlyProperty();
    }

    /**
     * What is shown, and where.
     *
     * @return what a view paints
     */
    public FieldShown shown() {
        return shown;
    }

    /**
     * What the hand does.
     *
     * @return the hand
     */
    public FieldHand hand() {
        return hand;
    }

    /**
     * How near it is looked at.
     *
     * @return the sight
     */
    public FieldSight sight() {
        return sight;
    }

    /**
     * What the keyboard does.
     *
     * @return the keyboard
     */
    public FieldKeyboard keyboard() {
        return keyboard;
    }

    /**
     * Edits of what is selected.
     *
     * @return the edits
     */
    public FieldEdits edits() {
        return edits;
    }

    /** Opens the exact values of what is selected. */
    public void openExactValues() {
        exactValues.get().run();
    }

    /**
     * Everything the user can do here, for the menus.
     *
     * @return the commands
     */
    public List<Command> commands() {
        return FieldCommands.of(this);
    }
}
