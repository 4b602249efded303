package tideband.pacer;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.bench.BenchPlan;
import tideband.bench.PacedPlans;
import tideband.plan.Immersion;

/** What a stop leaves done and undone. */
class InterruptionTest {
    /** Property. */
    @Test
    void nothingIsDoneAtFirstAndAllIsDoneBeforeThePieceIsOut() {
        for (BenchPlan plan : PacedPlans.all()) {
            for (int i = 0; i < plan.pulls().size(); i++) {
                PaceScript script = new PaceScript(plan, i);
                Immersion immersion = plan.plan().immersions().get(i);
                Interruption atOnce = new Interruption(script, 0.05);
                assertThat(atOnce.bands()).hasSameSizeAs(immersion.finishes());
                assertThat(atOnce.bands()).noneMatch(BandOutcome::done);
                assertThat(new Interruption(script, script.durationS() - 1).allDone())
                        .as(plan.design().title() + " " + i)
                        .isTrue();
                for (BandOutcome band : atOnce.bands()) {
                    assertThat(band.doneAtS()).isBetween(0.1, script.durationS());
                    assertThat(band.repeatGainNm()).isGreaterThanOrEqualTo(0);
                }
            }
        }
    }

    /** Property: bands are done from the outermost inwards, and what has been said done stays so. */
    @Test
    void bandsAreDoneOneAfterTheOther() {
        PaceScript script = new PaceScript(PacedPlans.shipped("lantern-hook"), 0);
        int before = 0;
        for (double atS = 0; atS <= script.durationS(); atS += 0.5) {
            int done = (int) new Interruption(script, atS)
                    .bands().stream().filter(BandOutcome::done).count();
            assertThat(done).isGreaterThanOrEqualTo(before);
            before = done;
        }
        assertThat(before)
                .isEqualTo(script.plan().plan().immersions().get(0).finishes().size());
    }

    @Test
    void aHoldCountsAsDoneWhenItsSecondsAreOver() {
        // chimney-post, first dip: two holds of 30 s, 12 s of drawing between them.
        PaceScript script = new PaceScript(PacedPlans.shipped("chimney-post"), 0);
        List<BandOutcome> bands = new Interruption(script, 35).bands();
        assertThat(bands).anySatisfy(band -> assertThat(band.doneAtS()).isCloseTo(30, within(1e-9)));
        assertThat(bands).anySatisfy(band -> assertThat(band.doneAtS()).isCloseTo(72, within(1e-9)));
        assertThat(new Interruption(script, 29.9).bands()).noneMatch(BandOutcome::done);
        assertThat(bands.stream().filter(BandOutcome::done)).isNotEmpty();
        assertThat(new Interruption(script, 35).allDone()).isFalse();
    }

    @Test
    void aRepeatCreepsByAFewPerCent() {
        PaceScript script = new PaceScript(PacedPlans.shipped("chimney-post"), 0);
        Interruption late = new Interruption(script, 60);
        BandOutcome done =
                late.bands().stream().filter(BandOutcome::done).findFirst().orElseThrow();
        // Films at steady volts go with the logarithm of time: twice the hold is d ln 2 / s more, 2.5 % for titanium's
        // s of 27.7.
        assertThat(done.repeatGainShare()).isBetween(0.01, 0.04);
        assertThat(late.repeatable())
                .isEqualTo(late.bands().stream().allMatch(b -> b.repeatGainShare() <= Interruption.MOST_GAIN_SHARE));
        assertThat(late.goOnAtS()).contains(60.0);
    }

    @Test
    void adviceStartsWithTheSupply() {
        PaceScript script = new PaceScript(PacedPlans.shipped("carry-bail"), 0);
        for (double atS = 0; atS <= script.durationS(); atS += 0.7) {
            Interruption stop = new Interruption(script, atS);
            assertThat(stop.abortWords().get(0)).startsWith("Supply off. Wait until its meter reads 0 V");
            assertThat(stop.pauseWords()).isNotEmpty();
            boolean live = script.at(atS).live();
            assertThat(stop.pauseWords().get(0).contains("grows on")).isEqualTo(live);
            assertThat(stop.resumeWords().contains("supply ON")).isEqualTo(live);
        }
        assertThat(new Interruption(script, script.durationS()).goOnAtS()).isEmpty();
        assertThat(new Interruption(script, 0).goOnAtS()).isEmpty();
        assertThat(new Interruption(script, 40).pauseWords())
                .anyMatch(words -> words.startsWith("A fade that stands with volts on"));
    }

    @Test
    void filmLeftIsWhatTheDrawingWants() {
        // Regression against the plan: lantern-hook is one pull without masks, so it leaves every band's film.
        BenchPlan plan = PacedPlans.shipped("lantern-hook");
        FilmLeft left = new FilmLeft(plan, 0);
        plan.bands().stream().filter(band -> !band.bare()).forEach(band -> {
            double insideMm = 0.5;
            assertThat(left.filmNm(band.toMm() - insideMm))
                    .isCloseTo(band.bSide().filmNm(), within(2.5));
        });
    }
}
