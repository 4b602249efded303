package tideband.window.bands;

import java.util.Collection;
import java.util.List;
import java.util.OptionalInt;
import tideband.bench.Colours;
import tideband.bench.DrawnFilm;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.design.Wanted;
import tideband.edit.BandEdits;

/** Turns bands into another kind that comes out as nearly as can be as they do now. */
final class KindChange {
    /** What a bare band begins with when it is to have a film, in nm. */
    private static final double START_NM = 50;

    private KindChange() {}

    static Design of(Design design, Colours colours, Collection<Integer> chosen, BandKind kind) {
        List<DrawnFilm> films = colours.filmsOf(design);
        Design changed = design;
        for (int band : chosen) {
            if (BandKind.of(design.bands().get(band).wanted()) != kind) {
                changed = BandEdits.want(changed, List.of(band), wanted(design, colours, films, band, kind));
            }
        }
        return changed;
    }

    private static Wanted wanted(Design design, Colours colours, List<DrawnFilm> films, int band, BandKind kind) {
        double filmNm = films.get(band).bare() ? START_NM : films.get(band).aSideNm();
        return switch (kind) {
            case LEVEL -> BandEdits.film(filmNm, filmNm);
            case FADE -> BandEdits.film(filmNm, farSideNm(films, band, filmNm));
            case VOLTS -> new Wanted.Volts(volts(design, colours, filmNm));
            case COLOUR ->
                Wanted.Colour.ofHex(
                        colours.ofFilm(Math.min(filmNm, colours.palette().maxNm()))
                                .srgbHex(),
                        colours.viewing(),
                        OptionalInt.empty());
            case BARE -> new Wanted.Bare();
        };
    }

    /** A fade runs to where the next band begins; where that leads nowhere, to half its film. */
    private static double farSideNm(List<DrawnFilm> films, int band, double filmNm) {
        boolean leads = band + 1 < films.size()
                && !films.get(band + 1).bare()
                && films.get(band + 1).aSideNm() != filmNm;
        return leads ? films.get(band + 1).aSideNm() : Math.max(filmNm / 2, BandEdits.THINNEST_NM);
    }

    private static double volts(Design design, Colours colours, double filmNm) {
        double within = Math.min(filmNm, colours.scale().ceilingNm());
        double volts = Math.min(colours.scale().volts(within), colours.scale().ceilingVolts());
        return Limits.BAND_VOLTS.nearest(
                Math.max(design.supply().dialled(volts), design.supply().dialVolts()));
    }
}
