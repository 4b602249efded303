package tideband.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import tideband.colour.Ciede2000;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Wanted;
import tideband.match.ColourMatch;

/** Finds the film of every band: as drawn, as volts give it on a coupon, or as a colour is matched. */
final class BandFilms {
    private final Design design;
    private final Colours colours;
    private final ColourMatch colourMatch;
    private final double mostNm;
    private final double leastNm;
    private final List<Obstacle> obstacles = new ArrayList<>();

    BandFilms(Design design, Colours colours) {
        this.design = design;
        this.colours = colours;
        this.colourMatch = new ColourMatch(colours.palette(), colours.scale());
        this.mostNm = colours.scale().ceilingNm();
        this.leastNm =
                colours.scale().filmNmAtVolts().applyAsDouble(design.supply().dialVolts());
    }

    /** What stands in the way; empty when every band has its film. */
    List<Obstacle> obstacles() {
        return List.copyOf(obstacles);
    }

    List<DrawnBand> find() {
        List<DrawnBand> drawn = new ArrayList<>();
        for (int i = 0; i < design.bands().size(); i++) {
            drawn.add(find(i));
        }
        return drawn;
    }

    private DrawnBand find(int index) {
        Band band = design.bands().get(index);
        if (band.wanted() instanceof Wanted.Film film) {
            checkReach(index, film, film.aSideNm());
            if (film.bSideNm() != film.aSideNm()) {
                checkReach(index, film, film.bSideNm());
            }
            return new DrawnBand(band, film.aSideNm(), film.bSideNm(), Optional.empty(), 0);
        }
        if (band.wanted() instanceof Wanted.Volts volts) {
            checkReach(index, volts);
            double within = Math.min(volts.volts(), colours.scale().ceilingVolts());
            double filmNm = rounded(colours.scale().filmNmAtVolts().applyAsDouble(within));
            return new DrawnBand(band, filmNm, filmNm, Optional.empty(), 0);
        }
        if (band.wanted() instanceof Wanted.Colour colour) {
            return matched(index, colour);
        }
        return new DrawnBand(band, 0, 0, Optional.empty(), 0);
    }

    private DrawnBand matched(int index, Wanted.Colour wanted) {
        Band band = design.bands().get(index);
        double ofAllNm =
                colourMatch.nearestFilmNm(wanted.lab(), OptionalInt.empty()).orElseThrow();
        OptionalDouble asAskedNm = colourMatch.nearestFilmNm(wanted.lab(), wanted.order());
        if (asAskedNm.isEmpty()) {
            int order = colours.palette().orderAt(ofAllNm);
            stop(
                    index,
                    text(
                            "no film of order %d comes near %s within %.1f nm, all that bath and supply give",
                            wanted.order().orElseThrow(), wanted.text(), mostNm),
                    text(
                            "draw it in order %d, which has the nearest film (%.1f nm), or leave the order out",
                            order, ofAllNm),
                    Optional.of(new Mends(design).inOrder(index, wanted, order)));
        }
        double filmNm = Math.max(leastNm, rounded(asAskedNm.orElse(ofAllNm)));
        double difference = Ciede2000.between(wanted.lab(), colours.palette().labAt(filmNm));
        return new DrawnBand(band, filmNm, filmNm, Optional.of(wanted.lab()), difference);
    }

    private void checkReach(int band, Wanted.Volts wanted) {
        double mostVolts = colours.scale().ceilingVolts();
        double leastVolts = design.supply().dialVolts();
        if (wanted.volts() > mostVolts) {
            stop(
                    band,
                    text("%.1f V is more than bath and supply allow (%.1f V)", wanted.volts(), mostVolts),
                    text("draw it at %.1f V or less", mostVolts),
                    Optional.of(new Mends(design).atVolts(band, mostVolts)).filter(mend -> mostVolts >= leastVolts));
        } else if (wanted.volts() < leastVolts) {
            stop(
                    band,
                    text("%.3f V is less than one step of the supply's dial (%.3f V)", wanted.volts(), leastVolts),
                    text("draw it at %.3f V or more, or bare", leastVolts),
                    Optional.of(new Mends(design).atVolts(band, leastVolts)).filter(mend -> leastVolts <= mostVolts));
        }
    }

    private void checkReach(int band, Wanted.Film film, double filmNm) {
        double floorNm = Math.floor(mostNm * 10) / 10;
        double ceilNm = Math.ceil(leastNm * 10) / 10;
        if (filmNm > mostNm) {
            stop(
                    band,
                    tooThick(filmNm),
                    text("draw it at %.1f nm or less, or %s", floorNm, otherCure(filmNm)),
                    floorNm >= leastNm ? Optional.of(new Mends(design).thinner(band, floorNm)) : Optional.empty());
        } else if (filmNm < leastNm) {
            stop(
                    band,
                    text(
                            "a film of %.1f nm is too thin: the metal has %.1f nm from the beginning, and the thinnest this"
                                    + " supply can add to it makes %.1f nm",
                            filmNm, design.bath().nativeNm(), leastNm),
                    text("draw it at %.1f nm or more, or bare", ceilNm),
                    ceilNm <= mostNm ? Optional.of(new Mends(design).thicker(band, film, ceilNm)) : Optional.empty());
        }
    }

    private void stop(int band, String reason, String change, Optional<Mend> mend) {
        obstacles.add(new Obstacle(where(design.bands().get(band)), reason, change, OptionalInt.of(band), mend));
    }

    private String tooThick(double filmNm) {
        double voltsNeeded = colours.scale().volts(filmNm);
        if (Double.isInfinite(voltsNeeded)) {
            return text(
                    "%.1f nm is out of reach at the supply's %.3f A",
                    filmNm, design.supply().maxAmps());
        }
        String limit = supplyLimits()
                ? text("the supply gives %.1f V", design.supply().maxVolts())
                : text("the bath's ceiling is %.1f V", design.bath().ceilingVolts());
        return text("%.1f nm needs about %.1f V, and %s", filmNm, voltsNeeded, limit);
    }

    private String otherCure(double filmNm) {
        double voltsNeeded = colours.scale().volts(filmNm);
        if (Double.isInfinite(voltsNeeded)) {
            return "hold longer, or use a supply of more amps";
        }
        return supplyLimits() && voltsNeeded <= design.bath().ceilingVolts()
                ? text("use a supply of at least %.0f V", Math.ceil(voltsNeeded))
                : "choose a bath with a higher ceiling or more film a volt";
    }

    private boolean supplyLimits() {
        return design.supply().maxVolts() < design.bath().ceilingVolts();
    }

    static String where(Band band) {
        return "band \"" + band.name() + "\"";
    }

    private static double rounded(double filmNm) {
        return Math.rint(filmNm * 100) / 100;
    }

    private static String text(String form, Object... values) {
        return String.format(Locale.ROOT, form, values);
    }
}
