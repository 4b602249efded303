package tideband.window.piece;

/**
 * The angle under which a place on the piece is seen.
 *
 * <p>Let the eye look along −z, so that {@code v = (0, 0, 1)} points to it, and let the piece lie along x. On a round piece of
 * half width {@code h} a place seen at the offset {@code y} from the axis has a normal turned by {@code φ} from the eye across
 * the width, {@code sin φ = y / h}, which is {@code n = (0, sin φ, cos φ)}. Tilting the piece by {@code τ} about the y axis, so that
 * end B goes back, turns the normal into
 *
 * <pre>
 *   n = (−cos φ · sin τ,  sin φ,  cos φ · cos τ)      and so      cos θ = n · v = cos φ · cos τ
 * </pre>
 *
 * A place that mirrors light to the eye takes it in under the angle it sends it out, so {@code θ} is the angle of incidence
 * too. On a flat piece {@code φ = 0} all over its face. The slant of a taper is left out. Colours are known up to
 * {@value #MOST_DEG}°; what turns farther away, the last half per cent of the width, is shown as seen at that angle.
 */
final class Incidence {
    /** The largest angle colours are computed for, in degrees. */
    static final double MOST_DEG = 85;

    private Incidence() {}

    /**
     * The angle of incidence.
     *
     * @param offsetShare offset from the axis as a share of the half width, −1 to 1
     * @param tiltDeg tilt along the length in degrees
     * @return angle in degrees, 0 to {@link #MOST_DEG}
     */
    static double angleDeg(double offsetShare, double tiltDeg) {
        double cosTurn = Math.sqrt(Math.max(0, 1 - offsetShare * offsetShare));
        double cosine = Math.min(1, cosTurn * Math.cos(Math.toRadians(tiltDeg)));
        return Math.min(MOST_DEG, Math.toDegrees(Math.acos(cosine)));
    }
}
