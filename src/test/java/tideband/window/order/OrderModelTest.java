package tideband.window.order;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.bench.RandomDesigns;
import tideband.bench.Work;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Order;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.trial.TrialBand;
import tideband.window.Desk;
import tideband.window.comfort.LengthUnit;
import tideband.window.work.Glance;

class OrderModelTest {
    private static final List<String> SHIPPED = List.of(
            "lantern-hook", "wick-key", "snuffer-handle", "carry-bail", "wick-pin", "vent-plate", "chimney-post");
    private static final int RANDOM = 48;

    static Stream<Design> designs() {
        return Stream.concat(
                Stream.concat(SHIPPED.stream(), Stream.of("burner-tube")).map(Desk::shipped),
                IntStream.range(0, RANDOM)
                        .mapToObj(RandomDesigns::design)
                        .filter(d -> Colours.obstacle(d).isEmpty()));
    }

    private static OrderModel orderOf(Desk desk) {
        return new OrderModel(desk.drawing(), desk.work(), desk.comfort());
    }

    private static Optional<BenchPlan> plan(Desk desk) {
        Work work = desk.work().answerProperty().get().orElseThrow().work();
        return work instanceof Work.Worked worked ? Optional.of(worked.plan()) : Optional.empty();
    }

    /** What is done beside the bath, told from the plan in words of one syllable. */
    private static List<String> acts(BenchPlan plan) {
        List<String> acts = new ArrayList<>();
        List<Immersion> immersions = plan.plan().immersions();
        for (int i = 0; i < immersions.size(); i++) {
            Immersion now = immersions.get(i);
            if (i > 0 && immersions.get(i - 1).endDown() != now.endDown()) {
                acts.add(i + " turn " + now.endDown());
            }
            for (Run run : now.strippedBefore()) {
                acts.add(i + " strip " + List.of(run));
            }
            for (Run run : now.maskedBefore()) {
                acts.add(i + " mask " + List.of(run));
            }
            acts.add(i + " dip");
            acts.add(i + " lift");
        }
        if (!plan.plan().strippedAtEnd().isEmpty()) {
            acts.add(immersions.size() - 1 + " strip " + plan.plan().strippedAtEnd());
        }
        return acts;
    }

    private static Stream<String> act(WorkCard card) {
        return switch (card.kind()) {
            case TURN -> Stream.of(card.immersion() + " turn " + card.picture().down());
            case STRIP, STRIP_ALL -> Stream.of(card.immersion() + " strip " + card.runs());
            case MASK -> Stream.of(card.immersion() + " mask " + card.runs());
            case DIP -> Stream.of(card.immersion() + " dip");
            case LIFT -> Stream.of(card.immersion() + " lift");
            case HOLD, HOLDS, FADE, FOLLOW -> Stream.empty();
        };
    }

    @ParameterizedTest
    @MethodSource("designs")
    void cardsTellTheWholePlanOnceAndInOrder(Design design) {
        Desk desk = Desk.with(design);
        OrderModel order = orderOf(desk);
        List<WorkCard> cards = order.cards();
        Optional<BenchPlan> plan = plan(desk);
        assertThat(cards.stream().flatMap(OrderModelTest::act))
                .isEqualTo(plan.map(OrderModelTest::acts).orElse(List.of()));
        assertThat(order.obstacles().isEmpty()).isEqualTo(plan.isPresent());
        for (int i = 0; i < cards.size(); i++) {
            WorkCard card = cards.get(i);
            assertThat(card.number()).isEqualTo(i + 1);
            assertThat(card.sentence())
                    .startsWith(
                            "Step " + (i + 1) + " of " + cards.size() + ", immersion " + (card.immersion() + 1) + ": ")
                    .endsWith(".");
        }
    }

