package tideband.plan;

import java.util.Arrays;
import java.util.List;
import tideband.design.Order;
import tideband.piece.End;

/**
 * The rule of one immersion, boiled down. Walking outward from the end that is down, a band is finished if and only if
 * it is <em>finishable</em> from there (its film does not rise outward, and it stays clear of the dry length), is itself
 * unmasked, and every band it <em>needs</em> masked is masked. Those are
 *
 * <ul>
 *   <li>the deeper bands that are to be thinner anywhere than this band's deep side: unmasked, such a band would bring
 *       the running minimum below it (a bare one, of film 0, would stop the walk);
 *   <li>the next band outward, if the edge to it is crisp and its film there is to be thinner.
 * </ul>
 *
 * <p>Neither depends on other masks, so each pair of end and band has one fixed set of needed masks.
 */
final class Needs {

    /** Slack in mm when a band's far edge is compared with the dry length. */
    static final double EDGE_SLACK_MM = 1e-9;

    private final int bands;
    private final long[] finishable = new long[2];
    private final long[][] inner;
    private final long[][] crisp;
    private final double[] peakNm;
    private final double[][] deepNm;
    private final long filmed;
    private final boolean[] mayGoDown = new boolean[2];

    Needs(Problem problem) {
        List<Stretch> stretches = problem.stretches();
        bands = stretches.size();
        inner = new long[2][bands];
        crisp = new long[2][bands];
        peakNm = new double[bands];
        deepNm = new double[2][bands];
        long notBare = 0;
        for (int band = 0; band < bands; band++) {
            Stretch s = stretches.get(band);
            peakNm[band] = Math.max(s.aSideNm(), s.bSideNm());
            notBare |= s.bare() ? 0 : 1L << band;
        }
        filmed = notBare;
        for (End end : End.values()) {
            mayGoDown[Visit.index(end)] = problem.endsDown().contains(end);
            walk(problem, end);
        }
    }

    private void walk(Problem problem, End end) {
        List<Stretch> stretches = problem.stretches();
        int e = Visit.index(end);
        for (int step = 0; step < bands; step++) {
            int band = outward(end, step);
            Stretch s = stretches.get(band);
            deepNm[e][band] = deepSideNm(s, end);
            for (int before = 0; before < step; before++) {
                int deeper = outward(end, before);
                Stretch d = stretches.get(deeper);
                inner[e][band] |= Math.min(d.aSideNm(), d.bSideNm()) < deepNm[e][band] ? 1L << deeper : 0;
            }
            if (step + 1 < bands) {
                int next = outward(end, step + 1);
                Stretch q = stretches.get(next);
                boolean mask = (end == End.A ? s : q).crispAtB() && deepSideNm(q, end) < deepSideNm(s, end.other());
                crisp[e][band] = mask ? 1L << next : 0;
            }
            if (mayGoDown[e] && !s.bare() && !rises(s, end) && !dry(problem, band, end)) {
                finishable[e] |= 1L << band;
            }
        }
    }

    /** The band met at a step of the walk outward from an end. */
    private int outward(End end, int step) {
        return end == End.A ? step : bands - 1 - step;
    }

    /** Film at the side towards an end. */
    private static double deepSideNm(Stretch s, End end) {
        return end == End.A ? s.aSideNm() : s.bSideNm();
    }

    /** Whether a stretch gets thicker away from an end. */
    static boolean rises(Stretch s, End end) {
        return deepSideNm(s, end.other()) > deepSideNm(s, end);
    }

    /** The longest dry length with which a band stays clear of the holder, in mm. */
    static double clearMm(Problem problem, int band, End end) {
        List<Stretch> s = problem.stretches();
        List<Stretch> beyond = end == End.A ? s.subList(band + 1, s.size()) : s.subList(0, band);
        return beyond.stream().mapToDouble(Stretch::lengthMm).sum();
    }

    /** Whether a band reaches into the dry length with an end down. */
    static boolean dry(Problem problem, int band, End end) {
        return problem.dryMm() > clearMm(problem, band, end) + EDGE_SLACK_MM;
    }

    /** Whether the same ends may go down and each band needs the same others masked; films and lengths may differ. */
    boolean asksTheSameMasksAs(Needs other) {
        return bands == other.bands
                && filmed == other.filmed
                && Arrays.equals(mayGoDown, other.mayGoDown)
                && Arrays.equals(finishable, other.finishable)
                && Arrays.deepEquals(inner, other.inner)
                && Arrays.deepEquals(crisp, other.crisp);
    }

    int bands() {
        return bands;
    }

    /** The bands that are not bare. */
    long filmed() {
        return filmed;
    }

    boolean mayGoDown(int end) {
        return mayGoDown[end];
    }

    /** The bands that some immersion with this end down can finish. */
    long finishable(int end) {
        return finishable[end];
    }

    /** The deeper, thinner bands that must be masked for this band. */
    long inner(int end, int band) {
        return inner[end][band];
    }

    /** The next band outward, if it must be masked for this band's crisp edge; else none. */
    long crisp(int end, int band) {
        return crisp[end][band];
    }

    /** All that must be masked for this band. */
    long all(int end, int band) {
        return inner[end][band] | crisp[end][band];
    }

    double peakNm(int band) {
        return peakNm[band];
    }

    /** Film of a band at its side towards an end. */
    double deepNm(int end, int band) {
        return deepNm[end][band];
    }

    /** The bands that an immersion finishes. */
    long finished(long masked, int end) {
        long finished = 0;
        for (long rest = finishable[end] & ~masked; rest != 0; rest &= rest - 1) {
            int band = Long.numberOfTrailingZeros(rest);
            if (((inner[end][band] | crisp[end][band]) & ~masked) == 0) {
                finished |= 1L << band;
            }
        }
        return finished;
    }

    /**
     * The bands of which the next immersion must finish one. Under thicker-first these are the thickest still
     * unfinished: were none of them finished now, one would be later, and the highest new film would rise.
     */
    long due(long finished, Order order) {
        long open = filmed & ~finished;
        return order == Order.THICKER_FIRST ? thickest(open) : open;
    }

    private long thickest(long open) {
        double highest = 0;
        long top = 0;
        for (long rest = open; rest != 0; rest &= rest - 1) {
            int band = Long.numberOfTrailingZeros(rest);
            if (peakNm[band] > highest) {
                highest = peakNm[band];
                top = 0;
            }
            top |= peakNm[band] == highest ? 1L << band : 0;
        }
        return top;
    }
}
