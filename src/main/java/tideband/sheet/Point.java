package tideband.sheet;

/**
 * A place on a drawing.
 *
 * @param xMm to the right, in mm
 * @param yMm down, in mm
 */
record Point(double xMm, double yMm) {}
