package tideband.window.drawing;

/**
 * Which stretch of the piece is in view, and where; views that stand below each other share it.
 *
 * @param leftPx where the view's stretch begins, in px from the view's left
 * @param pxPerMm how many px a millimetre is wide, above 0
 * @param fromMm what lies there, in mm from end A
 */
public record Viewport(double leftPx, double pxPerMm, double fromMm) {

    /** Refuses a view without width. */
    public Viewport {
        if (!(pxPerMm > 0 && Double.isFinite(pxPerMm))) {
            throw new IllegalArgumentException("pxPerMm must be finite and above 0, but was " + pxPerMm);
        }
    }

    /**
     * Where a place on the piece is in the view.
     *
     * @param mm position in mm from end A
     * @return px from the view's left
     */
    public double px(double mm) {
        return leftPx + (mm - fromMm) * pxPerMm;
    }

    /**
     * What lies at a place of the view.
     *
     * @param px px from the view's left
     * @return position in mm from end A; off the piece where the view is wider
     */
    public double mm(double px) {
        return fromMm + (px - leftPx) / pxPerMm;
    }
}
