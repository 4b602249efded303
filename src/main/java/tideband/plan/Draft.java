package tideband.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.design.Order;

/**
 * A plan in short: its visits, what each newly finishes, and its price. Drafts are ordered by price (minutes, then runs,
 * then turns), then by masked length, then fewer immersions, then end A before B at the first visit that differs, then
 * the masks read as binary numbers at the first visit that differs.
 *
 * @param visits the visits in order
 * @param newly the bands each newly finishes, as bits
 * @param price the price
 * @param maskedSteps length of all runs put on, in steps of {@link #LENGTH_STEP_MM}
 */
record Draft(List<Visit> visits, List<Long> newly, long price, long maskedSteps) implements Comparable<Draft> {

    /** The step in which lengths are compared, in mm, so that equal sums are equal. */
    static final double LENGTH_STEP_MM = 1e-6;

    Draft {
        visits = List.copyOf(visits);
        newly = List.copyOf(newly);
    }

    @Override
    public int compareTo(Draft other) {
        int order = Long.compare(price, other.price);
        order = order != 0 ? order : Long.compare(maskedSteps, other.maskedSteps);
        order = order != 0 ? order : Integer.compare(visits.size(), other.visits.size());
        for (int i = 0; order == 0 && i < visits.size(); i++) {
            order = Integer.compare(visits.get(i).end(), other.visits.get(i).end());
        }
        for (int i = 0; order == 0 && i < visits.size(); i++) {
            order = Long.compare(visits.get(i).masked(), other.visits.get(i).masked());
        }
        return order;
    }

    /** Works visits out, or empty if they are no plan: one finishes nothing that is due, or a band is left over. */
    static Optional<Draft> of(List<Visit> visits, Needs needs, Order order, Tariff tariff, long[] lengthSteps) {
        List<Long> newly = new ArrayList<>();
        long finished = 0;
        long price = 0;
        long steps = 0;
        Visit last = null;
        for (Visit visit : visits) {
            long fresh = needs.finished(visit.masked(), visit.end()) & ~finished;
            if ((fresh & needs.due(finished, order)) == 0) {
                return Optional.empty();
            }
            newly.add(fresh);
            finished |= fresh;
            long before = last == null ? 0 : last.masked();
            price += tariff.immersion();
            price += last == null
                    ? tariff.maskFirst() * Masks.runs(visit.masked())
                    : tariff.change(before, visit.masked()) + (last.end() == visit.end() ? 0 : tariff.turn());
            steps += steps(visit.masked() & ~before, lengthSteps);
            last = visit;
        }
        if (finished != needs.filmed()) {
            return Optional.empty();
        }
        price += last == null ? 0 : tariff.strip() * Masks.runs(last.masked());
        return Optional.of(new Draft(visits, newly, price, steps));
    }

    static long steps(long bands, long[] lengthSteps) {
        long sum = 0;
        for (long rest = bands; rest != 0; rest &= rest - 1) {
            sum += lengthSteps[Long.numberOfTrailingZeros(rest)];
        }
        return sum;
    }
}
