package tideband.trial;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import tideband.oxide.Bath;
import tideband.oxide.Patchwork;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Waterline;
import tideband.pull.Row;

/**
 * The surface of the piece in short cells, each split round the piece into lanes that the waterline passes at slightly
 * different heights, with the film each has grown so far.
 *
 * <p>The lanes stand for the blur of a meniscus: a line that lies anywhere within the blur with equal chance, by the
 * three-point Gauss-Legendre rule. The blur is that of the place where the line is, for a piece is not equally thick
 * everywhere. A cell leaves the bath when the line of its lane passes its middle. A mutable work object for one thread.
 */
final class Surface {
    /** Where the three lanes' lines lie, in shares of the blur, and how much of the surface each has. */
    private static final double[] LANE_OFFSETS = {-Math.sqrt(0.6), 0, Math.sqrt(0.6)};

    private static final double[] LANE_SHARES = {5.0 / 18, 8.0 / 18, 5.0 / 18};

    /** A line moves at most this far in one step of growth, so that the area it leaves behind is right to a cell or two. */
    private static final double LINE_STEP_MM = 1;

    private final Piece piece;
    private final Bath bath;
    private final double limitAmps;
    private final double[] edgesMm;
    private final double[] areaCm2;
    private final double[] filmNm;

    Surface(Piece piece, Bath bath, double limitAmps, double[] edgesMm) {
        this.piece = piece;
        this.bath = bath;
        this.limitAmps = limitAmps;
        this.edgesMm = edgesMm.clone();
        this.areaCm2 = new double[edgesMm.length - 1];
        for (int cell = 0; cell < areaCm2.length; cell++) {
            areaCm2[cell] = piece.wetAreaMm2(edgesMm[cell], edgesMm[cell + 1]) / 100;
        }
        this.filmNm = new double[areaCm2.length * LANE_OFFSETS.length];
        Arrays.fill(filmNm, bath.nativeNm());
    }

    static int lanes() {
        return LANE_OFFSETS.length;
    }

    static double laneShare(int lane) {
        return LANE_SHARES[lane];
    }

    /** The film of a cell in a lane, in nm. */
    double filmNm(int cell, int lane) {
        return filmNm[lane * areaCm2.length + cell];
    }

    /** Carries out one immersion. */
    void dip(Dip dip) {
        new Passage(dip).carryOut();
    }

    /** One immersion under way. */
    private final class Passage {
        private final Dip dip;
        private final Waterline waterline;
        private final int[][] leaving = new int[LANE_OFFSETS.length][];
        private final int[] gone = new int[LANE_OFFSETS.length];
        private final Patchwork patchwork;

        Passage(Dip dip) {
            this.dip = dip;
            List<Row> rows = dip.pull().rows();
            this.waterline = new Waterline(piece, dip.down(), Optional.empty());
            double blurMm = waterline.blurMm(rows.get(0).lineMm());
            double mostVolts = rows.stream().mapToDouble(Row::volts).max().orElse(0);
            double[] wetCm2 = new double[filmNm.length];
            for (int lane = 0; lane < LANE_OFFSETS.length; lane++) {
                leaving[lane] = wetOutermostFirst(rows.get(0).lineMm() + LANE_OFFSETS[lane] * blurMm);
                for (int cell : leaving[lane]) {
                    wetCm2[lane * areaCm2.length + cell] = areaCm2[cell] * LANE_SHARES[lane];
                }
            }
            this.patchwork = new Patchwork(
                    bath,
                    limitAmps,
                    filmNm,
                    wetCm2,
                    mostVolts,
                    Math.max(1, dip.pull().durationS()));
        }

        private int[] wetOutermostFirst(double lineMm) {
            int count = areaCm2.length;
            int[] cells = new int[count];
            int wet = 0;
            for (int i = 0; i < count; i++) {
                int cell = dip.down() == End.A ? count - 1 - i : i;
                if (fromDownMm(cell) < lineMm && !covered(cell)) {
                    cells[wet++] = cell;
                }
            }
            return Arrays.copyOf(cells, wet);
        }

        private double fromDownMm(int cell) {
            return piece.fromEnd(dip.down(), (edgesMm[cell] + edgesMm[cell + 1]) / 2);
        }

        private boolean covered(int cell) {
            double middleMm = (edgesMm[cell] + edgesMm[cell + 1]) / 2;
            return dip.covers().stream().anyMatch(c -> c.fromMm() <= middleMm && middleMm <= c.toMm());
        }

        void carryOut() {
            List<Row> rows = dip.pull().rows();
            double blurMm = waterline.blurMm(rows.get(0).lineMm());
            for (int i = 1; i < rows.size(); i++) {
                Row from = rows.get(i - 1);
                Row to = rows.get(i);
                if (to.lineMm() > from.lineMm() || to.timeS() < from.timeS()) {
                    throw new IllegalArgumentException("a pull only rises and its clock only goes on, but row " + i
                            + " goes from " + from + " to " + to);
                }
                double nextBlurMm = to.lineMm() == from.lineMm() ? blurMm : waterline.blurMm(to.lineMm());
                go(from, to, blurMm, nextBlurMm);
                blurMm = nextBlurMm;
            }
            for (int lane = 0; lane < LANE_OFFSETS.length; lane++) {
                for (int i = gone[lane]; i < leaving[lane].length; i++) {
                    int place = lane * areaCm2.length + leaving[lane][i];
                    filmNm[place] = patchwork.filmNm(place);
                }
            }
        }

        private void go(Row from, Row to, double fromBlurMm, double toBlurMm) {
            double durationS = to.timeS() - from.timeS();
            double doneS = 0;
            while (doneS < durationS) {
                double leftS = durationS - doneS;
                double lineMmPerS = (from.lineMm() - to.lineMm()) / durationS;
                double mostS = lineMmPerS > 0 ? Math.min(leftS, LINE_STEP_MM / lineMmPerS) : leftS;
                double voltsPerS = (to.volts() - from.volts()) / durationS;
                double stepS = patchwork.growth().step(mostS, from.volts() + voltsPerS * doneS, voltsPerS);
                double beforeShare = doneS / durationS;
                doneS = stepS == leftS ? durationS : doneS + stepS;
                double afterShare = doneS / durationS;
                for (int lane = 0; lane < LANE_OFFSETS.length; lane++) {
                    double fromMm = from.lineMm() + LANE_OFFSETS[lane] * fromBlurMm;
                    double toMm = to.lineMm() + LANE_OFFSETS[lane] * toBlurMm;
                    leaveBetween(lane, between(fromMm, toMm, beforeShare), between(fromMm, toMm, afterShare));
                }
            }
        }

        private static double between(double from, double to, double share) {
            return (1 - share) * from + share * to;
        }

        /** Takes out of the bath what the line of a lane passes, each cell with the film it had at that moment. */
        private void leaveBetween(int lane, double lineBeforeMm, double lineMm) {
            while (gone[lane] < leaving[lane].length) {
                int cell = leaving[lane][gone[lane]];
                double cellMm = fromDownMm(cell);
                if (cellMm < lineMm) {
                    break;
                }
                double passedMm = lineBeforeMm - lineMm;
                double share = passedMm > 0 ? Math.min(1, Math.max(0, (lineBeforeMm - cellMm) / passedMm)) : 1;
                int place = lane * areaCm2.length + cell;
                filmNm[place] = patchwork.filmWithinStepNm(place, share);
                patchwork.setWetAreaCm2(place, 0);
                gone[lane]++;
            }
        }
    }
}
