package tideband.window.order;

import tideband.bench.BenchPlan;
import tideband.plan.Plan;
import tideband.sheet.Figures;

/** What is said of a plan: its minutes, how sure it is that none costs less, and what the other order would save. */
final class Verdict {
    private static final double PERCENT = 100;

    private Verdict() {}

    static String of(BenchPlan bench) {
        Plan plan = bench.plan();
        double costMin = plan.cost().minutes();
        String minutes = BenchFigures.minutes(costMin);
        if (plan.immersions().isEmpty()) {
            return minutes + " \u00b7 nothing to do: every band is bare";
        }
        if (plan.proven()) {
            return minutes + " \u00b7 proven: no plan under "
                    + bench.design().order().key() + " costs less";
        }
        double gapMin = costMin - plan.lowerBoundMin();
        return minutes + " \u00b7 not proven: gap " + BenchFigures.minutes(gapMin) + " ("
                + Figures.plain(PERCENT * gapMin / costMin, 0) + " %)";
    }

    static String saving(Plan plan) {
        if (plan.savedByOtherOrderMin().isEmpty()) {
            return "";
        }
        double savedMin = plan.savedByOtherOrderMin().getAsDouble();
        return savedMin > 0
                ? "least-minutes would save " + BenchFigures.minutes(savedMin)
                : "least-minutes would save nothing";
    }
}
