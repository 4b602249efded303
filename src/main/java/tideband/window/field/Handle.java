package tideband.window.field;

import tideband.edit.Part;

/**
 * Where a part of the drawing can be taken hold of.
 *
 * @param part the part
 * @param xPx px from the field's left
 * @param yPx px from the field's top
 * @param hitPx how near a hand must come, in px
 */
public record Handle(Part part, double xPx, double yPx, double hitPx) {

    double awayPx(double x, double y) {
        return Math.hypot(x - xPx, y - yPx);
    }
}
