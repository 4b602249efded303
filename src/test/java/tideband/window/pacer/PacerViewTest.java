package tideband.window.pacer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import javafx.event.Event;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.bench.PacedPlans;
import tideband.pacer.Call;
import tideband.pacer.PaceState;
import tideband.pacer.Tone;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.comfort.ComfortModel;

@ScreenTest
class PacerViewTest {
    private long nanos = 1;
    private final List<Tone> heard = new ArrayList<>();
    private final ComfortModel comfort = new ComfortModel();
    private Stage stage;
    private PacerModel model;
    private PacerView view;

    /** Listens. */
    private final class Listener implements Chime {
        @Override
        public void sound(Tone tone) {
            heard.add(tone);
        }

        @Override
        public String trouble() {
            return "";
        }

        @Override
        public void close() {
            // Nothing to give back.
        }
    }

    private PacerModel model(String name, int immersion) {
        BenchPlan plan = PacedPlans.shipped(name);
        return new PacerModel(plan, Colours.of(plan.design()), immersion, comfort, () -> nanos);
    }

    @Start
    void start(Stage shown) {
        stage = shown;
        model = model("chimney-post", 0);
        view = PacerWindow.show(stage, model, new Listener(), () -> nanos);
    }

    private void pass(FxRobot robot, double seconds) {
        robot.interact(() -> {
            nanos += Math.round(seconds * 1e9);
            view.poll();
        });
    }

    private void readyByKey(FxRobot robot) {
        robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        robot.press(KeyCode.RIGHT).release(KeyCode.RIGHT);
        assertThat(model.state()).isEqualTo(new PaceState.Preparing(2, 0));
        robot.press(KeyCode.LEFT).release(KeyCode.LEFT);
        assertThat(model.state()).isEqualTo(new PaceState.Preparing(1, 0));
        robot.interact(() -> {
            while (model.state() instanceof PaceState.Preparing) {
                model.perform(PacerAct.CONFIRM);
            }
        });
    }

    @Test
    void aRunFromPreparationToTheEnd(FxRobot robot) {
        readyByKey(robot);
        assertThat(words(robot)).isEqualTo("READY: 5");
        pass(robot, 2);
        assertThat(words(robot)).isEqualTo("READY: 3");
        robot.press(KeyCode.C).release(KeyCode.C);
        assertThat(words(robot)).isEqualTo("READY: 5");
        pass(robot, 5);
        assertThat(words(robot)).isEqualTo("ON \u00b7 HOLD");
        assertThat(heard).endsWith(Tone.SUPPLY);
        pass(robot, 10);
        robot.press(KeyCode.SPACE).release(KeyCode.SPACE);
        assertThat(words(robot)).isEqualTo("SUPPLY OFF");
        assertThat(heard).endsWith(Tone.ALARM);
        pass(robot, 60);
        robot.press(KeyCode.SPACE).release(KeyCode.SPACE);
        pass(robot, 5);
        robot.press(KeyCode.M).release(KeyCode.M);
        int before = heard.size();
        pass(robot, 20);
        assertThat(words(robot)).isEqualTo("OFF \u00b7 DRAW");
        assertThat(heard).hasSize(before);
        robot.press(KeyCode.M).release(KeyCode.M);
        pass(robot, 50);
        assertThat(model.state()).isInstanceOf(PaceState.Finished.class);
        assertThat(heard).endsWith(Tone.END);
        assertThat(words(robot)).isEqualTo("RINSE");
        robot.press(KeyCode.N).release(KeyCode.N);
        assertThat(stage.getScene().getRoot()).isNotSameAs(view);
    }

    @Test
    void escapeAbortsAtOnceAndAgainDoesNothing(FxRobot robot) {
        readyByKey(robot);
        pass(robot, 40);
        robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(model.state()).isInstanceOf(PaceState.Aborted.class);
        robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(stage.isShowing()).isTrue();
        assertThat(model.state()).isInstanceOf(PaceState.Aborted.class);
        robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(model.state()).isInstanceOf(PaceState.Preparing.class);
        robot.press(KeyCode.Q).release(KeyCode.Q);
        robot.interact(() -> {});
        assertThat(stage.isShowing()).isFalse();
    }

