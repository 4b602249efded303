package tideband.window.piece;

import java.util.Locale;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ObjectProperty;
import javafx.beans.value.ObservableValue;
import javafx.geometry.Pos;
import javafx.scene.Node;
import javafx.scene.control.CheckBox;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.Viewport;
import tideband.window.work.TiltModel;

/** The picture of the piece with its controls: tilt, lamps, what is compared. */
public final class PieceView extends VBox {
    private final PieceModel model;

    /**
     * A view of the piece.
     *
     * @param model what is shown
     * @param comfort what suits the user
     * @param viewport which stretch is in view, and where, in px from this view's left
     */
    public PieceView(PieceModel model, ComfortModel comfort, ObservableValue<Viewport> viewport) {
        this.model = model;
        getStyleClass().add("piece");
        getStylesheets().add(PieceView.class.getResource("piece.css").toExternalForm());
        PiecePane pane = new PiecePane(model, comfort, viewport);
        setVgrow(pane, Priority.ALWAYS);
        Label scale = new Label();
        scale.getStyleClass().add("faint");
        scale.textProperty().bind(pane.scaleWordsProperty());
        scale.setTooltip(new Tooltip("How the piece is drawn across, against its scale along the length"));
        FlowPane controls = new FlowPane(
                tilt(),
                choice(
                        "Light",
                        model.lampsProperty(),
                        "How the piece is lit. In even light every colour is the computed one."),
                choice(
                        "Colours",
                        model.comparisonProperty(),
                        "Whether the colours predicted, those wanted, or both are shown, wanted above and predicted below."),
                difference(),
                scale);
        controls.getStyleClass().add("controls");
        getChildren().addAll(controls, pane);
    }

    private Node tilt() {
        Slider slider = new Slider(0, TiltModel.MOST_DEG, 0);
        slider.setId("tilt");
        slider.setBlockIncrement(PieceModel.TILT_STEP_DEG);
        slider.valueProperty().bindBidirectional(model.tiltDegProperty());
        slider.setAccessibleText("Tilt of the piece in degrees");
        slider.setAccessibleHelp("End B goes back; the colours change as those of the real piece do.");
        slider.setTooltip(new Tooltip("Tilts the piece, end B going back. Arrow keys: 5 degrees."));
        Label degrees = new Label();
        degrees.getStyleClass().add("degrees");
        degrees.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> String.format(Locale.ROOT, "%.0f°", slider.getValue()), slider.valueProperty()));
        return named("Tilt", slider, degrees);
    }

    private static <T extends Enum<T>> Node choice(String name, ObjectProperty<T> property, String help) {
        ChoiceBox<T> box = new ChoiceBox<>();
        box.setId(name.toLowerCase(Locale.ROOT));
        box.getItems().setAll(property.get().getDeclaringClass().getEnumConstants());
        box.setConverter(new StringConverter<>() {
            @Override
            public String toString(T value) {
                return words(value);
            }

            @Override
            public T fromString(String words) {
                return box.getItems().stream()
                        .filter(value -> words(value).equals(words))
                        .findFirst()
                        .orElseThrow();
            }
        });
        box.valueProperty().bindBidirectional(property);
        box.setAccessibleText(name + " of the piece");
        box.setAccessibleHelp(help);
        box.setTooltip(new Tooltip(help));
        return named(name, box);
    }

    private static String words(Enum<?> value) {
        if (value instanceof Lamps lamps) {
            return lamps.text();
        }
        return value instanceof Comparison comparison ? comparison.text() : "";
    }

    private Node difference() {
        CheckBox box = new CheckBox("Difference");
        box.setId("difference");
        box.selectedProperty().bindBidirectional(model.differenceShownProperty());
        String help = "Shows how far the predicted colours are from those wanted, along the piece, in dE00.";
        box.setAccessibleHelp(help);
        box.setTooltip(new Tooltip(help));
        return box;
    }

    private static Node named(String name, Node... controls) {
        Label label = new Label(name);
        label.setLabelFor(controls[0]);
        HBox box = new HBox(label);
        box.getChildren().addAll(controls);
        box.setAlignment(Pos.CENTER_LEFT);
        box.getStyleClass().add("control");
        return box;
    }
}
