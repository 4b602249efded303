package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import javafx.application.Platform;
import javafx.scene.image.WritableImage;
import javafx.stage.Stage;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.comfort.ComfortModel;
import tideband.window.files.FilesView;

/** The whole window in its main sizes and looks, saved to be looked at. */
@ScreenTest
class WorkbenchPicturesTest {
    @TempDir
    static Path state;

    private final ComfortModel comfort = new ComfortModel();
    private DrawingDesk desk;
    private Threads threads;

    @Start
    void start(Stage shared) {
        // A stage of its own: the shared one keeps what is bound to it for the tests that follow.
        Stage stage = new Stage();
        threads = Threads.start(Platform::runLater);
        stage.setWidth(1024);
        stage.setHeight(640);
        desk = new DrawingDesk(
                stage,
                Beginning.with(Desk.shipped("snuffer-handle")),
                comfort,
                threads,
                new Recovery(state),
                new RecentFiles(state.resolve("recent")),
                new FilesView(stage, comfort),
                System::nanoTime);
        desk.show();
    }

    @AfterEach
    void close(FxRobot robot) {
        robot.interact(() -> desk.stage().hide());
        threads.close();
    }

    /** Property: at every size, look and text size the window has the size asked for and shows what was worked out. */
    @Test
    void canBeLookedAt(FxRobot robot) throws TimeoutException {
        robot.interact(() -> desk.model().drawing().select(Selection.of(new Part.Level(2))));
        picture(robot, "bench-1024", 1024, 640, false, 100);
        picture(robot, "bench-1280", 1280, 800, false, 100);
        picture(robot, "bench-1600-dark", 1600, 1000, true, 100);
        picture(robot, "bench-1024-large", 1024, 640, false, 200);
        picture(robot, "bench-3840", 3840, 2160, false, 150);
        picture(robot, "bench-3840-dark", 3840, 2160, true, 200);
    }

    private void picture(FxRobot robot, String name, int widthPx, int heightPx, boolean dark, int textPercent)
            throws TimeoutException {
        robot.interact(() -> {
            comfort.darkProperty().set(dark);
            comfort.textPercentProperty().set(textPercent);
            desk.stage().setWidth(widthPx);
            desk.stage().setHeight(heightPx);
        });
        WaitForAsyncUtils.waitFor(
                20, TimeUnit.SECONDS, () -> !desk.model().work().staleProperty().get());
        WaitForAsyncUtils.waitForFxEvents(20);
        robot.interact(() -> {
            WritableImage picture = Pictures.save(desk.stage().getScene(), name);
            assertThat(picture.getWidth()).as(name).isEqualTo(widthPx);
            assertThat(picture.getHeight()).as(name).isEqualTo(heightPx);
            assertThat(desk.model().order().cards()).as(name).hasSize(18);
        });
    }
}
