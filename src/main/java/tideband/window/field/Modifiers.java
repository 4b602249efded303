package tideband.window.field;

/**
 * The keys held down while a hand draws.
 *
 * @param shift all that follows moves with an edge; films go by steps of the supply's dial
 * @param shortcut more is selected; snapping is off while dragging
 * @param alt snapping is off while dragging
 */
public record Modifiers(boolean shift, boolean shortcut, boolean alt) {
    /** No key held down. */
    public static final Modifiers NONE = new Modifiers(false, false, false);

    boolean snapping() {
        return !shortcut && !alt;
    }
}
