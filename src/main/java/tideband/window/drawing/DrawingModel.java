package tideband.window.drawing;

import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.design.Design;
import tideband.edit.History;
import tideband.edit.Selection;

/** The drawing, its history and its selection. To be used on one thread. */
public final class DrawingModel {
    private final ReadOnlyObjectWrapper<Design> design = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyObjectWrapper<Selection> selection = new ReadOnlyObjectWrapper<>(Selection.NONE);
    private final ReadOnlyStringWrapper undoName = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper redoName = new ReadOnlyStringWrapper("");
    private History history;
    private long gestures;

    /**
     * A drawing to begin with.
     *
     * @param design the design
     */
    public DrawingModel(Design design) {
        open(design);
    }

    /**
     * Replaces the drawing by another, with a history of its own.
     *
     * @param other the design
     */
    public void open(Design other) {
        selection.set(Selection.NONE);
        show(History.of(other));
    }

    /**
     * The design as it stands.
     *
     * @return a property that changes with every edit
     */
    public ReadOnlyObjectProperty<Design> designProperty() {
        return design.getReadOnlyProperty();
    }

    /**
     * The design as it stands.
     *
     * @return the design
     */
    public Design design() {
        return design.get();
    }

    /**
     * What is selected.
     *
     * @return a property; its bands are always in the design
     */
    public ReadOnlyObjectProperty<Selection> selectionProperty() {
        return selection.getReadOnlyProperty();
    }

    /**
     * What is selected.
     *
     * @return the selection
     */
    public Selection selection() {
        return selection.get();
    }

    /**
     * Selects.
     *
     * @param other what is selected from now on
     */
    public void select(Selection other) {
        selection.set(other.within(design().bands().size()));
    }

    /**
     * Edits the drawing in one step.
     *
     * @param name what the edit is, as a menu says it after "Undo": "Move edge"
     * @param edit from the design as it stands to the design as it shall be
     * @return whether the edit changed anything
     */
    public boolean change(String name, UnaryOperator<Design> edit) {
        return change(name, "", edit);
    }

    /**
     * Edits the drawing as a part of a gesture, which is one step as a whole.
     *
     * @param name what the edit is, as a menu says it after "Undo"
     * @param gesture from {@link #newGesture()}
     * @param edit from the design as it stands to the design as it shall be
     * @return whether the edit changed anything
     */
    public boolean change(String name, String gesture, UnaryOperator<Design> edit) {
        History before = history;
        show(history.with(name, gesture, edit.apply(design())));
        return history != before;
    }

    /**
     * Begins a gesture, such as a drag.
     *
     * @return what tells it apart from all others
     */
    public String newGesture() {
        gestures++;
        return "gesture " + gestures;
    }

    /** Takes the last step back, if there is one. */
    public void undo() {
        show(history.undo());
    }

    /** Brings back the step last undone, if there is one. */
    public void redo() {
        show(history.redo());
    }

    /**
     * What undo would take back.
     *
     * @return its name; empty if there is nothing to undo
     */
    public ReadOnlyStringProperty undoNameProperty() {
        return undoName.getReadOnlyProperty();
    }

    /**
     * What redo would bring back.
     *
     * @return its name; empty if there is nothing to redo
     */
    public ReadOnlyStringProperty redoNameProperty() {
        return redoName.getReadOnlyProperty();
    }

    private void show(History next) {
        history = next;
        // First what is no longer there leaves the selection, so that no listener sees a band that is not in the
        // design.
        int fewer = design.get() == null
                ? 0
                : Math.min(design.get().bands().size(), next.design().bands().size());
        selection.set(selection.get().within(fewer));
        design.set(next.design());
        undoName.set(next.undoName().orElse(""));
        redoName.set(next.redoName().orElse(""));
    }
}
