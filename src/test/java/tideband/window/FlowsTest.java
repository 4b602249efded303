package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.BooleanSupplier;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.scene.control.Labeled;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.bench.Work;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Edge;
import tideband.design.Reading;
import tideband.design.Wanted;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.StartingShape;
import tideband.oxide.Metal;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.Viewport;
import tideband.window.files.Answers;
import tideband.window.files.Asks;
import tideband.window.order.WorkCard;
import tideband.window.pacer.PacerView;

/** The main flows, by hand and by keys, in the whole window. */
@ScreenTest
class FlowsTest {
    @TempDir
    Path folder;

    private final AtomicLong nanoTime = new AtomicLong();
    private Threads threads;
    private Answers asks;
    private DrawingDesk desk;

    @Start
    void start(Stage shared) {
        // A stage of its own: the shared one keeps what is bound to it for the tests that follow.
        Stage stage = new Stage();
        Reading<Design> rod = StartingShape.ROUND_ROD.design("Lantern rod", Metal.TITANIUM, Map.of());
        threads = Threads.start(Platform::runLater);
        asks = new Answers();
        stage.setWidth(1280);
        stage.setHeight(800);
        desk = new DrawingDesk(
                stage,
                Beginning.with(((Reading.Read<Design>) rod).value()),
                new ComfortModel(),
                threads,
                new Recovery(folder.resolve("state")),
                new RecentFiles(folder.resolve("recent")),
                asks,
                nanoTime::get);
        desk.show();
    }

    @AfterEach
    void close(FxRobot robot) {
        robot.interact(() -> List.copyOf(Window.getWindows()).forEach(Window::hide));
        threads.close();
    }

    private Design design() {
        return desk.model().drawing().design();
    }

    private Band band(int index) {
        return design().bands().get(index);
    }

    private Wanted.Film film(int index) {
        return (Wanted.Film) band(index).wanted();
    }

    private static void until(BooleanSupplier met) {
        try {
            WaitForAsyncUtils.waitFor(20, TimeUnit.SECONDS, met::getAsBoolean);
        } catch (TimeoutException late) {
            throw new AssertionError("it did not come about within 20 s", late);
        }
        WaitForAsyncUtils.waitForFxEvents();
    }

    private boolean worked() {
        return !desk.model().work().staleProperty().get()
                && desk.model().work().answerProperty().get().orElseThrow().work() instanceof Work.Worked;
    }

    private void keys(FxRobot robot, KeyCode... codes) {
        robot.push(codes);
        WaitForAsyncUtils.waitForFxEvents();
    }

    /** A fade over the whole of a band, by keys alone. */
    private void drawRainbow(FxRobot robot) {
        keys(robot, KeyCode.PAGE_DOWN);
        keys(robot, KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.B);
        keys(robot, KeyCode.CONTROL, KeyCode.K);
        keys(robot, KeyCode.PAGE_UP);
        while (film(0).aSideNm() < 120) {
            keys(robot, KeyCode.SHIFT, KeyCode.UP);
        }
        keys(robot, KeyCode.CONTROL, KeyCode.R);
    }

    @Test
    void drawsARainbowWithKeysAloneAndUndoesItAll(FxRobot robot) {
        byte[] before = DesignFile.bytes(design());
        drawRainbow(robot);
        assertThat(design().bands()).hasSize(2);
        assertThat(film(0).aSideNm()).isGreaterThanOrEqualTo(120);
        assertThat(film(0).bSideNm()).isEqualTo(film(1).aSideNm()).isLessThan(100);
        until(this::worked);
        assertThat(desk.model().order().cards()).isNotEmpty();
        robot.interact(() -> Pictures.save(desk.stage().getScene(), "flow-rainbow"));
        while (!desk.model().drawing().undoNameProperty().get().isEmpty()) {
            keys(robot, KeyCode.CONTROL, KeyCode.Z);
        }
        assertThat(DesignFile.bytes(design())).isEqualTo(before);
        keys(robot, KeyCode.CONTROL, KeyCode.Y);
        assertThat(design().bands()).isNotEqualTo(List.of());
        assertThat(DesignFile.bytes(design())).isNotEqualTo(before);
    }

    @Test
    void drawsTwoTonesWithACrispEdgeByHand(FxRobot robot) {
        keys(robot, KeyCode.PAGE_DOWN);
        keys(robot, KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.B);
        Viewport place = desk.model().field().viewportProperty().get();
        double heightNm = film(0).aSideNm();
        // A double click splits; a drag at the level of the second half lifts it.
        Node field = desk.view().field();
        robot.interact(() -> robot.moveTo(field.localToScreen(place.px(40), fieldY(heightNm))));
        robot.doubleClickOn(field.localToScreen(place.px(40), fieldY(heightNm)));
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(design().bands()).hasSize(2);
        assertThat(band(0).toMm()).isEqualTo(40);
        robot.drag(field.localToScreen(place.px(70), fieldY(heightNm)))
                .moveTo(field.localToScreen(place.px(70), fieldY(heightNm + 20)))
                .dropTo(field.localToScreen(place.px(70), fieldY(110)));
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(film(1).aSideNm()).isBetween(106.0, 114.0);
        robot.doubleClickOn(field.localToScreen(place.px(40), fieldY(60)));
        WaitForAsyncUtils.waitForFxEvents();
        assertThat(band(0).edge()).isEqualTo(Edge.CRISP);
        until(this::worked);
        robot.interact(() -> Pictures.save(desk.stage().getScene(), "flow-two-tones"));
        assertThat(desk.model().order().cards()).anyMatch(card -> card.kind() == WorkCard.Kind.MASK);
    }

