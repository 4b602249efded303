package tideband.oxide;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;

class CircuitTest {
    private static final double BALANCED_VOLTS = 1e-6;

    private record Case(Bath bath, double limitAmps, double volts, List<Double> filmNm, List<Double> areaCm2) {}

    private static double[] array(List<Double> values) {
        return values.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /** Each corner of what a bench could hold and far beyond, then a thousand drawn at random between. */
    static List<Case> cases() {
        List<Case> cases = new ArrayList<>();
        for (Metal metal : Metal.values()) {
            for (double ohm : new double[] {0, 2, 10_000}) {
                for (double limit : new double[] {1e-6, 2, 1e6}) {
                    for (double area : new double[] {1e-6, 1e4}) {
                        for (double volts : new double[] {0.01, 120}) {
                            Bath bath = BathPresets.usual(metal).withResistanceOhm(ohm);
                            cases.add(new Case(bath, limit, volts, List.of(bath.nativeNm()), List.of(area)));
                            cases.add(
                                    new Case(bath, limit, volts, List.of(bath.nativeNm(), 200.0), List.of(area, 10.0)));
                        }
                    }
                }
            }
        }
        Random random = new Random(20);
        for (int i = 0; i < 1000; i++) {
            List<Metal> metals = List.of(Metal.values());
            Bath bath = BathPresets.usual(metals.get(random.nextInt(metals.size())))
                    .withResistanceOhm(20 * random.nextDouble());
            List<Double> filmNm = new ArrayList<>();
            List<Double> areaCm2 = new ArrayList<>();
            for (int patch = random.nextInt(6); patch >= 0; patch--) {
                filmNm.add(bath.nativeNm() + 200 * random.nextDouble());
                areaCm2.add(Math.pow(10, 4 * random.nextDouble() - 2));
            }
            double limit = Math.pow(10, 5 * random.nextDouble() - 4);
            cases.add(new Case(bath, limit, 120 * random.nextDouble() + 1e-3, filmNm, areaCm2));
        }
        return cases;
    }

    /** Property: Kirchhoff's loop balances to 1e-6 V, or the limit holds exactly; the current is that of the films. */
    @Test
    void balances() {
        for (Case one : cases()) {
            double[] filmNm = array(one.filmNm());
            double[] areaCm2 = array(one.areaCm2());
            double[] growth = new double[filmNm.length];
            Circuit circuit = new Circuit(one.bath(), one.limitAmps(), filmNm.length);
            circuit.settle(one.volts(), filmNm, areaCm2, growth);

            double drive = one.volts() + one.bath().nativeNm() / one.bath().nmPerVolt();
            double loop = circuit.filmVolts() + one.bath().resistanceOhm() * circuit.amps();
            assertThat(circuit.amps()).as("%s", one).isLessThanOrEqualTo(one.limitAmps() * (1 + 1e-15));
            boolean limited = circuit.amps() >= one.limitAmps() * (1 - 1e-12);
            if (limited) {
                assertThat(loop).as("%s", one).isLessThan(drive + BALANCED_VOLTS);
            } else {
                assertThat(loop).as("%s", one).isCloseTo(drive, within(BALANCED_VOLTS));
            }
            assertThat(circuit.terminalVolts())
                    .isCloseTo(limited ? loop - (drive - one.volts()) : one.volts(), within(BALANCED_VOLTS));
            double charged = 0;
            for (int j = 0; j < growth.length; j++) {
                charged += 1e-3 * areaCm2[j] * new GrowthLaw(one.bath()).currentForGrowth(growth[j]);
            }
            if (Arrays.stream(growth).allMatch(each -> each < Circuit.FASTEST_NM_PER_S)) {
                assertThat(charged).as("%s", one).isCloseTo(circuit.amps(), within(1e-6 * circuit.amps()));
            }
        }
    }

    /** Reference: the same potential by Brent's method of Commons Math on another form of the equations. */
    @Test
    void agreesWithAnotherSolver() {
        for (Case one : cases()) {
            double[] filmNm = array(one.filmNm());
            double[] areaCm2 = array(one.areaCm2());
            Circuit circuit = new Circuit(one.bath(), one.limitAmps(), filmNm.length);
            circuit.settle(one.volts(), filmNm, areaCm2, new double[filmNm.length]);
            double expected = new ReferenceGrowth(one.bath(), one.limitAmps(), areaCm2, t -> one.volts())
                    .filmVolts(one.volts(), filmNm);
            assertThat(circuit.filmVolts()).as("%s", one).isCloseTo(expected, within(BALANCED_VOLTS));
        }
    }

    /** Property: the answer does not depend on what was settled before, to the same 1e-6 V. */
    @Test
    void forgetsWhatWasBefore() {
        double[] filmNm = {3, 50, 100};
        double[] areaCm2 = {1, 2, 3};
        double[] growth = new double[3];
        Bath bath = BathPresets.usual(Metal.TITANIUM);
        for (double volts : new double[] {0.01, 1, 30, 119}) {
            Circuit fresh = new Circuit(bath, 2, 3);
            fresh.settle(volts, filmNm, areaCm2, growth);
            for (double before : new double[] {0.001, 29, 120}) {
                Circuit used = new Circuit(bath, 2, 3);
                used.settle(before, new double[] {150, 150, 150}, areaCm2, growth);
                used.settle(volts, filmNm, areaCm2, growth);
                assertThat(used.filmVolts()).isCloseTo(fresh.filmVolts(), within(BALANCED_VOLTS));
                assertThat(used.withLimit(2).amps()).isEqualTo(used.amps());
            }
        }
    }

    /** Property: with nothing wet no current flows and the supply shows its set volts. */
    @Test
    void nothingWet() {
        Circuit circuit = new Circuit(BathPresets.usual(Metal.TITANIUM), 2, 2);
        double[] growth = new double[2];
        circuit.settle(40, new double[] {3, 90}, new double[] {0, 0}, growth);
        assertThat(circuit.amps()).isZero();
        assertThat(circuit.terminalVolts()).isCloseTo(40, within(1e-12));
        assertThat(growth).containsOnly(0);
        circuit.open(growth);
        assertThat(growth).containsOnly(0);
        assertThat(circuit.terminalVolts()).isZero();
    }
}
