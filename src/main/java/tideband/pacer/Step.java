package tideband.pacer;

/**
 * A step of getting ready, to be confirmed.
 *
 * @param heading a few words, to be read from afar
 * @param text what to do, in full sentences
 */
public record Step(String heading, String text) {}
