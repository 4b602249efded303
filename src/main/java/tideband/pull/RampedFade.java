package tideband.pull;

import java.util.List;
import java.util.OptionalDouble;

/** A fade at an even hand speed: the law solved for volts at each mark, and straight between marks. */
final class RampedFade {
    /** Marks closer in time than this could not be followed. */
    private static final double SHORTEST_MARK_S = 2;

    /** Leaves room for a clock that shows tenths. */
    private static final double CLOCK_MARGIN = 0.97;

    /** How fast the film at the line grows where nothing forbids it: an easy rate to follow by hand. */
    private static final double EASY_GROWTH_NM_PER_S = 1;

    private static final double SLOWER = 0.8;

    private final Outfit outfit;
    private final FadeNotes says;
    private final List<String> notes;

    RampedFade(Outfit outfit, List<String> notes) {
        this.outfit = outfit;
        this.says = new FadeNotes(outfit);
        this.notes = notes;
    }

    /**
     * Pulls the leg.
     *
     * @return the volts at its inner edge; empty, with a note, where no hand speed would do
     */
    OptionalDouble pull(Visit visit, Leg leg) {
        double travelMm = visit.travelMm(leg.outerMm(), leg.innerMm());
        OptionalDouble speed = handSpeedMmPerS(visit, leg, travelMm);
        if (speed.isEmpty()) {
            return OptionalDouble.empty();
        }
        double handMmPerS = speed.getAsDouble();
        double growth = leg.riseNm() / travelMm * handMmPerS;
        visit.raiseTo(outfit.dialled(visit.voltsForGrowth(leg.outerNm(), growth, leg.outerMm())));
        double startS = visit.timeS();
        int marks = marks(leg, travelMm / handMmPerS);
        for (int mark = 1; mark <= marks; mark++) {
            double lineMm = leg.lineMm((double) mark / marks);
            double aimNm = leg.filmNm((double) mark / marks);
            double untilS = Visit.onTheClock(startS + visit.travelMm(leg.outerMm(), lineMm) / handMmPerS);
            double lastsS = Math.max(Visit.CLOCK_S, untilS - visit.timeS());
            double volts = outfit.dialled(visit.voltsForGrowth(aimNm, growth, lineMm));
            visit.mark(Row.Act.FADE);
            visit.goOn(lastsS, outfit.dialled(Math.min(volts, visit.volts() + raiseVolts(lastsS))), lineMm);
        }
        return OptionalDouble.of(visit.volts());
    }

    private static int marks(Leg leg, double lastsS) {
        return (int) Math.max(1, Math.min(leg.marks(), lastsS / SHORTEST_MARK_S));
    }

    /** The most the supply can raise its volts in a time, in whole settings of its dial. */
    private double raiseVolts(double lastsS) {
        return outfit.supply().highestVolts(lastsS * outfit.supply().slewVoltsPerS());
    }

    /**
     * The slower of an easy growth and the fastest hand, within what volts, amps and slew allow; empty, with a note that says
     * why and what would help, where even the slowest hand is too fast.
     */
    private OptionalDouble handSpeedMmPerS(Visit visit, Leg leg, double travelMm) {
        double slowest = outfit.settings().slowestMmPerS();
        double nmPerTravelMm = leg.riseNm() / travelMm;
        double speed = Math.min(CLOCK_MARGIN * outfit.settings().fastestMmPerS(), EASY_GROWTH_NM_PER_S / nmPerTravelMm);
        speed = Math.max(speed, slowest);
        while (true) {
            double growth = speed * nmPerTravelMm;
            double startVolts = visit.voltsForGrowth(leg.outerNm(), growth, leg.outerMm());
            double endVolts = visit.voltsForGrowth(leg.innerNm(), growth, leg.innerMm());
            double startAmps = visit.ampsForGrowth(leg.outerNm(), growth, leg.outerMm());
            boolean voltsFit = endVolts <= outfit.mostVolts();
            boolean ampsFit = startAmps <= outfit.safeAmps();
            int marks = marks(leg, travelMm / speed);
            boolean slewFits = (endVolts - startVolts) / marks <= raiseVolts(travelMm / speed / marks);
            if (voltsFit && ampsFit && slewFits) {
                return OptionalDouble.of(speed);
            }
            if (speed == slowest) {
                notes.add(
                        !ampsFit
                                ? says.tooMuchCurrent(leg, startAmps)
                                : !voltsFit
                                        ? says.tooSteep(visit, leg, endVolts)
                                        : says.tooQuickForSupply(leg, (endVolts - startVolts) / (travelMm / speed)));
                return OptionalDouble.empty();
            }
            speed = Math.max(slowest, speed * SLOWER);
        }
    }
}
