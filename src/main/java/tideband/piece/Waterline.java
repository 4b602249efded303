package tideband.piece;

import java.util.Optional;

/**
 * The line the liquid draws round a piece held upright with one end down, and what gauge and hand must do to put it
 * somewhere.
 *
 * <p>Lengths are in mm from the end that is down. The <em>line</em> is where the liquid's edge touches the piece; the
 * <em>depth</em> is how far the end is below the flat level, which is less by the rise of the meniscus at the line.
 * Lines are taken as those of a fully wetted surface (contact angle 0): a clean piece that is drawn out stays wet above.
 *
 * @param piece the piece
 * @param down the end that is down
 * @param vessel the vessel, where it is narrow enough to matter
 */
public record Waterline(Piece piece, End down, Optional<Vessel> vessel) {

    /** Contact angle that depth marks are worked out for, in degrees: a wetted surface being drawn out. */
    public static final double WETTED_ANGLE_DEG = 0;

    /** Contact angle that clean oxide stays below, in degrees; recalled from the literature, not looked up. */
    public static final double CLEAN_OXIDE_ANGLE_DEG = 20;

    /**
     * The depth that puts the line where it is wanted.
     *
     * @param lineMm the line in mm from the end that is down, 0 to the length
     * @return depth of that end below the flat level in mm; below 0 near the end, where the meniscus still holds on
     *     although the end is already above the level
     */
    public double depthMm(double lineMm) {
        return lineMm - Meniscus.riseMm(piece, piece.fromEnd(down, lineMm), WETTED_ANGLE_DEG);
    }

    /**
     * How far the line may lie from where it is expected, because the piece may be less than fully wet: half the
     * difference of the rise at 0 and at 20 degrees.
     *
     * @param lineMm the line in mm from the end that is down, 0 to the length
     * @return half the width of the blurred stretch in mm
     */
    public double blurMm(double lineMm) {
        return Meniscus.blurMm(piece, piece.fromEnd(down, lineMm));
    }

    /**
     * How far the hand moves up between two depths.
     *
     * @param fromDepthMm depth before, in mm, at most the length
     * @param toDepthMm depth after
     * @return travel in mm, positive upwards: the difference of the depths, less what the level sinks in the vessel
     */
    public double travelMm(double fromDepthMm, double toDepthMm) {
        return vessel.map(v -> v.travelMm(piece, down, fromDepthMm, toDepthMm)).orElse(fromDepthMm - toDepthMm);
    }
}
