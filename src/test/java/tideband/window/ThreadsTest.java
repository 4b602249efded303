package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;

import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

class ThreadsTest {

    @Test
    void whatComesAfterTheEndIsNotDoneAndNoFault() {
        Threads threads = Threads.start(Runnable::run);
        threads.close();
        AtomicInteger done = new AtomicInteger();
        assertThatCode(() -> {
                    threads.work().execute(done::incrementAndGet);
                    threads.look().execute(done::incrementAndGet);
                    threads.write().execute(done::incrementAndGet);
                    threads.keep().execute(done::incrementAndGet);
                    threads.keep().schedule(done::incrementAndGet, 1, TimeUnit.MILLISECONDS);
                })
                .doesNotThrowAnyException();
        assertThat(done).hasValue(0);
    }
}
