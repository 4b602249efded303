package tideband.window.bands;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.function.Supplier;
import java.util.function.ToDoubleFunction;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Range;
import tideband.edit.BandEdits;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;

/** Where the selected band begins and ends; its neighbours give and take. */
final class BandPlaces {
    private static final String ONE = "Select one band to set its place.";
    private static final double SHORTEST_MM = BandEdits.SHORTEST_MM;

    private final DrawingModel drawing;
    private final ComfortModel comfort;
    private final Supplier<List<Integer>> chosen;

    private BandPlaces(DrawingModel drawing, ComfortModel comfort, Supplier<List<Integer>> chosen) {
        this.drawing = drawing;
        this.comfort = comfort;
        this.chosen = chosen;
    }

    static List<Setting> of(DrawingModel drawing, ComfortModel comfort, Supplier<List<Integer>> chosen) {
        BandPlaces make = new BandPlaces(drawing, comfort, chosen);
        return List.of(
                make.place(
                        new About(
                                "beginning of band",
                                "From",
                                "Its A side, from end A. The band before gives and takes."),
                        () -> make.index() == 0 ? "The first band begins at end A." : "",
                        Band::fromMm,
                        () -> new Range(
                                make.beside(-1).fromMm() + SHORTEST_MM,
                                make.band().toMm() - SHORTEST_MM),
                        (design, mm) -> BandEdits.moveEdge(design, make.index() - 1, mm)),
                make.place(
                        new About("end of band", "To", "Its B side, from end A. The band after gives and takes."),
                        () -> make.last()
                                ? "The last band ends at end B; set the piece's length in the bench settings."
                                : "",
                        Band::toMm,
                        () -> new Range(
                                make.band().fromMm() + SHORTEST_MM,
                                make.beside(1).toMm() - SHORTEST_MM),
                        (design, mm) -> BandEdits.moveEdge(design, make.index(), mm)),
                make.place(
                        new About(
                                "length of band",
                                "Length",
                                "Moves its B side; that of the last band moves its A side."),
                        () -> make.drawing.design().bands().size() == 1 ? "The only band is as long as the piece." : "",
                        band -> band.toMm() - band.fromMm(),
                        make::lengths,
                        make::ofLength));
    }

    private Setting place(
            About about,
            Supplier<String> lock,
            ToDoubleFunction<Band> value,
            Supplier<Range> range,
            BiFunction<Design, Double, Design> edit) {
        Supplier<String> anyLock = () -> chosen.get().size() == 1 ? lock.get() : ONE;
        return new NumberSetting(
                about,
                new Terms(() -> !chosen.get().isEmpty(), anyLock),
                Measure.length(comfort),
                Bounds.now(() -> anyLock.get().isEmpty()
                        ? range.get()
                        : new Range(0, drawing.design().piece().lengthMm())),
                () -> common(value),
                mm -> "",
                mm -> drawing.change("Set " + about.thing(), design -> edit.apply(design, mm)));
    }

    private OptionalDouble common(ToDoubleFunction<Band> value) {
        double[] values = chosen.get().stream()
                .mapToDouble(index ->
                        clean(value.applyAsDouble(drawing.design().bands().get(index))))
                .distinct()
                .toArray();
        return values.length == 1 ? OptionalDouble.of(values[0]) : OptionalDouble.empty();
    }

    private Range lengths() {
        double roomMm = last() ? band().toMm() - beside(-1).fromMm() : beside(1).toMm() - band().fromMm();
        return new Range(SHORTEST_MM, roomMm - SHORTEST_MM);
    }

    private Design ofLength(Design design, double mm) {
        return last()
                ? BandEdits.moveEdge(design, index() - 1, band().toMm() - mm)
                : BandEdits.moveEdge(design, index(), band().fromMm() + mm);
    }

    private int index() {
        return chosen.get().get(0);
    }

    private boolean last() {
        return index() == drawing.design().bands().size() - 1;
    }

    private Band band() {
        return beside(0);
    }

    private Band beside(int by) {
        return drawing.design().bands().get(index() + by);
    }

    /** Differences of positions without what binary fractions add. */
    private static double clean(double mm) {
        return Math.rint(mm * 1e6) / 1e6;
    }
}
