package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class GrowCommandTest {
    private static final int T = 0;
    private static final int FILM = 1;
    private static final int CURRENT = 2;
    private static final int SUPPLY = 3;

    /** Reference: the contract's header, to the byte. */
    @Test
    void theTable() {
        Ran ran = Ran.line("grow --metal titanium --bath phosphate --volts 60 --seconds 30");
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.header()).isEqualTo("t_s,film_nm,current_mA_cm2,supply_V");
        assertThat(ran.out()).doesNotContain("\r");
        assertThat(ran.rows()).hasSize(209).allMatch(row -> row.size() == 4);
        assertThat(ran.rows().get(0).subList(0, 2)).containsExactly("0.000000", "3.0000");
        assertThat(ran.rows().get(208).get(T)).isEqualTo("30.000000");
    }

    /** Property: time rises strictly from 0 to exactly the end, by the even grid and its halved beginning. */
    @ParameterizedTest
    @ValueSource(strings = {"0.1", "1", "7.3", "30", "3600", "1000000"})
    void theTimes(String seconds) {
        Ran ran = Ran.of("grow", "--metal", "niobium", "--volts", "20", "--seconds", seconds);
        int rows = ran.rows().size();
        double endS = Double.parseDouble(seconds);
        assertThat(rows).isEqualTo(209);
        assertThat(ran.number(0, T)).isZero();
        assertThat(ran.number(rows - 1, T)).isEqualTo(endS);
        for (int i = 1; i < rows; i++) {
            assertThat(ran.number(i, T)).isGreaterThan(ran.number(i - 1, T));
            assertThat(ran.number(i, FILM)).isGreaterThanOrEqualTo(ran.number(i - 1, FILM));
        }
        assertThat(ran.number(1, T)).isCloseTo(endS / 200 / 256, within(1e-6));
        assertThat(ran.number(9, T)).isCloseTo(endS / 200, within(1e-6));
    }

    /** Property: with an interval, rows stand at its multiples and at the end, once. */
    @ParameterizedTest
    @CsvSource({"10, 2.5, 5", "10, 3, 5", "10, 100, 2", "0.3, 0.1, 4", "1, 0.0001, 10001"})
    void everySoOften(String seconds, String every, int rows) {
        Ran ran = Ran.of("grow", "--metal", "tantalum", "--volts", "5", "--seconds", seconds, "--every", every);
        assertThat(ran.rows()).hasSize(rows);
        assertThat(ran.number(1, T)).isEqualTo(Math.min(Double.parseDouble(seconds), Double.parseDouble(every)));
        assertThat(ran.number(rows - 1, T)).isEqualTo(Double.parseDouble(seconds));
    }

    /**
     * Reference: Faraday's law, 1.836 mC/cm² a nm of TiO2, 1.670 of Nb2O5, 1.747 of Ta2O5 (z F rho / M, worked out by hand
     * from CODATA's F and IUPAC's atomic weights), at the current limit and full efficiency, to the printed digits; half
     * the efficiency grows half.
     */
    @ParameterizedTest
    @CsvSource({"titanium, 1.836, 3", "niobium, 1.670, 4", "tantalum, 1.747, 3.3"})
    void underTheLimitFilmIsCharge(String metal, double milliCoulombPerNm, double nativeNm) {
        for (double efficiency : new double[] {1, 0.5}) {
            Ran ran = Ran.line("grow --metal " + metal + " --volts 100 --seconds 40 --area-cm2 20 --amps 0.04 --every 5"
                    + " --efficiency " + efficiency);
            double grownNm = ran.number(8, FILM) - nativeNm;
            assertThat(grownNm).isCloseTo(efficiency * 2 * 40 / milliCoulombPerNm, within(3e-4 * grownNm));
            for (int i = 0; i < 9; i++) {
                assertThat(ran.number(i, CURRENT)).isEqualTo(2);
                assertThat(ran.number(i, SUPPLY)).isLessThan(100);
            }
        }
    }

    /** Property: the terminals fall short of the set volts just as long as the limit holds, by Ohm's law and the film's. */
    @Test
    void theTerminals() {
        Ran ran = Ran.line("grow --metal titanium --volts 40 --seconds 20 --amps 0.5 --area-cm2 10 --resistance-ohm 4");
        boolean held = false;
        for (int i = 0; i < ran.rows().size(); i++) {
            boolean limited = ran.number(i, CURRENT) >= 50;
            assertThat(ran.number(i, SUPPLY)).isLessThanOrEqualTo(40.0001);
            if (!limited) {
                held = true;
                assertThat(ran.number(i, SUPPLY)).isCloseTo(40, within(1e-3));
            } else {
                assertThat(held)
                        .as("once the limit has let go it does not take hold again")
                        .isFalse();
                // k 1.8 nm/V, s 27.7 at 0.1 mA/cm², d0 3 nm: the volts across the film at 50 mA/cm².
                double filmVolts = ran.number(i, FILM) / 1.8 * (1 + Math.log(500) / 27.7);
                assertThat(ran.number(i, SUPPLY)).isCloseTo(filmVolts + 0.5 * 4 - 3 / 1.8, within(1e-3));
            }
        }
        assertThat(held).isTrue();
    }

    /** Property: with the supply at 0 V nothing happens. */
    @Test
    void supplyOff() {
        Ran ran = Ran.line("grow --metal niobium --volts 0 --seconds 100 --every 50");
        assertThat(ran.rows())
                .containsExactly(
                        List.of("0.000000", "4.0000", "0.000000", "0.0000"),
                        List.of("50.000000", "4.0000", "0.000000", "0.0000"),
                        List.of("100.000000", "4.0000", "0.000000", "0.0000"));
    }

    /** Property: volts above the bath's ceiling are computed, as the law has no ceiling, but not without a word. */
    @Test
    void aboveTheCeiling() {
        Ran ran = Ran.line("grow --metal titanium --bath sulfuric --volts 90 --seconds 10");
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).contains("above the bath's ceiling of 80 V");
        assertThat(Ran.line("grow --metal titanium --bath sulfuric --volts 80 --seconds 10")
                        .err())
                .isEmpty();
    }

    /** Property: the corners of what is allowed are answered, in finite numbers. */
    @Test
    void theCorners() {
        for (String volts : List.of("0.001", "500")) {
            for (String area : List.of("0.001", "100000")) {
                for (String amps : List.of("0.000001", "10000")) {
                    for (String ohm : List.of("0", "10000")) {
                        Ran ran = Ran.line("grow --metal tantalum --volts " + volts + " --seconds 1000 --area-cm2 "
                                + area + " --amps " + amps + " --resistance-ohm " + ohm);
                        assertThat(ran.code()).isZero();
                        assertThat(ran.out()).doesNotContain("NaN", "Infinity");
                    }
                }
            }
        }
    }
}
