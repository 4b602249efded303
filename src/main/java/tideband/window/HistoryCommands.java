package tideband.window;

import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.value.ObservableStringValue;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;

/** Undo and redo, which name what they undo and redo. */
final class HistoryCommands {
    private HistoryCommands() {}

    static List<Command> of(DrawingModel drawing) {
        return List.of(
                command(
                        "undo",
                        "Undo",
                        drawing.undoNameProperty(),
                        "Shortcut+Z",
                        "Takes the last edit back; every edit since the design was opened can be.",
                        drawing::undo),
                command(
                        "redo",
                        "Redo",
                        drawing.redoNameProperty(),
                        "Shortcut+Y",
                        "Brings back the edit last undone.",
                        drawing::redo));
    }

    private static Command command(
            String id, String verb, ObservableStringValue what, String key, String help, Runnable act) {
        return new Command(
                id,
                Command.Menu.EDIT,
                Bindings.createStringBinding(() -> what.get().isEmpty() ? verb : verb + ": " + what.get(), what),
                key,
                help,
                Bindings.isNotEmpty(what),
                act);
    }
}
