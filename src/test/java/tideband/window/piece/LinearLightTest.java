package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

class LinearLightTest {

    /** Property: every channel value, and everything nearer to it than to its neighbours, comes back as it was. */
    @Test
    void everyChannelValueComesBack() {
        for (int value = 0; value < 256; value++) {
            for (double off : new double[] {-0.49, 0, 0.49}) {
                double encoded = Math.min(1, Math.max(0, (value + off) / 255));
                assertThat(LinearLight.eightBits((float) LinearLight.decode(encoded)))
                        .isEqualTo(value);
            }
        }
        assertThat(LinearLight.eightBits(-0.1f)).isZero();
        assertThat(LinearLight.eightBits(Float.NaN)).isZero();
        assertThat(LinearLight.eightBits(7)).isEqualTo(255);
    }

    /** Reference: IEC 61966-2-1, where both branches meet: 0.04045 encoded is 0.0031308 linear, to the digits printed. */
    @Test
    void bothBranchesMeet() {
        assertThat(LinearLight.decode(0.04045)).isCloseTo(0.0031308, within(5e-8));
        assertThat(LinearLight.decode(0.040451)).isCloseTo(0.0031308, within(2e-7));
    }
}
