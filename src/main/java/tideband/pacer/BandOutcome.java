package tideband.pacer;

/**
 * What an interruption means for a band that the immersion finishes.
 *
 * @param band its index, 0-based
 * @param name its number and name
 * @param doneAtS when its film is complete, in s since the pull began
 * @param done whether it was complete when the run was broken off
 * @param repeatGainNm film that it would end up with beyond the plan's, if the immersion were repeated from its start, in nm; the
 *     worse of its two sides
 * @param repeatGainShare the same as a share of the plan's film
 */
public record BandOutcome(
        int band, String name, double doneAtS, boolean done, double repeatGainNm, double repeatGainShare) {}
