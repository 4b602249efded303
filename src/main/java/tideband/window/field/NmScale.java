package tideband.window.field;

/**
 * Films up the field.
 *
 * @param topPx px of the thickest film shown, from the top
 * @param bottomPx px of the thinnest
 * @param fromNm the thinnest film shown, in nm
 * @param toNm the thickest film shown, in nm
 */
public record NmScale(double topPx, double bottomPx, double fromNm, double toNm) {

    /**
     * Where a film is.
     *
     * @param filmNm film in nm
     * @return px from the top
     */
    public double px(double filmNm) {
        return bottomPx - (filmNm - fromNm) * pxPerNm();
    }

    /**
     * The film at a height.
     *
     * @param yPx px from the top
     * @return film in nm; below 0 under the line of no film
     */
    public double nm(double yPx) {
        return fromNm + (bottomPx - yPx) / pxPerNm();
    }

    /**
     * How high a nanometre is.
     *
     * @return px a nm
     */
    public double pxPerNm() {
        return (bottomPx - topPx) / (toNm - fromNm);
    }
}
