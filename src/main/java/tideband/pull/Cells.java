package tideband.pull;

import java.util.Arrays;
import java.util.List;
import tideband.piece.End;
import tideband.piece.Piece;

/**
 * The piece cut into cells for planning: one cell a level band (nothing inside it can differ), several a fade. Films
 * change as immersions are gone through.
 */
final class Cells {
    private static final int PER_FADE = 12;

    private final double lengthMm;
    private final int[] firstOfBand;
    private final double[] fromMm;
    private final double[] toMm;
    private final double[] areaCm2;
    private final double[] filmNm;

    Cells(Piece piece, List<Target> targets, double nativeNm) {
        lengthMm = piece.lengthMm();
        firstOfBand = new int[targets.size() + 1];
        for (int band = 0; band < targets.size(); band++) {
            firstOfBand[band + 1] = firstOfBand[band] + (targets.get(band).fade() ? PER_FADE : 1);
        }
        int count = firstOfBand[targets.size()];
        fromMm = new double[count];
        toMm = new double[count];
        areaCm2 = new double[count];
        filmNm = new double[count];
        for (int band = 0; band < targets.size(); band++) {
            Target target = targets.get(band);
            int cells = firstOfBand[band + 1] - firstOfBand[band];
            double stepMm = (target.toMm() - target.fromMm()) / cells;
            for (int i = 0; i < cells; i++) {
                int cell = firstOfBand[band] + i;
                fromMm[cell] = target.fromMm() + i * stepMm;
                toMm[cell] = i == cells - 1 ? target.toMm() : fromMm[cell] + stepMm;
                areaCm2[cell] = piece.wetAreaMm2(fromMm[cell], toMm[cell]) / 100;
            }
        }
        startAfresh(nativeNm);
    }

    private Cells(Cells other) {
        lengthMm = other.lengthMm;
        firstOfBand = other.firstOfBand;
        fromMm = other.fromMm;
        toMm = other.toMm;
        areaCm2 = other.areaCm2;
        filmNm = other.filmNm.clone();
    }

    /** The same cells with films of their own. */
    Cells copy() {
        return new Cells(this);
    }

    void startAfresh(double nativeNm) {
        Arrays.fill(filmNm, nativeNm);
    }

    int count() {
        return filmNm.length;
    }

    int bandOf(int cell) {
        int band = 0;
        while (firstOfBand[band + 1] <= cell) {
            band++;
        }
        return band;
    }

    int firstOf(int band) {
        return firstOfBand[band];
    }

    int afterLastOf(int band) {
        return firstOfBand[band + 1];
    }

    double filmNm(int cell) {
        return filmNm[cell];
    }

    double[] filmsNm() {
        return filmNm.clone();
    }

    void setFilmNm(int cell, double nm) {
        filmNm[cell] = nm;
    }

    double areaCm2(int cell) {
        return areaCm2[cell];
    }

    /** The middle of a cell, in mm from the end that is down. */
    double middleMm(int cell, End down) {
        double middle = (fromMm[cell] + toMm[cell]) / 2;
        return down == End.A ? middle : lengthMm - middle;
    }

    /** How much of a cell is below the line, 0 to 1. */
    double wetShare(int cell, End down, double lineMm) {
        double near = down == End.A ? fromMm[cell] : lengthMm - toMm[cell];
        double far = down == End.A ? toMm[cell] : lengthMm - fromMm[cell];
        return Math.max(0, Math.min(1, (lineMm - near) / (far - near)));
    }

    /** The films at a band's two sides: ends of the straight line fitted through its cells by least squares. */
    double[] sides(int band) {
        int first = firstOf(band);
        int count = afterLastOf(band) - first;
        double mean = 0;
        for (int i = 0; i < count; i++) {
            mean += filmNm[first + i] / count;
        }
        double slope = 0;
        double spread = 0;
        for (int i = 0; i < count; i++) {
            double offset = i - (count - 1) / 2.0;
            slope += offset * filmNm[first + i];
            spread += offset * offset;
        }
        double halfRise = spread > 0 ? slope / spread * count / 2 : 0;
        return new double[] {mean - halfRise, mean + halfRise};
    }

    int bands() {
        return firstOfBand.length - 1;
    }

    /** The innermost cell of a band, the last to leave the bath. */
    int innermostOf(int band, End down) {
        return down == End.A ? firstOf(band) : afterLastOf(band) - 1;
    }
}
