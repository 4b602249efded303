package tideband.window.piece;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.bench.BenchPlan;
import tideband.bench.Work;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.design.Band;
import tideband.match.Palette;
import tideband.trial.TrialBand;

/** Reads an answer band by band. */
final class Readings {
    private final AsDrawn drawn;
    private final Palette palette;

    private Readings(AsDrawn drawn) {
        this.drawn = drawn;
        this.palette = drawn.colours().palette();
    }

    /**
     * What is to be said of every band.
     *
     * @param drawn what is wanted
     * @param work what comes of it
     * @return one reading a band, from end A to end B
     */
    static List<BandReading> of(AsDrawn drawn, Work work) {
        Readings readings = new Readings(drawn);
        List<BandReading> list = new ArrayList<>();
        for (int b = 0; b < drawn.design().bands().size(); b++) {
            list.add(readings.band(
                    b, work instanceof Work.Worked worked ? Optional.of(worked.plan()) : Optional.empty()));
        }
        return List.copyOf(list);
    }

    private BandReading band(int b, Optional<BenchPlan> plan) {
        Band band = drawn.design().bands().get(b);
        double aSideNm = drawn.filmNmAt(b, band.fromMm());
        double bSideNm = drawn.filmNmAt(b, band.toMm());
        Named aSide = named(aSideNm);
        Named bSide = named(bSideNm);
        return new BandReading(
                b,
                band.name(),
                band.fromMm(),
                band.toMm(),
                drawn.films().get(b).bare(),
                aSide.name(),
                aSide.order(),
                bSide.name(),
                bSide.order(),
                drawn.labAt(b, (band.fromMm() + band.toMm()) / 2).map(this::hex).orElse("unknown"),
                aSideNm,
                bSideNm,
                plan.map(p -> predicted(p, b, band)));
    }

    private BandReading.Predicted predicted(BenchPlan plan, int b, Band band) {
        TrialBand tried = plan.trial().bands().get(b);
        Named aSide = named(tried.aSideNm());
        double middleMm = (band.fromMm() + band.toMm()) / 2;
        Lab middle = plan.trial().cells().stream()
                .filter(cell -> middleMm < cell.toMm())
                .findFirst()
                .orElseThrow()
                .lab();
        return new BandReading.Predicted(
                aSide.name(),
                aSide.order(),
                hex(middle),
                tried.aSideNm(),
                tried.bSideNm(),
                tried.de00Median(),
                tried.de00Worst());
    }

    private record Named(String name, int order) {}

    /** A fade's fitted line may pass the ends of the palette by a trifle; a film wanted may lie far beyond. */
    private Named named(double filmNm) {
        if (filmNm > palette.maxNm()) {
            return new Named("colour not known", BandReading.NO_ORDER);
        }
        double within = Math.max(0, filmNm);
        return new Named(palette.nameAt(within).text(), palette.orderAt(within));
    }

    private String hex(Lab lab) {
        Srgb screen = drawn.colours()
                .viewing()
                .srgb(lab.toXyz(drawn.colours().viewing().white()));
        return screen.hex();
    }
}
