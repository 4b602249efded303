package tideband.piece;

/** An end of the piece; positions run from A (0 mm) to B (the length). */
public enum End {
    /** The end at 0 mm. */
    A,
    /** The end at the piece's length. */
    B;

    /**
     * The other end.
     *
     * @return B for A, A for B
     */
    public End other() {
        return this == A ? B : A;
    }
}
