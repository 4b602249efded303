package tideband.window.files;

import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Dialog;
import javafx.scene.control.DialogPane;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import javafx.stage.Screen;
import javafx.stage.Window;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** The look of dialogs about files. */
final class DialogLook {

    /** Title bar and buttons need the rest. */
    private static final double SHARE_OF_SCREEN = 0.7;

    private DialogLook() {}

    static Dialog<ButtonType> dialog(Window owner, ComfortModel comfort, String title) {
        Dialog<ButtonType> dialog = new Dialog<>();
        dialog.initOwner(owner);
        dialog.setTitle(title);
        dialog.setResizable(true);
        DialogPane pane = dialog.getDialogPane();
        Look.dress(pane, comfort);
        pane.getStylesheets().add(DialogLook.class.getResource("files.css").toExternalForm());
        pane.getStyleClass().add("files-dialog");
        pane.setMinHeight(Region.USE_PREF_SIZE);
        return dialog;
    }

    /** Puts the focus where Enter does what a careful user expects: a harmless act, where there is no usual one. */
    static void focusOn(Dialog<ButtonType> dialog, ButtonType type) {
        if (dialog.getDialogPane().lookupButton(type) instanceof Button button) {
            button.setDefaultButton(true);
            dialog.setOnShown(shown -> button.requestFocus());
        }
    }

    /** Puts the focus on what is to be filled in or chosen; the dialog itself first puts it on the usual button. */
    static void beginAt(Dialog<ButtonType> dialog, Node first) {
        dialog.setOnShown(shown -> Platform.runLater(first::requestFocus));
    }

    /** Scrolls what is too tall for the screen, as with large text. */
    static ScrollPane scrolling(Region content) {
        ScrollPane scroll = new ScrollPane(content);
        scroll.setFitToWidth(true);
        scroll.setHbarPolicy(ScrollPane.ScrollBarPolicy.NEVER);
        scroll.getStyleClass().add("form");
        double mostPx = Screen.getPrimary().getVisualBounds().getHeight() * SHARE_OF_SCREEN;
        scroll.setMaxHeight(mostPx);
        return scroll;
    }

    private static void wrap(Label label) {
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
    }

    /** What happened, and what follows from it. */
    static VBox words(String what, String more) {
        Label heading = new Label(what);
        heading.getStyleClass().add("heading");
        wrap(heading);
        VBox box = new VBox(heading);
        if (!more.isEmpty()) {
            Label text = new Label(more);
            wrap(text);
            box.getChildren().add(text);
        }
        box.getStyleClass().add("words");
        return box;
    }
}
