package tideband.window.field;

import java.util.Optional;
import java.util.function.Consumer;
import tideband.edit.Part;
import tideband.match.Match;

/** What a hand does in the field. All places are in px from the field's upper left corner. */
public final class FieldHand {
    private final FieldState state;
    private final FieldShown shown;
    private final FieldPointer pointer;
    private final FieldEdits edits;
    private final Nudges nudges;
    private final Consumer<Match> take;
    private Optional<Part> hovered = Optional.empty();
    private Optional<Crosshair> crosshair = Optional.empty();

    /**
     * Where the hand is over the films.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     */
    public record Crosshair(double xPx, double yPx) {}

    /** What a hand would do where it is. */
    public enum Grip {
        /** Select. */
        SELECT,
        /** Move an edge along the piece. */
        ALONG,
        /** Move a film up and down. */
        UP,
        /** Take a film that comes near a wanted colour. */
        TAKE
    }

    FieldHand(FieldState state, FieldShown shown, FieldEdits edits, Nudges nudges, Consumer<Match> take) {
        this.state = state;
        this.shown = shown;
        this.pointer = new FieldPointer(state);
        this.edits = edits;
        this.nudges = nudges;
        this.take = take;
    }

    /** What is under the hand changes with the view. */
    void viewChanged() {
        if (!pointer.busy()) {
            crosshair.ifPresent(at -> hover(at.xPx(), at.yPx()));
        }
    }

    /** Lets go of what is no longer there. */
    void designChanged() {
        if (hovered.isPresent() && !state.there(hovered.get())) {
            hovered = Optional.empty();
        }
    }

    /**
     * The part under the hand, or the one it holds.
     *
     * @return the part, where there is one
     */
    public Optional<Part> hovered() {
        return pointer.held().or(() -> hovered);
    }

    /**
     * Where the hand is over the films.
     *
     * @return the place, where there is one
     */
    public Optional<Crosshair> crosshair() {
        return crosshair;
    }

    /**
     * The hand comes by.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     */
    public void hover(double xPx, double yPx) {
        hovered = state.handles().at(xPx, yPx);
        state.message.set("");
        if (state.area().overFilms(xPx, yPx)) {
            crosshair = Optional.of(new Crosshair(xPx, yPx));
            double mm = state.viewport.get().mm(xPx);
            double within = Math.min(Math.max(mm, 0), state.design().piece().lengthMm());
            double filmNm = Math.max(0, state.scale.get().nm(yPx));
            state.reading.set(state.words.length(within) + " · " + state.words.film(filmNm) + " · on band "
                    + state.design().bands().get(state.bandAt(within)).name());
        } else {
            crosshair = Optional.empty();
            state.reading.set(hovered.map(p -> state.words.part(state.design(), state.films(), p))
                    .orElse(""));
        }
        state.changed(Layer.OVERLAY);
    }

    /** The hand leaves. */
    public void leave() {
        hovered = Optional.empty();
        crosshair = Optional.empty();
        if (!pointer.busy()) {
            state.reading.set("");
        }
        state.changed(Layer.OVERLAY);
    }

    /**
     * What the hand would do at a place.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     * @return what it would do
     */
    public Grip grip(double xPx, double yPx) {
        if (shown.marks().stream().anyMatch(m -> m.onLabel(xPx, yPx))) {
            return Grip.TAKE;
        }
        Optional<Part> part = state.handles().at(xPx, yPx);
        if (part.isPresent()) {
            return part.get() instanceof Part.EdgeAt ? Grip.ALONG : Grip.UP;
        }
        return shown.marks().stream().anyMatch(m -> m.onLine(xPx, yPx, state.area())) ? Grip.TAKE : Grip.SELECT;
    }

    /**
     * The hand comes down.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     * @param keys keys held
     */
    public void press(double xPx, double yPx, Modifiers keys) {
        nudges.pause();
        state.say("");
        if (grip(xPx, yPx) == Grip.TAKE) {
            shown.marks().stream()
                    .filter(m -> m.onLabel(xPx, yPx))
                    .findFirst()
                    .or(() -> shown.marks().stream()
                            .filter(m -> m.onLine(xPx, yPx, state.area()))
                            .findFirst())
                    .ifPresent(m -> take.accept(m.match()));
            return;
        }
        pointer.press(xPx, yPx, keys);
    }

    /**
     * The hand comes down to move the view.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     */
    public void pressToPan(double xPx, double yPx) {
        pointer.pressToPan(xPx, yPx);
    }

    /**
     * The hand moves while it is down.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     * @param keys keys held
     */
    public void drag(double xPx, double yPx, Modifiers keys) {
        crosshair = Optional.empty();
        pointer.drag(xPx, yPx, keys);
    }

    /** The hand goes up. */
    public void release() {
        pointer.release();
    }

    /** Gives up what the hand is doing and puts everything back. */
    public void cancel() {
        pointer.cancel();
    }

    /**
     * Whether a hand is down.
     *
     * @return whether there is something to cancel
     */
    public boolean busy() {
        return pointer.busy();
    }

    /**
     * The hand comes down twice: an edge becomes crisp or soft, anything else is split there.
     *
     * @param xPx px from the left
     * @param yPx px from the top
     */
    public void pressTwice(double xPx, double yPx) {
        pointer.release();
        Optional<Part> part = state.handles().at(xPx, yPx);
        if (part.orElse(null) instanceof Part.EdgeAt edge) {
            edits.toggleEdge(edge.edge());
        } else if (state.area().overFilms(xPx, yPx)) {
            splitAt(xPx);
        }
    }

    private void splitAt(double xPx) {
        double mm = state.viewport.get().mm(xPx);
        double stepMm =
                Snapping.stepMm(state.comfort.unit(), state.viewport.get().pxPerMm());
        edits.split(state.bandAt(mm), Math.rint(mm / stepMm) * stepMm);
    }

    /** Splits the band under the hand where the hand is; where there is none, the selected one in its middle. */
    public void splitHere() {
        if (crosshair.isPresent()) {
            splitAt(crosshair.get().xPx());
        } else {
            edits.splitMiddle();
        }
    }
}
