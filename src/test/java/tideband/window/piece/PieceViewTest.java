package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Slider;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.bands.ReadoutView;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;

@ScreenTest
class PieceViewTest {
    private static final double WIDTH = 800;

    private PieceDesk desk;
    private SimpleObjectProperty<Viewport> viewport;
    private PieceView view;
    private ReadoutView readout;
    private Scene scene;

    @Start
    void start(Stage stage) {
        desk = PieceDesk.with("lantern-hook");
        viewport = new SimpleObjectProperty<>(desk.viewport(WIDTH));
        view = new PieceView(desk.model(), desk.desk().comfort(), viewport);
        readout = new ReadoutView(desk.model(), desk.desk().comfort(), viewport);
        VBox box = new VBox(view, readout);
        VBox.setVgrow(view, Priority.ALWAYS);
        Look.dress(box, desk.desk().comfort());
        scene = new Scene(box, WIDTH, 280);
        stage.setScene(scene);
        stage.show();
    }

    private Node pane() {
        return view.lookup(".piece-pane");
    }

    @Test
    void aClickSelectsTheBandAndPointingReadsThePlace(FxRobot robot) {
        robot.clickOn(pane());
        assertThat(desk.desk().drawing().selection().bands()).containsExactly(1);
        assertThat(pane().getAccessibleText()).contains(" nm · ").contains("dE00");
        robot.interact(() -> Pictures.save(scene, "piece-view-pointed-at"));
    }

    @Test
    void thePieceCanBeReadOffWithTheKeyboard(FxRobot robot) {
        robot.interact(() -> pane().requestFocus());
        assertThat(pane().getAccessibleText()).startsWith("Picture of Lantern hook");
        robot.press(KeyCode.END).release(KeyCode.END);
        assertThat(pane().getAccessibleText()).startsWith("160 mm");
        robot.press(KeyCode.LEFT).release(KeyCode.LEFT);
        assertThat(pane().getAccessibleText()).startsWith("159 mm");
        robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(desk.desk().drawing().selection().bands()).containsExactly(3);
        robot.press(KeyCode.ESCAPE).release(KeyCode.ESCAPE);
        assertThat(pane().getAccessibleText()).startsWith("Picture of Lantern hook");
    }

    @Test
    void theTiltIsSetWithTheKeyboard(FxRobot robot) {
        Slider slider = robot.lookup("#tilt").query();
        robot.interact(slider::requestFocus);
        robot.press(KeyCode.RIGHT).release(KeyCode.RIGHT);
        assertThat(desk.model().tiltDegProperty().get()).isEqualTo(5);
        robot.press(KeyCode.END).release(KeyCode.END);
        assertThat(desk.model().tiltDegProperty().get()).isEqualTo(80);
        assertThat(pane().getBoundsInParent().getHeight()).isGreaterThan(60);
    }

    @Test
    void everyControlHasANameAndFollowsTheModel(FxRobot robot) {
        List<Node> controls = List.of(
                robot.lookup("#tilt").query(),
                robot.lookup("#light").query(),
                robot.lookup("#colours").query());
        assertThat(controls).allSatisfy(c -> assertThat(c.getAccessibleText()).isNotBlank());
        robot.interact(() -> {
            desk.model().lampsProperty().set(Lamps.TWO);
            desk.model().comparisonProperty().set(Comparison.BOTH);
            desk.model().differenceShownProperty().set(true);
        });
        assertThat(robot.lookup("#light").<ChoiceBox<Lamps>>query().getValue()).isEqualTo(Lamps.TWO);
        assertThat(robot.lookup("#difference").<CheckBox>query().isSelected()).isTrue();
        robot.interact(() -> Pictures.save(scene, "piece-view-both"));
    }

    @Test
    void bandsInWordsAreReachedSelectedAndRead(FxRobot robot) {
        List<Node> labels = List.copyOf(readout.getChildrenUnmodifiable());
        assertThat(labels)
                .hasSize(4)
                .allSatisfy(label -> assertThat(label.getAccessibleText()).contains("Wanted: "));
        assertThat(labels.stream().filter(Node::isFocusTraversable)).hasSize(1);
        robot.interact(() -> labels.get(0).requestFocus());
        robot.press(KeyCode.RIGHT).release(KeyCode.RIGHT);
        robot.press(KeyCode.RIGHT).release(KeyCode.RIGHT);
        robot.press(KeyCode.ENTER).release(KeyCode.ENTER);
        assertThat(desk.desk().drawing().selection().bands()).containsExactly(2);
        assertThat(labels.get(2).isFocusTraversable()).isTrue();
        assertThat(labels.get(2).isFocused()).isTrue();
    }

    @Test
    void whatCannotBeMadeAndATooNarrowViewCanBeLookedAt(FxRobot robot) {
        robot.interact(() -> {
            desk.desk().drawing().change("Raise", d -> BandEdits.want(d, List.of(0), new Wanted.Film(900, 900)));
            Pictures.save(scene, "piece-view-cannot");
            desk.desk().comfort().darkProperty().set(true);
            viewport.set(new Viewport(50, 1, 0));
        });
        robot.interact(() -> Pictures.save(scene, "piece-view-narrow"));
        robot.interact(() -> {
            desk.desk().drawing().undo();
            desk.model().tiltDegProperty().set(30);
            viewport.set(new Viewport(0, 20, 90));
        });
        robot.interact(() -> Pictures.save(scene, "piece-view-near"));
        assertThat(readout.getChildrenUnmodifiable().get(0).isVisible()).isFalse();
        assertThat(readout.getChildrenUnmodifiable().get(2).isVisible()).isTrue();
    }
}
