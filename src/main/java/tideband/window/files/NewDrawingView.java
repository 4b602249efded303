package tideband.window.files;

import java.util.EnumMap;
import java.util.Map;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.RadioButton;
import javafx.scene.control.TextField;
import javafx.scene.control.ToggleGroup;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import javafx.util.StringConverter;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.document.StartingShape;
import tideband.document.StartingShape.Size;
import tideband.oxide.Metal;
import tideband.window.comfort.LengthUnit;

/** The form of a new drawing. */
final class NewDrawingView extends VBox {
    private final NewDrawingModel model;
    private final LengthUnit unit;
    private final GridPane sizes = new GridPane();
    private final Map<Size, TextField> fields = new EnumMap<>(Size.class);
    private final Label faults = new Label();
    private final TextField title = new TextField();

    NewDrawingView(NewDrawingModel model, LengthUnit unit) {
        this.model = model;
        this.unit = unit;
        getStyleClass().add("new-drawing");
        sizes.getStyleClass().add("sizes");
        faults.getStyleClass().add("warning");
        faults.setWrapText(true);
        faults.setMinHeight(USE_PREF_SIZE);
        faults.setManaged(false);
        faults.setVisible(false);
        getChildren().addAll(head(), shapes(), sizes, faults);
        model.shapeProperty().addListener((value, before, after) -> layOutSizes());
        layOutSizes();
    }

    private Node head() {
        title.textProperty().bindBidirectional(model.titleProperty());
        title.setAccessibleText("Title of the drawing");
        title.setTooltip(new Tooltip("What the drawing is called, on the sheets too"));
        title.setPrefColumnCount(24);
        ComboBox<Metal> metal = new ComboBox<>();
        metal.getItems().setAll(Metal.values());
        metal.valueProperty().bindBidirectional(model.metalProperty());
        metal.setAccessibleText("Metal");
        metal.setTooltip(new Tooltip("The metal of the piece; its usual bath is taken, and can be changed later"));
        metal.setConverter(new StringConverter<>() {
            @Override
            public String toString(Metal value) {
                return switch (value) {
                    case TITANIUM -> "Titanium";
                    case TI_6AL_4V -> "Ti-6Al-4V";
                    case NIOBIUM -> "Niobium";
                    case TANTALUM -> "Tantalum";
                };
            }

            @Override
            public Metal fromString(String text) {
                throw new UnsupportedOperationException("the box is not typed into");
            }
        });
        GridPane grid = new GridPane();
        grid.getStyleClass().add("sizes");
        grid.addRow(0, labelFor("_Title", title), title);
        grid.addRow(1, labelFor("_Metal", metal), metal);
        return grid;
    }

    private Node shapes() {
        VBox box = new VBox();
        box.getStyleClass().add("shapes");
        Label heading = new Label("Shape");
        heading.getStyleClass().add("heading");
        box.getChildren().add(heading);
        ToggleGroup group = new ToggleGroup();
        for (StartingShape shape : StartingShape.values()) {
            RadioButton button = new RadioButton(shape.title());
            button.setToggleGroup(group);
            button.setUserData(shape);
            button.setSelected(shape == model.shapeProperty().get());
            button.setAccessibleHelp(shape.about());
            button.setTooltip(new Tooltip(shape.about()));
            Label about = new Label(shape.about());
            about.getStyleClass().add("faint");
            about.setWrapText(true);
            HBox row = new HBox(button, about);
            row.getStyleClass().add("shape");
            box.getChildren().add(row);
        }
        group.selectedToggleProperty()
                .addListener((value, before, after) -> model.shapeProperty().set((StartingShape) after.getUserData()));
        return box;
    }

    private void layOutSizes() {
        sizes.getChildren().clear();
        fields.clear();
        int row = 0;
        for (Size size : model.shapeProperty().get().sizes()) {
            TextField field = new TextField();
            field.setPrefColumnCount(7);
            field.textProperty().bindBidirectional(model.typedProperty(size));
            field.setAccessibleText(size.title() + " in " + unit.symbol());
            field.setTooltip(new Tooltip("From " + unit.text(size.allowedMm().low()) + " to "
                    + unit.text(size.allowedMm().high())));
            fields.put(size, field);
            sizes.addRow(row, labelFor(size.title(), field), field, new Label(unit.symbol()));
            row++;
        }
    }

    private static Label labelFor(String text, Node control) {
        Label label = new Label(text);
        label.setMnemonicParsing(true);
        label.setLabelFor(control);
        return label;
    }

    /** What is filled in first. */
    Node first() {
        return title;
    }

    /** The drawing described; nothing if the description is at fault, which is then said. */
    Optional<Design> drawing() {
        Reading<Design> reading = model.drawing();
        if (reading instanceof Reading.Read<Design> read) {
            return Optional.of(read.value());
        }
        StringBuilder text = new StringBuilder();
        for (Fault fault : ((Reading.Faulty<Design>) reading).faults()) {
            text.append(text.isEmpty() ? "" : "\n")
                    .append(fault.at())
                    .append(' ')
                    .append(fault.wrong());
            text.append("; ").append(fault.right()).append('.');
        }
        faults.setText(text.toString());
        faults.setManaged(true);
        faults.setVisible(true);
        return Optional.empty();
    }
}
