package tideband.window.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import javafx.event.Event;
import javafx.geometry.Point2D;
import javafx.scene.AccessibleAction;
import javafx.scene.AccessibleAttribute;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyCode;
import javafx.scene.input.MouseButton;
import javafx.scene.input.ScrollEvent;
import javafx.scene.layout.StackPane;
import javafx.scene.paint.Color;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.bench.DrawnFilm;
import tideband.colour.Srgb;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.piece.End;
import tideband.window.Desk;
import tideband.window.ScreenTest;
import tideband.window.look.Look;

/** Drawing with hand and keyboard in a real scene. */
@ScreenTest
class FieldViewTest {
    private final Design start = Desk.shipped("lantern-hook")
            .withBands(List.of(new Band("hook", 0, 160, new Wanted.Film(80, 80), Edge.SOFT)));
    private final FieldDesk field = new FieldDesk(start);
    private FieldView view;
    private Scene scene;

    @Start
    void show(Stage stage) {
        view = new FieldView(field.model, field.desk.comfort());
        StackPane root = new StackPane(view);
        Look.dress(root, field.desk.comfort());
        scene = new Scene(root, 1000, 420);
        stage.setScene(scene);
        stage.show();
        view.requestFocus();
    }

    private Point2D screen(double xPx, double yPx) {
        double stripPx = view.getHeight() - field.model.shown().area().heightPx();
        return view.localToScreen(xPx, yPx + stripPx);
    }

    private void drag(FxRobot robot, Part part, double toX, double toY) {
        Handle handle = field.handle(part);
        robot.moveTo(screen(handle.xPx(), handle.yPx()));
        robot.press(MouseButton.PRIMARY);
        Point2D middle = screen((handle.xPx() + toX) / 2, (handle.yPx() + toY) / 2);
        robot.moveTo(middle);
        robot.moveTo(screen(toX, toY));
        robot.release(MouseButton.PRIMARY);
    }

