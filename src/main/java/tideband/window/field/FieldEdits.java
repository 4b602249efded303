package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.piece.End;

/**
 * Edits of what is selected: the selected bands, or else the band of the part that has the focus. What cannot be done is
 * said, and why.
 */
public final class FieldEdits {
    private static final double GUESSED_NM = 40;
    private final FieldState state;

    FieldEdits(FieldState state) {
        this.state = state;
    }

    private List<Integer> chosen() {
        Selection selection = state.drawing.selection();
        if (!selection.bands().isEmpty()) {
            return selection.bands();
        }
        return selection.focus().map(p -> List.of(p.band())).orElse(List.of());
    }

    private Optional<List<Integer>> some() {
        List<Integer> chosen = chosen();
        if (chosen.isEmpty()) {
            state.say("No band is selected. Click one, or go to the field and press Page Down.");
            return Optional.empty();
        }
        return Optional.of(chosen);
    }

    private Band band(int index) {
        return state.design().bands().get(index);
    }

    private boolean change(String name, UnaryOperator<Design> edit) {
        state.say("");
        return state.drawing.change(name, edit);
    }

    private void selectOne(int band) {
        state.drawing.select(Selection.of(new Part.Level(band)));
    }

    private boolean full(int more) {
        int count = state.design().bands().size();
        if (count + more > BandEdits.MOST_BANDS) {
            state.say(BandEdits.MOST_BANDS + " bands are the most a design has, and this one has " + count
                    + ". Join or delete some first.");
            return true;
        }
        return false;
    }

    private boolean tooShort(int index, String act) {
        Band band = band(index);
        double lengthMm = band.toMm() - band.fromMm();
        if (lengthMm < 2 * BandEdits.SHORTEST_MM) {
            state.say("Band " + band.name() + " is " + state.words.length(lengthMm) + " long, too short to " + act
                    + ": it takes " + state.words.length(2 * BandEdits.SHORTEST_MM) + ". Make it longer first.");
            return true;
        }
        return false;
    }

    /** Splits the first selected band in its middle. */
    public void splitMiddle() {
        some().ifPresent(bands -> {
            Band band = band(bands.get(0));
            split(bands.get(0), (band.fromMm() + band.toMm()) / 2);
        });
    }

    /**
     * Splits a band.
     *
     * @param band its index
     * @param atMm where, in mm from end A
     */
    public void split(int band, double atMm) {
        if (full(1) || tooShort(band, "split")) {
            return;
        }
        if (change("Split band", d -> BandEdits.split(d, band, atMm))) {
            selectOne(band + 1);
        }
    }

    /** Joins the last selected band with the one after it. */
    public void joinNext() {
        some().ifPresent(bands -> {
            int band = bands.get(bands.size() - 1);
            if (band == state.design().bands().size() - 1) {
                state.say("Band " + band(band).name() + " is the last one; there is none after it to join.");
            } else {
                join(band, band + 1);
            }
        });
    }

    /** Joins the selected bands, which must lie side by side. */
    public void joinSelected() {
        some().ifPresent(bands -> {
            int first = bands.get(0);
            int last = bands.get(bands.size() - 1);
            if (bands.size() < 2) {
                state.say("One band alone cannot be joined. Select two or more that lie side by side.");
            } else if (last - first != bands.size() - 1) {
                state.say("The selected bands do not lie side by side. Select those between them too.");
            } else {
                join(first, last);
            }
        });
    }

    private void join(int first, int last) {
        change("Join bands", d -> BandEdits.join(d, first, last));
        selectOne(first);
    }

    /** Inserts a band after the last selected one, in half of its length. */
    public void insertAfter() {
        some().ifPresent(bands -> {
            int after = bands.get(bands.size() - 1);
            if (full(1) || tooShort(after, "hold another")) {
                return;
            }
            DrawnFilm film = state.films().get(after);
            double filmNm = film.bare() ? guessedNm(after) : Math.max(1, Math.rint(film.bSideNm() * 2 / 3));
            if (change("Insert band", d -> BandEdits.insert(d, after, BandEdits.film(filmNm, filmNm)))) {
                selectOne(after + 1);
            }
        });
    }

    /** Repeats the selected bands after the last of them. */
    public void duplicate() {
        some().ifPresent(bands -> {
            int first = bands.get(0);
            int last = bands.get(bands.size() - 1);
            int count = last - first + 1;
            if (full(count)) {
                return;
            }
            if (!change(count == 1 ? "Duplicate band" : "Duplicate bands", d -> BandEdits.duplicate(d, first, last))) {
                state.say("The piece is too short for more bands of at least "
                        + state.words.length(BandEdits.SHORTEST_MM) + ". Join or delete some first.");
                return;
            }
            List<Integer> repeats =
                    IntStream.range(last + 1, last + 1 + count).boxed().toList();
            state.drawing.select(Selection.ofBands(repeats));
        });
    }

    /** Turns the drawing end for end. */
    public void mirror() {
        int last = state.design().bands().size() - 1;
        List<Integer> mirrored =
                state.drawing.selection().bands().stream().map(b -> last - b).toList();
        if (change("Mirror drawing", BandEdits::mirror)) {
            state.drawing.select(Selection.ofBands(mirrored));
        } else {
            state.say("The drawing looks the same from either end.");
        }
    }

    /** Deletes the selected bands; their neighbours take their length. */
    public void delete() {
        some().ifPresent(bands -> {
            if (bands.size() == state.design().bands().size()) {
                state.say("A drawing keeps at least one band. Leave one unselected.");
                return;
            }
            if (change(bands.size() == 1 ? "Delete band" : "Delete bands", d -> BandEdits.delete(d, bands))) {
                selectOne(Math.max(0, bands.get(0) - 1));
            }
        });
    }

