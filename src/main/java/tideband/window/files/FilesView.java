package tideband.window.files;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.ZoneId;
import java.time.format.DateTimeFormatter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.binding.Bindings;
import javafx.event.ActionEvent;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.VBox;
import javafx.stage.FileChooser;
import javafx.stage.FileChooser.ExtensionFilter;
import javafx.stage.Window;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.document.Leftover;
import tideband.window.comfort.ComfortModel;

/** Asks the user in dialogs. Every button is named for what it does, and Escape always keeps the drawing as it is. */
public final class FilesView implements Asks {
    private static final ExtensionFilter DESIGNS = new ExtensionFilter("Tideband designs", "*.json");
    private static final ExtensionFilter ALL = new ExtensionFilter("All files", "*");

    private final Window owner;
    private final ComfortModel comfort;

    /**
     * Dialogs over a window.
     *
     * @param owner the window
     * @param comfort what suits the user
     */
    public FilesView(Window owner, ComfortModel comfort) {
        this.owner = owner;
        this.comfort = comfort;
    }

    @Override
    public Unsaved unsaved(String name) {
        ButtonType save = does("Save");
        ButtonType discard = other("Discard changes");
        ButtonType stay = stays("Keep drawing");
        ButtonType answer = ask(
                "Save changes?",
                "\"" + name + "\" has changes that are not saved.",
                "If you discard them, they are lost.",
                List.of(save, discard, stay));
        return answer == save ? Unsaved.SAVE : answer == discard ? Unsaved.DISCARD : Unsaved.KEEP_DRAWING;
    }

    @Override
    public Optional<Path> fileToOpen(Optional<Path> folder) {
        return Optional.ofNullable(chooser("Open a design", folder).showOpenDialog(owner))
                .map(File::toPath);
    }

    @Override
    public Optional<Path> fileToSave(Optional<Path> folder, String name) {
        FileChooser chooser = chooser("Save the drawing as", folder);
        chooser.setInitialFileName(name);
        while (true) {
            File chosen = chooser.showSaveDialog(owner);
            if (chosen == null) {
                return Optional.empty();
            }
            Path file = FileNames.withEnding(chosen.toPath());
            // The system asked about the name as typed, not about the one with the ending.
            if (file.equals(chosen.toPath()) || !Files.exists(file) || replaces(file)) {
                return Optional.of(file);
            }
        }
    }

    private boolean replaces(Path file) {
        ButtonType replace = does("Replace it");
        return replace
                == ask(
                        "Replace the file?",
                        "There is a \"" + file.getFileName() + "\" already.",
                        "If you replace it, what is in it is lost.",
                        List.of(replace, stays("Choose another name")));
    }

    private static FileChooser chooser(String title, Optional<Path> folder) {
        FileChooser chooser = new FileChooser();
        chooser.setTitle(title);
        chooser.getExtensionFilters().setAll(DESIGNS, ALL);
        folder.ifPresent(f -> chooser.setInitialDirectory(f.toFile()));
        return chooser;
    }

    @Override
    public Optional<Design> newDrawing() {
        NewDrawingView form = new NewDrawingView(new NewDrawingModel(comfort.unit()), comfort.unit());
        ButtonType begin = does("Begin drawing");
        Dialog<ButtonType> dialog = DialogLook.dialog(owner, comfort, "New drawing");
        dialog.getDialogPane().setContent(DialogLook.scrolling(form));
        dialog.getDialogPane().getButtonTypes().setAll(begin, stays("Keep drawing"));
        DialogLook.beginAt(dialog, form.first());
        Design[] drawn = new Design[1];
        dialog.getDialogPane().lookupButton(begin).addEventFilter(ActionEvent.ACTION, event -> {
            Optional<Design> design = form.drawing();
            if (design.isPresent()) {
                drawn[0] = design.get();
            } else {
                event.consume();
                dialog.getDialogPane().getScene().getWindow().sizeToScene();
            }
        });
        return dialog.showAndWait().filter(answer -> answer == begin).map(answer -> drawn[0]);
    }

