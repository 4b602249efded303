package tideband.plan;

import java.util.ArrayList;
import java.util.List;

/** Which bands to plan by themselves for a bound. */
final class Selections {

    private static final int ROW_SETS = 3;
    private static final int SPREAD_SETS = 5;

    private Selections() {}

    /** Neighbouring bands. */
    static int[] row(int first, int last) {
        int[] members = new int[last - first + 1];
        for (int i = 0; i < members.length; i++) {
            members[i] = first + i;
        }
        return members;
    }

    /** Rows of {@code size + 1} neighbours from end to end, and sets of {@code size} bands spread over the drawing. */
    static List<int[]> of(int bands, int size) {
        if (size == bands) {
            return List.of(row(0, bands - 1));
        }
        List<int[]> sets = new ArrayList<>();
        for (int k = 0; k < ROW_SETS; k++) {
            int first = k * (bands - size - 1) / (ROW_SETS - 1);
            sets.add(row(first, first + size));
        }
        for (int k = 0; k < SPREAD_SETS; k++) {
            sets.add(spread(bands, size, k));
        }
        return sets;
    }

    /** Leaves out bands at strides, starting with band {@code k}. */
    private static int[] spread(int bands, int size, int k) {
        long left = (1L << bands) - 1;
        int band = k;
        for (int out = 0; out < bands - size; out++) {
            while (!Masks.has(left, band % bands)) {
                band++;
            }
            left &= ~(1L << (band % bands));
            band += 2 + k % 2;
        }
        return Masks.list(left).stream().mapToInt(Integer::intValue).toArray();
    }
}
