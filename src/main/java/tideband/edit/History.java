package tideband.edit;

import java.util.Optional;
import tideband.design.Design;

/**
 * A design with everything that led to it and everything undone since: undo without end. Immutable.
 *
 * <p>Designs are values, so "changed since saved" is a comparison of designs and cannot be fooled by the way there.
 */
public final class History {

    // A step of a linked list.
    private record Step(String name, String gesture, Design before, Design after, Step earlier) {}

    private final Design design;
    private final Step done;
    private final Step undone;

    private History(Design design, Step done, Step undone) {
        this.design = design;
        this.done = done;
        this.undone = undone;
    }

    /**
     * A history that begins.
     *
     * @param design the design it begins with
     * @return the history, with nothing to undo
     */
    public static History of(Design design) {
        return new History(design, null, null);
    }

    /**
     * The design as it stands.
     *
     * @return the design
     */
    public Design design() {
        return design;
    }

    /**
     * Takes an edit in as a step of its own.
     *
     * @param name what the edit is, as a menu says it after "Undo"
     * @param after the design after it
     * @return the history with it; the same history if the edit changed nothing
     */
    public History with(String name, Design after) {
        return with(name, "", after);
    }

    /**
     * Takes an edit in; those of one gesture, such as all movements of a drag, are one step together.
     *
     * @param name what the edit is, as a menu says it after "Undo"
     * @param gesture tells gestures apart; empty for an edit that is a step of its own
     * @param after the design after it
     * @return the history with it; a gesture that ends where it began leaves no step
     */
    public History with(String name, String gesture, Design after) {
        if (after.equals(design)) {
            return this;
        }
        if (done != null && undone == null && !gesture.isEmpty() && done.gesture.equals(gesture)) {
            return after.equals(done.before)
                    ? new History(after, done.earlier, null)
                    : new History(after, new Step(name, gesture, done.before, after, done.earlier), null);
        }
        return new History(after, new Step(name, gesture, design, after, done), null);
    }

    /**
     * What undo would take back.
     *
     * @return the name of the last step, where there is one
     */
    public Optional<String> undoName() {
        return Optional.ofNullable(done).map(Step::name);
    }

    /**
     * What redo would bring back.
     *
     * @return the name of the step last undone, where there is one
     */
    public Optional<String> redoName() {
        return Optional.ofNullable(undone).map(Step::name);
    }

    /**
     * Takes the last step back.
     *
     * @return the history before it; the same where there is no step
     */
    public History undo() {
        if (done == null) {
            return this;
        }
        return new History(
                done.before, done.earlier, new Step(done.name, done.gesture, done.before, done.after, undone));
    }

    /**
     * Brings back the step last undone.
     *
     * @return the history after it; the same where there is none
     */
    public History redo() {
        if (undone == null) {
            return this;
        }
        return new History(
                undone.after, new Step(undone.name, undone.gesture, undone.before, undone.after, done), undone.earlier);
    }
}
