package tideband.window.piece;

import java.util.List;
import tideband.optics.Finish;
import tideband.piece.Piece;

/**
 * What the picture shows, wherever it is seen from and however it is lit.
 *
 * @param piece the shape
 * @param finish the finish
 * @param upper the colours above the axis
 * @param lower the colours below it; the same strip where both halves are alike
 * @param dry the lengths that stay dry under a holder
 * @param note what must be known of the picture, in a few words; empty where it shows just what was asked for
 */
record Portrait(Piece piece, Finish finish, Strip upper, Strip lower, List<Dry> dry, String note) {

    /**
     * A length under the holder.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     */
    record Dry(double fromMm, double toMm) {}

    /** Copies the list, so that the value cannot change. */
    Portrait {
        dry = List.copyOf(dry);
    }

    /**
     * Whether the halves differ.
     *
     * @return true where wanted colours stand above predicted ones
     */
    boolean split() {
        return upper != lower;
    }
}
