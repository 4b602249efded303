package tideband.window.pacer;

import java.util.function.LongSupplier;
import javafx.application.Platform;
import javafx.scene.Scene;
import javafx.scene.input.KeyCombination;
import javafx.stage.Modality;
import javafx.stage.Stage;
import javafx.stage.Window;

/** Opens the pacer on the whole screen. */
public final class PacerWindow {
    private static final double WIDTH_PX = 1280;
    private static final double HEIGHT_PX = 800;

    private final Stage stage;
    private final Chime chime;
    private final LongSupplier nanoTime;
    private PacerView view;

    private PacerWindow(Stage stage, PacerModel model, Chime chime, LongSupplier nanoTime) {
        this.stage = stage;
        this.chime = chime;
        this.nanoTime = nanoTime;
        this.view = viewOf(model);
        stage.setScene(new Scene(view, WIDTH_PX, HEIGHT_PX));
        stage.setTitle("Tideband pacer");
        // Escape breaks the run off and must never do anything else.
        stage.setFullScreenExitKeyCombination(KeyCombination.NO_MATCH);
        stage.setFullScreenExitHint("Esc breaks a run off at once \u00b7 Q leaves the pacer");
    }

    /**
     * Opens the pacer with the computer's sound.
     *
     * @param owner the window it is opened from
     * @param model a run yet to begin
     * @param nanoTime the clock runs are paced by
     * @return its stage, shown
     */
    public static Stage open(Window owner, PacerModel model, LongSupplier nanoTime) {
        Stage stage = new Stage();
        stage.initOwner(owner);
        // While volts are on, nothing else is to be begun or closed: no second run, no end of the program.
        stage.initModality(Modality.WINDOW_MODAL);
        show(stage, model, new LineChime(), nanoTime);
        stage.setFullScreen(true);
        return stage;
    }

    /** Shows the pacer on a stage. */
    static PacerView show(Stage stage, PacerModel model, Chime chime, LongSupplier nanoTime) {
        PacerWindow window = new PacerWindow(stage, model, chime, nanoTime);
        stage.setOnCloseRequest(event -> {
            if (window.view.underWay()) {
                event.consume();
                window.view.abort();
            }
        });
        stage.setOnHidden(event -> window.closed());
        stage.show();
        window.view.start();
        return window.view;
    }

    private PacerView viewOf(PacerModel model) {
        // Closed once the key is done with: the toolkit still asks the stage about it after its handlers have run.
        return new PacerView(
                model,
                chime,
                () -> Platform.runLater(stage::close),
                () -> model.nextImmersion().ifPresent(next -> turnTo(model.paceAnother(next, nanoTime))));
    }

    private void turnTo(PacerModel model) {
        view.stop();
        view = viewOf(model);
        stage.getScene().setRoot(view);
        view.start();
    }

    private void closed() {
        view.stop();
        chime.close();
    }
}
