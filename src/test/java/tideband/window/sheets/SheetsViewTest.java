package tideband.window.sheets;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Labeled;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.sheet.Paper;
import tideband.sheet.SheetPrinter;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;

@ScreenTest
class SheetsViewTest {
    @TempDir
    Path folder;

    private final Desk desk = Desk.with("lantern-hook");
    private final Deque<Runnable> beside = new ArrayDeque<>();
    private List<SheetPrinter> printers = List.of();
    private SheetsModel model;
    private Scene scene;

    private static final class Tray implements SheetPrinter {
        @Override
        public String name() {
            return "Workshop laser";
        }

        @Override
        public Paper paper(Paper otherwise) {
            return Paper.A4;
        }

        @Override
        public void print(byte[] pdf, Paper paper, Consumer<String> progress, BooleanSupplier cancelled)
                throws IOException {
            throw new IOException("it is switched off");
        }
    }

    @Start
    void start(Stage stage) {
        model = new SheetsModel(
                desk.drawing(), desk.work(), beside::add, Runnable::run, () -> printers, folder, Locale.UK);
        model.form().nextTo(Optional.of(Path.of("/home/lantern/designs/lantern-hook.json")));
        scene = new Scene(new SheetsView(model, desk.comfort()), 560, 380);
        stage.setScene(scene);
        stage.show();
    }

    private void run(FxRobot robot) {
        robot.interact(() -> {
            while (!beside.isEmpty()) {
                beside.remove().run();
            }
        });
        WaitForAsyncUtils.waitForFxEvents();
    }

    private void save(FxRobot robot, String name) {
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(() -> Pictures.save(scene, name));
    }

    @Test
    void exportsByKeysAlone(FxRobot robot) throws IOException {
        Files.writeString(folder.resolve("lantern-hook-plan.json"), "{}");
        robot.interact(model::export);
        save(robot, "sheets-form-light");
        robot.interact(() -> model.form().folderProperty().set(folder.toString()));
        robot.interact(() -> model.form().pngProperty().set(false));
        robot.type(KeyCode.ENTER);
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.InTheWay.class);
        save(robot, "sheets-in-the-way-light");
        robot.type(KeyCode.ESCAPE);
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Asked.class);
        WaitForAsyncUtils.waitForFxEvents();
        robot.type(KeyCode.ENTER);
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(() -> robot.lookup((Button b) -> b.getText().equals("Replace it"))
                .queryButton()
                .fire());
        model.standingProperty().addListener((value, before, after) -> {
            if (after instanceof Standing.Working working && working.stage().endsWith("letter paper")) {
                Pictures.save(scene, "sheets-progress-light");
            }
        });
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(((Button) scene.getFocusOwner()).getText()).isEqualTo("Cancel");
        run(robot);
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Written.class);
        robot.interact(() -> desk.comfort().darkProperty().set(true));
        save(robot, "sheets-written-dark");
        robot.type(KeyCode.ENTER);
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.Idle());
    }

    @Test
    void escapeCallsWorkOff(FxRobot robot) throws IOException {
        robot.interact(model::export);
        robot.interact(() -> model.form().folderProperty().set(folder.toString()));
        robot.type(KeyCode.ENTER);
        WaitForAsyncUtils.waitForFxEvents();
        robot.type(KeyCode.ESCAPE);
        assertThat(model.standingProperty().get().said()).isEqualTo("Stopping \u2026");
        run(robot);
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.CalledOff(Errand.EXPORT, false));
        assertThat(folder).isEmptyDirectory();
        save(robot, "sheets-called-off-light");
    }

    @Test
    void showsPagesAndTurnsThemByKeys(FxRobot robot) {
        robot.interact(() -> {
            printers = List.of(new Tray());
            scene.getWindow().setWidth(820);
            scene.getWindow().setHeight(600);
            model.print();
        });
        run(robot);
        run(robot);
        save(robot, "sheets-pages-light");
        robot.type(KeyCode.PAGE_DOWN).type(KeyCode.PAGE_DOWN);
        run(robot);
        assertThat(model.pages().pageProperty().get()).isEqualTo(2);
        assertThat(model.pages().pictureProperty().get().orElseThrow().page()).isEqualTo(2);
        assertThat(scene.lookup(".pages-cautions").isVisible()).isFalse();
        robot.interact(() -> {
            desk.comfort().darkProperty().set(true);
            desk.comfort().textPercentProperty().set(200);
        });
        run(robot);
        save(robot, "sheets-pages-200-dark");
        robot.interact(() -> desk.comfort().textPercentProperty().set(100));
        robot.interact(() -> robot.lookup((Labeled b) -> "Whole page".equals(b.getText()))
                .queryAs(javafx.scene.control.ToggleButton.class)
                .fire());
        run(robot);
        save(robot, "sheets-whole-page-dark");
        robot.interact(() -> robot.lookup((Button b) -> "Print".equals(b.getText()))
                .queryButton()
                .fire());
        run(robot);
        assertThat(model.standingProperty().get().said()).contains("it is switched off");
        save(robot, "sheets-failed-dark");
    }

    @Test
    void withoutAPrinterItOffersThePdf(FxRobot robot) {
        robot.interact(model::print);
        run(robot);
        run(robot);
        save(robot, "sheets-no-printer-light");
        robot.interact(() -> robot.lookup((Button b) -> b.getText().startsWith("Write a PDF"))
                .queryButton()
                .fire());
        save(robot, "sheets-pdf-form-light");
        robot.type(KeyCode.ESCAPE);
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Shown.class);
    }

    @Test
    void aWindowOverTheMainOneComesAndGoes(FxRobot robot) {
        robot.interact(() -> new SheetsDialogView(scene.getWindow(), model, desk.comfort()));
        robot.interact(model::export);
        assertThat(robot.listWindows()).hasSize(2);
        robot.interact(model::close);
        assertThat(robot.listWindows()).hasSize(1);
    }

    @Test
    void saysWhyThereAreNoSheets(FxRobot robot) {
        robot.interact(() ->
                desk.drawing().change("Film", d -> BandEdits.want(d, List.of(1, 2), new Wanted.Film(1500, 1500))));
        robot.interact(model::export);
        save(robot, "sheets-refused-light");
        robot.interact(() -> desk.comfort().textPercentProperty().set(200));
        save(robot, "sheets-refused-200-light");
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Refused.class);
    }
}
