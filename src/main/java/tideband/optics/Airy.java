package tideband.optics;

import org.apache.commons.math3.complex.Complex;

/**
 * One film on a substrate in air: Fresnel amplitudes and Airy's coherent sum, exact for any angle below 90° and any absorbing
 * film; equations and signs as on the package page.
 *
 * <p>This is the plain form, one wavelength and one film at a time. It is what the fast series is checked against.
 */
public final class Airy {

    private Airy() {}

    /**
     * The share of light reflected.
     *
     * @param filmIndex the film's index N1 = n + ik
     * @param substrateIndex the substrate's index N2 = n + ik
     * @param filmNm film thickness in nm, at least 0; 0 gives the bare substrate
     * @param wavelengthNm wavelength in nm, above 0
     * @param angleDegrees angle of incidence in air in degrees, 0 to below 90
     * @param polarisation s or p
     * @return reflectance R, 0 to 1
     */
    public static double reflectance(
            Complex filmIndex,
            Complex substrateIndex,
            double filmNm,
            double wavelengthNm,
            double angleDegrees,
            Polarisation polarisation) {
        requireFilm(filmNm);
        if (!(wavelengthNm > 0 && Double.isFinite(wavelengthNm))) {
            throw new IllegalArgumentException("wavelengthNm must be finite and above 0, but was " + wavelengthNm);
        }
        double sine = sine(angleDegrees);
        if (filmNm == 0) {
            return squared(boundary(Complex.ONE, substrateIndex, sine, polarisation));
        }
        Complex outer = boundary(Complex.ONE, filmIndex, sine, polarisation);
        Complex inner = boundary(filmIndex, substrateIndex, sine, polarisation);
        Complex returned = inner.multiply(phasePerNm(filmIndex, sine, wavelengthNm)
                .multiply(filmNm)
                .multiply(Complex.I)
                .exp());
        return squared(outer.add(returned).divide(outer.multiply(returned).add(1)));
    }

    /**
     * The Fresnel amplitude of a boundary.
     *
     * @param from index of the medium the light is in
     * @param to index of the medium behind the boundary
     * @param sine sin θ in air
     */
    static Complex boundary(Complex from, Complex to, double sine, Polarisation polarisation) {
        Complex qFrom = normalComponent(from, sine);
        Complex qTo = normalComponent(to, sine);
        return switch (polarisation) {
            case S -> qFrom.subtract(qTo).divide(qFrom.add(qTo));
            case P -> {
                Complex near = to.multiply(to).multiply(qFrom);
                Complex far = from.multiply(from).multiply(qTo);
                yield near.subtract(far).divide(near.add(far));
            }
        };
    }

    /** {@code 2β / d = 4π q1 / λ}: what the phase of the wave gains in the film, there and back, per nm of thickness. */
    static Complex phasePerNm(Complex filmIndex, double sine, double wavelengthNm) {
        return normalComponent(filmIndex, sine).multiply(4 * Math.PI / wavelengthNm);
    }

    /** {@code q = √(N² − sin² θ)}; N² lies in the upper half plane, so the principal root decays forwards. */
    private static Complex normalComponent(Complex index, double sine) {
        return index.multiply(index).subtract(sine * sine).sqrt();
    }

    static double squared(Complex amplitude) {
        return amplitude.getReal() * amplitude.getReal() + amplitude.getImaginary() * amplitude.getImaginary();
    }

    static double sine(double angleDegrees) {
        if (!(angleDegrees >= 0 && angleDegrees < 90)) {
            throw new IllegalArgumentException("angleDegrees must be from 0 to below 90, but was " + angleDegrees);
        }
        return Math.sin(Math.toRadians(angleDegrees));
    }

    static void requireFilm(double filmNm) {
        if (!(filmNm >= 0 && Double.isFinite(filmNm))) {
            throw new IllegalArgumentException("filmNm must be finite and at least 0, but was " + filmNm);
        }
    }
}
