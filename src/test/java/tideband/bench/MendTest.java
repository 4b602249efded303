package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Holding;
import tideband.design.Wanted;
import tideband.oxide.Bath;
import tideband.oxide.Supply;

/** Property: a nearest change that is ready to be made takes its obstacle away. */
class MendTest {
    private static final int DESIGNS = 700;

    private final RandomDesigns lot = new RandomDesigns();

    /** Bad designs of every kind; what kinds there were is counted, so that the test cannot pass by meeting none. */
    @Test
    void everyMendTakesItsObstacleAway() {
        Map<String, Integer> mended = new TreeMap<>();
        Map<String, Integer> left = new TreeMap<>();
        for (int number = 0; number < DESIGNS; number++) {
            Design design = worse(RandomDesigns.design(number), new Random(number));
            if (lot.work(design) instanceof Work.CannotBeMade cannot) {
                for (Obstacle obstacle : cannot.obstacles()) {
                    obstacle.mended()
                            .ifPresentOrElse(
                                    other -> gone(design, obstacle, other),
                                    () -> left.merge(kind(obstacle), 1, Integer::sum));
                    obstacle.mend().ifPresent(mend -> mended.merge(kind(obstacle), 1, Integer::sum));
                }
            }
        }
        assertThat(mended.keySet())
                .contains(
                        "too thick",
                        "too thin",
                        "volts",
                        "order",
                        "holding",
                        "amps at the bench",
                        "volts at the bench");
        assertThat(left.keySet()).as("kinds with no definite change").isSubsetOf("amps at the bench");
    }

    private void gone(Design design, Obstacle obstacle, Design mended) {
        assertThat(mended).as("%s", obstacle.change()).isNotEqualTo(design);
        if (lot.work(mended) instanceof Work.CannotBeMade still) {
            assertThat(still.obstacles())
                    .as("%s: %s, after %s", obstacle.where(), obstacle.reason(), obstacle.mend())
                    .noneMatch(o -> o.band().equals(obstacle.band())
                            && kind(o).equals(kind(obstacle))
                            && (!kind(o).startsWith("too") || o.reason().equals(obstacle.reason())));
        }
    }

    private static String kind(Obstacle obstacle) {
        String reason = obstacle.reason();
        if (reason.contains("cannot be finished")) {
            return "holding";
        }
        if (reason.contains("too thin")) {
            return "too thin";
        }
        if (reason.contains("no film of order")) {
            return "order";
        }
        if (reason.contains("A are not enough")) {
            return "amps at the bench";
        }
        if (reason.contains("which gives")) {
            return "volts at the bench";
        }
        return reason.contains(" nm needs about ") || reason.contains("out of reach at") ? "too thick" : "volts";
    }

    private static Design worse(Design design, Random random) {
        Supply supply = design.supply();
        return switch (random.nextInt(6)) {
            case 0 ->
                design.withHolding(new Holding(
                        design.holding().endsDown(), design.piece().lengthMm() * random.nextDouble() * 0.9));
            case 1 ->
                design.withSupply(new Supply(
                        supply.maxVolts(),
                        supply.maxAmps() / (2 + random.nextInt(20)),
                        supply.dialVolts(),
                        supply.slewVoltsPerS()));
            case 2 ->
                design.withSupply(new Supply(
                        supply.maxVolts() / (1 + random.nextInt(5)),
                        supply.maxAmps(),
                        supply.dialVolts(),
                        supply.slewVoltsPerS()));
            case 3 -> design.withPull(design.pull().withHoldS(1 + random.nextInt(4)));
            case 4 -> design.withBands(oneElse(design, random));
            default -> design;
        };
    }

    private static List<Band> oneElse(Design design, Random random) {
        List<Band> bands = new ArrayList<>(design.bands());
        int index = random.nextInt(bands.size());
        Band band = bands.get(index);
        double most = Math.min(design.bath().ceilingVolts(), design.supply().maxVolts());
        Wanted wanted = switch (random.nextInt(4)) {
            case 0 -> new Wanted.Volts(most + 0.04 + random.nextInt(20));
            case 1 -> new Wanted.Volts(design.supply().dialVolts() / 2);
            case 2 -> new Wanted.Film(900, 1 + random.nextInt(3));
            default ->
                new Wanted.Film(
                        1.04 * most * design.bath().nmPerVolt(),
                        most * design.bath().nmPerVolt());
        };
        bands.set(index, new Band(band.name(), band.fromMm(), band.toMm(), wanted, band.edge()));
        return bands;
    }

    /** A bath file may hold a ratio and a ceiling that no colours are known for. */
    @Test
    void filmsBeyondAllKnownColours() {
        Design rod = DesignTexts.rod(50, "{ \"to_mm\": 30, \"film_nm\": 80 }, { \"to_mm\": 50, \"bare\": true }", "");
        Bath had = rod.bath();
        for (double nmPerVolt : new double[] {5, 11.3, 20}) {
            for (double dialVolts : new double[] {0.01, 0.1, 1, 7}) {
                Bath bath = new Bath(
                        "grown wild",
                        had.metal(),
                        nmPerVolt,
                        had.fieldSlope(),
                        had.nativeNm(),
                        1,
                        0,
                        500,
                        1,
                        "made up");
                Design design = withBath(rod, bath, new Supply(500, 200, dialVolts, Double.POSITIVE_INFINITY));
                Obstacle obstacle = Colours.obstacle(design).orElseThrow();
                assertThat(obstacle.band()).isEmpty();
                Design mended = obstacle.mended().orElseThrow();
                assertThat(Colours.obstacle(mended)).isEmpty();
                double oneStepMore = mended.supply().maxVolts() + dialVolts;
                assertThat(Colours.obstacle(
                                withBath(rod, bath, new Supply(oneStepMore, 200, dialVolts, Double.POSITIVE_INFINITY))))
                        .isPresent();
            }
        }
    }

    private static Design withBath(Design d, Bath bath, Supply supply) {
        return new Design(
                d.title(),
                d.metal(),
                d.finish(),
                d.light(),
                d.observer(),
                d.piece(),
                d.holding(),
                d.bands(),
                bath,
                supply,
                Optional.empty(),
                d.bench(),
                d.order(),
                d.pull());
    }

    @Test
    void theActIsNamedAsItIsMade() {
        Design design = DesignTexts.rod(100, "{ \"name\": \"all\", \"to_mm\": 100, \"film_nm\": 80 }", "");
        Obstacle obstacle =
                ((Work.CannotBeMade) BenchPlanner.work(design)).obstacles().get(0);
        assertThat(obstacle.band()).hasValue(0);
        assertThat(obstacle.mend().orElseThrow().act()).isEqualTo("shorten the dry length to 0 mm");
        assertThat(obstacle.mended().orElseThrow().holding().dryMm()).isZero();
        assertThat(BenchPlanner.work(obstacle.mended().orElseThrow())).isInstanceOf(Work.Worked.class);
    }
}
