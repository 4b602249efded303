package tideband.window.field;

import java.util.Collection;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.oxide.Supply;
import tideband.piece.End;

/** What a hand does in the field, from press to release. */
final class FieldPointer {
    private static final double STILL_PX = 3;
    private static final double REACH_ALONG_PX = 5;
    private static final double REACH_UP_PX = 4;
    private static final double TINY = 1e-6;

    private enum Doing {
        NOTHING,
        MOVING,
        SWEEPING,
        PANNING
    }

    // How it all was when the hand came down.
    private record Start(
            double xPx,
            double yPx,
            Modifiers keys,
            Design design,
            List<DrawnFilm> films,
            Selection selection,
            Zoom zoom) {}

    private final FieldState state;
    private Doing doing = Doing.NOTHING;
    private Start start;
    private Part held;
    private String gesture = "";
    private boolean moved;
    private Design last;

    FieldPointer(FieldState state) {
        this.state = state;
    }

    boolean busy() {
        return doing != Doing.NOTHING;
    }

    boolean drawing() {
        return doing == Doing.MOVING && moved;
    }

    Optional<Part> held() {
        return doing == Doing.MOVING ? Optional.of(held) : Optional.empty();
    }

    void pressToPan(double xPx, double yPx) {
        begin(Doing.PANNING, xPx, yPx, Modifiers.NONE);
    }

    void press(double xPx, double yPx, Modifiers keys) {
        Optional<Part> part = state.handles().at(xPx, yPx);
        if (part.isPresent()) {
            begin(Doing.MOVING, xPx, yPx, keys);
            held = part.get();
            if (!keys.shift() && !keys.shortcut()) {
                boolean oneOfMany = !(held instanceof Part.EdgeAt)
                        && state.drawing.selection().bands().contains(held.band());
                state.drawing.select(
                        oneOfMany ? new Selection(state.drawing.selection().bands(), part) : Selection.of(held));
            }
        } else if (state.area().overFilms(xPx, yPx)) {
            begin(Doing.SWEEPING, xPx, yPx, keys);
            held = new Part.Level(state.bandAt(state.viewport.get().mm(xPx)));
            if (!keys.shift() && !keys.shortcut()) {
                state.drawing.select(Selection.of(held));
            }
        }
    }

    private void begin(Doing next, double xPx, double yPx, Modifiers keys) {
        doing = next;
        moved = false;
        start = new Start(xPx, yPx, keys, state.design(), state.films(), state.drawing.selection(), state.zoom());
        last = state.design();
        gesture = state.drawing.newGesture();
    }

    void drag(double xPx, double yPx, Modifiers keys) {
        if (doing == Doing.NOTHING) {
            return;
        }
        if (!last.equals(state.design())) {
            // Something else changed the drawing: the hand has lost it.
            end();
            return;
        }
        if (!moved && Math.hypot(xPx - start.xPx, yPx - start.yPx) < STILL_PX * state.enlarged()) {
            return;
        }
        if (!moved) {
            moved = true;
            state.holdSteady(true);
            if (doing == Doing.MOVING && (start.keys.shift() || start.keys.shortcut())) {
                state.drawing.select(Selection.of(held));
            }
        }
        if (doing == Doing.PANNING) {
            double byMm = (start.xPx - xPx) / state.viewport.get().pxPerMm();
            double byNm = (yPx - start.yPx) / state.scale.get().pxPerNm();
            state.look(start.zoom.moved(byMm, byNm, state.design().piece().lengthMm(), state.mostNm()));
        } else if (doing == Doing.SWEEPING) {
            sweep(xPx);
        } else if (held instanceof Part.EdgeAt edge) {
            moveEdge(edge.edge(), xPx, keys);
        } else if (held instanceof Part.FadeEnd side) {
            moveEnd(side, yPx, keys);
        } else {
            moveLevel(held.band(), xPx, yPx, keys);
        }
    }

    private void sweep(double xPx) {
        int here = state.bandAt(state.viewport.get().mm(xPx));
        List<Integer> bands = range(held.band(), here);
        state.drawing.select(new Selection(bands, Optional.of(new Part.Level(here))));
        state.reading.set(bands.size() == 1 ? "1 band selected" : bands.size() + " bands selected");
    }

    private static List<Integer> range(int one, int other) {
        return IntStream.rangeClosed(Math.min(one, other), Math.max(one, other))
                .boxed()
                .toList();
    }

    private void moveEdge(int edge, double xPx, Modifiers keys) {
        double pxPerMm = state.viewport.get().pxPerMm();
        double wasMm = start.design.bands().get(edge).toMm();
        double wantedMm = wasMm + (xPx - start.xPx) / pxPerMm;
        Snap snap = new Snap(wantedMm, "");
        if (keys.snapping()) {
            double stepMm = Snapping.stepMm(state.comfort.unit(), pxPerMm);
            double reachMm = REACH_ALONG_PX * state.enlarged() / pxPerMm;
            snap = Snapping.edge(start.design, edge, wantedMm, reachMm, stepMm, state.comfort.unit());
        }
        double toMm = snap.value();
        Design next = toMm == wasMm
                ? start.design
                : keys.shift()
                        ? BandEdits.moveEdgeAndFollowing(start.design, edge, toMm)
                        : BandEdits.moveEdge(start.design, edge, toMm);
        double isMm = next.bands().get(edge).toMm();
        String note = "";
        if (Math.abs(isMm - toMm) > 2e-3) {
            note = " · as far as it goes: no band is shorter than " + state.words.length(BandEdits.SHORTEST_MM);
        } else if (!snap.to().isEmpty()) {
            note = " · snapped to " + snap.to();
        }
        show(
                keys.shift() ? "Move edge and what follows" : "Move edge",
                next,
                "edge " + state.words.length(isMm) + was(state.words.length(isMm), state.words.length(wasMm))
                        + (keys.shift() ? " · all that follows moves" : "") + note);
    }

