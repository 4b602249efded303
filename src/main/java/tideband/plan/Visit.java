package tideband.plan;

import tideband.piece.End;

/**
 * An immersion in short.
 *
 * @param masked the masked bands, as bits
 * @param end the {@link #index} of the end that is down
 */
record Visit(long masked, int end) {

    /** 0 for end A, 1 for end B: the searches keep tables by end. */
    static int index(End end) {
        return end == End.A ? 0 : 1;
    }

    End endDown() {
        return end == 0 ? End.A : End.B;
    }
}
