package tideband.window.field;

import tideband.edit.Part;

/** How near the field is looked at, and where. */
public final class FieldSight {
    private static final double ZOOM_STEP = 1.5;
    private final FieldState state;

    FieldSight(FieldState state) {
        this.state = state;
    }

    /**
     * Gives the field another place.
     *
     * @param area the place
     */
    public void resize(FieldArea area) {
        state.resize(area);
    }

    /**
     * Looks nearer or from farther away, along the piece.
     *
     * @param factor above 1 for nearer
     * @param xPx the place that stays where it is, in px from the left
     */
    public void zoomAlong(double factor, double xPx) {
        double aboutMm = state.viewport.get().mm(xPx);
        state.look(state.zoom().along(factor, aboutMm, state.design().piece().lengthMm()));
    }

    /**
     * Looks nearer or from farther away, up the films.
     *
     * @param factor above 1 for nearer
     * @param yPx the place that stays where it is, in px from the top
     */
    public void zoomUp(double factor, double yPx) {
        state.look(state.zoom().up(factor, state.scale.get().nm(yPx), state.mostNm()));
    }

    /**
     * Moves the view.
     *
     * @param byPx how far to the right, in px
     * @param upPx how far up, in px
     * @return whether there was anywhere to go
     */
    public boolean pan(double byPx, double upPx) {
        Zoom before = state.zoom();
        state.look(before.moved(
                byPx / state.viewport.get().pxPerMm(),
                upPx / state.scale.get().pxPerNm(),
                state.design().piece().lengthMm(),
                state.mostNm()));
        return !before.equals(state.zoom());
    }

    /** Looks nearer, about the focus or else the middle. */
    public void zoomIn() {
        zoomAlong(ZOOM_STEP, middlePx());
    }

    /** Looks from farther away. */
    public void zoomOut() {
        zoomAlong(1 / ZOOM_STEP, middlePx());
    }

    /** Looks nearer at the films, about the focus or else the middle. */
    public void zoomFilmsIn() {
        zoomUp(ZOOM_STEP, middleUpPx());
    }

    /** Looks at more films. */
    public void zoomFilmsOut() {
        zoomUp(1 / ZOOM_STEP, middleUpPx());
    }

    private double middlePx() {
        return state.focus()
                .flatMap(p -> state.handles().of(p))
                .map(Handle::xPx)
                .filter(x -> x >= state.area().leftPx() && x <= state.area().rightPx())
                .orElse((state.area().leftPx() + state.area().rightPx()) / 2);
    }

    private double middleUpPx() {
        return state.focus()
                .filter(p -> !(p instanceof Part.EdgeAt))
                .flatMap(p -> state.handles().of(p))
                .map(Handle::yPx)
                .orElse((state.area().topPx() + state.area().bottomPx()) / 2);
    }

    /** Shows the whole piece and all films. */
    public void fit() {
        state.look(Zoom.WHOLE);
    }
}
