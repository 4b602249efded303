package tideband.window.work;

import java.util.List;
import tideband.piece.End;

/**
 * One immersion as the field shows it when it is pointed at.
 *
 * @param immersion its index, 0-based
 * @param endDown the end that is down
 * @param gives what it gives along the piece, a polyline from end A to end B; where it gives nothing there is none
 * @param masked the masked stretches
 * @param finishes indices of the bands it finishes
 */
public record Glance(int immersion, End endDown, List<Point> gives, List<Stretch> masked, List<Integer> finishes) {

    /**
     * A point of the line.
     *
     * @param atMm position in mm from end A
     * @param filmNm film in nm
     */
    public record Point(double atMm, double filmNm) {}

    /**
     * A masked stretch.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     */
    public record Stretch(double fromMm, double toMm) {}

    /** Copies the lists, so that the value cannot change. */
    public Glance {
        gives = List.copyOf(gives);
        masked = List.copyOf(masked);
        finishes = List.copyOf(finishes);
    }
}
