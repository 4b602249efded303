package tideband.window.bands;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import tideband.bench.BenchBand;
import tideband.bench.DrawnFilm;
import tideband.bench.Work;
import tideband.design.Band;
import tideband.design.Wanted;
import tideband.match.FilmColour;
import tideband.window.work.Answer;

/** What the work behind the drawing says of each band, in words. */
final class Figures {

    /**
     * Of one band.
     *
     * @param band the band as it was worked out
     * @param film its film in nm
     * @param volts supply volts in the plan; empty without a plan
     * @param colour what its colour is called
     * @param aSideHex its colour at the A side
     * @param bSideHex its colour at the B side
     * @param outcome all of it in a sentence or two
     */
    record Of(Band band, String film, String volts, String colour, String aSideHex, String bSideHex, String outcome) {}

    private final List<Of> bands;

    private Figures(List<Of> bands) {
        this.bands = bands;
    }

    static Figures none() {
        return new Figures(List.of());
    }

    static Figures of(Answer answer) {
        List<Of> bands = new ArrayList<>();
        List<Band> drawn = answer.design().bands();
        if (answer.work() instanceof Work.Worked worked) {
            for (int i = 0; i < drawn.size(); i++) {
                bands.add(planned(drawn.get(i), worked.plan().bands().get(i)));
            }
        } else {
            List<DrawnFilm> films = answer.colours().filmsOf(answer.design());
            double mostNm = answer.colours().palette().maxNm();
            for (int i = 0; i < drawn.size(); i++) {
                DrawnFilm film = films.get(i);
                Optional<FilmColour> aSide = colour(answer, film.aSideNm(), mostNm);
                Optional<FilmColour> bSide = colour(answer, film.bSideNm(), mostNm);
                bands.add(unplanned(drawn.get(i), film, aSide, bSide));
            }
        }
        return new Figures(bands);
    }

    /** What is known of a band; nothing if it was worked out otherwise than it is drawn now. */
    Optional<Of> at(int index, Band band) {
        return index < bands.size() && bands.get(index).band().wanted().equals(band.wanted())
                ? Optional.of(bands.get(index))
                : Optional.empty();
    }

    private static Optional<FilmColour> colour(Answer answer, double filmNm, double mostNm) {
        return filmNm <= mostNm ? Optional.of(answer.colours().ofFilm(filmNm)) : Optional.empty();
    }

    private static Of planned(Band band, BenchBand bench) {
        String film =
                bench.bare() ? "bare" : nm(bench.aSide().filmNm(), bench.bSide().filmNm());
        String volts = bench.bare() ? "" : volts(bench.aSideVolts(), bench.bSideVolts());
        String colour = both(bench.aSide().name().text(), bench.bSide().name().text());
        String order = bench.bare()
                ? ""
                : ", order "
                        + both(text(bench.aSide().order()), text(bench.bSide().order()));
        String off = band.wanted() instanceof Wanted.Colour
                ? String.format(Locale.ROOT, " It is %.1f dE00 off what is wanted.", bench.wantedDe00())
                : "";
        String gamut = bench.aSide().inGamut() && bench.bSide().inGamut() ? "" : " A screen cannot show it in full.";
        String outcome = (bench.bare() ? "Natural metal: " : film + " nm at " + volts + " V: ") + colour + order + ", "
                + both(bench.aSide().srgbHex(), bench.bSide().srgbHex()) + "." + off + gamut;
        return new Of(
                band,
                film,
                volts,
                colour,
                bench.aSide().srgbHex(),
                bench.bSide().srgbHex(),
                outcome);
    }

    private static Of unplanned(Band band, DrawnFilm film, Optional<FilmColour> aSide, Optional<FilmColour> bSide) {
        String nm = film.bare() ? "bare" : nm(film.aSideNm(), film.bSideNm());
        String colour = aSide.isPresent() && bSide.isPresent()
                ? both(aSide.get().name().text(), bSide.get().name().text())
                : "";
        return new Of(
                band,
                nm,
                "",
                colour,
                aSide.map(FilmColour::srgbHex).orElse(""),
                bSide.map(FilmColour::srgbHex).orElse(""),
                (film.bare() ? "Natural metal" : nm + " nm") + (colour.isEmpty() ? "" : ": " + colour)
                        + ". There is no plan yet, so no volts are known.");
    }

    private static String nm(double aSideNm, double bSideNm) {
        return both(text(aSideNm), text(bSideNm));
    }

    private static String volts(double aSideVolts, double bSideVolts) {
        return both(text(aSideVolts), text(bSideVolts));
    }

    static String text(double number) {
        String fixed = String.format(Locale.ROOT, "%.1f", number);
        return fixed.endsWith(".0") ? fixed.substring(0, fixed.length() - 2) : fixed;
    }

    private static String both(String aSide, String bSide) {
        return aSide.equals(bSide) ? aSide : aSide + " \u2192 " + bSide;
    }
}
