package tideband.pull;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tideband.oxide.GrowthLaw;
import tideband.oxide.Patchwork;
import tideband.piece.End;
import tideband.piece.Waterline;
import tideband.plan.Immersion;

/**
 * One visit to the bath, carried forward as its pull is written: where the line is, what the supply gives, which cells
 * are still wet and what film they have by now. Everything a pull does goes through here, so the rows and the films
 * cannot part.
 */
final class Visit {
    /** The clock's step, in s. */
    static final double CLOCK_S = 0.1;

    private static final double TICKS_PER_S = 10;
    private static final double SHORTEST_MOVE_S = 5;
    private static final double ALIKE_NM = 1;
    private static final double WITNESS_CM2 = 1e-6;

    private final Outfit outfit;
    private final GrowthLaw law;
    private final Cells cells;
    private final End down;
    private final Waterline waterline;
    private final Patchwork patchwork;
    private final boolean[] gone;
    private final List<Row> rows = new ArrayList<>();
    private final double startDepthMm;
    private int band;
    private double lineMm;
    private double depthMm;
    private double depthLineMm;
    private double timeS;
    private double volts;
    private double stoodVolts;

    /**
     * A visit about to begin: the piece is lowered dead.
     *
     * @param startLineMm where the line is then, in mm from the end that is down
     * @param band the band that the line is in, or at the outer edge of
     * @param mostS no visit lasts longer
     */
    Visit(Outfit outfit, Cells cells, Immersion immersion, double startLineMm, int band, double mostS) {
        this.outfit = outfit;
        this.law = new GrowthLaw(outfit.bath());
        this.cells = cells;
        this.down = immersion.endDown();
        this.waterline = new Waterline(outfit.piece(), down, outfit.vessel());
        this.gone = new boolean[cells.count()];
        // After the cells comes a witness for each band to be finished: next to no area, and wet to the end. It tells
        // the film at the line however little of the band is left below it.
        double[] wetCm2 = new double[cells.count() + cells.bands()];
        double[] startNm = Arrays.copyOf(cells.filmsNm(), wetCm2.length);
        for (int finished : immersion.finishes()) {
            startNm[cells.count() + finished] = cells.filmNm(cells.innermostOf(finished, down));
            wetCm2[cells.count() + finished] = WITNESS_CM2;
        }
        for (int cell = 0; cell < cells.count(); cell++) {
            gone[cell] = immersion.masked().contains(cells.bandOf(cell)) || cells.middleMm(cell, down) >= startLineMm;
            wetCm2[cell] = gone[cell] ? 0 : cells.areaCm2(cell) * cells.wetShare(cell, down, startLineMm);
        }
        this.patchwork =
                new Patchwork(outfit.bath(), outfit.supply().maxAmps(), startNm, wetCm2, outfit.mostVolts(), mostS);
        this.band = band;
        this.lineMm = startLineMm;
        this.startDepthMm = waterline.depthMm(startLineMm);
        this.depthMm = startDepthMm;
        this.depthLineMm = startLineMm;
        mark(Row.Act.LOWERED);
    }

    private Visit(Visit other, Patchwork patchwork) {
        this.outfit = other.outfit;
        this.law = other.law;
        this.cells = other.cells.copy();
        this.down = other.down;
        this.waterline = other.waterline;
        this.patchwork = patchwork;
        this.gone = other.gone.clone();
        this.startDepthMm = other.startDepthMm;
        this.depthMm = other.depthMm;
        this.depthLineMm = other.depthLineMm;
        this.band = other.band;
        this.lineMm = other.lineMm;
        this.timeS = other.timeS;
        this.volts = other.volts;
        this.stoodVolts = other.stoodVolts;
    }

    /** The same visit, to try something on; films that leave the bath in it stay its own, and its rows start afresh. */
    Visit copy() {
        return new Visit(this, patchwork.copy());
    }

    /** The same visit under another current limit. */
    Visit copyWithLimit(double limitAmps) {
        return new Visit(this, patchwork.copyWithLimit(limitAmps));
    }

    double lineMm() {
        return lineMm;
    }

    double timeS() {
        return timeS;
    }

