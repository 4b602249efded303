package tideband.bench;

/**
 * A caution that applies to the plan at hand.
 *
 * @param heading a few words, to be read from afar
 * @param text what to do, in full sentences
 */
public record Caution(String heading, String text) {}
