package tideband.window.order;

import java.util.List;
import tideband.piece.End;
import tideband.window.work.Glance;

/**
 * What the small picture of an act shows.
 *
 * @param down the end that is down
 * @param tints the colours reached once it is done, from end A to end B
 * @param masked the stretches masked once it is done
 * @param touched the stretches masked or stripped by it
 * @param fromLineMm where the waterline stands before, in mm from the end that is down; 0 when the piece is out
 * @param toLineMm where it stands after
 */
public record BenchPicture(
        End down,
        List<Tint> tints,
        List<Glance.Stretch> masked,
        List<Glance.Stretch> touched,
        double fromLineMm,
        double toLineMm) {

    /**
     * The colour of a stretch.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     * @param hex its colour as {@code #rrggbb}
     */
    public record Tint(double fromMm, double toMm, String hex) {}

    /** Copies the lists, so that the value cannot change. */
    public BenchPicture {
        tints = List.copyOf(tints);
        masked = List.copyOf(masked);
        touched = List.copyOf(touched);
    }
}
