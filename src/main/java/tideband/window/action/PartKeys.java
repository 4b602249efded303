package tideband.window.action;

import java.util.List;
import javafx.scene.input.KeyCombination;

/**
 * Keys that work only while a part of the window has the focus.
 *
 * @param part where, as a heading
 * @param keys what they do there, in the order they are learnt
 */
public record PartKeys(String part, List<Does> keys) {

    /**
     * What a key does.
     *
     * @param keys the keys as they are written on the keyboard; more than one where they do the same two ways
     * @param does a sentence
     */
    public record Does(List<String> keys, String does) {

        // One key.
        Does(String key, String does) {
            this(List.of(key), does);
        }

        // A key and the one that does it the other way.
        Does(String key, String other, String does) {
            this(List.of(key, other), does);
        }
    }

    /** Copies the list, so that the value cannot change. */
    public PartKeys {
        keys = List.copyOf(keys);
    }

    /**
     * The parts that have keys of their own.
     *
     * @return from the drawing to the pacer
     */
    public static List<PartKeys> all() {
        return List.of(everywhere(), field(), piece(), order(), pacer());
    }

    private static PartKeys everywhere() {
        return new PartKeys(
                "Everywhere",
                List.of(
                        new Does("Tab", "Goes to the next part of the window; with Shift to the one before."),
                        new Does("F10", "Goes to the menus; arrow keys move in them, Esc leaves them."),
                        new Does("Esc", "Takes back what is being typed or dragged, or closes what lies on top.")));
    }

    private static PartKeys field() {
        return new PartKeys(
                "Inside the field",
                List.of(
                        new Does(
                                "Page Down",
                                "Page Up",
                                "Goes to the next band or the one before; with Shift selects it too."),
                        new Does("Home", "End", "Goes to the first or the last band."),
                        new Does(
                                shortcut("Right"),
                                shortcut("Left"),
                                "Goes to the next handle or the one before: an edge, a line or the end of a fade."),
                        new Does(
                                "Up",
                                "Down",
                                "Makes the film 1 nm thicker or thinner; with Shift 10 nm, with Alt 0.1 nm."),
                        new Does(
                                shortcut("Up"),
                                shortcut("Down"),
                                "Moves the film to the next or last step of the supply's dial; with Shift ten steps."),
                        new Does(
                                "Right",
                                "Left",
                                "Moves an edge by 1 mm or 0.05 in; with Shift 10 steps, with Alt a tenth."),
                        new Does("Enter", "Goes to the exact values of what is selected."),
                        new Does("Delete", "Deletes the selected bands; their neighbours take their length."),
                        new Does(shortcut("A"), "Selects every band."),
                        new Does("Space and drag", "Moves the view instead of the drawing."),
                        new Does("Esc", "Gives up a drag, or selects nothing.")));
    }

    private static PartKeys piece() {
        return new PartKeys(
                "On the piece and the bands in words",
                List.of(
                        new Does(
                                "Right",
                                "Left",
                                "Reads the piece off place by place, with Shift in long steps; goes from band to band."),
                        new Does("Home", "End", "Reads off end A or end B."),
                        new Does("Enter", "Selects the band there."),
                        new Does("Esc", "Stops reading off.")));
    }

    private static PartKeys order() {
        return new PartKeys(
                "In the order of work",
                List.of(
                        new Does(
                                "Right",
                                "Left",
                                "Points at the next card or the one before, and says why it is there."),
                        new Does("Home", "End", "Points at the first or the last card."),
                        new Does("Esc", "Goes back from the cautions to the cards.")));
    }

    private static PartKeys pacer() {
        return new PartKeys(
                "In the pacer",
                List.of(
                        new Does(
                                "Enter",
                                "Confirms a step of getting ready, or gets ready to go on where a run was broken off."),
                        new Does("Left", "Goes back a step of getting ready."),
                        new Does("Space", "Stops the clock or the count-in; lets the clock go on."),
                        new Does("Esc", "Breaks off at once and says what to do."),
                        new Does("C", "Begins the count-in again, or gets ready from the start."),
                        new Does("N", "Opens the next immersion."),
                        new Does("Up", "Down", "Moves through long instructions."),
                        new Does("M", "Turns sounds off or on."),
                        new Does("L", "Changes between light and dark."),
                        new Does("Q", "Leaves the pacer.")));
    }

    private static String shortcut(String key) {
        return KeyCombination.valueOf("Shortcut+" + key).getDisplayText();
    }
}
