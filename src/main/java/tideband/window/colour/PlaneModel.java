package tideband.window.colour;

import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicLong;
import java.util.function.Consumer;
import javafx.beans.property.DoubleProperty;
import javafx.beans.property.ReadOnlyDoubleProperty;
import javafx.beans.property.ReadOnlyDoubleWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.SimpleDoubleProperty;
import javafx.beans.value.ObservableDoubleValue;
import tideband.bench.Colours;
import tideband.colour.Lab;
import tideband.window.work.WorkModel;

/** Chooses a colour by hue, lightness and chroma, and knows which of them films come near. */
public final class PlaneModel {
    /** The strongest chroma that can be chosen; the films' own are weaker. */
    public static final double STRONGEST = 100;

    private static final double START_CHROMA = 40;

    private final WorkModel work;
    private final ObservableDoubleValue within;
    private final Consumer<Lab> take;
    private final Executor beside;
    private final Executor screen;
    private final ReadOnlyDoubleWrapper hueDegrees = new ReadOnlyDoubleWrapper(270);
    private final ReadOnlyDoubleWrapper lightness = new ReadOnlyDoubleWrapper(50);
    private final DoubleProperty chroma = new SimpleDoubleProperty(START_CHROMA);
    private final ReadOnlyObjectWrapper<Optional<ColourPlane>> plane = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final AtomicLong asked = new AtomicLong();
    private boolean wanted;
    private boolean following;

    PlaneModel(WorkModel work, ObservableDoubleValue within, Consumer<Lab> take, Executor beside, Executor screen) {
        this.work = work;
        this.within = within;
        this.take = take;
        this.beside = beside;
        this.screen = screen;
        work.coloursProperty().addListener((value, before, after) -> workOut());
        within.addListener((value, before, after) -> workOut());
        chroma.addListener((value, before, after) -> {
            workOut();
            if (!following) {
                give();
            }
        });
    }

    /** Begins to work planes out; until it is looked at there is none. */
    public void show() {
        if (!wanted) {
            wanted = true;
            workOut();
        }
    }

    /**
     * Chooses a colour of the plane.
     *
     * @param toHueDegrees hue angle in degrees, taken round the circle
     * @param toLightness L*, kept from 0 to 100
     */
    public void choose(double toHueDegrees, double toLightness) {
        hueDegrees.set(((toHueDegrees % 360) + 360) % 360);
        lightness.set(Math.min(Math.max(toLightness, 0), 100));
        give();
    }

    /** Goes to a colour chosen elsewhere. */
    void follow(Lab lab) {
        following = true;
        if (lab.chroma() > 0) {
            hueDegrees.set(lab.hueDegrees());
        }
        lightness.set(Math.min(Math.max(lab.lightness(), 0), 100));
        chroma.set(Math.min(lab.chroma(), STRONGEST));
        following = false;
    }

    private void give() {
        Lab lab = ColourPlane.lab(hueDegrees.get(), lightness.get(), chroma.get());
        take.accept(new Lab(tenth(lab.lightness()), tenth(lab.a()), tenth(lab.b())));
    }

    private static double tenth(double value) {
        return Math.rint(value * 10) / 10 + 0.0;
    }

    private void workOut() {
        if (!wanted) {
            return;
        }
        long mine = asked.incrementAndGet();
        Colours colours = work.coloursProperty().get();
        double ofChroma = chroma.get();
        double near = within.get();
        beside.execute(() -> {
            // What a slider has passed in the meantime is not worked out.
            if (asked.get() == mine) {
                ColourPlane next = ColourPlane.of(colours, ofChroma, near);
                screen.execute(() -> {
                    if (asked.get() == mine) {
                        plane.set(Optional.of(next));
                    }
                });
            }
        });
    }

    /**
     * The hue chosen.
     *
     * @return a property: degrees, 0 to below 360
     */
    public ReadOnlyDoubleProperty hueDegreesProperty() {
        return hueDegrees.getReadOnlyProperty();
    }

    /**
     * The lightness chosen.
     *
     * @return a property: L*, 0 to 100
     */
    public ReadOnlyDoubleProperty lightnessProperty() {
        return lightness.getReadOnlyProperty();
    }

    /**
     * The chroma of the plane.
     *
     * @return a property: C*, 0 to {@link #STRONGEST}
     */
    public DoubleProperty chromaProperty() {
        return chroma;
    }

    /**
     * The plane of that chroma.
     *
     * @return a property; empty until it has been worked out
     */
    public ReadOnlyObjectProperty<Optional<ColourPlane>> planeProperty() {
        return plane.getReadOnlyProperty();
    }
}
