package tideband.plan;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Random;
import java.util.Set;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/** Random drawings for tests, from a seed. */
final class Drawings {

    private Drawings() {}

    /** A small drawing with few different films, so that ties and equal neighbours come up often. */
    static Problem small(Random random, int bands) {
        int kinds = 2 + random.nextInt(5);
        List<Stretch> stretches = new ArrayList<>();
        double lengthMm = 0;
        for (int i = 0; i < bands; i++) {
            double bandMm = 2 + random.nextInt(9);
            lengthMm += bandMm;
            boolean bare = random.nextInt(6) == 0;
            double aNm = bare ? 0 : 20.0 * (1 + random.nextInt(kinds));
            double bNm = bare || random.nextInt(3) != 0 ? aNm : 20.0 * (1 + random.nextInt(kinds));
            stretches.add(new Stretch(bandMm, aNm, bNm, bare, random.nextBoolean()));
        }
        double dryMm = random.nextInt(3) == 0 ? 0 : random.nextInt(1 + (int) (lengthMm / 3));
        return new Problem(stretches, ends(random, 0.7), dryMm, times(random), order(random));
    }

    /** A drawing as one might be made: films from 20 to 200 nm, a quarter fades, a few bare bands. */
    static Problem usual(Random random, int bands, Order order) {
        List<Stretch> stretches = new ArrayList<>();
        double lengthMm = 0;
        for (int i = 0; i < bands; i++) {
            double bandMm = 5 + random.nextInt(20);
            lengthMm += bandMm;
            boolean bare = random.nextDouble() < 0.08;
            double aNm = bare ? 0 : 20 + random.nextInt(181);
            double bNm = bare || random.nextDouble() >= 0.25 ? aNm : 20 + random.nextInt(181);
            stretches.add(new Stretch(bandMm, aNm, bNm, bare, random.nextDouble() < 0.4));
        }
        double dryMm = random.nextInt(10) < 3 ? 0 : random.nextDouble() * 0.15 * lengthMm;
        return new Problem(stretches, ends(random, 0.7), dryMm, BenchTimes.USUAL, order);
    }

    /** The next usual drawing that can be made. */
    static Problem possible(Random random, int bands, Order order) {
        while (true) {
            Problem problem = usual(random, bands, order);
            if (Hindrances.of(problem).isEmpty()) {
                return problem;
            }
        }
    }

    private static Set<End> ends(Random random, double both) {
        if (random.nextDouble() < both) {
            return EnumSet.allOf(End.class);
        }
        return EnumSet.of(random.nextBoolean() ? End.A : End.B);
    }

    /** Times in quarters of a minute, zero now and then, so that sums are exact and ties are many. */
    private static BenchTimes times(Random random) {
        return switch (random.nextInt(4)) {
            case 0, 1 -> BenchTimes.USUAL;
            case 2 -> new BenchTimes(few(random), few(random), few(random), few(random), few(random));
            default ->
                new BenchTimes(
                        random.nextInt(24) / 4.0,
                        random.nextInt(24) / 4.0,
                        random.nextInt(32) / 4.0,
                        random.nextInt(8) / 4.0,
                        random.nextInt(8) / 4.0);
        };
    }

    private static double few(Random random) {
        return random.nextInt(3);
    }

    private static Order order(Random random) {
        return random.nextBoolean() ? Order.THICKER_FIRST : Order.LEAST_MINUTES;
    }
}
