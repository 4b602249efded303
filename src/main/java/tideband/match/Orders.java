package tideband.match;

import java.util.Arrays;
import java.util.List;
import tideband.colour.Lab;

/**
 * Which time round the hue circle a film is.
 *
 * <p>As a film grows its hue falls: straw, purple, blue, green, yellow, purple … The circle is counted at hue {@value #MARK_DEGREES}°,
 * the green side of yellow: order 1 is everything before the hue first falls through it, order 2 until it falls through it
 * again, and so on. So the first order runs from bare metal through gold, purple and blue to silver, and the second begins with
 * yellow.
 *
 * <p>Near neutral a hue means little, so only colours of chroma {@value #COUNTED_CHROMA} and more are counted, each hue taken
 * to follow from the last counted one by a rise of at most {@value #LARGEST_RISE_DEGREES}° or else by a fall: a series that
 * passes just the wrong side of neutral (tantalum's pale zone does) has still been round. An order, once begun, is not given
 * back.
 */
final class Orders {

    /** Where the circle is counted, degrees of hue. */
    static final double MARK_DEGREES = 120;
    /** The chroma a colour needs for its hue to be counted. */
    static final double COUNTED_CHROMA = 8;
    /** The largest step that is read as a rise of the hue, degrees. */
    static final double LARGEST_RISE_DEGREES = 60;

    private final double stepNm;
    /** Index of the film at which order 2, 3, … begins. */
    private final int[] begins;

    /**
     * Counts the orders of a series.
     *
     * @param stepNm interval of the films in nm
     * @param colours the colours of the films 0, step, 2·step …
     */
    Orders(double stepNm, List<Lab> colours) {
        this.stepNm = stepNm;
        int[] found = new int[colours.size()];
        int orders = 0;
        double unwrapped = Double.NaN;
        for (int i = 0; i < colours.size(); i++) {
            Lab colour = colours.get(i);
            if (colour.chroma() < COUNTED_CHROMA) {
                continue;
            }
            double hue = colour.hueDegrees();
            unwrapped = Double.isNaN(unwrapped) ? firstTurn(hue) : followed(unwrapped, hue);
            while (unwrapped < MARK_DEGREES - 360 * (orders + 1)) {
                found[orders++] = i;
            }
        }
        begins = Arrays.copyOf(found, orders);
    }

    /** The first counted hue, from just above the mark downwards: an olive start is still order 1. */
    private static double firstTurn(double hue) {
        return hue > MARK_DEGREES + LARGEST_RISE_DEGREES ? hue - 360 : hue;
    }

    private static double followed(double last, double hue) {
        double rise = (hue - last) % 360;
        if (rise < 0) {
            rise += 360;
        }
        return last + (rise <= LARGEST_RISE_DEGREES ? rise : rise - 360);
    }

    int at(double filmNm) {
        int order = 1;
        for (int begin : begins) {
            if (filmNm >= begin * stepNm) {
                order++;
            }
        }
        return order;
    }
}