    /** Makes the selected bands bare, or films again if they all are. */
    public void toggleBare() {
        some().ifPresent(bands -> {
            boolean allBare = bands.stream().allMatch(b -> band(b).wanted() instanceof Wanted.Bare);
            if (!allBare) {
                change("Leave bare", d -> BandEdits.want(d, bands, new Wanted.Bare()));
                return;
            }
            change("Give a film", design -> {
                Design filmed = design;
                for (int band : bands) {
                    double filmNm = guessedNm(band);
                    filmed = BandEdits.want(filmed, List.of(band), BandEdits.film(filmNm, filmNm));
                }
                return filmed;
            });
        });
    }

    /** A film for a band that has none: its neighbour's where that has one. */
    private double guessedNm(int band) {
        List<DrawnFilm> films = state.films();
        if (band > 0 && !films.get(band - 1).bare()) {
            return films.get(band - 1).bSideNm();
        }
        if (band < films.size() - 1 && !films.get(band + 1).bare()) {
            return films.get(band + 1).aSideNm();
        }
        return Math.min(GUESSED_NM, Math.floor(state.volts().ceilingNm()));
    }

    /** Makes the edge that has the focus, or the edges after the selected bands, crisp if they are soft and soft if crisp. */
    public void toggleEdge() {
        int last = state.design().bands().size() - 1;
        List<Integer> edges = new ArrayList<>();
        if (state.focus().orElse(null) instanceof Part.EdgeAt edge) {
            edges.add(edge.edge());
        } else {
            chosen().stream().filter(b -> b < last).forEach(edges::add);
        }
        if (edges.isEmpty()) {
            state.say(
                    chosen().isEmpty()
                            ? "No edge is selected. Click one, or go to the field and press Ctrl+Right (Command on a Mac)."
                            : "The last band ends where the piece ends; there is no edge to make crisp or soft.");
            return;
        }
        Edge other = band(edges.get(0)).edge() == Edge.CRISP ? Edge.SOFT : Edge.CRISP;
        toggle(edges, other);
    }

    /**
     * Makes an edge crisp if it is soft, and soft if it is crisp.
     *
     * @param edge index of the band on its A side
     */
    public void toggleEdge(int edge) {
        toggle(List.of(edge), band(edge).edge() == Edge.CRISP ? Edge.SOFT : Edge.CRISP);
    }

    private void toggle(List<Integer> edges, Edge kind) {
        change(kind == Edge.CRISP ? "Make edge crisp" : "Make edge soft", d -> BandEdits.setEdge(d, edges, kind));
        state.reading.set(kind == Edge.CRISP ? "edge crisp: a mask line" : "edge soft: a waterline will do");
    }

    /** Makes the selected fades level: at the side that has the focus, or else at their middle. */
    public void makeLevel() {
        some().ifPresent(bands -> {
            Part focus = state.focus().orElse(null);
            boolean changed = change("Make level", design -> {
                Design level = design;
                for (int band : bands) {
                    DrawnFilm film = state.films().get(band);
                    if (film.aSideNm() != film.bSideNm()) {
                        double filmNm = focus instanceof Part.FadeEnd end && end.band() == band
                                ? Moves.sideNm(film, end.side())
                                : Math.rint((film.aSideNm() + film.bSideNm()) / 2);
                        level = BandEdits.want(level, List.of(band), BandEdits.film(filmNm, filmNm));
                    }
                }
                return level;
            });
            if (!changed) {
                state.say("No fade is selected, so there is nothing to make level.");
            }
        });
    }

    /** Makes the selected level bands fades, from their own film to their neighbour's. */
    public void makeFade() {
        some().ifPresent(bands -> {
            List<DrawnFilm> films = state.films();
            boolean changed = change("Make fade", design -> {
                Design faded = design;
                for (int band : bands) {
                    DrawnFilm film = films.get(band);
                    if (!film.bare() && film.aSideNm() == film.bSideNm()) {
                        faded = fade(faded, band);
                    }
                }
                return faded;
            });
            if (changed) {
                int first = bands.get(0);
                state.drawing.select(new Selection(bands, Optional.of(new Part.FadeEnd(first, End.B))));
            } else {
                state.say("Only a level band that has a film can be made a fade. Give it a film first.");
            }
        });
    }

    private Design fade(Design design, int band) {
        List<DrawnFilm> films = state.films();
        double ownNm = films.get(band).aSideNm();
        if (band < films.size() - 1
                && differs(films.get(band + 1), films.get(band + 1).aSideNm(), ownNm)) {
            return Moves.fadeEnd(design, films, band, End.B, films.get(band + 1).aSideNm());
        }
        if (band > 0 && differs(films.get(band - 1), films.get(band - 1).bSideNm(), ownNm)) {
            return Moves.fadeEnd(design, films, band, End.A, films.get(band - 1).bSideNm());
        }
        return Moves.fadeEnd(design, films, band, End.B, Math.max(1, Math.rint(ownNm / 2)));
    }

    private static boolean differs(DrawnFilm neighbour, double sideNm, double ownNm) {
        return !neighbour.bare() && sideNm != ownNm;
    }

    /** Selects all bands. */
    public void selectAll() {
        state.say("");
        state.drawing.select(Selection.ofBands(
                IntStream.range(0, state.design().bands().size()).boxed().toList()));
    }
}
