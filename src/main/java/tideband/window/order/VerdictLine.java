package tideband.window.order;

import javafx.beans.binding.Bindings;
import javafx.beans.property.BooleanProperty;
import javafx.beans.value.ObservableBooleanValue;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ToggleButton;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import tideband.window.action.Command;

/** The line over the cards: what the plan costs and how sure that is, and its gravest caution. */
final class VerdictLine extends FlowPane {
    private final OrderModel order;
    private final ToggleButton cautions = new ToggleButton();

    VerdictLine(OrderModel order) {
        this.order = order;
        getStyleClass().add("verdict-line");
        Label verdict = new Label();
        verdict.getStyleClass().add("numeral");
        verdict.textProperty().bind(order.verdictProperty());
        verdict.setWrapText(true);
        Tooltip more = new Tooltip();
        more.textProperty().bind(Bindings.concat(order.verdictProperty(), "\n", order.savingProperty()));
        verdict.setTooltip(more);
        verdict.accessibleTextProperty().bind(Bindings.concat(order.verdictProperty(), ". ", order.savingProperty()));
        getChildren().addAll(verdict, orderButton(), cautions());
    }

    /** Whether all cautions are shown in full. */
    BooleanProperty allCautionsProperty() {
        return cautions.selectedProperty();
    }

    /** Says what the other order would save, and is there while that is something; under least minutes it leads back. */
    private Node orderButton() {
        Command command = order.commands().stream()
                .filter(c -> c.id().equals("switch-order"))
                .findFirst()
                .orElseThrow();
        Button button = new Button();
        button.getStyleClass().add("switch-order");
        button.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> order.savedMinProperty().get() > 0
                                ? "Least minutes: saves "
                                        + BenchFigures.minutes(
                                                order.savedMinProperty().get())
                                : command.name().getValue(),
                        order.savedMinProperty(),
                        command.name()));
        button.setTooltip(new Tooltip(command.help()));
        button.setAccessibleHelp(command.help());
        button.setOnAction(event -> command.act().run());
        seenIf(
                button,
                Bindings.isNotEmpty(order.cards())
                        .and(order.savedMinProperty().greaterThan(0).or(order.leastMinutesProperty())));
        return button;
    }

    private Node cautions() {
        cautions.getStyleClass().add("caution-button");
        cautions.textProperty()
                .bind(Bindings.createStringBinding(this::cautionText, cautions.selectedProperty(), order.cautions()));
        cautions.setTooltip(new Tooltip("Shows every caution of this plan in full; Esc goes back to the cards."));
        cautions.setAccessibleHelp("Shows every caution of this plan in full.");
        seenIf(cautions, Bindings.isNotEmpty(order.cautions()));
        cautions.visibleProperty()
                .addListener((value, before, after) -> cautions.setSelected(cautions.isSelected() && after));
        return cautions;
    }

    private String cautionText() {
        if (order.cautions().isEmpty()) {
            return "";
        }
        return cautions.isSelected()
                ? "Back to the cards"
                : "Caution: " + order.cautions().get(0).heading() + " \u00b7 all "
                        + order.cautions().size();
    }

    private static void seenIf(Node node, ObservableBooleanValue there) {
        node.visibleProperty().bind(there);
        node.managedProperty().bind(there);
    }
}
