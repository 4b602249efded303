package tideband.design;

/**
 * What each act at the bench costs, in minutes.
 *
 * @param immersionMin one immersion
 * @param maskMin masking one run of neighbouring bands before the first immersion
 * @param maskOverMin masking one run after the first immersion, over fresh colour
 * @param stripMin stripping one run
 * @param turnMin turning the piece end for end
 */
public record BenchTimes(double immersionMin, double maskMin, double maskOverMin, double stripMin, double turnMin) {

    /** The usual times: common practice, no source. */
    public static final BenchTimes USUAL = new BenchTimes(4, 3, 6, 1, 1.5);

    /** Refuses negative or endless times. */
    public BenchTimes {
        double[] all = {immersionMin, maskMin, maskOverMin, stripMin, turnMin};
        for (double minutes : all) {
            if (!(minutes >= 0 && minutes <= 1e6)) {
                throw new IllegalArgumentException("bench times must be from 0 to 1000000 min, but one was " + minutes);
            }
        }
        // Minus zero becomes zero.
        immersionMin += 0.0;
        maskMin += 0.0;
        maskOverMin += 0.0;
        stripMin += 0.0;
        turnMin += 0.0;
    }
}
