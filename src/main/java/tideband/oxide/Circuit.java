package tideband.oxide;

import java.util.Arrays;

/**
 * The electrical side of growth: patches of different film, wet together, share one supply through one resistance.
 *
 * <p>Wanted is the potential {@code p} over the films at which the current {@code I(p) = Σ A_j i(p, d_j)} satisfies
 * {@code p + R I(p) = V + d0/k}, or, where that current passes the limit, at which {@code I(p)} equals the limit. Both
 * {@code p + R I(p)} and {@code ln I(p)} are convex and rise with {@code p}, so a Newton step for either lands at or
 * above its root; taking the lower of the two steps descends without a bracket to the lower root, which is the answer.
 */
final class Circuit {
    private static final double MILLI = 1e-3;
    /** Error left in the balance of volts, in V; that of the potential is smaller. */
    private static final double SETTLED_VOLTS = 1e-7;

    private static final int MOST_STEPS = 200;
    /**
     * Growth is cut off here, a nanometre a nanosecond. Only a patch of next to no area that is far thinner than all others
     * would be given more, and would only get to where it must stop the sooner.
     */
    static final double FASTEST_NM_PER_S = 1e9;

    private final GrowthLaw law;
    private final int count;
    private final double resistanceOhm;
    private final double limitAmps;
    private final double logReferenceAmpsPerCm2;
    /** By patch, how much the logarithm of its current rises a volt: {@code s k / d}. */
    private final double[] steepness;

    private double filmVolts;
    private double amps;
    private boolean limited;

    /**
     * A circuit.
     *
     * @param bath the bath
     * @param limitAmps the supply's current limit in A
     * @param count how many patches share it
     */
    Circuit(Bath bath, double limitAmps, int count) {
        this.law = new GrowthLaw(bath);
        this.count = count;
        this.resistanceOhm = bath.resistanceOhm();
        this.limitAmps = requireLimit(limitAmps);
        this.logReferenceAmpsPerCm2 = Math.log(GrowthLaw.REFERENCE_MA_PER_CM2 * MILLI) - law.fieldSlope();
        this.steepness = new double[count];
    }

    private Circuit(Circuit other, double limitAmps) {
        this.law = other.law;
        this.count = other.count;
        this.resistanceOhm = other.resistanceOhm;
        this.limitAmps = requireLimit(limitAmps);
        this.logReferenceAmpsPerCm2 = other.logReferenceAmpsPerCm2;
        this.steepness = new double[count];
        this.filmVolts = other.filmVolts;
        this.amps = other.amps;
        this.limited = other.limited;
    }

    private static double requireLimit(double limitAmps) {
        if (!(limitAmps > 0 && limitAmps <= 1e6)) {
            throw new IllegalArgumentException("limitAmps must be above 0 to 1e6 A, but was " + limitAmps);
        }
        return limitAmps;
    }

    Circuit copy() {
        return new Circuit(this, limitAmps);
    }

    Circuit withLimit(double amps) {
        return new Circuit(this, amps);
    }

    /**
     * Settles the circuit and gives each patch its growth.
     *
     * @param volts the supply's set volts, above 0
     * @param filmNm films
     * @param areaCm2 areas; a patch of area 0 is dry, draws no current and does not grow
     * @param growthNmPerS receives the growth of each patch, and is work space until then
     */
    void settle(double volts, double[] filmNm, double[] areaCm2, double[] growthNmPerS) {
        double drive = volts + law.nativeVolts();
        double steepest = measure(filmNm, areaCm2);
        if (steepest == 0) {
            filmVolts = drive;
            amps = 0;
            limited = false;
            Arrays.fill(growthNmPerS, 0);
            return;
        }
        double logLimit = Math.log(limitAmps);
        double potential = filmVolts > 0 ? Math.min(filmVolts, drive) : drive;
        for (int step = 0; step < MOST_STEPS; step++) {
            double shift = steepest * potential;
            double sum = 0;
            double slopeSum = 0;
            double last = 0;
            double lastTerm = 0;
            for (int j = 0; j < count; j++) {
                if (areaCm2[j] == 0) {
                    continue;
                }
                if (steepness[j] != last) {
                    last = steepness[j];
                    lastTerm = Math.exp(last * potential - shift);
                }
                growthNmPerS[j] = lastTerm;
                double share = areaCm2[j] * lastTerm;
                sum += share;
                slopeSum += share * last;
            }
            double logAmps = Math.log(sum) + shift + logReferenceAmpsPerCm2;
            double logSlope = slopeSum / sum;
            double change = (logLimit - logAmps) / logSlope;
            double gain = 1;
            limited = true;
            if (logAmps <= logLimit + 1) {
                double droppedVolts = resistanceOhm * Math.exp(logAmps);
                gain += droppedVolts * logSlope;
                double byVolts = (drive - potential - droppedVolts) / gain;
                limited = change < byVolts;
                change = Math.min(change, byVolts);
            }
            potential += change;
            // Of either function the second derivative is at most steepest times the first.
            if (change * change * steepest * gain < 2 * SETTLED_VOLTS) {
                filmVolts = potential;
                amps = Math.exp(Math.min(logAmps + logSlope * change, logLimit));
                shareGrowth(areaCm2, growthNmPerS, shift, change);
                return;
            }
        }
        throw new IllegalStateException("the circuit did not settle at " + volts + " V");
    }

    /** Takes the steepness of each patch, and returns the largest among those with an area, 0 where there is none. */
    private double measure(double[] filmNm, double[] areaCm2) {
        double steepest = 0;
        for (int j = 0; j < count; j++) {
            steepness[j] = law.exponentPerVoltNm() / filmNm[j];
            if (areaCm2[j] > 0) {
                steepest = Math.max(steepest, steepness[j]);
            }
        }
        return steepest;
    }

    /** The last exponentials become growth; the last change of the potential is small enough for two terms of its series. */
    private void shareGrowth(double[] areaCm2, double[] growthNmPerS, double shift, double change) {
        double unit = law.growthNmPerS(GrowthLaw.REFERENCE_MA_PER_CM2) * Math.exp(shift - law.fieldSlope());
        for (int j = 0; j < count; j++) {
            double x = steepness[j] * change;
            double growth = areaCm2[j] > 0 ? unit * growthNmPerS[j] * (1 + x + x * x / 2) : 0;
            growthNmPerS[j] = Math.min(growth, FASTEST_NM_PER_S);
        }
    }

    /** With the supply off nothing grows. */
    void open(double[] growthNmPerS) {
        Arrays.fill(growthNmPerS, 0);
        amps = 0;
        filmVolts = 0;
        limited = false;
    }

    /** Current at the last settling, in A. */
    double amps() {
        return amps;
    }

    /** Whether it is the limit that sets the current at the last settling. */
    boolean limited() {
        return limited;
    }

    /** Potential over the films at the last settling, in V; 0 with the supply off. */
    double filmVolts() {
        return filmVolts;
    }

    /** Volts at the supply's terminals at the last settling: below the set volts while the limit holds. */
    double terminalVolts() {
        return filmVolts == 0 ? 0 : filmVolts + resistanceOhm * amps - law.nativeVolts();
    }
}
