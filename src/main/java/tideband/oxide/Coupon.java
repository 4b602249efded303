package tideband.oxide;

import org.apache.commons.math3.analysis.solvers.BracketingNthOrderBrentSolver;

/**
 * A coupon held at a voltage: the growth law between a film and the volts that give it at the end of a hold.
 *
 * <p>This is what a chart of volts means: one small patch, its own current through the bath's resistance.
 */
public final class Coupon {
    /** The area a coupon has where none is stated, in cm². */
    public static final double USUAL_CM2 = 1;

    private static final double SOLVED_NM = 1e-5;
    private static final double SOLVED_VOLTS = 1e-7;
    /** Half the first bracket, as a share of the volts: the first guess is nearer than this where nothing throttles. */
    private static final double BRACKET = 0.005;

    private static final int MOST_HOLDS = 100;
    /** Nearness to all that the limit allows at which growth counts as throttled to the end, as a share of it. */
    private static final double THROTTLED = 1e-6;

    private final Bath bath;
    private final GrowthLaw law;
    private final double limitAmps;
    private final double holdS;
    private final double areaCm2;

    /**
     * A coupon.
     *
     * @param bath the bath
     * @param limitAmps the supply's current limit, in A
     * @param holdS seconds held
     * @param areaCm2 its wet area, in cm²
     */
    public Coupon(Bath bath, double limitAmps, double holdS, double areaCm2) {
        if (!(limitAmps > 0 && holdS > 0 && areaCm2 > 0)) {
            throw new IllegalArgumentException("limitAmps, holdS and areaCm2 must be above 0, but they were "
                    + limitAmps + " A, " + holdS + " s and " + areaCm2 + " cm²");
        }
        this.bath = bath;
        this.law = new GrowthLaw(bath);
        this.limitAmps = limitAmps;
        this.holdS = holdS;
        this.areaCm2 = areaCm2;
    }

    /**
     * The film at the end of the hold.
     *
     * @param volts supply volts, at least 0
     * @return film in nm
     */
    public double filmNm(double volts) {
        Growth growth = new Growth(bath, limitAmps, new double[] {bath.nativeNm()}, new double[] {areaCm2});
        growth.advance(holdS, volts, volts);
        return growth.filmNm(0);
    }

    /**
     * The volts that give a film at the end of the hold, by bracketing the nearly straight relation.
     *
     * @param filmNm wanted film in nm
     * @return supply volts; 0 for a film no thicker than the least the supply gives once it is on (the native film and the
     *     little it gains), infinite where the current limit keeps the film out of reach at any volts
     */
    public double volts(double filmNm) {
        if (!(filmNm >= 0)) {
            throw new IllegalArgumentException("filmNm must be at least 0 nm, but was " + filmNm);
        }
        if (filmNm <= bath.nativeNm()) {
            return 0;
        }
        double mostGrowthNm = law.growthNmPerS(limitAmps / areaCm2 * 1e3) * holdS;
        if (filmNm >= bath.nativeNm() + mostGrowthNm * (1 - THROTTLED)) {
            return Double.POSITIVE_INFINITY;
        }
        return solved(filmNm);
    }

    private double solved(double filmNm) {
        double guess = Math.max(2 * SOLVED_VOLTS, guessedVolts(filmNm));
        double share = BRACKET;
        double highVolts = guess * (1 + share);
        double low = 0;
        while (filmNm(highVolts) < filmNm) {
            low = highVolts;
            share *= 2;
            highVolts *= 1 + share;
        }
        share = BRACKET;
        double lowVolts = low > 0 ? low : guess * (1 - share);
        while (filmNm(lowVolts) >= filmNm) {
            if (lowVolts == SOLVED_VOLTS) {
                return 0;
            }
            highVolts = lowVolts;
            share *= 2;
            lowVolts = Math.max(SOLVED_VOLTS, lowVolts / (1 + share));
        }
        return new BracketingNthOrderBrentSolver(0, SOLVED_VOLTS, SOLVED_NM, 2)
                .solve(MOST_HOLDS, volts -> filmNm(volts) - filmNm, lowVolts, highVolts);
    }

    /** Late in a hold at steady volts a film goes with the logarithm of time, by {@code d² / (s k V)}, about d/s, an e-fold. */
    private double guessedVolts(double filmNm) {
        double growthAtEnd = filmNm / (bath.fieldSlope() * holdS);
        double milliAmpsPerCm2 = law.currentForGrowth(growthAtEnd);
        return law.filmVolts(filmNm, milliAmpsPerCm2)
                - law.nativeVolts()
                + bath.resistanceOhm() * areaCm2 * 1e-3 * milliAmpsPerCm2;
    }
}
