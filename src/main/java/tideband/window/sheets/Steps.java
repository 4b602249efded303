package tideband.window.sheets;

import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.function.BiConsumer;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;

/** Counts the stages of an errand, and ends it at the next stage once it is called off. Used on one thread. */
final class Steps implements Consumer<String>, BooleanSupplier {
    private final int stages;
    private final AtomicBoolean calledOff;
    private final BiConsumer<String, Double> show;
    private String last = "";
    private int begun;

    Steps(int stages, AtomicBoolean calledOff, BiConsumer<String, Double> show) {
        this.stages = stages;
        this.calledOff = calledOff;
        this.show = show;
    }

    @Override
    public void accept(String stage) {
        // A printer draws a page in several passes; that is one stage.
        if (!stage.equals(last)) {
            last = stage;
            show.accept(stage, Math.min(1.0, (double) begun / stages));
            begun++;
        }
        if (calledOff.get()) {
            throw new CancellationException("called off while " + stage);
        }
    }

    @Override
    public boolean getAsBoolean() {
        return calledOff.get();
    }
}
