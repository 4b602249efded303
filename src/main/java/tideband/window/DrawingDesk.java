package tideband.window;

import java.io.File;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.LongSupplier;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import javafx.collections.ListChangeListener;
import javafx.scene.Scene;
import javafx.scene.control.Menu;
import javafx.scene.control.MenuItem;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.stage.FileChooser;
import javafx.stage.Modality;
import javafx.stage.Stage;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.window.action.Command;
import tideband.window.action.KeysView;
import tideband.window.action.MenusView;
import tideband.window.comfort.ComfortModel;
import tideband.window.files.Asks;
import tideband.window.files.FileCommands;
import tideband.window.files.FilesModel;
import tideband.window.look.Look;
import tideband.window.pacer.PacerWindow;
import tideband.window.sheets.SheetsDialogView;

/** The main window with its documents, dialogs and pacer. */
final class DrawingDesk {
    private static final double LEAST_WIDTH_PX = 640;
    private static final double LEAST_HEIGHT_PX = 400;
    private static final double KEYS_WIDTH_PX = 960;
    private static final double KEYS_HEIGHT_PX = 640;

    private final Stage stage;
    private final ComfortModel comfort;
    private final WorkbenchModel model;
    private final FilesModel files;
    private final WorkbenchView view;

    @SuppressWarnings("UnusedVariable") // listens to its model for as long as the window is there
    private final SheetsDialogView sheets;

    private final List<Command> commands = new ArrayList<>();
    private final List<Command> samples;
    private final Stage keys = new Stage();

    /**
     * A desk with a drawing on it, not shown yet.
     *
     * @param stage the window
     * @param first what to begin with
     * @param comfort what suits the user
     * @param threads the threads beside the screen's
     * @param recovery where changed drawings are kept
     * @param recent the recent files
     * @param asks questions to the user
     * @param nanoTime the clock pulls are paced by
     */
    DrawingDesk(
            Stage stage,
            Beginning first,
            ComfortModel comfort,
            Threads threads,
            Recovery recovery,
            RecentFiles recent,
            Asks asks,
            LongSupplier nanoTime) {
        this.stage = stage;
        this.comfort = comfort;
        model = new WorkbenchModel(first, comfort, threads, this::chooseBathFile, nanoTime);
        files = new FilesModel(model.drawing(), recovery, recent, asks, threads.keep(), threads.screen());
        FileCommands fileCommands = new FileCommands(files);
        commands.addAll(fileCommands.commands());
        commands.addAll(model.commands());
        commands.add(fileCommands.quit(stage::close));
        commands.add(own(
                "whole-screen",
                Command.Menu.VIEW,
                "Whole screen",
                "F11",
                "Shows the window on the whole screen, or no longer.",
                () -> stage.setFullScreen(!stage.isFullScreen())));
        commands.add(own(
                "all-keys",
                Command.Menu.HELP,
                "Commands and keys",
                "F1",
                "Lists everything that can be done, with its key.",
                this::showKeys));
        view = new WorkbenchView(model, commands);
        samples = fileCommands.samples();
        view.menus().insertAfter("open-drawing", MenusView.inner("Samples", samples));
        view.menus().insertAfter("open-drawing", recentMenu());
        model.status().follow(files.saidProperty());
        Look.dress(view, comfort);
        stage.setScene(new Scene(view));
        stage.setMinWidth(LEAST_WIDTH_PX);
        stage.setMinHeight(LEAST_HEIGHT_PX);
        files.titleProperty().addListener((value, before, after) -> entitle(after));
        entitle(files.titleProperty().get());
        stage.setOnCloseRequest(event -> {
            event.consume();
            files.close(stage::close);
        });
        stage.focusedProperty().addListener((value, before, after) -> {
            if (after) {
                files.lookAtDisk();
            }
        });
        sheets = new SheetsDialogView(stage, model.sheets(), comfort);
        files.fileProperty()
                .addListener((value, before, after) -> model.sheets().form().nextTo(after));
        model.onPace(pacer -> PacerWindow.open(stage, pacer, nanoTime));
    }

    /** Shows the window; the field has the focus. */
    void show() {
        stage.show();
        view.field().requestFocus();
        files.start();
    }

    /** Greets someone who came without a design. */
    void welcome() {
        StringProperty greeting = new SimpleStringProperty();
        model.status().follow(greeting);
        greeting.set("A plain rod to begin with: drag its line up to give it a film, or look at a finished drawing with"
                + " File, Samples. F1 lists everything that can be done.");
        model.drawing().designProperty().addListener((value, before, after) -> greeting.set(""));
    }

    void say(String note) {
        model.status().say(note);
    }

    /** Says what should never happen; the drawing is kept all the same. */
    void say(Throwable fault) {
        model.status()
                .say("Something in the program went wrong: " + fault
                        + ". Your drawing is still here: save it under another name, and please report this.");
    }

    Stage stage() {
        return stage;
    }

    FilesModel files() {
        return files;
    }

    WorkbenchModel model() {
        return model;
    }

    WorkbenchView view() {
        return view;
    }

    List<Command> commands() {
        return List.copyOf(commands);
    }

    private void entitle(String drawing) {
        stage.setTitle(drawing + " \u00b7 Tideband");
    }

    private Optional<Path> chooseBathFile() {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Take a bath file");
        chooser.getExtensionFilters().add(new FileChooser.ExtensionFilter("Bath files (JSON)", "*.json"));
        files.fileProperty()
                .get()
                .map(Path::getParent)
                .ifPresent(folder -> chooser.setInitialDirectory(folder.toFile()));
        return Optional.ofNullable(chooser.showOpenDialog(stage)).map(File::toPath);
    }

    private Menu recentMenu() {
        Menu menu = new Menu("Open recent");
        Runnable fill = () -> {
            menu.getItems().clear();
            for (Path file : files.recentFiles()) {
                menu.getItems().add(recentItem(file, menu.getItems().size() + 1));
            }
            menu.setDisable(files.recentFiles().isEmpty());
        };
        files.recentFiles().addListener((ListChangeListener<Path>) change -> fill.run());
        fill.run();
        return menu;
    }

    private MenuItem recentItem(Path file, int place) {
        MenuItem item = new MenuItem(file.toString());
        item.setMnemonicParsing(false);
        if (place < 10) {
            item.setAccelerator(KeyCombination.valueOf("Shortcut+" + place));
        }
        item.setOnAction(event -> files.open(file));
        return item;
    }

    private void showKeys() {
        if (keys.getScene() == null) {
            keys.initOwner(stage);
            keys.initModality(Modality.NONE);
            keys.setTitle("Commands and keys");
            KeysView page = new KeysView(commands, samples);
            Look.dress(page, comfort);
            keys.setScene(new Scene(page, KEYS_WIDTH_PX, KEYS_HEIGHT_PX));
            keys.addEventHandler(KeyEvent.KEY_PRESSED, event -> {
                if (event.getCode() == KeyCode.ESCAPE) {
                    keys.close();
                }
            });
        }
        keys.show();
        keys.toFront();
        keys.getScene().getRoot().requestFocus();
    }

    private static Command own(String id, Command.Menu menu, String name, String key, String help, Runnable act) {
        return new Command(id, menu, new ReadOnlyStringWrapper(name), key, help, new ReadOnlyBooleanWrapper(true), act);
    }
}
