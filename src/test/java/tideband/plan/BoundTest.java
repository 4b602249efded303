package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

/** The bound keeps its promise, and the sweep equals trying every pair of masks. */
class BoundTest {

    /** Property: along a least plan, the bound never asks for more than is still paid. */
    @Test
    void neverAbovePriceStillPaid() {
        Random random = new Random(31);
        for (int i = 0; i < 400; i++) {
            Problem problem = Drawings.small(random, 4 + random.nextInt(3));
            if (!(Planner.plan(problem) instanceof Outcome.Planned planned)
                    || planned.plan().immersions().isEmpty()) {
                continue;
            }
            Needs needs = new Needs(problem);
            Tariff tariff = Tariff.of(problem.times(), needs.bands());
            List<Visit> visits = visits(planned.plan());
            Draft draft = Draft.of(visits, needs, problem.order(), tariff, new long[needs.bands()])
                    .orElseThrow();
            for (Bound bound : List.of(
                    Bound.ofSelections(needs, tariff, 3),
                    Bound.ofSelections(needs, tariff, 4),
                    Bound.ofRows(needs, tariff, 3),
                    Bound.ofRows(needs, tariff, 4))) {
                assertThat(bound.start()).isLessThanOrEqualTo(draft.price());
                long paid = 0;
                long finished = 0;
                for (int v = 0; v < visits.size(); v++) {
                    Visit now = visits.get(v);
                    paid += tariff.immersion();
                    paid += v == 0
                            ? tariff.maskFirst() * Masks.runs(now.masked())
                            : tariff.change(visits.get(v - 1).masked(), now.masked())
                                    + (visits.get(v - 1).end() == now.end() ? 0 : tariff.turn());
                    finished |= needs.finished(now.masked(), now.end());
                    long left = draft.price() - paid;
                    assertThat(bound.least(finished, now.end(), now.masked())).isLessThanOrEqualTo(left);
                    assertThat(bound.least(finished)).isLessThanOrEqualTo(left);
                }
            }
        }
    }

    /** Property: steered by bounds from few bands, the exact search still finds the least plan. */
    @Test
    void steeredSearchFindsTheSamePlan() {
        Random random = new Random(32);
        for (int i = 0; i < 300; i++) {
            Problem problem = Drawings.small(random, 6);
            if (!(Planner.plan(problem) instanceof Outcome.Planned planned)
                    || planned.plan().immersions().isEmpty()) {
                continue;
            }
            Needs needs = new Needs(problem);
            Tariff tariff = Tariff.of(problem.times(), needs.bands());
            long[] lengthSteps = problem.stretches().stream()
                    .mapToLong(s -> Math.round(s.lengthMm() / Draft.LENGTH_STEP_MM))
                    .toArray();
            Draft least = Draft.of(visits(planned.plan()), needs, problem.order(), tariff, lengthSteps)
                    .orElseThrow();
            for (Bound bound : List.of(Bound.ofSelections(needs, tariff, 3), Bound.ofRows(needs, tariff, 3))) {
                ExactSearch search =
                        new ExactSearch(needs, tariff, problem.order(), bound, Long.MAX_VALUE, () -> false);
                assertThat(new TieBreak(search, tariff, search.layers(least.price()), lengthSteps).visits())
                        .isEqualTo(least.visits());
            }
        }
    }

    /** Property: the sweep equals the minimum over all pairs of masks. */
    @Test
    void sweepEqualsEveryPair() {
        Random random = new Random(33);
        for (int bands = 1; bands <= 7; bands++) {
            for (int i = 0; i < 30; i++) {
                int masks = 1 << bands;
                long put = random.nextInt(9);
                long strip = random.nextInt(4);
                long[] in = new long[masks];
                Arrays.setAll(in, mask -> random.nextInt(3) == 0 ? random.nextInt(40) : Tariff.NEVER);
                in[random.nextInt(masks)] = 5;
                long[] out = new long[masks];
                new MaskSweep(bands, false).cheapest(in, out, put, strip);
                for (int to = 0; to < masks; to++) {
                    long least = Long.MAX_VALUE;
                    for (int from = 0; from < masks; from++) {
                        least = Math.min(
                                least, in[from] + put * Masks.runs(to & ~from) + strip * Masks.runs(from & ~to));
                    }
                    assertThat(out[to]).isEqualTo(least);
                }
            }
        }
    }

    private static List<Visit> visits(Plan plan) {
        return plan.immersions().stream()
                .map(i -> new Visit(i.masked().stream().mapToLong(b -> 1L << b).sum(), Visit.index(i.endDown())))
                .toList();
    }
}
