package tideband.pacer;

import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.piece.End;
import tideband.plan.Immersion;
import tideband.pull.Pull;
import tideband.pull.Row;

/**
 * The film one immersion leaves along the piece: each place keeps what the line had when it passed. Creep of places that had
 * more before is left out.
 */
public final class FilmLeft {
    private final BenchPlan plan;
    private final Immersion immersion;
    private final Pull pull;

    /**
     * The film an immersion leaves.
     *
     * @param plan the plan
     * @param immersion index of the immersion, 0-based
     */
    public FilmLeft(BenchPlan plan, int immersion) {
        this.plan = plan;
        this.immersion = plan.plan().immersions().get(immersion);
        this.pull = plan.pulls().get(immersion);
    }

    /**
     * The film it leaves at a place.
     *
     * @param atMm place in mm from end A
     * @return film in nm; 0 where it leaves none
     */
    public double filmNm(double atMm) {
        if (masked(atMm)) {
            return 0;
        }
        double lineMm = fromDownMm(atMm);
        List<Row> rows = pull.rows();
        if (lineMm >= rows.get(0).lineMm()) {
            return 0;
        }
        for (int i = 1; i < rows.size(); i++) {
            Row from = rows.get(i - 1);
            Row to = rows.get(i);
            if (to.lineMm() <= lineMm && to.lineMm() < from.lineMm()) {
                Stretch stretch = new Stretch(from, to);
                return Stretch.between(from.filmNm(), to.filmNm(), stretch.shareAtLine(lineMm));
            }
        }
        return rows.get(rows.size() - 1).filmNm();
    }

    /**
     * Whether a place is masked in this immersion.
     *
     * @param atMm place in mm from end A
     * @return true under a mask
     */
    public boolean masked(double atMm) {
        return immersion.masked().stream().anyMatch(band -> {
            BenchBand each = plan.bands().get(band);
            return each.fromMm() <= atMm && atMm <= each.toMm();
        });
    }

    /** Distance of a place from the end that is down. */
    private double fromDownMm(double atMm) {
        return immersion.endDown() == End.A ? atMm : plan.design().piece().lengthMm() - atMm;
    }

    /**
     * The most that the immersions before one left at a place.
     *
     * @param plan the plan
     * @param immersion index of the immersion, 0-based
     * @param atMm place in mm from end A
     * @return film in nm; 0 where they left none
     */
    public static double before(BenchPlan plan, int immersion, double atMm) {
        double mostNm = 0;
        for (int i = 0; i < immersion; i++) {
            mostNm = Math.max(mostNm, new FilmLeft(plan, i).filmNm(atMm));
        }
        return mostNm;
    }
}
