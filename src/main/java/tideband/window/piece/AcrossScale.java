package tideband.window.piece;

import java.util.Locale;

/**
 * How large the piece is shown across. As far as the room allows it has the scale it has along its length; a piece too thin
 * to be seen is widened, one too wide for the room is narrowed, and that is said.
 *
 * @param pxPerMm px a millimetre across
 * @param times how many times the scale along the length that is; 1 is to scale
 */
record AcrossScale(double pxPerMm, double times) {
    private static final double[] WIDER = {1, 2, 3, 4, 5, 6, 8, 10, 12, 15, 20, 25, 30, 40, 50, 60, 80, 100};

    /**
     * The scale for a piece.
     *
     * @param largestMm its largest size in mm
     * @param alongPxPerMm the scale along its length
     * @param leastPx what it should measure at least, in px
     * @param roomPx what it may measure at most, in px
     * @return the scale
     */
    static AcrossScale fit(double largestMm, double alongPxPerMm, double leastPx, double roomPx) {
        double plainPx = largestMm * alongPxPerMm;
        double times = 1;
        if (plainPx > roomPx) {
            // Two digits, rounded down so that it fits.
            double fits = roomPx / plainPx;
            double unit = Math.pow(10, Math.floor(Math.log10(fits)) - 1);
            times = Math.max(unit, Math.floor(fits / unit) * unit);
        } else {
            for (double wider : WIDER) {
                if (plainPx * wider <= roomPx) {
                    times = wider;
                }
                if (plainPx * wider >= leastPx) {
                    break;
                }
            }
        }
        return new AcrossScale(alongPxPerMm * times, times);
    }

    /**
     * The scale in words.
     *
     * @return {@code to scale} or such as {@code across ×4}
     */
    String words() {
        if (times == 1) {
            return "to scale";
        }
        return times > 1
                ? String.format(Locale.ROOT, "across ×%.0f", times)
                : String.format(Locale.ROOT, "across ×%.2g", times);
    }
}
