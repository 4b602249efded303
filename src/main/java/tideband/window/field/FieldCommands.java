package tideband.window.field;

import java.util.List;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.window.action.Command;

/** What can be done in the field, as commands. All are always possible; what one cannot do, it says. */
final class FieldCommands {
    private FieldCommands() {}

    static List<Command> of(FieldModel field) {
        FieldEdits edits = field.edits();
        FieldKeyboard keyboard = field.keyboard();
        return Stream.of(
                        pieces(field.hand(), edits),
                        kinds(edits),
                        walks(keyboard),
                        nudges(keyboard),
                        sights(field.sight()))
                .flatMap(List::stream)
                .toList();
    }

    private static List<Command> pieces(FieldHand hand, FieldEdits edits) {
        return List.of(
                band(
                        "split-here",
                        "Split here",
                        "Shortcut+K",
                        "Splits the band under the pointer where it is, or the selected one in its middle.",
                        hand::splitHere),
                band(
                        "split-middle",
                        "Split in the middle",
                        "Shortcut+Shift+K",
                        "Splits the selected band in its middle.",
                        edits::splitMiddle),
                band(
                        "join-next",
                        "Join with next",
                        "Shortcut+J",
                        "Joins the selected band with the one after it.",
                        edits::joinNext),
                band(
                        "join-selected",
                        "Join selected",
                        "Shortcut+Shift+J",
                        "Joins the selected bands, which lie side by side, into one.",
                        edits::joinSelected),
                band(
                        "insert-band",
                        "Insert after",
                        "Shortcut+I",
                        "Inserts a band in the B half of the selected one.",
                        edits::insertAfter),
                band(
                        "duplicate-bands",
                        "Duplicate",
                        "Shortcut+D",
                        "Repeats the selected bands after the last of them; what follows makes room.",
                        edits::duplicate),
                band(
                        "mirror-drawing",
                        "Mirror drawing",
                        "Shortcut+Shift+M",
                        "Turns the drawing end for end; the piece keeps its shape.",
                        edits::mirror),
                band(
                        "delete-bands",
                        "Delete",
                        "Shortcut+Delete",
                        "Deletes the selected bands; their neighbours take their length. In the field, Delete does too.",
                        edits::delete));
    }

    private static List<Command> kinds(FieldEdits edits) {
        return List.of(
                band(
                        "bare-band",
                        "Bare on or off",
                        "Shortcut+Shift+B",
                        "Leaves the selected bands natural metal, or gives them a film again.",
                        edits::toggleBare),
                band(
                        "edge-kind",
                        "Edge crisp or soft",
                        "Shortcut+T",
                        "Makes the edge crisp (a mask line) or soft (a waterline will do).",
                        edits::toggleEdge),
                band(
                        "make-level",
                        "Make level",
                        "Shortcut+L",
                        "Makes a fade one film from side to side.",
                        edits::makeLevel),
                band(
                        "make-fade",
                        "Make fade",
                        "Shortcut+R",
                        "Lets the film run from its own thickness to its neighbour's.",
                        edits::makeFade),
                band(
                        "select-all-bands",
                        "Select all bands",
                        "Shortcut+Shift+A",
                        "Selects every band.",
                        edits::selectAll));
    }

    private static List<Command> walks(FieldKeyboard keyboard) {
        return List.of(
                band(
                        "next-band",
                        "Next band",
                        "Shortcut+Page Down",
                        "Goes to the next band towards end B. In the field, Page Down does too.",
                        () -> keyboard.stepBand(1, false)),
                band(
                        "previous-band",
                        "Previous band",
                        "Shortcut+Page Up",
                        "Goes to the next band towards end A. In the field, Page Up does too.",
                        () -> keyboard.stepBand(-1, false)),
                band(
                        "next-handle",
                        "Next handle",
                        "Shortcut+Right",
                        "Goes to the next side, line or edge towards end B.",
                        () -> keyboard.stepHandle(1)),
                band(
                        "previous-handle",
                        "Previous handle",
                        "Shortcut+Left",
                        "Goes to the next side, line or edge towards end A.",
                        () -> keyboard.stepHandle(-1)));
    }

    private static List<Command> nudges(FieldKeyboard keyboard) {
        return List.of(
                band(
                        "nudge-right",
                        "Move edge towards B",
                        "Shortcut+Alt+Right",
                        "Moves the edge by 1 mm or 0.05 in. In the field, the arrow keys do; with Shift 10 steps, with Alt a tenth.",
                        () -> keyboard.nudgeAlong(1, false)),
                band(
                        "nudge-left",
                        "Move edge towards A",
                        "Shortcut+Alt+Left",
                        "Moves the edge by 1 mm or 0.05 in. In the field, the arrow keys do; with Shift 10 steps, with Alt a tenth.",
                        () -> keyboard.nudgeAlong(-1, false)),
                band(
                        "nudge-up",
                        "Thicker by 1 nm",
                        "Shortcut+Alt+Up",
                        "Makes the film 1 nm thicker. In the field, the arrow keys do; with Shift 10 nm, with Alt 0.1 nm.",
                        () -> keyboard.nudgeUp(1)),
                band(
                        "nudge-down",
                        "Thinner by 1 nm",
                        "Shortcut+Alt+Down",
                        "Makes the film 1 nm thinner. In the field, the arrow keys do; with Shift 10 nm, with Alt 0.1 nm.",
                        () -> keyboard.nudgeUp(-1)),
                band(
                        "dial-up",
                        "Next step of the dial",
                        "Shortcut+Up",
                        "Moves the film to the next step of the supply's dial.",
                        () -> keyboard.nudgeDial(1)),
                band(
                        "dial-down",
                        "Step of the dial before",
                        "Shortcut+Down",
                        "Moves the film to the step of the supply's dial before.",
                        () -> keyboard.nudgeDial(-1)));
    }

    private static List<Command> sights(FieldSight sight) {
        return List.of(
                view("zoom-in-field", "Look nearer", "F3", "Shows a shorter stretch of the piece.", sight::zoomIn),
                view(
                        "zoom-out-field",
                        "Look from farther",
                        "F2",
                        "Shows a longer stretch of the piece.",
                        sight::zoomOut),
                view(
                        "zoom-films-in",
                        "Fewer films, larger",
                        "Shift+F3",
                        "Shows fewer films, larger.",
                        sight::zoomFilmsIn),
                view(
                        "zoom-films-out",
                        "More films, smaller",
                        "Shift+F2",
                        "Shows more films, smaller.",
                        sight::zoomFilmsOut),
                view("fit-field", "Whole piece, all films", "F4", "Shows the whole piece and all films.", sight::fit));
    }

    private static Command band(String id, String name, String key, String help, Runnable act) {
        return command(id, Command.Menu.BAND, name, key, help, act);
    }

    private static Command view(String id, String name, String key, String help, Runnable act) {
        return command(id, Command.Menu.VIEW, name, key, help, act);
    }

    private static Command command(String id, Command.Menu menu, String name, String key, String help, Runnable act) {
        return new Command(
                id,
                menu,
                new ReadOnlyStringWrapper(name).getReadOnlyProperty(),
                key,
                help,
                new ReadOnlyBooleanWrapper(true).getReadOnlyProperty(),
                act);
    }
}
