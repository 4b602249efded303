package tideband.window.pacer;

import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.Consumer;
import javafx.geometry.Pos;
import javafx.scene.control.Button;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.Region;
import javafx.scene.text.TextAlignment;

/** What can be done now, as buttons for gloved hands, each with its key. */
final class ButtonsView extends Region {
    /** A gloved fingertip and some: no button is lower or narrower, in px. */
    static final double LEAST_PX = 64;

    private static final double GAP_PX = 10;
    private static final double FIRST_EXTRA = 0.6;

    private final PacerModel model;
    private final FarType type = new FarType();
    private final Map<PacerAct, Button> buttons = new EnumMap<>(PacerAct.class);
    private List<PacerAct> shown = List.of();
    private double screenHeight = 1;

    ButtonsView(PacerModel model, Consumer<PacerAct> perform) {
        this.model = model;
        for (PacerAct act : PacerAct.values()) {
            Label key = new Label(act.key());
            key.getStyleClass().add("pacer-key");
            Button button = new Button(act.label(), key);
            button.setId("pacer-" + act.name().toLowerCase(Locale.ROOT).replace('_', '-'));
            button.setContentDisplay(ContentDisplay.BOTTOM);
            button.setAlignment(Pos.CENTER);
            button.setTextAlignment(TextAlignment.CENTER);
            button.getStyleClass().setAll("pacer-button");
            if (act == PacerAct.ABORT) {
                button.getStyleClass().add("pacer-abort");
            }
            // The keys do the same whatever has the focus, so that Enter and Space never mean two things.
            button.setFocusTraversable(false);
            button.setAccessibleText(act.label() + ", key " + act.key());
            button.setAccessibleHelp(act.help());
            button.setTooltip(new Tooltip(act.help() + " (" + act.key() + ")"));
            button.setOnAction(event -> perform.accept(act));
            button.setManaged(false);
            buttons.put(act, button);
        }
        model.comfort().mutedProperty().addListener((value, before, after) -> nameSwitches());
        model.look().darkProperty().addListener((value, before, after) -> nameSwitches());
        nameSwitches();
    }

    private void nameSwitches() {
        buttons.get(PacerAct.MUTE).setText(model.comfort().mutedProperty().get() ? "Sound is OFF" : "Sound is on");
        buttons.get(PacerAct.LIGHT).setText(model.look().darkProperty().get() ? "Light" : "Dark");
        requestLayout();
    }

    void setScreenHeight(double px) {
        screenHeight = px;
        requestLayout();
    }

    double heightPx() {
        return Math.max(LEAST_PX, screenHeight / 10);
    }

    void show(List<PacerAct> acts) {
        if (!acts.equals(shown)) {
            shown = acts;
            getChildren().setAll(acts.stream().map(buttons::get).toList());
            requestLayout();
        }
    }

    @Override
    protected void layoutChildren() {
        double height = heightPx();
        double wantedPx = Math.max(15, screenHeight / 30);
        // The weightiest comes first and is the widest.
        double part = (getWidth() - GAP_PX * (shown.size() - 1)) / (shown.size() + FIRST_EXTRA);
        double x = 0;
        for (PacerAct act : shown) {
            double each = x == 0 ? part * (1 + FIRST_EXTRA) : part;
            Button button = buttons.get(act);
            double px = type.fitPx(button.getText(), true, wantedPx, each - wantedPx);
            button.setStyle(String.format(Locale.ROOT, "-fx-font-size: %.1fpx;", px));
            button.resizeRelocate(x, 0, each, height);
            x += each + GAP_PX;
        }
    }
}
