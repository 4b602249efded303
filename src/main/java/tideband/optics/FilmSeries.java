package tideband.optics;

import java.util.ArrayList;
import java.util.List;
import tideband.colour.SpectralGrid;
import tideband.colour.Viewing;
import tideband.colour.Xyz;

/**
 * The tristimulus values of many evenly spaced films at once.
 *
 * <p>From one film to the next the wave that comes back from the metal turns and fades by a fixed complex factor at each
 * wavelength, so a multiplication replaces sine, cosine and exponential. Each multiplication may add about 2e-16 of error;
 * after {@value #RESEED_EVERY} films the wave is computed afresh, which keeps reflectances within 1e-12 of the plain kernel.
 */
public final class FilmSeries {

    private static final int RESEED_EVERY = 128;

    private FilmSeries() {}

    /**
     * The colours of the films 0, step, 2·step …
     *
     * @param surface the surface they grow on
     * @param viewing how they are looked at
     * @param stepNm interval of film thickness in nm, above 0
     * @param count how many films, at least 1
     * @return {@code count} tristimulus values, thinnest film first
     */
    public static List<Xyz> colours(Surface surface, Viewing viewing, double stepNm, int count) {
        if (!(stepNm > 0 && Double.isFinite(stepNm))) {
            throw new IllegalArgumentException("stepNm must be finite and above 0, but was " + stepNm);
        }
        if (count < 1) {
            throw new IllegalArgumentException("count must be at least 1, but was " + count);
        }
        Sums sums = new Sums(viewing, count);
        double scattered = surface.finish().scatteredShare();
        for (Facet facet : surface.facets()) {
            addFilms(facet, stepNm, facet.share * (1 - scattered), sums);
            sums.addToAll(facet.outer, facet.share * scattered);
        }
        return sums.list();
    }

    private static void addFilms(Facet facet, double stepNm, double share, Sums sums) {
        double[] re = new double[SpectralGrid.COUNT];
        double[] im = new double[SpectralGrid.COUNT];
        double[] turnRe = new double[SpectralGrid.COUNT];
        double[] turnIm = new double[SpectralGrid.COUNT];
        double[] reflected = new double[SpectralGrid.COUNT];
        facet.rotation(stepNm, turnRe, turnIm);
        sums.add(0, facet.bare, share);
        for (int film = 1; film < sums.count; film++) {
            if (film % RESEED_EVERY == 1) {
                facet.seed(film * stepNm, re, im);
            } else {
                turn(re, im, turnRe, turnIm);
            }
            facet.reflect(re, im, reflected);
            sums.add(film, reflected, share);
        }
    }

    private static void turn(double[] re, double[] im, double[] turnRe, double[] turnIm) {
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double real = re[i] * turnRe[i] - im[i] * turnIm[i];
            im[i] = re[i] * turnIm[i] + im[i] * turnRe[i];
            re[i] = real;
        }
    }

    /** X, Y and Z of every film, added up facet by facet. */
    private static final class Sums {

        final int count;
        private final double[] weightsX;
        private final double[] weightsY;
        private final double[] weightsZ;
        private final double[] x;
        private final double[] y;
        private final double[] z;

        Sums(Viewing viewing, int count) {
            this.count = count;
            weightsX = viewing.weightsX();
            weightsY = viewing.weightsY();
            weightsZ = viewing.weightsZ();
            x = new double[count];
            y = new double[count];
            z = new double[count];
        }

        void add(int film, double[] reflected, double share) {
            double sumX = 0;
            double sumY = 0;
            double sumZ = 0;
            for (int i = 0; i < SpectralGrid.COUNT; i++) {
                sumX += weightsX[i] * reflected[i];
                sumY += weightsY[i] * reflected[i];
                sumZ += weightsZ[i] * reflected[i];
            }
            x[film] += share * sumX;
            y[film] += share * sumY;
            z[film] += share * sumZ;
        }

        void addToAll(double[] reflected, double share) {
            if (share > 0) {
                for (int film = 0; film < count; film++) {
                    add(film, reflected, share);
                }
            }
        }

        List<Xyz> list() {
            List<Xyz> list = new ArrayList<>(count);
            for (int film = 0; film < count; film++) {
                list.add(new Xyz(x[film], y[film], z[film]));
            }
            return list;
        }
    }
}
