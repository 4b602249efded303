package tideband.window;

import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.AbstractExecutorService;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/**
 * The models every part of the window shares, over a shipped design; all work is done at once on the thread that asks.
 *
 * @param drawing the drawing
 * @param work the work behind it
 * @param tilt the tilt
 * @param comfort what suits the user
 */
public record Desk(DrawingModel drawing, WorkModel work, TiltModel tilt, ComfortModel comfort) {

    /**
     * A desk with a shipped design on it.
     *
     * @param name the design's name, such as {@code lantern-hook}
     * @return the desk
     */
    public static Desk with(String name) {
        return with(shipped(name));
    }

    /**
     * A desk with a design on it.
     *
     * @param design the design
     * @return the desk
     */
    public static Desk with(Design design) {
        DrawingModel drawing = new DrawingModel(design);
        WorkModel work = new WorkModel(drawing.designProperty(), Colours.of(design), Runnable::run, Runnable::run);
        TiltModel tilt = new TiltModel(work, Runnable::run, Runnable::run);
        return new Desk(drawing, work, tilt, new ComfortModel());
    }

    /**
     * Threads that are none: all is done at once by the one who asks; nothing is done later.
     *
     * @return the threads
     */
    static Threads threads() {
        ExecutorService atOnce = new AtOnce();
        ScheduledExecutorService never = Executors.newScheduledThreadPool(0);
        return new Threads(atOnce, atOnce, atOnce, never, Runnable::run);
    }

    /** Runs tasks on the thread that hands them in. */
    private static final class AtOnce extends AbstractExecutorService {
        @Override
        public void execute(Runnable task) {
            task.run();
        }

        @Override
        public void shutdown() {}

        @Override
        public List<Runnable> shutdownNow() {
            return List.of();
        }

        @Override
        public boolean isShutdown() {
            return false;
        }

        @Override
        public boolean isTerminated() {
            return false;
        }

        @Override
        public boolean awaitTermination(long timeout, TimeUnit unit) {
            return true;
        }
    }

    /**
     * Reads a shipped design.
     *
     * @param name its name
     * @return the design
     */
    public static Design shipped(String name) {
        Reading<Design> reading = DesignFile.read(Path.of("designs", name + ".json"));
        if (reading instanceof Reading.Read<Design> read) {
            return read.value();
        }
        throw new AssertionError(reading.toString());
    }
}
