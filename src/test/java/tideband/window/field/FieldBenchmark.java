package tideband.window.field;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import javafx.beans.property.SimpleObjectProperty;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/**
 * How long the field takes from a movement of the hand to the new drawing with its handles and its reading, for twelve
 * bands; planning is not part of it, it runs beside.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 3)
public class FieldBenchmark {
    private FieldModel model;
    private int step;

    /** Lays out the field. */
    @Setup
    public void prepare() {
        Design design = TwelveBands.design();
        DrawingModel drawing = new DrawingModel(design);
        WorkModel work = new WorkModel(drawing.designProperty(), Colours.of(design), task -> {}, Runnable::run);
        model = new FieldModel(
                drawing,
                work,
                new TiltModel(work, task -> {}, Runnable::run),
                new ComfortModel(),
                new SimpleObjectProperty<>(List.of()),
                match -> {},
                new SimpleObjectProperty<>(Optional.empty()),
                new SimpleObjectProperty<>(List.of()));
        model.sight().resize(new FieldArea(1000, 400, 13));
    }

    private void press(Part part) {
        Handle handle = model.shown().handles().stream()
                .filter(h -> h.part().equals(part))
                .findFirst()
                .orElseThrow();
        model.hand().press(handle.xPx(), handle.yPx(), Modifiers.NONE);
        step++;
        double by = 5 + step % 37;
        model.hand().drag(handle.xPx() + by, handle.yPx() - by, Modifiers.NONE);
    }

    /**
     * An edge is moved and put back.
     *
     * @return the handles while it was moved
     */
    @Benchmark
    public List<Handle> edge() {
        press(new Part.EdgeAt(4));
        List<Handle> handles = model.shown().handles();
        model.hand().cancel();
        return handles;
    }

    /**
     * A film is moved and put back.
     *
     * @return the handles while it was moved
     */
    @Benchmark
    public List<Handle> level() {
        press(new Part.Level(4));
        List<Handle> handles = model.shown().handles();
        model.hand().cancel();
        return handles;
    }
}
