package tideband.plan;

import java.util.ArrayList;
import java.util.List;
import tideband.design.Order;

/**
 * Makes a plan cheaper by small changes, one after another, until none helps or a number of tries is used up: masking or
 * unmasking a row of neighbouring bands throughout a row of visits, putting the other end down, leaving a visit out,
 * putting a visit elsewhere. Each change is judged by working the whole plan out anew.
 */
final class Polish {

    private final Needs needs;
    private final Tariff tariff;
    private final Order order;
    private long[] masked;
    private int[] end;
    private int count;
    private long price;
    private int triesLeft;

    Polish(Needs needs, Tariff tariff, Order order) {
        this.needs = needs;
        this.tariff = tariff;
        this.order = order;
    }

    List<Visit> polished(List<Visit> visits, int tries) {
        count = visits.size();
        masked = visits.stream().mapToLong(Visit::masked).toArray();
        end = visits.stream().mapToInt(Visit::end).toArray();
        price = worth();
        triesLeft = tries;
        long before;
        do {
            before = price;
            masks();
            ends();
            shorter();
            elsewhere();
        } while (price < before && triesLeft > 0);
        List<Visit> result = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            result.add(new Visit(masked[i], end[i]));
        }
        return result;
    }

    /** The price of the plan as it stands, or {@link Tariff#NEVER} if it is none. */
    private long worth() {
        long finished = 0;
        long sum = count * tariff.immersion();
        for (int i = 0; i < count; i++) {
            long fresh = needs.finished(masked[i], end[i]) & ~finished;
            if ((fresh & needs.due(finished, order)) == 0) {
                return Tariff.NEVER;
            }
            finished |= fresh;
            if (i == 0) {
                sum += tariff.maskFirst() * Masks.runs(masked[0]);
            } else {
                sum += tariff.change(masked[i - 1], masked[i]) + (end[i] == end[i - 1] ? 0 : tariff.turn());
            }
        }
        return finished == needs.filmed() ? sum + tariff.strip() * Masks.runs(masked[count - 1]) : Tariff.NEVER;
    }

    /** Whether the plan as it stands is cheaper than before; then it is kept. */
    private boolean keep() {
        triesLeft--;
        long now = worth();
        if (now < price) {
            price = now;
            return true;
        }
        return false;
    }

    private void masks() {
        long[] kept = new long[count];
        for (int from = 0; from < count; from++) {
            for (int to = from; to < count; to++) {
                for (int first = 0; first < needs.bands(); first++) {
                    for (int last = first; last < needs.bands() && triesLeft > 0; last++) {
                        long row = Masks.of(first, last);
                        rectangle(kept, from, to, row, row);
                        rectangle(kept, from, to, row, 0);
                    }
                }
            }
        }
    }

    private void rectangle(long[] kept, int from, int to, long row, long value) {
        boolean differs = false;
        for (int i = from; i <= to; i++) {
            kept[i] = masked[i];
            masked[i] = (masked[i] & ~row) | value;
            differs |= kept[i] != masked[i];
        }
        if (!differs || !keep()) {
            System.arraycopy(kept, from, masked, from, to - from + 1);
        }
    }

    private void ends() {
        for (int i = 0; i < count && triesLeft > 0; i++) {
            if (needs.mayGoDown(1 - end[i])) {
                end[i] = 1 - end[i];
                if (!keep()) {
                    end[i] = 1 - end[i];
                }
            }
        }
    }

    private void shorter() {
        for (int i = count - 1; i >= 0 && count > 1 && triesLeft > 0; i--) {
            long mask = masked[i];
            int down = end[i];
            remove(i);
            if (!keep()) {
                insert(i, mask, down);
            }
        }
    }

    private void elsewhere() {
        for (int i = 0; i < count; i++) {
            for (int at = 0; at < count && triesLeft > 0; at++) {
                long mask = masked[i];
                int down = end[i];
                remove(i);
                insert(at, mask, down);
                if (!keep()) {
                    remove(at);
                    insert(i, mask, down);
                }
            }
        }
    }

    private void remove(int at) {
        System.arraycopy(masked, at + 1, masked, at, count - at - 1);
        System.arraycopy(end, at + 1, end, at, count - at - 1);
        count--;
    }

    private void insert(int at, long mask, int down) {
        System.arraycopy(masked, at, masked, at + 1, count - at);
        System.arraycopy(end, at, end, at + 1, count - at);
        masked[at] = mask;
        end[at] = down;
        count++;
    }
}
