package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import tideband.bench.BenchPlan;
import tideband.design.Band;
import tideband.piece.End;
import tideband.plan.Immersion;
import tideband.pull.Row;
import tideband.window.work.Glance;

/**
 * What the pull of one immersion gives along the piece, as its rows say: a place has the film that was at the line when the
 * line passed it, and until then the film at the line. What is masked, or was never wet, is given none.
 */
final class Gives {
    /** Share of a stretch by which its ends are looked at from within. */
    private static final double WITHIN = 1e-6;

    private final double lengthMm;
    private final End down;
    private final List<Row> rows;
    private final List<Glance.Stretch> masked;
    private final List<Integer> finishes;
    private final int index;

    Gives(BenchPlan plan, int index) {
        Immersion immersion = plan.plan().immersions().get(index);
        this.index = index;
        this.lengthMm = plan.design().piece().lengthMm();
        this.down = immersion.endDown();
        this.rows = plan.pulls().get(index).rows();
        this.masked = stretches(plan.design().bands(), immersion.masked());
        this.finishes = immersion.finishes();
    }

    /** The stretches of some bands, neighbours joined. */
    static List<Glance.Stretch> stretches(List<Band> bands, List<Integer> chosen) {
        List<Glance.Stretch> found = new ArrayList<>();
        for (int i : chosen) {
            Band band = bands.get(i);
            int last = found.size() - 1;
            if (last >= 0 && found.get(last).toMm() == band.fromMm()) {
                found.set(last, new Glance.Stretch(found.get(last).fromMm(), band.toMm()));
            } else {
                found.add(new Glance.Stretch(band.fromMm(), band.toMm()));
            }
        }
        return found;
    }

    List<Glance.Stretch> masked() {
        return masked;
    }

    /**
     * The film given to a place.
     *
     * @param atMm the place, in mm from end A
     * @param untilRow the row of the pull at which it is looked at
     * @return film in nm; 0 where it is given none
     */
    double filmNm(double atMm, int untilRow) {
        if (covered(atMm)) {
            return 0;
        }
        double fromDownMm = down == End.A ? atMm : lengthMm - atMm;
        if (fromDownMm >= rows.get(0).lineMm()) {
            return 0;
        }
        for (int i = 0; i < untilRow; i++) {
            Row from = rows.get(i);
            Row to = rows.get(i + 1);
            if (to.lineMm() <= fromDownMm) {
                return passed(from, to, fromDownMm);
            }
        }
        return rows.get(untilRow).filmNm();
    }

    private boolean covered(double atMm) {
        for (Glance.Stretch stretch : masked) {
            if (stretch.fromMm() <= atMm && atMm <= stretch.toMm()) {
                return true;
            }
        }
        return false;
    }

    private static double passed(Row from, Row to, double fromDownMm) {
        return switch (from.act()) {
            case FADE, FOLLOW -> {
                double share = (from.lineMm() - fromDownMm) / (from.lineMm() - to.lineMm());
                yield from.filmNm() + (to.filmNm() - from.filmNm()) * share;
            }
            // With the supply off nothing grows on the way.
            case LOWERED, RAISE, HOLD, OFF, WITHDRAW, LIFT_OUT -> from.filmNm();
        };
    }

    /** The whole of it, for the field to show. */
    Glance glance() {
        TreeSet<Double> turns = new TreeSet<>(List.of(0.0, lengthMm));
        masked.forEach(stretch -> turns.addAll(List.of(stretch.fromMm(), stretch.toMm())));
        rows.forEach(row -> turns.add(down == End.A ? row.lineMm() : lengthMm - row.lineMm()));
        List<Glance.Point> line = new ArrayList<>();
        double fromMm = 0;
        for (double toMm : turns.tailSet(0.0, false)) {
            double inMm = WITHIN * (toMm - fromMm);
            add(line, fromMm, filmNm(fromMm + inMm, rows.size() - 1));
            add(line, toMm, filmNm(toMm - inMm, rows.size() - 1));
            fromMm = toMm;
        }
        return new Glance(index, down, line, masked, finishes);
    }

    private static void add(List<Glance.Point> line, double atMm, double filmNm) {
        Glance.Point point = new Glance.Point(atMm, filmNm);
        if (line.isEmpty() || !line.get(line.size() - 1).equals(point)) {
            line.add(point);
        }
    }
}
