package tideband.window.settings;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.Observable;
import javafx.beans.binding.Bindings;
import javafx.beans.binding.BooleanBinding;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Bounds;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.TitledPane;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.window.comfort.ComfortModel;
import tideband.window.entry.Setting;
import tideband.window.entry.SettingView;
import tideband.window.look.Look;

/** All settings in groups that fold away; a folded group still tells its gist, and whether something in it is wrong. */
public final class SettingsView extends ScrollPane {
    private final SettingsModel model;
    private final ComfortModel comfort;
    private final List<TitledPane> folds = new ArrayList<>();

    /**
     * Shows settings.
     *
     * @param model the settings
     * @param comfort what suits the user
     */
    public SettingsView(SettingsModel model, ComfortModel comfort) {
        this.model = model;
        this.comfort = comfort;
        getStylesheets().add(Setting.class.getResource("entry.css").toExternalForm());
        getStyleClass().addAll("plain-scroll", "settings");
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.AS_NEEDED);
        setFocusTraversable(false);
        setAccessibleText("Bench settings");
        VBox all = new VBox();
        for (Group group : model.groups()) {
            TitledPane fold = fold(group);
            folds.add(fold);
            all.getChildren().add(fold);
        }
        setContent(all);
        comfort.textPercentProperty().addListener((value, before, after) -> widen());
        widen();
        model.calledProperty().addListener((value, before, after) -> focusFirst());
    }

    /** Puts the focus on the first group. */
    public void focusFirst() {
        folds.get(0).requestFocus();
        setVvalue(0);
    }

    /**
     * Unfolds one group and shows it from its top.
     *
     * @param title the group's title
     */
    public void unfold(String title) {
        for (int i = 0; i < folds.size(); i++) {
            if (model.groups().get(i).title().equals(title)) {
                TitledPane fold = folds.get(i);
                fold.setExpanded(true);
                fold.requestFocus();
                applyCss();
                layout();
                double spareHeight = getContent().getBoundsInLocal().getHeight()
                        - getViewportBounds().getHeight();
                Bounds place = fold.getBoundsInParent();
                setVvalue(spareHeight > 0 ? Math.min(1, place.getMinY() / spareHeight) : 0);
            }
        }
    }

    private void widen() {
        double emPx = Look.of(comfort).emPx();
        setMinWidth(emPx * 12);
        // Narrower than this it scrolls sideways, so that nothing is cut off.
        ((VBox) getContent()).setMinWidth(emPx * 19);
        setPrefWidth(emPx * 23);
    }

    private TitledPane fold(Group group) {
        TitledPane fold = new TitledPane();
        fold.getStyleClass().add("fold");
        fold.setAnimated(false);
        fold.setExpanded(false);
        HBox title = title(group);
        // The arrow takes its share; what does not fit is cut with an ellipsis.
        title.maxWidthProperty()
                .bind(Bindings.createDoubleBinding(
                        () -> Math.max(0, fold.getWidth() - 3 * Look.of(comfort).emPx()),
                        fold.widthProperty(),
                        comfort.textPercentProperty()));
        title.prefWidthProperty().bind(title.maxWidthProperty());
        title.setMinWidth(0);
        fold.setMinWidth(0);
        fold.setGraphic(title);
        ObservableValue<String> spoken = Bindings.concat(group.title(), ", ", group.summaryProperty());
        fold.accessibleTextProperty().bind(spoken);
        Tooltip whole = new Tooltip();
        whole.textProperty().bind(Bindings.concat(spoken, "\nFolds and unfolds; Space does the same."));
        fold.setTooltip(whole);
        // Rows are made when they are first looked at.
        fold.expandedProperty().addListener((value, before, after) -> {
            if (after && fold.getContent() == null) {
                fold.setContent(rows(group));
            }
        });
        return fold;
    }

    private static HBox title(Group group) {
        Label title = new Label(group.title());
        title.getStyleClass().add("fold-title");
        title.setMinWidth(Region.USE_PREF_SIZE);
        Label summary = new Label();
        summary.getStyleClass().add("fold-summary");
        summary.textProperty().bind(group.summaryProperty());
        Label alarm = new Label("fault inside");
        alarm.getStyleClass().add("fold-alarm");
        alarm.setMinWidth(Region.USE_PREF_SIZE);
        BooleanBinding faulty = Bindings.createBooleanBinding(
                () -> group.settings().stream()
                        .anyMatch(s -> !s.faultProperty().get().isEmpty()),
                group.settings().stream().map(Setting::faultProperty).toArray(Observable[]::new));
        alarm.visibleProperty().bind(faulty);
        alarm.managedProperty().bind(alarm.visibleProperty());
        HBox line = new HBox(title, summary, alarm);
        line.getStyleClass().add("fold-line");
        return line;
    }

    private VBox rows(Group group) {
        VBox rows = new VBox();
        rows.setMinWidth(0);
        rows.getStyleClass().add("rows");
        group.settings().forEach(setting -> rows.getChildren().add(SettingView.of(setting)));
        if (group == model.pieceGroup()) {
            rows.getChildren().add(new StationsView(model.stations(), comfort));
        } else if (group == model.bathGroup()) {
            rows.getChildren().add(1, new BathNotesView(model));
        }
        return rows;
    }
}
