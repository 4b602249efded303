package tideband.pull;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Finds the films to make for, so that every band ends at its own after what it gains later: the secant method, each side
 * of each band for itself.
 *
 * <p>The film a side ends with rises with the film it was left with when finished, by less than one to one, since a thinner film
 * gains more. A level is looked at from the film it was left with, not from the one aimed at: what the dial could not give is no
 * fault of the aim. A fade passes many settings of the dial, so what its pull misses by is taken off its aim too.
 */
final class Corrections {
    private static final double LEAST_SLOPE = 0.25;
    /** Films nearer than this, in nm, say nothing of the slope. */
    private static final double LEAST_MOVE_NM = 0.1;

    private final List<Target> targets;
    private final double leastNm;
    private final double[][] lastFinishedNm;
    private final double[][] lastEndNm;
    private final double[][] slope;

    /**
     * Corrections yet to begin.
     *
     * @param targets the bands from end A to end B, as drawn
     * @param leastNm no film is aimed below this
     */
    Corrections(List<Target> targets, double leastNm) {
        this.targets = targets;
        this.leastNm = leastNm;
        this.lastFinishedNm = new double[targets.size()][];
        this.lastEndNm = new double[targets.size()][];
        this.slope = new double[targets.size()][2];
        Arrays.stream(slope).forEach(sides -> Arrays.fill(sides, 1));
    }

    /** The aims for the round after this one. */
    List<Target> after(Round round) {
        List<Target> corrected = new ArrayList<>();
        for (int band = 0; band < targets.size(); band++) {
            Target target = targets.get(band);
            corrected.add(
                    target.bare()
                            ? target
                            : corrected(round, band, target, round.aims().get(band)));
        }
        return corrected;
    }

    private Target corrected(Round round, int band, Target target, Target aim) {
        double[] finishedNm = round.finishedNm(band);
        double[] endNm = round.endNm(band);
        if (lastEndNm[band] != null) {
            for (int side = 0; side < 2; side++) {
                double movedNm = finishedNm[side] - lastFinishedNm[band][side];
                if (Math.abs(movedNm) > LEAST_MOVE_NM) {
                    double seen = (endNm[side] - lastEndNm[band][side]) / movedNm;
                    slope[band][side] = Math.max(LEAST_SLOPE, Math.min(1, seen));
                }
            }
        }
        lastFinishedNm[band] = finishedNm;
        lastEndNm[band] = endNm;
        double fromA = target.fade() ? aim.aSideNm() : finishedNm[0];
        double fromB = target.fade() ? aim.bSideNm() : finishedNm[1];
        return target.withFilms(
                Math.max(leastNm, fromA - (endNm[0] - target.aSideNm()) / slope[band][0]),
                Math.max(leastNm, fromB - (endNm[1] - target.bSideNm()) / slope[band][1]));
    }
}
