package tideband.window.order;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.Scene;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ListCell;
import javafx.scene.control.ListView;
import javafx.scene.input.KeyCode;
import javafx.stage.Stage;
import org.junit.jupiter.api.Test;
import org.testfx.api.FxRobot;
import org.testfx.framework.junit5.Start;
import tideband.design.Design;
import tideband.edit.BandEdits;
import tideband.window.Desk;
import tideband.window.Pictures;
import tideband.window.ScreenTest;
import tideband.window.look.Look;

@ScreenTest
class OrderViewTest {
    private Stage stage;

    @Start
    void start(Stage given) {
        stage = given;
    }

    private record Shown(Desk desk, OrderModel order, OrderView view, Scene scene) {}

    private Shown show(FxRobot robot, Design design, int width, int height, boolean dark, int percent) {
        Desk desk = Desk.with(design);
        Shown[] shown = new Shown[1];
        robot.interact(() -> {
            desk.comfort().darkProperty().set(dark);
            desk.comfort().textPercentProperty().set(percent);
            OrderModel order = new OrderModel(desk.drawing(), desk.work(), desk.comfort());
            OrderView view = new OrderView(order, desk.comfort());
            Scene scene = new Scene(view, width, height);
            Look.dress(view, desk.comfort());
            stage.setScene(scene);
            stage.setWidth(width);
            stage.setHeight(height);
            stage.show();
            view.applyCss();
            view.layout();
            shown[0] = new Shown(desk, order, view, scene);
        });
        return shown[0];
    }

    private static void picture(FxRobot robot, Shown shown, String name) {
        robot.interact(() -> {
            shown.view().applyCss();
            shown.view().layout();
            Pictures.save(shown.scene(), "order-" + name);
        });
    }

    private static List<ListCell<?>> cells(Shown shown) {
        List<ListCell<?>> cells = new ArrayList<>();
        for (Node node : shown.view().lookupAll(".work-card")) {
            if (node instanceof ListCell<?> cell && !cell.isEmpty()) {
                cells.add(cell);
            }
        }
        return cells;
    }

    @Test
    void theFocusGoesFromTheButtonThatMendsToTheCardsOfTheNewPlan(FxRobot robot) {
        Design beyond = BandEdits.want(Desk.shipped("lantern-hook"), List.of(1), BandEdits.film(210, 74));
        Shown shown = show(robot, beyond, 1000, 200, false, 100);
        robot.interact(() -> {
            Button mend = (Button) shown.view().lookup(".mend");
            mend.requestFocus();
            mend.fire();
        });
        assertThat(shown.order().obstacles()).isEmpty();
        assertThat(shown.scene().getFocusOwner()).isInstanceOf(ListView.class);
    }

    @Test
    void aNameStaysAsItWasWritten(FxRobot robot) {
        Design under = BandEdits.rename(Desk.shipped("wick-pin"), 2, "c");
        under = BandEdits.want(under, List.of(2), BandEdits.film(60, 60));
        Shown shown = show(robot, under, 1000, 200, false, 100);
        assertThat(shown.view().lookupAll(".obstacle .label"))
                .anyMatch(label -> ((Label) label).getText().startsWith("c cannot be finished"));
    }

    @Test
    void picturesOfPlans(FxRobot robot) {
        for (boolean dark : new boolean[] {false, true}) {
            String ink = dark ? "dark" : "light";
            picture(robot, show(robot, Desk.shipped("snuffer-handle"), 1024, 160, dark, 100), "small-" + ink);
            picture(robot, show(robot, Desk.shipped("carry-bail"), 2000, 220, dark, 100), "wide-" + ink);
            picture(robot, show(robot, Desk.shipped("wick-pin"), 1024, 400, dark, 200), "large-" + ink);
            picture(robot, show(robot, Desk.shipped("chimney-post"), 2000, 160, dark, 100), "post-" + ink);
            Shown twelve = show(robot, TwelveBands.design(), 2000, 160, dark, 100);
            picture(robot, twelve, "twelve-" + ink);
            robot.interact(() -> twelve.order().pointedProperty().set(Optional.of(12)));
            picture(robot, twelve, "twelve-pointed-" + ink);
            Shown bad = show(robot, tooThick(), 1024, 160, dark, 100);
            picture(robot, bad, "obstacles-" + ink);
            picture(robot, show(robot, tooThick(), 1024, 400, dark, 200), "obstacles-large-" + ink);
        }
    }

