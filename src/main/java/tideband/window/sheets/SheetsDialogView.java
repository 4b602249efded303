package tideband.window.sheets;

import javafx.scene.Scene;
import javafx.stage.Modality;
import javafx.stage.Stage;
import javafx.stage.Window;
import tideband.window.comfort.ComfortModel;

/** A window over the main one that is there for as long as an errand is. */
public final class SheetsDialogView {
    private static final double FORM_WIDTH_PX = 560;
    private static final double FORM_HEIGHT_PX = 380;
    private static final double PAGES_WIDTH_PX = 820;

    private final Window owner;
    private final Stage stage = new Stage();

    /**
     * Begins to open and close the window as the model asks; it needs no more care.
     *
     * @param owner the main window
     * @param model what it shows
     * @param comfort what suits the user
     */
    public SheetsDialogView(Window owner, SheetsModel model, ComfortModel comfort) {
        this.owner = owner;
        stage.initOwner(owner);
        stage.initModality(Modality.WINDOW_MODAL);
        stage.setScene(new Scene(new SheetsView(model, comfort), FORM_WIDTH_PX, FORM_HEIGHT_PX));
        stage.setOnCloseRequest(e -> {
            e.consume();
            model.close();
        });
        model.standingProperty().addListener((value, before, after) -> show(after));
    }

    private void show(Standing standing) {
        if (standing instanceof Standing.Idle) {
            stage.hide();
            return;
        }
        stage.setTitle(standing instanceof Standing.Shown ? "Step sheets" : "Sheets");
        if (!stage.isShowing()) {
            place(FORM_WIDTH_PX, FORM_HEIGHT_PX);
            stage.show();
        }
        if (standing instanceof Standing.Shown && stage.getWidth() < PAGES_WIDTH_PX) {
            place(PAGES_WIDTH_PX, owner.getHeight());
        }
    }

    /** In the middle of the main window, never larger than it. */
    private void place(double widthPx, double heightPx) {
        stage.setWidth(Math.min(widthPx, owner.getWidth()));
        stage.setHeight(Math.min(heightPx, owner.getHeight()));
        stage.setX(owner.getX() + (owner.getWidth() - stage.getWidth()) / 2);
        stage.setY(owner.getY() + (owner.getHeight() - stage.getHeight()) / 2);
    }
}
