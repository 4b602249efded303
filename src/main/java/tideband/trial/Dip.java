package tideband.trial;

import java.util.List;
import tideband.piece.End;
import tideband.pull.Pull;

/**
 * One immersion as the bench sees it: which end is down, what is covered, and the pull.
 *
 * @param down the end that is down
 * @param covers the masked stretches of the piece
 * @param pull depth and volts against time
 */
public record Dip(End down, List<Cover> covers, Pull pull) {

    /** Copies the list, so that the value cannot change. */
    public Dip {
        covers = List.copyOf(covers);
    }

    /**
     * A masked stretch.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     */
    public record Cover(double fromMm, double toMm) {}
}
