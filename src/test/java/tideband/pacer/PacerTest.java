package tideband.pacer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tideband.bench.PacedPlans;

/** Property: a run keeps to the timing table, whatever the polls do. */
class PacerTest {
    private long nanos = 123_456_789_012L;

    private Pacer pacer(String name) {
        return new Pacer(new PaceScript(PacedPlans.shipped(name), 0), () -> nanos);
    }

    private void pass(double seconds) {
        nanos += Math.round(seconds * 1e9);
    }

    private static void confirmAll(Pacer pacer) {
        int steps = pacer.steps().size();
        for (int i = 0; i < steps; i++) {
            pacer.confirm();
        }
    }

    @Test
    void everyMarkIsAnnouncedAtTheTablesTimeToTheMillisecond() {
        Pacer pacer = pacer("carry-bail");
        confirmAll(pacer);
        long start = nanos + 5_000_000_000L;
        List<Double> heardS = new ArrayList<>();
        while (!(pacer.state() instanceof PaceState.Finished)) {
            for (Cue cue : pacer.poll()) {
                if (cue.tone() != Tone.TICK) {
                    double atS = (nanos - start) / 1e9;
                    assertThat(atS).isCloseTo(cue.dueS(), within(1e-3));
                    heardS.add(cue.dueS());
                }
            }
            nanos += 1_000_000;
        }
        assertThat(heardS)
                .isEqualTo(pacer.script().calls().stream().map(Call::dueS).toList());
    }

    @Test
    void irregularPollsLoseNoMarkAndDoNotDrift() {
        for (int seed = 0; seed < 20; seed++) {
            Random random = new Random(seed);
            Pacer pacer = pacer("lantern-hook");
            confirmAll(pacer);
            long start = nanos + 5_000_000_000L;
            long paused = 0;
            List<Double> heardS = new ArrayList<>();
            while (!(pacer.state() instanceof PaceState.Finished)) {
                pass(random.nextDouble() * (random.nextInt(20) == 0 ? 20 : 0.1));
                pacer.poll().stream()
                        .filter(cue -> cue.tone() != Tone.TICK)
                        .map(Cue::dueS)
                        .filter(dueS -> pacer.script().calls().stream().anyMatch(c -> c.dueS() == dueS))
                        .forEach(heardS::add);
                if (pacer.state() instanceof PaceState.Running running) {
                    assertThat(running.elapsedS()).isCloseTo((nanos - start - paused) / 1e9, within(1e-9));
                    if (random.nextInt(50) == 0) {
                        pacer.pauseOrResume();
                        long from = nanos;
                        pass(3600 * random.nextDouble());
                        pacer.poll();
                        pacer.pauseOrResume();
                        paused += nanos - from + 5_000_000_000L;
                    }
                }
            }
            assertThat(heardS)
                    .isEqualTo(pacer.script().calls().stream().map(Call::dueS).toList());
        }
    }

    @Test
    void aClockReadForHoursShowsNowLessStart() {
        Paceclock clock = new Paceclock(() -> nanos);
        long start = nanos;
        Random random = new Random(7);
        for (int i = 0; i < 1_000_000; i++) {
            nanos += random.nextInt(40_000_001);
            clock.elapsedS();
        }
        assertThat(nanos - start).isGreaterThan(4 * 3_600_000_000_000L);
        assertThat(clock.elapsedS()).isEqualTo((nanos - start) / 1e9);
    }

    @Test
    void aClockSurvivesTheWrapOfNanoTime() {
        nanos = Long.MAX_VALUE - 500_000_000L;
        Paceclock clock = new Paceclock(() -> nanos);
        pass(2);
        assertThat(clock.elapsedS()).isEqualTo(2);
    }

