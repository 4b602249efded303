package tideband.window.files;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Future;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import tideband.design.Design;
import tideband.document.Recovery;

/**
 * Keeps the changed drawing in the recovery store, off the thread of the screen: a moment after the first edit, however many
 * follow. What is to be kept may be said on any thread.
 */
final class KeptDrawing {

    /** So that a drag is not written in every position, and yet little is lost. */
    private static final long DELAY_MS = 500;

    // What is to be in the store; no design if nothing is to be.
    private record Wish(Optional<Design> design, Optional<Path> belongs) {}

    private final ScheduledExecutorService beside;
    private final Consumer<IOException> trouble;
    private final Object writing = new Object();
    private Recovery.Slot slot;
    private Wish wish = new Wish(Optional.empty(), Optional.empty());
    private Wish inStore = wish;
    private Future<?> pending;

    KeptDrawing(Recovery.Slot slot, ScheduledExecutorService beside, Consumer<IOException> trouble) {
        this.slot = slot;
        this.beside = beside;
        this.trouble = trouble;
    }

    /** What shall be in the store soon; nothing once the drawing is saved. */
    synchronized void want(Optional<Design> design, Optional<Path> belongs) {
        wish = new Wish(design, belongs);
        if (pending == null && !wish.equals(inStore)) {
            pending = beside.schedule(this::put, DELAY_MS, TimeUnit.MILLISECONDS);
        }
    }

    /** Goes on in another place of the store, in which a drawing is kept already; what was kept here is forgotten. */
    void moveTo(Recovery.Slot other, Design design, Optional<Path> belongs) throws IOException {
        synchronized (writing) {
            Recovery.Slot before = slot;
            slot = other;
            synchronized (this) {
                inStore = new Wish(Optional.of(design), belongs);
                wish = inStore;
            }
            before.clear();
        }
    }

    /** Brings the store up to date now. */
    void putNow() throws IOException {
        // One at a time, so that an older wish is never written over a newer one.
        synchronized (writing) {
            Wish next;
            synchronized (this) {
                if (pending != null) {
                    pending.cancel(false);
                    pending = null;
                }
                next = wish;
                if (next.equals(inStore)) {
                    return;
                }
            }
            if (next.design.isPresent()) {
                slot.keep(next.design.get(), next.belongs);
            } else {
                slot.clear();
            }
            synchronized (this) {
                inStore = next;
            }
        }
    }

    private void put() {
        try {
            putNow();
        } catch (IOException e) {
            trouble.accept(e);
        } catch (RuntimeException e) {
            trouble.accept(new IOException(e.toString(), e));
        }
    }
}
