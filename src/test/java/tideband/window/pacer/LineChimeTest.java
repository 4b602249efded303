package tideband.window.pacer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import javax.sound.sampled.LineUnavailableException;
import org.junit.jupiter.api.Test;
import tideband.pacer.Tone;

class LineChimeTest {
    @Test
    void withoutALineItIsSilentAndSaysSo() throws InterruptedException {
        CountDownLatch asked = new CountDownLatch(1);
        LineChime chime = new LineChime(format -> {
            asked.countDown();
            throw new LineUnavailableException("none");
        });
        assertThat(asked.await(10, TimeUnit.SECONDS)).isTrue();
        for (int i = 0; i < 200 && chime.trouble().isEmpty(); i++) {
            Thread.sleep(10);
        }
        assertThat(chime.trouble()).isEqualTo("no sound device: watch the screen");
        chime.sound(Tone.MARK);
        chime.close();
        chime.sound(Tone.MARK);
    }

    @Test
    void tonesDifferAndStayWithinSixteenBits() {
        int tick = Beeps.of(Tone.TICK, 44_100).length;
        int mark = Beeps.of(Tone.MARK, 44_100).length;
        int supply = Beeps.of(Tone.SUPPLY, 44_100).length;
        assertThat(tick).isLessThan(mark);
        assertThat(supply).isEqualTo(2 * mark);
        byte[] bytes = Beeps.of(Tone.ALARM, 44_100);
        int most = 0;
        for (int i = 0; i < bytes.length; i += 2) {
            most = Math.max(most, Math.abs((bytes[i] & 0xff) | (bytes[i + 1] << 8)));
        }
        assertThat(most).isBetween(15_000, 20_000);
        // Starts and ends at rest, so that nothing clicks.
        assertThat(bytes[0]).isZero();
        assertThat(bytes[bytes.length - 1]).isZero();
    }
}
