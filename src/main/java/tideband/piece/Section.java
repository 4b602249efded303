package tideband.piece;

/**
 * The kind of cross-section a piece has, and the mensuration that goes with it.
 *
 * <p>A span is the stretch between two positions over which the size runs straight from one value to another. Its side
 * is what the bath touches apart from end faces. Formulas for the frustum of a cone: A. D. Polyanin and A. V. Manzhirov,
 * Handbook of Mathematics for Engineers and Scientists (Chapman &amp; Hall/CRC, 2007), section 3.2.
 */
public sealed interface Section {

    /**
     * The outline of the cross-section, outside only.
     *
     * @param sizeMm the size in mm
     * @return its length in mm
     */
    double perimeterMm(double sizeMm);

    /**
     * The area inside the outline, a tube's bore included: what the piece takes up across, seen from outside.
     *
     * @param sizeMm the size in mm
     * @return the area in mm²
     */
    double outlineAreaMm2(double sizeMm);

    /**
     * The area of metal in the cross-section, a tube's bore left out.
     *
     * @param sizeMm the size in mm
     * @return the area in mm²
     */
    double metalAreaMm2(double sizeMm);

    /**
     * The side surface of a span, slant and bore included, end faces left out.
     *
     * @param fromSizeMm size where the span begins, in mm
     * @param toSizeMm size where it ends, in mm
     * @param lengthMm its length along the axis, in mm
     * @return the area in mm²
     */
    double sideAreaMm2(double fromSizeMm, double toSizeMm, double lengthMm);

    /**
     * The metal in a span.
     *
     * @param fromSizeMm size where the span begins, in mm
     * @param toSizeMm size where it ends, in mm
     * @param lengthMm its length along the axis, in mm
     * @return the volume in mm³
     */
    double volumeMm3(double fromSizeMm, double toSizeMm, double lengthMm);

    /** Solid round; size is the diameter. */
    record Round() implements Section {

        @Override
        public double perimeterMm(double sizeMm) {
            return Math.PI * sizeMm;
        }

        @Override
        public double outlineAreaMm2(double sizeMm) {
            return Math.PI / 4 * sizeMm * sizeMm;
        }

        @Override
        public double metalAreaMm2(double sizeMm) {
            return outlineAreaMm2(sizeMm);
        }

        /** Frustum of a cone: {@code π (r1 + r2) · slant}. */
        @Override
        public double sideAreaMm2(double fromSizeMm, double toSizeMm, double lengthMm) {
            double slantMm = Math.hypot(lengthMm, (toSizeMm - fromSizeMm) / 2);
            return Math.PI / 2 * (fromSizeMm + toSizeMm) * slantMm;
        }

        /** Frustum of a cone: {@code π h (r1² + r1 r2 + r2²) / 3}. */
        @Override
        public double volumeMm3(double fromSizeMm, double toSizeMm, double lengthMm) {
            double squares = fromSizeMm * fromSizeMm + fromSizeMm * toSizeMm + toSizeMm * toSizeMm;
            return Math.PI / 12 * lengthMm * squares;
        }
    }

    /**
     * Flat; size is the width, which tapers evenly to both sides of the axis.
     *
     * @param thicknessMm thickness in mm, above 0
     */
    record Flat(double thicknessMm) implements Section {

        // Refuses thicknesses no strip has.
        public Flat {
            if (!(thicknessMm > 0 && Double.isFinite(thicknessMm))) {
                throw new IllegalArgumentException("thicknessMm must be finite and above 0, but was " + thicknessMm);
            }
        }

        @Override
        public double perimeterMm(double sizeMm) {
            return 2 * (sizeMm + thicknessMm);
        }

        @Override
        public double outlineAreaMm2(double sizeMm) {
            return sizeMm * thicknessMm;
        }

        @Override
        public double metalAreaMm2(double sizeMm) {
            return outlineAreaMm2(sizeMm);
        }

        /** Two faces, each a trapezium, and two edges as long as the slant. */
        @Override
        public double sideAreaMm2(double fromSizeMm, double toSizeMm, double lengthMm) {
            double slantMm = Math.hypot(lengthMm, (toSizeMm - fromSizeMm) / 2);
            return (fromSizeMm + toSizeMm) * lengthMm + 2 * thicknessMm * slantMm;
        }

        @Override
        public double volumeMm3(double fromSizeMm, double toSizeMm, double lengthMm) {
            return (fromSizeMm + toSizeMm) / 2 * lengthMm * thicknessMm;
        }
    }

    /**
     * A tube, open and so wet inside; size is the outer diameter.
     *
     * @param boreMm inner diameter in mm, above 0, the same all along
     */
    record Tube(double boreMm) implements Section {

        private static final Round ROUND = new Round();

        // Refuses bores no tube has.
        public Tube {
            if (!(boreMm > 0 && Double.isFinite(boreMm))) {
                throw new IllegalArgumentException("boreMm must be finite and above 0, but was " + boreMm);
            }
        }

        @Override
        public double perimeterMm(double sizeMm) {
            return ROUND.perimeterMm(sizeMm);
        }

        @Override
        public double outlineAreaMm2(double sizeMm) {
            return ROUND.outlineAreaMm2(sizeMm);
        }

        @Override
        public double metalAreaMm2(double sizeMm) {
            return ROUND.outlineAreaMm2(sizeMm) - ROUND.outlineAreaMm2(boreMm);
        }

        @Override
        public double sideAreaMm2(double fromSizeMm, double toSizeMm, double lengthMm) {
            return ROUND.sideAreaMm2(fromSizeMm, toSizeMm, lengthMm) + ROUND.sideAreaMm2(boreMm, boreMm, lengthMm);
        }

        @Override
        public double volumeMm3(double fromSizeMm, double toSizeMm, double lengthMm) {
            return ROUND.volumeMm3(fromSizeMm, toSizeMm, lengthMm) - ROUND.volumeMm3(boreMm, boreMm, lengthMm);
        }
    }
}
