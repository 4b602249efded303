package tideband.window.field;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.bench.Colours;
import tideband.colour.Srgb;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.ColourMatch;
import tideband.piece.End;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.look.Look;
import tideband.window.work.Glance;

/** Pictures of the field for people to look at, and what can be checked of them. */
@ScreenTest
class FieldPicturesTest {
    private static final Map<String, Design> DESIGNS = Map.of(
            "hook", Desk.shipped("lantern-hook"),
            "snuffer", Desk.shipped("snuffer-handle"),
            "post", Desk.shipped("chimney-post"),
            "twelve", TwelveBands.design());

    private Stage stage;

    @Start
    void start(Stage first) {
        stage = first;
    }

    private WritableImage picture(FieldDesk field, int width, int height, String name) {
        FieldView view = new FieldView(field.model, field.desk.comfort());
        StackPane root = new StackPane(view);
        Look.dress(root, field.desk.comfort());
        Scene scene = new Scene(root, width, height);
        stage.setScene(scene);
        stage.show();
        view.requestFocus();
        WritableImage picture = Pictures.save(scene, name);
        assertThat(view.getWidth()).isEqualTo(width);
        return picture;
    }

    @Test
    void allDesignsInAllSizesAndLooks(FxRobot robot) {
        robot.interact(() -> DESIGNS.forEach((name, design) -> {
            for (int[] size : new int[][] {{680, 240}, {1000, 420}, {2400, 900}}) {
                for (int percent : new int[] {100, 200}) {
                    FieldDesk field = new FieldDesk(design);
                    boolean dark = percent == 200 ^ size[0] == 1000;
                    field.desk.comfort().darkProperty().set(dark);
                    field.desk.comfort().textPercentProperty().set(percent);
                    field.model.keyboard().stepBand(1, false);
                    picture(field, size[0], size[1], "field-" + name + "-" + size[0] + "-" + percent);
                }
            }
        }));
    }

    @Test
    void everythingPluggedIn(FxRobot robot) {
        robot.interact(() -> {
            FieldDesk field = new FieldDesk(TwelveBands.design());
            Colours colours = field.desk.work().coloursProperty().get();
            field.matches.set(new ColourMatch(colours.palette(), colours.scale())
                    .find(Srgb.ofHex("#3f4f9a").lab(), 2)
                    .bestFirst());
            field.faulty.set(List.of(4, 10));
            field.desk.drawing().select(Selection.of(new Part.FadeEnd(7, End.B)));
            picture(field, 1000, 420, "field-matches-faulty");
            field.matches.set(List.of());
            field.faulty.set(List.of());
            field.glance.set(Optional.of(new Glance(
                    0,
                    End.A,
                    List.of(
                            new Glance.Point(0, 150),
                            new Glance.Point(16, 150),
                            new Glance.Point(40, 90),
                            new Glance.Point(120, 60),
                            new Glance.Point(192, 60)),
                    List.of(new Glance.Stretch(80, 96), new Glance.Stretch(140, 200)),
                    List.of(0, 1, 6))));
            field.desk.drawing().select(new Selection(List.of(1, 2), Optional.of(new Part.Level(2))));
            field.model.hand().hover(300, 200);
            picture(field, 1000, 420, "field-glance");
            field.glance.set(Optional.empty());
            field.desk.drawing().select(Selection.of(new Part.EdgeAt(2)));
            field.model.sight().zoomAlong(4, field.px(60));
            field.model.sight().zoomUp(2, field.py(90));
            picture(field, 1000, 420, "field-zoomed");
        });
    }
}
