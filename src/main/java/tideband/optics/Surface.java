package tideband.optics;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import tideband.colour.SpectralGrid;

/**
 * A finished metal surface looked at under an angle: what it reflects, whatever its film.
 *
 * <p>The reflectance is the mean over facets whose tilt (in the plane of incidence) and film vary as the {@link Finish} says,
 * each a Gaussian by {@value #TILTS} and {@value #FILMS} Gauss–Hermite points, with a share of it replaced by the plain
 * reflectance of the air/oxide boundary:
 *
 * <pre>
 *   R = (1 − share) · mean R_facet(θ + tilt, d (1 + spread)) + share · mean |r01(θ + tilt)|²
 * </pre>
 *
 * The scattering skin is taken to be oxide at every film, as bare metal carries its native oxide; so colour runs on
 * smoothly to film 0. A facet counts by the area it shows, the cosine of its own angle; one turned away is not seen. A
 * finish with no spread and no scatter is one exact mirror.
 */
public final class Surface {

    /** The largest viewing angle, degrees. */
    public static final double MAX_ANGLE_DEGREES = 85;

    private static final int TILTS = 7;
    private static final int FILMS = 7;

    private final FilmSystem system;
    private final Finish finish;
    private final List<Facet> facets;

    /**
     * A surface.
     *
     * @param system metal and oxide
     * @param finish how far it is from a mirror
     * @param angleDegrees viewing angle from the normal in degrees, 0 to 85
     */
    public Surface(FilmSystem system, Finish finish, double angleDegrees) {
        if (!(angleDegrees >= 0 && angleDegrees <= MAX_ANGLE_DEGREES)) {
            throw new IllegalArgumentException("viewing angle must be from 0 to " + MAX_ANGLE_DEGREES
                    + " degrees from the normal, but was " + angleDegrees);
        }
        this.system = system;
        this.finish = finish;
        this.facets = facets(system, finish, angleDegrees, TILTS, FILMS);
    }

    /**
     * The same surface seen from another side.
     *
     * @param angleDegrees viewing angle from the normal in degrees, 0 to 85
     * @return the surface at that angle
     */
    public Surface seenAt(double angleDegrees) {
        return new Surface(system, finish, angleDegrees);
    }

    /** The facets that stand for a finish, by a chosen number of points. */
    static List<Facet> facets(FilmSystem system, Finish finish, double angleDegrees, int tilts, int films) {
        Map<Double, Double> shareByAngle = new TreeMap<>();
        double seen = 0;
        for (GaussianSpread.Point tilt : GaussianSpread.points(finish.tiltDegrees(), tilts)) {
            double local = Math.abs(angleDegrees + tilt.offset());
            if (local < 90) {
                double shown = tilt.share() * Math.cos(Math.toRadians(local));
                shareByAngle.merge(local, shown, Double::sum);
                seen += shown;
            }
        }
        List<Facet> facets = new ArrayList<>();
        for (Map.Entry<Double, Double> tilt : shareByAngle.entrySet()) {
            for (GaussianSpread.Point film : GaussianSpread.points(finish.filmSpread(), films)) {
                double angle = tilt.getKey();
                double thickness = 1 + film.offset();
                double share = tilt.getValue() / seen * film.share();
                if (angle == 0) {
                    // Head-on both polarisations reflect alike.
                    facets.add(new Facet(system, angle, thickness, Polarisation.S, share));
                } else {
                    facets.add(new Facet(system, angle, thickness, Polarisation.S, share / 2));
                    facets.add(new Facet(system, angle, thickness, Polarisation.P, share / 2));
                }
            }
        }
        return List.copyOf(facets);
    }

    Finish finish() {
        return finish;
    }

    List<Facet> facets() {
        return facets;
    }

    /**
     * What the surface reflects with a film on it.
     *
     * @param filmNm mean film thickness in nm, at least 0; 0 is the bare metal
     * @return reflectance, 0 to 1, at the wavelengths of {@link SpectralGrid}
     */
    public double[] reflectance(double filmNm) {
        Airy.requireFilm(filmNm);
        double scattered = finish.scatteredShare();
        double[] re = new double[SpectralGrid.COUNT];
        double[] im = new double[SpectralGrid.COUNT];
        double[] mirrored = new double[SpectralGrid.COUNT];
        double[] sum = new double[SpectralGrid.COUNT];
        for (Facet facet : facets) {
            double[] one = facet.bare;
            if (filmNm > 0) {
                facet.seed(filmNm, re, im);
                facet.reflect(re, im, mirrored);
                one = mirrored;
            }
            for (int i = 0; i < SpectralGrid.COUNT; i++) {
                sum[i] += facet.share * ((1 - scattered) * one[i] + scattered * facet.outer[i]);
            }
        }
        return sum;
    }
}
