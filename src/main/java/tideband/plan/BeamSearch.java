package tideband.plan;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tideband.design.Order;

/**
 * A good plan, soon: immersion by immersion, the most promising beginnings go on. Next masks come from
 * {@link NextMask}, greedy and thrifty in turn; beginnings are ranked by their price and what the {@link Bound} says is
 * left, the latter made a little heavier because it is always too hopeful. No claim is made for the plan found but that
 * it is one.
 */
final class BeamSearch {

    /** Rewards tried for a band newly finished, in eighths of an immersion with one run masked and stripped. */
    private static final int[] REWARD_EIGHTHS = {1, 3, 6, 16};

    /** Rewards tried for an open band kept masked, in the same eighths. */
    private static final int[] KEEP_EIGHTHS = {0, 1, 2, 4};

    /** What is left, by the bound, counts this many quarters. */
    private static final int LEFT_QUARTERS = 5;

    private final Needs needs;
    private final Tariff tariff;
    private final Order order;
    private final Bound bound;
    private final NextMask nextMask;
    private final BooleanSupplier cancelled;

    BeamSearch(
            List<Stretch> stretches, Needs needs, Tariff tariff, Order order, Bound bound, BooleanSupplier cancelled) {
        this.needs = needs;
        this.tariff = tariff;
        this.order = order;
        this.bound = bound;
        this.nextMask = new NextMask(stretches, needs, tariff);
        this.cancelled = cancelled;
    }

    /**
     * A beginning of a plan.
     *
     * @param before the beginning one immersion shorter, or null
     * @param visit its last visit
     * @param finished what is finished
     * @param price its price
     * @param promise its price with what is left
     */
    private record Beginning(Beginning before, Visit visit, long finished, long price, long promise) {

        static final Comparator<Beginning> ORDER = Comparator.comparingLong(Beginning::promise)
                .thenComparingLong(Beginning::price)
                .thenComparingLong(Beginning::finished)
                .thenComparingInt(b -> b.visit.end())
                .thenComparingLong(b -> b.visit.masked());

        List<Visit> visits() {
            List<Visit> visits = new ArrayList<>();
            for (Beginning b = this; b.before != null; b = b.before) {
                visits.add(0, b.visit);
            }
            return visits;
        }
    }

    /**
     * Searches.
     *
     * @param width how many beginnings of each length go on
     * @return plans, the cheapest first, at least one and at most {@code width}
     */
    List<List<Visit>> plans(int width) {
        List<Beginning> beam = new ArrayList<>();
        beam.add(new Beginning(null, new Visit(0, 0), 0, 0, 0));
        List<Beginning> complete = new ArrayList<>();
        while (!beam.isEmpty()) {
            if (cancelled.getAsBoolean()) {
                throw new CancellationException("planning was cancelled");
            }
            Map<List<Long>, Beginning> longer = new HashMap<>();
            for (Beginning beginning : beam) {
                continueFrom(beginning, longer);
            }
            List<Beginning> ranked = new ArrayList<>(longer.values());
            ranked.sort(Beginning.ORDER);
            beam.clear();
            for (Beginning b : ranked) {
                if (b.finished == needs.filmed()) {
                    complete.add(b);
                } else if (beam.size() < width) {
                    beam.add(b);
                }
            }
        }
        complete.sort(Beginning.ORDER);
        return complete.stream().limit(width).map(Beginning::visits).toList();
    }

    private void continueFrom(Beginning beginning, Map<List<Long>, Beginning> longer) {
        boolean first = beginning.before == null;
        long base = Math.max(8, tariff.immersion() + tariff.maskOver() + tariff.strip());
        long due = needs.due(beginning.finished, Order.THICKER_FIRST);
        for (int end = 0; end < 2; end++) {
            if (!needs.mayGoDown(end)) {
                continue;
            }
            for (int eighths : REWARD_EIGHTHS) {
                for (int keepEighths : KEEP_EIGHTHS) {
                    long reward = base / 8 * eighths;
                    long keep = base / 8 * keepEighths;
                    for (long rest = due & needs.finishable(end); rest != 0; rest &= rest - 1) {
                        int band = Long.numberOfTrailingZeros(rest);
                        add(beginning, end, first, reward, keep, needs.all(end, band), 1L << band, longer);
                    }
                    if (order == Order.LEAST_MINUTES) {
                        add(beginning, end, first, reward, keep, 0, 0, longer);
                    }
                }
            }
        }
    }

    private void add(
            Beginning from,
            int end,
            boolean first,
            long reward,
            long keep,
            long mustMask,
            long mustBare,
            Map<List<Long>, Beginning> longer) {
        long before = from.visit.masked();
        long mask =
                nextMask.best(new NextMask.Wish(from.finished, before, first, end, reward, keep, mustMask, mustBare));
        long fresh = needs.finished(mask, end) & ~from.finished;
        if ((fresh & needs.due(from.finished, order)) == 0) {
            return;
        }
        long price = from.price + tariff.immersion();
        price += first
                ? tariff.maskFirst() * Masks.runs(mask)
                : tariff.change(before, mask) + (from.visit.end() == end ? 0 : tariff.turn());
        long finished = from.finished | fresh;
        long left = finished == needs.filmed()
                ? tariff.strip() * Masks.runs(mask)
                : bound.least(finished, end, mask) / 4 * LEFT_QUARTERS;
        Beginning to = new Beginning(from, new Visit(mask, end), finished, price, price + left);
        longer.merge(List.of(finished, mask, (long) end), to, (a, b) -> Beginning.ORDER.compare(b, a) < 0 ? b : a);
    }
}