    double volts() {
        return volts;
    }

    /** The volts that stood when the supply was last on: those set, or less where the current limit held them down. */
    double stoodVolts() {
        return stoodVolts;
    }

    /** The band that the line is in, or at the outer edge of. */
    int band() {
        return band;
    }

    /** Turns to the band whose outer edge the line is at. */
    void enter(int next) {
        band = next;
    }

    double amps() {
        return patchwork.growth().amps();
    }

    double terminalVolts() {
        return patchwork.growth().terminalVolts();
    }

    /** The film at the line. */
    double filmNm() {
        return patchwork.filmNm(cells.count() + band);
    }

    /** Sets the volts and lets the circuit settle, without letting time pass. */
    void settle(double newVolts) {
        volts = newVolts;
        patchwork.growth().settle(newVolts);
    }

    /** The clock shows tenths of a second. */
    static double onTheClock(double seconds) {
        return Math.rint(seconds * TICKS_PER_S) / TICKS_PER_S;
    }

    /** The first tenth of a second that is no sooner, so that the supply is never asked to hurry. */
    private static double noSoonerOnTheClock(double seconds) {
        return Math.ceil(seconds * TICKS_PER_S - 1e-6) / TICKS_PER_S;
    }

    /** Writes a row for this moment. */
    void mark(Row.Act act) {
        double travelMm = waterline.travelMm(startDepthMm, depthMm());
        rows.add(new Row(timeS, volts, lineMm, depthMm(), travelMm, filmNm(), act));
    }

    /** The depth at this moment, worked out once for each line the piece stands at. */
    private double depthMm() {
        if (depthLineMm != lineMm) {
            depthLineMm = lineMm;
            depthMm = waterline.depthMm(lineMm);
        }
        return depthMm;
    }

    /** Switches on, or changes the volts, and writes it down. */
    void raiseTo(double newVolts) {
        if (newVolts != volts) {
            mark(Row.Act.RAISE);
            raise(newVolts);
        }
    }

    /** Switches on, or changes the volts, as fast as the supply can. */
    void raise(double newVolts) {
        double raiseS = Math.abs(newVolts - volts) / outfit.supply().slewVoltsPerS();
        if (raiseS > 0) {
            goOn(noSoonerOnTheClock(raiseS), newVolts, lineMm);
        }
        volts = newVolts;
    }

    /** Lets volts and line stand for a time. */
    void hold(double durationS) {
        mark(Row.Act.HOLD);
        goOn(durationS, volts, lineMm);
    }

    /**
     * How long the present volts have to stand until the film at the line is there; leaves this visit as it is.
     *
     * @return seconds, or {@code mostS} where that is not enough
     */
    double secondsUntil(double aimNm, double mostS) {
        Patchwork ahead = patchwork.copy();
        int cell = cells.count() + band;
        double doneS = 0;
        while (doneS < mostS) {
            double stepS = ahead.growth().step(mostS - doneS, volts, 0);
            if (ahead.filmNm(cell) >= aimNm) {
                double low = 0;
                double high = 1;
                while (high - low > 1e-6) {
                    double middle = (low + high) / 2;
                    if (ahead.filmWithinStepNm(cell, middle) < aimNm) {
                        low = middle;
                    } else {
                        high = middle;
                    }
                }
                return doneS + high * stepS;
            }
            doneS += stepS;
        }
        return mostS;
    }

    /** Lets time pass while volts and line run straight to new values. */
    void goOn(double durationS, double toVolts, double toLineMm) {
        double fromVolts = volts;
        double fromLineMm = lineMm;
        double endS = onTheClock(timeS + durationS);
        double doneS = 0;
        while (doneS < durationS) {
            double nextMm = deepestLeavingAbove(toLineMm);
            double untilS =
                    nextMm == toLineMm ? durationS : durationS * (fromLineMm - nextMm) / (fromLineMm - toLineMm);
            double startVolts = fromVolts + (toVolts - fromVolts) * doneS / durationS;
            double stopVolts = fromVolts + (toVolts - fromVolts) * untilS / durationS;
            patchwork.growth().advance(untilS - doneS, startVolts, stopVolts);
            doneS = untilS;
            moveLine(nextMm);
        }
        timeS = endS;
        volts = toVolts;
        if (volts > 0) {
            stoodVolts = patchwork.growth().terminalVolts();
        }
    }

