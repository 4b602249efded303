package tideband.window.field;

import java.util.ArrayList;
import java.util.List;

/** Round numbers along an axis. */
final class Ticks {
    private Ticks() {}

    /** Round numbers from one value to another, at least so far apart. */
    static List<Double> between(double from, double to, double least) {
        double power = Math.pow(10, Math.floor(Math.log10(least)));
        double step = 10 * power;
        for (double share : new double[] {1, 2, 5}) {
            if (share * power >= least) {
                step = share * power;
                break;
            }
        }
        List<Double> ticks = new ArrayList<>();
        for (long i = (long) Math.ceil(from / step - 1e-9); i * step <= to + step * 1e-9; i++) {
            // Whole powers are taken out before rounding, so that 3 times 0.1 is 0.3.
            ticks.add(Math.rint(i * step * 1e6) / 1e6);
        }
        return ticks;
    }
}
