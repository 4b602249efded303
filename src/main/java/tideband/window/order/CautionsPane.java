package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import javafx.collections.ListChangeListener;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.bench.Caution;

/** All cautions of the plan in full. */
final class CautionsPane extends ScrollPane {
    private final OrderModel order;
    private final VBox list = new VBox();

    CautionsPane(OrderModel order) {
        this.order = order;
        getStyleClass().add("cautions");
        list.getStyleClass().add("cautions-list");
        setContent(list);
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        setAccessibleText("Cautions of this plan");
        setFocusTraversable(true);
        order.cautions().addListener((ListChangeListener<Caution>) change -> showIfSeen());
        visibleProperty().addListener((value, before, after) -> showIfSeen());
    }

    private void showIfSeen() {
        if (!isVisible()) {
            return;
        }
        List<Node> rows = new ArrayList<>();
        for (Caution caution : order.cautions()) {
            Label heading = new Label(caution.heading());
            heading.getStyleClass().add("warning");
            Label text = new Label(caution.text());
            for (Label label : List.of(heading, text)) {
                label.setWrapText(true);
                label.setMinHeight(Region.USE_PREF_SIZE);
                rows.add(label);
            }
        }
        list.getChildren().setAll(rows);
    }
}