    @ParameterizedTest
    @MethodSource("designs")
    void depthsVoltsAndSecondsAreThePulls(Design design) {
        Desk desk = Desk.with(design);
        List<WorkCard> cards = orderOf(desk).cards();
        plan(desk).ifPresent(plan -> {
            for (int i = 0; i < plan.pulls().size(); i++) {
                int immersion = i;
                Pull pull = plan.pulls().get(i);
                List<Stage> stages = cards.stream()
                        .filter(card -> card.immersion() == immersion && !card.beside())
                        .map(WorkCard::stage)
                        .toList();
                assertThat(stages.stream().mapToDouble(Stage::wholeS).sum()).isCloseTo(pull.durationS(), within(1e-6));
                stages.forEach(stage -> endsAsItsRow(stage, pull));
                long holds = pull.rows().stream()
                        .filter(r -> r.act() == Row.Act.HOLD)
                        .count();
                assertThat(stages.stream().mapToInt(Stage::holds).sum()).isEqualTo((int) holds);
            }
        });
    }

    private static void endsAsItsRow(Stage stage, Pull pull) {
        Row row = pull.rows().get(stage.lastRow());
        assertThat(row.depthMm()).isEqualTo(stage.toDepthMm());
        assertThat(row.lineMm()).isEqualTo(stage.toLineMm());
        assertThat(row.volts()).isEqualTo(stage.toVolts());
        if (stage.kind() == WorkCard.Kind.HOLD) {
            Row before = pull.rows().get(stage.lastRow() - 1);
            assertThat(before.act()).isEqualTo(Row.Act.HOLD);
            assertThat(row.timeS() - before.timeS()).isCloseTo(stage.seconds(), within(1e-9));
        }
    }

    /**
     * What the immersions give, the most of it at each place, is what the trial finds. The trial adds creep: a finished
     * band that is wet again gains a per cent or two a time, for which its aim was lowered; and its current is that of finer
     * cells than the pull was planned on. So within 2 % and 2 nm (the most seen
     * in these designs is 1.7 % and 1.7 nm), blurred edges left out.
     */
    @ParameterizedTest
    @MethodSource("designs")
    void glancesTogetherAreTheTrial(Design design) {
        Desk desk = Desk.with(design);
        OrderModel order = orderOf(desk);
        plan(desk).ifPresent(plan -> {
            List<Glance> glances = new ArrayList<>();
            for (int i = 0; i < order.cards().size(); i++) {
                order.pointedProperty().set(Optional.of(i));
                Glance glance = order.glanceProperty().get().orElseThrow();
                assertThat(glance.immersion()).isEqualTo(order.cards().get(i).immersion());
                glances.add(glance);
                liesInOrder(glance, design.piece().lengthMm());
            }
            for (int band = 0; band < plan.bands().size(); band++) {
                if (!plan.bands().get(band).bare()) {
                    double fromMm = plan.bands().get(band).fromMm();
                    double toMm = plan.bands().get(band).toMm();
                    TrialBand trial = plan.trial().bands().get(band);
                    for (double share : new double[] {0.1, 0.5, 0.9}) {
                        double atMm = fromMm + share * (toMm - fromMm);
                        double given = glances.stream()
                                .mapToDouble(g -> at(g, atMm))
                                .max()
                                .orElse(0);
                        double foundNm = trial.aSideNm() + share * (trial.bSideNm() - trial.aSideNm());
                        assertThat(given)
                                .as("%s at %s", plan.bands().get(band), share)
                                .isCloseTo(foundNm, within(2 + 0.02 * foundNm));
                    }
                }
            }
        });
    }

    private static void liesInOrder(Glance glance, double lengthMm) {
        List<Glance.Point> line = glance.gives();
        assertThat(line.get(0).atMm()).isZero();
        assertThat(line.get(line.size() - 1).atMm()).isEqualTo(lengthMm);
        assertThat(line).isSortedAccordingTo((a, b) -> Double.compare(a.atMm(), b.atMm()));
        for (Glance.Stretch masked : glance.masked()) {
            assertThat(at(glance, (masked.fromMm() + masked.toMm()) / 2)).isZero();
        }
    }