    @Override
    public Elsewhere changedElsewhere(String name, boolean gone, boolean changedHere) {
        if (gone) {
            ask(
                    "The file is gone",
                    "\"" + name + "\" was deleted or moved by another program.",
                    "What you see here is kept, but it is in no file any more. Save it to have one again.",
                    List.of(stays("Keep mine")));
            return Elsewhere.KEEP_MINE;
        }
        ButtonType load = other("Load it");
        ButtonType answer = ask(
                "Changed on disk",
                "\"" + name + "\" was changed on disk by another program.",
                changedHere
                        ? "If you load it, your own changes since you last saved are lost. If you keep yours, the file is"
                                + " replaced when you save."
                        : "You have no changes of your own that loading it would lose. If you keep yours, the file is"
                                + " replaced when you save.",
                List.of(load, stays("Keep mine")));
        return answer == load ? Elsewhere.LOAD : Elsewhere.KEEP_MINE;
    }

    @Override
    public Overwrite overwrite(String name) {
        ButtonType replace = other("Replace it");
        ButtonType load = other("Load it");
        ButtonType answer = ask(
                "Changed on disk",
                "\"" + name + "\" was changed on disk by another program, so nothing was saved yet.",
                "Replace it with your drawing, or load it and lose your own changes. To keep both, keep drawing and use"
                        + " Save as.",
                List.of(replace, load, stays("Keep drawing")));
        return answer == replace ? Overwrite.REPLACE : answer == load ? Overwrite.LOAD : Overwrite.KEEP_DRAWING;
    }

    @Override
    public BathChoice bathInTheWay(String bathFile, String ownName) {
        ButtonType own = does("Save bath separately");
        ButtonType replace = other("Replace the bath there");
        ButtonType answer = ask(
                "Another bath has that name",
                "This drawing's bath belongs in \"" + bathFile + "\", but that file holds something else.",
                "Other designs in that folder may name it, and would be planned for the new bath if you replace it."
                        + " Saved separately, the bath goes into \"" + ownName
                        + "\", for this drawing alone. Nothing was saved yet.",
                List.of(own, replace, stays("Keep drawing")));
        return answer == own ? BathChoice.OWN_NAME : answer == replace ? BathChoice.REPLACE : BathChoice.KEEP_DRAWING;
    }

    @Override
    public Optional<LeftChoice> leftBehind(List<Leftover> drawings) {
        ListView<Leftover> list = new ListView<>();
        list.getItems().setAll(drawings);
        list.getSelectionModel().select(0);
        list.setAccessibleText("Drawings that were open");
        list.getStyleClass().add("left-drawings");
        list.setCellFactory(view -> new ListCell<>() {
            @Override
            protected void updateItem(Leftover item, boolean empty) {
                super.updateItem(item, empty);
                setText(empty || item == null ? null : described(item));
                // As wide as the list, so that long paths wrap.
                setWrapText(true);
                setPrefWidth(0);
            }
        });
        ButtonType open = does("Open");
        ButtonType discard = other("Discard");
        ButtonType later = stays("Decide later");
        Dialog<ButtonType> dialog = DialogLook.dialog(owner, comfort, "Drawings left open");
        VBox content = DialogLook.words(
                "These drawings were open when Tideband stopped.",
                "They are as they were a moment before. Open one to go on with it; a discarded one is lost.");
        content.getChildren().add(list);
        dialog.getDialogPane().setContent(content);
        dialog.getDialogPane().getButtonTypes().setAll(open, discard, later);
        for (ButtonType type : List.of(open, discard)) {
            Node button = dialog.getDialogPane().lookupButton(type);
            button.disableProperty()
                    .bind(Bindings.isNull(list.getSelectionModel().selectedItemProperty()));
        }
        // A list keeps these keys for itself.
        list.addEventFilter(KeyEvent.KEY_PRESSED, event -> {
            ButtonType meant = event.getCode() == KeyCode.ENTER ? open : later;
            boolean ours = event.getCode() == KeyCode.ENTER || event.getCode() == KeyCode.ESCAPE;
            if (ours && dialog.getDialogPane().lookupButton(meant) instanceof Button button) {
                event.consume();
                button.fire();
            }
        });
        DialogLook.beginAt(dialog, list);
        ButtonType answer = dialog.showAndWait().orElse(later);
        Leftover chosen = list.getSelectionModel().getSelectedItem();
        if (answer == later || chosen == null) {
            return Optional.empty();
        }
        return Optional.of(new LeftChoice(answer == open ? LeftChoice.Act.OPEN : LeftChoice.Act.DISCARD, chosen));
    }

