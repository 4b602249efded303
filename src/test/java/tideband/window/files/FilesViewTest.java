package tideband.window.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.function.Function;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.document.Leftover;
import tideband.document.Sample;
import tideband.piece.Section;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.comfort.ComfortModel;

/** The dialogs as they are seen, answered by mouse and keyboard. */
@ScreenTest
class FilesViewTest {
    private final ComfortModel comfort = new ComfortModel();
    private FilesView view;

    @Start
    void show(Stage stage) {
        stage.setScene(new Scene(new StackPane(), 1024, 640));
        stage.show();
        view = new FilesView(stage, comfort);
    }

    /** Asks, takes a picture of the dialog, answers, and gives what came of it. */
    private Object asked(FxRobot robot, String picture, Function<Asks, ?> question, Runnable answer) {
        CompletableFuture<Object> answered = new CompletableFuture<>();
        Platform.runLater(() -> answered.complete(question.apply(view)));
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(() -> Pictures.save(dialog().getScene(), picture));
        answer.run();
        try {
            return answered.get(10, TimeUnit.SECONDS);
        } catch (InterruptedException | ExecutionException | TimeoutException e) {
            throw new AssertionError(e);
        }
    }

    private static Window dialog() {
        List<Window> windows = Window.getWindows();
        return windows.get(windows.size() - 1);
    }

    @Test
    void changesAreAskedAboutByActs(FxRobot robot) {
        Function<Asks, Asks.Unsaved> question = asks -> asks.unsaved("lantern-hook");
        assertThat(asked(robot, "files-unsaved-light", question, () -> robot.clickOn("Discard changes")))
                .isEqualTo(Asks.Unsaved.DISCARD);
        robot.interact(() -> comfort.darkProperty().set(true));
        assertThat(asked(robot, "files-unsaved-dark", question, () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(Asks.Unsaved.KEEP_DRAWING);
        robot.interact(() -> comfort.textPercentProperty().set(200));
        assertThat(asked(robot, "files-unsaved-large", question, () -> robot.type(KeyCode.ENTER)))
                .isEqualTo(Asks.Unsaved.SAVE);
    }

    @Test
    void whatAnotherProgramDidIsSaid(FxRobot robot) {
        assertThat(asked(
                        robot,
                        "files-elsewhere-light",
                        asks -> asks.changedElsewhere("wick-key.json", false, true),
                        () -> robot.clickOn("Load it")))
                .isEqualTo(Asks.Elsewhere.LOAD);
        // Enter does no harm.
        assertThat(asked(
                        robot,
                        "files-elsewhere-plain-light",
                        asks -> asks.changedElsewhere("wick-key.json", false, false),
                        () -> robot.type(KeyCode.ENTER)))
                .isEqualTo(Asks.Elsewhere.KEEP_MINE);
        robot.interact(() -> comfort.darkProperty().set(true));
        assertThat(asked(
                        robot,
                        "files-bath-dark",
                        asks -> asks.bathInTheWay("shop-tantalum.json", "shop-tantalum 2.json"),
                        () -> robot.clickOn("Replace the bath there")))
                .isEqualTo(Asks.BathChoice.REPLACE);
        assertThat(asked(
                        robot,
                        "files-overwrite-dark",
                        asks -> asks.overwrite("wick-key.json"),
                        () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(Asks.Overwrite.KEEP_DRAWING);
    }

    @Test
    void drawingsLeftOpenAreListed(FxRobot robot) {
        List<Leftover> drawings = List.of(
                new Leftover(
                        Sample.LANTERN_HOOK.design(),
                        Optional.of(Path.of("/home/lamp/orders/2026/lantern-hook.json")),
                        Instant.EPOCH,
                        Path.of("/x")),
                new Leftover(Sample.VENT_PLATE.design(), Optional.empty(), Instant.EPOCH, Path.of("/y")));
        Object choice = asked(robot, "files-left-light", asks -> asks.leftBehind(drawings), () -> {
            robot.type(KeyCode.DOWN);
            robot.clickOn("Discard");
        });
        assertThat(choice).isEqualTo(Optional.of(new Asks.LeftChoice(Asks.LeftChoice.Act.DISCARD, drawings.get(1))));
        robot.interact(() -> comfort.darkProperty().set(true));
        assertThat(asked(robot, "files-left-again-light", asks -> asks.leftBehind(drawings), () -> {
                    robot.type(KeyCode.DOWN);
                    robot.type(KeyCode.ENTER);
                }))
                .isEqualTo(Optional.of(new Asks.LeftChoice(Asks.LeftChoice.Act.OPEN, drawings.get(1))));
        assertThat(asked(robot, "files-left-dark", asks -> asks.leftBehind(drawings), () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(Optional.empty());
    }

    @Test
    void allFaultsAreShown(FxRobot robot) {
        Reading<Design> reading = DesignFile.read(
                "{ \"format\": \"tideband-design\", \"metal\": \"tin\", \"titel\": 4 }"
                        .getBytes(StandardCharsets.UTF_8),
                Optional.empty());
        Function<Asks, Boolean> question = asks -> {
            asks.faults("\"lamp.json\" could not be opened.", ((Reading.Faulty<Design>) reading).faults());
            return true;
        };
        assertThat(asked(robot, "files-faults-light", question, () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(true);
        robot.interact(() -> comfort.darkProperty().set(true));
        assertThat(asked(robot, "files-faults-dark", question, () -> robot.type(KeyCode.ENTER)))
                .isEqualTo(true);
    }

    @Test
    void aNewDrawingIsDescribed(FxRobot robot) {
        Object drawn = asked(robot, "files-new-light", Asks::newDrawing, () -> {
            robot.clickOn("Tube");
            robot.doubleClickOn(field(robot, "Bore in mm")).write("12");
            robot.clickOn("Begin drawing");
            robot.interact(() -> Pictures.save(dialog().getScene(), "files-new-faulty-light"));
            robot.doubleClickOn(field(robot, "Bore in mm")).write("5");
            robot.clickOn("Begin drawing");
        });
        assertThat(drawn)
                .isInstanceOfSatisfying(
                        Optional.class,
                        design -> assertThat(((Design) design.get()).piece().section())
                                .isEqualTo(new Section.Tube(5)));
        robot.interact(() -> comfort.darkProperty().set(true));
        robot.interact(() -> comfort.textPercentProperty().set(200));
        assertThat(asked(robot, "files-new-large", Asks::newDrawing, () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(Optional.empty());
        robot.interact(() -> comfort.textPercentProperty().set(100));
        assertThat(asked(robot, "files-new-dark", Asks::newDrawing, () -> robot.type(KeyCode.ESCAPE)))
                .isEqualTo(Optional.empty());
    }

    private static Node field(FxRobot robot, String accessibleText) {
        return robot.lookup(node -> accessibleText.equals(node.getAccessibleText()))
                .query();
    }
}
