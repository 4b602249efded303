package tideband.sheet;

import java.util.ArrayList;
import java.util.List;

/** Finds room for labels along a line: as near as may be to what they name, in order, none over another. */
final class Labels {
    private Labels() {}

    /** Whether labels of these widths fit side by side from {@code lowMm} to {@code highMm}. */
    static boolean fit(List<Double> widthsMm, double gapMm, double lowMm, double highMm) {
        double sum = widthsMm.stream().mapToDouble(w -> w).sum();
        return sum + gapMm * (widthsMm.size() - 1) <= highMm - lowMm + 1e-9;
    }

    /**
     * Middles of labels that do not overlap. Each wish is met where there is room; labels that crowd each other are put
     * side by side about the mean of their wishes (pooled neighbours, as in isotonic regression).
     *
     * @param wishesMm wished middles, rising
     * @param widthsMm widths of the labels
     * @param gapMm least space between them
     * @param lowMm where the first may begin
     * @param highMm where the last may end
     * @return the middles, in the same order
     */
    static List<Double> spread(
            List<Double> wishesMm, List<Double> widthsMm, double gapMm, double lowMm, double highMm) {
        if (!fit(widthsMm, gapMm, lowMm, highMm)) {
            throw new IllegalArgumentException(
                    widthsMm.size() + " labels do not fit between " + lowMm + " and " + highMm + " mm");
        }
        List<Cluster> clusters = new ArrayList<>();
        for (int i = 0; i < wishesMm.size(); i++) {
            Cluster next = new Cluster(widthsMm.get(i), wishesMm.get(i) - widthsMm.get(i) / 2, 1, lowMm, highMm);
            while (!clusters.isEmpty() && clusters.get(clusters.size() - 1).reaches(next, gapMm)) {
                next = clusters.remove(clusters.size() - 1).joined(next, gapMm, lowMm, highMm);
            }
            clusters.add(next);
        }
        List<Double> middles = new ArrayList<>();
        for (Cluster cluster : clusters) {
            double at = cluster.startMm;
            for (int i = 0; i < cluster.count; i++) {
                double width = widthsMm.get(middles.size());
                middles.add(at + width / 2);
                at += width + gapMm;
            }
        }
        return List.copyOf(middles);
    }

    /** Labels side by side. */
    private static final class Cluster {
        private final double widthMm;
        private final double wishedStartMm;
        private final int count;
        private final double startMm;

        private Cluster(double widthMm, double wishedStartMm, int count, double lowMm, double highMm) {
            this.widthMm = widthMm;
            this.wishedStartMm = wishedStartMm;
            this.count = count;
            this.startMm = Math.max(lowMm, Math.min(wishedStartMm, highMm - widthMm));
        }

        private boolean reaches(Cluster next, double gapMm) {
            return startMm + widthMm + gapMm > next.startMm;
        }

        private Cluster joined(Cluster next, double gapMm, double lowMm, double highMm) {
            // Each label of the next cluster would start this much later than the joint start.
            double shifted = next.wishedStartMm - widthMm - gapMm;
            int labels = count + next.count;
            double wished = (count * wishedStartMm + next.count * shifted) / labels;
            return new Cluster(widthMm + gapMm + next.widthMm, wished, labels, lowMm, highMm);
        }
    }
}
