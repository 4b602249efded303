package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tideband.design.Order;

class KnownBoundTest {

    /** Property: what is known from the drawings before never changes an answer, however the next one differs. */
    @Test
    void answersAreTheSameWithItAndWithout() {
        Random random = new Random(40);
        KnownBound known = new KnownBound();
        for (int i = 0; i < 60; i++) {
            Order order = random.nextBoolean() ? Order.THICKER_FIRST : Order.LEAST_MINUTES;
            Problem problem = Drawings.possible(random, 2 + random.nextInt(7), order);
            for (int edit = 0; edit < 6; edit++) {
                assertThat(Planner.plan(problem, () -> false, known)).isEqualTo(Planner.plan(problem));
                assertThat(Planner.planThisOrderOnly(problem, () -> false, known))
                        .isEqualTo(Planner.planThisOrderOnly(problem, () -> false));
                problem = edited(random, problem);
            }
        }
    }

    /** One band made longer or shorter, thicker or thinner, or its edge made crisp or soft. */
    private static Problem edited(Random random, Problem problem) {
        List<Stretch> stretches = new ArrayList<>(problem.stretches());
        int band = random.nextInt(stretches.size());
        Stretch s = stretches.get(band);
        double longer = random.nextInt(3) - 1;
        double thicker = s.bare() ? 0 : random.nextInt(3) * 5;
        boolean other = random.nextInt(4) == 0;
        stretches.set(
                band,
                new Stretch(
                        Math.max(2, s.lengthMm() + longer),
                        s.aSideNm() + thicker,
                        s.bSideNm() + thicker,
                        s.bare(),
                        (other && band < stretches.size() - 1) != s.crispAtB()));
        return new Problem(stretches, problem.endsDown(), problem.dryMm(), problem.times(), problem.order());
    }
}
