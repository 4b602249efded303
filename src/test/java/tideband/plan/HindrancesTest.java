package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.Random;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/** Drawings that cannot be made, and what would help. */
class HindrancesTest {

    @Test
    void fadeRisingFromTheOnlyEndNeedsTheOther() {
        Hindrance h = only(problem(Set.of(End.A), 0, new Stretch(10, 50, 100, false, false)));
        assertThat(h.band()).isEqualTo(OptionalInt.of(0));
        assertThat(h.reason())
                .isEqualTo(
                        "band 1 cannot be finished: with end A down its film rises away from end A, and end B may not"
                                + " go down");
        assertThat(h.remedy()).isEqualTo("let end B go down too");
        assertThat(h.changes()).containsExactly(new Change(Optional.of(End.B), OptionalDouble.empty()));
    }

    @Test
    void bandUnderTheHolderNeedsTheOtherEndOrAShorterHolder() {
        Stretch tip = new Stretch(20, 80, 80, false, false);
        Stretch tail = new Stretch(8, 60, 60, false, false);
        Stretch stub = new Stretch(4, 0, 0, true, false);
        Hindrance h = only(problem(Set.of(End.A), 10, tip, tail, stub));
        assertThat(h.reason()).contains("band 2", "it reaches 6 mm into the dry length under the holder at end B");
        assertThat(h.remedy()).isEqualTo("shorten the dry length to 4 mm, or let end B go down too");
    }

    @Test
    void fadeUnderTheHolderOfItsOnlyEndNeedsTwoThings() {
        Stretch dawn = new Stretch(10, 50, 100, false, false);
        Stretch tip = new Stretch(20, 0, 0, true, false);
        Hindrance h = only(problem(Set.of(End.A), 5, dawn, tip));
        assertThat(h.remedy()).isEqualTo("let end B go down too and shorten the dry length to 0 mm");
    }

    /** Property: a drawing is impossible just if exhaustive search finds no plan, and each change named does help. */
    @Test
    void everyChangeNamedWorks() {
        Random random = new Random(77);
        int seen = 0;
        for (int i = 0; i < 2000; i++) {
            Problem problem = Drawings.small(random, 1 + random.nextInt(5));
            if (!(Planner.plan(problem) instanceof Outcome.Impossible impossible)) {
                continue;
            }
            seen++;
            Problem changed = problem;
            for (Hindrance h : impossible.hindrances()) {
                assertThat(h.changes()).isNotEmpty();
                for (Change change : h.changes()) {
                    assertThat(Hindrances.of(change.applyTo(problem)))
                            .noneMatch(other -> other.band().equals(h.band()));
                }
                changed = h.changes().get(0).applyTo(changed);
            }
            assertThat(Planner.plan(changed)).as("%s", changed).isInstanceOf(Outcome.Planned.class);
        }
        assertThat(seen).isGreaterThan(300);
    }

    /** Property: where a shorter dry length alone would do, one a little longer than the longest named would not. */
    @Test
    void theDryLengthNamedIsTheLongest() {
        Random random = new Random(78);
        int seen = 0;
        for (int i = 0; i < 2000; i++) {
            Problem problem = Drawings.small(random, 4);
            for (Hindrance h : Hindrances.of(problem)) {
                OptionalDouble longest = h.changes().stream()
                        .filter(change -> change.alsoDown().isEmpty())
                        .mapToDouble(change -> change.dryMm().orElseThrow())
                        .max();
                if (longest.isPresent()) {
                    seen++;
                    Change longer = new Change(Optional.empty(), OptionalDouble.of(longest.getAsDouble() + 0.002));
                    assertThat(Hindrances.of(longer.applyTo(problem)))
                            .anyMatch(other -> other.band().equals(h.band()));
                }
            }
        }
        assertThat(seen).isGreaterThan(100);
    }

    private static Hindrance only(Problem problem) {
        List<Hindrance> hindrances = ((Outcome.Impossible) Planner.plan(problem)).hindrances();
        assertThat(hindrances).hasSize(1);
        return hindrances.get(0);
    }

    private static Problem problem(Set<End> ends, double dryMm, Stretch... stretches) {
        return new Problem(List.of(stretches), EnumSet.copyOf(ends), dryMm, BenchTimes.USUAL, Order.THICKER_FIRST);
    }
}
