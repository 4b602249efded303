package tideband.window.colour;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.value.ChangeListener;
import javafx.geometry.Bounds;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Spinner;
import javafx.scene.control.SpinnerValueFactory;
import javafx.scene.control.TextField;
import javafx.scene.control.TitledPane;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyCode;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.match.Match;
import tideband.window.comfort.ComfortModel;

/** Where a colour is wanted and a film is taken: the entry, the films that come near, and three ways to point at a colour. */
public final class WantedView extends ScrollPane {
    private final WantedModel model;
    private final TextField entry = new TextField();
    private final Swatch swatch = new Swatch(2.2, 2.2);
    private final VBox rows = new VBox();
    private final List<MatchRow> known = new ArrayList<>();
    private final Label message = new Label();
    private final VBox body = new VBox();
    private final ChangeListener<Node> focused = (value, before, after) -> {
        if (after != null && holds(after)) {
            reveal(after);
        }
    };
    private final ImagePickView picture;
    private final TitledPane pictureFold;

    /**
     * A view, about 23 em wide; it scrolls where it is too high.
     *
     * @param model what it shows
     * @param comfort what suits the user
     */
    public WantedView(WantedModel model, ComfortModel comfort) {
        this.model = model;
        getStylesheets().add(WantedView.class.getResource("colour.css").toExternalForm());
        getStyleClass().add("wanted");
        setFitToWidth(true);
        setHbarPolicy(ScrollBarPolicy.AS_NEEDED);
        picture = new ImagePickView(model.image(), comfort);
        PlaneView plane = new PlaneView(model.plane(), comfort);
        TitledPane named = fold("Colours this metal shows", new NamedFilmsView(model));
        TitledPane planeFold = fold("By hue and lightness", plane);
        pictureFold = fold("From a picture", picture);
        named.setExpanded(true);
        planeFold.expandedProperty().addListener((value, before, after) -> {
            if (after) {
                model.plane().show();
            }
        });
        Label heading = new Label("Wanted colour");
        heading.getStyleClass().add("heading");
        rows.setStyle("-fx-spacing: 0.3em;");
        rows.setAccessibleRole(AccessibleRole.PARENT);
        body.getChildren().setAll(heading, entryRow(), message(), rows, taken(), named, planeFold, pictureFold);
        body.getStyleClass().add("wanted-body");
        body.setFillWidth(true);
        setContent(body);
        model.foundProperty().addListener((value, before, after) -> show(after));
        show(model.foundProperty().get());
        sceneProperty().addListener((value, before, after) -> {
            if (before != null) {
                before.focusOwnerProperty().removeListener(focused);
            }
            if (after != null) {
                after.focusOwnerProperty().addListener(focused);
            }
        });
        model.callsForEntryProperty().addListener((value, before, after) -> callForEntry());
        model.callsForImageProperty().addListener((value, before, after) -> callForImage());
    }

