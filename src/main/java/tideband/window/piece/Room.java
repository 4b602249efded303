package tideband.window.piece;

/**
 * How the height of the picture is shared out, in px from its top.
 *
 * @param topPx where the room for the piece begins; above it stands a line of text
 * @param bottomPx where it ends
 * @param graphTopPx where the graph of differences begins
 * @param graphBottomPx where it ends; the same where none is shown
 */
record Room(double topPx, double bottomPx, double graphTopPx, double graphBottomPx) {
    private static final double LINE_EMS = 1.35;
    private static final double GRAPH_EMS = 3.2;
    private static final double GAP_EMS = 0.45;

    /**
     * Shares a height out.
     *
     * @param heightPx the height
     * @param emPx the height of text
     * @param split whether a line of text stands below the piece too
     * @param graph whether there is a graph
     * @return the room
     */
    static Room in(double heightPx, double emPx, boolean split, boolean graph) {
        double top = (LINE_EMS + GAP_EMS) * emPx;
        double below = (split ? LINE_EMS + GAP_EMS : GAP_EMS) * emPx;
        double graphTop = heightPx - (graph ? GRAPH_EMS * emPx : 0);
        double bottom = Math.max(top + emPx, graphTop - below);
        return new Room(top, bottom, graphTop, heightPx);
    }

    /**
     * The height the piece may have.
     *
     * @return height in px
     */
    double heightPx() {
        return bottomPx - topPx;
    }

    /**
     * Where the piece's axis lies.
     *
     * @return px from the top
     */
    double centrePx() {
        return Math.rint((topPx + bottomPx) / 2);
    }
}
