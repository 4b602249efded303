package tideband.plan;

import tideband.design.BenchTimes;

/**
 * Prices of the acts as whole numbers, so that sums are exact and ties are ties. A price carries three figures in one
 * number, compared in this order: minutes (in steps of {@link #stepMin}), runs masked, turns. Every price is a sum of
 * prices of acts, so comparing sums compares minutes first, then runs, then turns.
 *
 * @param immersion one immersion
 * @param maskFirst masking one run before the first immersion
 * @param maskOver masking one run later
 * @param strip stripping one run
 * @param turn turning the piece
 * @param stepMin the step in which minutes are counted, in min
 */
record Tariff(long immersion, long maskFirst, long maskOver, long strip, long turn, double stepMin) {

    /** More than any price. */
    static final long NEVER = Long.MAX_VALUE / 4;

    private static final int TURN_BITS = 6;
    private static final int RUN_BITS = 11;
    private static final int MINUTE_SHIFT = TURN_BITS + RUN_BITS;
    private static final int MINUTE_BITS = 44;

    /** The finest step, in min. It is made ten times coarser until the dearest plan fits. */
    private static final double FINEST_STEP_MIN = 1e-9;

    static Tariff of(BenchTimes times, int bands) {
        double runMin = Math.max(times.maskMin(), times.maskOverMin()) + times.stripMin();
        double dearestMin = bands * (times.immersionMin() + times.turnMin() + (bands + 1) / 2.0 * runMin);
        double step = FINEST_STEP_MIN;
        while (dearestMin / step >= 1L << MINUTE_BITS) {
            step *= 10;
        }
        return new Tariff(
                minutes(times.immersionMin(), step),
                minutes(times.maskMin(), step) + (1 << TURN_BITS),
                minutes(times.maskOverMin(), step) + (1 << TURN_BITS),
                minutes(times.stripMin(), step),
                minutes(times.turnMin(), step) + 1,
                step);
    }

    private static long minutes(double min, double step) {
        return Math.round(min / step) << MINUTE_SHIFT;
    }

    /** The same tariff with immersions and turns at a share of their price, rounded down. */
    Tariff shared(int shares) {
        return new Tariff(immersion / shares, maskFirst, maskOver, strip, turn / shares, stepMin);
    }

    /** The minutes in a price. */
    double minutes(long price) {
        return (price >> MINUTE_SHIFT) * stepMin;
    }

    /** Changing masks between two immersions. */
    long change(long from, long to) {
        return maskOver * Masks.runs(to & ~from) + strip * Masks.runs(from & ~to);
    }
}
