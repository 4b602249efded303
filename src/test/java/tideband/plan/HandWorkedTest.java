package tideband.plan;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.EnumSet;
import java.util.List;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tideband.design.BenchTimes;
import tideband.design.Order;
import tideband.piece.End;

/** Drawings small enough to plan by hand; the sums are beside the checks, by the usual times 4, 3, 6, 1 and 1.5 min. */
class HandWorkedTest {

    private static final Set<End> A = EnumSet.of(End.A);
    private static final Set<End> BOTH = EnumSet.allOf(End.class);

    @Test
    void softTwoToneIsOneStair() {
        Plan plan = plan(A, List.of("tip", "tail"), flat(100, false), flat(50, false));
        assertThat(told(plan)).containsExactly("A masked [] finishes [0, 1]");
        assertThat(plan.cost().minutes()).isEqualTo(4);
        assertThat(plan.immersions().get(0).why())
                .containsExactly("One immersion makes every band.", "End A is down because no other end may go down.");
    }

    @Test
    void crispTwoToneMasksTheThinnerSide() {
        Plan plan = plan(BOTH, List.of("tip", "tail"), flat(100, true), flat(50, false));
        assertThat(told(plan)).containsExactly("A masked [1] finishes [0]", "A masked [] finishes [1]");
        // mask 3, dip 4, strip 1, dip 4
        assertThat(plan.cost()).isEqualTo(new Cost(2, 1, 0, 1, 0, 10, 12));
        assertThat(plan.immersions().get(0).why())
                .containsExactly(
                        "It comes now because no band still to be made is thicker than tip (100 nm).",
                        "End A is down because with end B down it would cost 1.5 min more.",
                        "tail (50 nm) is masked because its edge to tip (100 nm) is crisp and it is the thinner there.");
        assertThat(plan.otherOrder()).hasValue("The order least-minutes would save nothing.");
    }

    @Test
    void zigzagMasksItsValleys() {
        Plan plan = plan(
                A, List.of(), flat(60, false), flat(120, false), flat(60, false), flat(120, false), flat(60, false));
        assertThat(told(plan)).containsExactly("A masked [0, 2] finishes [1, 3, 4]", "A masked [] finishes [0, 2]");
        // mask 3 + 3, dip 4, strip 1 + 1, dip 4
        assertThat(plan.cost().minutes()).isEqualTo(16);
        assertThat(plan.immersions().get(0).maskedBefore()).containsExactly(new Run(0, 0), new Run(2, 2));
        assertThat(plan.immersions().get(0).why())
                .contains(
                        "band 3 (60 nm) is masked because it is to be thinner than the 120 nm of band 4, which is made beyond it.");
    }

    @Test
    void valleyOfFadesNeedsBothEnds() {
        Stretch falling = new Stretch(10, 100, 50, false, false);
        Stretch rising = new Stretch(10, 50, 100, false, false);
        Plan plan = plan(BOTH, List.of("dusk", "dawn"), falling, rising);
        assertThat(told(plan)).containsExactly("A masked [] finishes [0]", "B masked [] finishes [1]");
        // dip 4, turn 1.5, dip 4
        assertThat(plan.cost().minutes()).isEqualTo(9.5);
        assertThat(plan.immersions().get(1).why())
                .contains(
                        "The piece is turned (1.5 min): end B is down because dawn (50 to 100 nm) gets thinner away from"
                                + " it.");
    }

    @Test
    void bareCollarIsMaskedSoThatTheFilmPassesIt() {
        Stretch bare = new Stretch(10, 0, 0, true, false);
        Plan plan = plan(BOTH, List.of("tip", "collar", "tail"), flat(80, false), bare, flat(40, false));
        assertThat(told(plan)).containsExactly("A masked [1] finishes [0, 2]");
        // mask 3, dip 4, strip 1; from both ends without a mask it would be 4 + 1.5 + 4
        assertThat(plan.cost().minutes()).isEqualTo(8);
        assertThat(plan.strippedAtEnd()).containsExactly(new Run(1, 1));
        assertThat(plan.immersions().get(0).why())
                .contains("collar is masked because it stays bare and tail (40 nm) is made beyond.");
    }

    @Test
    void crispStaircaseIsMaskedOnceAndStrippedStepByStep() {
        Plan plan = plan(A, List.of("low", "mid", "top"), flat(150, true), flat(100, true), flat(50, false));
        assertThat(told(plan))
                .containsExactly(
                        "A masked [1, 2] finishes [0]", "A masked [2] finishes [1]", "A masked [] finishes [2]");
        // mask 3, dip 4, strip 1, dip 4, strip 1, dip 4; masking mid first and top over it later would be 19
        assertThat(plan.cost().minutes()).isEqualTo(17);
        assertThat(plan.immersions().get(0).why().get(2))
                .isEqualTo(
                        "mid (100 nm) is masked because its edge to low (150 nm) is crisp and it is the thinner there;"
                                + " top is masked along because otherwise a band would be finished here already, and a later immersion"
                                + " would have nothing to do in its turn.");
    }

    @Test
    void allBareNeedsNothing() {
        Plan plan = plan(A, List.of(), new Stretch(10, 0, 0, true, false));
        assertThat(plan.immersions()).isEmpty();
        assertThat(plan.cost()).isEqualTo(new Cost(0, 0, 0, 0, 0, 0, 0));
        assertThat(plan.proven()).isTrue();
    }

    private static Stretch flat(double filmNm, boolean crisp) {
        return new Stretch(10, filmNm, filmNm, false, crisp);
    }

    private static Plan plan(Set<End> ends, List<String> names, Stretch... stretches) {
        Problem problem = new Problem(List.of(stretches), names, ends, 0, BenchTimes.USUAL, Order.THICKER_FIRST);
        Plan plan = ((Outcome.Planned) Planner.plan(problem)).plan();
        PlanCheck.check(problem, plan);
        return plan;
    }

    private static List<String> told(Plan plan) {
        return plan.immersions().stream()
                .map(i -> i.endDown() + " masked " + i.masked() + " finishes " + i.finishes())
                .toList();
    }
}
