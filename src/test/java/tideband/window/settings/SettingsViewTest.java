package tideband.window.settings;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.Locale;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.control.TitledPane;
import javafx.scene.control.skin.ComboBoxListViewSkin;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.entry.Setting;
import tideband.window.entry.TypedSetting;
import tideband.window.look.Look;

@ScreenTest
class SettingsViewTest {
    private final Desk desk = Desk.with("wick-pin");
    private final SettingsModel model = new SettingsModel(
            desk.drawing(), desk.work(), desk.comfort(), () -> Optional.of(Path.of("designs", "wick-pin.json")));
    private SettingsView view;
    private Scene scene;

    @Start
    void show(Stage stage) {
        view = new SettingsView(model, desk.comfort());
        scene = new Scene(view, 300, 560);
        Look.dress(view, desk.comfort());
        stage.setScene(scene);
        stage.show();
    }

    @Test
    void looks(FxRobot robot) {
        picture(robot, "settings-folded", 300, 560, "");
        for (Group group : model.groups()) {
            String name = group.title().toLowerCase(Locale.ROOT).replace(' ', '-');
            picture(robot, "settings-" + name, 300, 560, group.title());
        }
        robot.interact(() -> {
            type(model, "bath resistance", "abc");
            type(model, "native film", "99");
            type(model, "bath ratio", "2.5");
            model.bath().load();
            model.stations().rows().get(1).size().typedProperty().set("0");
            model.stations().rows().get(1).size().commit();
            model.stations().add();
            desk.comfort().darkProperty().set(true);
        });
        picture(robot, "settings-faults-dark", 300, 1200, "Bath");
        picture(robot, "settings-stations-dark", 300, 560, "Piece");
        robot.interact(() -> {
            desk.comfort().textPercentProperty().set(200);
            desk.comfort().darkProperty().set(false);
        });
        picture(robot, "settings-faults-large", 600, 1200, "Bath");
        picture(robot, "settings-stations-large", 600, 1200, "Piece");
        picture(robot, "settings-large-small", 300, 560, "Hand and fades");
        assertThat(model.bath().fileFaults()).isNotEmpty();
    }

    @Test
    void theListSaysWhatEachChoiceIs(FxRobot robot) {
        robot.interact(() -> view.unfold("Metal and look"));
        ComboBox<?> metals = robot.lookup(".choices").queryComboBox();
        robot.interact(metals::show);
        robot.interact(() -> {
            Node list = ((ComboBoxListViewSkin<?>) metals.getSkin()).getPopupContent();
            Pictures.save(list, "settings-metals");
            assertThat(list.lookupAll(".choice-meaning").stream().map(n -> ((Label) n).getText()))
                    .contains("Its film is Nb2O5.");
            metals.hide();
        });
    }

    @Test
    void f7GoesToTheSettings(FxRobot robot) {
        robot.interact(() -> model.commands().get(0).act().run());
        assertThat(scene.getFocusOwner()).isInstanceOf(TitledPane.class);
        robot.type(KeyCode.SPACE);
        assertThat(((TitledPane) scene.getFocusOwner()).isExpanded()).isTrue();
        robot.type(KeyCode.TAB);
        assertThat(scene.getFocusOwner()).isInstanceOf(TextField.class);
    }

    private void picture(FxRobot robot, String name, int width, int height, String unfolded) {
        robot.interact(() -> {
            SettingsView other = new SettingsView(model, desk.comfort());
            Scene canvas = new Scene(other, width, height);
            Look.dress(other, desk.comfort());
            canvas.snapshot(null);
            other.unfold(unfolded);
            canvas.snapshot(null);
            other.unfold(unfolded);
            Pictures.save(canvas, name);
        });
    }

    private static void type(SettingsModel model, String thing, String text) {
        for (Group group : model.groups()) {
            for (Setting setting : group.settings()) {
                if (setting.about().thing().equals(thing) && setting instanceof TypedSetting typed) {
                    typed.typedProperty().set(text);
                    typed.commit();
                }
            }
        }
    }
}
