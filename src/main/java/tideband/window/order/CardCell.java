package tideband.window.order;

import java.util.Objects;
import java.util.function.IntConsumer;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.ListCell;
import javafx.scene.control.Tooltip;
import tideband.piece.Piece;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** Shows one card; the list uses it again and again for whatever card comes into sight. */
final class CardCell extends ListCell<Integer> {
    // What a picture depends on.
    private record Painted(WorkCard card, Piece piece, boolean first, boolean pointed, Look look) {}

    private final OrderModel order;
    private final ComfortModel comfort;
    private final Canvas canvas = new Canvas();
    private final Tooltip tooltip = new Tooltip();
    private WorkCard told;
    private Painted painted;

    CardCell(OrderModel order, ComfortModel comfort, IntConsumer point) {
        this.order = order;
        this.comfort = comfort;
        setContentDisplay(ContentDisplay.GRAPHIC_ONLY);
        setAccessibleRole(AccessibleRole.LIST_ITEM);
        getStyleClass().add("work-card");
        setOnMouseEntered(event -> {
            if (!isEmpty()) {
                point.accept(getIndex());
            }
        });
    }

    /** As high as the strip, whatever that is: a card never asks for a bar of its own. */
    @Override
    protected double computePrefHeight(double width) {
        return 1;
    }

    @Override
    protected void updateItem(Integer place, boolean empty) {
        super.updateItem(place, empty);
        refresh();
    }

    /** Shows the card that now stands at this place; what has not changed is left as it is. */
    void refresh() {
        WorkCard card =
                !isEmpty() && getItem() < order.cards().size() ? order.cards().get(getItem()) : null;
        tell(card);
        if (card != null) {
            paint(card);
        }
    }

    private void tell(WorkCard card) {
        if (Objects.equals(card, told)) {
            return;
        }
        told = card;
        if (card != null) {
            tooltip.setText(card.sentence());
        }
        setTooltip(card == null ? null : tooltip);
        setAccessibleText(card == null ? null : card.sentence());
        setGraphic(card == null ? null : canvas);
    }

    private void paint(WorkCard card) {
        Look look = Look.of(comfort);
        double width = CardPainter.WIDTH_EM * look.emPx();
        double height = CardPainter.HEIGHT_EM * look.emPx();
        if (canvas.getWidth() != width || canvas.getHeight() != height) {
            canvas.setWidth(width);
            canvas.setHeight(height);
        }
        int before = card.number() - 2;
        boolean first = before < 0
                || before >= order.cards().size()
                || order.cards().get(before).immersion() != card.immersion();
        boolean pointed =
                order.pointedProperty().get().filter(i -> i == getIndex()).isPresent();
        Painted next = new Painted(card, order.pieceProperty().get(), first, pointed, look);
        if (next.equals(painted)) {
            return;
        }
        painted = next;
        new CardPainter(canvas.getGraphicsContext2D(), look).paint(card, next.piece(), first, pointed);
    }
}
