package tideband.plan;

import java.util.Arrays;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tideband.design.Order;

/**
 * Every state worth reaching, with its least price, for drawings of up to {@value #MOST_BANDS} bands. The
 * work doubles twice with each band.
 *
 * <p>A state is the set of finished bands, the masks on, and the end down. The finished set grows with each immersion,
 * so the sets are taken in rising order as numbers, each once, with all its states together: two {@link MaskSweep}s
 * (one an end) price every next mask, and a table says what each next mask finishes. A state is dropped when its price
 * and the {@link Bound} of what is left exceed the price of a plan already known. No state is dropped on any other
 * ground, so every plan of least price survives; {@link TieBreak} picks among them.
 */
final class ExactSearch {

    /** The most bands for which every mask can be looked at. */
    static final int MOST_BANDS = 16;

    /** Up to so many steps, changes of masks are priced one by one; above, a sweep is quicker. */
    private static final int DIRECT_STEPS = 20_000;

    /** Masks for which prices may be held at once: for two ends, and 8 bytes each, 256 MB. */
    private static final long MOST_HELD = 1 << 24;

    private final Needs needs;
    private final Tariff tariff;
    private final Order order;
    private final Bound bound;
    private final BooleanSupplier cancelled;
    private final int masks;
    private final int full;
    private final int[][] finished;
    private final long[] leastOnward;
    private final MaskSweep sweep;
    private final long[] now;
    private final long[] next;
    private final int[] candidate;
    private int candidates;
    private long workLeft;
    private long held;

    /**
     * Prepares a search.
     *
     * @param work how many masks of finished sets it may look at in all
     */
    ExactSearch(Needs needs, Tariff tariff, Order order, Bound bound, long work, BooleanSupplier cancelled) {
        this.workLeft = work;
        this.needs = needs;
        this.tariff = tariff;
        this.order = order;
        this.bound = bound;
        this.cancelled = cancelled;
        this.masks = 1 << needs.bands();
        this.full = (int) needs.filmed();
        this.finished = finishedByMask(needs);
        this.leastOnward = new long[full + 1];
        Arrays.fill(leastOnward, -1);
        this.sweep = new MaskSweep(needs.bands(), false);
        this.now = new long[masks];
        this.next = new long[masks];
        this.candidate = new int[masks];
    }

    private static int[][] finishedByMask(Needs needs) {
        int[][] table = new int[2][1 << needs.bands()];
        for (int end = 0; end < 2; end++) {
            for (int mask = 0; mask < table[end].length; mask++) {
                table[end][mask] = (int) needs.finished(mask, end);
            }
        }
        return table;
    }

    /**
     * States that share a finished set.
     *
     * @param finished the finished set
     * @param due the bands of which the next immersion must finish one
     * @param slots the states
     */
    record Layer(int finished, int due, Slots slots) {}

    /** Slots (end, then mask, as one number) in rising order, and their prices beside them. */
    static final class Slots {
        static final Slots NONE = new Slots(new long[0]);

        final int[] slot;
        final long[] price;

        Slots(long[] prices) {
            slot = new int
                    [(int) Arrays.stream(prices).filter(p -> p < Tariff.NEVER).count()];
            price = new long[slot.length];
            int n = 0;
            for (int s = 0; s < prices.length; s++) {
                if (prices[s] < Tariff.NEVER) {
                    slot[n] = s;
                    price[n++] = prices[s];
                }
            }
        }
    }

    /**
     * Searches.
     *
     * @param limit states of which no plan of this price or less can come are dropped
     * @return by finished set, the states reached, or null; the first is the start and holds none, and the last is null
     *     if no plan keeps to the limit
     */
    Layer[] layers(long limit) {
        held = 0;
        long[][] pending = new long[full + 1][];
        Layer[] layers = new Layer[full + 1];
        for (int done = 0; done <= full; done++) {
            if (done != 0 && pending[done] == null) {
                continue;
            }
            workLeft -= masks;
            if (exhausted()) {
                return layers;
            }
            if (cancelled.getAsBoolean()) {
                throw new CancellationException("planning was cancelled");
            }
            int due = (int) needs.due(done, order);
            layers[done] = new Layer(done, due, done == 0 ? Slots.NONE : new Slots(pending[done]));
            for (int end = 0; end < 2 && done != full; end++) {
                if (needs.mayGoDown(end)) {
                    nextMasks(layers[done], end, pending[done]);
                    immerse(done, end, limit, pending);
                }
            }
            held -= pending[done] == null ? 0 : masks;
            pending[done] = null;
        }
        return layers;
    }

