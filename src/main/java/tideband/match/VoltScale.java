package tideband.match;

import java.util.function.DoubleUnaryOperator;

/**
 * How film and volts belong together in a bath, for a small coupon at the end of its hold.
 *
 * @param ceilingVolts the bath's ceiling, in V
 * @param filmNmAtVolts film in nm by volts, rising
 * @param voltsForFilmNm the inverse: volts by film in nm; 0 for any film no thicker than the native one
 */
public record VoltScale(double ceilingVolts, DoubleUnaryOperator filmNmAtVolts, DoubleUnaryOperator voltsForFilmNm) {

    /** Refuses a ceiling no bath can have. */
    public VoltScale {
        if (!(ceilingVolts > 0 && Double.isFinite(ceilingVolts))) {
            throw new IllegalArgumentException("ceilingVolts must be finite and above 0, but was " + ceilingVolts);
        }
    }

    /**
     * The thickest film the bath may grow.
     *
     * @return film at the ceiling, in nm
     */
    public double ceilingNm() {
        return filmNmAtVolts.applyAsDouble(ceilingVolts);
    }

    /**
     * The volts of a film.
     *
     * @param filmNm film thickness in nm
     * @return volts in V
     */
    public double volts(double filmNm) {
        return voltsForFilmNm.applyAsDouble(filmNm);
    }
}
