package tideband.oxide;

/**
 * The power supply.
 *
 * @param maxVolts highest volts it gives
 * @param maxAmps current limit: it holds its set volts up to here, then it holds this current
 * @param dialVolts smallest step of its dial, in V
 * @param slewVoltsPerS fastest change of its volts, in V/s; infinite where it jumps
 */
public record Supply(double maxVolts, double maxAmps, double dialVolts, double slewVoltsPerS) {

    /** What is used where a design is silent: common practice, no source. */
    public static final Supply USUAL = new Supply(120, 2, 0.1, Double.POSITIVE_INFINITY);

    /** Refuses values no supply can have. */
    public Supply {
        if (!(maxVolts > 0 && maxAmps > 0 && dialVolts > 0 && slewVoltsPerS > 0)) {
            throw new IllegalArgumentException("a supply's volts, amps, dial step and slew must be above 0");
        }
    }

    /**
     * The nearest setting of the dial.
     *
     * @param volts wanted volts, at least 0
     * @return the nearest whole number of dial steps, in V
     */
    public double dialled(double volts) {
        return cleaned(Math.rint(volts / dialVolts) * dialVolts);
    }

    /**
     * The lowest setting of the dial that is no less than wanted.
     *
     * @param volts wanted volts, at least 0
     * @return a whole number of dial steps, in V
     */
    public double dialledUp(double volts) {
        return cleaned(Math.ceil(volts / dialVolts - 1e-9) * dialVolts);
    }

    /**
     * The highest setting of the dial that passes neither its own end nor a ceiling.
     *
     * @param ceilingVolts volts not to be passed
     * @return a whole number of dial steps, in V
     */
    public double highestVolts(double ceilingVolts) {
        double most = Math.min(ceilingVolts, maxVolts);
        return cleaned(Math.floor(most / dialVolts + 1e-9) * dialVolts);
    }

    /** Takes away what binary fractions add: 908 steps of 0.1 V are 90.8 V. */
    private static double cleaned(double volts) {
        return Math.rint(volts * 1e6) / 1e6;
    }
}
