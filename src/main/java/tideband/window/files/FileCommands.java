package tideband.window.files;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.SimpleStringProperty;
import tideband.document.Sample;
import tideband.window.action.Command;

/** What the user can do with files. */
public final class FileCommands {
    private final FilesModel files;
    private final BooleanBinding free;

    /**
     * Commands of a document.
     *
     * @param files the document
     */
    public FileCommands(FilesModel files) {
        this.files = files;
        free = files.busyProperty().not();
    }

    /**
     * All but the recent files, the samples and the end, in the order of the menu.
     *
     * @return the commands
     */
    public List<Command> commands() {
        return List.of(
                command("new-drawing", "New…", "Shortcut+N", "Begins a drawing of a shape you choose.", files::begin),
                command("open-drawing", "Open…", "Shortcut+O", "Opens a design file.", files::open),
                command("save-drawing", "Save", "Shortcut+S", "Saves the drawing to its file.", files::save),
                command(
                        "save-drawing-as",
                        "Save as…",
                        "Shortcut+Shift+S",
                        "Saves the drawing to another file and goes on there.",
                        files::saveAs),
                new Command(
                        "left-behind",
                        Command.Menu.FILE,
                        new SimpleStringProperty("Drawings left open…"),
                        "Shortcut+Shift+R",
                        "Opens or discards drawings that were open when Tideband last stopped without closing them.",
                        Bindings.createBooleanBinding(
                                () -> files.leftBehindProperty().get() > 0, files.leftBehindProperty()),
                        files::askAboutLeftBehind));
    }

    /**
     * The last one in the menu.
     *
     * @param leave ends the window, after the user agreed
     * @return the command
     */
    public Command quit(Runnable leave) {
        return command(
                "quit",
                "Quit",
                "Shortcut+Q",
                "Closes the drawing and ends Tideband; changes not saved are asked about.",
                () -> files.close(leave));
    }

    /**
     * One for each sample.
     *
     * @return the commands
     */
    public List<Command> samples() {
        List<Command> commands = new ArrayList<>();
        for (Sample sample : Sample.values()) {
            commands.add(command(
                    "sample-" + sample.name().toLowerCase(Locale.ROOT).replace('_', '-'),
                    sample.title(),
                    "Shortcut+Alt+" + (commands.size() + 1),
                    sample.shows() + ".",
                    () -> files.begin(sample)));
        }
        return commands;
    }

    private Command command(String id, String name, String key, String help, Runnable act) {
        return new Command(id, Command.Menu.FILE, new SimpleStringProperty(name), key, help, free, act);
    }
}