    private static Design tooThick() {
        return BandEdits.want(Desk.shipped("snuffer-handle"), List.of(1, 3), BandEdits.film(300, 300));
    }

    @Test
    void onlyCardsInSightHaveCells(FxRobot robot) {
        Shown shown = show(robot, TwelveBands.design(), 1024, 160, false, 100);
        assertThat(shown.order().cards()).hasSizeGreaterThan(20);
        assertThat(cells(shown)).hasSizeBetween(4, 8);
        for (ListCell<?> cell : cells(shown)) {
            assertThat(cell.getAccessibleText())
                    .isEqualTo(shown.order().cards().get(cell.getIndex()).sentence());
        }
    }

    @Test
    void keysMoveAlongTheCards(FxRobot robot) {
        Shown shown = show(robot, Desk.shipped("snuffer-handle"), 1024, 160, false, 100);
        robot.interact(() -> shown.view().lookup(".work-strip").requestFocus());
        assertThat(shown.order().pointedProperty().get()).hasValue(0);
        robot.type(KeyCode.RIGHT).type(KeyCode.RIGHT);
        assertThat(shown.order().pointedProperty().get()).hasValue(2);
        robot.interact(shown.order()::pointPrevious);
        assertThat(((ListView<?>) shown.view().lookup(".work-strip"))
                        .getFocusModel()
                        .getFocusedIndex())
                .isEqualTo(1);
        picture(robot, shown, "focused");
    }

    @Test
    void stepsFarAwayComeIntoSight(FxRobot robot) {
        Shown shown = show(robot, TwelveBands.design(), 1024, 160, false, 100);
        robot.interact(shown.order()::pointPrevious);
        picture(robot, shown, "last");
        int last = shown.order().cards().size() - 1;
        assertThat(cells(shown)).anyMatch(cell -> cell.getIndex() == last);
    }

    @Test
    void cautionsAreAlwaysNamedAndCanBeReadInFull(FxRobot robot) {
        Shown shown = show(robot, Desk.shipped("snuffer-handle"), 1024, 160, false, 100);
        String gravest = shown.order().cautions().get(0).heading();
        robot.clickOn("Caution: " + gravest + " \u00b7 all "
                + shown.order().cautions().size());
        assertThat(robot.lookup(shown.order().cautions().get(1).text()).tryQuery())
                .isPresent();
        picture(robot, shown, "cautions");
        robot.type(KeyCode.ESCAPE);
        assertThat(shown.view().lookup(".work-strip").isVisible()).isTrue();
    }

    @Test
    void theNearestChangeIsMadeByItsButton(FxRobot robot) {
        Shown shown = show(robot, tooThick(), 1024, 160, false, 100);
        robot.clickOn((Button) shown.view().lookup(".mend"));
        assertThat(shown.order().faultyProperty().get()).containsExactly(3);
        robot.clickOn((Button) shown.view().lookup(".mend"));
        assertThat(shown.order().cards()).isNotEmpty();
        assertThat(shown.view().lookup(".work-strip").isVisible()).isTrue();
    }

    /** Every edge moved again and again, as by a drag: what is shown follows. The time is noted, not judged. */
    @Test
    void dragging(FxRobot robot) throws Exception {
        Shown shown = show(robot, TwelveBands.design(), 1024, 160, false, 100);
        long[] spent = new long[1];
        int moves = 60;
        for (int i = 0; i < moves; i++) {
            double toMm = 30 + 0.1 * i;
            robot.interact(() -> {
                shown.desk().drawing().change("Move edge", d -> BandEdits.moveEdge(d, 1, toMm));
                long start = System.nanoTime();
                shown.view().applyCss();
                shown.view().layout();
                spent[0] += System.nanoTime() - start;
            });
        }
        Files.createDirectories(Path.of("target"));
        Files.writeString(Path.of("target", "order-drag.txt"), spent[0] / moves / 1000 + " us a move");
        for (ListCell<?> cell : cells(shown)) {
            WorkCard card = shown.order().cards().get(cell.getIndex());
            assertThat(cell.getAccessibleText()).isEqualTo(card.sentence());
        }
    }
}
