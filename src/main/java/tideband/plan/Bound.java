package tideband.plan;

import java.util.ArrayList;
import java.util.List;

/**
 * A lower bound on what is still to be paid.
 *
 * <p><b>Promise.</b> {@link #least} is never above the price of the rest of any plan that passes through the state,
 * under either order, and {@link #start} never above the price of any plan. Each is the largest over several families
 * of sub-drawings; within a family the promises of the {@link SubDrawing}s are added, which their prices allow.
 */
final class Bound {

    /** Up to here the projections of all sets of bands are kept in tables. */
    private static final int TABLE_BANDS = ExactSearch.MOST_BANDS;

    private final SubDrawing[][] families;
    private final int[][][] projected;
    private int lastAbove;

    private Bound(List<List<SubDrawing>> families, int bands) {
        this.families = families.stream().map(f -> f.toArray(new SubDrawing[0])).toArray(SubDrawing[][]::new);
        this.projected = bands <= TABLE_BANDS ? tables(bands) : null;
    }

    private int[][][] tables(int bands) {
        int[][][] tables = new int[families.length][][];
        for (int f = 0; f < families.length; f++) {
            tables[f] = new int[families[f].length][1 << bands];
            for (int s = 0; s < families[f].length; s++) {
                for (int set = 0; set < 1 << bands; set++) {
                    tables[f][s][set] = families[f][s].project(set);
                }
            }
        }
        return tables;
    }

    /** Families of one sub-drawing each, of about {@code size} bands, as {@link Selections} picks them. */
    static Bound ofSelections(Needs needs, Tariff tariff, int size) {
        int bands = needs.bands();
        List<List<SubDrawing>> families = new ArrayList<>();
        for (int[] members : Selections.of(bands, Math.min(size, bands))) {
            families.add(List.of(new SubDrawing(needs, members, tariff, false)));
        }
        return new Bound(families, bands);
    }

    /** One family: the whole drawing cut into rows of at most {@code size} neighbours that share their border bands. */
    static Bound ofRows(Needs needs, Tariff tariff, int size) {
        int bands = needs.bands();
        int rows = Math.max(1, (bands - 1 + size - 2) / (size - 1));
        List<SubDrawing> family = new ArrayList<>();
        for (int row = 0; row < rows; row++) {
            int first = row * (bands - 1) / rows;
            int last = (row + 1) * (bands - 1) / rows;
            family.add(new SubDrawing(needs, Selections.row(first, last), tariff.shared(rows), row > 0));
        }
        return new Bound(List.of(family), bands);
    }

    /** What any plan costs at least. */
    long start() {
        long best = 0;
        for (SubDrawing[] family : families) {
            long sum = 0;
            for (SubDrawing sub : family) {
                sum += sub.start();
            }
            best = Math.max(best, sum);
        }
        return best;
    }

    /** What is still to be paid at least. */
    long least(long finished, int end, long mask) {
        long best = 0;
        for (int f = 0; f < families.length; f++) {
            best = Math.max(best, ofFamily(f, finished, end, mask));
        }
        return best;
    }

    /** What is still to be paid at least, whatever the masks and the end. */
    long least(long finished) {
        long best = 0;
        for (SubDrawing[] family : families) {
            long sum = 0;
            for (SubDrawing sub : family) {
                sum += sub.least(sub.project(finished));
            }
            best = Math.max(best, sum);
        }
        return best;
    }

    /**
     * Whether {@link #least} is above a budget; quicker than asking how much, for the family that last was above its
     * budget is asked first.
     */
    boolean exceeds(long budget, long finished, int end, long mask) {
        if (ofFamily(lastAbove, finished, end, mask) > budget) {
            return true;
        }
        for (int f = 0; f < families.length; f++) {
            if (f != lastAbove && ofFamily(f, finished, end, mask) > budget) {
                lastAbove = f;
                return true;
            }
        }
        return false;
    }

    private long ofFamily(int f, long finished, int end, long mask) {
        long sum = 0;
        SubDrawing[] family = families[f];
        for (int s = 0; s < family.length; s++) {
            if (projected == null) {
                sum += family[s].least(family[s].project(finished), end, family[s].project(mask));
            } else {
                int[] place = projected[f][s];
                sum += family[s].least(place[(int) finished], end, place[(int) mask]);
            }
        }
        return sum;
    }
}
