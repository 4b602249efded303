package tideband.window.bands;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import java.util.function.Supplier;
import javafx.beans.Observable;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import javafx.scene.Node;
import javafx.scene.control.Label;
import javafx.scene.control.SelectionMode;
import javafx.scene.control.TableCell;
import javafx.scene.control.TableColumn;
import javafx.scene.control.TableView;
import javafx.scene.control.Tooltip;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** All bands, two lines each; selecting a row selects the band. */
final class BandsTableView extends TableView<Integer> {
    private final BandsModel model;
    private final ObservableList<Integer> places = FXCollections.observableArrayList();
    private final List<RowCell> cells = new ArrayList<>();
    private boolean following;

    BandsTableView(BandsModel model, ComfortModel comfort) {
        this.model = model;
        getStyleClass().add("bands-table");
        setItems(places);
        setColumnResizePolicy(CONSTRAINED_RESIZE_POLICY_FLEX_LAST_COLUMN);
        getSelectionModel().setSelectionMode(SelectionMode.MULTIPLE);
        setAccessibleText("All bands");
        setAccessibleHelp("Arrow keys go from band to band; with Shift they select several.");
        setTooltip(new Tooltip("Select bands; with Shift or Ctrl several."));
        TableColumn<Integer, Integer> band = column("Band", () -> new NameCell(model));
        TableColumn<Integer, Integer> film = column("Film nm, V", () -> new FilmCell(model));
        TableColumn<Integer, Integer> colour = column("Colour", () -> new ColourCell(model));
        getColumns().setAll(List.of(band, film, colour));
        Runnable widths = () -> {
            double emPx = Look.of(comfort).emPx();
            band.setPrefWidth(emPx * 7);
            film.setPrefWidth(emPx * 7);
            colour.setPrefWidth(emPx * 8);
        };
        comfort.textPercentProperty().addListener((value, before, after) -> widths.run());
        widths.run();
        model.chosen().addListener((Observable chosen) -> follow());
        model.rows().addListener((Observable rows) -> {
            show();
            follow();
        });
        show();
        getSelectionModel().getSelectedIndices().addListener((Observable indices) -> pass());
        follow();
    }

    private void pass() {
        List<Integer> picked = getSelectionModel().getSelectedIndices().stream()
                .filter(index -> index != null && index >= 0)
                .sorted()
                .toList();
        // While rows are replaced nothing is selected for a moment; that is no wish of the user.
        if (!following && !picked.isEmpty()) {
            model.select(picked);
        }
    }

    private void follow() {
        List<Integer> now = List.copyOf(getSelectionModel().getSelectedIndices());
        if (!now.equals(model.chosen())) {
            following = true;
            getSelectionModel().clearSelection();
            model.chosen().stream().filter(band -> band < getItems().size()).forEach(getSelectionModel()::select);
            if (!model.chosen().isEmpty() && !isFocused()) {
                scrollTo(Math.max(0, model.chosen().get(0) - 1));
            }
            following = false;
        }
    }

    /** The rows' places follow; a row that changes is shown anew where it stands, without the table laying itself out. */
    private void show() {
        int count = model.rows().size();
        if (places.size() > count) {
            places.remove(count, places.size());
        }
        while (places.size() < count) {
            places.add(places.size());
        }
        cells.forEach(RowCell::refresh);
    }

    private TableColumn<Integer, Integer> column(String title, Supplier<RowCell> cell) {
        TableColumn<Integer, Integer> column = new TableColumn<>(title);
        column.setSortable(false);
        column.setReorderable(false);
        column.setCellValueFactory(features -> new ReadOnlyObjectWrapper<>(features.getValue()));
        column.setCellFactory(made -> {
            RowCell next = cell.get();
            cells.add(next);
            return next;
        });
        return column;
    }

    /** Two lines about a band. */
    private abstract static class RowCell extends TableCell<Integer, Integer> {
        private final BandsModel model;
        private final VBox lines = new VBox();
        private BandRow told;

        RowCell(BandsModel model, Node... lines) {
            this.model = model;
            this.lines.getChildren().addAll(lines);
        }

        @Override
        protected void updateItem(Integer place, boolean empty) {
            super.updateItem(place, empty);
            refresh();
        }

        /** Shows the row that now stands at this place; what has not changed is left as it is. */
        final void refresh() {
            Integer place = getItem();
            BandRow row = !isEmpty() && place != null && place < model.rows().size()
                    ? model.rows().get(place)
                    : null;
            if (Objects.equals(row, told)) {
                return;
            }
            told = row;
            setGraphic(row == null ? null : lines);
            setAccessibleText(row == null ? "" : tell(row));
        }

        /** Puts a row into the lines and gives what is read out. */
        abstract String tell(BandRow row);

        static Label line(String style) {
            Label line = new Label();
            line.getStyleClass().add(style);
            return line;
        }
    }

    private static final class NameCell extends RowCell {
        private final Label name;
        private final Label place;

        NameCell(BandsModel model) {
            this(model, line("row-name"), line("row-second"));
        }

        private NameCell(BandsModel model, Label name, Label place) {
            super(model, name, place);
            this.name = name;
            this.place = place;
        }

        @Override
        String tell(BandRow row) {
            name.setText(row.number() + "  " + row.name());
            place.setText(row.place());
            return "Band " + row.number() + ", " + row.name() + ", " + row.place();
        }
    }

    private static final class FilmCell extends RowCell {
        private final Label film;
        private final Label volts;

        FilmCell(BandsModel model) {
            this(model, line("row-first"), line("row-second"));
        }

        private FilmCell(BandsModel model, Label film, Label volts) {
            super(model, film, volts);
            this.film = film;
            this.volts = volts;
        }

        @Override
        String tell(BandRow row) {
            film.setText(row.film());
            volts.setText(row.volts().isEmpty() ? "" : row.volts() + " V");
            return row.film() + " nm, " + row.volts() + " V";
        }
    }

    private static final class ColourCell extends RowCell {
        private final Label colour;
        private final Region swatch;

        ColourCell(BandsModel model) {
            this(model, line("row-first"), new Region());
        }

        private ColourCell(BandsModel model, Label colour, Region swatch) {
            super(model, colour, new HBox(swatch));
            this.colour = colour;
            this.swatch = swatch;
            swatch.getStyleClass().add("swatch");
            swatch.setStyle(sides("transparent", "transparent"));
        }

        private static String sides(String aSide, String bSide) {
            return "-tb-a-side: " + aSide + "; -tb-b-side: " + bSide + ";";
        }

        @Override
        String tell(BandRow row) {
            colour.setText(row.colour());
            swatch.getParent().setVisible(!row.aSideHex().isEmpty());
            if (!row.aSideHex().isEmpty()) {
                swatch.setStyle(sides(row.aSideHex(), row.bSideHex()));
            }
            return row.colour();
        }
    }
}
