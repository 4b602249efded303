package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.fail;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Queue;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.ConcurrentLinkedQueue;
import javafx.application.Platform;
import javafx.geometry.Bounds;
import javafx.geometry.Point2D;
import javafx.scene.Node;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.robot.Robot;
import javafx.stage.Stage;
import javafx.stage.Window;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import org.testfx.util.WaitForAsyncUtils;
import tideband.design.BathFile;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.files.Answers;

/** Property: whatever keys, clicks, drags and commands come, and in whatever order, the drawing stays whole. */
@ScreenTest
class AtRandomTest {
    /** Commands that ask for a file, or that put another window in front. */
    private static final Set<String> NOT_THESE =
            Set.of("load-bath", "colour-from-image", "export-sheets", "print-sheets", "pace-immersion");

    private static final List<KeyCode> KEYS = List.of(
            KeyCode.LEFT,
            KeyCode.RIGHT,
            KeyCode.UP,
            KeyCode.DOWN,
            KeyCode.PAGE_UP,
            KeyCode.PAGE_DOWN,
            KeyCode.HOME,
            KeyCode.END,
            KeyCode.ENTER,
            KeyCode.ESCAPE,
            KeyCode.TAB,
            KeyCode.DELETE,
            KeyCode.BACK_SPACE,
            KeyCode.SPACE);

    @TempDir
    Path folder;

    private final Queue<Throwable> faults = new ConcurrentLinkedQueue<>();
    private final List<String> acts = new ArrayList<>();
    private Threads threads;
    private DrawingDesk desk;
    private Stage stage;

    @Start
    void start(Stage given) {
        stage = given;
    }

    private void open(String name) {
        threads = Threads.start(Platform::runLater);
        stage.setWidth(1280);
        stage.setHeight(800);
        desk = new DrawingDesk(
                stage,
                Beginning.with(Desk.shipped(name)),
                new ComfortModel(),
                threads,
                new Recovery(folder.resolve("state")),
                new RecentFiles(folder.resolve("recent")),
                new Answers(),
                System::nanoTime);
        Thread.currentThread().setUncaughtExceptionHandler((thread, fault) -> keep(fault));
        Thread.setDefaultUncaughtExceptionHandler((thread, fault) -> keep(fault));
        desk.show();
    }

    @AfterEach
    void close(FxRobot robot) {
        Thread.setDefaultUncaughtExceptionHandler(null);
        robot.interact(() -> {
            Thread.currentThread().setUncaughtExceptionHandler(null);
            List.copyOf(Window.getWindows()).forEach(Window::hide);
        });
        threads.close();
    }

    @ParameterizedTest
    @CsvSource({"snuffer-handle, 1", "burner-tube, 2", "chimney-post, 3"})
    void staysWhole(String name, long seed, FxRobot robot) {
        robot.interact(() -> open(name));
        byte[] first = DesignFile.bytes(desk.model().drawing().design());
        Random lot = new Random(seed);
        Robot[] hand = new Robot[1];
        robot.interact(() -> hand[0] = new Robot());
        for (int i = 0; i < 30; i++) {
            robot.interact(() -> {
                for (int k = 0; k < 6; k++) {
                    act(lot, hand[0]);
                }
            });
            robot.interact(this::isWhole);
        }
        robot.interact(() -> {
            hand[0].mouseRelease(MouseButton.PRIMARY);
            while (!desk.model().drawing().undoNameProperty().get().isEmpty()) {
                desk.model().drawing().undo();
            }
        });
        WaitForAsyncUtils.waitForFxEvents();
        robot.interact(this::isWhole);
        assertThat(DesignFile.bytes(desk.model().drawing().design())).isEqualTo(first);
        robot.interact(() -> {
            while (!desk.model().drawing().redoNameProperty().get().isEmpty()) {
                desk.model().drawing().redo();
            }
        });
        robot.interact(this::isWhole);
    }

    private void act(Random lot, Robot hand) {
        try {
            switch (lot.nextInt(6)) {
                case 0, 1 -> command(lot);
                case 2, 3 -> key(lot);
                default -> mouse(lot, hand);
            }
        } catch (RuntimeException | AssertionError fault) {
            keep(fault);
        }
    }

    private void keep(Throwable fault) {
        // A click may ask for a file, and the screen in memory has no dialogs of the system's.
        boolean dialog = fault instanceof UnsupportedOperationException
                && fault.getStackTrace().length > 0
                && fault.getStackTrace()[0].getMethodName().startsWith("staticCommonDialogs");
        if (!dialog) {
            faults.add(fault);
        }
    }

    private void command(Random lot) {
        List<Command> commands = desk.model().commands();
        Command command = commands.get(lot.nextInt(commands.size()));
        if (!NOT_THESE.contains(command.id()) && command.possible().get()) {
            acts.add(command.id());
            command.act().run();
        }
    }

    private void key(Random lot) {
        Node focus = stage.getScene().getFocusOwner();
        if (focus == null) {
            return;
        }
        boolean shift = lot.nextInt(4) == 0;
        boolean control = lot.nextInt(6) == 0;
        boolean alt = lot.nextInt(8) == 0;
        if (lot.nextInt(3) == 0) {
            String typed = String.valueOf("0123456789.,-#abc ".charAt(lot.nextInt(18)));
            acts.add("type " + typed);
            focus.fireEvent(
                    new KeyEvent(KeyEvent.KEY_TYPED, typed, typed, KeyCode.UNDEFINED, false, false, false, false));
            return;
        }
        KeyCode code = KEYS.get(lot.nextInt(KEYS.size()));
        acts.add("key " + (control ? "control " : "") + (shift ? "shift " : "") + (alt ? "alt " : "") + code);
        focus.fireEvent(new KeyEvent(KeyEvent.KEY_PRESSED, "", "", code, shift, control, alt, false));
        focus.fireEvent(new KeyEvent(KeyEvent.KEY_RELEASED, "", "", code, shift, control, alt, false));
    }

    /** Presses, moves and releases anywhere below the menus; half the time in the field. */
    private void mouse(Random lot, Robot hand) {
        Node field = desk.view().field();
        Bounds room = lot.nextBoolean()
                ? field.localToScreen(field.getBoundsInLocal())
                : desk.view().getCenter().localToScreen(desk.view().getCenter().getBoundsInLocal());
        Point2D at = new Point2D(
                room.getMinX() + lot.nextDouble() * room.getWidth(),
                room.getMinY() + lot.nextDouble() * room.getHeight());
        acts.add("mouse " + at);
        hand.mouseMove(at);
        switch (lot.nextInt(4)) {
            case 0 -> hand.mousePress(MouseButton.PRIMARY);
            case 1 -> hand.mouseRelease(MouseButton.PRIMARY);
            case 2 -> {
                hand.mousePress(MouseButton.PRIMARY);
                hand.mouseRelease(MouseButton.PRIMARY);
            }
            default -> hand.mouseWheel(lot.nextInt(7) - 3);
        }
    }

    private void isWhole() {
        if (!faults.isEmpty()) {
            StringWriter words = new StringWriter();
            faults.element().printStackTrace(new PrintWriter(words, true));
            fail("after " + acts.subList(Math.max(0, acts.size() - 30), acts.size()) + "\n" + words);
        }
        Design design = desk.model().drawing().design();
        Optional<byte[]> bath =
                design.bathFile().isPresent() ? Optional.of(BathFile.bytes(design.bath())) : Optional.empty();
        Reading<Design> again = DesignFile.read(DesignFile.bytes(design), name -> bath);
        assertThat(again).as("after %s", acts).isEqualTo(new Reading.Read<>(design));
    }
}
