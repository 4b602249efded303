package tideband.window.order;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.bench.Colours;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.window.Desk;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.WorkModel;

/** What is shown, and can be done, where a design cannot be made. */
class ObstaclesTest {
    private final Desk desk = Desk.with("snuffer-handle");
    private final OrderModel order = new OrderModel(desk.drawing(), desk.work(), desk.comfort());

    private static Design tooThick(Design design) {
        return BandEdits.want(design, List.of(1, 3), BandEdits.film(300, 300));
    }

    private Command command(String id) {
        return order.commands().stream()
                .filter(c -> c.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void eachObstacleNamesItsBandAndIsMendedInOneStep() {
        assertThat(command("make-nearest-change").possible().get()).isFalse();
        desk.drawing().change("Draw", ObstaclesTest::tooThick);
        assertThat(order.cards()).isEmpty();
        assertThat(order.cautions()).isEmpty();
        assertThat(order.minutesProperty().get()).isNaN();
        assertThat(order.faultyProperty().get()).containsExactly(1, 3);
        assertThat(order.obstacles()).hasSize(2).allMatch(ObstacleNote::canMend);
        assertThat(order.verdictProperty().get()).isEqualTo("Cannot be made yet: 2 obstacles");
        order.showBand(1);
        assertThat(desk.drawing().selection().bands()).containsExactly(3);
        Design before = desk.drawing().design();
        String act = order.obstacles().get(1).act();
        order.mend(1);
        assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Make the nearest change: " + act);
        assertThat(order.faultyProperty().get()).containsExactly(1);
        command("make-nearest-change").act().run();
        assertThat(order.faultyProperty().get()).isEmpty();
        assertThat(order.cards()).isNotEmpty();
        assertThat(command("make-nearest-change").possible().get()).isFalse();
        desk.drawing().undo();
        desk.drawing().undo();
        assertThat(desk.drawing().design()).isEqualTo(before);
    }

    /** A change worked out for an earlier drawing would take later edits back without a word. */
    @Test
    void nothingIsMendedWhileTheAnswerIsToAnEarlierDrawing() {
        Design design = tooThick(Desk.shipped("snuffer-handle"));
        DrawingModel drawing = new DrawingModel(design);
        Deque<Runnable> beside = new ArrayDeque<>();
        WorkModel work = new WorkModel(drawing.designProperty(), Colours.of(design), beside::add, Runnable::run);
        OrderModel late = new OrderModel(drawing, work, desk.comfort());
        assertThat(late.verdictProperty().get()).isEqualTo("The plan is being worked out.");
        beside.remove().run();
        drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 31));
        Design edited = drawing.design();
        late.mend(0);
        assertThat(drawing.design()).isEqualTo(edited);
        beside.remove().run();
        late.mend(0);
        assertThat(drawing.design()).isNotEqualTo(edited);
        assertThat(drawing.design().bands().get(0).toMm()).isEqualTo(31);
    }

    @Test
    void aPieceThatStaysBareHasNothingToDo() {
        desk.drawing()
                .change(
                        "Bare",
                        d -> d.withBands(d.bands().stream()
                                .map(b -> new Band(b.name(), b.fromMm(), b.toMm(), new Wanted.Bare(), b.edge()))
                                .toList()));
        assertThat(order.cards()).isEmpty();
        assertThat(order.verdictProperty().get()).isEqualTo("0 min \u00b7 nothing to do: every band is bare");
        order.paceThis();
    }
}
