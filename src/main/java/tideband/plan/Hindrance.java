package tideband.plan;

import java.util.List;
import java.util.OptionalInt;

/**
 * Why a drawing cannot be made, and the nearest change that would help.
 *
 * @param band index of the band that cannot be finished, counted from end A, 0-based
 * @param reason why, in plain words
 * @param remedy the changes in plain words
 * @param changes the changes, nearest first; any one of them lets the band be finished
 */
public record Hindrance(OptionalInt band, String reason, String remedy, List<Change> changes) {

    /** Copies the list, so that the value cannot change. */
    public Hindrance {
        changes = List.copyOf(changes);
    }
}
