package tideband.window.order;

import java.util.List;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableValue;
import tideband.design.Order;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.WorkModel;

/** What can be done with the order of work. */
final class OrderCommands {
    private final List<Command> all;

    OrderCommands(OrderModel order, DrawingModel drawing, WorkModel work) {
        BooleanBinding planned = Bindings.isNotEmpty(order.cards());
        BooleanBinding mendable = Bindings.createBooleanBinding(
                () -> !work.staleProperty().get() && firstMendable(order) >= 0,
                order.obstacles(),
                work.staleProperty());
        ObservableValue<String> otherOrder = Bindings.createStringBinding(
                () -> drawing.design().order() == Order.THICKER_FIRST
                        ? "Order by least minutes"
                        : "Order thicker first",
                drawing.designProperty());
        BooleanBinding always = Bindings.createBooleanBinding(() -> true);
        all = List.of(
                command(
                        "pace-immersion",
                        "Pace this immersion\u2026",
                        "F5",
                        "Leads through the immersion pointed at, or the first, against the clock.",
                        planned,
                        order::paceThis),
                command(
                        "next-step",
                        "Next step",
                        "Alt+Right",
                        "Points at the next card of the order of work.",
                        planned,
                        order::pointNext),
                command(
                        "previous-step",
                        "Previous step",
                        "Alt+Left",
                        "Points at the card before in the order of work.",
                        planned,
                        order::pointPrevious),
                command(
                        "make-nearest-change",
                        "Make nearest change",
                        "Shortcut+M",
                        "Makes the nearest change that takes the first obstacle away. It can be undone.",
                        mendable,
                        () -> order.mend(firstMendable(order))),
                new Command(
                        "switch-order",
                        Command.Menu.BENCH,
                        otherOrder,
                        "Shortcut+Shift+O",
                        "Switches the rule for the order of immersions between thicker first and least minutes, and plans"
                                + " anew.",
                        always,
                        order::switchOrder));
    }

    private static Command command(
            String id, String name, String key, String help, ObservableBooleanValue possible, Runnable act) {
        return new Command(
                id,
                Command.Menu.BENCH,
                new ReadOnlyStringWrapper(name).getReadOnlyProperty(),
                key,
                help,
                possible,
                act);
    }

    private static int firstMendable(OrderModel order) {
        for (int i = 0; i < order.obstacles().size(); i++) {
            if (order.obstacles().get(i).canMend()) {
                return i;
            }
        }
        return -1;
    }

    List<Command> all() {
        return all;
    }
}
