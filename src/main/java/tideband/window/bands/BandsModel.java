package tideband.window.bands;

import java.util.ArrayList;
import java.util.Collection;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import tideband.design.Band;
import tideband.design.Wanted;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.entry.Setting;
import tideband.window.entry.TypedSetting;
import tideband.window.work.WorkModel;

/** The bands in exact values: those of the selected ones to be set, and all of them in a table. */
public final class BandsModel {
    private final DrawingModel drawing;
    private final ComfortModel comfort;
    private final List<Setting> settings;
    private final ObservableList<BandRow> rows = FXCollections.observableArrayList();
    private final ObservableList<Integer> chosen = FXCollections.observableArrayList();
    // Kept, as they would hear nothing once collected.
    private final ObservableList<BandRow> shownRows = FXCollections.unmodifiableObservableList(rows);
    private final ObservableList<Integer> shownChosen = FXCollections.unmodifiableObservableList(chosen);
    private final ReadOnlyStringWrapper heading = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper outcome = new ReadOnlyStringWrapper("");
    private final ReadOnlyIntegerWrapper called = new ReadOnlyIntegerWrapper(0);
    private Figures figures = Figures.none();

    /**
     * The bands of a drawing.
     *
     * @param drawing the drawing
     * @param work the work behind it
     * @param comfort what suits the user
     */
    public BandsModel(DrawingModel drawing, WorkModel work, ComfortModel comfort) {
        this.drawing = drawing;
        this.comfort = comfort;
        settings = BandSettings.of(drawing, work, comfort, () -> chosen);
        drawing.designProperty().addListener((value, before, after) -> refresh());
        drawing.selectionProperty().addListener((value, before, after) -> follow());
        comfort.unitProperty().addListener((value, before, after) -> refresh());
        work.answerProperty().addListener((value, before, after) -> {
            figures = after.map(Figures::of).orElseGet(Figures::none);
            refresh();
        });
        figures = work.answerProperty().get().map(Figures::of).orElseGet(Figures::none);
        follow();
    }

    /**
     * The values of the selected bands.
     *
     * @return settings in the order they are shown
     */
    public List<Setting> settings() {
        return settings;
    }

    /**
     * All bands.
     *
     * @return rows from end A to end B
     */
    public ObservableList<BandRow> rows() {
        return shownRows;
    }

    /**
     * Indices of the bands whose values are shown, rising.
     *
     * @return a list that follows the selection
     */
    public ObservableList<Integer> chosen() {
        return shownChosen;
    }

    /**
     * What is selected, in words; what to do where nothing is.
     *
     * @return a property
     */
    public ReadOnlyStringProperty headingProperty() {
        return heading.getReadOnlyProperty();
    }

    /**
     * How the selected band comes out, in words.
     *
     * @return a property; empty unless one band is selected and it has been worked out
     */
    public ReadOnlyStringProperty outcomeProperty() {
        return outcome.getReadOnlyProperty();
    }

    /**
     * How often the user has asked to go to the exact values; a view takes the focus whenever it rises.
     *
     * @return a property
     */
    public ReadOnlyIntegerProperty calledProperty() {
        return called.getReadOnlyProperty();
    }

    /**
     * Selects bands.
     *
     * @param bands their indices
     */
    public void select(Collection<Integer> bands) {
        if (!List.copyOf(bands).equals(drawing.selection().bands())) {
            drawing.select(Selection.ofBands(bands));
        }
    }

    /**
     * What the user can do here.
     *
     * @return commands for menus and keys
     */
    public List<Command> commands() {
        return List.of(new Command(
                "exact-values",
                Command.Menu.BAND,
                new ReadOnlyStringWrapper("Exact values"),
                "F6",
                "Goes to the exact values of the selected bands: name, place, film, volts, colour and edge.",
                new ReadOnlyBooleanWrapper(true),
                this::call));
    }

    /** Calls the exact values to the front; where no band is selected, those of the first. */
    public void call() {
        if (chosen.isEmpty()) {
            drawing.select(Selection.of(new Part.Level(0)));
        }
        called.set(called.get() + 1);
    }

    private void follow() {
        Selection selection = drawing.selection();
        List<Integer> now = selection.bands().isEmpty()
                ? selection.focus().map(part -> List.of(part.band())).orElse(List.of())
                : selection.bands();
        boolean other = !chosen.equals(now);
        if (other) {
            chosen.setAll(now);
        }
        refresh();
        if (other) {
            // What was typed belongs to the bands that were selected then.
            settings.forEach(setting -> {
                if (setting instanceof TypedSetting typed) {
                    typed.restore();
                }
            });
        }
    }

    private void refresh() {
        List<Band> bands = drawing.design().bands();
        // While an edit is under way the selection may be a step behind.
        if (chosen.stream().anyMatch(index -> index >= bands.size())) {
            chosen.removeIf(index -> index >= bands.size());
        }
        settings.forEach(Setting::refresh);
        List<BandRow> fresh = new ArrayList<>();
        for (int i = 0; i < bands.size(); i++) {
            fresh.add(row(i, bands.get(i)));
        }
        put(fresh);
        heading.set(headingNow(bands));
        outcome.set(
                chosen.size() == 1
                        ? figures.at(chosen.get(0), bands.get(chosen.get(0)))
                                .map(Figures.Of::outcome)
                                .orElse("")
                        : "");
    }

    /** Changes only the rows that differ, so that a table keeps its selection and its place. */
    private void put(List<BandRow> fresh) {
        if (fresh.size() != rows.size()) {
            rows.setAll(fresh);
            return;
        }
        for (int i = 0; i < fresh.size(); i++) {
            if (!fresh.get(i).equals(rows.get(i))) {
                rows.set(i, fresh.get(i));
            }
        }
    }

    private String headingNow(List<Band> bands) {
        if (chosen.isEmpty()) {
            return "No band is selected. Select one in the drawing or in the table.";
        }
        return chosen.size() == 1
                ? "Band " + (chosen.get(0) + 1) + " of " + bands.size()
                : chosen.size() + " of " + bands.size() + " bands; what is set is set for all of them";
    }

    private BandRow row(int index, Band band) {
        String place =
                comfort.unit().number(band.fromMm()) + "\u2013" + comfort.unit().number(band.toMm());
        Optional<Figures.Of> known = figures.at(index, band);
        return new BandRow(
                index + 1,
                band.name(),
                place,
                known.map(Figures.Of::film).orElseGet(() -> drawnFilm(band.wanted())),
                known.map(Figures.Of::volts).orElse(""),
                known.map(Figures.Of::colour).orElse(""),
                known.map(Figures.Of::aSideHex).orElse(""),
                known.map(Figures.Of::bSideHex).orElse(""));
    }

    private static String drawnFilm(Wanted wanted) {
        if (wanted instanceof Wanted.Film film) {
            String aSide = Figures.text(film.aSideNm());
            return film.aSideNm() == film.bSideNm() ? aSide : aSide + " \u2192 " + Figures.text(film.bSideNm());
        }
        return wanted instanceof Wanted.Bare ? "bare" : "\u2026";
    }
}
