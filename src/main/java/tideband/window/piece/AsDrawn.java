package tideband.window.piece;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.bench.Colours;
import tideband.bench.DrawnFilm;
import tideband.bench.Work;
import tideband.colour.Lab;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.trial.TrialRun;
import tideband.window.work.Answer;

/**
 * What the drawing wants at each place. A bare band is wanted with the native film it has, as the trial takes it; a band that
 * names a colour is wanted in that very colour, whatever film comes nearest.
 *
 * @param design the drawing
 * @param films the film of each band
 * @param colours the colours of the drawing's metal, finish and light
 */
record AsDrawn(Design design, List<DrawnFilm> films, Colours colours) {
    private static final int FEWEST_CUTS = 200;

    /**
     * A stretch thin enough to be shown in one colour.
     *
     * @param band the band it belongs to
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     */
    record Cut(int band, double fromMm, double toMm) {}

    /**
     * What a drawing wants.
     *
     * @param design the drawing
     * @param colours the colours of its metal, finish and light
     * @return what is wanted
     */
    static AsDrawn of(Design design, Colours colours) {
        return new AsDrawn(design, colours.filmsOf(design), colours);
    }

    /**
     * What a drawing wants that has been answered; films already found for the answer are not searched for again.
     *
     * @param answer the answer
     * @return what is wanted
     */
    static AsDrawn of(Answer answer) {
        if (answer.work() instanceof Work.Worked worked) {
            List<DrawnFilm> films = worked.plan().bands().stream()
                    .map(band ->
                            new DrawnFilm(band.aSide().filmNm(), band.bSide().filmNm()))
                    .toList();
            return new AsDrawn(answer.design(), films, answer.colours());
        }
        return of(answer.design(), answer.colours());
    }

    /**
     * The piece cut up: levels whole, fades as finely as the trial does.
     *
     * @return the cuts from end A to end B
     */
    List<Cut> cuts() {
        double longestMm = Math.min(TrialRun.LONGEST_CELL_MM, design.piece().lengthMm() / FEWEST_CUTS);
        List<Cut> cuts = new ArrayList<>();
        for (int b = 0; b < films.size(); b++) {
            Band band = design.bands().get(b);
            double lengthMm = band.toMm() - band.fromMm();
            boolean level = films.get(b).aSideNm() == films.get(b).bSideNm();
            int count = level ? 1 : (int) Math.ceil(lengthMm / longestMm);
            for (int i = 0; i < count; i++) {
                double toMm = i == count - 1 ? band.toMm() : band.fromMm() + lengthMm * (i + 1) / count;
                cuts.add(new Cut(b, band.fromMm() + lengthMm * i / count, toMm));
            }
        }
        return cuts;
    }

    /**
     * The band at a place.
     *
     * @param atMm position in mm from end A
     * @return its index; the first or last for a place off the piece
     */
    int bandAt(double atMm) {
        for (int b = 0; b < design.bands().size() - 1; b++) {
            if (atMm < design.bands().get(b).toMm()) {
                return b;
            }
        }
        return design.bands().size() - 1;
    }

    /**
     * The film wanted at a place.
     *
     * @param b the band
     * @param atMm position in mm from end A, in that band
     * @return film in nm; the native film where bare
     */
    double filmNmAt(int b, double atMm) {
        DrawnFilm film = films.get(b);
        if (film.bare()) {
            return design.bath().nativeNm();
        }
        Band band = design.bands().get(b);
        double share = (atMm - band.fromMm()) / (band.toMm() - band.fromMm());
        return film.aSideNm() + (film.bSideNm() - film.aSideNm()) * share;
    }

    /**
     * The colour wanted at a place.
     *
     * @param b the band
     * @param atMm position in mm from end A, in that band
     * @return the colour, or nothing for a film beyond those whose colours are known
     */
    Optional<Lab> labAt(int b, double atMm) {
        if (design.bands().get(b).wanted() instanceof Wanted.Colour colour) {
            return Optional.of(colour.lab());
        }
        double filmNm = filmNmAt(b, atMm);
        return filmNm <= colours.palette().maxNm()
                ? Optional.of(colours.palette().labAt(filmNm))
                : Optional.empty();
    }
}
