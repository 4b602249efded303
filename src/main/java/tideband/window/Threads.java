package tideband.window;

import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.RejectedExecutionHandler;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ScheduledThreadPoolExecutor;
import java.util.concurrent.ThreadFactory;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;

/**
 * The threads beside the screen's. None keeps the program from ending.
 *
 * @param work works the drawing out, one task at a time
 * @param look works out colours and pictures, one task at a time
 * @param write writes and prints sheets, one errand at a time
 * @param keep keeps documents safe, and watches the clock
 * @param screen the thread the screen is drawn on
 */
record Threads(
        ExecutorService work,
        ExecutorService look,
        ExecutorService write,
        ScheduledExecutorService keep,
        Executor screen)
        implements AutoCloseable {

    /** Starts them. */
    static Threads start(Executor screen) {
        // Once they have ended, what the screen's thread still hands them is not to be done.
        RejectedExecutionHandler afterwards = new ThreadPoolExecutor.DiscardPolicy();
        return new Threads(
                one("work", afterwards),
                one("look", afterwards),
                one("write", afterwards),
                new ScheduledThreadPoolExecutor(1, named("keep"), afterwards),
                screen);
    }

    private static ExecutorService one(String name, RejectedExecutionHandler afterwards) {
        return new ThreadPoolExecutor(1, 1, 0, TimeUnit.SECONDS, new LinkedBlockingQueue<>(), named(name), afterwards);
    }

    private static ThreadFactory named(String name) {
        return task -> {
            Thread thread = new Thread(task, "tideband " + name);
            thread.setDaemon(true);
            return thread;
        };
    }

    /** Ends them; tasks under way are asked to stop. */
    @Override
    public void close() {
        work.shutdownNow();
        look.shutdownNow();
        write.shutdownNow();
        keep.shutdownNow();
    }
}
