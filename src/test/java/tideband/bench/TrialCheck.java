package tideband.bench;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import tideband.colour.Ciede2000;
import tideband.design.Design;
import tideband.design.FadeStyle;
import tideband.match.Palette;
import tideband.piece.Meniscus;
import tideband.trial.TrialBand;
import tideband.trial.TrialCell;

/**
 * Holds a trial against the drawing.
 *
 * <p>A band may miss its film by what no plan can avoid, and no more:
 *
 * <ul>
 *   <li>Half a step of the dial. At the reference current a volt is {@code k} nm; at the end of a hold the current is lower
 *       and a volt is a little more, {@code k / (1 − ln(0.1 / i) / s)}: at most 1.15 {@code k} down to 1.5 µA/cm².
 *   <li>{@value #CREEP} of the film. A band gains a little when it is wet again near its own volts. Where the bands that one
 *       pull makes at one level gain differently later, or a fade ends on a level that gains and itself does not, no aim suits
 *       both, and half the gain is left on each. The clock has tenths of a second.
 *   <li>For a fade, {@value #BEND} of its rise: volts run straight between marks, and the film not quite.
 *   <li>For a fade made in steps, half the largest step.
 * </ul>
 */
final class TrialCheck {
    private static final double CREEP = 0.012;
    private static final double BEND = 0.003;
    private static final double MOST_NM_PER_VOLT = 1.15;

    private final BenchPlan plan;
    private final Palette palette;

    TrialCheck(BenchPlan plan, Palette palette) {
        this.plan = plan;
        this.palette = palette;
    }

    /** What is wrong with the trial, in words; empty when nothing is. */
    List<String> faults() {
        List<String> faults = new ArrayList<>();
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            if (band.bare()) {
                bare(band, faults);
            } else {
                TrialBand trial = plan.trial().bands().get(i);
                double fadeNm = band.fade() ? halfStepNm(band) + bendNm(band) : 0;
                film(band.name() + " A", band.aSide().filmNm(), trial.aSideNm(), fadeNm, faults);
                film(band.name() + " B", band.bSide().filmNm(), trial.bSideNm(), fadeNm, faults);
            }
        }
        return faults;
    }

    private void film(String where, double wantedNm, double gotNm, double moreNm, List<String> faults) {
        double within = toleranceNm(plan.design(), wantedNm) + moreNm;
        if (!(Math.abs(gotNm - wantedNm) <= within)) {
            faults.add(String.format(
                    Locale.ROOT, "%s: %.2f nm for %.2f nm, not within %.2f nm", where, gotNm, wantedNm, within));
        }
    }

    static double toleranceNm(Design design, double filmNm) {
        double nmPerVolt = MOST_NM_PER_VOLT * design.bath().nmPerVolt();
        return design.supply().dialVolts() / 2 * nmPerVolt + CREEP * filmNm;
    }

    private static double bendNm(BenchBand band) {
        return BEND * Math.abs(band.aSide().filmNm() - band.bSide().filmNm());
    }

    /**
     * Half the largest step of a fade that is, or may have had to be, made in steps: the longest run of films within the chosen
     * colour difference, or (where that is shorter than the dial's settings are apart) nearly two of those.
     */
    private double halfStepNm(BenchBand band) {
        boolean steps = plan.design().pull().fade() == FadeStyle.STEPPED
                || plan.pulls().stream().anyMatch(p -> p.notes().stream().anyMatch(n -> n.contains("pulled in steps")));
        if (!steps) {
            return 0;
        }
        double lowNm = Math.min(band.aSide().filmNm(), band.bSide().filmNm());
        double highNm = Math.max(band.aSide().filmNm(), band.bSide().filmNm());
        double largestNm = 0;
        double pitchNm = (highNm - lowNm) / 500;
        int low = 0;
        double travelled = 0;
        for (int high = 1; high <= 500; high++) {
            travelled += difference(lowNm + (high - 1) * pitchNm, lowNm + high * pitchNm);
            while (travelled > plan.design().pull().stepDe00()) {
                travelled -= difference(lowNm + low * pitchNm, lowNm + (low + 1) * pitchNm);
                low++;
            }
            largestNm = Math.max(largestNm, (high - low) * pitchNm);
        }
        double settingNm = MOST_NM_PER_VOLT
                * plan.design().bath().nmPerVolt()
                * plan.design().supply().dialVolts();
        return Math.max(largestNm, 2 * settingNm) / 2;
    }

    private double difference(double someNm, double otherNm) {
        return Ciede2000.between(palette.labAt(someNm), palette.labAt(otherNm));
    }

    /** Bare metal has its native film to the last digit, but for what a waterline at its edges may blur. */
    private void bare(BenchBand band, List<String> faults) {
        double nativeNm = plan.design().bath().nativeNm();
        double nearMm = Meniscus.blurMm(plan.design().piece(), band.fromMm());
        double farMm = Meniscus.blurMm(plan.design().piece(), band.toMm());
        for (TrialCell cell : plan.trial().cells()) {
            boolean inside = cell.fromMm() >= band.fromMm() + nearMm && cell.toMm() <= band.toMm() - farMm;
            if (inside && cell.filmNm() != nativeNm) {
                faults.add(band.name() + ": bare, but " + cell.filmNm() + " nm at " + cell.fromMm() + " mm");
                return;
            }
        }
    }
}
