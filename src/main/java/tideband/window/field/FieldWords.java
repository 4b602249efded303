package tideband.window.field;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import tideband.bench.Colours;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.match.Match;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.window.comfort.ComfortModel;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/** Places, films and parts in words and numbers. */
final class FieldWords {
    private static final int MOST_SAID = 50;

    private final WorkModel work;
    private final TiltModel tilt;
    private final ComfortModel comfort;
    // The same film is said several times over, and its volts take long to find.
    private final Map<Double, String> said = new HashMap<>();
    private Colours saidFor;
    private Palette saidUnder;

    FieldWords(WorkModel work, TiltModel tilt, ComfortModel comfort) {
        this.work = work;
        this.tilt = tilt;
        this.comfort = comfort;
    }

    String length(double mm) {
        return comfort.unit().text(mm);
    }

    static String nm(double filmNm) {
        BigDecimal rounded = BigDecimal.valueOf(filmNm).setScale(1, RoundingMode.HALF_EVEN);
        return (rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString()) + " nm";
    }

    static String volts(double volts) {
        return String.format(Locale.ROOT, "%.1f V", volts);
    }

    /** A film with its volts and colour, as far as they are known. */
    String film(double filmNm) {
        if (filmNm <= 0) {
            return "bare metal";
        }
        Colours colours = work.coloursProperty().get();
        Palette palette = tilt.paletteProperty().get();
        if (!colours.equals(saidFor) || !palette.equals(saidUnder) || said.size() >= MOST_SAID) {
            said.clear();
            saidFor = colours;
            saidUnder = palette;
        }
        return said.computeIfAbsent(filmNm, nm -> film(nm, colours.scale(), palette));
    }

    private static String film(double filmNm, VoltScale scale, Palette palette) {
        String reach = filmNm > scale.ceilingNm()
                ? "out of reach, the most is " + nm(scale.ceilingNm()) + " at " + volts(scale.ceilingVolts())
                : volts(scale.volts(filmNm));
        return nm(filmNm) + " · " + reach + colour(filmNm, palette);
    }

    private static String colour(double filmNm, Palette palette) {
        if (filmNm > palette.maxNm()) {
            return "";
        }
        return " · " + palette.nameAt(filmNm).text() + " (" + palette.orderAt(filmNm) + ")";
    }

    /** A band's film, both sides where it is a fade. */
    String film(DrawnFilm film) {
        return film.aSideNm() == film.bSideNm()
                ? film(film.aSideNm())
                : film(film.aSideNm()) + " to " + film(film.bSideNm());
    }

    static String match(Match match) {
        return nm(match.filmNm()) + " · " + volts(match.volts()) + " · dE00 "
                + String.format(Locale.ROOT, "%.1f", match.difference());
    }

    /** A part with its numbers, for those who do not see it. */
    String part(Design design, List<DrawnFilm> films, Part part) {
        Band band = design.bands().get(part.band());
        DrawnFilm film = films.get(part.band());
        if (part instanceof Part.EdgeAt) {
            Band next = design.bands().get(part.band() + 1);
            return band.edge().key() + " edge between " + band.name() + " and " + next.name() + " at "
                    + length(band.toMm());
        }
        if (part instanceof Part.FadeEnd end) {
            return "side " + end.side() + " of band " + band.name() + ", " + film(Moves.sideNm(film, end.side()));
        }
        return "band " + band.name() + ", " + length(band.fromMm()) + " to " + length(band.toMm()) + ", " + film(film);
    }
}
