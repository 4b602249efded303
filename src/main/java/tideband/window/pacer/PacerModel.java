package tideband.window.pacer;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.LongSupplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.pacer.Cue;
import tideband.pacer.LogEntry;
import tideband.pacer.PaceScript;
import tideband.pacer.PaceState;
import tideband.pacer.Pacer;
import tideband.pacer.Tone;
import tideband.window.comfort.ComfortModel;

/**
 * The pacer as it is shown: carries a run forward and says what stands on the board. Nothing moves between two calls of
 * {@link #poll}.
 */
public final class PacerModel {
    private final BenchPlan plan;
    private final Colours colours;
    private final int immersion;
    private final ComfortModel comfort;
    private final ComfortModel look = new ComfortModel();
    private final Pacer pacer;
    private final BoardWriter writer;
    private final ReadOnlyObjectWrapper<Board> board = new ReadOnlyObjectWrapper<>();
    private final ReadOnlyStringWrapper announcement = new ReadOnlyStringWrapper("");

    /**
     * A run yet to begin.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @param immersion index of the immersion, 0-based
     * @param comfort what suits the user; sounds are muted by it
     * @param nanoTime a monotonic clock in nanoseconds, such as {@code System::nanoTime}
     */
    public PacerModel(BenchPlan plan, Colours colours, int immersion, ComfortModel comfort, LongSupplier nanoTime) {
        this.plan = plan;
        this.colours = colours;
        this.immersion = immersion;
        this.comfort = comfort;
        this.pacer = new Pacer(new PaceScript(plan, immersion), nanoTime);
        this.writer = new BoardWriter(pacer, colours);
        look.darkProperty().set(true);
        look.textPercentProperty().bind(comfort.textPercentProperty());
        show();
    }

    /**
     * What is shown.
     *
     * @return the board
     */
    public ReadOnlyObjectProperty<Board> boardProperty() {
        return board.getReadOnlyProperty();
    }

    /**
     * What is shown.
     *
     * @return the board
     */
    public Board board() {
        return board.get();
    }

    /**
     * What is read out to those who cannot see the screen; it changes at each mark and each turn of the run.
     *
     * @return a sentence
     */
    public ReadOnlyStringProperty announcementProperty() {
        return announcement.getReadOnlyProperty();
    }

    /**
     * How far the run has come.
     *
     * @return its state
     */
    public PaceState state() {
        return pacer.state();
    }

    /**
     * The immersion.
     *
     * @return its script
     */
    public PaceScript script() {
        return pacer.script();
    }

    /**
     * The colours of films.
     *
     * @return the colours
     */
    public Colours colours() {
        return colours;
    }

    /**
     * What suits the user.
     *
     * @return the choices
     */
    public ComfortModel comfort() {
        return comfort;
    }

    /**
     * How the pacer itself looks: dark until the user changes it, for a bright screen dazzles over a bath.
     *
     * @return the look, text as large as everywhere
     */
    public ComfortModel look() {
        return look;
    }

    /**
     * What was done in this run.
     *
     * @return entries, in order
     */
    public List<LogEntry> log() {
        return pacer.log();
    }

    /**
     * The immersion after this one.
     *
     * @return its index, 0-based, if there is one
     */
    public OptionalInt nextImmersion() {
        return immersion + 1 < plan.pulls().size() ? OptionalInt.of(immersion + 1) : OptionalInt.empty();
    }

    /**
     * The same plan, another immersion.
     *
     * @param other index of the immersion, 0-based
     * @param nanoTime the clock
     * @return a run yet to begin, looking as this one does
     */
    public PacerModel paceAnother(int other, LongSupplier nanoTime) {
        PacerModel model = new PacerModel(plan, colours, other, comfort, nanoTime);
        model.look.darkProperty().set(look.darkProperty().get());
        return model;
    }

    /**
     * Whether the supply may be on by the script: then the pacer is not closed, but the run broken off.
     *
     * @return true from the count-in to the end of the pull
     */
    public boolean underWay() {
        PaceState state = pacer.state();
        return state instanceof PaceState.CountIn
                || state instanceof PaceState.Running
                || state instanceof PaceState.Paused;
    }

    /**
     * Comes up to the clock.
     *
     * @return the most urgent sound that fell due, unless sounds are muted
     */
    public Optional<Tone> poll() {
        List<Cue> cues = pacer.poll();
        show();
        return heard(cues.stream().map(Cue::tone).max(Comparator.naturalOrder()));
    }

    private Optional<Tone> heard(Optional<Tone> tone) {
        return comfort.mutedProperty().get() ? Optional.empty() : tone;
    }

    /**
     * Does what the user asks, where it is possible now.
     *
     * @param act what to do; {@link PacerAct#NEXT} and {@link PacerAct#LEAVE} are the window's and do nothing here
     * @return a sound to be heard at once, unless sounds are muted
     */
    public Optional<Tone> perform(PacerAct act) {
        if (!board.get().acts().contains(act)) {
            return Optional.empty();
        }
        Optional<Tone> tone = Optional.empty();
        switch (act) {
            case CONFIRM -> pacer.confirm();
            case BACK -> pacer.back();
            case RESUME, STOP_COUNT -> pacer.pauseOrResume();
            case PAUSE -> {
                pacer.pauseOrResume();
                tone = Optional.of(Tone.ALARM);
            }
            case ABORT -> {
                pacer.abort();
                tone = Optional.of(Tone.ALARM);
            }
            case COUNT_AGAIN -> pacer.countInAgain();
            case GO_ON -> pacer.goOn();
            case AGAIN -> pacer.again();
            case MUTE -> comfort.mutedProperty().set(!comfort.mutedProperty().get());
            case LIGHT -> look.darkProperty().set(!look.darkProperty().get());
            case NEXT, LEAVE -> {
                return Optional.empty();
            }
        }
        show();
        return heard(tone);
    }

    private void show() {
        board.set(writer.board(nextImmersion().isPresent()));
        announcement.set(writer.announcement());
    }
}