    /** The line at which the next cell leaves, or the given one where none leaves before it. */
    private double deepestLeavingAbove(double toLineMm) {
        double next = toLineMm;
        for (int cell = 0; cell < gone.length; cell++) {
            double middle = cells.middleMm(cell, down);
            if (!gone[cell] && middle > next && middle < lineMm) {
                next = middle;
            }
        }
        return next;
    }

    private void moveLine(double toLineMm) {
        lineMm = toLineMm;
        for (int cell = 0; cell < gone.length; cell++) {
            if (gone[cell]) {
                continue;
            }
            if (cells.middleMm(cell, down) >= toLineMm) {
                cells.setFilmNm(cell, patchwork.filmNm(cell));
                gone[cell] = true;
                patchwork.setWetAreaCm2(cell, 0);
            } else {
                patchwork.setWetAreaCm2(cell, cells.areaCm2(cell) * cells.wetShare(cell, down, toLineMm));
            }
        }
    }

    /** Draws the piece out to a line with the supply off. */
    void moveOff(double toLineMm) {
        if (volts > 0) {
            mark(Row.Act.OFF);
            volts = 0;
        }
        double travelMm = waterline.travelMm(depthMm(), waterline.depthMm(toLineMm));
        mark(Row.Act.WITHDRAW);
        double easyMmPerS = outfit.settings().fastestMmPerS() / 2;
        goOn(onTheClock(Math.max(SHORTEST_MOVE_S, travelMm / easyMmPerS)), 0, toLineMm);
    }

    /** Switches off and lifts the piece out. */
    void liftOut() {
        mark(Row.Act.OFF);
        volts = 0;
        mark(Row.Act.LIFT_OUT);
        double travelMm = waterline.travelMm(depthMm(), waterline.depthMm(0));
        goOn(onTheClock(Math.max(SHORTEST_MOVE_S, travelMm / outfit.settings().fastestMmPerS())), 0, 0);
        mark(Row.Act.LIFT_OUT);
    }

    /** Hand travel between two lines, in mm. */
    double travelMm(double fromLineMm, double toLineMm) {
        return waterline.travelMm(waterline.depthMm(fromLineMm), waterline.depthMm(toLineMm));
    }

    /**
     * The supply volts at which the film at the line would grow at a rate, once the line is elsewhere and the film has a
     * value to come: the law solved for volts.
     */
    double voltsForGrowth(double filmNm, double growthNmPerS, double atLineMm) {
        double filmVolts = law.filmVolts(filmNm, law.currentForGrowth(growthNmPerS));
        return filmVolts
                - law.nativeVolts()
                + outfit.bath().resistanceOhm() * ampsForGrowth(filmNm, growthNmPerS, atLineMm);
    }

    /** The current at that time. Films no thicker than the one at the line are taken to go on with it. */
    double ampsForGrowth(double filmNm, double growthNmPerS, double atLineMm) {
        double filmVolts = law.filmVolts(filmNm, law.currentForGrowth(growthNmPerS));
        double gainNm = filmNm - filmNm();
        double leadingNm = filmNm() + ALIKE_NM;
        double amps = 0;
        for (int cell = 0; cell < gone.length; cell++) {
            if (!gone[cell]) {
                double now = patchwork.filmNm(cell);
                double then = now <= leadingNm ? now + gainNm : Math.max(now, filmNm);
                double wetCm2 = cells.areaCm2(cell) * cells.wetShare(cell, down, atLineMm);
                amps += 1e-3 * wetCm2 * law.currentMilliAmpsPerCm2(filmVolts, then);
            }
        }
        return amps;
    }

    /** Hands the films of all cells that are still wet back to the piece; the visit is over. */
    Pull done(List<String> notes) {
        moveLine(0);
        return new Pull(rows, outfit.supply().maxAmps(), patchwork.growth().peakAmps(), notes);
    }
}
