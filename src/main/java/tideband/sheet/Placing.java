package tideband.sheet;

import tideband.piece.End;

/**
 * Where a piece lies on a drawing, and how large.
 *
 * @param origin end A for a piece lying down, the end that is down for one hanging
 * @param along mm of drawing for a mm along the piece
 * @param across mm of drawing for a mm across it
 * @param lie which way it lies
 * @param lengthMm length of the piece in mm
 */
record Placing(Point origin, double along, double across, Lie lie, double lengthMm) {

    /** Which way a piece lies. */
    enum Lie {
        /** Flat, end A at the left. */
        LEVEL,
        /** Hanging with end A down. */
        A_DOWN,
        /** Hanging with end B down. */
        B_DOWN;

        static Lie hanging(End down) {
            return down == End.A ? A_DOWN : B_DOWN;
        }
    }

    /**
     * A point of the piece on the drawing.
     *
     * @param atMm position from end A in mm
     * @param offMm distance from the middle line in mm
     */
    Point at(double atMm, double offMm) {
        double side = offMm * across;
        return switch (lie) {
            case LEVEL -> new Point(origin.xMm() + atMm * along, origin.yMm() + side);
            case A_DOWN -> new Point(origin.xMm() + side, origin.yMm() - atMm * along);
            case B_DOWN -> new Point(origin.xMm() + side, origin.yMm() - (lengthMm - atMm) * along);
        };
    }
}
