package tideband.oxide;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;

/**
 * Growth computed another way, to check {@link Growth} by: the law typed again from its formulas, the circuit solved by
 * Brent's method on logarithms, time integrated by Commons Math's Dormand-Prince 8(5,3) at a tolerance of 1e-9 nm.
 */
final class ReferenceGrowth implements FirstOrderDifferentialEquations {
    private final Bath bath;
    private final double limitAmps;
    private final double[] areaCm2;
    private final DoubleUnaryOperator volts;

    ReferenceGrowth(Bath bath, double limitAmps, double[] areaCm2, DoubleUnaryOperator volts) {
        this.bath = bath;
        this.limitAmps = limitAmps;
        this.areaCm2 = areaCm2.clone();
        this.volts = volts;
    }

    /** The films after a time. */
    double[] after(double[] filmNm, double fromS, double toS) {
        double[] films = filmNm.clone();
        new DormandPrince853Integrator(1e-12, 1, 1e-9, 1e-10).integrate(this, fromS, filmNm, toS, films);
        return films;
    }

    @Override
    public int getDimension() {
        return areaCm2.length;
    }

    @Override
    public void computeDerivatives(double timeS, double[] filmNm, double[] growthNmPerS) {
        double potential = filmVolts(volts.applyAsDouble(timeS), filmNm);
        double faraday = 1e4
                * molarMass()
                / ((bath.metal() == Metal.NIOBIUM || bath.metal() == Metal.TANTALUM ? 10 : 4)
                        * 96_485.332_12
                        * density());
        for (int j = 0; j < filmNm.length; j++) {
            growthNmPerS[j] =
                    areaCm2[j] == 0 ? 0 : bath.efficiency() * faraday * Math.exp(logMilliAmps(potential, filmNm[j]));
        }
    }

    private double molarMass() {
        return switch (bath.metal()) {
            case TITANIUM, TI_6AL_4V -> 79.866;
            case NIOBIUM -> 265.81;
            case TANTALUM -> 441.893;
        };
    }

    private double density() {
        return switch (bath.metal()) {
            case TITANIUM, TI_6AL_4V -> 3.8;
            case NIOBIUM -> 4.6;
            case TANTALUM -> 8.0;
        };
    }

    private double logMilliAmps(double potential, double filmNm) {
        return Math.log(0.1) + bath.fieldSlope() * (bath.nmPerVolt() * potential / filmNm - 1);
    }

    /** The logarithm of the current in A, by adding up shares of the largest. */
    double logAmps(double potential, double[] filmNm) {
        double largest = Double.NEGATIVE_INFINITY;
        for (int j = 0; j < filmNm.length; j++) {
            if (areaCm2[j] > 0) {
                largest = Math.max(largest, logMilliAmps(potential, filmNm[j]) + Math.log(areaCm2[j] * 1e-3));
            }
        }
        double shares = 0;
        for (int j = 0; j < filmNm.length; j++) {
            if (areaCm2[j] > 0) {
                shares += Math.exp(logMilliAmps(potential, filmNm[j]) + Math.log(areaCm2[j] * 1e-3) - largest);
            }
        }
        return largest + Math.log(shares);
    }

    /** The potential over the films: the lower of what the supply's volts and what its limit allow. */
    double filmVolts(double supplyVolts, double[] filmNm) {
        double drive = supplyVolts + bath.nativeNm() / bath.nmPerVolt();
        double byVolts = bath.resistanceOhm() == 0
                ? drive
                : root(p -> logAmps(p, filmNm) - Math.log((drive - p) / bath.resistanceOhm()), drive * (1 - 1e-15));
        if (logAmps(byVolts, filmNm) <= Math.log(limitAmps)) {
            return byVolts;
        }
        return root(p -> logAmps(p, filmNm) - Math.log(limitAmps), byVolts);
    }

    /** All of a hundredth of the drive's order must be resolved: the exponents multiply an error by tens. */
    private static double root(UnivariateFunction rising, double high) {
        return rising.value(high) <= 0 ? high : new BrentSolver(1e-16, 1e-14, 1e-15).solve(1000, rising, 0, high);
    }
}