    /**
     * Whether a state is past the limit. With all finished the price is known to the end, the last stripping included:
     * a bound would not do, since a limit counts as met once such a state is kept.
     */
    private boolean tooDear(long price, int done, int end, int mask, long limit) {
        return done == full
                ? price + tariff.strip() * Masks.runs(mask) > limit
                : price + leastOnward(done) > limit || bound.exceeds(limit - price, done, end, mask);
    }

    /** The bound of what is left of a finished set, whatever the masks and the end; worked out when first asked for. */
    private long leastOnward(int done) {
        if (leastOnward[done] < 0) {
            leastOnward[done] = bound.least(done);
        }
        return leastOnward[done];
    }

    /** Lists the masks with which the end down finishes what is due, and their least prices, in {@code next}. */
    private void nextMasks(Layer layer, int end, long[] prices) {
        candidates = 0;
        for (int mask = 0; mask < masks; mask++) {
            if ((finished[end][mask] & layer.due()) != 0) {
                candidate[candidates++] = mask;
            }
        }
        if (layer.finished() == 0) {
            for (int c = 0; c < candidates; c++) {
                next[candidate[c]] = tariff.maskFirst() * Masks.runs(candidate[c]);
            }
        } else if ((long) layer.slots().slot.length * candidates < DIRECT_STEPS) {
            oneByOne(layer.slots(), end);
        } else {
            turned(prices, end);
            sweep.cheapest(now, next, tariff.maskOver(), tariff.strip());
        }
    }

    private void oneByOne(Slots slots, int end) {
        for (int c = 0; c < candidates; c++) {
            next[candidate[c]] = Tariff.NEVER;
        }
        for (int i = 0; i < slots.slot.length; i++) {
            int from = slots.slot[i] & (masks - 1);
            long price = slots.price[i] + (slots.slot[i] / masks == end ? 0 : tariff.turn());
            for (int c = 0; c < candidates; c++) {
                int to = candidate[c];
                next[to] = Math.min(next[to], price + tariff.change(from, to));
            }
        }
    }

    /** The price of each mask with an end down, whichever end was down before, in {@code now}. */
    private void turned(long[] prices, int end) {
        int same = end * masks;
        int other = masks - same;
        for (int mask = 0; mask < masks; mask++) {
            now[mask] = Math.min(prices[same + mask], prices[other + mask] + tariff.turn());
        }
    }

    private void immerse(int done, int end, long limit, long[][] pending) {
        int[] finishes = finished[end];
        long most = limit - tariff.immersion();
        for (int c = 0; c < candidates; c++) {
            int mask = candidate[c];
            if (next[mask] > most) {
                continue;
            }
            long price = next[mask] + tariff.immersion();
            int then = done | finishes[mask];
            int slot = end * masks + mask;
            long[] prices = pending[then];
            boolean known = prices != null && prices[slot] <= price;
            if (known || tooDear(price, then, end, mask, limit)) {
                continue;
            }
            if (prices == null) {
                prices = new long[2 * masks];
                Arrays.fill(prices, Tariff.NEVER);
                pending[then] = prices;
                workLeft -= masks;
                held += masks;
            }
            prices[slot] = price;
        }
    }

    /** Whether the work allowed is used up; what was found last is then of no use. */
    boolean exhausted() {
        return workLeft < 0 || held > MOST_HELD;
    }

    /** What an immersion finishes. */
    int finishes(int slot) {
        return finished[slot / masks][slot & (masks - 1)];
    }

    int masks() {
        return masks;
    }
}
