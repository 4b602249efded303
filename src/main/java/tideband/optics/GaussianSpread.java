package tideband.optics;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegrator;
import org.apache.commons.math3.analysis.integration.gauss.GaussIntegratorFactory;

/** A Gaussian spread about zero as a few points with weights that sum to 1 (Gauss–Hermite quadrature). */
final class GaussianSpread {

    /**
     * A point of the spread.
     *
     * @param offset how far from the mean
     * @param share the share of the surface it stands for
     */
    record Point(double offset, double share) {}

    private GaussianSpread() {}

    /** One point for no spread, else {@code count} points. */
    static List<Point> points(double standardDeviation, int count) {
        if (standardDeviation == 0) {
            return List.of(new Point(0, 1));
        }
        GaussIntegrator rule = new GaussIntegratorFactory().hermite(count);
        List<Point> points = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            // Hermite's weight is exp(−t²): the normal variable is √2 σ t, and the weights sum to √π.
            points.add(new Point(
                    Math.sqrt(2) * standardDeviation * rule.getPoint(i), rule.getWeight(i) / Math.sqrt(Math.PI)));
        }
        return points;
    }
}
