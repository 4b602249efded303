package tideband.optics;

import java.util.Arrays;
import java.util.stream.Collectors;

/**
 * How far a surface is from one mirror: the spread of its local tilt, the spread of its film, and the share of light that its
 * skin scatters.
 *
 * <p>The spreads are estimates, no source: what a hand-prepared surface of that look is likely to have. The share follows
 * from an assumed roughness {@code σ} within a facet through the loss of the mirror-like beam, {@code 1 − exp(−(4πσ/λ)²)} at
 * 550 nm (H. E. Bennett and J. O. Porteus, J. Opt. Soc. Am. 51, 123 (1961)): 5 nm polished, 10 nm satin, 16 nm blasted.
 */
public enum Finish {
    /** One ideal mirror. */
    MIRROR("mirror", 0, 0, 0),
    /** Mechanically or electrolytically polished. */
    POLISHED("polished", 1.5, 0.005, 0.013),
    /** Brushed or finely abraded. */
    SATIN("satin", 8, 0.02, 0.051),
    /** Blasted or coarsely etched. */
    BLASTED("blasted", 18, 0.04, 0.125);

    private final String key;
    private final double tiltDegrees;
    private final double filmSpread;
    private final double scatteredShare;

    Finish(String key, double tiltDegrees, double filmSpread, double scatteredShare) {
        this.key = key;
        this.tiltDegrees = tiltDegrees;
        this.filmSpread = filmSpread;
        this.scatteredShare = scatteredShare;
    }

    /**
     * The word this finish goes by in files and on the command line.
     *
     * @return such as {@code satin}
     */
    public String key() {
        return key;
    }

    /**
     * Standard deviation of the local tilt, in the plane of incidence.
     *
     * @return angle in degrees
     */
    public double tiltDegrees() {
        return tiltDegrees;
    }

    /**
     * Standard deviation of the local film thickness.
     *
     * @return share of the mean thickness
     */
    public double filmSpread() {
        return filmSpread;
    }

    /**
     * Share of the light that the oxide's outer surface scatters before it can interfere.
     *
     * @return share, 0 to 1
     */
    public double scatteredShare() {
        return scatteredShare;
    }

    /**
     * The finish a word stands for.
     *
     * @param key such as {@code satin}
     * @return the finish
     * @throws IllegalArgumentException for any other word
     */
    public static Finish ofKey(String key) {
        for (Finish finish : values()) {
            if (finish.key.equals(key)) {
                return finish;
            }
        }
        String known = Arrays.stream(values()).map(Finish::key).collect(Collectors.joining(", "));
        throw new IllegalArgumentException("finish must be one of " + known + ", but was " + key);
    }
}
