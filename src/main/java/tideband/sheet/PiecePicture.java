package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.function.DoubleBinaryOperator;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;

/** Draws a piece where a placing puts it: slices of colour, its outline, hatching over masks. */
final class PiecePicture {
    /** A slice reaches this far under the next one, so that no seam shows. */
    private static final double OVERLAP_MM = 0.4;

    private static final double HATCH_MM = 2.2;

    /** Thinner than this on paper, shading lines would hide the colour. */
    private static final double SHADED_FROM_MM = 5;

    private final Piece piece;
    private final Placing placing;

    PiecePicture(Piece piece, Placing placing) {
        this.piece = piece;
        this.placing = placing;
    }

    /**
     * A stretch in one colour.
     *
     * @param fromMm where it begins, in mm from end A
     * @param toMm where it ends
     * @param hex its colour
     */
    record Slice(double fromMm, double toMm, String hex) {}

    /** Fills slices, given from end A to end B; neighbours of one colour are drawn as one. */
    void slices(Pen pen, List<Slice> slices) {
        double endMm = slices.get(slices.size() - 1).toMm();
        int first = 0;
        for (int i = 1; i <= slices.size(); i++) {
            if (i < slices.size()
                    && slices.get(i).hex().equals(slices.get(first).hex())) {
                continue;
            }
            double toMm = Math.min(endMm, slices.get(i - 1).toMm() + OVERLAP_MM / placing.along());
            pen.shape(
                    outline(slices.get(first).fromMm(), toMm, 0),
                    Ink.fill(slices.get(first).hex()));
            first = i;
        }
    }

    /** The outline of the whole piece, with thin lines that show its cross-section and leave its hues alone. */
    void frame(Pen pen) {
        if (piece.section() instanceof Section.Tube tube) {
            along(pen, (at, half) -> tube.boreMm() / 2, Ink.BLACK, 0.2, 1.2);
            along(pen, (at, half) -> -tube.boreMm() / 2, Ink.BLACK, 0.2, 1.2);
        } else if (piece.section() instanceof Section.Round && largestAcrossMm() >= SHADED_FROM_MM) {
            along(pen, (at, half) -> -half * 0.5, Ink.WHITE, 0.35, 0);
            along(pen, (at, half) -> half * 0.72, Ink.BLACK, 0.12, 0);
        }
        pen.shape(outline(0, piece.lengthMm(), 0), Ink.outline(Ink.BLACK, 0.3));
    }

    /** A mask over a stretch: white, hatched, standing proud of the metal. */
    void mask(Pen pen, double fromMm, double toMm) {
        double proudMm = 0.8 / placing.across();
        List<Double> places = places(fromMm, toMm);
        for (int i = 1; i < places.size(); i++) {
            List<Point> quad = outline(places.get(i - 1), places.get(i), proudMm);
            pen.shape(quad, Ink.fill(Ink.WHITE));
            hatch(pen, quad);
        }
        pen.shape(outline(fromMm, toMm, proudMm), Ink.outline(Ink.BLACK, 0.4));
    }

    /** The outline of a stretch, {@code proudMm} wider on both sides. */
    List<Point> outline(double fromMm, double toMm, double proudMm) {
        List<Double> places = places(fromMm, toMm);
        List<Point> corners = new ArrayList<>();
        for (double at : places) {
            corners.add(placing.at(at, -halfMm(at) - proudMm));
        }
        for (int i = places.size() - 1; i >= 0; i--) {
            corners.add(placing.at(places.get(i), halfMm(places.get(i)) + proudMm));
        }
        return corners;
    }

    /** The largest size of the piece as drawn, in mm of drawing. */
    double largestAcrossMm() {
        return piece.stations().stream().mapToDouble(Station::sizeMm).max().orElse(0) * placing.across();
    }

    private double halfMm(double atMm) {
        return piece.sizeMm(Math.min(Math.max(atMm, 0), piece.lengthMm())) / 2;
    }

    private List<Double> places(double fromMm, double toMm) {
        TreeSet<Double> places = new TreeSet<>(List.of(fromMm, toMm));
        piece.stations().stream()
                .map(Station::atMm)
                .filter(at -> at > fromMm && at < toMm)
                .forEach(places::add);
        return List.copyOf(places);
    }

    /** A line along the piece; where it runs is given by position and half size, all in mm. */
    private void along(Pen pen, DoubleBinaryOperator offMm, String hex, double widthMm, double dash) {
        List<Double> places = places(0, piece.lengthMm());
        for (int i = 1; i < places.size(); i++) {
            Point a = placing.at(places.get(i - 1), offMm.applyAsDouble(places.get(i - 1), halfMm(places.get(i - 1))));
            Point b = placing.at(places.get(i), offMm.applyAsDouble(places.get(i), halfMm(places.get(i))));
            pen.dashed(a.xMm(), a.yMm(), b.xMm(), b.yMm(), widthMm, dash, hex);
        }
    }

    /** Lines at 45 degrees across a convex polygon, in step with those of its neighbours. */
    private static void hatch(Pen pen, List<Point> convex) {
        double low = convex.stream().mapToDouble(p -> p.xMm() + p.yMm()).min().orElse(0);
        double high = convex.stream().mapToDouble(p -> p.xMm() + p.yMm()).max().orElse(0);
        for (double sum = Math.ceil(low / HATCH_MM) * HATCH_MM; sum < high; sum += HATCH_MM) {
            List<Point> cuts = new ArrayList<>();
            for (int i = 0; i < convex.size(); i++) {
                Point a = convex.get(i);
                Point b = convex.get((i + 1) % convex.size());
                double sumA = a.xMm() + a.yMm();
                double sumB = b.xMm() + b.yMm();
                if (sumA < sum != sumB < sum) {
                    double share = (sum - sumA) / (sumB - sumA);
                    cuts.add(new Point(a.xMm() + share * (b.xMm() - a.xMm()), a.yMm() + share * (b.yMm() - a.yMm())));
                }
            }
            if (cuts.size() == 2) {
                pen.dashed(
                        cuts.get(0).xMm(),
                        cuts.get(0).yMm(),
                        cuts.get(1).xMm(),
                        cuts.get(1).yMm(),
                        0.22,
                        0,
                        Ink.BLACK);
            }
        }
    }
}
