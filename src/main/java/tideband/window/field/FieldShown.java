package tideband.window.field;

import java.util.List;
import java.util.Optional;
import javafx.beans.value.ObservableValue;
import tideband.bench.DrawnFilm;
import tideband.colour.Viewing;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.Match;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.window.comfort.LengthUnit;
import tideband.window.drawing.Viewport;
import tideband.window.work.Glance;

/** What the field shows, and where. */
public final class FieldShown {
    private final FieldState state;
    private final ObservableValue<List<Match>> matches;
    private final ObservableValue<Optional<Glance>> glance;
    private final ObservableValue<List<Integer>> faulty;
    private List<MatchMark> marks;

    FieldShown(
            FieldState state,
            ObservableValue<List<Match>> matches,
            ObservableValue<Optional<Glance>> glance,
            ObservableValue<List<Integer>> faulty) {
        this.state = state;
        this.matches = matches;
        this.glance = glance;
        this.faulty = faulty;
        matches.addListener((value, before, after) -> marksChanged());
        state.scale.addListener((value, before, after) -> marksChanged());
        state.viewport.addListener((value, before, after) -> marksChanged());
        glance.addListener((value, before, after) -> state.changed(Layer.OVERLAY));
        faulty.addListener((value, before, after) -> {
            state.changed(Layer.DRAWING);
            state.changed(Layer.OVERLAY);
        });
    }

    private void marksChanged() {
        marks = null;
        state.changed(Layer.OVERLAY);
    }

    /**
     * Where everything is.
     *
     * @return the field's place
     */
    public FieldArea area() {
        return state.area();
    }

    /**
     * The stretch of the piece in view.
     *
     * @return the viewport
     */
    public Viewport viewport() {
        return state.viewport.get();
    }

    /**
     * The films in view.
     *
     * @return the scale
     */
    public NmScale scale() {
        return state.scale.get();
    }

    /**
     * The design as it stands.
     *
     * @return the design
     */
    public Design design() {
        return state.design();
    }

    /**
     * What is selected.
     *
     * @return the selection
     */
    public Selection selection() {
        return state.drawing.selection();
    }

    /**
     * The films of the bands as drawn.
     *
     * @return one a band
     */
    public List<DrawnFilm> films() {
        return state.films();
    }

    /**
     * What can be taken hold of, from end A to end B.
     *
     * @return the handles
     */
    public List<Handle> handles() {
        return state.handles().all();
    }

    /**
     * What can be taken hold of at a place.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     * @return the part, where there is one
     */
    public Optional<Part> partAt(double xPx, double yPx) {
        return state.handles().at(xPx, yPx);
    }

    /**
     * Films that come near a wanted colour, as they are marked.
     *
     * @return the marks, from the top
     */
    public List<MatchMark> marks() {
        if (marks == null) {
            marks = MatchMark.of(matches.getValue(), state.area(), state.scale.get(), state.volts());
        }
        return marks;
    }

    /**
     * The immersion pointed at.
     *
     * @return what it does, where there is one
     */
    public Optional<Glance> glance() {
        return glance.getValue();
    }

    /**
     * Bands that cannot be made as drawn.
     *
     * @return their indices; only such as are in the drawing
     */
    public List<Integer> faulty() {
        int count = state.design().bands().size();
        return faulty.getValue().stream().filter(b -> b >= 0 && b < count).toList();
    }

    /**
     * The colours of films as the piece is tilted.
     *
     * @return the palette
     */
    public Palette palette() {
        return state.tilt.paletteProperty().get();
    }

    /**
     * Light and observer.
     *
     * @return how it is looked at
     */
    public Viewing viewing() {
        return state.work.coloursProperty().get().viewing();
    }

    /**
     * Films and volts.
     *
     * @return the scale of bath and supply
     */
    public VoltScale volts() {
        return state.volts();
    }

    /**
     * The unit of length.
     *
     * @return the unit
     */
    public LengthUnit unit() {
        return state.comfort.unit();
    }

    /**
     * How much larger than usual everything is.
     *
     * @return 1 to 2
     */
    public double enlarged() {
        return state.enlarged();
    }
}