    @Test
    void closingARunAbortsItAndStaysOpen(FxRobot robot) {
        readyByKey(robot);
        pass(robot, 12);
        robot.interact(() -> stage.fireEvent(new WindowEvent(stage, WindowEvent.WINDOW_CLOSE_REQUEST)));
        assertThat(stage.isShowing()).isTrue();
        assertThat(model.state()).isInstanceOf(PaceState.Aborted.class);
    }

    @Test
    void aHeldKeyActsOnce(FxRobot robot) {
        readyByKey(robot);
        pass(robot, 12);
        robot.press(KeyCode.SPACE);
        robot.press(KeyCode.SPACE);
        assertThat(model.state()).isInstanceOf(PaceState.Paused.class);
        robot.release(KeyCode.SPACE);
    }

    @Test
    void buttonsAreForGlovesAndSayTheirKeys(FxRobot robot) {
        readyByKey(robot);
        pass(robot, 12);
        robot.clickOn("#pacer-pause");
        assertThat(model.state()).isInstanceOf(PaceState.Paused.class);
        for (Node node : view.lookupAll(".button")) {
            Button button = (Button) node;
            assertThat(button.getWidth()).isGreaterThanOrEqualTo(64);
            assertThat(button.getHeight()).isGreaterThanOrEqualTo(64);
            assertThat(button.getAccessibleText()).contains("key ");
            assertThat(button.getTooltip().getText()).isNotEmpty();
        }
        Label live = robot.lookup("#pacer-live-words").queryAs(Label.class);
        assertThat(live.getAccessibleText()).startsWith("Paused.");
        robot.clickOn("#pacer-abort");
        assertThat(live.getAccessibleText()).startsWith("Aborted.");
    }

    @Test
    void onTheWholeScreenEscapeIsLeftToThePacer(FxRobot robot) {
        PacerModel run = model("wick-key", 0);
        Stage[] opened = new Stage[1];
        robot.interact(() -> opened[0] = PacerWindow.open(stage, run, System::nanoTime));
        assertThat(opened[0].isFullScreen()).isTrue();
        assertThat(opened[0].getFullScreenExitKeyCombination()).isEqualTo(KeyCombination.NO_MATCH);
        assertThat(opened[0].getFullScreenExitHint()).contains("Esc", "Q");
        robot.interact(() -> ready(run));
        robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(run.state()).isInstanceOf(PaceState.Aborted.class);
        assertThat(opened[0].isFullScreen()).isTrue();
        robot.press(KeyCode.Q).release(KeyCode.Q);
        robot.interact(() -> {});
        assertThat(opened[0].isShowing()).isFalse();
    }

    private static String words(FxRobot robot) {
        return robot.lookup("#pacer-words").queryAs(Label.class).getText();
    }

    /** Lays a run out for a screen of a size. */
    private PacerView at(PacerModel run, double width, double height) {
        PacerView other = new PacerView(run, new Listener(), () -> {}, () -> {});
        new Scene(other, width, height);
        other.resize(width, height);
        lay(other);
        return other;
    }

    private static void lay(PacerView other) {
        for (int i = 0; i < 3; i++) {
            other.applyCss();
            other.layout();
        }
    }

    @Test
    void wordsAreAnEighthOfTheHeightAtEveryMark(FxRobot robot) {
        robot.interact(() -> {
            for (String name : List.of("carry-bail", "vent-plate", "wick-pin", "burner-tube", "lantern-hook")) {
                for (double[] size : new double[][] {{1024, 640}, {1920, 1080}}) {
                    nanos = 1;
                    PacerModel run = model(name, 0);
                    while (run.state() instanceof PaceState.Preparing) {
                        run.perform(PacerAct.CONFIRM);
                    }
                    PacerView other = at(run, size[0], size[1]);
                    double atS = -5;
                    Set<String> seen = new HashSet<>();
                    for (Call call : run.script().calls()) {
                        nanos += Math.round((call.dueS() - atS) * 1e9);
                        atS = call.dueS();
                        other.poll();
                        if (!seen.add(call.words())) {
                            continue;
                        }
                        lay(other);
                        Label label = (Label) other.lookup("#pacer-words");
                        assertThat(label.getFont().getSize())
                                .as(name + " " + call.words())
                                .isGreaterThanOrEqualTo(size[1] * PacerView.WORDS_SHARE);
                    }
                }
            }
        });
    }

