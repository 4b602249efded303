package tideband.window.field;

import java.util.Collection;
import java.util.List;
import tideband.bench.DrawnFilm;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.piece.End;

/** Films moved up and down. */
final class Moves {
    private Moves() {}

    /**
     * Moves bands by the same amount of film; each keeps its slope. A film that would be thinner than can be drawn becomes
     * bare metal; a bare band becomes a film only where it is the one held.
     */
    static Design levels(Design start, List<DrawnFilm> films, Collection<Integer> chosen, int held, double byNm) {
        Design moved = start;
        for (int band : chosen) {
            DrawnFilm film = films.get(band);
            if (!film.bare() || band == held) {
                moved = BandEdits.want(moved, List.of(band), moved(film, byNm));
            }
        }
        return moved;
    }

    private static Wanted moved(DrawnFilm film, double byNm) {
        double thinNm = Math.min(film.aSideNm(), film.bSideNm());
        double thickNm = Math.max(film.aSideNm(), film.bSideNm());
        if (thickNm + byNm < BandEdits.THINNEST_NM) {
            return new Wanted.Bare();
        }
        double within = Math.min(Math.max(byNm, BandEdits.THINNEST_NM - thinNm), BandEdits.THICKEST_NM - thickNm);
        return BandEdits.film(film.aSideNm() + within, film.bSideNm() + within);
    }

    /** Gives one side of a band another film; the band becomes a fade, or level if both sides are alike. */
    static Design fadeEnd(Design start, List<DrawnFilm> films, int band, End side, double toNm) {
        DrawnFilm film = films.get(band);
        Wanted.Film wanted =
                side == End.A ? BandEdits.film(toNm, film.bSideNm()) : BandEdits.film(film.aSideNm(), toNm);
        return BandEdits.want(start, List.of(band), wanted);
    }

    static double sideNm(DrawnFilm film, End side) {
        return side == End.A ? film.aSideNm() : film.bSideNm();
    }
}
