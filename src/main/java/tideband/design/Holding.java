package tideband.design;

import java.util.Collections;
import java.util.EnumSet;
import java.util.Set;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Vessel;

/**
 * How the piece is held.
 *
 * @param endsDown the ends that may go down into the bath
 * @param dryMm the length under the holder that must stay dry, from the end that is up, in mm
 */
public record Holding(Set<End> endsDown, double dryMm) {

    /** What is used where a design is silent, 10 mm under the holder: common practice, no source. */
    public static final Holding USUAL = new Holding(EnumSet.allOf(End.class), 10);

    /** Copies the set in the order A, B; refuses an empty one. */
    public Holding {
        if (endsDown.isEmpty()) {
            throw new IllegalArgumentException("at least one end must be able to go down");
        }
        if (!(dryMm >= 0 && Double.isFinite(dryMm))) {
            throw new IllegalArgumentException("dryMm must be finite and at least 0, but was " + dryMm);
        }
        dryMm += 0.0; // minus zero becomes zero
        endsDown = Collections.unmodifiableSet(EnumSet.copyOf(endsDown));
    }

    /**
     * The largest size of the piece at the places that can get wet.
     *
     * @param piece a piece longer than {@link #dryMm}
     * @return size in mm
     */
    public double largestWetSizeMm(Piece piece) {
        double largest = 0;
        for (End end : endsDown) {
            double downMm = piece.fromEnd(end, 0);
            double dryEdgeMm = piece.fromEnd(end, piece.lengthMm() - dryMm);
            double here = piece.largestSizeMm(Math.min(downMm, dryEdgeMm), Math.max(downMm, dryEdgeMm));
            largest = Math.max(largest, here);
        }
        return largest;
    }

    /**
     * Whether the piece, so held, goes into a vessel upright.
     *
     * @param vessel the vessel
     * @param piece a piece longer than {@link #dryMm}
     * @return whether what can get wet is smaller across than the vessel's inside
     */
    public boolean goesInto(Vessel vessel, Piece piece) {
        double sizeMm = largestWetSizeMm(piece);
        if (!(piece.section() instanceof Section.Flat flat)) {
            return sizeMm < vessel.narrowMm();
        }
        double thickMm = Math.min(sizeMm, flat.thicknessMm());
        double broadMm = Math.max(sizeMm, flat.thicknessMm());
        return vessel instanceof Vessel.Round round
                ? Math.hypot(thickMm, broadMm) < round.boreMm()
                : thickMm < vessel.narrowMm() && broadMm < vessel.wideMm();
    }
}
