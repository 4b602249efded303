package tideband.window.status;

import javafx.scene.AccessibleAttribute;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;

/** The line at the foot of the window. */
public final class StatusView extends HBox {

    /**
     * Shows what the model says.
     *
     * @param model the messages
     */
    public StatusView(StatusModel model) {
        Label message = new Label();
        message.setId("status");
        message.textProperty().bind(model.messageProperty());
        message.setMinWidth(0);
        message.setMaxWidth(Double.MAX_VALUE);
        HBox.setHgrow(message, Priority.ALWAYS);
        Tooltip whole = new Tooltip();
        whole.textProperty().bind(model.messageProperty());
        whole.setWrapText(true);
        whole.setMaxWidth(600);
        message.setTooltip(whole);
        message.setAccessibleRole(AccessibleRole.TEXT);
        message.textProperty()
                .addListener(
                        (value, before, after) -> message.notifyAccessibleAttributeChanged(AccessibleAttribute.TEXT));
        getStyleClass().add("status");
        getChildren().add(message);
    }
}
