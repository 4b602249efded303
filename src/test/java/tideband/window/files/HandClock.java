package tideband.window.files;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.AbstractExecutorService;
import java.util.concurrent.Callable;
import java.util.concurrent.Delayed;
import java.util.concurrent.FutureTask;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ScheduledFuture;
import java.util.concurrent.TimeUnit;

/** Does at once what is to be done now, and what is to be done later when the clock is moved on by hand. */
final class HandClock extends AbstractExecutorService implements ScheduledExecutorService {
    private long nowMs;
    private final List<Task> tasks = new ArrayList<>();

    private final class Task extends FutureTask<Object> implements ScheduledFuture<Object> {
        private final Runnable work;
        private final long everyMs;
        private long atMs;

        Task(Runnable work, long atMs, long everyMs) {
            super(work, null);
            this.work = work;
            this.atMs = atMs;
            this.everyMs = everyMs;
        }

        @Override
        public long getDelay(TimeUnit unit) {
            return unit.convert(atMs - nowMs, TimeUnit.MILLISECONDS);
        }

        @Override
        public int compareTo(Delayed other) {
            return Long.compare(getDelay(TimeUnit.MILLISECONDS), other.getDelay(TimeUnit.MILLISECONDS));
        }

        @Override
        public boolean equals(Object other) {
            return this == other;
        }

        @Override
        public int hashCode() {
            return System.identityHashCode(this);
        }
    }

    /** Moves the clock on. */
    void advance(long ms) {
        long endMs = nowMs + ms;
        while (true) {
            tasks.removeIf(Task::isCancelled);
            Task next = tasks.stream()
                    .min(Comparator.comparingLong(t -> t.atMs))
                    .filter(t -> t.atMs <= endMs)
                    .orElse(null);
            if (next == null) {
                break;
            }
            nowMs = next.atMs;
            if (next.everyMs > 0) {
                next.atMs += next.everyMs;
            } else {
                tasks.remove(next);
            }
            next.work.run();
        }
        nowMs = endMs;
    }

    int tasks() {
        tasks.removeIf(Task::isCancelled);
        return tasks.size();
    }

    @Override
    public void execute(Runnable command) {
        command.run();
    }

    @Override
    public ScheduledFuture<?> schedule(Runnable command, long delay, TimeUnit unit) {
        Task task = new Task(command, nowMs + unit.toMillis(delay), 0);
        tasks.add(task);
        return task;
    }

    @Override
    public ScheduledFuture<?> scheduleWithFixedDelay(Runnable command, long first, long every, TimeUnit unit) {
        Task task = new Task(command, nowMs + unit.toMillis(first), unit.toMillis(every));
        tasks.add(task);
        return task;
    }

    @Override
    public <V> ScheduledFuture<V> schedule(Callable<V> callable, long delay, TimeUnit unit) {
        throw new UnsupportedOperationException();
    }

    @Override
    public ScheduledFuture<?> scheduleAtFixedRate(Runnable command, long first, long every, TimeUnit unit) {
        throw new UnsupportedOperationException();
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
