package tideband.plan;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.PriorityQueue;
import java.util.Set;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/**
 * The least plan by plain uniform-cost search over every state and every next mask, straight from the definition in the
 * specification. It shares no code with the planner: sets are bits here too, but the walk, the runs and the costs are
 * worked out anew, in minutes as they are given.
 */
final class Exhaustive {

    private final Problem problem;
    private final List<Stretch> bands;
    private final int n;
    private final int[][] finishes;
    private final Set<State> settled = new HashSet<>();

    Exhaustive(Problem problem) {
        this.problem = problem;
        this.bands = problem.stretches();
        this.n = bands.size();
        this.finishes = new int[2][1 << n];
        for (End end : End.values()) {
            for (int set = 0; set < 1 << n; set++) {
                int masked = set;
                boolean[] done = Walk.finishes(problem, i -> (masked >> i & 1) == 1, end);
                for (int i = 0; i < n; i++) {
                    finishes[(end == End.A ? 0 : 1)][set] |= done[i] ? 1 << i : 0;
                }
            }
        }
    }

    /** A way to a state: its last immersion, the way before it, and the figures it is judged by. */
    record Way(
            Way before,
            int masked,
            End end,
            int finished,
            double minutes,
            int runs,
            int turns,
            double lengthMm,
            int steps,
            double peakNm) {

        List<Way> all() {
            List<Way> all = new ArrayList<>();
            for (Way way = this; way.before != null; way = way.before) {
                all.add(way);
            }
            Collections.reverse(all);
            return all;
        }
    }

    static final Comparator<Way> LEAST = Comparator.comparingDouble(Way::minutes)
            .thenComparingInt(Way::runs)
            .thenComparingInt(Way::turns)
            .thenComparingDouble(Way::lengthMm)
            .thenComparingInt(Way::steps)
            .thenComparing((a, b) -> firstDifference(a, b, Comparator.comparing(Way::end)))
            .thenComparing((a, b) -> firstDifference(a, b, Comparator.comparingInt(Way::masked)));

    private static int firstDifference(Way one, Way two, Comparator<Way> by) {
        List<Way> a = one.all();
        List<Way> b = two.all();
        for (int i = 0; i < a.size(); i++) {
            int order = by.compare(a.get(i), b.get(i));
            if (order != 0) {
                return order;
            }
        }
        return 0;
    }

    private record State(int finished, int masked, End end, double peakNm) {}

    /** The least plan, its final stripping paid, or empty if there is none. */
    Optional<Way> least() {
        int all = 0;
        for (int i = 0; i < n; i++) {
            all |= bands.get(i).bare() ? 0 : 1 << i;
        }
        PriorityQueue<Way> queue = new PriorityQueue<>(LEAST);
        Map<State, Way> best = new HashMap<>();
        queue.add(new Way(null, 0, null, 0, 0, 0, 0, 0, 0, Double.POSITIVE_INFINITY));
        Way goal = null;
        while (!queue.isEmpty() && (goal == null || LEAST.compare(queue.peek(), goal) < 0)) {
            Way way = queue.poll();
            if (!settled.add(state(way))) {
                continue;
            }
            if (way.finished() == all) {
                Way stripped = stripped(way);
                goal = goal == null || LEAST.compare(stripped, goal) < 0 ? stripped : goal;
                continue;
            }
            for (End end : problem.endsDown()) {
                for (int masked = 0; masked < 1 << n; masked++) {
                    Way next = after(way, masked, end);
                    if (next == null) {
                        continue;
                    }
                    Way known = best.get(state(next));
                    if (known == null || LEAST.compare(next, known) < 0) {
                        best.put(state(next), next);
                        queue.add(next);
                    }
                }
            }
        }
        return Optional.ofNullable(goal);
    }

    int settled() {
        return settled.size();
    }

    private State state(Way way) {
        double peakNm = problem.order() == Order.THICKER_FIRST ? way.peakNm() : 0;
        return new State(way.finished(), way.masked(), way.end(), peakNm);
    }

    private Way stripped(Way way) {
        double minutes = way.minutes() + runs(way.masked()) * problem.times().stripMin();
        return new Way(
                way.before(),
                way.masked(),
                way.end(),
                way.finished(),
                minutes,
                way.runs(),
                way.turns(),
                way.lengthMm(),
                way.steps(),
                way.peakNm());
    }

    /** The way one immersion on, or null if it finishes nothing new or breaks the order. */
    private Way after(Way way, int masked, End end) {
        int newly = finishes[end == End.A ? 0 : 1][masked] & ~way.finished();
        if (newly == 0) {
            return null;
        }
        double peakNm = 0;
        for (int i = 0; i < n; i++) {
            if ((newly >> i & 1) == 1) {
                peakNm = Math.max(
                        peakNm, Math.max(bands.get(i).aSideNm(), bands.get(i).bSideNm()));
            }
        }
        if (problem.order() == Order.THICKER_FIRST && peakNm > way.peakNm()) {
            return null;
        }
        BenchTimes times = problem.times();
        boolean first = way.before() == null;
        int put = masked & ~way.masked();
        boolean turn = !first && way.end() != end;
        double minutes = way.minutes()
                + times.immersionMin()
                + runs(put) * (first ? times.maskMin() : times.maskOverMin())
                + runs(way.masked() & ~masked) * times.stripMin()
                + (turn ? times.turnMin() : 0);
        double lengthMm = way.lengthMm();
        for (int i = 0; i < n; i++) {
            lengthMm += (put >> i & 1) == 1 ? bands.get(i).lengthMm() : 0;
        }
        return new Way(
                way,
                masked,
                end,
                way.finished() | newly,
                minutes,
                way.runs() + runs(put),
                way.turns() + (turn ? 1 : 0),
                lengthMm,
                way.steps() + 1,
                peakNm);
    }

    private int runs(int set) {
        int runs = 0;
        for (int i = 0; i < n; i++) {
            runs += (set >> i & 1) == 1 && (i == 0 || (set >> (i - 1) & 1) == 0) ? 1 : 0;
        }
        return runs;
    }
}
