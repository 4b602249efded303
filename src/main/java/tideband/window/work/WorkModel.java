package tideband.window.work;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.Executor;
import java.util.concurrent.atomic.AtomicReference;
import java.util.function.BooleanSupplier;
import java.util.function.LongSupplier;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;
import tideband.bench.BenchPlanner;
import tideband.bench.Colours;
import tideband.bench.Obstacle;
import tideband.bench.Work;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.design.Design;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.Supply;
import tideband.plan.KnownBound;

/**
 * Keeps the work in step with the drawing: after every edit the newest design is worked out on another thread, and what
 * has become out of date is given up.
 *
 * <p>While a hand draws there is an edit every few milliseconds, and were each to put an end to the work on the one before
 * it, none would ever be answered until the hand rests. So a design that has been overtaken is carried through all the same
 * where that takes no longer than {@value #PATIENCE_MS} ms, or where the one before it was given up.
 */
public final class WorkModel {

    /** How long a design is worked on without looking whether it has been overtaken. */
    static final int PATIENCE_MS = 100;

    // What colours depend on.
    private record Basis(Finish finish, Illuminant light, Observer observer, Bath bath, Supply supply, double holdS) {
        static Basis of(Design design) {
            return new Basis(
                    design.finish(),
                    design.light(),
                    design.observer(),
                    design.bath(),
                    design.supply(),
                    design.pull().holdS());
        }
    }

    private record Known(Basis basis, Colours colours) {}

    private final Executor beside;
    private final Executor screen;
    private final ReadOnlyObjectWrapper<Colours> colours;
    private final ReadOnlyObjectWrapper<Optional<Answer>> answer = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyBooleanWrapper stale = new ReadOnlyBooleanWrapper(true);
    private final ReadOnlyStringWrapper trouble = new ReadOnlyStringWrapper("");
    private final AtomicReference<Design> newest = new AtomicReference<>();
    private final AtomicReference<Design> waiting = new AtomicReference<>();
    private final LongSupplier nanoTime;
    private final KnownBound bound = new KnownBound();
    private Known known;
    private boolean carriedThrough = true;

    /**
     * Begins to keep in step.
     *
     * @param design the drawing
     * @param first colours for the design as it stands
     * @param beside runs work on another thread, one task at a time
     * @param screen runs what changes properties on the thread they are used on
     */
    public WorkModel(ObservableValue<Design> design, Colours first, Executor beside, Executor screen) {
        this(design, first, beside, screen, System::nanoTime);
    }

    /** The same with a clock of the caller's. */
    WorkModel(ObservableValue<Design> design, Colours first, Executor beside, Executor screen, LongSupplier nanoTime) {
        this.nanoTime = nanoTime;
        this.beside = beside;
        this.screen = screen;
        this.colours = new ReadOnlyObjectWrapper<>(first);
        this.known = new Known(Basis.of(design.getValue()), first);
        design.addListener((value, before, after) -> workOut(after));
        workOut(design.getValue());
    }

    /**
     * The colours of the newest design that has been looked at; on no change of metal, finish, light, bath, supply and hold
     * they stay.
     *
     * @return a property that is never null
     */
    public ReadOnlyObjectProperty<Colours> coloursProperty() {
        return colours.getReadOnlyProperty();
    }

    /**
     * The latest answer; it may be to an earlier design, see {@link #staleProperty()}.
     *
     * @return a property; empty until the first answer is there
     */
    public ReadOnlyObjectProperty<Optional<Answer>> answerProperty() {
        return answer.getReadOnlyProperty();
    }

    /**
     * Whether the latest answer is not to the design as it stands.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty staleProperty() {
        return stale.getReadOnlyProperty();
    }

    /**
     * What went wrong while working the design out, in a sentence; empty when nothing did.
     *
     * @return a property
     */
    public ReadOnlyStringProperty troubleProperty() {
        return trouble.getReadOnlyProperty();
    }

    private void workOut(Design design) {
        newest.set(design);
        stale.set(true);
        if (waiting.getAndSet(design) == null) {
            beside.execute(this::takeNext);
        }
    }

    private void takeNext() {
        Design design = waiting.getAndSet(null);
        BooleanSupplier outOfDate = () -> !design.equals(newest.get());
        BooleanSupplier givenUp = patience(outOfDate);
        try {
            Optional<Obstacle> obstacle = Colours.obstacle(design);
            if (obstacle.isPresent()) {
                Work cannot = new Work.CannotBeMade(List.of(obstacle.get()));
                publish(new Answer(design, known.colours(), cannot, true));
                return;
            }
            Colours own = coloursOf(design);
            carriedThrough = false;
            Work work = new BenchPlanner(design, own, bound).workWhileDrawing(givenUp);
            carriedThrough = true;
            boolean whole = work instanceof Work.CannotBeMade;
            publish(new Answer(design, own, work, whole));
            if (!whole && !outOfDate.getAsBoolean()) {
                publish(new Answer(
                        design, own, new BenchPlanner(design, own, bound).work(stage -> {}, outOfDate), true));
            }
        } catch (CancellationException overtaken) {
            // A newer design is waiting; its turn comes next.
            return;
        } catch (RuntimeException fault) {
            screen.execute(() -> trouble.set("The plan could not be worked out: " + fault
                    + ". Undo the last edit, and please report this with the design."));
        }
    }

    private BooleanSupplier patience(BooleanSupplier outOfDate) {
        if (!carriedThrough) {
            return () -> false;
        }
        long untilNs = nanoTime.getAsLong() + PATIENCE_MS * 1_000_000L;
        return () -> nanoTime.getAsLong() - untilNs > 0 && outOfDate.getAsBoolean();
    }

    private Colours coloursOf(Design design) {
        Basis basis = Basis.of(design);
        if (!known.basis().equals(basis)) {
            known = new Known(basis, Colours.of(design));
        }
        return known.colours();
    }

    private void publish(Answer next) {
        screen.execute(() -> {
            colours.set(next.colours());
            answer.set(Optional.of(next));
            stale.set(!next.design().equals(newest.get()));
            trouble.set("");
        });
    }
}
