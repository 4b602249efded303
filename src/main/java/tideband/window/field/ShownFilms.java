package tideband.window.field;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tideband.bench.Colours;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.match.Palette;

/** The films of bands as drawn. What takes long to find, the films of colours and volts, is kept while colours stay. */
final class ShownFilms {
    private static final int MOST_KEPT = 500;
    private final Map<Wanted, DrawnFilm> found = new HashMap<>();
    private Palette good;

    List<DrawnFilm> of(Design design, Colours colours) {
        if (!colours.palette().equals(good) || found.size() > MOST_KEPT) {
            found.clear();
            good = colours.palette();
        }
        List<DrawnFilm> films = new ArrayList<>();
        for (Band band : design.bands()) {
            DrawnFilm film = known(band.wanted());
            if (film == null) {
                List<DrawnFilm> all = colours.filmsOf(design);
                for (int i = 0; i < all.size(); i++) {
                    found.put(design.bands().get(i).wanted(), all.get(i));
                }
                return all;
            }
            films.add(film);
        }
        return List.copyOf(films);
    }

    private DrawnFilm known(Wanted wanted) {
        if (wanted instanceof Wanted.Film film) {
            return new DrawnFilm(film.aSideNm(), film.bSideNm());
        }
        return wanted instanceof Wanted.Bare ? new DrawnFilm(0, 0) : found.get(wanted);
    }
}
