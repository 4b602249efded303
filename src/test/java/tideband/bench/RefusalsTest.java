package tideband.bench;

import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.design.Design;
import tideband.piece.End;
import tideband.pull.Outfit;
import tideband.pull.Pull;
import tideband.pull.PullOutcome;
import tideband.pull.PullPlanner;
import tideband.pull.Row;
import tideband.pull.Target;
import tideband.trial.Dip;
import tideband.trial.TrialRun;
import tideband.trial.Wish;

/** Property: a caller's mistake is refused in words that name it. */
final class RefusalsTest {
    private final Design design =
            DesignTexts.rod(50, "{ \"to_mm\": 30, \"film_nm\": 80 }, { \"to_mm\": 50, \"bare\": true }", "");

    @ParameterizedTest
    @CsvSource({"-1, 5, 10, 10", "5, 5, 10, 10", "0, 5, -1, 10", "0, 5, 10, NaN", "NaN, 5, 10, 10"})
    void targetsThatCannotBe(double fromMm, double toMm, double aSideNm, double bSideNm) {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Target(fromMm, toMm, aSideNm, bSideNm))
                .withMessageContaining("fromMm");
    }

    @Test
    void aBandThatNoImmersionFinishes() {
        Outfit outfit = new Outfit(
                design.piece(), design.bath(), design.supply(), Optional.empty(), design.pull(), (some, other) -> 1);
        List<Target> targets = List.of(new Target(0, 30, 80, 80), new Target(30, 50, 0, 0));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new PullPlanner(outfit, targets, List.of()))
                .withMessageContaining("band 0");
    }

    @ParameterizedTest
    @CsvSource({"0, 10, 1, 20", "5, 20, 1, 10"})
    void aPullThatGoesBack(double firstS, double firstMm, double nextS, double nextMm) {
        Row first = new Row(firstS, 0, firstMm, firstMm, 0, 3, Row.Act.LOWERED);
        Row next = new Row(nextS, 0, nextMm, nextMm, 0, 3, Row.Act.LIFT_OUT);
        Dip dip = new Dip(End.A, List.of(), new Pull(List.of(first, next), 1, 0, List.of()));
        Colours colours = Colours.of(design);
        TrialRun run = new TrialRun(
                design.piece(),
                List.of(new Wish(0, 50, 3, 3, Optional.empty())),
                colours.palette(),
                colours.viewing().white());
        assertThatIllegalArgumentException()
                .isThrownBy(() -> run.carryOut(design.bath(), 1, List.of(dip)))
                .withMessageContaining("row 1");
    }

    @Test
    void refusalsWithoutReason() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Work.CannotBeMade(List.of()))
                .withMessageContaining("at least one");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new PullOutcome.OutOfReach(List.of()))
                .withMessageContaining("at least one");
    }
}
