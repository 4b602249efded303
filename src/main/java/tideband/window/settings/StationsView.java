package tideband.window.settings;

import javafx.beans.Observable;
import javafx.beans.binding.Bindings;
import javafx.geometry.HPos;
import javafx.scene.control.Button;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.GridPane;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.window.comfort.ComfortModel;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.TypedFieldView;

/** A small table of the piece's stations, one line a station, with its faults below the line. */
final class StationsView extends VBox {
    private final StationsModel model;
    private final ComfortModel comfort;
    private final GridPane table = new GridPane();

    StationsView(StationsModel model, ComfortModel comfort) {
        this.model = model;
        this.comfort = comfort;
        getStyleClass().add("setting");
        table.getStyleClass().add("stations");
        Label title = new Label("Stations");
        title.getStyleClass().add("setting-name");
        Button add = new Button("Add a station");
        add.setOnAction(event -> model.add());
        add.disableProperty().bind(model.noRoomProperty().isNotEmpty());
        add.setTooltip(new Tooltip("Adds a station in the middle of the widest gap; the shape stays as it is."));
        add.setAccessibleHelp("Adds a station in the middle of the widest gap; the shape stays as it is.");
        Label help = paragraph("setting-help");
        help.textProperty()
                .bind(Bindings.concat(
                        "Sizes along the piece; between stations they run straight. End A is at 0, end B at the length. ",
                        model.noRoomProperty()));
        getChildren().addAll(title, table, add, help);
        model.rows().addListener((Observable rows) -> fill());
        fill();
    }

    private void fill() {
        table.getChildren().clear();
        table.add(head("From A"), 1, 0);
        Label size = head("");
        size.textProperty().bind(model.sizeWordProperty());
        table.add(size, 2, 0);
        Label unit = head("");
        unit.textProperty()
                .bind(Bindings.createStringBinding(() -> "in " + comfort.unit().symbol(), comfort.unitProperty()));
        table.add(unit, 3, 0);
        for (StationsModel.Row row : model.rows()) {
            int line = 1 + 2 * row.index();
            table.add(endName(row), 0, line);
            table.add(field(row.at()), 1, line);
            table.add(field(row.size()), 2, line);
            if (model.removable(row)) {
                table.add(remove(row), 3, line);
            }
            table.add(fault(row), 0, line + 1, 4, 1);
        }
    }

    private Label endName(StationsModel.Row row) {
        boolean first = row.index() == 0;
        boolean last = row.index() == model.rows().size() - 1;
        Label name = new Label(first ? "A" : last ? "B" : "");
        name.getStyleClass().add("fold-title");
        return name;
    }

    private static TypedFieldView field(NumberSetting setting) {
        TypedFieldView field = new TypedFieldView(setting);
        field.getStyleClass().add("number");
        return field;
    }

    private Button remove(StationsModel.Row row) {
        Button remove = new Button("\u00d7");
        remove.getStyleClass().add("remove");
        remove.setOnAction(event -> model.remove(row));
        remove.setAccessibleText("Remove station " + (row.index() + 1));
        remove.setTooltip(new Tooltip("Removes this station; the piece then runs straight past it."));
        return remove;
    }

    private static Label fault(StationsModel.Row row) {
        Label fault = paragraph("setting-fault");
        fault.textProperty()
                .bind(Bindings.createStringBinding(
                        () -> text(row.at()) + text(row.size()),
                        row.at().faultProperty(),
                        row.size().faultProperty()));
        fault.visibleProperty().bind(fault.textProperty().isNotEmpty());
        fault.managedProperty().bind(fault.visibleProperty());
        GridPane.setHalignment(fault, HPos.LEFT);
        return fault;
    }

    private static String text(NumberSetting setting) {
        String fault = setting.faultProperty().get();
        return fault.isEmpty()
                ? ""
                : setting.about().name() + " not taken: " + fault + ". Escape brings " + setting.shown() + " back. ";
    }

    private static Label head(String text) {
        Label label = new Label(text);
        label.getStyleClass().add("setting-help");
        return label;
    }

    private static Label paragraph(String style) {
        Label label = new Label();
        label.getStyleClass().add(style);
        label.setWrapText(true);
        label.setMinHeight(Region.USE_PREF_SIZE);
        return label;
    }
}
