package tideband.plan;

import java.util.Arrays;

/**
 * All mask changes at once. Given a price for each mask now on, finds for each mask the cheapest way to come to it:
 * {@code out[new] = min over old of in[old] + change(old, new)}.
 *
 * <p>The price of a change falls apart band by band: a run that is put on (or stripped) is paid where it starts. So the
 * minimum is taken one band at a time, replacing the band's old bit by its new one, while remembering whether the band
 * before was changed: {@code level} holds the prices when it was not, {@code open} those when it was (put on if its new
 * bit is set, stripped if not). That is {@code n 2^n} steps in place of {@code 4^n}.
 */
final class MaskSweep {

    private final int bands;
    private final boolean firstFree;
    private long[] level;
    private long[] open;
    private long[] nextLevel;
    private long[] nextOpen;
    private final boolean[] used;

    /**
     * Prepares a sweep.
     *
     * @param bands number of bands
     * @param firstFree whether a run that starts at the first band costs nothing (it is paid elsewhere)
     */
    MaskSweep(int bands, boolean firstFree) {
        this.bands = bands;
        this.firstFree = firstFree;
        int masks = 1 << bands;
        level = new long[masks];
        open = new long[masks];
        nextLevel = new long[masks];
        nextOpen = new long[masks];
        used = new boolean[2 * masks];
    }

    /**
     * Sweeps.
     *
     * @param in price of each old mask, {@link Tariff#NEVER} or more where it cannot be
     * @param out filled with the least price of each new mask
     * @param put price of a run put on
     * @param strip price of a run stripped
     */
    void cheapest(long[] in, long[] out, long put, long strip) {
        int masks = 1 << bands;
        System.arraycopy(in, 0, level, 0, masks);
        Arrays.fill(open, Tariff.NEVER);
        markUsed(in, masks);
        for (int band = 0; band < bands; band++) {
            int bit = 1 << band;
            int node = 1 << (bands - band - 1);
            for (int from = 0; from < masks; from += 2 * bit, node++) {
                if (!used[node >> 1]) {
                    continue;
                }
                if (!used[node]) {
                    Arrays.fill(nextLevel, from, from + 2 * bit, Tariff.NEVER);
                    Arrays.fill(nextOpen, from, from + 2 * bit, Tariff.NEVER);
                } else if (band == 0) {
                    first(from, firstFree ? 0 : put, firstFree ? 0 : strip);
                } else {
                    afterClear(from, bit, put, strip);
                    afterSet(from + bit / 2, bit, put, strip);
                }
            }
            swap();
        }
        for (int mask = 0; mask < masks; mask++) {
            out[mask] = Math.min(level[mask], open[mask]);
        }
    }

    /** Marks, in a binary tree over the masks, which blocks hold a price at all. */
    private void markUsed(long[] in, int masks) {
        for (int mask = 0; mask < masks; mask++) {
            used[masks + mask] = in[mask] < Tariff.NEVER;
        }
        for (int node = masks - 1; node > 0; node--) {
            used[node] = used[2 * node] || used[2 * node + 1];
        }
        used[0] = used[1];
    }

    private void first(int at, long put, long strip) {
        nextLevel[at] = level[at];
        nextLevel[at + 1] = level[at + 1];
        nextOpen[at + 1] = level[at] + put;
        nextOpen[at] = level[at + 1] + strip;
    }

    /** The new bit before is clear: an open run there is one being stripped. */
    private void afterClear(int from, int bit, long put, long strip) {
        for (int k = from; k < from + bit / 2; k++) {
            long clear = Math.min(level[k], open[k]);
            nextLevel[k] = clear;
            nextLevel[k + bit] = Math.min(level[k + bit], open[k + bit]);
            nextOpen[k + bit] = clear + put;
            nextOpen[k] = Math.min(level[k + bit] + strip, open[k + bit]);
        }
    }

    /** The new bit before is set: an open run there is one being put on. */
    private void afterSet(int from, int bit, long put, long strip) {
        for (int k = from; k < from + bit / 2; k++) {
            long set = Math.min(level[k + bit], open[k + bit]);
            nextLevel[k] = Math.min(level[k], open[k]);
            nextLevel[k + bit] = set;
            nextOpen[k + bit] = Math.min(level[k] + put, open[k]);
            nextOpen[k] = set + strip;
        }
    }

    private void swap() {
        long[] wasLevel = level;
        long[] wasOpen = open;
        level = nextLevel;
        open = nextOpen;
        nextLevel = wasLevel;
        nextOpen = wasOpen;
    }
}
