package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.design.Order;
import tideband.piece.End;

/** The planner against exhaustive search, and its properties. */
class PlannerTest {

    /** Property: the plan is the exhaustive search's, to the last tie-break. */
    @ParameterizedTest
    @CsvSource({"1, 200", "2, 600", "3, 2000", "4, 3000", "5, 2000", "6, 600", "7, 40", "8, 12"})
    void equalsExhaustiveSearch(int bands, int drawings) {
        Random random = new Random(20_240 + bands);
        for (int i = 0; i < drawings; i++) {
            Problem problem = Drawings.small(random, bands);
            var least = new Exhaustive(problem).least();
            if (problem.stretches().stream().allMatch(Stretch::bare)) {
                assertThat(plan(problem).immersions()).isEmpty();
                assertThat(plan(problem).cost().minutes()).isZero();
                assertThat(plan(problem).proven()).isTrue();
            } else if (Planner.plan(problem) instanceof Outcome.Planned planned) {
                Plan plan = planned.plan();
                PlanCheck.check(problem, plan);
                assertThat(plan.proven()).isTrue();
                assertThat(visits(plan)).as("drawing %d: %s", i, problem).isEqualTo(visits(least.orElseThrow()));
                assertThat(plan.cost().minutes()).isEqualTo(least.get().minutes());
                if (problem.order() == Order.THICKER_FIRST) {
                    double other = new Exhaustive(problem.under(Order.LEAST_MINUTES))
                            .least()
                            .orElseThrow()
                            .minutes();
                    assertThat(plan.savedByOtherOrderMin()).hasValue(plan.cost().minutes() - other);
                }
            } else {
                assertThat(least).as("drawing %d: %s", i, problem).isEmpty();
            }
        }
    }

    /** Property: the same drawing gives the same plan, reasons and all. */
    @ParameterizedTest
    @CsvSource({"8, 40", "12, 5", "20, 1"})
    void plansAreRepeatable(int bands, int drawings) {
        Random random = new Random(5);
        for (int i = 0; i < drawings; i++) {
            Problem problem = Drawings.possible(random, bands, Order.THICKER_FIRST);
            assertThat(Planner.plan(problem)).isEqualTo(Planner.plan(problem));
        }
    }

    /** Property: a drawing seen from its other end costs the same. */
    @ParameterizedTest
    @CsvSource({"5, 300", "9, 30", "12, 4"})
    void mirroredDrawingCostsTheSame(int bands, int drawings) {
        Random random = new Random(6);
        for (int i = 0; i < drawings; i++) {
            Order order = i % 2 == 0 ? Order.THICKER_FIRST : Order.LEAST_MINUTES;
            Problem problem = Drawings.possible(random, bands, order);
            Plan plan = plan(problem);
            Plan mirrored = plan(mirrored(problem));
            assertThat(mirrored.cost().minutes()).isEqualTo(plan.cost().minutes());
            assertThat(mirrored.cost().turns()).isEqualTo(plan.cost().turns());
            assertThat(mirrored.savedByOtherOrderMin()).isEqualTo(plan.savedByOtherOrderMin());
        }
    }

    /** Property: plans of large drawings are plans, and their bound is one of the plans of a part too. */
    @ParameterizedTest
    @CsvSource({"13, 4", "30, 2", "60, 1"})
    void largeDrawingsArePlannedWithAStatedGap(int bands, int drawings) {
        Random random = new Random(7);
        for (int i = 0; i < drawings; i++) {
            Order order = i % 2 == 0 ? Order.THICKER_FIRST : Order.LEAST_MINUTES;
            Problem problem = Drawings.possible(random, bands, order);
            Plan plan = plan(problem);
            PlanCheck.check(problem, plan);
            assertThat(plan.lowerBoundMin()).isPositive();
            assertThat(plan.savedByOtherOrderMin()).isEmpty();
        }
    }

    /** Property: a large drawing made of a small one and bare bands at its end A side keeps the small one's bound. */
    @Test
    void boundOfALargeDrawingHoldsForAPlanKnownToBeLeast() {
        Random random = new Random(8);
        for (int i = 0; i < 3; i++) {
            Problem small = Drawings.possible(random, 10, Order.THICKER_FIRST);
            List<Stretch> stretches = new ArrayList<>(small.stretches());
            for (int k = 0; k < 4; k++) {
                stretches.add(new Stretch(1, 0, 0, true, false));
            }
            Problem large = new Problem(stretches, Set.of(End.A), small.dryMm() + 4, small.times(), small.order());
            Problem fromA = new Problem(small.stretches(), Set.of(End.A), small.dryMm(), small.times(), small.order());
            if (Planner.plan(fromA) instanceof Outcome.Planned least) {
                assertThat(plan(large).lowerBoundMin())
                        .isLessThanOrEqualTo(least.plan().cost().minutes());
            }
        }
    }

    /** Property: every immersion says why it comes now, why its end is down, and why each run is masked. */
    @Test
    void everyImmersionExplainsItself() {
        Random random = new Random(9);
        for (int i = 0; i < 200; i++) {
            Order order = i % 2 == 0 ? Order.THICKER_FIRST : Order.LEAST_MINUTES;
            Problem problem = Drawings.possible(random, 7, order);
            for (Immersion immersion : plan(problem).immersions()) {
                long masked =
                        immersion.masked().stream().mapToLong(b -> 1L << b).sum();
                assertThat(immersion.why())
                        .hasSize(2 + Masks.runs(masked))
                        .allMatch(sentence -> sentence.endsWith("."))
                        .noneMatch(sentence -> sentence.contains("would save") && !sentence.contains("save nothing"));
            }
        }
    }

    @Test
    void planOfThisOrderOnlyIsTheSame() {
        Problem problem = Drawings.possible(new Random(11), 8, Order.THICKER_FIRST);
        Plan alone = ((Outcome.Planned) Planner.planThisOrderOnly(problem, () -> false)).plan();
        assertThat(alone.immersions()).isEqualTo(plan(problem).immersions());
        assertThat(alone.savedByOtherOrderMin()).isEmpty();
        assertThat(alone.otherOrder()).isEmpty();
    }

    @Test
    void stopsWhenCancelled() {
        Problem problem = Drawings.possible(new Random(10), 30, Order.THICKER_FIRST);
        assertThatThrownBy(() -> Planner.plan(problem, () -> true)).isInstanceOf(CancellationException.class);
    }

    private static Problem mirrored(Problem problem) {
        int n = problem.stretches().size();
        List<Stretch> stretches = new ArrayList<>();
        for (int i = n - 1; i >= 0; i--) {
            Stretch s = problem.stretches().get(i);
            boolean crisp = i > 0 && problem.stretches().get(i - 1).crispAtB();
            stretches.add(new Stretch(s.lengthMm(), s.bSideNm(), s.aSideNm(), s.bare(), crisp));
        }
        Set<End> ends = problem.endsDown().stream().map(End::other).collect(Collectors.toSet());
        return new Problem(stretches, ends, problem.dryMm(), problem.times(), problem.order());
    }

    private static Plan plan(Problem problem) {
        return ((Outcome.Planned) Planner.plan(problem)).plan();
    }

    private static List<String> visits(Plan plan) {
        return plan.immersions().stream()
                .map(i -> i.endDown() + " "
                        + i.masked().stream().mapToInt(b -> 1 << b).sum())
                .toList();
    }

    private static List<String> visits(Exhaustive.Way way) {
        return way.all().stream().map(w -> w.end() + " " + w.masked()).toList();
    }
}
