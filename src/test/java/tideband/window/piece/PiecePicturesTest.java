package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;

import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.bands.ReadoutView;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;

/** Pictures of every shipped design, for people to look at. */
@ScreenTest
class PiecePicturesTest {
    private static final String[] SHIPPED = {
        "lantern-hook",
        "wick-key",
        "snuffer-handle",
        "carry-bail",
        "wick-pin",
        "vent-plate",
        "chimney-post",
        "burner-tube"
    };

    private Stage stage;

    @Start
    void start(Stage shown) {
        stage = shown;
    }

    @Test
    void everyShippedDesignCanBeLookedAt(FxRobot robot) {
        for (String name : SHIPPED) {
            PieceDesk desk = PieceDesk.with(name);
            robot.interact(() -> {
                shoot(desk, name + "-680", 680, 150, false, 100, 0);
                shoot(desk, name + "-1000", 1000, 200, true, 100, 45);
                shoot(desk, name + "-1000-0", 1000, 200, false, 100, 0);
                shoot(desk, name + "-1000-70", 1000, 200, false, 100, 70);
                desk.model().comparisonProperty().set(Comparison.BOTH);
                desk.model().differenceShownProperty().set(true);
                desk.model().lampsProperty().set(Lamps.TWO);
                shoot(desk, name + "-1000-both", 1000, 260, true, 100, 0);
                shoot(desk, name + "-1000-200", 1000, 400, false, 200, 45);
                desk.model().comparisonProperty().set(Comparison.PREDICTED);
                desk.model().lampsProperty().set(Lamps.EVEN);
                if (name.equals("lantern-hook") || name.equals("burner-tube")) {
                    // The largest, which take the longest to save: one taper and one tube.
                    shoot(desk, name + "-3600", 3600, 300, false, 100, 45);
                }
            });
        }
    }

    private void shoot(PieceDesk desk, String name, double width, double height, boolean dark, int text, double tilt) {
        desk.desk().comfort().darkProperty().set(dark);
        desk.desk().comfort().textPercentProperty().set(text);
        desk.model().tiltDegProperty().set(tilt);
        SimpleObjectProperty<Viewport> viewport = new SimpleObjectProperty<>(desk.viewport(width));
        PieceView view = new PieceView(desk.model(), desk.desk().comfort(), viewport);
        ReadoutView readout = new ReadoutView(desk.model(), desk.desk().comfort(), viewport);
        VBox box = new VBox(view, readout);
        VBox.setVgrow(view, Priority.ALWAYS);
        Look.dress(box, desk.desk().comfort());
        double whole = height + readout.minHeight(-1);
        Scene scene = new Scene(box, width, whole);
        stage.setScene(scene);
        stage.show();
        assertThat(Pictures.save(scene, "piece-" + name).getWidth()).isEqualTo(width);
    }
}
