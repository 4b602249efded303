package tideband.window.field;

/**
 * A value a hand was led to.
 *
 * @param value the value, in mm or nm
 * @param to what it was led to; empty if to nothing
 */
record Snap(double value, String to) {}
