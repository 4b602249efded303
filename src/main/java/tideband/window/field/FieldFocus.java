package tideband.window.field;

import java.util.List;
import java.util.Optional;
import java.util.SortedSet;
import java.util.TreeSet;
import tideband.edit.Part;
import tideband.edit.Selection;

/** Walks the keyboard's focus along the drawing. */
final class FieldFocus {
    private final FieldState state;

    FieldFocus(FieldState state) {
        this.state = state;
    }

    /** To the next handle towards end B, or with -1 towards end A; bands stay selected as long as the focus is on one of them. */
    void stepHandle(int by) {
        List<Handle> handles = state.handles().all();
        int at = -1;
        Part focus = state.focus().orElse(null);
        for (int i = 0; i < handles.size(); i++) {
            if (handles.get(i).part().equals(focus)) {
                at = i;
            }
        }
        int next = at < 0 ? (by > 0 ? 0 : handles.size() - 1) : at + by;
        if (next < 0 || next >= handles.size()) {
            state.say(next < 0 ? "This is the first handle, at end A." : "This is the last handle, at end B.");
            return;
        }
        go(handles.get(next).part());
    }

    /** To the next band towards end B, or with -1 towards end A. */
    void stepBand(int by, boolean extend) {
        int last = state.design().bands().size() - 1;
        Part focus = state.focus().orElse(null);
        int next;
        if (focus == null) {
            next = by > 0 ? 0 : last;
        } else {
            // From an edge, the band on the side that is asked for.
            next = focus instanceof Part.EdgeAt && by < 0 ? focus.band() : focus.band() + by;
        }
        if (next < 0 || next > last) {
            state.say(next < 0 ? "This is the first band, at end A." : "This is the last band, at end B.");
            return;
        }
        toBand(next, extend);
    }

    void toBand(int band, boolean extend) {
        if (!extend) {
            go(new Part.Level(band));
            return;
        }
        state.say("");
        SortedSet<Integer> bands = new TreeSet<>(state.drawing.selection().bands());
        bands.add(band);
        state.drawing.select(new Selection(List.copyOf(bands), Optional.of(new Part.Level(band))));
        state.reveal(new Part.Level(band));
    }

    private void go(Part part) {
        state.say("");
        state.drawing.select(Selection.of(part));
        state.reveal(part);
        state.reading.set(state.words.part(state.design(), state.films(), part));
    }
}
