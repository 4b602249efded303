package tideband.design;

/**
 * How the piece is to be drawn out.
 *
 * @param holdS seconds a level is held once its volts stand
 * @param fade how fades are pulled
 * @param stepDe00 for stepped fades, the largest CIEDE2000 difference between neighbouring steps
 * @param slowestMmPerS slowest steady speed of the hand, in mm/s
 * @param fastestMmPerS fastest steady speed of the hand, in mm/s
 */
public record PullSettings(double holdS, FadeStyle fade, double stepDe00, double slowestMmPerS, double fastestMmPerS) {

    /** What is used where a design is silent: common practice, no source. */
    public static final PullSettings USUAL = new PullSettings(30, FadeStyle.RAMPED, 2, 0.3, 10);

    /** Refuses settings no hand or bath can follow. */
    public PullSettings {
        if (!(holdS >= 1 && holdS <= 36_000)) {
            throw new IllegalArgumentException("holdS must be from 1 to 36000 s, but was " + holdS);
        }
        if (!(stepDe00 >= 0.2 && stepDe00 <= 50)) {
            throw new IllegalArgumentException("stepDe00 must be from 0.2 to 50, but was " + stepDe00);
        }
        if (!(slowestMmPerS > 0 && fastestMmPerS > slowestMmPerS && fastestMmPerS <= 1000)) {
            throw new IllegalArgumentException(
                    "the slowest speed must be above 0 and the fastest above it, at most 1000" + " mm/s, but they were "
                            + slowestMmPerS + " and " + fastestMmPerS);
        }
    }

    /**
     * The same settings with another hold.
     *
     * @param seconds seconds a level is held, 1 to 36000
     * @return the changed settings
     */
    public PullSettings withHoldS(double seconds) {
        return new PullSettings(seconds, fade, stepDe00, slowestMmPerS, fastestMmPerS);
    }
}
