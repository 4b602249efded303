package tideband.cli;

import java.io.PrintWriter;
import java.util.Timer;
import java.util.TimerTask;
import java.util.function.Consumer;

/** Tells on standard error what is being done, if it takes long. */
final class Progress implements Consumer<String>, AutoCloseable {
    private static final long PATIENCE_MS = 2000;

    private final PrintWriter talk;
    private final Timer timer = new Timer("progress", true);
    private TimerTask telling;

    Progress(PrintWriter talk) {
        this.talk = talk;
    }

    @Override
    public void accept(String stage) {
        stop();
        telling = new TimerTask() {
            @Override
            public void run() {
                talk.print(stage + " …\n");
                talk.flush();
            }
        };
        timer.schedule(telling, PATIENCE_MS);
    }

    private void stop() {
        if (telling != null) {
            telling.cancel();
        }
    }

    @Override
    public void close() {
        timer.cancel();
    }
}
