package tideband.bench;

import java.util.List;
import tideband.design.Design;
import tideband.plan.Plan;
import tideband.pull.Pull;
import tideband.trial.Trial;

/**
 * Everything the bench needs: the plan, its pulls, what will come of it, and what to beware of.
 *
 * @param design what was drawn
 * @param bands the bands from end A to end B
 * @param plan immersions, masks and cost
 * @param pulls one pull an immersion, in order
 * @param trial the plan carried out on paper
 * @param cautions the cautions that apply
 */
public record BenchPlan(
        Design design, List<BenchBand> bands, Plan plan, List<Pull> pulls, Trial trial, List<Caution> cautions) {

    /** Copies the lists, so that the value cannot change. */
    public BenchPlan {
        bands = List.copyOf(bands);
        pulls = List.copyOf(pulls);
        cautions = List.copyOf(cautions);
    }
}
