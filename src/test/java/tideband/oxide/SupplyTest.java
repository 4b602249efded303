package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class SupplyTest {

    /** Property: a dialled value is a whole number of steps, written without the dust of binary fractions, half a step off. */
    @ParameterizedTest
    @ValueSource(doubles = {0.1, 0.05, 0.5, 1, 0.25})
    void dialsWholeSteps(double stepVolts) {
        Supply supply = new Supply(120, 2, stepVolts, Double.POSITIVE_INFINITY);
        for (double volts = 0; volts < 120; volts += 0.0173) {
            double dialled = supply.dialled(volts);
            assertThat(Math.abs(dialled - volts)).isLessThanOrEqualTo(stepVolts / 2 + 1e-9);
            assertThat(Double.toString(dialled)).matches("[0-9]+\\.[0-9]{1,2}");
            assertThat(dialled / stepVolts).isCloseTo(Math.rint(dialled / stepVolts), within(1e-9));
        }
    }

    /** Property: the highest setting passes neither the supply's end nor the ceiling. */
    @Test
    void theHighestSetting() {
        Supply supply = new Supply(120, 2, 0.5, 10);
        assertThat(supply.highestVolts(100.7)).isEqualTo(100.5);
        assertThat(supply.highestVolts(300)).isEqualTo(120);
        assertThat(new Supply(90.8, 2, 0.1, 10).highestVolts(100)).isEqualTo(90.8);
    }

    /** Property: what no supply can be is refused, not-a-number included. */
    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, 0, -1})
    void refusesWhatCannotBe(double bad) {
        assertThatThrownBy(() -> new Supply(bad, 1, 1, 1)).hasMessageContaining("above 0");
        assertThatThrownBy(() -> new Supply(1, bad, 1, 1)).hasMessageContaining("above 0");
        assertThatThrownBy(() -> new Supply(1, 1, bad, 1)).hasMessageContaining("above 0");
        assertThatThrownBy(() -> new Supply(1, 1, 1, bad)).hasMessageContaining("above 0");
    }
}
