package tideband.document;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;

/**
 * The running program a drawing belongs to. The number of a process is given out again after its end, so the time it began
 * goes with it.
 *
 * @param pid number of the process
 * @param startMillis when it began, in ms since 1970; 0 where the system does not tell
 */
record Owner(long pid, long startMillis) {

    /** Systems work the time out from their clock, which is put right now and then. */
    private static final Duration LEEWAY = Duration.ofSeconds(2);

    static Owner self() {
        ProcessHandle self = ProcessHandle.current();
        return new Owner(
                self.pid(),
                self.info().startInstant().map(Instant::toEpochMilli).orElse(0L));
    }

    /** Whether it still runs. */
    boolean alive() {
        Optional<ProcessHandle> process = ProcessHandle.of(pid).filter(ProcessHandle::isAlive);
        if (process.isEmpty()) {
            return false;
        }
        Optional<Instant> start = process.get().info().startInstant();
        return start.isEmpty()
                || startMillis == 0
                || Duration.between(start.get(), Instant.ofEpochMilli(startMillis))
                                .abs()
                                .compareTo(LEEWAY)
                        <= 0;
    }
}
