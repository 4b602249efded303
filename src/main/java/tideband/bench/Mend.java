package tideband.bench;

import tideband.design.Design;

/**
 * A change that takes an obstacle away, ready to be made.
 *
 * @param act what it does, as a request: {@code draw it at 163.4 nm}
 * @param design the whole design with the change made
 */
public record Mend(String act, Design design) {}
