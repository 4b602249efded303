package tideband.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.ode.FirstOrderDifferentialEquations;
import org.apache.commons.math3.ode.events.EventHandler;
import org.apache.commons.math3.ode.nonstiff.DormandPrince853Integrator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MeniscusTest {

    private static final double LC = Meniscus.CAPILLARY_LENGTH_MM;
    private static final double EULER = 0.577_215_664_901_532_9;

    // Reference: sqrt(γ/(ρg)) of water at 20 °C, worked by hand from 72.8 mN/m, 998.2 kg/m³ and 9.80665 m/s².
    @Test
    void capillaryLengthOfWater() {
        assertThat(LC).isCloseTo(2.727, within(5e-4));
    }

    // Reference: Landau and Lifshitz, Fluid Mechanics, section 61: h = lc sqrt(2(1 − sin θ)), with lc 2.727 mm.
    @ParameterizedTest
    @CsvSource({"0, 3.857", "30, 2.727", "60, 1.412", "90, 0"})
    void plateRise(double angleDeg, double riseMm) {
        assertThat(Meniscus.plateRiseMm(angleDeg)).isCloseTo(riseMm, within(6e-4));
    }

    // Reference: James, J. Fluid Mech. 63, 657 (1974), leading order; the digits were worked by hand for lc 2.727 mm.
    // The formula holds for r far below lc, so the program may leave it more and more as r grows.
    @ParameterizedTest
    @CsvSource({"0.25, 0.800, 0.01", "0.5, 1.253, 0.03", "1.0, 1.812, 0.08"})
    void thinRodRise(double radiusMm, double riseMm, double leeway) {
        assertThat(jamesRiseMm(radiusMm, 0)).isCloseTo(riseMm, within(6e-4));
        assertThat(Meniscus.rodRiseMm(radiusMm, 0)).isCloseTo(riseMm, within(leeway * riseMm));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 20, 45, 70, 89})
    void thinnestRodsFollowJamesAndThickestThePlate(double angleDeg) {
        double thin = 1e-3;
        assertThat(Meniscus.rodRiseMm(thin, angleDeg) / jamesRiseMm(thin, angleDeg))
                .isCloseTo(1, within(2e-4));
        assertThat(Meniscus.rodRiseMm(1e5, angleDeg) / Meniscus.plateRiseMm(angleDeg))
                .isCloseTo(1, within(2e-4));
    }

    private static double jamesRiseMm(double radiusMm, double angleDeg) {
        double angle = Math.toRadians(angleDeg);
        return radiusMm * Math.cos(angle) * (Math.log(4 * LC / (radiusMm * (1 + Math.sin(angle)))) - EULER);
    }

    // Reference: the Young-Laplace equation, solved here: from the far field, where z = A K0(x), inwards along the arc.
    @Test
    void rodRiseKeepsWithinFourThousandthsOfTheYoungLaplaceEquation() {
        double worst = 0;
        double thinnest = Double.MAX_VALUE;
        double thickest = 0;
        int count = 0;
        for (double startRadius = 3; startRadius < 320; startRadius += startRadius < 20 ? 0.5 : 25) {
            for (Wall wall : meniscusFrom(startRadius)) {
                double rise = Meniscus.rodRiseMm(wall.radius() * LC, wall.angleDeg()) / LC;
                worst = Math.max(worst, Math.abs(rise / wall.height() - 1));
                thinnest = Math.min(thinnest, wall.radius());
                thickest = Math.max(thickest, wall.radius());
                count++;
            }
        }
        assertThat(worst).isLessThan(4e-3);
        assertThat(count).isGreaterThan(300);
        assertThat(thinnest).isLessThan(1e-4);
        assertThat(thickest).isGreaterThan(250);
    }

    // The solution used as the yardstick must itself meet a case known in closed form: a rod so thick that it is a
    // wall.
    @Test
    void theYardstickMeetsTheWall() {
        for (Wall wall : meniscusFrom(5000)) {
            double plate = Meniscus.plateRiseMm(wall.angleDeg()) / LC;
            assertThat(wall.height() / plate).isCloseTo(1, within(2e-4));
        }
    }

    /** A place where a solution of the Young-Laplace equation meets a wall; lengths over the capillary length. */
    private record Wall(double radius, double height, double angleDeg) {}

    private static List<Wall> meniscusFrom(double startRadius) {
        double startSlope = 1e-6;
        double[] state = {startRadius, startSlope * Meniscus.besselK0OverK1(startRadius), startSlope};
        List<Wall> walls = new ArrayList<>();
        DormandPrince853Integrator integrator = new DormandPrince853Integrator(1e-12, 1, 1e-13, 1e-11);
        for (int angleDeg = 85; angleDeg >= 0; angleDeg -= 5) {
            integrator.addEventHandler(new WallAt(angleDeg, walls), 0.1, 1e-12, 200);
        }
        integrator.integrate(new YoungLaplace(), 0, state, 2 * startRadius + 20, new double[3]);
        return walls;
    }

    /** Radius, height and slope angle along the arc, inwards. */
    private static final class YoungLaplace implements FirstOrderDifferentialEquations {
        @Override
        public int getDimension() {
            return 3;
        }

        @Override
        public void computeDerivatives(double arc, double[] y, double[] rate) {
            rate[0] = -Math.cos(y[2]);
            rate[1] = Math.sin(y[2]);
            rate[2] = y[1] + Math.sin(y[2]) / y[0];
        }
    }

    private record WallAt(int angleDeg, List<Wall> walls) implements EventHandler {
        @Override
        public void init(double arc0, double[] y0, double arcEnd) {}

        @Override
        public double g(double arc, double[] y) {
            return y[2] - Math.toRadians(90 - angleDeg);
        }

        @Override
        public Action eventOccurred(double arc, double[] y, boolean rising) {
            walls.add(new Wall(y[0], y[1], angleDeg));
            return angleDeg == 0 ? Action.STOP : Action.CONTINUE;
        }

        @Override
        public void resetState(double arc, double[] y) {}
    }

    // Reference: Abramowitz and Stegun, Handbook of Mathematical Functions (1964), table 9.8.
    @ParameterizedTest
    @CsvSource({"0.1, 2.4270690247, 9.8538447809", "1, 0.4210244382, 0.6019072302", "10, 1.778006232e-5, 1.864877345e-5"
    })
    void besselRatio(double x, double k0, double k1) {
        assertThat(Meniscus.besselK0OverK1(x)).isCloseTo(k0 / k1, within(1e-9));
    }

    @Test
    void riseGrowsWithRadiusAndFallsWithAngle() {
        double before = 0;
        for (double radiusMm = 0.02; radiusMm < 500; radiusMm *= 1.3) {
            double rise = Meniscus.rodRiseMm(radiusMm, 0);
            assertThat(rise).isGreaterThan(before).isLessThan(Meniscus.plateRiseMm(0));
            assertThat(Meniscus.rodRiseMm(radiusMm, 20)).isLessThan(rise);
            assertThat(Meniscus.rodRiseMm(radiusMm, 90)).isCloseTo(0, within(1e-12));
            before = rise;
        }
    }

    @Test
    void flatsArePlatesAndTubesAreRods() {
        List<Station> stations = List.of(new Station(0, 2), new Station(10, 4));
        Piece rod = new Piece(new Section.Round(), stations);
        assertThat(Meniscus.riseMm(rod, 5, 10)).isEqualTo(Meniscus.rodRiseMm(1.5, 10));
        assertThat(Meniscus.riseMm(new Piece(new Section.Tube(1), stations), 5, 10))
                .isEqualTo(Meniscus.rodRiseMm(1.5, 10));
        assertThat(Meniscus.riseMm(new Piece(new Section.Flat(1), stations), 5, 10))
                .isEqualTo(Meniscus.plateRiseMm(10));
    }

    // Reference for the plate: half of 3.8566 · (1 − sqrt(1 − sin 20°)) = 0.364 mm, by hand.
    @Test
    void blurIsHalfTheDifferenceOfTheTwoWettings() {
        List<Station> stations = List.of(new Station(0, 2), new Station(10, 2));
        assertThat(Meniscus.blurMm(new Piece(new Section.Flat(1), stations), 5)).isCloseTo(0.364, within(5e-4));
        double rodBlur = Meniscus.blurMm(new Piece(new Section.Round(), stations), 5);
        assertThat(rodBlur).isBetween(0.1, 0.364);
    }

    @Test
    void impossibleArgumentsAreRefused() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Meniscus.plateRiseMm(Double.NaN))
                .withMessage("contactAngleDeg must be from 0 to 90 degrees, but was NaN");
        assertThatIllegalArgumentException().isThrownBy(() -> Meniscus.plateRiseMm(90.1));
        assertThatIllegalArgumentException().isThrownBy(() -> Meniscus.rodRiseMm(1, -1));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Meniscus.rodRiseMm(0, 10))
                .withMessage("radiusMm must be finite and above 0, but was 0.0");
        assertThatIllegalArgumentException().isThrownBy(() -> Meniscus.rodRiseMm(Double.POSITIVE_INFINITY, 10));
        assertThatIllegalArgumentException().isThrownBy(() -> Meniscus.rodRiseMm(Double.NaN, 10));
    }
}
