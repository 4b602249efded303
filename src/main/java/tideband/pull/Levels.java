package tideband.pull;

import java.util.List;
import java.util.Locale;

/** Brings the film at the line up to a level and says by which volts. */
final class Levels {
    /** A film this near its aim, in nm, is there: no hold would bring it nearer. */
    private static final double THERE_NM = 0.1;

    /** Volts at the terminals are known to far less than this. */
    private static final double SETTLED_VOLTS = 1e-6;

    private static final double SHORT_NM = 0.3;
    private static final double SHORT_SHARE = 0.003;
    /** A current this near the supply's limit, as a share of it, is held down by it. */
    static final double AT_LIMIT = 0.99;
    /** A setting this near the right volts, in shares of a step, is surely the nearest. */
    private static final double NEAREST = 0.45;
    /** Where film hardly rises with volts, it is taken to rise by this share of the bath's ratio. */
    private static final double LEAST_SLOPE = 0.05;

    private final Outfit outfit;
    private final List<String> notes;
    private final List<Shortfall> shortfalls;

    Levels(Outfit outfit, List<String> notes, List<Shortfall> shortfalls) {
        this.outfit = outfit;
        this.notes = notes;
        this.shortfalls = shortfalls;
    }

    /**
     * Holds until the film at the line is there: at the volts that give it at the end of the hold, or, where those would be lower
     * than the volts that stood before, at these for as long as it takes, so that volts only rise.
     *
     * @param guessVolts where to begin looking
     * @return the volts held, or those that stood before where the film was there already
     */
    double hold(Visit visit, double aimNm, double holdS, double guessVolts) {
        double voltsBefore = outfit.supply().highestVolts(visit.stoodVolts() + SETTLED_VOLTS);
        double startNm = visit.filmNm();
        if (startNm >= aimNm - THERE_NM) {
            return voltsBefore;
        }
        double mostVolts = outfit.mostVolts();
        double volts = solve(visit, aimNm, holdS, guessVolts);
        if (volts < voltsBefore) {
            visit.raiseTo(voltsBefore);
            double untilS = Visit.onTheClock(visit.secondsUntil(aimNm, holdS));
            visit.hold(Math.max(untilS, Visit.CLOCK_S));
            return voltsBefore;
        }
        visit.raiseTo(volts);
        if (volts < mostVolts) {
            visit.hold(holdS);
        } else {
            holdAtMost(visit, aimNm, holdS);
        }
        if (visit.amps() >= AT_LIMIT * outfit.supply().maxAmps()
                && holdS == outfit.settings().holdS()) {
            notes.add(atLimit(visit, holdS));
        }
        return volts;
    }

    private String atLimit(Visit visit, double holdS) {
        return String.format(
                Locale.ROOT,
                "At %.0f mm the supply is still at its %.2f A when the hold of %.0f s ends: seconds count there, not volts. A"
                        + " longer hold would be easier to meet.",
                visit.lineMm(),
                outfit.supply().maxAmps(),
                holdS);
    }

    /** No volts are left to make up for a short hold, so it lasts up to a whole one if need be. */
    private void holdAtMost(Visit visit, double aimNm, double holdS) {
        double wholeS = outfit.settings().holdS();
        Visit before = visit.copy();
        double neededS = Visit.onTheClock(visit.secondsUntil(aimNm, wholeS));
        double lastsS = Math.max(holdS, neededS);
        visit.hold(lastsS);
        double dialNm = outfit.supply().dialVolts() * outfit.bath().nmPerVolt() / 2;
        if (visit.filmNm() < aimNm - Math.max(dialNm, Math.max(SHORT_NM, aimNm * SHORT_SHARE))) {
            shortfalls.add(new HoldShortfall(outfit).explain(aimNm, lastsS, before, visit));
        }
    }

    /**
     * The setting of the dial that brings the film nearest at the end of the hold.
     *
     * <p>Film rises with volts, nearly straight until the current limit takes over and then hardly at all. So the secant method
     * finds the setting in a few tries, and where it would leave what is known to lie on either side, halving does.
     */
    private double solve(Visit visit, double aimNm, double holdS, double guessVolts) {
        double dialVolts = outfit.supply().dialVolts();
        double mostVolts = outfit.mostVolts();
        double lowVolts = 0;
        double lowMissNm = visit.filmNm() - aimNm;
        double highVolts = Double.POSITIVE_INFINITY;
        double highMissNm = Double.POSITIVE_INFINITY;
        double volts = outfit.dialled(guessVolts);
        double nmPerVolt = outfit.bath().nmPerVolt();
        while (highVolts - lowVolts > 1.5 * dialVolts) {
            double missNm = filmAfter(visit, volts, holdS) - aimNm;
            boolean nearest = Math.abs(missNm) <= NEAREST * dialVolts * nmPerVolt;
            if (nearest || (missNm < 0 && volts == mostVolts) || (missNm > 0 && volts == dialVolts)) {
                return volts;
            }
            double otherVolts = missNm < 0 ? lowVolts : highVolts;
            double otherMissNm = missNm < 0 ? lowMissNm : highMissNm;
            if (otherVolts > 0 && otherVolts <= mostVolts) {
                double slope = (missNm - otherMissNm) / (volts - otherVolts);
                nmPerVolt = Math.max(slope, LEAST_SLOPE * outfit.bath().nmPerVolt());
            }
            if (missNm < 0) {
                lowVolts = volts;
                lowMissNm = missNm;
            } else {
                highVolts = volts;
                highMissNm = missNm;
            }
            double next = outfit.dialled(volts - missNm / nmPerVolt);
            volts = next > lowVolts && next < highVolts ? next : between(lowVolts, highVolts);
        }
        return lowVolts > 0 && -lowMissNm < highMissNm ? lowVolts : highVolts;
    }

    private double between(double lowVolts, double highVolts) {
        return outfit.dialled((lowVolts
                        + Math.min(
                                highVolts, outfit.mostVolts() + outfit.supply().dialVolts()))
                / 2);
    }

    private static double filmAfter(Visit visit, double volts, double holdS) {
        Visit ahead = visit.copy();
        ahead.raise(volts);
        ahead.goOn(holdS, volts, ahead.lineMm());
        return ahead.filmNm();
    }
}