    private Node entryRow() {
        entry.textProperty().bindBidirectional(model.entryProperty());
        entry.setPromptText("#rrggbb or lab(L, a, b)");
        entry.setAccessibleText("Wanted colour");
        entry.setAccessibleHelp(
                "Type # and six hexadecimal digits, or lab, then lightness, a and b in brackets. Enter takes the"
                        + " nearest film for the selected bands; Down goes to the films; Escape clears.");
        entry.setTooltip(new Tooltip("A screen colour such as #3a3f8f, seen in the design's light, or CIELAB such as"
                + " lab(45, 10, -38). Enter takes the nearest film."));
        entry.setOnAction(e -> model.takeNearest());
        entry.setOnKeyPressed(e -> {
            if (e.getCode() == KeyCode.DOWN && !rows.getChildren().isEmpty()) {
                rows.getChildren().get(0).requestFocus();
                e.consume();
            } else if (e.getCode() == KeyCode.ESCAPE && !entry.getText().isEmpty()) {
                model.clear();
                e.consume();
            }
        });
        entry.setMinWidth(0);
        HBox.setHgrow(entry, Priority.ALWAYS);
        Button clear = new Button("Clear");
        clear.setMinWidth(Region.USE_PREF_SIZE);
        clear.setTooltip(new Tooltip("Wants no colour any more and takes its marks off the field"));
        clear.setAccessibleText("Clear the wanted colour and its marks");
        clear.disableProperty().bind(model.entryProperty().isEmpty());
        clear.setOnAction(e -> {
            model.clear();
            entry.requestFocus();
        });
        HBox row = new HBox(swatch, entry, clear);
        row.setStyle("-fx-spacing: 0.4em; -fx-alignment: center-left;");
        Spinner<Double> within = new Spinner<>(new SpinnerValueFactory.DoubleSpinnerValueFactory(
                WantedModel.NEAREST,
                WantedModel.FARTHEST,
                model.withinProperty().get(),
                0.5));
        within.setPrefWidth(0);
        within.setStyle("-fx-pref-width: 6em;");
        within.valueProperty().addListener((value, before, after) -> {
            if (after != null) {
                model.withinProperty().set(after);
            }
        });
        model.withinProperty()
                .addListener((value, before, after) -> within.getValueFactory().setValue(after.doubleValue()));
        within.setAccessibleText("Within dE00");
        within.setTooltip(
                new Tooltip("How near a film must come to count, as a CIEDE2000 difference: 1 is hardly seen, 5 is"
                        + " close, 12 another colour"));
        Label label = new Label("Within dE00");
        label.setLabelFor(within);
        HBox near = new HBox(label, within);
        near.setStyle("-fx-spacing: 0.4em; -fx-alignment: center-left;");
        VBox both = new VBox(row, near);
        both.setStyle("-fx-spacing: 0.4em;");
        return both;
    }

    private Label message() {
        message.setWrapText(true);
        message.setMinHeight(Region.USE_PREF_SIZE);
        message.textProperty().bind(model.messageProperty());
        return message;
    }

    private Label taken() {
        Label taken = new Label();
        taken.setWrapText(true);
        taken.setMinHeight(Region.USE_PREF_SIZE);
        taken.getStyleClass().add("numeral");
        taken.textProperty().bind(model.takenProperty());
        taken.visibleProperty().bind(model.takenProperty().isNotEmpty());
        taken.managedProperty().bind(taken.visibleProperty());
        return taken;
    }

    private static TitledPane fold(String title, Node content) {
        TitledPane fold = new TitledPane(title, content);
        fold.getStyleClass().add("fold");
        fold.setAnimated(false);
        fold.setExpanded(false);
        return fold;
    }

    private void show(Optional<Found> found) {
        swatch.setVisible(found.isPresent());
        swatch.setManaged(found.isPresent());
        found.ifPresent(f -> swatch.show(f.hex()));
        List<Match> shown = found.map(Found::shown).orElse(List.of());
        while (known.size() < shown.size()) {
            known.add(new MatchRow(model::take));
        }
        for (int i = 0; i < shown.size(); i++) {
            known.get(i).show(found.orElseThrow(), shown.get(i));
        }
        if (rows.getChildren().size() != shown.size()) {
            rows.getChildren().setAll(known.subList(0, shown.size()));
        }
    }

    /** Puts the focus where a wanted colour is typed. */
    public void callForEntry() {
        setVvalue(0);
        entry.requestFocus();
        entry.selectAll();
    }

    /** Asks for a picture to take a colour from. */
    public void callForImage() {
        pictureFold.setExpanded(true);
        picture.ask();
    }

    /**
     * Opens a picture to take a colour from, as if the user had chosen it.
     *
     * @param file the picture's file
     */
    public void openPicture(Path file) {
        pictureFold.setExpanded(true);
        picture.open(file);
    }

    /** Scrolls so that what has the focus is seen. */
    private void reveal(Node node) {
        Bounds seen = body.sceneToLocal(node.localToScene(node.getBoundsInLocal()));
        double high = getViewportBounds().getHeight();
        double spare = body.getHeight() - high;
        if (spare <= 0) {
            return;
        }
        double top = getVvalue() * spare;
        if (seen.getMinY() < top) {
            setVvalue(Math.max(0, seen.getMinY() / spare));
        } else if (seen.getMaxY() > top + high) {
            setVvalue(Math.min(1, (seen.getMaxY() - high) / spare));
        }
    }

    private boolean holds(Node node) {
        for (Node at = node; at != null; at = at.getParent()) {
            if (at == body) {
                return true;
            }
        }
        return false;
    }
}
