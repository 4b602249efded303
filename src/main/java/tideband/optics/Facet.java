package tideband.optics;

import org.apache.commons.math3.complex.Complex;
import tideband.colour.SpectralGrid;

/**
 * One small mirror of a surface, in one polarisation: Airy's constants at every wavelength of {@link SpectralGrid}.
 *
 * <p>With {@code A = r01} and {@code G = r12 e^{2iβ}} the reflectance in real numbers is
 *
 * <pre>
 *   R = (|A|² + |G|² + 2 Re(A* G)) / (1 + |A|² |G|² + 2 Re(A G))
 * </pre>
 *
 * and {@code G} is the only part that changes with the film.
 */
final class Facet {

    final double share;
    final double[] outerRe = new double[SpectralGrid.COUNT];
    final double[] outerIm = new double[SpectralGrid.COUNT];
    /** |r01|²: what the air/oxide boundary reflects alone. */
    final double[] outer = new double[SpectralGrid.COUNT];
    /** |r02|²: what the bare metal reflects. */
    final double[] bare = new double[SpectralGrid.COUNT];

    private final double[] innerRe = new double[SpectralGrid.COUNT];
    private final double[] innerIm = new double[SpectralGrid.COUNT];
    private final double[] phasePerNm = new double[SpectralGrid.COUNT];
    private final double[] decayPerNm = new double[SpectralGrid.COUNT];

    /**
     * A facet.
     *
     * @param angleDegrees its own angle of incidence
     * @param thickness its film as a factor on the mean film
     * @param share the share of the surface it stands for
     */
    Facet(FilmSystem system, double angleDegrees, double thickness, Polarisation polarisation, double share) {
        this.share = share;
        double sine = Airy.sine(angleDegrees);
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double nm = SpectralGrid.wavelengthNm(i);
            Complex film = system.filmIndex(nm);
            Complex metal = system.metalIndex(nm);
            Complex r01 = Airy.boundary(Complex.ONE, film, sine, polarisation);
            Complex r12 = Airy.boundary(film, metal, sine, polarisation);
            Complex phase = Airy.phasePerNm(film, sine, nm).multiply(thickness);
            outerRe[i] = r01.getReal();
            outerIm[i] = r01.getImaginary();
            outer[i] = Airy.squared(r01);
            bare[i] = Airy.squared(Airy.boundary(Complex.ONE, metal, sine, polarisation));
            innerRe[i] = r12.getReal();
            innerIm[i] = r12.getImaginary();
            phasePerNm[i] = phase.getReal();
            decayPerNm[i] = phase.getImaginary();
        }
    }

    /** Sets {@code re + i·im} to G of a film. */
    void seed(double filmNm, double[] re, double[] im) {
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double left = Math.exp(-decayPerNm[i] * filmNm);
            double cos = left * Math.cos(phasePerNm[i] * filmNm);
            double sin = left * Math.sin(phasePerNm[i] * filmNm);
            re[i] = innerRe[i] * cos - innerIm[i] * sin;
            im[i] = innerRe[i] * sin + innerIm[i] * cos;
        }
    }

    /** Sets {@code re + i·im} to the factor that takes G from one film to the film {@code stepNm} thicker. */
    void rotation(double stepNm, double[] re, double[] im) {
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double left = Math.exp(-decayPerNm[i] * stepNm);
            re[i] = left * Math.cos(phasePerNm[i] * stepNm);
            im[i] = left * Math.sin(phasePerNm[i] * stepNm);
        }
    }

    /** Sets {@code reflected} to R for G; written so that the compiler can use vector instructions. */
    void reflect(double[] re, double[] im, double[] reflected) {
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double returned = re[i] * re[i] + im[i] * im[i];
            double real = outerRe[i] * re[i];
            double imaginary = outerIm[i] * im[i];
            reflected[i] =
                    (outer[i] + returned + 2 * (real + imaginary)) / (1 + outer[i] * returned + 2 * (real - imaginary));
        }
    }
}
