package tideband.window.work;

import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicReference;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import tideband.match.Palette;

/** How far the piece is tilted away from the eye, and the colour of every film seen so. */
public final class TiltModel {
    /** The steepest tilt that is shown, in degrees. */
    public static final double MOST_DEG = 80;

    private final WorkModel work;
    private final Executor beside;
    private final Executor screen;
    private final DoubleProperty tiltDeg = new SimpleDoubleProperty(0);
    private final ReadOnlyObjectWrapper<Palette> palette = new ReadOnlyObjectWrapper<>();
    private final AtomicReference<Seen> newest = new AtomicReference<>();
    private final AtomicReference<Seen> waiting = new AtomicReference<>();

    // The palette seen straight on, and the angle it is to be seen at.
    private record Seen(Palette straight, double angleDeg) {}

    /**
     * Not tilted, to begin with.
     *
     * @param work keeps the colours seen straight on
     * @param beside runs work on another thread
     * @param screen runs what changes properties on the thread they are used on
     */
    public TiltModel(WorkModel work, Executor beside, Executor screen) {
        this.work = work;
        this.beside = beside;
        this.screen = screen;
        palette.set(work.coloursProperty().get().palette());
        work.coloursProperty().addListener((value, before, after) -> look());
        tiltDeg.addListener((value, before, after) -> look());
    }

    /**
     * The angle between the line of sight and the normal of the surface.
     *
     * @return a property in degrees, 0 to {@link #MOST_DEG}
     */
    public DoubleProperty tiltDegProperty() {
        return tiltDeg;
    }

    /**
     * The colour of every film at this tilt; it follows a change of tilt a moment later.
     *
     * @return a property that is never null
     */
    public ReadOnlyObjectProperty<Palette> paletteProperty() {
        return palette.getReadOnlyProperty();
    }

    private void look() {
        Seen seen = new Seen(work.coloursProperty().get().palette(), angleDeg());
        newest.set(seen);
        if (seen.angleDeg() == 0) {
            palette.set(seen.straight());
        } else if (waiting.getAndSet(seen) == null) {
            beside.execute(this::takeNext);
        }
    }

    /** To the degree: finer steps cannot be told apart, and each costs a palette. */
    private double angleDeg() {
        return Math.rint(Math.min(Math.max(tiltDeg.get(), 0), MOST_DEG));
    }

    private void takeNext() {
        Seen seen = waiting.getAndSet(null);
        Palette tilted = seen.straight().seenAt(seen.angleDeg());
        screen.execute(() -> {
            if (seen.equals(newest.get())) {
                palette.set(tilted);
            }
        });
    }
}
