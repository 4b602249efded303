package tideband.window.colour;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.Colours;
import tideband.match.FilmColour;

/**
 * The colours a metal can really show, by trade name: from bare metal to the thickest film the bath gives, one film for
 * each stretch that bears one name in one order, taken from its middle.
 *
 * @param films the films, thinnest first
 */
public record NamedFilms(List<FilmColour> films) {
    /** Films are looked at in these steps, in nm. */
    private static final double STEP_NM = 1;
    /** A stretch shorter than this is the seam between two names rather than a colour to ask for, in nm. */
    private static final double SHORTEST_NM = 2;

    /** Copies the list, so that the value cannot change. */
    public NamedFilms {
        films = List.copyOf(films);
    }

    /**
     * Looks along the films.
     *
     * @param colours the colours of a design
     * @return its named films
     */
    public static NamedFilms of(Colours colours) {
        List<FilmColour> named = new ArrayList<>();
        List<FilmColour> stretch = new ArrayList<>();
        double endNm = colours.scale().ceilingNm();
        for (double filmNm = 0; filmNm <= endNm; filmNm += STEP_NM) {
            FilmColour film = colours.ofFilm(filmNm);
            if (!stretch.isEmpty() && !alike(stretch.get(0), film)) {
                take(stretch, named);
            }
            stretch.add(film);
        }
        take(stretch, named);
        return new NamedFilms(named);
    }

    private static boolean alike(FilmColour one, FilmColour other) {
        return one.name() == other.name() && one.order() == other.order();
    }

    private static void take(List<FilmColour> stretch, List<FilmColour> named) {
        if (stretch.size() * STEP_NM >= SHORTEST_NM) {
            named.add(stretch.get(stretch.size() / 2));
        }
        stretch.clear();
    }
}
