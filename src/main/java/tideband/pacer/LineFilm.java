package tideband.pacer;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.oxide.Growth;
import tideband.piece.End;
import tideband.plan.Immersion;
import tideband.pull.Pull;
import tideband.pull.Row;

/**
 * The film at the line, and what more volts would add to a film, by the growth law.
 *
 * <p>All that is wet and not masked is taken for one patch of one film, as it is wherever an immersion starts on bare metal. The
 * timing table comes from a finer reckoning; so in a hold only the shape of the growth is taken from here, and it is
 * stretched to meet the films of the table at both ends.
 */
final class LineFilm {
    private static final int SAMPLES = 48;
    private static final double LEAST_CM2 = 1e-6;

    private final BenchPlan plan;
    private final Immersion immersion;
    private final Pull pull;
    private final List<Stretch> stretches;
    private final List<List<Double>> shapes = new ArrayList<>();

    LineFilm(BenchPlan plan, int immersion, List<Stretch> stretches) {
        this.plan = plan;
        this.immersion = plan.plan().immersions().get(immersion);
        this.pull = plan.pulls().get(immersion);
        this.stretches = stretches;
        for (Stretch stretch : stretches) {
            shapes.add(stretch.live() && !stretch.drawnLive() ? shape(stretch) : List.of());
        }
    }

    /** The film at the line, at a share of a stretch. */
    double filmNm(int index, double share) {
        Stretch stretch = stretches.get(index);
        List<Double> shape = shapes.get(index);
        double grown = share;
        if (!shape.isEmpty()) {
            // Samples lie at squares, for growth is quickest at first.
            double place = Math.sqrt(share) * SAMPLES;
            int low = Math.min(SAMPLES - 1, (int) place);
            grown = Stretch.between(shape.get(low), shape.get(low + 1), place - low);
        }
        return Stretch.between(stretch.from().filmNm(), stretch.to().filmNm(), grown);
    }

    /** How fast the film at the line grows, in nm/s. */
    double growthNmPerS(int index, double timeS) {
        Stretch stretch = stretches.get(index);
        if (!stretch.live()) {
            return 0;
        }
        double stepS = Math.min(0.1, stretch.lastsS() / 2);
        double startS = Math.min(timeS, stretch.to().timeS() - stepS);
        double gainNm = filmNm(index, stretch.share(startS + stepS)) - filmNm(index, stretch.share(startS));
        return Math.max(0, gainNm / stepS);
    }

    /** Growth done against time, 0 to 1, at the squares of even shares of a stretch; nothing where none is worth it. */
    private List<Double> shape(Stretch stretch) {
        Growth growth = growth(stretch.from().filmNm(), stretch.from().lineMm());
        List<Double> films = new ArrayList<>(List.of(stretch.from().filmNm()));
        double before = 0;
        for (int i = 1; i <= SAMPLES; i++) {
            double share = (double) i * i / (SAMPLES * SAMPLES);
            advance(growth, stretch, before, share);
            films.add(growth.filmNm(0));
            before = share;
        }
        double riseNm = films.get(SAMPLES) - films.get(0);
        return riseNm > 0
                ? films.stream().map(film -> (film - films.get(0)) / riseNm).toList()
                : List.of();
    }

    private static void advance(Growth growth, Stretch stretch, double fromShare, double toShare) {
        Row from = stretch.from();
        Row to = stretch.to();
        growth.advance(
                (toShare - fromShare) * stretch.lastsS(),
                Stretch.between(from.volts(), to.volts(), fromShare),
                Stretch.between(from.volts(), to.volts(), toShare));
    }

    private Growth growth(double filmNm, double lineMm) {
        double startNm = Math.max(filmNm, plan.design().bath().nativeNm());
        return new Growth(
                plan.design().bath(), pull.currentLimitAmps(), new double[] {startNm}, new double[] {wetCm2(lineMm)});
    }

    /** What is wet and not masked with the line somewhere. */
    private double wetCm2(double lineMm) {
        double lengthMm = plan.design().piece().lengthMm();
        double lowMm = immersion.endDown() == End.A ? 0 : lengthMm - lineMm;
        double highMm = immersion.endDown() == End.A ? lineMm : lengthMm;
        double mm2 = 0;
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            double fromMm = Math.max(lowMm, band.fromMm());
            double toMm = Math.min(highMm, band.toMm());
            if (toMm > fromMm && !immersion.masked().contains(i)) {
                mm2 += plan.design().piece().wetAreaMm2(fromMm, toMm);
            }
        }
        return Math.max(LEAST_CM2, mm2 / 100);
    }

    /**
     * The film a place has when the line leaves it, had it started with a film.
     *
     * @param startNm its film when the pull begins, in nm
     * @param atLineMm the place, in mm from the end that is down
     */
    double filmWhenLeftNm(double startNm, double atLineMm) {
        double filmNm = startNm;
        for (Stretch stretch : stretches) {
            double share = 1;
            if (stretch.to().lineMm() < atLineMm) {
                share = stretch.from().lineMm() > atLineMm ? stretch.shareAtLine(atLineMm) : 0;
            }
            if (stretch.live() && share > 0) {
                Growth growth = growth(filmNm, stretch.from().lineMm());
                advance(growth, stretch, 0, share);
                filmNm = growth.filmNm(0);
            }
        }
        return filmNm;
    }
}