    private void undoAll(FxRobot robot) {
        robot.interact(() -> {
            while (!field.desk.drawing().undoNameProperty().get().isEmpty()) {
                field.desk.drawing().undo();
            }
        });
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void aRainbowIsDrawnWithTheHandAndUndone(FxRobot robot) {
        Part end = new Part.FadeEnd(0, End.A);
        drag(robot, end, field.handle(end).xPx(), field.py(160));
        Part other = new Part.FadeEnd(0, End.B);
        drag(robot, other, field.handle(other).xPx(), field.py(24));
        DrawnFilm film = field.model.shown().films().get(0);
        // A pointer stands on whole px, so to a nanometre or so.
        assertThat(film.aSideNm()).isCloseTo(160, within(1.0));
        assertThat(film.bSideNm()).isCloseTo(24, within(1.0));
        undoAll(robot);
    }

    @Test
    void twoTonesWithACrispEdgeAreDrawnByKeysAndTheEdgeIsDragged(FxRobot robot) {
        robot.interact(() -> field.model.edits().selectAll());
        robot.interact(() -> field.model.edits().splitMiddle());
        robot.type(KeyCode.UP).type(KeyCode.UP);
        robot.press(KeyCode.SHORTCUT).type(KeyCode.LEFT).type(KeyCode.LEFT).release(KeyCode.SHORTCUT);
        assertThat(field.desk.drawing().selection()).isEqualTo(Selection.of(new Part.EdgeAt(0)));
        robot.interact(() -> field.model.edits().toggleEdge());
        robot.type(KeyCode.RIGHT);
        robot.press(KeyCode.SHIFT).type(KeyCode.RIGHT).release(KeyCode.SHIFT);
        robot.press(KeyCode.ALT).type(KeyCode.LEFT).release(KeyCode.ALT);
        assertThat(field.design().bands().get(0).toMm()).isEqualTo(90.9);
        assertThat(field.design().bands().get(0).edge()).isEqualTo(Edge.CRISP);
        assertThat(field.model.shown().films()).containsExactly(new DrawnFilm(80, 80), new DrawnFilm(82, 82));
        drag(robot, new Part.EdgeAt(0), field.px(40.2), 15);
        assertThat(field.design().bands().get(0).toMm()).isEqualTo(40);
        undoAll(robot);
    }

    @Test
    void escapeInTheMiddleOfADragPutsItBack(FxRobot robot) {
        Handle handle = field.handle(new Part.Level(0));
        robot.moveTo(screen(handle.xPx(), handle.yPx()));
        robot.press(MouseButton.PRIMARY);
        robot.moveTo(screen(handle.xPx(), handle.yPx() - 40));
        assertThat(field.design()).isNotEqualTo(start);
        robot.type(KeyCode.ESCAPE);
        robot.moveTo(screen(handle.xPx(), handle.yPx() - 90));
        robot.release(MouseButton.PRIMARY);
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void doubleClickSplitsAndDeleteTakesAway(FxRobot robot) {
        robot.moveTo(screen(field.px(60), field.py(130)));
        robot.doubleClickOn(MouseButton.PRIMARY);
        assertThat(field.design().bands()).hasSize(2);
        assertThat(field.design().bands().get(0).toMm()).isEqualTo(60);
        robot.type(KeyCode.DELETE);
        assertThat(field.design().bands()).hasSize(1);
    }

    @Test
    void everyHeightHasTheColourOfItsFilm(FxRobot robot) {
        robot.interact(() -> {
            WritableImage picture = scene.snapshot(null);
            double stripPx = view.getHeight() - field.model.shown().area().heightPx();
            int checked = 0;
            for (double nm = 6; nm < 75; nm += 7) {
                double y = Math.floor(field.py(nm));
                double filmNm = field.model.scaleProperty().get().nm(y + 0.5);
                Color painted = picture.getPixelReader().getColor((int) field.px(101), (int) (y + stripPx));
                String hex = field.model.shown().palette().at(filmNm).srgbHex();
                Srgb wanted = Srgb.ofHex(hex);
                assertThat(Math.abs(painted.getRed() - wanted.red())).as(hex).isLessThan(0.02);
                assertThat(Math.abs(painted.getGreen() - wanted.green()))
                        .as(hex)
                        .isLessThan(0.02);
                assertThat(Math.abs(painted.getBlue() - wanted.blue())).as(hex).isLessThan(0.02);
                checked++;
            }
            assertThat(checked).isEqualTo(10);
        });
    }

    @Test
    void assistiveTechnologyHearsThePartAndMovesIt(FxRobot robot) {
        robot.type(KeyCode.PAGE_DOWN);
        assertThat(view.getAccessibleText()).startsWith("band hook, 0 mm to 160 mm, 80 nm · ");
        assertThat(view.queryAccessibleAttribute(AccessibleAttribute.VALUE)).isEqualTo(80.0);
        robot.interact(() -> view.executeAccessibleAction(AccessibleAction.INCREMENT));
        assertThat(view.getAccessibleText()).startsWith("band hook, 0 mm to 160 mm, 81 nm · ");
        assertThat(view.getAccessibleHelp()).contains("Page Down");
        robot.type(KeyCode.TAB);
        assertThat(view.getAccessibleRoleDescription()).isEqualTo("drawing field");
    }

    private static ScrollEvent wheel(double x, double y, double up, boolean shortcut) {
        return new ScrollEvent(
                ScrollEvent.SCROLL,
                x,
                y,
                x,
                y,
                false,
                shortcut,
                false,
                false,
                false,
                false,
                0,
                up,
                0,
                up,
                ScrollEvent.HorizontalTextScrollUnits.NONE,
                0,
                ScrollEvent.VerticalTextScrollUnits.NONE,
                0,
                0,
                null);
    }

    @Test
    void shortcutAndWheelLookNearerAboutThePointer(FxRobot robot) {
        double mm = field.model.viewportProperty().get().mm(500);
        robot.interact(() -> Event.fireEvent(view, wheel(500, 200, 120, true)));
        assertThat(field.model.viewportProperty().get().pxPerMm()).isGreaterThan(9);
        assertThat(field.model.viewportProperty().get().mm(500)).isCloseTo(mm, within(1e-6));
    }
}
