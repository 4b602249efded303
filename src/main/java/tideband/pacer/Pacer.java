package tideband.pacer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.LongSupplier;
import tideband.sheet.Figures;

/**
 * One run through an immersion. It stands still between calls: {@link #poll} brings it up to the clock, however long ago the last
 * call was.
 */
public final class Pacer {
    /** Seconds of a count-in. */
    public static final double COUNT_IN_S = 5;

    private static final int LAST_SECONDS = 3;
    /** A tick this late, in s, would only confuse. */
    private static final double STALE_TICK_S = 0.5;

    private final PaceScript script;
    private final Paceclock clock;
    private final List<LogEntry> log = new ArrayList<>();
    private List<Step> steps;
    private PaceState state = new PaceState.Preparing(0, 0);
    private double heardS;
    private int loggedMarks;
    private boolean resuming;

    /**
     * A run yet to begin.
     *
     * @param script the immersion
     * @param nanoTime a monotonic clock in nanoseconds, such as {@code System::nanoTime}
     */
    public Pacer(PaceScript script, LongSupplier nanoTime) {
        this.script = script;
        this.clock = new Paceclock(nanoTime);
        this.steps = script.preparation();
    }

    /**
     * The immersion.
     *
     * @return its script
     */
    public PaceScript script() {
        return script;
    }

    /**
     * How far it has come, as of the last call.
     *
     * @return the state
     */
    public PaceState state() {
        return state;
    }

    /**
     * The steps of getting ready.
     *
     * @return the steps, in order
     */
    public List<Step> steps() {
        return steps;
    }

    /**
     * What was done so far.
     *
     * @return entries, in order
     */
    public List<LogEntry> log() {
        return List.copyOf(log);
    }

    /** Confirms the step shown; after the last the count-in begins. */
    public void confirm() {
        if (state instanceof PaceState.Preparing preparing) {
            if (preparing.step() + 1 < steps.size()) {
                state = new PaceState.Preparing(preparing.step() + 1, preparing.fromS());
            } else {
                countIn(preparing.fromS());
            }
        }
    }

    /** Goes back to the step before. */
    public void back() {
        if (state instanceof PaceState.Preparing preparing && preparing.step() > 0) {
            state = new PaceState.Preparing(preparing.step() - 1, preparing.fromS());
        }
    }

    /** Begins the count-in again while it is under way. */
    public void countInAgain() {
        poll();
        if (state instanceof PaceState.CountIn counting) {
            clock.start(counting.fromS() - COUNT_IN_S);
            heardS = counting.fromS() - COUNT_IN_S - 1e-9;
            log.add(new LogEntry(counting.fromS(), "count-in again"));
            state = new PaceState.CountIn(COUNT_IN_S, counting.fromS());
        }
    }

    private void countIn(double fromS) {
        clock.start(fromS - COUNT_IN_S);
        heardS = fromS - COUNT_IN_S - 1e-9;
        resuming = false;
        loggedMarks =
                script.at(fromS).markIndex() + (fromS > script.at(fromS).now().dueS() ? 1 : 0);
        log.add(new LogEntry(fromS, "count-in"));
        state = new PaceState.CountIn(COUNT_IN_S, fromS);
    }

    /** Stops the clock of a running pull, or lets a stopped one go on after a count-in; stops a count-in. */
    public void pauseOrResume() {
        poll();
        if (state instanceof PaceState.Running running) {
            clock.pause();
            Moment moment = script.at(running.elapsedS());
            log.add(new LogEntry(
                    running.elapsedS(),
                    "paused at mark " + moment.now().mark().number() + ", " + moment.volts()
                            + (moment.live() ? " V" : "") + ", "
                            + Figures.fixed(moment.setting().depthMm(), 1) + " mm"));
            state = new PaceState.Paused(running.elapsedS(), 0);
        } else if (state instanceof PaceState.Paused paused) {
            log.add(new LogEntry(
                    paused.elapsedS(), "going on after " + Figures.fixed(clock.pausedS(), 1) + " s, count-in"));
            clock.resume(COUNT_IN_S);
            heardS = paused.elapsedS() - COUNT_IN_S - 1e-9;
            resuming = true;
            state = new PaceState.CountIn(COUNT_IN_S, paused.elapsedS());
        } else if (state instanceof PaceState.CountIn counting) {
            log.add(new LogEntry(counting.fromS(), "count-in stopped"));
            if (resuming) {
                clock.start(counting.fromS());
                clock.pause();
                state = new PaceState.Paused(counting.fromS(), 0);
            } else {
                state = new PaceState.Preparing(steps.size() - 1, counting.fromS());
            }
        }
    }