    private static double at(Glance glance, double atMm) {
        for (int i = 1; i < glance.gives().size(); i++) {
            Glance.Point from = glance.gives().get(i - 1);
            Glance.Point to = glance.gives().get(i);
            if (from.atMm() <= atMm && atMm < to.atMm()) {
                return from.filmNm() + (to.filmNm() - from.filmNm()) * (atMm - from.atMm()) / (to.atMm() - from.atMm());
            }
        }
        throw new AssertionError("no place " + atMm + " on " + glance);
    }

    @Test
    void theVerdictSaysHowSureItIs() {
        Desk desk = Desk.with("snuffer-handle");
        OrderModel order = orderOf(desk);
        BenchPlan plan = plan(desk).orElseThrow();
        assertThat(order.minutesProperty().get()).isEqualTo(plan.plan().cost().minutes());
        assertThat(order.verdictProperty().get())
                .endsWith(" min \u00b7 proven: no plan under thicker-first costs less");
        assertThat(order.savingProperty().get()).startsWith("least-minutes would save");
        order.switchOrder();
        assertThat(desk.drawing().design().order()).isEqualTo(Order.LEAST_MINUTES);
        assertThat(order.verdictProperty().get()).contains("under least-minutes");
        assertThat(order.savingProperty().get()).isEmpty();
    }

    @Test
    void lengthsFollowTheUnit() {
        Desk desk = Desk.with("lantern-hook");
        OrderModel order = orderOf(desk);
        WorkCard dip = order.cards().get(0);
        Row row = plan(desk).orElseThrow().pulls().get(0).rows().get(0);
        assertThat(dip.figures().get(0)).isEqualTo(LengthUnit.MILLIMETRE.text(Math.rint(row.depthMm() * 10) / 10));
        assertThat(dip.sentence()).startsWith("Step 1 of ").contains("dip with end A down to ", "supply off");
        desk.comfort().unitProperty().set(LengthUnit.INCH);
        assertThat(order.cards().get(0).figures().get(0)).isEqualTo(LengthUnit.INCH.text(row.depthMm()));
    }

    /** Sixty cards of a stair would tell nobody anything. */
    @Test
    void aLongStairIsOneCard() {
        Design design = Desk.shipped("lantern-hook");
        int steps = 30;
        double eachMm = Math.floor(design.piece().lengthMm() * 0.8 / steps);
        List<Band> bands = new ArrayList<>();
        for (int i = 0; i <= steps; i++) {
            double toMm = i == steps ? design.piece().lengthMm() : (i + 1) * eachMm;
            Wanted wanted = i == steps ? new Wanted.Bare() : BandEdits.film(130 - 3 * i, 130 - 3 * i);
            bands.add(new Band("s" + i, i * eachMm, toMm, wanted, Edge.SOFT));
        }
        OrderModel order = orderOf(Desk.with(design.withBands(bands)));
        assertThat(order.cards().stream().map(WorkCard::kind))
                .containsExactly(WorkCard.Kind.DIP, WorkCard.Kind.HOLDS, WorkCard.Kind.LIFT);
        WorkCard holds = order.cards().get(1);
        assertThat(holds.headline()).isEqualTo("30 holds");
        assertThat(holds.stage().fromVolts()).isLessThan(holds.stage().toVolts());
        assertThat(holds.stage().fromDepthMm()).isGreaterThan(holds.stage().toDepthMm());
    }

    @Test
    void pacingBeginsAtTheImmersionPointedAt() {
        OrderModel order = orderOf(Desk.with("snuffer-handle"));
        List<Integer> paced = new ArrayList<>();
        order.onPace(paced::add);
        order.paceThis();
        order.pointPrevious();
        order.paceThis();
        int last = order.cards().size() - 1;
        assertThat(order.pointedProperty().get()).hasValue(last);
        order.pointNext();
        assertThat(order.pointedProperty().get()).hasValue(last);
        assertThat(paced).containsExactly(0, order.cards().get(last).immersion());
        assertThat(order.whyProperty().get()).isNotEmpty();
    }
}