    private static String described(Leftover drawing) {
        String at = DateTimeFormatter.ofPattern("yyyy-MM-dd HH:mm", Locale.ROOT)
                .withZone(ZoneId.systemDefault())
                .format(drawing.at());
        return drawing.design().title() + "\n"
                + drawing.belongs().map(Path::toString).orElse("never saved to a file") + ", kept " + at;
    }

    @Override
    public void faults(String what, List<Fault> faults) {
        Dialog<ButtonType> dialog = DialogLook.dialog(owner, comfort, "The file is at fault");
        VBox content = DialogLook.words(
                what,
                faults.size() == 1
                        ? "This is wrong:"
                        : "These " + faults.size() + " things are wrong; all are listed, mend them and try again:");
        VBox lines = new VBox();
        lines.getStyleClass().add("faults");
        for (Fault fault : faults) {
            lines.getChildren().add(faultLines(fault));
        }
        ScrollPane scroll = new ScrollPane(lines);
        scroll.setFitToWidth(true);
        scroll.getStyleClass().add("fault-list");
        scroll.setFocusTraversable(true);
        scroll.setAccessibleText(
                String.join(". ", faults.stream().map(Fault::text).toList()));
        content.getChildren().add(scroll);
        dialog.getDialogPane().setContent(content);
        dialog.getDialogPane().getButtonTypes().setAll(stays("Back to the drawing"));
        dialog.showAndWait();
    }

    private static Node faultLines(Fault fault) {
        Label place = new Label(fault.at().isEmpty() ? "The whole file" : fault.at());
        place.getStyleClass().add("numeral");
        Label wrong = new Label(fault.wrong());
        Label right = new Label("→ " + fault.right());
        right.getStyleClass().add("faint");
        for (Label label : List.of(place, wrong, right)) {
            label.setWrapText(true);
        }
        VBox box = new VBox(place, wrong);
        if (!fault.right().isEmpty()) {
            box.getChildren().add(right);
        }
        return box;
    }

    @Override
    public void say(String what, String remedy) {
        ask("Tideband", what, remedy, List.of(stays("Back to the drawing")));
    }

    private ButtonType ask(String title, String what, String more, List<ButtonType> buttons) {
        Dialog<ButtonType> dialog = DialogLook.dialog(owner, comfort, title);
        dialog.getDialogPane().setContent(DialogLook.words(what, more));
        dialog.getDialogPane().getButtonTypes().setAll(buttons);
        DialogLook.focusOn(
                dialog,
                buttons.stream()
                        .filter(b -> b.getButtonData() == ButtonData.OK_DONE)
                        .findFirst()
                        .orElse(buttons.get(buttons.size() - 1)));
        return dialog.showAndWait().orElse(buttons.get(buttons.size() - 1));
    }

    private static ButtonType does(String name) {
        return new ButtonType(name, ButtonData.OK_DONE);
    }

    private static ButtonType other(String name) {
        return new ButtonType(name, ButtonData.OTHER);
    }

    private static ButtonType stays(String name) {
        return new ButtonType(name, ButtonData.CANCEL_CLOSE);
    }
}
