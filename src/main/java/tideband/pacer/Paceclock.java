package tideband.pacer;

import java.util.function.LongSupplier;

/**
 * The time of a run. It reads a monotonic clock whenever it is asked and adds no ticks up, so it cannot drift: elapsed is
 * now, less the start, less the time paused.
 */
public final class Paceclock {
    private static final double NANOS_PER_S = 1e9;

    private final LongSupplier nanoTime;
    private long startNanos;
    private long pausedNanos;
    private long pausedSinceNanos;
    private boolean paused;

    /**
     * A clock that shows 0 now.
     *
     * @param nanoTime a monotonic clock in nanoseconds, such as {@code System::nanoTime}
     */
    public Paceclock(LongSupplier nanoTime) {
        this.nanoTime = nanoTime;
        this.startNanos = nanoTime.getAsLong();
    }

    /**
     * Starts afresh.
     *
     * @param atS what it shows now, in s; below 0 in a count-in
     */
    public void start(double atS) {
        startNanos = nanoTime.getAsLong() - nanos(atS);
        pausedNanos = 0;
        paused = false;
    }

    /** Stops, if it is not stopped. */
    public void pause() {
        if (!paused) {
            pausedSinceNanos = nanoTime.getAsLong();
            paused = true;
        }
    }

    /**
     * Goes on, if it is stopped.
     *
     * @param countInS it goes on from so many seconds before the moment at which it was stopped
     */
    public void resume(double countInS) {
        if (paused) {
            pausedNanos += nanoTime.getAsLong() - pausedSinceNanos + nanos(countInS);
            paused = false;
        }
    }

    /**
     * What it shows.
     *
     * @return seconds
     */
    public double elapsedS() {
        long nowNanos = paused ? pausedSinceNanos : nanoTime.getAsLong();
        return (nowNanos - startNanos - pausedNanos) / NANOS_PER_S;
    }

    /**
     * How long it has been stopped this time.
     *
     * @return seconds; 0 while it goes
     */
    public double pausedS() {
        return paused ? (nanoTime.getAsLong() - pausedSinceNanos) / NANOS_PER_S : 0;
    }

    private static long nanos(double seconds) {
        return Math.round(seconds * NANOS_PER_S);
    }
}
