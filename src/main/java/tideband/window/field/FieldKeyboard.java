package tideband.window.field;

import tideband.bench.DrawnFilm;
import tideband.edit.Part;
import tideband.edit.Selection;

/** What the keyboard does in the field: it walks the focus along the drawing and moves what has it. */
public final class FieldKeyboard {
    private final FieldState state;
    private final FieldFocus focus;
    private final Nudges nudges;

    FieldKeyboard(FieldState state, Nudges nudges) {
        this.state = state;
        this.focus = new FieldFocus(state);
        this.nudges = nudges;
    }

    /**
     * To another handle.
     *
     * @param by 1 towards end B, -1 towards end A
     */
    public void stepHandle(int by) {
        focus.stepHandle(by);
    }

    /**
     * To another band.
     *
     * @param by 1 towards end B, -1 towards end A
     * @param extend whether what is selected stays selected
     */
    public void stepBand(int by, boolean extend) {
        focus.stepBand(by, extend);
    }

    /** To the first band. */
    public void firstBand() {
        focus.toBand(0, false);
    }

    /** To the last band. */
    public void lastBand() {
        focus.toBand(state.design().bands().size() - 1, false);
    }

    /**
     * Moves the edge that has the focus.
     *
     * @param steps how many mm, or 0.05 in, towards end B
     * @param following whether all that follows moves with it
     */
    public void nudgeAlong(double steps, boolean following) {
        nudges.along(steps, following);
    }

    /**
     * Moves the film that has the focus.
     *
     * @param nm how many nm up
     */
    public void nudgeUp(double nm) {
        nudges.up(nm);
    }

    /**
     * Moves the film that has the focus to another step of the supply's dial.
     *
     * @param steps how many steps up
     */
    public void nudgeDial(int steps) {
        nudges.dial(steps);
    }

    /**
     * The number of the part that has the focus: mm of an edge, nm of a film.
     *
     * @return the number; 0 where nothing has the focus
     */
    public double value() {
        Part part = state.focus().orElse(null);
        if (part == null) {
            return 0;
        }
        if (part instanceof Part.EdgeAt) {
            return state.design().bands().get(part.band()).toMm();
        }
        DrawnFilm film = state.films().get(part.band());
        return part instanceof Part.FadeEnd end ? Moves.sideNm(film, end.side()) : film.aSideNm();
    }

    /**
     * The most that number could be within reach.
     *
     * @return mm or nm
     */
    public double mostValue() {
        return state.focus().orElse(null) instanceof Part.EdgeAt
                ? state.design().piece().lengthMm()
                : state.volts().ceilingNm();
    }

    /**
     * Moves what has the focus the way it can be moved.
     *
     * @param steps how many mm, or 0.05 in, towards end B; or how many nm up
     */
    public void nudge(double steps) {
        if (state.focus().orElse(null) instanceof Part.EdgeAt) {
            nudges.along(steps, false);
        } else {
            nudges.up(steps);
        }
    }

    /**
     * Selects nothing.
     *
     * @return whether something was selected
     */
    public boolean letGo() {
        boolean some = !state.drawing.selection().equals(Selection.NONE);
        state.drawing.select(Selection.NONE);
        return some;
    }
}
