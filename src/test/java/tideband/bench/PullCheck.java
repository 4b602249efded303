package tideband.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tideband.design.Design;
import tideband.design.FadeStyle;
import tideband.design.PullSettings;
import tideband.piece.End;
import tideband.piece.Meniscus;
import tideband.piece.Piece;
import tideband.pull.Pull;
import tideband.pull.Row;

/** Holds the rows of one pull against what bath, supply and hand can do, and against geometry. */
final class PullCheck {
    /** The clock of a pull shows tenths of a second, so a move may last this much longer or shorter than meant. */
    private static final double TENTH_S = 0.1;

    private final Design design;
    private final End down;
    private final Pull pull;
    private final List<Row> rows;
    private final List<String> faults = new ArrayList<>();

    PullCheck(Design design, End down, Pull pull) {
        this.design = design;
        this.down = down;
        this.pull = pull;
        this.rows = pull.rows();
    }

    /** What is wrong with the pull, in words; empty when nothing is. */
    List<String> faults() {
        require(rows.size() >= 2 && rows.get(0).timeS() == 0, 0, "a pull starts at 0 s");
        require(rows.get(0).act() == Row.Act.LOWERED && rows.get(0).volts() == 0, 0, "it is lowered dead");
        require(rows.get(rows.size() - 1).lineMm() == 0, rows.size() - 1, "it ends out of the bath");
        require(pull.peakAmps() <= pull.currentLimitAmps() * (1 + 1e-9), 0, "the current keeps to its limit");
        require(pull.currentLimitAmps() <= design.supply().maxAmps(), 0, "the limit is one the supply has");
        for (int i = 0; i < rows.size(); i++) {
            stands(i);
            if (i > 0) {
                goesOn(i);
            }
        }
        holds();
        return faults;
    }

    private void require(boolean so, int row, String rule) {
        if (!so) {
            faults.add(String.format(Locale.ROOT, "%s: row %d %s", rule, row, rows.get(row)));
        }
    }

    /** What holds of each row alone. */
    private void stands(int i) {
        Row row = rows.get(i);
        Piece piece = design.piece();
        double mostVolts =
                Math.min(design.bath().ceilingVolts(), design.supply().maxVolts());
        require(row.volts() >= 0 && row.volts() <= mostVolts + 1e-9, i, "volts within bath and supply");
        if (design.pull().fade() != FadeStyle.FIXED_VOLTS || row.act() == Row.Act.HOLD) {
            double steps = row.volts() / design.supply().dialVolts();
            require(Math.abs(steps - Math.rint(steps)) < 1e-6, i, "volts on the dial");
        }
        double riseMm = Meniscus.riseMm(piece, piece.fromEnd(down, row.lineMm()), 0);
        require(Math.abs(row.depthMm() - (row.lineMm() - riseMm)) < 1e-9, i, "depth is line less rise");
        double plainMm = rows.get(0).depthMm() - row.depthMm();
        double sinkMm = design.vessel()
                .map(v -> (displacedMm3(rows.get(0).depthMm()) - displacedMm3(row.depthMm())) / v.areaMm2())
                .orElse(0.0);
        require(Math.abs(row.travelMm() - (plainMm - sinkMm)) < 1e-2, i, "travel is rise less sinking level");
        boolean immersed = rows.get(0).depthMm() > 0;
        require(sinkMm == 0 || !immersed || row.travelMm() < plainMm, i, "a vessel saves travel");
    }

    /** The metal below the level, summed over thin slices. */
    private double displacedMm3(double depthMm) {
        int slices = 2000;
        double sum = 0;
        for (int i = 0; i < slices && depthMm > 0; i++) {
            double fromEndMm = depthMm * (i + 0.5) / slices;
            sum += design.piece().sectionAreaMm2(design.piece().fromEnd(down, fromEndMm)) * depthMm / slices;
        }
        return sum;
    }

    /** What holds between a row and the one before. */
    private void goesOn(int i) {
        Row from = rows.get(i - 1);
        Row to = rows.get(i);
        PullSettings hand = design.pull();
        double lastsS = to.timeS() - from.timeS();
        double travelMm = to.travelMm() - from.travelMm();
        double raisedVolts = to.volts() - from.volts();
        require(lastsS >= 0, i, "the clock never goes back");
        require(to.lineMm() <= from.lineMm(), i, "the line never rises on the piece");
        boolean sameBand = from.act() != Row.Act.WITHDRAW;
        require(!sameBand || to.filmNm() >= from.filmNm() - 1e-9, i, "film at the line never shrinks");
        // In a fade at fixed volts the meter climbs by itself, as film grows under the current limit.
        boolean byItself = from.act() == Row.Act.FOLLOW;
        double slew = design.supply().slewVoltsPerS();
        boolean canRaise = Double.isInfinite(slew) || raisedVolts <= slew * lastsS + 1e-6;
        require(byItself || raisedVolts <= 0 || canRaise, i, "the supply can raise that fast");
        if (to.lineMm() < from.lineMm()) {
            require(lastsS > 0, i, "the line does not jump");
            require(travelMm <= hand.fastestMmPerS() * (lastsS + TENTH_S), i, "no faster than the hand");
            boolean live = from.volts() > 0 || to.volts() > 0;
            require(!live || travelMm >= hand.slowestMmPerS() * (lastsS - TENTH_S), i, "no slower than the hand");
        }
    }

    private void holds() {
        double stepS = Math.rint(Math.max(3, design.pull().holdS() / 4) * 10) / 10;
        double before = 0;
        for (int i = 0; i + 1 < rows.size(); i++) {
            Row row = rows.get(i);
            if (row.act() == Row.Act.HOLD) {
                double lastsS = rows.get(i + 1).timeS() - row.timeS();
                boolean whole = Math.abs(lastsS - design.pull().holdS()) < 1e-6 || Math.abs(lastsS - stepS) < 1e-6;
                // After a fade at fixed volts the volts before are those set, which the rows do not show.
                boolean fixed = design.pull().fade() == FadeStyle.FIXED_VOLTS;
                boolean afterFade =
                        rows.get(i - 1).act() == Row.Act.FADE || rows.get(i - 1).act() == Row.Act.FOLLOW;
                // At the current limit less than the volts set stands, and the next hold need not go above those.
                boolean limited = pull.peakAmps() >= 0.99 * pull.currentLimitAmps();
                boolean asBefore = afterFade || fixed || Math.abs(row.volts() - before) < 1e-9;
                boolean shortened = lastsS < design.pull().holdS() && (asBefore || limited);
                require(limited || row.volts() >= before - 1e-9, i, "volts of holds never fall");
                require(whole || shortened, i, "a hold is whole, or shortened so that volts need not fall");
                require(rows.get(i + 1).volts() == row.volts(), i, "volts stand in a hold");
                require(rows.get(i + 1).lineMm() == row.lineMm(), i, "the piece stands in a hold");
            }
            before = Math.max(before, row.volts());
        }
    }
}
