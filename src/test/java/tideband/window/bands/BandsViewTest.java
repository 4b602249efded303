package tideband.window.bands;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import javafx.scene.Scene;
import javafx.scene.control.TableView;
import javafx.scene.control.TextInputControl;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.entry.Setting;
import tideband.window.entry.TypedSetting;
import tideband.window.look.Look;

@ScreenTest
class BandsViewTest {
    private Desk desk;
    private BandsModel model;
    private BandsView view;
    private Scene scene;

    @Start
    void show(Stage stage) {
        desk = Desk.with("lantern-hook");
        model = new BandsModel(desk.drawing(), desk.work(), desk.comfort());
        view = new BandsView(model, desk.comfort());
        scene = new Scene(view, 300, 560);
        Look.dress(view, desk.comfort());
        stage.setScene(scene);
        stage.show();
    }

    @Test
    void keepsToTheSelectionWhileRowsAreReplaced(FxRobot robot) {
        robot.interact(() -> {
            scene.getRoot().layout();
            desk.drawing().change("Split band", d -> BandEdits.split(d, 3, 150));
            desk.drawing().select(Selection.ofBands(List.of(0, 1, 2, 3, 4)));
            desk.drawing().change("Move edge", d -> BandEdits.moveEdge(d, 0, 20));
            assertThat(desk.drawing().selection().bands()).containsExactly(0, 1, 2, 3, 4);
            desk.drawing().undo();
            assertThat(desk.drawing().selection().bands()).containsExactly(0, 1, 2, 3, 4);
            desk.drawing().undo();
            assertThat(desk.drawing().selection().bands()).containsExactly(0, 1, 2, 3);
            assertThat(model.chosen()).containsExactly(0, 1, 2, 3);
            TableView<?> table = (TableView<?>) view.lookup(".bands-table");
            assertThat(table.getSelectionModel().getSelectedIndices()).containsExactly(0, 1, 2, 3);
        });
    }

    @Test
    void looks(FxRobot robot) {
        picture(robot, "bands-none", 300, 560);
        robot.interact(() -> desk.drawing().select(Selection.of(new Part.Level(1))));
        picture(robot, "bands-one", 300, 560);
        robot.interact(() -> {
            desk.drawing().select(Selection.ofBands(List.of(0, 1, 3)));
            desk.comfort().darkProperty().set(true);
        });
        picture(robot, "bands-several-dark", 300, 560);
        robot.interact(() -> {
            desk.drawing().select(Selection.of(new Part.Level(2)));
            desk.comfort().textPercentProperty().set(200);
            type("beginning of band", "900");
            type("band name", "");
        });
        picture(robot, "bands-faults-dark-large", 600, 1200);
        robot.interact(() -> desk.comfort().darkProperty().set(false));
        picture(robot, "bands-faults-large-small", 300, 560);
        robot.interact(() -> desk.comfort().textPercentProperty().set(100));
        picture(robot, "bands-faults-high", 600, 1200);
    }

    private void type(String thing, String text) {
        for (Setting setting : model.settings()) {
            if (setting.about().thing().equals(thing) && setting instanceof TypedSetting typed) {
                typed.typedProperty().set(text);
                typed.commit();
            }
        }
    }

    private void picture(FxRobot robot, String name, int width, int height) {
        robot.interact(() -> {
            BandsView other = new BandsView(model, desk.comfort());
            Scene canvas = new Scene(other, width, height);
            Look.dress(other, desk.comfort());
            canvas.snapshot(null);
            Pictures.save(canvas, name);
        });
    }

    @Test
    void enterCommitsAndEscapeTakesBack(FxRobot robot) {
        robot.interact(() -> model.commands().get(0).act().run());
        assertThat(scene.getFocusOwner()).isInstanceOf(TextInputControl.class);
        TextInputControl name = (TextInputControl) scene.getFocusOwner();
        robot.interact(() -> name.setText("barb"));
        assertThat(desk.drawing().design().bands().get(0).name()).isNotEqualTo("barb");
        robot.type(KeyCode.ENTER);
        assertThat(desk.drawing().design().bands().get(0).name()).isEqualTo("barb");
        robot.interact(() -> name.setText(" "));
        robot.type(KeyCode.ENTER);
        assertThat(name.getText()).isEqualTo(" ");
        robot.type(KeyCode.ESCAPE);
        assertThat(name.getText()).isEqualTo("barb");
        assertThat(desk.drawing().design().bands().get(0).name()).isEqualTo("barb");
    }

    @Test
    void theTableSelectsByKeyboard(FxRobot robot) {
        robot.interact(() -> {
            desk.drawing().select(Selection.of(new Part.Level(0)));
            scene.lookup(".bands-table").requestFocus();
        });
        robot.type(KeyCode.DOWN);
        assertThat(desk.drawing().selection().bands()).containsExactly(1);
        robot.press(KeyCode.SHIFT).type(KeyCode.DOWN).release(KeyCode.SHIFT);
        assertThat(desk.drawing().selection().bands()).containsExactly(1, 2);
    }
}