    @Test
    void countInTicksFiveTimesThenTheFirstMark() {
        Pacer pacer = pacer("lantern-hook");
        confirmAll(pacer);
        assertThat(pacer.state()).isEqualTo(new PaceState.CountIn(5, 0));
        List<Tone> tones = new ArrayList<>();
        for (int i = 0; i <= 50; i++) {
            pacer.poll().forEach(cue -> tones.add(cue.tone()));
            pass(0.1);
        }
        assertThat(tones).containsExactly(Tone.TICK, Tone.TICK, Tone.TICK, Tone.TICK, Tone.TICK, Tone.SUPPLY);
        assertThat(pacer.state()).isInstanceOf(PaceState.Running.class);
    }

    @Test
    void pausedTimeDoesNotCountAndTheHoldGoesOnWhereItWas() {
        Pacer pacer = pacer("lantern-hook");
        confirmAll(pacer);
        pass(5 + 12.4);
        pacer.poll();
        pacer.pauseOrResume();
        PaceState.Paused paused = (PaceState.Paused) pacer.state();
        assertThat(paused.elapsedS()).isCloseTo(12.4, within(1e-9));
        pass(100);
        pacer.poll();
        assertThat(((PaceState.Paused) pacer.state()).sinceS()).isCloseTo(100, within(1e-9));
        assertThat(new Interruption(pacer.script(), 12.4).resumeWords())
                .isEqualTo("At nought: supply ON at 11.4 V, and hold for the 17.6 s left.");
        pacer.pauseOrResume();
        pass(4.9);
        pacer.poll();
        assertThat(pacer.state()).isInstanceOf(PaceState.CountIn.class);
        pass(0.1);
        assertThat(pacer.poll()).contains(new Cue(Tone.SUPPLY, paused.elapsedS()));
        assertThat(((PaceState.Running) pacer.state()).elapsedS()).isCloseTo(12.4, within(1e-9));
        assertThat(pacer.log().stream().map(LogEntry::line))
                .contains("0:12 paused at mark 1, 11.4 V, 142.0 mm", "0:12 going on after 100.0 s, count-in");
    }

    @Test
    void aStoppedCountInGoesBackToWhereItCameFrom() {
        Pacer pacer = pacer("lantern-hook");
        confirmAll(pacer);
        pacer.pauseOrResume();
        assertThat(pacer.state())
                .isEqualTo(new PaceState.Preparing(pacer.steps().size() - 1, 0));
        pacer.confirm();
        pass(10);
        pacer.poll();
        pacer.pauseOrResume();
        pacer.pauseOrResume();
        pass(1);
        pacer.pauseOrResume();
        assertThat(pacer.state()).isEqualTo(new PaceState.Paused(5, 0));
        pass(50);
        pacer.pauseOrResume();
        pass(6);
        pacer.poll();
        assertThat(((PaceState.Running) pacer.state()).elapsedS()).isCloseTo(6, within(1e-9));
    }

    @Test
    void abortIsImmediateFromEveryStateWithAClock() {
        Pacer pacer = pacer("lantern-hook");
        pacer.abort();
        assertThat(pacer.state()).isInstanceOf(PaceState.Preparing.class);
        confirmAll(pacer);
        pacer.abort();
        assertThat(pacer.state()).isEqualTo(new PaceState.Aborted(0));
        pacer.again();
        assertThat(pacer.state()).isEqualTo(new PaceState.Preparing(0, 0));
        confirmAll(pacer);
        pass(5 + 50);
        pacer.abort();
        assertThat(((PaceState.Aborted) pacer.state()).elapsedS()).isCloseTo(50, within(1e-9));
        pacer.goOn();
        assertThat(((PaceState.Preparing) pacer.state()).fromS()).isCloseTo(50, within(1e-9));
        confirmAll(pacer);
        pass(4);
        pacer.poll();
        assertThat(((PaceState.CountIn) pacer.state()).leftS()).isCloseTo(1, within(1e-9));
        pass(1.5);
        pacer.poll();
        assertThat(((PaceState.Running) pacer.state()).elapsedS()).isCloseTo(50.5, within(1e-9));
        pacer.pauseOrResume();
        pacer.abort();
        assertThat(pacer.state()).isInstanceOf(PaceState.Aborted.class);
    }
}
