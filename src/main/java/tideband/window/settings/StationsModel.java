package tideband.window.settings;

import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Terms;

/** The sizes of the piece at its stations; between them the size runs straight. */
public final class StationsModel {
    private final DesignSettings make;
    private final ObservableList<Row> rows = FXCollections.observableArrayList();
    // Kept, as it would hear nothing once collected.
    private final ObservableList<Row> shown = FXCollections.unmodifiableObservableList(rows);
    private final ReadOnlyStringWrapper noRoom = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper sizeWord = new ReadOnlyStringWrapper("");

    /**
     * A station.
     *
     * @param index its index from end A, 0-based
     * @param at its position from end A
     * @param size its size
     */
    public record Row(int index, NumberSetting at, NumberSetting size) {}

    StationsModel(DesignSettings make) {
        this.make = make;
        refresh();
    }

    /**
     * The stations from end A to end B; at least two.
     *
     * @return a list that keeps its rows while the number of stations stays
     */
    public ObservableList<Row> rows() {
        return shown;
    }

    /**
     * Why no station can be added.
     *
     * @return a property; empty where one can be
     */
    public ReadOnlyStringProperty noRoomProperty() {
        return noRoom.getReadOnlyProperty();
    }

    /**
     * What a size measures: diameter, width or outer diameter.
     *
     * @return a property
     */
    public ReadOnlyStringProperty sizeWordProperty() {
        return sizeWord.getReadOnlyProperty();
    }

    /**
     * Whether a station can be removed; the ends stay.
     *
     * @param row the station
     * @return whether it lies between the ends
     */
    public boolean removable(Row row) {
        return row.index() > 0 && row.index() < rows.size() - 1;
    }

    /** Adds a station in the middle of the widest gap; the shape stays as it is. */
    public void add() {
        int gap = widestGap();
        if (gap >= 0) {
            edit("Add station", stations -> {
                Station low = stations.get(gap);
                Station high = stations.get(gap + 1);
                double atMm = middleMm(low, high);
                stations.add(
                        gap + 1,
                        new Station(atMm, PieceShape.clean(make.design().piece().sizeMm(atMm))));
                return stations;
            });
        }
    }

    /**
     * Removes a station.
     *
     * @param row the station
     */
    public void remove(Row row) {
        if (removable(row)) {
            edit("Remove station", stations -> {
                stations.remove(row.index());
                return stations;
            });
        }
    }

    void refresh() {
        int count = stations().size();
        if (rows.size() != count) {
            List<Row> fresh = new ArrayList<>();
            for (int i = 0; i < count; i++) {
                fresh.add(new Row(i, at(i), size(i)));
            }
            rows.setAll(fresh);
        }
        rows.forEach(row -> {
            row.at().refresh();
            row.size().refresh();
        });
        noRoom.set(widestGap() >= 0 ? "" : noRoomReason(count));
        sizeWord.set(
                switch (PieceShape.kindOf(make.design().piece())) {
                    case ROUND -> "Diameter";
                    case FLAT -> "Width";
                    case TUBE -> "Outer diameter";
                });
    }

    private static String noRoomReason(int count) {
        return count >= Limits.STATIONS.high()
                ? "There are " + count + " stations, the most there can be."
                : "The stations lie too close for one between them.";
    }

    private int widestGap() {
        List<Station> stations = stations();
        if (stations.size() >= Limits.STATIONS.high()) {
            return -1;
        }
        int widest = -1;
        double widestMm = 0;
        for (int i = 0; i + 1 < stations.size(); i++) {
            Station low = stations.get(i);
            Station high = stations.get(i + 1);
            double middleMm = middleMm(low, high);
            if (high.atMm() - low.atMm() > widestMm && middleMm > low.atMm() && middleMm < high.atMm()) {
                widest = i;
                widestMm = high.atMm() - low.atMm();
            }
        }
        return widest;
    }

    private static double middleMm(Station low, Station high) {
        double middle = (low.atMm() + high.atMm()) / 2;
        // A short number if there is one between the two.
        double shortMm = Math.rint(middle * 100) / 100;
        return shortMm > low.atMm() && shortMm < high.atMm() ? shortMm : PieceShape.clean(middle);
    }

    private NumberSetting at(int index) {
        return make.number(
                new About(
                        "position of station " + (index + 1),
                        "Position of station " + (index + 1),
                        "From end A; between its neighbours."),
                Terms.unless(() -> {
                    boolean last = index == stations().size() - 1;
                    return index == 0 ? "This is end A." : last ? "This is end B; set the length instead." : "";
                }),
                make.length(),
                Bounds.of(Limits.AT_MM),
                design -> station(design, index).atMm(),
                atMm -> wrongPosition(index, atMm),
                (design, atMm) -> with(
                        design, index, new Station(atMm, station(design, index).sizeMm())));
    }

    private String wrongPosition(int index, double atMm) {
        double lowMm = stations().get(index - 1).atMm();
        double highMm = stations().get(index + 1).atMm();
        if (!(atMm > lowMm && atMm < highMm)) {
            return "must lie between its neighbours, at " + make.text(lowMm) + " and " + make.text(highMm);
        }
        Station moved = new Station(atMm, stations().get(index).sizeMm());
        return PieceShape.wrong(make.design(), with(make.design().piece(), index, moved), make);
    }

    private NumberSetting size(int index) {
        return make.number(
                new About(
                        "size at station " + (index + 1), "Size at station " + (index + 1), "Diameter or width here."),
                Terms.ALWAYS,
                make.length(),
                Bounds.of(Limits.SIZE_MM),
                design -> station(design, index).sizeMm(),
                sizeMm -> wrongSize(index, sizeMm),
                (design, sizeMm) ->
                        with(design, index, new Station(station(design, index).atMm(), sizeMm)));
    }

    private String wrongSize(int index, double sizeMm) {
        Piece piece = make.design().piece();
        if (piece.section() instanceof Section.Tube tube && !(sizeMm > tube.boreMm())) {
            return "must be larger than the bore, " + make.text(tube.boreMm());
        }
        Station sized = new Station(piece.stations().get(index).atMm(), sizeMm);
        return PieceShape.wrong(make.design(), with(piece, index, sized), make);
    }

    private List<Station> stations() {
        return make.design().piece().stations();
    }

    private static Station station(Design design, int index) {
        // A row may be asked once more after its station has gone.
        List<Station> stations = design.piece().stations();
        return stations.get(Math.min(index, stations.size() - 1));
    }

    private static Design with(Design design, int index, Station station) {
        return DesignEdits.piece(design, with(design.piece(), index, station));
    }

    private static Piece with(Piece piece, int index, Station station) {
        List<Station> stations = new ArrayList<>(piece.stations());
        stations.set(index, station);
        return new Piece(piece.section(), stations);
    }

    private void edit(String name, UnaryOperator<List<Station>> edit) {
        make.drawing()
                .change(
                        name,
                        design -> DesignEdits.piece(
                                design,
                                new Piece(
                                        design.piece().section(),
                                        edit.apply(
                                                new ArrayList<>(design.piece().stations())))));
    }
}
