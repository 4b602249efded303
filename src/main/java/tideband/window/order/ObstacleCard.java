package tideband.window.order;

import java.util.Locale;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;

/** Shows an obstacle: where, why, and the nearest change with a button that makes it. */
final class ObstacleCard extends VBox {
    private final Label where = new Label();
    private final Label reason = new Label();
    private final Label change = new Label();
    private final Button show = new Button("Show");
    private final Button mend = new Button();

    ObstacleCard(OrderModel order, int index, Runnable mending) {
        getStyleClass().addAll("card", "obstacle");
        where.getStyleClass().add("heading");
        where.setWrapText(true);
        where.setMinHeight(Region.USE_PREF_SIZE);
        reason.setWrapText(true);
        change.setWrapText(true);
        reason.setMinHeight(Region.USE_PREF_SIZE);
        change.setMinHeight(Region.USE_PREF_SIZE);
        show.setMinWidth(Region.USE_PREF_SIZE);
        mend.setMinWidth(Region.USE_PREF_SIZE);
        mend.getStyleClass().add("mend");
        mend.setTooltip(new Tooltip("Makes this change. It can be undone."));
        mend.disableProperty().bind(order.staleProperty());
        show.setTooltip(new Tooltip("Selects this band in the drawing."));
        show.setOnAction(event -> order.showBand(index));
        mend.setOnAction(event -> {
            // Before the button is out of use, or the focus would go astray.
            mending.run();
            order.mend(index);
        });
        FlowPane acts = new FlowPane(mend, show);
        acts.getStyleClass().add("obstacle-acts");
        getChildren().addAll(where, reason, change, acts);
    }

    void show(ObstacleNote note) {
        where.setText(capital(note.where()));
        reason.setText(reason(note) + ".");
        change.setText("Nearest change: " + note.change() + ".");
        put(show, note.band().isPresent());
        put(mend, note.canMend());
        mend.setText(capital(note.act()));
        show.setAccessibleText("Show " + note.where());
        mend.setAccessibleText("Make this change to " + note.where() + ": " + note.act());
    }

    void takeFocus() {
        (mend.isVisible() ? mend : show).requestFocus();
    }

    private static void put(Button button, boolean there) {
        button.setVisible(there);
        button.setManaged(there);
    }

    /** A band's name stays as it was written, also where the sentence begins with it. */
    private static String reason(ObstacleNote note) {
        boolean named =
                note.band().isPresent() && note.reason().startsWith(note.where().replaceAll("^band \"|\"$", "") + " ");
        return named ? note.reason() : capital(note.reason());
    }

    private static String capital(String text) {
        return text.isEmpty() ? text : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }
}
