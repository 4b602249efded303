package tideband.trial;

/**
 * A band after the trial, against the drawing.
 *
 * @param aSideNm film in nm: the median over the band's cells, or for a fade the A end of the line fitted through them
 * @param bSideNm the same as {@code aSideNm}, or for a fade the B end of that line
 * @param de00Median median CIEDE2000 difference of the band's cells from the drawing
 * @param de00Worst the largest, edges blurred by a waterline left out
 */
public record TrialBand(double aSideNm, double bSideNm, double de00Median, double de00Worst) {}
