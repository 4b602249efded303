package tideband.window.files;

import java.io.IOException;
import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.Executor;
import java.util.function.Consumer;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;

/**
 * Work on the disk, beside the thread of the screen, one piece after the other: what is asked for while some is under way or
 * a question is open waits its turn. To be used on the screen's thread.
 */
final class Errands {

    // Work that reads or writes.
    interface Work<T> {
        T done() throws IOException;
    }

    private final Executor beside;
    private final Executor screen;
    private final ReadOnlyBooleanWrapper busy = new ReadOnlyBooleanWrapper(false);
    private final Deque<Runnable> waiting = new ArrayDeque<>();
    private int questions;

    Errands(Executor beside, Executor screen) {
        this.beside = beside;
        this.screen = screen;
    }

    ReadOnlyBooleanProperty busyProperty() {
        return busy.getReadOnlyProperty();
    }

    /** Whether neither work nor a question is open. */
    boolean idle() {
        return !busy.get() && questions == 0;
    }

    /** Does something now, or as soon as all is idle. */
    void inTurn(Runnable act) {
        if (idle()) {
            act.run();
            goOn();
        } else {
            waiting.add(act);
        }
    }

    /** Asks the user. */
    <T> T ask(Supplier<T> question) {
        questions++;
        try {
            return question.get();
        } finally {
            questions--;
        }
    }

    /** Does work beside, then goes on with what came of it. */
    <T> void send(Work<T> work, Consumer<T> then, Consumer<IOException> failed) {
        busy.set(true);
        beside.execute(() -> {
            try {
                T result = work.done();
                back(() -> then.accept(result));
            } catch (IOException e) {
                back(() -> failed.accept(e));
            } catch (RuntimeException e) {
                back(() -> {
                    throw e;
                });
            }
        });
    }

    private void back(Runnable then) {
        screen.execute(() -> {
            busy.set(false);
            try {
                then.run();
            } finally {
                goOn();
            }
        });
    }

    private void goOn() {
        while (idle() && !waiting.isEmpty()) {
            waiting.remove().run();
        }
    }
}
