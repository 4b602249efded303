package tideband.window.order;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;

/** The films along the piece while the plan is gone through: film never shrinks, so a place has the most it was given. */
final class FilmsSoFar {
    private static final int PER_FADE = 10;

    private final double[] edgesMm;
    private final double[] filmNm;

    FilmsSoFar(BenchPlan plan) {
        List<Double> edges = new ArrayList<>(List.of(0.0));
        for (BenchBand band : plan.bands()) {
            int cells = band.fade() ? PER_FADE : 1;
            for (int cell = 1; cell < cells; cell++) {
                edges.add(band.fromMm() + (band.toMm() - band.fromMm()) * cell / cells);
            }
            edges.add(band.toMm());
        }
        this.edgesMm = edges.stream().mapToDouble(Double::doubleValue).toArray();
        this.filmNm = new double[edgesMm.length - 1];
        Arrays.fill(filmNm, plan.design().bath().nativeNm());
    }

    /** The colours with what a pull has given up to a row. */
    List<BenchPicture.Tint> tints(FilmInks inks, Gives gives, int untilRow) {
        return tints(inks, with(gives, untilRow));
    }

    /** The colours as they are. */
    List<BenchPicture.Tint> tints(FilmInks inks) {
        return tints(inks, filmNm);
    }

    private List<BenchPicture.Tint> tints(FilmInks inks, double[] films) {
        List<BenchPicture.Tint> tints = new ArrayList<>();
        for (int cell = 0; cell < films.length; cell++) {
            tints.add(new BenchPicture.Tint(edgesMm[cell], edgesMm[cell + 1], inks.hex(films[cell])));
        }
        return List.copyOf(tints);
    }

    /** Takes in all that a pull gives. */
    void take(Gives gives, int lastRow) {
        System.arraycopy(with(gives, lastRow), 0, filmNm, 0, filmNm.length);
    }

    private double[] with(Gives gives, int untilRow) {
        double[] films = filmNm.clone();
        for (int cell = 0; cell < films.length; cell++) {
            films[cell] = Math.max(films[cell], gives.filmNm((edgesMm[cell] + edgesMm[cell + 1]) / 2, untilRow));
        }
        return films;
    }
}
