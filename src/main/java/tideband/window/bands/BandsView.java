package tideband.window.bands;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.Observable;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableValue;
import javafx.scene.Node;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.window.comfort.ComfortModel;
import tideband.window.entry.Setting;
import tideband.window.entry.SettingView;
import tideband.window.look.Look;

/** The exact values of the selected bands above a table of all bands. */
public final class BandsView extends VBox {
    private final ComfortModel comfort;
    private final BandsModel model;
    private final Label help = new Label("What a value means stands here while it has the focus.");
    private final BandsTableView table;
    private final VBox rows;
    private final ScrollPane values;
    private final List<Control> fields = new ArrayList<>();

    /**
     * Shows bands in exact values.
     *
     * @param model the bands
     * @param comfort what suits the user
     */
    public BandsView(BandsModel model, ComfortModel comfort) {
        this.comfort = comfort;
        this.model = model;
        getStylesheets().add(Setting.class.getResource("entry.css").toExternalForm());
        getStyleClass().add("bands");
        setAccessibleText("Exact values");
        VBox rows = new VBox(paragraph(model.headingProperty(), "fold-title"));
        rows.getStyleClass().addAll("brief-rows", "band-values");
        this.rows = rows;
        for (Setting setting : model.settings()) {
            SettingView row = SettingView.brief(setting);
            fields.add(row.control());
            row.focusWithinProperty().addListener((value, before, after) -> {
                if (after) {
                    help.textProperty().bind(row.helpProperty());
                }
            });
            rows.getChildren().add(row);
        }
        rows.getChildren().add(1, paragraph(model.outcomeProperty(), "setting-origin"));
        values = new ScrollPane(rows);
        values.getStyleClass().add("plain-scroll");
        values.setFitToWidth(true);
        values.setHbarPolicy(ScrollPane.ScrollBarPolicy.AS_NEEDED);
        values.setFocusTraversable(false);
        Look.paintDirectly(values);
        table = new BandsTableView(model, comfort);
        help.getStyleClass().addAll("setting-help", "band-help");
        help.setWrapText(true);
        Label nothing = paragraph(model.headingProperty(), "fold-title");
        nothing.getStyleClass().add("no-band");
        BooleanBinding alone = Bindings.isEmpty(model.chosen());
        seenIf(nothing, alone);
        seenIf(values, alone.not());
        seenIf(help, alone.not());
        getChildren().addAll(nothing, values, help, table);
        VBox.setVgrow(values, Priority.ALWAYS);
        model.rows().addListener((Observable list) -> size());
        model.chosen().addListener((Observable list) -> size());
        comfort.textPercentProperty().addListener((value, before, after) -> size());
        heightProperty().addListener((value, before, after) -> size());
        size();
        model.calledProperty().addListener((value, before, after) -> focusFirst());
    }

    /** Puts the focus on the first value that can be set, or on the table where no band is selected. */
    public void focusFirst() {
        fields.stream()
                .filter(field -> field.getParent() != null && shown(field))
                .findFirst()
                .ifPresentOrElse(Control::requestFocus, table::requestFocus);
    }

    private static boolean shown(Control field) {
        boolean here = !field.isDisabled();
        for (Node node = field; node != null && here; node = node.getParent()) {
            here = node.isVisible();
        }
        return here;
    }

    private void size() {
        double emPx = Look.of(comfort).emPx();
        setMinWidth(emPx * 12);
        // Narrower than this the values scroll sideways, so that nothing is cut off.
        rows.setMinWidth(emPx * 19);
        setPrefWidth(emPx * 23);
        // The table is as high as its rows; where a band's values need the room, up to two fifths of what there is and
        // never
        // less than a few rows.
        boolean alone = model.chosen().isEmpty();
        VBox.setVgrow(table, alone ? Priority.ALWAYS : Priority.NEVER);
        double wishPx = emPx * (2.6 + 3.2 * model.rows().size());
        double heightPx = alone ? wishPx : Math.min(wishPx, Math.max(emPx * 9, getHeight() * 0.4));
        table.setMinHeight(alone ? Math.min(wishPx, emPx * 9) : heightPx);
        table.setPrefHeight(heightPx);
        table.setMaxHeight(heightPx);
    }

    private static Label paragraph(ObservableValue<String> text, String style) {
        Label label = new Label();
        label.textProperty().bind(text);
        label.getStyleClass().add(style);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        seenIf(label, label.textProperty().isNotEmpty());
        return label;
    }

    private static void seenIf(Node node, ObservableBooleanValue there) {
        node.visibleProperty().bind(there);
        node.managedProperty().bind(node.visibleProperty());
    }
}
