package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import tideband.design.BenchTimes;
import tideband.design.Order;

/** Checks a plan from scratch against its problem: masks, films finished, order, cost. */
final class PlanCheck {

    private PlanCheck() {}

    static void check(Problem problem, Plan plan) {
        BenchTimes times = problem.times();
        TreeSet<Integer> on = new TreeSet<>();
        TreeSet<Integer> open = new TreeSet<>();
        for (int i = 0; i < problem.stretches().size(); i++) {
            if (!problem.stretches().get(i).bare()) {
                open.add(i);
            }
        }
        double minutes = 0;
        double lengthMm = 0;
        double peakNm = Double.POSITIVE_INFINITY;
        Immersion last = null;
        for (Immersion now : plan.immersions()) {
            assertThat(problem.endsDown()).contains(now.endDown());
            List<Integer> off = bands(now.strippedBefore());
            List<Integer> put = bands(now.maskedBefore());
            assertThat(on).containsAll(off);
            assertThat(put).noneMatch(on::contains);
            off.forEach(on::remove);
            on.addAll(put);
            assertThat(now.masked()).containsExactlyElementsOf(on);
            apart(now.strippedBefore());
            apart(now.maskedBefore());

            List<Integer> newly = finishes(problem, on, now);
            newly.retainAll(open);
            assertThat(now.finishes()).isNotEmpty().containsExactlyElementsOf(newly);
            newly.forEach(open::remove);
            double highest = newly.stream()
                    .mapToDouble(b -> Math.max(
                            problem.stretches().get(b).aSideNm(),
                            problem.stretches().get(b).bSideNm()))
                    .max()
                    .orElseThrow();
            assertThat(now.peakNm()).isEqualTo(highest);
            if (problem.order() == Order.THICKER_FIRST) {
                assertThat(highest).isLessThanOrEqualTo(peakNm);
            }
            peakNm = highest;
            minutes += times.immersionMin()
                    + now.maskedBefore().size() * (last == null ? times.maskMin() : times.maskOverMin())
                    + now.strippedBefore().size() * times.stripMin()
                    + (last != null && last.endDown() != now.endDown() ? times.turnMin() : 0);
            lengthMm += put.stream()
                    .mapToDouble(b -> problem.stretches().get(b).lengthMm())
                    .sum();
            last = now;
        }
        assertThat(open).isEmpty();
        assertThat(bands(plan.strippedAtEnd())).containsExactlyElementsOf(on);
        apart(plan.strippedAtEnd());
        minutes += plan.strippedAtEnd().size() * times.stripMin();
        assertThat(plan.cost().minutes()).isCloseTo(minutes, within(1e-6));
        assertThat(plan.cost().maskedLengthMm()).isCloseTo(lengthMm, within(1e-6));
        assertThat(plan.lowerBoundMin()).isLessThanOrEqualTo(plan.cost().minutes());
        assertThat(plan.proven()).isEqualTo(plan.lowerBoundMin() == plan.cost().minutes());
    }

    private static List<Integer> finishes(Problem problem, Set<Integer> masked, Immersion now) {
        List<Integer> finished = new ArrayList<>();
        boolean[] done = Walk.finishes(problem, masked::contains, now.endDown());
        for (int i = 0; i < done.length; i++) {
            if (done[i]) {
                finished.add(i);
            }
        }
        return finished;
    }

    private static List<Integer> bands(List<Run> runs) {
        List<Integer> bands = new ArrayList<>();
        for (Run run : runs) {
            for (int b = run.first(); b <= run.last(); b++) {
                bands.add(b);
            }
        }
        return bands;
    }

    /** Runs must be maximal: a bare place between each and the next. */
    private static void apart(List<Run> runs) {
        for (int i = 1; i < runs.size(); i++) {
            assertThat(runs.get(i).first()).isGreaterThan(runs.get(i - 1).last() + 1);
        }
    }
}
