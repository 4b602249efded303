package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tideband.colour.Ciede2000;
import tideband.design.Design;
import tideband.piece.End;
import tideband.plan.Immersion;
import tideband.pull.Outfit;
import tideband.pull.Pull;
import tideband.pull.PullOutcome;
import tideband.pull.PullPlanner;
import tideband.pull.Target;
import tideband.trial.Dip;
import tideband.trial.Trial;
import tideband.trial.TrialRun;
import tideband.trial.Wish;

/**
 * Property: a band that stays wet at nearly its own volts in a later immersion would gain, and does not, because the
 * plan makes it so much thinner before.
 */
final class CreepTest {
    private static final double TIP_NM = 150;
    private static final double SHANK_NM = 148;
    private static final Target TIP = new Target(0, 30, TIP_NM, TIP_NM);
    private static final Target SHANK = new Target(30, 60, SHANK_NM, SHANK_NM);
    private static final Target STUB = new Target(60, 90, 0, 0);

    private final Design design = DesignTexts.rod(
            90,
            "{ \"to_mm\": 30, \"film_nm\": 150, \"edge\": \"soft\" },"
                    + " { \"to_mm\": 60, \"film_nm\": 148, \"edge\": \"soft\" },"
                    + " { \"to_mm\": 90, \"bare\": true }",
            "");
    private final Colours colours = Colours.of(design);

    private static Immersion finishing(int band, double filmNm) {
        return new Immersion(End.A, List.of(), List.of(), List.of(), List.of(band), filmNm, List.of());
    }

    private List<Pull> pulls(List<Target> targets, Immersion... immersions) {
        Outfit outfit = new Outfit(
                design.piece(), design.bath(), design.supply(), Optional.empty(), design.pull(), this::difference);
        PullOutcome outcome = new PullPlanner(outfit, targets, List.of(immersions)).plan();
        return ((PullOutcome.Pulled) outcome).pulls();
    }

    private double difference(double someNm, double otherNm) {
        return Ciede2000.between(
                colours.palette().labAt(someNm), colours.palette().labAt(otherNm));
    }

    private double tipNm(List<Pull> pulls) {
        double bareNm = design.bath().nativeNm();
        List<Wish> wishes = List.of(
                new Wish(0, 30, TIP_NM, TIP_NM, Optional.empty()),
                new Wish(30, 60, SHANK_NM, SHANK_NM, Optional.empty()),
                new Wish(60, 90, bareNm, bareNm, Optional.empty()));
        List<Dip> dips = new ArrayList<>();
        pulls.forEach(pull -> dips.add(new Dip(End.A, List.of(), pull)));
        Trial trial = new TrialRun(
                        design.piece(),
                        wishes,
                        colours.palette(),
                        colours.viewing().white())
                .carryOut(design.bath(), design.supply().maxAmps(), dips);
        return trial.bands().get(0).aSideNm();
    }

    @Test
    void theTipIsMadeThinnerByWhatItGainsLater() {
        Pull alone = pulls(List.of(TIP, new Target(30, 60, 0, 0), STUB), finishing(0, TIP_NM))
                .get(0);
        List<Pull> both = pulls(List.of(TIP, SHANK, STUB), finishing(0, TIP_NM), finishing(1, SHANK_NM));
        double withinNm = design.supply().dialVolts() / 2 * design.bath().nmPerVolt() * 1.15 + 0.1;

        assertThat(tipNm(List.of(alone))).isBetween(TIP_NM - withinNm, TIP_NM + withinNm);
        assertThat(tipNm(both)).isBetween(TIP_NM - withinNm, TIP_NM + withinNm);
        // Planned as if nothing came after, it would end a per cent too thick.
        assertThat(tipNm(List.of(alone, both.get(1)))).isGreaterThan(TIP_NM * 1.008);
        assertThat(tipNm(List.of(both.get(0)))).isLessThan(TIP_NM * 0.992);
    }
}
