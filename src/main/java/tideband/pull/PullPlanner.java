package tideband.pull;

import java.util.List;
import tideband.plan.Immersion;

/**
 * Turns immersions into pulls: depth, volts and seconds.
 *
 * <p>Within an immersion the legs are gone through from the shallowest to the deepest: the line is put to a leg's outer
 * edge with the supply off, volts are raised and held until the film at the line is there, then the piece is drawn out
 * to the next leg, or through a fade. Volts come from the growth law with the area still wet at that depth.
 *
 * <p>A finished band that is wet again near its own volts gains a little. So the whole plan is gone through several
 * times: each time every band's aim is lowered by what it gained after it was finished, for as long as all bands together
 * come nearer to their films.
 */
public final class PullPlanner {
    private static final int ROUNDS = 4;
    private static final double GOOD_ENOUGH_NM = 0.05;

    private final Outfit outfit;
    private final List<Target> targets;
    private final List<Immersion> immersions;

    /**
     * A planner for one plan.
     *
     * @param outfit what the pulls are made with
     * @param targets the bands from end A to end B
     * @param immersions the immersions in order; between them they finish every band that is not bare
     */
    public PullPlanner(Outfit outfit, List<Target> targets, List<Immersion> immersions) {
        for (int band = 0; band < targets.size(); band++) {
            int wanted = band;
            if (!targets.get(band).bare()
                    && immersions.stream()
                            .noneMatch(immersion -> immersion.finishes().contains(wanted))) {
                throw new IllegalArgumentException("immersions must finish every band that is not bare, but band "
                        + band + " of " + targets.get(band) + " is finished by none");
            }
        }
        this.outfit = outfit;
        this.targets = List.copyOf(targets);
        this.immersions = List.copyOf(immersions);
    }

    /**
     * Plans the pulls.
     *
     * @return the pulls, or what cannot be met
     */
    public PullOutcome plan() {
        Round best = new Round(outfit, targets, immersions, targets, firstGuess());
        if (!best.shortfalls().isEmpty()) {
            return new PullOutcome.OutOfReach(best.shortfalls());
        }
        Corrections corrections = new Corrections(targets, outfit.bath().nativeNm());
        for (int count = 2; count <= ROUNDS; count++) {
            List<Target> aims = corrections.after(best);
            if (farthestNm(best.aims(), aims) < GOOD_ENOUGH_NM) {
                break;
            }
            Round next = new Round(outfit, targets, immersions, aims, best.volts());
            if (!next.shortfalls().isEmpty() || next.missSquared() >= best.missSquared()) {
                break;
            }
            best = next;
        }
        return new PullOutcome.Pulled(best.pulls(), best.bandVolts());
    }

    private double[][] firstGuess() {
        double[][] volts = new double[targets.size()][];
        for (int band = 0; band < targets.size(); band++) {
            Target target = targets.get(band);
            volts[band] = new double[] {
                target.aSideNm() / outfit.bath().nmPerVolt(),
                target.bSideNm() / outfit.bath().nmPerVolt()
            };
        }
        return volts;
    }

    private static double farthestNm(List<Target> some, List<Target> others) {
        double most = 0;
        for (int band = 0; band < some.size(); band++) {
            most = Math.max(
                    most, Math.abs(some.get(band).aSideNm() - others.get(band).aSideNm()));
            most = Math.max(
                    most, Math.abs(some.get(band).bSideNm() - others.get(band).bSideNm()));
        }
        return most;
    }
}
