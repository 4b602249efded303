package tideband.piece;

/**
 * The piece's size at one position; between stations it runs straight.
 *
 * @param atMm position in mm from end A, at least 0
 * @param sizeMm diameter (round), width (flat) or outer diameter (tube) in mm, above 0
 */
public record Station(double atMm, double sizeMm) {

    /** Refuses positions and sizes no piece has. */
    public Station {
        if (!(atMm >= 0 && Double.isFinite(atMm))) {
            throw new IllegalArgumentException("atMm must be finite and at least 0, but was " + atMm);
        }
        if (!(sizeMm > 0 && Double.isFinite(sizeMm))) {
            throw new IllegalArgumentException("sizeMm must be finite and above 0, but was " + sizeMm);
        }
        atMm += 0.0; // minus zero becomes zero
    }
}
