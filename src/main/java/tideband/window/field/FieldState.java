package tideband.window.field;

import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import javafx.beans.property.ReadOnlyLongWrapper;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.match.VoltScale;
import tideband.piece.End;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.drawing.Viewport;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/** What the field shows and where, shared by all that works on it. */
final class FieldState {
    /** What is shown above the thickest film, as a share of it. */
    private static final double HEADROOM = 1.08;

    final DrawingModel drawing;
    final WorkModel work;
    final TiltModel tilt;
    final ComfortModel comfort;
    final FieldWords words;
    final ReadOnlyStringWrapper reading = new ReadOnlyStringWrapper("");
    final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");
    final ReadOnlyObjectWrapper<Viewport> viewport = new ReadOnlyObjectWrapper<>();
    final ReadOnlyObjectWrapper<NmScale> scale = new ReadOnlyObjectWrapper<>();
    private final Map<Layer, ReadOnlyLongWrapper> changes = new EnumMap<>(Layer.class);
    private final ShownFilms shown = new ShownFilms();
    private FieldArea area = new FieldArea(680, 220, 13);
    private Zoom zoom = Zoom.WHOLE;
    private double mostNm;
    private double lengthMm;
    private boolean steady;
    private List<DrawnFilm> films;
    private Handles handles;

    FieldState(DrawingModel drawing, WorkModel work, TiltModel tilt, ComfortModel comfort) {
        this.drawing = drawing;
        this.work = work;
        this.tilt = tilt;
        this.comfort = comfort;
        this.words = new FieldWords(work, tilt, comfort);
        for (Layer layer : Layer.values()) {
            changes.put(layer, new ReadOnlyLongWrapper());
        }
        designChanged();
    }

    Design design() {
        return drawing.design();
    }

    VoltScale volts() {
        return work.coloursProperty().get().scale();
    }

    List<DrawnFilm> films() {
        return films;
    }

    FieldArea area() {
        return area;
    }

    Zoom zoom() {
        return zoom;
    }

    double mostNm() {
        return mostNm;
    }

    double enlarged() {
        return comfort.textPercentProperty().get() / 100.0;
    }

    Handles handles() {
        if (handles == null) {
            handles = new Handles(design(), films, area, viewport.get(), scale.get(), enlarged());
        }
        return handles;
    }

    ReadOnlyLongWrapper changes(Layer layer) {
        return changes.get(layer);
    }

    void changed(Layer layer) {
        ReadOnlyLongWrapper count = changes.get(layer);
        count.set(count.get() + 1);
    }

    /** After every change of the design or of its colours. */
    void designChanged() {
        films = shown.of(design(), work.coloursProperty().get());
        if (!steady) {
            mostNm = thickestNm();
        }
        if (lengthMm != design().piece().lengthMm()) {
            lengthMm = design().piece().lengthMm();
            zoom = Zoom.WHOLE;
        }
        lay();
        changed(Layer.DRAWING);
    }

    private double thickestNm() {
        double thickest = volts().ceilingNm();
        for (DrawnFilm film : films) {
            thickest = Math.max(thickest, Math.max(film.aSideNm(), film.bSideNm()));
        }
        return thickest * HEADROOM;
    }

    /** Keeps the films' scale as it is while a hand draws, and lets it fit again afterwards. */
    void holdSteady(boolean still) {
        steady = still;
        if (!still) {
            mostNm = thickestNm();
            lay();
        }
    }

    void resize(FieldArea next) {
        if (!next.equals(area)) {
            area = next;
            lay();
            changed(Layer.GROUND);
            changed(Layer.DRAWING);
        }
    }

    void look(Zoom next) {
        zoom = next;
        lay();
    }

    private void lay() {
        handles = null;
        zoom = zoom.within(lengthMm, mostNm);
        Viewport seen = zoom.viewport(area, lengthMm);
        NmScale high = zoom.scale(area, mostNm);
        if (!seen.equals(viewport.get()) || !high.equals(scale.get())) {
            viewport.set(seen);
            // Who listens may have asked for handles between the two.
            handles = null;
            scale.set(high);
            changed(Layer.GROUND);
            changed(Layer.DRAWING);
        }
        changed(Layer.OVERLAY);
    }

    /** Brings a part into view. */
    void reveal(Part part) {
        double atMm = placeMm(part);
        double widthMm = lengthMm / zoom.along();
        if (atMm < zoom.fromMm() || atMm > zoom.fromMm() + widthMm) {
            look(zoom.moved(atMm - widthMm / 2 - zoom.fromMm(), 0, lengthMm, mostNm));
        }
    }

    private double placeMm(Part part) {
        Band band = design().bands().get(part.band());
        if (part instanceof Part.EdgeAt) {
            return band.toMm();
        }
        if (part instanceof Part.FadeEnd end) {
            return end.side() == End.A ? band.fromMm() : band.toMm();
        }
        return (band.fromMm() + band.toMm()) / 2;
    }

    void say(String what) {
        message.set(what);
    }

    Optional<Part> focus() {
        return drawing.selection().focus();
    }

    /** Whether a part can be taken hold of in the drawing as it stands; bare bands have no sides to move. */
    boolean there(Part part) {
        return handles().of(part).isPresent();
    }

    int bandAt(double mm) {
        int last = design().bands().size() - 1;
        for (int i = 0; i < last; i++) {
            if (mm < design().bands().get(i).toMm()) {
                return i;
            }
        }
        return last;
    }
}
