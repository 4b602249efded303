package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Collections;
import java.util.List;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.Size;
import org.junit.jupiter.api.Test;

class LabelsTest {
    /** Property: in order, apart, and within bounds, wherever the wishes lie. */
    @Property(tries = 300)
    void labelsKeepOrderAndDistance(
            @ForAll @Size(min = 1, max = 25) List<@DoubleRange(min = -20, max = 220) Double> unsorted) {
        List<Double> wishes = unsorted.stream().sorted().toList();
        List<Double> middles = Labels.spread(wishes, Collections.nCopies(wishes.size(), 6.0), 2, 0, 200);
        assertThat(middles.get(0)).isGreaterThanOrEqualTo(3 - 1e-9);
        assertThat(middles.get(middles.size() - 1)).isLessThanOrEqualTo(197 + 1e-9);
        for (int i = 1; i < middles.size(); i++) {
            assertThat(middles.get(i) - middles.get(i - 1)).isGreaterThanOrEqualTo(8 - 1e-9);
        }
    }

    /** Property: where there is room nothing moves, and a crowd stands about its mean. */
    @Test
    void labelsStandWhereTheyWish() {
        assertThat(Labels.spread(List.of(20.0, 60.0), List.of(10.0, 10.0), 2, 0, 100))
                .containsExactly(20.0, 60.0);
        List<Double> crowd = Labels.spread(List.of(50.0, 50.0, 50.0), List.of(10.0, 10.0, 10.0), 2, 0, 100);
        assertThat(crowd.get(1)).isCloseTo(50, within(1e-9));
        assertThat(crowd.get(2) - crowd.get(0)).isCloseTo(24, within(1e-9));
    }

    @Test
    void tooManyLabelsAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Labels.spread(List.of(1.0, 2.0), List.of(10.0, 10.0), 2, 0, 20))
                .withMessageContaining("2 labels do not fit between 0.0 and 20.0 mm");
    }
}
