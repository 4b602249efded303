package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/** Property: a remedy that helps from either end is named once. */
class HindranceOnceTest {

    @Test
    void theSameRemedyIsNotNamedTwice() {
        Problem whole = new Problem(
                List.of(new Stretch(50, 80, 80, false, false)),
                EnumSet.allOf(End.class),
                5,
                BenchTimes.USUAL,
                Order.THICKER_FIRST);
        assertThat(Planner.plan(whole))
                .isInstanceOfSatisfying(
                        Outcome.Impossible.class,
                        impossible -> assertThat(impossible.hindrances().get(0).remedy())
                                .isEqualTo("shorten the dry length to 0 mm"));
    }
}
