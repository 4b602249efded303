package tideband.window.work;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tideband.bench.BenchPlanner;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.edit.BandEdits;
import tideband.window.Desk;
import tideband.window.drawing.DrawingModel;

class WorkModelTest {
    private final Design design = Desk.shipped("snuffer-handle");
    private final DrawingModel drawing = new DrawingModel(design);
    private final Deque<Runnable> beside = new ArrayDeque<>();
    private final WorkModel work =
            new WorkModel(drawing.designProperty(), Colours.of(design), beside::add, Runnable::run);

    @Test
    void answersAsThePlannerDoes() {
        assertThat(work.answerProperty().get()).isEmpty();
        beside.remove().run();
        Answer answer = work.answerProperty().get().orElseThrow();
        assertThat(answer.work()).isEqualTo(BenchPlanner.work(design));
        assertThat(answer.whole()).isTrue();
        assertThat(work.staleProperty().get()).isFalse();
    }

    @Test
    void whileAHandDrawsWithoutRestEveryOtherDesignIsAnsweredHoweverLongItTakes() {
        Deque<Runnable> later = new ArrayDeque<>();
        // A hand that makes the next edit whenever the clock is read, and a clock that goes on by a second each time.
        long[] seconds = new long[1];
        Runnable edit = () -> drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 31 + ++seconds[0] % 50 * 0.1));
        WorkModel slow = new WorkModel(drawing.designProperty(), Colours.of(design), later::add, Runnable::run, () -> {
            edit.run();
            return seconds[0] * 1_000_000_000L;
        });
        List<Boolean> answered = new ArrayList<>();
        for (int i = 0; i < 6; i++) {
            edit.run();
            Optional<Answer> before = slow.answerProperty().get();
            later.remove().run();
            answered.add(!slow.answerProperty().get().equals(before));
        }
        assertThat(answered).containsExactly(false, true, false, true, false, true);
    }

    @Test
    void whatTakesNoLongIsCarriedThroughThoughOvertaken() {
        Deque<Runnable> later = new ArrayDeque<>();
        WorkModel quick = new WorkModel(drawing.designProperty(), Colours.of(design), later::add, Runnable::run, () -> {
            drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 31 + Math.random()));
            return 0;
        });
        later.remove().run();
        assertThat(quick.answerProperty().get()).isPresent();
        assertThat(quick.staleProperty().get()).isTrue();
    }

    @Test
    void onlyTheNewestOfManyEditsIsWorkedOut() {
        for (int i = 0; i < 100; i++) {
            double toMm = 31 + i * 0.1;
            drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, toMm));
        }
        assertThat(beside).hasSize(1);
        assertThat(work.staleProperty().get()).isTrue();
        beside.remove().run();
        assertThat(work.answerProperty().get().orElseThrow().design()).isEqualTo(drawing.design());
        assertThat(work.staleProperty().get()).isFalse();
    }
}
