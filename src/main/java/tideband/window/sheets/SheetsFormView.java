package tideband.window.sheets;

import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.CheckBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.stage.DirectoryChooser;

/** Asks for folder and name. */
final class SheetsFormView extends VBox {
    private final SheetsForm form;
    private final TextField folder = new TextField();

    SheetsFormView(SheetsForm form, Errand errand, Runnable enter) {
        this.form = form;
        getStyleClass().add("sheets-body");
        folder.textProperty().bindBidirectional(form.folderProperty());
        folder.setAccessibleText("Folder");
        folder.setTooltip(new Tooltip("Where the files go; made if it is missing"));
        folder.setOnAction(e -> enter.run());
        HBox.setHgrow(folder, Priority.ALWAYS);
        Button browse = new Button("Browse\u2026");
        browse.setMinWidth(Region.USE_PREF_SIZE);
        browse.setAccessibleText("Browse for a folder");
        browse.setTooltip(new Tooltip("Chooses a folder"));
        browse.setOnAction(e -> browse());
        HBox where = new HBox(folder, browse);
        where.setStyle("-fx-spacing: 0.5em;");
        TextField name = new TextField();
        name.textProperty().bindBidirectional(form.nameProperty());
        name.setAccessibleText("Names begin with");
        name.setTooltip(new Tooltip("What the name of every file begins with"));
        name.setOnAction(e -> enter.run());
        Label intro = plain(
                errand == Errand.EXPORT
                        ? "Writes what the bench and other programs need: the preview as a picture (SVG), the step sheets to"
                                + " print (PDF, for A4 and Letter), the timing of every pull (CSV) and the whole plan (JSON)."
                        : "Writes the step sheet as a PDF, to be opened and printed elsewhere.");
        getChildren().setAll(intro, field("_Folder", folder, where), field("_Names begin with", name, name));
        if (errand == Errand.EXPORT) {
            CheckBox png = new CheckBox("Draw the preview in pixels too (_PNG)");
            png.selectedProperty().bindBidirectional(form.pngProperty());
            png.setWrapText(true);
            png.setTooltip(new Tooltip("For messages and web pages; takes a second"));
            getChildren().add(png);
        }
        Label fault = plain("");
        fault.getStyleClass().add("warning");
        bind(fault, form.faultProperty());
        Label note = plain("");
        bind(note, form.noteProperty());
        getChildren().addAll(fault, note);
    }

    private static void bind(Label label, ReadOnlyStringProperty text) {
        label.textProperty().bind(text);
        label.visibleProperty().bind(text.isNotEmpty());
        label.managedProperty().bind(label.visibleProperty());
    }

    private static Node field(String name, Node input, Node row) {
        Label label = new Label(name);
        label.setMnemonicParsing(true);
        label.setLabelFor(input);
        VBox both = new VBox(label, row);
        both.setStyle("-fx-spacing: 0.2em;");
        return both;
    }

    static Label plain(String text) {
        Label label = new Label(text);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        return label;
    }

    @Override
    public void requestFocus() {
        folder.requestFocus();
        folder.end();
    }

    private void browse() {
        DirectoryChooser chooser = new DirectoryChooser();
        chooser.setTitle("Folder for the sheets");
        form.path().map(SheetsFormView::nearest).ifPresent(chooser::setInitialDirectory);
        File chosen = chooser.showDialog(getScene().getWindow());
        if (chosen != null) {
            form.folderProperty().set(chosen.toString());
        }
    }

    /** The folder itself, or the nearest above it that is there. */
    private static File nearest(Path path) {
        Path at = path;
        while (at.getParent() != null && !Files.isDirectory(at)) {
            at = at.getParent();
        }
        return at.toFile();
    }
}
