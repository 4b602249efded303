package tideband.plan;

import java.util.Arrays;

/**
 * A few bands of a drawing, planned as if the others did not exist, and with immersions allowed that finish nothing.
 *
 * <p><b>Promise.</b> {@link #least} is never above what any plan of the whole drawing, under either order, still pays
 * from that state on. <i>Proof.</i> Take such a plan and keep, of each of its masks, only the bands in the
 * sub-drawing. (1) Each immersion then finishes at least the bands of the sub-drawing that it finished before: a band's
 * needs (see {@link Needs}) only lose members. By induction no state lags behind the projected one, and a state with
 * more finished is never dearer here, for it may follow the other's steps. (2) No change of masks gets dearer: bands of
 * one run stay in one run when others are taken out of the line. (3) The number of immersions and turns is the same;
 * those left with nothing to finish are the idle ones allowed here. So the projected plan is one of those minimised
 * over, at no higher price.
 *
 * <p>Idle immersions must be allowed, and paid, because leaving one out would turn two changes of masks into one, and
 * that can be dearer: masking bands 1 to 3 as one run and stripping band 2 may cost less than masking 1 and 3 apart.
 *
 * <p>With {@code firstFree} a run that starts at the first band is not paid. Sub-drawings of neighbouring bands, each
 * sharing one band with the one before, then never pay for the same run twice: a run is paid only where it starts. If
 * they also share out the prices of immersions and turns, their promises may be added up.
 */
final class SubDrawing {

    private final int[] members;
    private final int bands;
    private final boolean contiguous;
    private final Tariff tariff;
    private final boolean firstFree;
    private final int[][] finished;
    private final int full;
    private final boolean[] endUsed = new boolean[2];
    /** Least price from each state on, at finished, end, mask. */
    private final long[] least;

    /** Least price from each finished set on. */
    private final long[] leastOfSet;

    private final long start;

    SubDrawing(Needs needs, int[] members, Tariff tariff, boolean firstFree) {
        this.members = members.clone();
        this.bands = members.length;
        this.contiguous = members[bands - 1] - members[0] == bands - 1;
        this.tariff = tariff;
        this.firstFree = firstFree;
        this.full = project(needs.filmed());
        this.finished = finishedByMask(needs);
        for (int end = 0; end < 2; end++) {
            endUsed[end] = needs.mayGoDown(end);
        }
        this.least = new long[2 << (2 * bands)];
        this.leastOfSet = new long[1 << bands];
        this.start = solve();
    }

    private int[][] finishedByMask(Needs needs) {
        int[][] table = new int[2][1 << bands];
        for (int end = 0; end < 2; end++) {
            for (int i = 0; i < bands; i++) {
                if (!Masks.has(needs.finishable(end), members[i])) {
                    continue;
                }
                int need = project(needs.all(end, members[i]));
                int others = ((1 << bands) - 1) & ~need & ~(1 << i);
                for (int more = others; ; more = (more - 1) & others) {
                    table[end][need | more] |= 1 << i;
                    if (more == 0) {
                        break;
                    }
                }
            }
        }
        return table;
    }

    /** The members among some bands, as bits in the order of the members. */
    int project(long set) {
        if (contiguous) {
            return (int) (set >>> members[0]) & ((1 << bands) - 1);
        }
        int projected = 0;
        for (int i = 0; i < bands; i++) {
            projected |= (int) (set >>> members[i] & 1) << i;
        }
        return projected;
    }

    /** What is still to be paid at least, the masks now on being stripped included. */
    long least(int finished, int end, int mask) {
        return least[at(finished, end) + mask];
    }

    /** What is still to be paid at least, whatever the masks and the end. */
    long least(int finished) {
        return leastOfSet[finished];
    }

    /** What a whole plan costs at least, its first masks at the first price. */
    long start() {
        return start;
    }

    private int at(int finished, int end) {
        return (2 * finished + end) << bands;
    }

    private int runs(int mask) {
        return Masks.runs(mask) - (firstFree ? mask & 1 : 0);
    }

    private long solve() {
        int masks = 1 << bands;
        MaskSweep sweep = new MaskSweep(bands, firstFree);
        long[][] goal = new long[2][masks];
        long[][] reach = new long[2][masks];
        long[] stripAll = new long[masks];
        for (int mask = 0; mask < masks; mask++) {
            stripAll[mask] = tariff.strip() * runs(mask);
        }
        for (int done = full; ; done = (done - 1) & full) {
            for (int end = 0; end < 2; end++) {
                Arrays.fill(reach[end], Tariff.NEVER);
                for (int mask = 0; mask < masks; mask++) {
                    int then = done | finished[end][mask];
                    boolean useful = endUsed[end] && then != done;
                    goal[end][mask] = useful ? tariff.immersion() + least[at(then, end) + mask] : Tariff.NEVER;
                }
            }
            settle(sweep, goal, reach, done == full ? stripAll : null);
            for (int end = 0; end < 2; end++) {
                System.arraycopy(reach[end], 0, least, at(done, end), masks);
            }
            leastOfSet[done] = Arrays.stream(least, at(done, 0), at(done, 0) + 2 * masks)
                    .min()
                    .orElseThrow();
            if (done == 0) {
                return first(goal);
            }
        }
    }

    /** Fills {@code reach}, adding idle immersions to {@code goal} for as long as they help. */
    private void settle(MaskSweep sweep, long[][] goal, long[][] reach, long[] stripAll) {
        boolean changed = true;
        while (changed) {
            for (int end = 0; end < 2; end++) {
                // Backwards from the new mask to the old one, putting on and stripping change places.
                sweep.cheapest(goal[end], reach[end], tariff.strip(), tariff.maskOver());
            }
            changed = false;
            for (int mask = 0; mask < 1 << bands; mask++) {
                long a = Math.min(reach[0][mask], reach[1][mask] + tariff.turn());
                long b = Math.min(reach[1][mask], reach[0][mask] + tariff.turn());
                reach[0][mask] = stripAll == null ? a : Math.min(a, stripAll[mask]);
                reach[1][mask] = stripAll == null ? b : Math.min(b, stripAll[mask]);
                for (int end = 0; end < 2; end++) {
                    long idle = reach[end][mask] + tariff.immersion();
                    if (endUsed[end] && idle < goal[end][mask]) {
                        goal[end][mask] = idle;
                        changed = true;
                    }
                }
            }
        }
    }

    private long first(long[][] goal) {
        if (full == 0) {
            return 0;
        }
        long least = Tariff.NEVER;
        for (int end = 0; end < 2; end++) {
            for (int mask = 0; mask < 1 << bands; mask++) {
                least = Math.min(least, tariff.maskFirst() * runs(mask) + goal[end][mask]);
            }
        }
        return least;
    }
}
