package tideband.plan;

import java.util.Arrays;
import java.util.List;
import java.util.stream.DoubleStream;

/**
 * The best next mask for one immersion, if each band it newly finishes is worth a given reward, and so is each open band
 * that it keeps masked for later: least price of changing masks less the rewards. Found exactly, by walking outward from the end that is down and keeping, for each running
 * minimum the walk may have, how the band before was changed and whether a crisp edge bids mask the next one, the least
 * price so far. A step for every band, minimum and change: about {@code 6 n^2} in all.
 */
final class NextMask {

    private final Needs needs;
    private final Tariff tariff;
    private final int bands;
    private final double[] lowsNm;
    private final int[] lowLevel;
    private long[] now;
    private long[] next;
    private final int[][] cameFrom;

    /** What the band before was: left as it was, put on, stripped. */
    private static final int LEFT = 0;

    private static final int PUT = 1;
    private static final int STRIPPED = 2;

    NextMask(List<Stretch> stretches, Needs needs, Tariff tariff) {
        this.needs = needs;
        this.tariff = tariff;
        this.bands = stretches.size();
        double[] lowNm = stretches.stream()
                .mapToDouble(s -> Math.min(s.aSideNm(), s.bSideNm()))
                .toArray();
        this.lowsNm = DoubleStream.concat(Arrays.stream(lowNm), DoubleStream.of(Double.POSITIVE_INFINITY))
                .sorted()
                .distinct()
                .toArray();
        this.lowLevel = Arrays.stream(lowNm)
                .mapToInt(low -> Arrays.binarySearch(lowsNm, low))
                .toArray();
        this.now = new long[6 * lowsNm.length];
        this.next = new long[6 * lowsNm.length];
        this.cameFrom = new int[bands][6 * lowsNm.length];
    }

    /**
     * What is asked.
     *
     * @param finished bands finished before
     * @param before masks on before
     * @param first whether this is the first immersion
     * @param end end that is down
     * @param reward what a newly finished band is worth
     * @param keep what an open band is worth masked
     * @param mustMask bands that must be masked
     * @param mustBare bands that must not
     */
    record Wish(
            long finished, long before, boolean first, int end, long reward, long keep, long mustMask, long mustBare) {}

    /** The best mask; at least one always satisfies the wish, since what must be masked and what must not are apart. */
    long best(Wish wish) {
        Arrays.fill(now, Tariff.NEVER);
        now[6 * (lowsNm.length - 1)] = 0;
        for (int step = 0; step < bands; step++) {
            Arrays.fill(next, Tariff.NEVER);
            for (int state = 0; state < now.length; state++) {
                if (now[state] < Tariff.NEVER) {
                    masking(wish, step, state);
                    baring(wish, step, state);
                }
            }
            long[] swap = now;
            now = next;
            next = swap;
        }
        int best = 0;
        for (int state = 0; state < now.length; state += 2) {
            best = now[state] < now[best] ? state : best;
        }
        return traced(wish, best);
    }

    private int band(Wish wish, int step) {
        return wish.end() == 0 ? step : bands - 1 - step;
    }

    private void masking(Wish wish, int step, int state) {
        int band = band(wish, step);
        if (Masks.has(wish.mustBare(), band)) {
            return;
        }
        boolean on = Masks.has(wish.before(), band);
        int change = state / 2 % 3;
        long put = wish.first() ? tariff.maskFirst() : tariff.maskOver();
        long price = now[state] + (on || change == PUT ? 0 : put);
        boolean open = Masks.has(needs.filmed() & ~wish.finished(), band);
        reach(step, 2 * (state / 6 * 3 + (on ? LEFT : PUT)), price - (open ? wish.keep() : 0), 2 * state + 1);
    }

    private void baring(Wish wish, int step, int state) {
        int band = band(wish, step);
        if (Masks.has(wish.mustMask(), band) || state % 2 == 1) {
            return;
        }
        boolean on = Masks.has(wish.before(), band);
        int level = state / 6;
        long price = now[state] + (on && state / 2 % 3 != STRIPPED ? tariff.strip() : 0);
        int to = 2 * (Math.min(level, lowLevel[band]) * 3 + (on ? STRIPPED : LEFT));
        boolean canFinish =
                Masks.has(needs.finishable(wish.end()), band) && needs.deepNm(wish.end(), band) <= lowsNm[level];
        long gain = canFinish && !Masks.has(wish.finished(), band) ? wish.reward() : 0;
        if (needs.crisp(wish.end(), band) == 0) {
            reach(step, to, price - gain, 2 * state);
        } else {
            reach(step, to, price, 2 * state);
            reach(step, to + 1, price - gain, 2 * state);
        }
    }

    private void reach(int step, int to, long price, int from) {
        if (price < next[to]) {
            next[to] = price;
            cameFrom[step][to] = from;
        }
    }

    private long traced(Wish wish, int last) {
        long mask = 0;
        int state = last;
        for (int step = bands - 1; step >= 0; step--) {
            int from = cameFrom[step][state];
            mask |= (long) (from & 1) << band(wish, step);
            state = from >> 1;
        }
        return mask;
    }
}
