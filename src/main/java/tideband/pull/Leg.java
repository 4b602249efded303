package tideband.pull;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.piece.End;
import tideband.plan.Immersion;

/**
 * A stretch that one immersion finishes in one go, seen from the end that is down.
 *
 * @param bands the bands in it, the shallowest first; a fade is always alone
 * @param outerMm its shallow edge, in mm from the end that is down
 * @param innerMm its deep edge
 * @param outerNm film wanted at the shallow edge, in nm
 * @param innerNm film wanted at the deep edge, not below {@code outerNm}
 */
record Leg(List<Integer> bands, double outerMm, double innerMm, double outerNm, double innerNm) {
    /** Levels closer than this share of their film are made in one hold: no hand could tell them apart. */
    private static final double ONE_LEVEL = 0.004;

    /** Marks of a fade stand about this far apart. */
    private static final double MARK_MM = 4;

    private static final int FEWEST_MARKS = 4;
    private static final int MOST_MARKS = 24;

    Leg {
        bands = List.copyOf(bands);
    }

    /** The band at its outer edge. */
    int band() {
        return bands.get(0);
    }

    boolean fade() {
        return innerNm > outerNm;
    }

    /** A place within it, by its share of the way from the shallow edge to the deep one: exactly the edges at 0 and 1. */
    double lineMm(double share) {
        return (1 - share) * outerMm + share * innerMm;
    }

    /** The film wanted there. */
    double filmNm(double share) {
        return (1 - share) * outerNm + share * innerNm;
    }

    /** How much thicker its deep edge is to be. */
    double riseNm() {
        return innerNm - outerNm;
    }

    /** How many marks a hand is given on the way through it. */
    int marks() {
        return (int) Math.max(FEWEST_MARKS, Math.min(MOST_MARKS, Math.round((outerMm - innerMm) / MARK_MM)));
    }

    /**
     * The legs of an immersion, the shallowest first.
     *
     * <p>The aims may have been corrected for later creep and then no longer rise with depth: they are made to, by
     * pooling neighbours that fall (pool adjacent violators, M. Ayer et al., Ann. Math. Stat. 26 (1955) 641-647).
     */
    static List<Leg> of(Immersion immersion, List<Target> aims, double lengthMm) {
        boolean fromA = immersion.endDown() == End.A;
        List<Leg> legs = new ArrayList<>();
        List<Integer> finishes = immersion.finishes();
        for (int i = 0; i < finishes.size(); i++) {
            int band = finishes.get(fromA ? finishes.size() - 1 - i : i);
            Target aim = aims.get(band);
            legs.add(new Leg(
                    List.of(band),
                    fromA ? aim.toMm() : lengthMm - aim.fromMm(),
                    fromA ? aim.fromMm() : lengthMm - aim.toMm(),
                    fromA ? aim.bSideNm() : aim.aSideNm(),
                    fromA ? aim.aSideNm() : aim.bSideNm()));
        }
        for (int i = 1; i < legs.size(); ) {
            Optional<Leg> joined = legs.get(i - 1).joinedWith(legs.get(i));
            if (joined.isEmpty()) {
                i++;
            } else {
                legs.set(i - 1, joined.get());
                legs.remove(i);
                i = Math.max(1, i - 1);
            }
        }
        for (int i = 0; i < legs.size(); i++) {
            legs.set(i, legs.get(i).meeting(legs, i));
        }
        return legs;
    }

    /**
     * A fade that comes as near as makes no odds to a level beside it starts or ends on that level. Where corrections have brought
     * its deep side above the level next to it, which can then have no less, the two meet halfway.
     */
    private Leg meeting(List<Leg> legs, int place) {
        if (!fade()) {
            return this;
        }
        double outer = outerNm;
        double inner = innerNm;
        if (place > 0 && alike(legs.get(place - 1).innerNm, outerNm)) {
            outer = legs.get(place - 1).innerNm;
        }
        if (place + 1 < legs.size()) {
            double nextNm = legs.get(place + 1).outerNm;
            if (alike(nextNm, innerNm)) {
                inner = nextNm;
            } else if (nextNm < innerNm) {
                inner = (innerNm + nextNm) / 2;
            }
        }
        return inner > outer ? new Leg(bands, outerMm, innerMm, outer, inner) : this;
    }

    private static boolean alike(double someNm, double otherNm) {
        return Math.abs(someNm - otherNm) <= ONE_LEVEL * otherNm;
    }

    /** The two as one level, where their films are too close to tell apart or in the wrong order. */
    private Optional<Leg> joinedWith(Leg deeper) {
        boolean apart = deeper.outerNm - innerNm > ONE_LEVEL * innerNm;
        if (apart || fade() || deeper.fade()) {
            return Optional.empty();
        }
        List<Integer> all = new ArrayList<>(bands);
        all.addAll(deeper.bands);
        double levelNm = (outerNm * bands.size() + deeper.outerNm * deeper.bands.size()) / all.size();
        return Optional.of(new Leg(all, outerMm, deeper.innerMm, levelNm, levelNm));
    }
}