    private static String was(String now, String before) {
        return now.equals(before) ? "" : " · was " + before;
    }

    private void moveLevel(int band, double xPx, double yPx, Modifiers keys) {
        DrawnFilm film = start.films.get(band);
        Band drawn = start.design.bands().get(band);
        // Of a fade, the side nearer to the hand is led; the other keeps its distance.
        boolean nearB = state.viewport.get().mm(xPx) > (drawn.fromMm() + drawn.toMm()) / 2;
        End side = film.aSideNm() == film.bSideNm() ? null : nearB ? End.B : End.A;
        double fromNm = side == End.B ? film.bSideNm() : film.aSideNm();
        Snap snap = led(band, side, false, fromNm + risenNm(yPx), keys);
        double byNm = snap.value() - fromNm;
        Collection<Integer> chosen = state.drawing.selection().bands().contains(band)
                ? state.drawing.selection().bands()
                : List.of(band);
        Design next =
                Math.abs(byNm) < TINY ? start.design : Moves.levels(start.design, start.films, chosen, band, byNm);
        String name = chosen.size() > 1 ? "Move " + chosen.size() + " bands" : "Move band";
        show(name, next, "");
        DrawnFilm now = state.films().get(band);
        String others = chosen.size() > 1 ? " · with " + (chosen.size() - 1) + " more" : "";
        String was = now.equals(film) ? "" : " · was " + brief(film);
        String bare = now.bare() && !film.bare() ? " · let go here and it stays natural metal" : "";
        state.reading.set(
                "band " + drawn.name() + " " + state.words.film(now) + was + bare + snapped(snap, now) + others);
    }

    private static String brief(DrawnFilm film) {
        if (film.bare()) {
            return "bare";
        }
        return film.aSideNm() == film.bSideNm()
                ? FieldWords.nm(film.aSideNm())
                : FieldWords.nm(film.aSideNm()) + " to " + FieldWords.nm(film.bSideNm());
    }

    private static String snapped(Snap snap, DrawnFilm now) {
        return snap.to().isEmpty() || now.bare() ? "" : " · snapped to " + snap.to();
    }

    private void moveEnd(Part.FadeEnd end, double yPx, Modifiers keys) {
        DrawnFilm film = start.films.get(end.band());
        double fromNm = Moves.sideNm(film, end.side());
        Snap snap = led(end.band(), end.side(), true, fromNm + risenNm(yPx), keys);
        Design next = Math.abs(snap.value() - fromNm) < TINY
                ? start.design
                : Moves.fadeEnd(start.design, start.films, end.band(), end.side(), snap.value());
        show("Move side of band", next, "");
        DrawnFilm now = state.films().get(end.band());
        double isNm = Moves.sideNm(now, end.side());
        String note = isNm > snap.value() + TINY
                ? " · as thin as it goes; to leave it bare, move the whole band down"
                : snapped(snap, now);
        state.reading.set("side " + end.side() + " of "
                + start.design.bands().get(end.band()).name() + " " + state.words.film(isNm)
                + was(FieldWords.nm(isNm), FieldWords.nm(fromNm)) + note);
    }

    private double risenNm(double yPx) {
        return (start.yPx - yPx) / state.scale.get().pxPerNm();
    }

    private Snap led(int band, End side, boolean alone, double toNm, Modifiers keys) {
        if (!keys.snapping() || toNm < BandEdits.THINNEST_NM) {
            return new Snap(Math.rint(toNm * 100) / 100, "");
        }
        if (keys.shift() && toNm <= state.volts().ceilingNm()) {
            Supply supply = start.design.supply();
            double volts = supply.dialled(state.volts().volts(toNm));
            double atDialNm = state.volts().filmNmAtVolts().applyAsDouble(volts);
            return new Snap(Math.rint(atDialNm * 100) / 100, "the dial at " + FieldWords.volts(volts));
        }
        double reachNm = REACH_UP_PX * state.enlarged() / state.scale.get().pxPerNm();
        return Snapping.film(
                start.design,
                start.films,
                band,
                side,
                alone,
                toNm,
                reachNm,
                state.volts().ceilingNm());
    }

    private void show(String name, Design next, String reading) {
        state.drawing.change(name, gesture, d -> next);
        last = state.design();
        state.reading.set(reading);
    }

    void release() {
        if (doing != Doing.NOTHING && !moved && doing != Doing.PANNING) {
            click();
        }
        end();
    }

    private void click() {
        if (held instanceof Part.EdgeAt) {
            state.drawing.select(Selection.of(held));
        } else if (start.keys.shortcut()) {
            state.drawing.select(start.selection.toggled(held.band()));
        } else if (start.keys.shift()) {
            int from = start.selection.focus().map(Part::band).orElse(held.band());
            state.drawing.select(new Selection(range(from, held.band()), Optional.of(new Part.Level(held.band()))));
        } else {
            state.drawing.select(Selection.of(held));
        }
    }

    /** Puts everything back as it was when the hand came down. */
    void cancel() {
        if (doing == Doing.NOTHING) {
            return;
        }
        Design before = start.design;
        if (doing == Doing.MOVING && moved && last.equals(state.design())) {
            state.drawing.change("Move", gesture, d -> before);
            state.reading.set("put back as it was");
        }
        if (doing == Doing.PANNING) {
            state.look(start.zoom);
        }
        state.drawing.select(start.selection);
        end();
    }

    private void end() {
        doing = Doing.NOTHING;
        state.holdSteady(false);
        state.changed(Layer.OVERLAY);
    }
}
