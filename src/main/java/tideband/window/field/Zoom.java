package tideband.window.field;

import tideband.window.drawing.Viewport;

/**
 * How much of the drawing is looked at.
 *
 * @param along how many times longer than the whole piece in view, 1 to {@link #MOST}
 * @param fromMm what is at the left, in mm from end A
 * @param up how many times higher than all films in view, 1 to {@link #MOST}
 * @param fromNm what is at the bottom, in nm
 */
record Zoom(double along, double fromMm, double up, double fromNm) {
    static final double MOST = 50;
    static final Zoom WHOLE = new Zoom(1, 0, 1, 0);

    Viewport viewport(FieldArea area, double lengthMm) {
        return new Viewport(area.leftPx(), (area.rightPx() - area.leftPx()) / lengthMm * along, fromMm);
    }

    NmScale scale(FieldArea area, double mostNm) {
        return new NmScale(area.topPx(), area.bottomPx(), fromNm, fromNm + mostNm / up);
    }

    Zoom along(double factor, double aboutMm, double lengthMm) {
        double next = Math.min(Math.max(along * factor, 1), MOST);
        return new Zoom(next, aboutMm - (aboutMm - fromMm) * along / next, up, fromNm).within(lengthMm, Double.NaN);
    }

    Zoom up(double factor, double aboutNm, double mostNm) {
        double next = Math.min(Math.max(up * factor, 1), MOST);
        return new Zoom(along, fromMm, next, aboutNm - (aboutNm - fromNm) * up / next).within(Double.NaN, mostNm);
    }

    Zoom moved(double byMm, double byNm, double lengthMm, double mostNm) {
        return new Zoom(along, fromMm + byMm, up, fromNm + byNm).within(lengthMm, mostNm);
    }

    /** The same, but not beyond the ends; what is NaN is left as it is. */
    Zoom within(double lengthMm, double mostNm) {
        double mm = Double.isNaN(lengthMm) ? fromMm : Math.min(Math.max(fromMm, 0), lengthMm - lengthMm / along);
        double nm = Double.isNaN(mostNm) ? fromNm : Math.min(Math.max(fromNm, 0), mostNm - mostNm / up);
        return new Zoom(along, mm, up, nm);
    }
}
