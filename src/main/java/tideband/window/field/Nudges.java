package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import tideband.bench.DrawnFilm;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.window.comfort.LengthUnit;

/** Moves the part that has the focus by small steps; steps of one part are one edit until the focus moves. */
final class Nudges {
    /** A step along the piece in inches is this; in millimetres it is 1. */
    private static final double INCH_STEP = 0.05;

    private final FieldState state;
    private Optional<Part> nudged = Optional.empty();
    private String gesture = "";

    Nudges(FieldState state) {
        this.state = state;
    }

    /** The next nudge is an edit of its own. */
    void pause() {
        nudged = Optional.empty();
    }

    private boolean change(Part part, String name, UnaryOperator<Design> edit) {
        if (!nudged.equals(Optional.of(part))) {
            nudged = Optional.of(part);
            gesture = state.drawing.newGesture();
        }
        state.say("");
        boolean changed = state.drawing.change(name, gesture, edit);
        state.reading.set(state.words.part(state.design(), state.films(), part));
        return changed;
    }

    private Optional<Part> focus() {
        Optional<Part> focus = state.focus().map(p -> state.there(p) ? p : new Part.Level(p.band()));
        if (focus.isEmpty()) {
            state.say(
                    "Nothing has the focus yet. Press Page Down for a band, or Ctrl+Right (Command on a Mac) for a handle.");
        }
        return focus;
    }

    /** Moves an edge by steps of 1 mm or 0.05 in towards end B, or towards end A if negative. */
    void along(double steps, boolean following) {
        focus().ifPresent(part -> {
            if (!(part instanceof Part.EdgeAt edge)) {
                state.say("Left and right move edges; this is "
                        + (part instanceof Part.Level ? "the line of a band" : "a side of a band")
                        + ". Go to its edge with Ctrl+Right (Command on a Mac).");
                return;
            }
            double stepMm = state.comfort.unit() == LengthUnit.INCH ? INCH_STEP * LengthUnit.INCH.inMm() : 1;
            double toMm = state.design().bands().get(edge.edge()).toMm() + steps * stepMm;
            boolean changed = change(
                    part,
                    following ? "Move edge and what follows" : "Move edge",
                    d -> following
                            ? BandEdits.moveEdgeAndFollowing(d, edge.edge(), toMm)
                            : BandEdits.moveEdge(d, edge.edge(), toMm));
            if (!changed) {
                state.say("The edge can go no farther: no band is shorter than "
                        + state.words.length(BandEdits.SHORTEST_MM) + ".");
            }
        });
    }

    /** Moves a film by steps of 1 nm up, or down if negative. */
    void up(double nm) {
        focus().ifPresent(part -> {
            if (part instanceof Part.EdgeAt) {
                state.say("Up and down move films; this is an edge. Go to a band with Page Down.");
                return;
            }
            boolean changed = part instanceof Part.FadeEnd end
                    ? change(
                            part,
                            "Move side of band",
                            d -> Moves.fadeEnd(
                                    d,
                                    state.films(),
                                    end.band(),
                                    end.side(),
                                    Moves.sideNm(state.films().get(end.band()), end.side()) + nm))
                    : level(part, nm);
            if (!changed) {
                state.say(
                        nm > 0
                                ? "No thicker film can be drawn than " + FieldWords.nm(BandEdits.THICKEST_NM) + "."
                                : part instanceof Part.Level
                                        ? "This band is bare already."
                                        : "No thinner film can be drawn than " + FieldWords.nm(BandEdits.THINNEST_NM)
                                                + "; to leave it bare, move the whole band down.");
            }
        });
    }

    private boolean level(Part part, double nm) {
        int band = part.band();
        List<Integer> bands = chosen(band);
        boolean bare = state.films().get(band).bare();
        double byNm = bare && nm > 0 ? Math.max(nm, thinnestNm()) : nm;
        return change(
                part,
                bands.size() > 1 ? "Move " + bands.size() + " bands" : "Move band",
                d -> Moves.levels(d, state.films(), bands, band, byNm));
    }

    /** The thinnest whole film the supply can give. */
    private double thinnestNm() {
        Supply supply = state.design().supply();
        return Math.ceil(state.volts().filmNmAtVolts().applyAsDouble(supply.dialVolts()));
    }

    private List<Integer> chosen(int band) {
        List<Integer> bands = state.drawing.selection().bands();
        return bands.contains(band) ? bands : List.of(band);
    }

    /** Moves films to the next steps of the supply's dial. */
    void dial(int steps) {
        focus().ifPresent(part -> {
            if (part instanceof Part.EdgeAt) {
                state.say("The dial's steps move films; this is an edge. Go to a band with Page Down.");
                return;
            }
            List<Integer> bands =
                    new ArrayList<>(part instanceof Part.Level ? chosen(part.band()) : List.of(part.band()));
            if (part instanceof Part.Level) {
                bands.removeIf(b -> sloped(state.films().get(b)));
            }
            if (bands.isEmpty()) {
                state.say("A fade runs through many volts. Go to one of its sides with Ctrl+Right (Command on a Mac).");
                return;
            }
            boolean changed = change(part, "Move by the dial", design -> {
                Design moved = design;
                for (int band : bands) {
                    moved = dialled(moved, band, part, steps);
                }
                return moved;
            });
            if (!changed) {
                state.say("The dial goes no farther: bath and supply give up to "
                        + FieldWords.volts(state.volts().ceilingVolts()) + ", and below one step nothing grows.");
            }
        });
    }

    private static boolean sloped(DrawnFilm film) {
        return film.aSideNm() != film.bSideNm();
    }

    private Design dialled(Design design, int band, Part part, int steps) {
        Supply supply = design.supply();
        DrawnFilm film = state.films().get(band);
        End side = part instanceof Part.FadeEnd end ? end.side() : End.A;
        double now = design.bands().get(band).wanted() instanceof Wanted.Volts volts
                ? volts.volts()
                : film.bare()
                        ? 0
                        : Math.min(
                                state.volts().volts(Moves.sideNm(film, side)),
                                state.volts().ceilingVolts());
        double next = supply.dialled(Math.min(
                Math.max(supply.dialled(now) + steps * supply.dialVolts(), supply.dialVolts()),
                state.volts().ceilingVolts()));
        double filmNm = state.volts().filmNmAtVolts().applyAsDouble(next);
        if (part instanceof Part.FadeEnd) {
            return Moves.fadeEnd(design, state.films(), band, side, filmNm);
        }
        Wanted wanted = design.bands().get(band).wanted() instanceof Wanted.Volts
                ? new Wanted.Volts(next)
                : BandEdits.film(filmNm, filmNm);
        return BandEdits.want(design, List.of(band), wanted);
    }
}
