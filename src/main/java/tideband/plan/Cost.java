package tideband.plan;

/**
 * Bench cost, itemised: how many of each act, and the minutes they sum to.
 *
 * @param immersions number of immersions
 * @param runsMaskedFirst runs masked before the first immersion
 * @param runsMaskedOver runs masked after it
 * @param runsStripped runs stripped, those at the end included
 * @param turns times the piece is turned end for end
 * @param maskedLengthMm length of all runs masked, each time it is masked, in mm
 * @param minutes the sum in minutes
 */
public record Cost(
        int immersions,
        int runsMaskedFirst,
        int runsMaskedOver,
        int runsStripped,
        int turns,
        double maskedLengthMm,
        double minutes) {}
