package tideband.bench;

import java.util.EnumSet;
import java.util.List;
import java.util.OptionalInt;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Holding;
import tideband.design.PullSettings;
import tideband.design.Wanted;
import tideband.piece.End;

/** Takes a refusal at its word: the design with the first of the changes each obstacle names. */
final class Advice {
    private static final Pattern AT_MOST_NM = Pattern.compile("draw it at ([0-9.]+) nm or less");
    private static final Pattern AT_LEAST_NM = Pattern.compile("draw it at ([0-9.]+) nm or more");
    private static final Pattern AT_MOST_VOLTS = Pattern.compile("draw it at ([0-9.]+) V or less");
    private static final Pattern AT_LEAST_VOLTS = Pattern.compile("draw it at ([0-9.]+) V or more");
    private static final Pattern IN_ORDER = Pattern.compile("draw it in order ([0-9]+)");
    private static final Pattern HOLD = Pattern.compile("hold for about ([0-9.]+) s");
    private static final Pattern ALSO_DOWN = Pattern.compile("let end ([AB]) go down too");
    private static final Pattern DRY = Pattern.compile("shorten the dry length to ([0-9.]+) mm");

    private Advice() {}

    static Design taken(Design design, List<Obstacle> obstacles) {
        Design changed = design;
        for (Obstacle obstacle : obstacles) {
            changed = taken(changed, obstacle);
        }
        return changed;
    }

    private static Design taken(Design design, Obstacle obstacle) {
        String first = obstacle.change().split(", or ", 2)[0];
        if (first.contains("draw it")) {
            return with(
                    design,
                    design.bands().stream()
                            .map(band -> obstacle.where().equals("band \"" + band.name() + "\"")
                                    ? new Band(
                                            band.name(), band.fromMm(), band.toMm(), redrawn(band, first), band.edge())
                                    : band)
                            .toList(),
                    design.holding(),
                    design.pull());
        }
        if (HOLD.matcher(first).find()) {
            PullSettings pull = design.pull();
            double holdS = Math.max(pull.holdS(), number(HOLD, first));
            return with(
                    design,
                    design.bands(),
                    design.holding(),
                    new PullSettings(holdS, pull.fade(), pull.stepDe00(), pull.slowestMmPerS(), pull.fastestMmPerS()));
        }
        Set<End> ends = EnumSet.copyOf(design.holding().endsDown());
        Matcher also = ALSO_DOWN.matcher(first);
        if (also.find()) {
            ends.add(End.valueOf(also.group(1)));
        }
        double dryMm = DRY.matcher(first).find()
                ? Math.min(design.holding().dryMm(), number(DRY, first))
                : design.holding().dryMm();
        return with(design, design.bands(), new Holding(ends, dryMm), design.pull());
    }

    private static Wanted redrawn(Band band, String change) {
        if (AT_MOST_VOLTS.matcher(change).find()) {
            return new Wanted.Volts(number(AT_MOST_VOLTS, change));
        }
        if (AT_LEAST_VOLTS.matcher(change).find()) {
            return new Wanted.Volts(number(AT_LEAST_VOLTS, change));
        }
        if (band.wanted() instanceof Wanted.Colour colour
                && IN_ORDER.matcher(change).find()) {
            return new Wanted.Colour(colour.text(), colour.lab(), OptionalInt.of((int) number(IN_ORDER, change)));
        }
        boolean less = AT_MOST_NM.matcher(change).find();
        double nm = number(less ? AT_MOST_NM : AT_LEAST_NM, change);
        if (band.wanted() instanceof Wanted.Film film) {
            return less
                    ? new Wanted.Film(Math.min(nm, film.aSideNm()), Math.min(nm, film.bSideNm()))
                    : new Wanted.Film(Math.max(nm, film.aSideNm()), Math.max(nm, film.bSideNm()));
        }
        return new Wanted.Film(nm, nm);
    }

    private static double number(Pattern pattern, String text) {
        Matcher matcher = pattern.matcher(text);
        if (!matcher.find()) {
            throw new IllegalArgumentException("no change this test knows: " + text);
        }
        return Double.parseDouble(matcher.group(1));
    }

    static Design with(Design d, List<Band> bands, Holding holding, PullSettings pull) {
        return new Design(
                d.title(),
                d.metal(),
                d.finish(),
                d.light(),
                d.observer(),
                d.piece(),
                holding,
                bands,
                d.bath(),
                d.supply(),
                d.vessel(),
                d.bench(),
                d.order(),
                pull);
    }
}
