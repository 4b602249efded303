package tideband.window.colour;

import java.util.Locale;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.edit.ColourText;
import tideband.match.FilmColour;
import tideband.match.Match;

/** What the window says of colours and films. */
final class Said {
    static final String NOTHING_WANTED =
            "Type a colour, or pick one below. Every film that comes near it is then listed"
                    + " here and marked on the field.";
    static final String NOTHING_SELECTED =
            "No band is selected, so there is nothing to give this film to. Select a band first, then take the film.";

    private Said() {}

    static String film(double filmNm) {
        return String.format(Locale.ROOT, "%.1f nm", filmNm);
    }

    static String volts(double volts) {
        return String.format(Locale.ROOT, "%.1f V", volts);
    }

    static String difference(double difference) {
        return String.format(Locale.ROOT, "%.1f", difference);
    }

    /** A colour by name and order, as the sheets write it: deep blue (1). */
    static String colour(FilmColour colour) {
        return colour.name().text() + " (" + colour.order() + ")";
    }

    /** The volts between which the colour holds. */
    static String window(Match match) {
        return String.format(Locale.ROOT, "%.1f\u2013%.1f V", match.windowLowVolts(), match.windowHighVolts());
    }

    /** How far apart two colours look. The words are common practice, no source. */
    static String howFar(double difference) {
        if (difference <= 1) {
            return "looks the same";
        }
        if (difference <= 2.5) {
            return "seen side by side";
        }
        if (difference <= 5) {
            return "close, but seen";
        }
        return difference <= 12 ? "another shade" : "another colour";
    }

    /** A match in one sentence, for those who hear it. */
    static String spoken(Match match) {
        return String.format(
                Locale.ROOT,
                "%s, order %d, film %s, %s, window %.1f to %.1f volts, dE00 %s, %s",
                match.colour().name().text(),
                match.order(),
                film(match.filmNm()),
                volts(match.volts()),
                match.windowLowVolts(),
                match.windowHighVolts(),
                difference(match.difference()),
                howFar(match.difference()));
    }

    static String found(Found found) {
        double within = found.matches().within();
        String wanted = found.text().text();
        Match best = found.matches().best();
        if (!found.matches().reached()) {
            return String.format(
                    Locale.ROOT,
                    "No film comes within dE00 %s of %s here. The nearest, %s at %s, is %s off: %s. It is listed all the"
                            + " same, with the next nearest.",
                    plain(within),
                    wanted,
                    best.colour().name().text(),
                    film(best.filmNm()),
                    difference(best.difference()),
                    howFar(best.difference()));
        }
        int count = found.shown().size();
        return String.format(
                Locale.ROOT,
                "%s within dE00 %s of %s. Each is marked on the field.",
                count == 1 ? "1 film comes" : count + " films come",
                plain(within),
                wanted);
    }

    static String faults(Reading.Faulty<ColourText> faulty) {
        StringBuilder all = new StringBuilder("Not a colour yet: ");
        String between = "";
        for (Fault fault : faulty.faults()) {
            all.append(between);
            if (!fault.at().isEmpty()) {
                all.append(fault.at()).append(' ');
            }
            all.append(fault.wrong()).append("; ").append(fault.right());
            between = ". ";
        }
        return all.append('.').toString();
    }

    static String plain(double number) {
        return number == Math.rint(number)
                ? String.format(Locale.ROOT, "%.0f", number)
                : String.format(Locale.ROOT, "%.1f", number);
    }
}
