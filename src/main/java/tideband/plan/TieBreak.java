package tideband.plan;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import tideband.plan.ExactSearch.Layer;
import tideband.plan.ExactSearch.Slots;

/**
 * The one plan among all of least price, in the order of {@link Draft}.
 *
 * <p>Every state on some plan of least price is found by walking back from the last states: a state comes before
 * another if its price and that of the step between them make up the other's price. Then the best beginning of each is
 * worked out, in rising order of finished sets. A better beginning stays better whatever follows, for lengths add up,
 * and after equal lengths and equally many visits the first difference decides.
 */
final class TieBreak {

    private final ExactSearch search;
    private final Tariff tariff;
    private final Layer[] layers;
    private final long[] lengthSteps;
    private final Map<Long, Node> nodes = new HashMap<>();
    private final Deque<Node> unvisited = new ArrayDeque<>();

    TieBreak(ExactSearch search, Tariff tariff, Layer[] layers, long[] lengthSteps) {
        this.search = search;
        this.tariff = tariff;
        this.layers = layers.clone();
        this.lengthSteps = lengthSteps.clone();
    }

    /** A state on a plan of least price. */
    private static final class Node {
        final int finished;
        final int slot;
        final long price;
        final List<Node> before = new ArrayList<>();
        boolean mayBegin;
        Beginning best;

        Node(int finished, int slot, long price) {
            this.finished = finished;
            this.slot = slot;
            this.price = price;
        }
    }

    /**
     * How a state is reached.
     *
     * @param visit the last visit
     * @param before what came before it, or null
     * @param visits how many visits in all
     * @param maskedSteps the length masked so far
     */
    private record Beginning(Visit visit, Beginning before, int visits, long maskedSteps) {

        boolean betterThan(Beginning other) {
            if (maskedSteps != other.maskedSteps) {
                return maskedSteps < other.maskedSteps;
            }
            if (visits != other.visits) {
                return visits < other.visits;
            }
            int order = Integer.signum(firstDifference(other, Comparator.comparingInt(Visit::end)));
            return (order != 0 ? order : firstDifference(other, Comparator.comparingLong(Visit::masked))) < 0;
        }

        private int firstDifference(Beginning other, Comparator<Visit> by) {
            int order = 0;
            Beginning mine = this;
            Beginning theirs = other;
            for (int left = visits; left > 0; left--) {
                int here = by.compare(mine.visit, theirs.visit);
                order = here != 0 ? here : order;
                mine = mine.before;
                theirs = theirs.before;
            }
            return order;
        }
    }

    List<Visit> visits() {
        List<Node> last = lastNodes();
        while (!unvisited.isEmpty()) {
            findBefore(unvisited.pop());
        }
        List<Node> rising = new ArrayList<>(nodes.values());
        rising.sort(Comparator.comparingInt((Node n) -> n.finished).thenComparingInt(n -> n.slot));
        rising.forEach(this::begin);
        Beginning best = null;
        for (Node node : last) {
            best = best == null || node.best.betterThan(best) ? node.best : best;
        }
        List<Visit> visits = new ArrayList<>();
        for (Beginning b = best; b != null; b = b.before) {
            visits.add(0, b.visit);
        }
        return visits;
    }

    private int mask(int slot) {
        return slot & (search.masks() - 1);
    }

    private int end(int slot) {
        return slot / search.masks();
    }

    private List<Node> lastNodes() {
        int full = layers.length - 1;
        Slots slots = layers[full].slots();
        long least = Tariff.NEVER;
        for (int i = 0; i < slots.slot.length; i++) {
            least = Math.min(least, slots.price[i] + tariff.strip() * Masks.runs(mask(slots.slot[i])));
        }
        List<Node> last = new ArrayList<>();
        for (int i = 0; i < slots.slot.length; i++) {
            if (slots.price[i] + tariff.strip() * Masks.runs(mask(slots.slot[i])) == least) {
                last.add(node(full, slots.slot[i], slots.price[i]));
            }
        }
        return last;
    }

    private Node node(int finished, int slot, long price) {
        return nodes.computeIfAbsent((long) finished << 32 | slot, key -> {
            Node node = new Node(finished, slot, price);
            unvisited.push(node);
            return node;
        });
    }

    private void findBefore(Node node) {
        int finishes = search.finishes(node.slot);
        int mask = mask(node.slot);
        long paidBefore = node.price - tariff.immersion();
        node.mayBegin = node.finished == finishes && paidBefore == tariff.maskFirst() * Masks.runs(mask);
        for (int done = 1; done < node.finished; done++) {
            Layer layer = layers[done];
            if (layer == null || (done | finishes) != node.finished || (layer.due() & finishes) == 0) {
                continue;
            }
            Slots slots = layer.slots();
            for (int i = 0; i < slots.slot.length; i++) {
                long rest = paidBefore - slots.price[i];
                if (rest >= 0) {
                    long turn = end(slots.slot[i]) == end(node.slot) ? 0 : tariff.turn();
                    if (rest == turn + tariff.change(mask(slots.slot[i]), mask)) {
                        node.before.add(node(done, slots.slot[i], slots.price[i]));
                    }
                }
            }
        }
    }

    private void begin(Node node) {
        int mask = mask(node.slot);
        Visit visit = new Visit(mask, end(node.slot));
        if (node.mayBegin) {
            node.best = new Beginning(visit, null, 1, Draft.steps(mask, lengthSteps));
        }
        for (Node before : node.before) {
            long steps = before.best.maskedSteps + Draft.steps(mask & ~mask(before.slot), lengthSteps);
            Beginning way = new Beginning(visit, before.best, before.best.visits + 1, steps);
            node.best = node.best == null || way.betterThan(node.best) ? way : node.best;
        }
    }
}