    @Test
    void nothingIsClippedInAnyStateAndItCanBeLookedAt(FxRobot robot) {
        robot.interact(() -> {
            everyState("carry-bail", 0, true, 1024, 640);
            everyState("carry-bail", 0, false, 1024, 640);
            pictures("snuffer-handle", 2, false, 1920, 1080, 20);
            pictures("wick-pin", 0, true, 1920, 1080, 38);
            nanos = 1;
            PacerModel run = model("lantern-hook", 0);
            PacerView other = at(run, 3840, 2160);
            ready(run);
            nanos += 95_000_000_000L;
            save(other, "lantern-hook-running");
        });
    }

    /** Text twice as large: what does not fit then is scrolled to. */
    @Test
    void largeTextScrollsByKey(FxRobot robot) {
        robot.interact(() -> {
            comfort.textPercentProperty().set(200);
            PacerModel run = model("carry-bail", 0);
            PacerView other = at(run, 1024, 640);
            run.perform(PacerAct.CONFIRM);
            run.perform(PacerAct.CONFIRM);
            lay(other);
            Pictures.save(other.getScene(), "pacer-large-text");
            ScrollPane pane = (ScrollPane) other.lookup(".scroll-pane");
            assertThat(pane.getContent().getLayoutBounds().getHeight()).isGreaterThan(pane.getHeight());
            assertThat(pane.getVvalue()).isZero();
            Event.fireEvent(
                    other, new KeyEvent(KeyEvent.KEY_PRESSED, "", "", KeyCode.DOWN, false, false, false, false));
            assertThat(pane.getVvalue()).isPositive();
        });
    }

    private static void ready(PacerModel run) {
        while (run.state() instanceof PaceState.Preparing) {
            run.perform(PacerAct.CONFIRM);
        }
    }

    private void pictures(String name, int immersion, boolean dark, int width, int height, double atS) {
        nanos = 1;
        PacerModel run = model(name, immersion);
        if (!dark) {
            run.perform(PacerAct.LIGHT);
        }
        PacerView other = at(run, width, height);
        ready(run);
        nanos += Math.round((5 + atS) * 1e9);
        save(other, name + "-running");
        run.perform(PacerAct.PAUSE);
        save(other, name + "-paused");
        run.perform(PacerAct.ABORT);
        save(other, name + "-aborted");
    }

    private void save(PacerView other, String name) {
        other.poll();
        lay(other);
        Scene scene = other.getScene();
        Pictures.save(scene, "pacer-" + name + "-" + (int) scene.getWidth());
        ScrollPane pane = (ScrollPane) other.lookup(".scroll-pane");
        if (pane.isVisible()) {
            double contentPx = pane.getContent().getLayoutBounds().getHeight();
            assertThat(contentPx).as(name).isLessThanOrEqualTo(pane.getHeight() + 1);
        }
        for (Node node : other.lookupAll(".label")) {
            Label label = (Label) node;
            if (label.isVisible() && label.getParent() == other && label.getOpacity() > 0) {
                assertThat(label.prefWidth(-1))
                        .as(name + " " + label.getText())
                        .isLessThanOrEqualTo(label.getWidth() + 1);
            }
        }
    }

    private void everyState(String name, int immersion, boolean dark, int width, int height) {
        String look = dark ? "-dark" : "-light";
        nanos = 1;
        PacerModel run = model(name, immersion);
        if (!dark) {
            run.perform(PacerAct.LIGHT);
        }
        PacerView other = at(run, width, height);
        save(other, "ready-0" + look);
        run.perform(PacerAct.CONFIRM);
        save(other, "ready-1" + look);
        run.perform(PacerAct.CONFIRM);
        save(other, "ready-2" + look);
        ready(run);
        save(other, "count-in" + look);
        nanos += 20_000_000_000L;
        save(other, "hold" + look);
        nanos += 18_000_000_000L;
        save(other, "draw" + look);
        nanos += 9_000_000_000L;
        save(other, "follow" + look);
        run.perform(PacerAct.PAUSE);
        save(other, "paused" + look);
        run.perform(PacerAct.RESUME);
        save(other, "resume" + look);
        run.perform(PacerAct.ABORT);
        save(other, "aborted" + look);
        run.perform(PacerAct.AGAIN);
        ready(run);
        nanos += 1_000_000_000_000L;
        save(other, "done" + look);
    }
}
