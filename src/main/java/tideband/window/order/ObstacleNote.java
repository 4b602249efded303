package tideband.window.order;

import java.util.OptionalInt;

/**
 * What stands in the way of making the design.
 *
 * @param band index of the band concerned, where there is one
 * @param where the band, or the design, by name
 * @param reason why it cannot be made
 * @param change the nearest change that would work
 * @param act what making that change would do, in a few words; empty where it cannot be made at a stroke
 * @param canMend whether it can
 */
public record ObstacleNote(OptionalInt band, String where, String reason, String change, String act, boolean canMend) {}