    /** Breaks off at once, whatever is under way. */
    public void abort() {
        poll();
        double elapsedS;
        if (state instanceof PaceState.Running running) {
            elapsedS = running.elapsedS();
        } else if (state instanceof PaceState.Paused paused) {
            elapsedS = paused.elapsedS();
        } else if (state instanceof PaceState.CountIn counting) {
            elapsedS = counting.fromS();
        } else {
            return;
        }
        clock.pause();
        log.add(new LogEntry(elapsedS, "aborted"));
        state = new PaceState.Aborted(elapsedS);
    }

    /** After an abort: gets ready to go on where it stopped, where that makes sense. */
    public void goOn() {
        if (state instanceof PaceState.Aborted aborted) {
            Optional<Double> atS = new Interruption(script, aborted.elapsedS()).goOnAtS();
            atS.ifPresent(this::prepareAgain);
        }
    }

    /** After an abort or the end: gets ready to do the immersion again from its start. */
    public void again() {
        if (state instanceof PaceState.Aborted || state instanceof PaceState.Finished) {
            prepareAgain(0);
        }
    }

    private void prepareAgain(double fromS) {
        steps = script.preparationAgain(fromS);
        state = new PaceState.Preparing(0, fromS);
    }

    /**
     * Comes up to the clock.
     *
     * @return the sounds that fell due since the last call, in order
     */
    public List<Cue> poll() {
        if (state instanceof PaceState.Paused paused) {
            state = new PaceState.Paused(paused.elapsedS(), clock.pausedS());
            return List.of();
        }
        boolean counting = state instanceof PaceState.CountIn;
        if (!counting && !(state instanceof PaceState.Running)) {
            return List.of();
        }
        double elapsedS = clock.elapsedS();
        double fromS = state instanceof PaceState.CountIn c ? c.fromS() : Double.NEGATIVE_INFINITY;
        List<Cue> cues = new ArrayList<>();
        if (counting) {
            for (int second = (int) COUNT_IN_S; second >= 1; second--) {
                tick(cues, fromS - second, elapsedS);
            }
        }
        if (elapsedS < fromS) {
            state = new PaceState.CountIn(fromS - elapsedS, fromS);
        } else {
            if (counting) {
                // What is due at the very start is heard even where the pull goes on between two marks.
                heardS = Math.max(heardS, Math.nextDown(fromS));
                if (loggedMarks > script.at(fromS).markIndex()) {
                    cues.add(new Cue(script.at(fromS).live() ? Tone.SUPPLY : Tone.MARK, fromS));
                    log.add(new LogEntry(
                            fromS, "gone on: " + script.at(fromS).now().line()));
                }
            }
            run(cues, elapsedS);
        }
        heardS = Math.max(heardS, elapsedS);
        return cues;
    }

    private void run(List<Cue> cues, double elapsedS) {
        List<Call> calls = script.calls();
        for (int i = 0; i < calls.size(); i++) {
            double dueS = calls.get(i).dueS();
            double sinceS = i == 0 ? 0 : calls.get(i - 1).dueS();
            for (int second = LAST_SECONDS; second >= 1 && i > 0; second--) {
                if (dueS - second > sinceS) {
                    tick(cues, dueS - second, elapsedS);
                }
            }
            if (dueS > heardS && dueS <= elapsedS) {
                boolean last = i + 1 == calls.size();
                cues.add(new Cue(last ? Tone.END : calls.get(i).switches() ? Tone.SUPPLY : Tone.MARK, dueS));
            }
            if (i >= loggedMarks && dueS <= elapsedS) {
                log.add(new LogEntry(
                        dueS,
                        "mark " + calls.get(i).mark().number() + ": "
                                + calls.get(i).line()));
                loggedMarks = i + 1;
            }
        }
        state = elapsedS >= script.durationS()
                ? new PaceState.Finished(script.durationS())
                : new PaceState.Running(elapsedS);
    }

    private void tick(List<Cue> cues, double dueS, double elapsedS) {
        if (dueS > heardS && dueS <= elapsedS && elapsedS - dueS < STALE_TICK_S) {
            cues.add(new Cue(Tone.TICK, dueS));
        }
    }
}
