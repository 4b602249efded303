package tideband.pacer;

import tideband.pull.Row;
import tideband.sheet.HandMark;

/**
 * What happens from one mark to the next.
 *
 * @param from the state once everything due at the mark is done
 * @param to the state on arrival at the next mark, before anything is done there
 */
record Stretch(Row from, Row to) {

    double lastsS() {
        return to.timeS() - from.timeS();
    }

    /** Whether there are volts in it. */
    boolean live() {
        return from.volts() > 0 || to.volts() > 0;
    }

    /** Whether the piece is drawn out along a drawn fade, where film goes with the line. */
    boolean drawnLive() {
        return live() && to.lineMm() < from.lineMm();
    }

    static Stretch between(HandMark mark, Row arrival) {
        return new Stretch(mark.row(), arrival);
    }

    double share(double timeS) {
        return lastsS() > 0 ? Math.max(0, Math.min(1, (timeS - from.timeS()) / lastsS())) : 0;
    }

    /** The share at which the line stands somewhere; for a stretch that is drawn. */
    double shareAtLine(double lineMm) {
        return (from.lineMm() - lineMm) / (from.lineMm() - to.lineMm());
    }

    static double between(double from, double to, double share) {
        return share == 1 ? to : from + share * (to - from);
    }
}
