package tideband.plan;

import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/**
 * What is to be planned: the drawing, how the piece is held, what the bench costs, and the rule of order.
 *
 * @param stretches the bands from end A to end B, from 1 to {@value #MOST_BANDS} of them
 * @param names one name a band for the sentences of the plan, or none: then bands are called by number, from 1
 * @param endsDown the ends that may go down, at least one
 * @param dryMm length under the holder, measured from the end that is up, in mm
 * @param times what each act at the bench costs
 * @param order the rule for the order of immersions
 */
public record Problem(
        List<Stretch> stretches, List<String> names, Set<End> endsDown, double dryMm, BenchTimes times, Order order) {

    /** The most bands a drawing may have. */
    public static final int MOST_BANDS = 60;

    /** The longest piece, in mm. */
    public static final double LONGEST_MM = 100_000;

    /** Refuses drawings that cannot be planned, and copies the collections, so that the value cannot change. */
    public Problem {
        stretches = List.copyOf(stretches);
        names = List.copyOf(names);
        if (stretches.isEmpty() || stretches.size() > MOST_BANDS) {
            throw new IllegalArgumentException(
                    "a drawing has from 1 to " + MOST_BANDS + " stretches, but had " + stretches.size());
        }
        if (!names.isEmpty() && names.size() != stretches.size()) {
            throw new IllegalArgumentException("names must be none or one a stretch, " + stretches.size()
                    + " in all, but there were " + names.size());
        }
        if (endsDown.isEmpty()) {
            throw new IllegalArgumentException("endsDown must name an end, A or B or both, but was empty");
        }
        endsDown = Collections.unmodifiableSet(EnumSet.copyOf(endsDown));
        if (!(dryMm >= 0 && Double.isFinite(dryMm))) {
            throw new IllegalArgumentException("dryMm must be finite and 0 or more, but was " + dryMm);
        }
        double lengthMm = stretches.stream().mapToDouble(Stretch::lengthMm).sum();
        if (!(lengthMm <= LONGEST_MM)) {
            throw new IllegalArgumentException(
                    "the stretches together may be at most " + LONGEST_MM + " mm long, but were " + lengthMm);
        }
    }

    /**
     * A problem whose bands are called by number.
     *
     * @param stretches the bands from end A to end B
     * @param endsDown the ends that may go down
     * @param dryMm length under the holder in mm
     * @param times what each act costs
     * @param order the rule of order
     */
    public Problem(List<Stretch> stretches, Set<End> endsDown, double dryMm, BenchTimes times, Order order) {
        this(stretches, List.of(), endsDown, dryMm, times, order);
    }

    /**
     * The length of the piece.
     *
     * @return the sum of the stretches in mm
     */
    public double lengthMm() {
        return stretches.stream().mapToDouble(Stretch::lengthMm).sum();
    }

    /**
     * What a band is called in sentences.
     *
     * @param band its index from end A, 0-based
     * @return its name, or {@code band 3} for the third of a drawing without names
     */
    public String nameOf(int band) {
        return names.isEmpty() ? "band " + (band + 1) : names.get(band);
    }

    /**
     * The same drawing under another rule of order.
     *
     * @param other the rule
     * @return a copy with that rule
     */
    public Problem under(Order other) {
        return new Problem(stretches, names, endsDown, dryMm, times, other);
    }
}
