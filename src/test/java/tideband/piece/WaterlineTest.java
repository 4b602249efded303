package tideband.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;

class WaterlineTest {

    private static final Piece HOOK = new Piece(new Section.Round(), List.of(new Station(0, 3), new Station(160, 8)));
    private static final Piece ROD = new Piece(new Section.Round(), List.of(new Station(0, 8), new Station(100, 8)));

    @Test
    void depthIsTheLineLessTheRiseThere() {
        Waterline a = new Waterline(HOOK, End.A, Optional.empty());
        Waterline b = new Waterline(HOOK, End.B, Optional.empty());
        assertThat(a.depthMm(42)).isEqualTo(42 - Meniscus.rodRiseMm(HOOK.sizeMm(42) / 2, 0));
        assertThat(b.depthMm(42)).isEqualTo(42 - Meniscus.rodRiseMm(HOOK.sizeMm(118) / 2, 0));
        assertThat(a.depthMm(0)).isNegative();
        assertThat(b.blurMm(42)).isEqualTo(Meniscus.blurMm(HOOK, 118));
    }

    @Test
    void withoutAVesselTravelIsTheDifferenceOfDepths() {
        Waterline line = new Waterline(HOOK, End.A, Optional.empty());
        assertThat(line.travelMm(100, 40)).isEqualTo(60);
        assertThat(line.travelMm(40, 100)).isEqualTo(-60);
    }

    // Reference: Archimedes. An even rod of 8 mm leaves a bore of 20 mm: the level falls by (8/20)² of the depth lost.
    @Test
    void evenRodInANarrowVesselTravelsLess() {
        Waterline line = new Waterline(ROD, End.A, Optional.of(Vessel.round(20)));
        assertThat(line.travelMm(60, 10)).isCloseTo(50 * (1 - 0.16), within(1e-10));
        assertThat(line.travelMm(10, -2)).isCloseTo(12 - 10 * 0.16, within(1e-10));
    }

    // Reference: volume of the cone's frustum in the box, by hand: hook of 3 to 8 mm, the lower 80 mm are 3 to 5.5 mm.
    @Test
    void taperInABox() {
        Waterline line = new Waterline(HOOK, End.A, Optional.of(Vessel.rectangular(20, 30)));
        double displaced = Math.PI * 80 / 3 * (1.5 * 1.5 + 1.5 * 2.75 + 2.75 * 2.75);
        assertThat(line.travelMm(80, 0)).isCloseTo(80 - displaced / 600, within(1e-10));
    }

    // Property: the same liquid before and after, counted slice by slice from the bottom of the vessel to its level.
    @Property(tries = 50)
    void liquidIsConserved(
            @ForAll @DoubleRange(min = 0, max = 160) double fromDepth,
            @ForAll @DoubleRange(min = 0, max = 160) double toDepth,
            @ForAll End down) {
        Vessel vessel = Vessel.round(15);
        double travel = vessel.travelMm(HOOK, down, fromDepth, toDepth);
        double bottomBefore = 20;
        double before = liquid(vessel, down, bottomBefore, bottomBefore + fromDepth);
        double bottomAfter = bottomBefore + travel;
        double after = liquid(vessel, down, bottomAfter, bottomAfter + toDepth);
        assertThat(after).isCloseTo(before, within(before * 1e-7));
    }

    private static double liquid(Vessel vessel, End down, double endMm, double levelMm) {
        int slices = 4000;
        double thick = (levelMm - endMm) / slices;
        double total = vessel.areaMm2() * endMm;
        for (int i = 0; i < slices; i++) {
            double taken = HOOK.sectionAreaMm2(HOOK.fromEnd(down, (i + 0.5) * thick));
            total += (vessel.areaMm2() - taken) * thick;
        }
        return total;
    }

    @Property(tries = 100)
    void thereAndBackIsNoTravel(
            @ForAll @DoubleRange(min = -5, max = 160) double one,
            @ForAll @DoubleRange(min = -5, max = 160) double other) {
        Waterline line = new Waterline(HOOK, End.B, Optional.of(Vessel.round(9)));
        assertThat(line.travelMm(one, other) + line.travelMm(other, one)).isCloseTo(0, within(1e-9));
        assertThat(Math.signum(line.travelMm(one, other))).isEqualTo(Math.signum(one - other));
    }

    @Test
    void vesselMustBeLargerThanWhatIsInIt() {
        Vessel tight = Vessel.round(6);
        assertThat(tight.travelMm(HOOK, End.A, 90, 0)).isPositive();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> tight.travelMm(HOOK, End.A, 100, 0))
                .withMessageContaining("the vessel must be larger across than the piece in it")
                .withMessageContaining("take a larger vessel");
        assertThatIllegalArgumentException().isThrownBy(() -> tight.travelMm(HOOK, End.B, 1, 0));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Vessel.round(Double.NaN))
                .withMessage("boreMm must be finite and above 0, but was NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> Vessel.round(0));
    }
}
