package tideband.pull;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * A fade at constant volts: just high enough that the film still keeps up with the slowest hand at the inner edge, and a
 * current limit low enough that it does not outrun the hand before. The hand follows the film.
 */
final class FixedVoltsFade {
    /** Leaves room for a clock that shows tenths. */
    private static final double CLOCK_MARGIN = 0.9;

    private static final double EASY_MM_PER_S = 1;
    /** How far the hand stays above its slowest speed, where speeds are reckoned and not followed. */
    private static final double MARGIN = 1.1;

    private static final double LESS_CURRENT = 0.7;
    private static final double LONGEST_MARK_S = 3600;
    private static final double MILLIVOLTS = 1000;

    private final Outfit outfit;
    private final FadeNotes says;
    private final List<String> notes;

    FixedVoltsFade(Outfit outfit, List<String> notes) {
        this.outfit = outfit;
        this.says = new FadeNotes(outfit);
        this.notes = notes;
    }

    /**
     * A mark passed.
     *
     * @param atS when, in s after the beginning of the fade
     * @param lineMm where the line is, in mm from the end that is down
     * @param terminalVolts what the supply's meter shows
     */
    private record Mark(double atS, double lineMm, double terminalVolts) {}

    /**
     * Pulls the leg.
     *
     * @return the volts set; empty, with a note, where no setting of the supply would keep the hand within its speeds
     */
    OptionalDouble pull(Visit visit, Leg leg) {
        double nmPerTravelMm = leg.riseNm() / visit.travelMm(leg.outerMm(), leg.innerMm());
        double slowest = outfit.settings().slowestMmPerS();
        double fastest = outfit.settings().fastestMmPerS();
        double endVolts = visit.voltsForGrowth(leg.innerNm(), MARGIN * slowest * nmPerTravelMm, leg.innerMm());
        double setVolts = outfit.supply().dialledUp(endVolts);
        if (setVolts > outfit.mostVolts()) {
            notes.add(says.tooSteep(visit, leg, endVolts));
            return OptionalDouble.empty();
        }
        double startMmPerS = Math.max(MARGIN * slowest, Math.min(EASY_MM_PER_S, fastest / 4));
        while (true) {
            double limitAmps = settable(visit.ampsForGrowth(leg.outerNm(), startMmPerS * nmPerTravelMm, leg.outerMm()));
            boolean last = startMmPerS == MARGIN * slowest;
            if (limitAmps <= outfit.safeAmps()) {
                List<Mark> path = follow(visit, leg, setVolts, limitAmps);
                double[] speeds = speedsMmPerS(visit, path);
                if (speeds[0] >= slowest && speeds[1] <= CLOCK_MARGIN * fastest) {
                    carryOut(visit, path);
                    notes.add(says.setting(leg, setVolts, limitAmps));
                    return OptionalDouble.of(setVolts);
                }
                if (last) {
                    notes.add(says.uneven(leg, speeds[0], speeds[1]));
                    return OptionalDouble.empty();
                }
            } else if (last) {
                notes.add(says.tooMuchCurrent(leg, limitAmps));
                return OptionalDouble.empty();
            }
            startMmPerS = Math.max(MARGIN * slowest, startMmPerS * LESS_CURRENT);
        }
    }

    /** A current limit as it can be set: whole milliamperes, at least one. */
    private static double settable(double amps) {
        return Math.max(1, Math.rint(amps * 1e3)) / 1e3;
    }

    private static void carryOut(Visit visit, List<Mark> path) {
        visit.raiseTo(path.get(0).terminalVolts());
        double startS = visit.timeS();
        for (Mark mark : path.subList(1, path.size())) {
            visit.mark(Row.Act.FOLLOW);
            double untilS = Visit.onTheClock(startS + mark.atS());
            visit.goOn(Math.max(Visit.CLOCK_S, untilS - visit.timeS()), mark.terminalVolts(), mark.lineMm());
        }
    }

    /** What the meter shows, to a millivolt, so that set volts are exactly that. */
    private static double shown(double terminalVolts) {
        return Math.rint(terminalVolts * MILLIVOLTS) / MILLIVOLTS;
    }

    /** Time and terminal volts at each mark, the line moving so that each place leaves with its film. */
    private static List<Mark> follow(Visit visit, Leg leg, double setVolts, double limitAmps) {
        Visit ahead = visit.copyWithLimit(limitAmps);
        ahead.settle(setVolts);
        List<Mark> path = new ArrayList<>();
        path.add(new Mark(0, leg.outerMm(), shown(ahead.terminalVolts())));
        double startS = ahead.timeS();
        int marks = leg.marks();
        for (int mark = 1; mark <= marks; mark++) {
            double share = (double) mark / marks;
            ahead.settle(setVolts);
            double stepS = ahead.secondsUntil(leg.filmNm(share), LONGEST_MARK_S);
            ahead.goOn(stepS, setVolts, leg.lineMm(share));
            path.add(new Mark(ahead.timeS() - startS, leg.lineMm(share), shown(ahead.terminalVolts())));
        }
        return path;
    }

    /** The slowest and the fastest the hand would move between marks. */
    private static double[] speedsMmPerS(Visit visit, List<Mark> path) {
        double slowest = Double.POSITIVE_INFINITY;
        double fastest = 0;
        for (int i = 1; i < path.size(); i++) {
            double travelMm =
                    visit.travelMm(path.get(i - 1).lineMm(), path.get(i).lineMm());
            double speed = travelMm / (path.get(i).atS() - path.get(i - 1).atS());
            slowest = Math.min(slowest, speed);
            fastest = Math.max(fastest, speed);
        }
        return new double[] {slowest, fastest};
    }
}
