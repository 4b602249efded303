package tideband.edit;

import tideband.piece.End;

/** A part of the drawing that can be taken hold of. Indices count from end A, 0-based. */
public sealed interface Part {

    /**
     * The line of a whole band.
     *
     * @param band the band
     */
    record Level(int band) implements Part {}

    /**
     * One side of a fade, or of a level band that is to become one.
     *
     * @param band the band
     * @param side the side
     */
    record FadeEnd(int band, End side) implements Part {}

    /**
     * The edge between a band and the next.
     *
     * @param edge index of the band on its A side
     */
    record EdgeAt(int edge) implements Part {}

    /**
     * The band concerned; of an edge, the band on its A side.
     *
     * @return its index
     */
    default int band() {
        if (this instanceof Level level) {
            return level.band;
        }
        if (this instanceof FadeEnd end) {
            return end.band;
        }
        return ((EdgeAt) this).edge;
    }
}
