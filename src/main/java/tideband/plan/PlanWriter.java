package tideband.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import tideband.design.BenchTimes;

/** Writes a draft out as a plan: runs, peaks, the itemised cost and the reasons. */
final class PlanWriter {

    private final Problem problem;
    private final Needs needs;
    private final Tariff tariff;

    PlanWriter(Problem problem, Needs needs, Tariff tariff) {
        this.problem = problem;
        this.needs = needs;
        this.tariff = tariff;
    }

    /**
     * Writes.
     *
     * @param draft the plan in short
     * @param bound no plan has a lower price
     * @param savedMin what least-minutes would save, where known
     */
    Plan write(Draft draft, long bound, OptionalDouble savedMin) {
        Reasons reasons = new Reasons(problem, needs, tariff, draft);
        List<Immersion> immersions = new ArrayList<>();
        long before = 0;
        for (int i = 0; i < draft.visits().size(); i++) {
            Visit visit = draft.visits().get(i);
            List<Integer> finishes = Masks.list(draft.newly().get(i));
            immersions.add(new Immersion(
                    visit.endDown(),
                    Masks.runList(visit.masked() & ~before),
                    Masks.runList(before & ~visit.masked()),
                    Masks.list(visit.masked()),
                    finishes,
                    finishes.stream().mapToDouble(needs::peakNm).max().orElseThrow(),
                    reasons.of(i)));
            before = visit.masked();
        }
        Cost cost = cost(draft);
        boolean proven = tariff.minutes(bound) >= tariff.minutes(draft.price());
        double lowerBoundMin = proven ? cost.minutes() : Math.min(tariff.minutes(bound), cost.minutes());
        return new Plan(immersions, Masks.runList(before), cost, lowerBoundMin, proven, savedMin);
    }

    Cost cost(Draft draft) {
        int first = 0;
        int over = 0;
        int stripped = 0;
        int turns = 0;
        double lengthMm = 0;
        Visit last = new Visit(0, 0);
        for (int i = 0; i < draft.visits().size(); i++) {
            Visit visit = draft.visits().get(i);
            long put = visit.masked() & ~last.masked();
            first += i == 0 ? Masks.runs(put) : 0;
            over += i == 0 ? 0 : Masks.runs(put);
            stripped += Masks.runs(last.masked() & ~visit.masked());
            turns += i > 0 && visit.end() != last.end() ? 1 : 0;
            for (int band : Masks.list(put)) {
                lengthMm += problem.stretches().get(band).lengthMm();
            }
            last = visit;
        }
        stripped += Masks.runs(last.masked());
        BenchTimes times = problem.times();
        double minutes = draft.visits().size() * times.immersionMin()
                + first * times.maskMin()
                + over * times.maskOverMin()
                + stripped * times.stripMin()
                + turns * times.turnMin();
        return new Cost(draft.visits().size(), first, over, stripped, turns, lengthMm, minutes);
    }
}
