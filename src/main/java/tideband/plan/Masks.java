package tideband.plan;

import java.util.ArrayList;
import java.util.List;

/** Sets of bands as bits: bit {@code i} stands for band {@code i} from end A. A run is a maximal row of set bits. */
final class Masks {

    private Masks() {}

    /** How many runs: a run starts where a bit is set and the one before it is not. */
    static int runs(long bands) {
        return Long.bitCount(bands & ~(bands << 1));
    }

    static boolean has(long bands, int band) {
        return (bands >>> band & 1) != 0;
    }

    static List<Run> runList(long bands) {
        List<Run> runs = new ArrayList<>();
        long rest = bands;
        while (rest != 0) {
            int first = Long.numberOfTrailingZeros(rest);
            int last = first + Long.numberOfTrailingZeros(~(rest >>> first)) - 1;
            runs.add(new Run(first, last));
            rest &= ~of(first, last);
        }
        return runs;
    }

    static List<Integer> list(long bands) {
        List<Integer> list = new ArrayList<>();
        for (long rest = bands; rest != 0; rest &= rest - 1) {
            list.add(Long.numberOfTrailingZeros(rest));
        }
        return list;
    }

    /** The bands from {@code first} to {@code last}, inclusive. */
    static long of(int first, int last) {
        return (-1L >>> (63 - (last - first))) << first;
    }
}