    private double fieldY(double filmNm) {
        // The field's own px begin below the strip of its reading.
        double stripPx = desk.view().field().getHeight()
                - desk.model().field().shown().area().heightPx();
        return stripPx + desk.model().field().scaleProperty().get().px(filmNm);
    }

    @Test
    void takesAMatchedColour(FxRobot robot) {
        keys(robot, KeyCode.PAGE_DOWN);
        keys(robot, KeyCode.F8);
        robot.write("#3f4f9a");
        keys(robot, KeyCode.ENTER);
        until(() -> !desk.model().wanted().matchesProperty().get().isEmpty());
        keys(robot, KeyCode.CONTROL, KeyCode.F8);
        Lab wanted = desk.model().work().coloursProperty().get().viewing().lab(Srgb.ofHex("#3f4f9a"));
        Lab taken = desk.model().work().coloursProperty().get().palette().labAt(film(0).aSideNm());
        assertThat(Ciede2000.between(wanted, taken)).isLessThan(5);
        assertThat(desk.model().drawing().undoNameProperty().get()).startsWith("Take");
        robot.interact(() -> Pictures.save(desk.stage().getScene(), "flow-matched"));
    }

    @Test
    void savesAndOpensAgain(FxRobot robot) throws Exception {
        drawRainbow(robot);
        Path file = folder.resolve("rod.json");
        asks.will(Optional.of(file));
        assertThat(desk.stage().getTitle()).contains("changed");
        keys(robot, KeyCode.CONTROL, KeyCode.S);
        until(() -> Files.exists(file) && !desk.files().changedProperty().get());
        assertThat(desk.model().status().messageProperty().get()).isEqualTo("Saved to " + file + ".");
        Design saved = design();
        keys(robot, KeyCode.CONTROL, KeyCode.SHIFT, KeyCode.M);
        assertThat(desk.files().changedProperty().get()).isTrue();
        asks.will(Asks.Unsaved.DISCARD, Optional.of(file));
        keys(robot, KeyCode.CONTROL, KeyCode.O);
        until(() -> design().equals(saved));
        assertThat(desk.files().changedProperty().get()).isFalse();
        assertThat(desk.stage().getTitle()).doesNotContain("changed");
    }

    @Test
    void exportsTheSheets(FxRobot robot) {
        drawRainbow(robot);
        until(this::worked);
        keys(robot, KeyCode.CONTROL, KeyCode.E);
        Path sheets = folder.resolve("sheets");
        robot.interact(() -> desk.model().sheets().form().folderProperty().set(sheets.toString()));
        press(robot, "Write the files");
        until(() -> Files.exists(sheets.resolve("lantern-rod-steps-a4.pdf"))
                && Files.exists(sheets.resolve("lantern-rod-timing.csv")));
        press(robot, "Done");
    }

    @Test
    void pacesAnImmersionToItsEnd(FxRobot robot) {
        drawRainbow(robot);
        until(this::worked);
        keys(robot, KeyCode.F5);
        until(() -> pacer().isPresent());
        PacerView pacer = pacer().orElseThrow();
        for (int i = 0; i < 40 && !pacer.underWay(); i++) {
            keys(robot, KeyCode.ENTER);
        }
        assertThat(pacer.underWay()).isTrue();
        for (int i = 0; i < 2000 && pacer.underWay(); i++) {
            nanoTime.addAndGet(TimeUnit.SECONDS.toNanos(1));
            WaitForAsyncUtils.waitForFxEvents();
            robot.sleep(4);
        }
        until(() -> !pacer.underWay());
        robot.interact(() -> Pictures.save(pacer.getScene(), "flow-paced"));
        keys(robot, KeyCode.Q);
        until(() -> pacer().isEmpty());
    }

    private static Optional<PacerView> pacer() {
        return Window.getWindows().stream()
                .filter(window -> window.getScene() != null && window.getScene().getRoot() instanceof PacerView)
                .map(window -> (PacerView) window.getScene().getRoot())
                .findFirst();
    }

    private static void press(FxRobot robot, String words) {
        until(() -> robot.lookup((Labeled labeled) -> words.equals(labeled.getText()))
                .tryQuery()
                .isPresent());
        robot.clickOn(robot.lookup((Labeled labeled) -> words.equals(labeled.getText()))
                .queryLabeled());
        WaitForAsyncUtils.waitForFxEvents();
    }
}
