package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class WrongUseTest {
    private static void isWrongUse(Ran ran) {
        assertThat(ran.code()).isEqualTo(Program.WRONG_USE);
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err()).contains("--help'").doesNotContain("Exception", "\tat ");
    }

    /** Property: wrong use is answered with what is wrong and what would be right, on standard error, exit code 2. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "colour | Did you mean",
                "draw one.json two.json | Unmatched argument",
                "colours | Missing required option: '--metal=METAL'",
                "colours --metal zinc | 'zinc' is none of titanium, ti-6al-4v, niobium, tantalum",
                "colours --metal Titanium | 'Titanium' is none of",
                "colours --metal titanium --finish shiny | 'shiny' is none of mirror, polished, satin, blasted",
                "colours --metal titanium --light D75 | 'D75' is none of A, D50, D65, F2, F11, LED-B3",
                "colours --metal titanium --observer 5 | '5' is none of 2, 10",
                "colours --metal titanium --metal niobium | only once",
                "colours --metal titanium --sparkle 3 | Unknown option",
                "colours --metal titanium --step | Missing required parameter",
                "colours --metal titanium --from 30 --to 20 | --from must not be above --to",
                "colours --metal titanium --step 0.001 | --step must be from 0.01 to 2000 nm, but was 0.001",
                "colours --metal titanium --to 2000 --step 0.01 | 200001 rows",
                "colours --metal titanium --step 0.1 --svg never.svg | at most 600 films",
                "colours --metal titanium --angle 86 | --angle must be from 0 to 85 degrees, but was 86",
                "match --metal titanium | Missing required option: '--colour=COLOUR'",
                "match --metal titanium --colour red | neither '#rrggbb'",
                "match --metal titanium --colour #12345 | neither '#rrggbb'",
                "match --metal titanium --colour lab:50,10 | lab:L,a,b",
                "match --metal titanium --colour lab:101,0,0 | L is from 0 to 100",
                "match --metal titanium --colour lab:50,NaN,0 | 'NaN' is not a number",
                "match --metal titanium --colour #3a3f8f --within 0 | --within must be from",
                "match --metal titanium --colour #3a3f8f --bath brine | neither a preset for titanium (phosphate, sulfuric,",
                "match --metal niobium --colour #3a3f8f --bath carbonate | (phosphate, sulfuric)",
                "grow --metal titanium --volts 60 | Missing required option: '--seconds=S'",
                "grow --metal titanium --volts -1 --seconds 5 | --volts must be from 0 to 500 V, but was -1",
                "grow --metal titanium --volts 60 --seconds 5 --every 0.00001 | --every must be from 0.0001",
                "grow --metal titanium --volts 60 --seconds 5000 --every 0.01 | more than 100000 rows",
                "grow --metal titanium --volts 60 --seconds 5 --efficiency 90 | --efficiency must be from 0.01 to 1, but was 90",
                "plan | Missing required parameter: 'DESIGN'",
                "plan one.json two.json | Unmatched argument",
                "plan one.json --png | --out",
                "trial one.json --runs 500 | Unknown option"
            })
    void saysWhatIsWrong(String line, String expected) {
        Ran ran = Ran.line(line);
        isWrongUse(ran);
        assertThat(ran.err()).contains(expected);
    }

    /** Property: nothing but the program's name is wrong use as well, and is told what commands there are. */
    @Test
    void noCommandAtAll() {
        isWrongUse(Ran.of());
        assertThat(Ran.of().err()).contains("Missing required subcommand");
    }

    /** Property: all options out of bounds are told at once. */
    @Test
    void allFaultsAtOnce() {
        Ran ran = Ran.line("grow --metal titanium --volts 501 --seconds 0 --area-cm2 0 --amps 0 --resistance-ohm -1");
        isWrongUse(ran);
        assertThat(ran.err()).contains("--volts must", "--seconds must", "--area-cm2 must", "--amps must", "-ohm must");
    }

    /** Property: no option takes what is no number, and none takes a number that nothing could have. */
    @ParameterizedTest
    @ValueSource(
            strings = {"NaN", "Infinity", "-Infinity", "inf", "1e999", "-1e999", "-1", "0x1p3", "1f", "1,5", "", "٣"})
    void refusesWhatIsNoQuantity(String value) {
        for (String option : List.of("--from", "--to", "--step", "--angle")) {
            isWrongUse(Ran.of("colours", "--metal", "titanium", option, value));
        }
        for (String option : List.of("--within", "--hold", "--angle")) {
            isWrongUse(Ran.of("match", "--metal", "titanium", "--colour", "#808080", option, value));
        }
        for (String option : List.of("--area-cm2", "--amps", "--resistance-ohm", "--efficiency", "--every")) {
            isWrongUse(Ran.of("grow", "--metal", "titanium", "--volts", "5", "--seconds", "5", option, value));
        }
        isWrongUse(Ran.of("grow", "--metal", "titanium", "--volts", value, "--seconds", "5"));
        isWrongUse(Ran.of("grow", "--metal", "titanium", "--volts", "5", "--seconds", value));
    }

    /** Property: whatever words come, the program answers in words and with one of its three exit codes. */
    @Test
    void anyWords() {
        List<String> words = List.of(
                "plan",
                "colours",
                "match",
                "grow",
                "trial",
                "--metal",
                "titanium",
                "niobium",
                "--colour",
                "#ff0000",
                "--bath",
                "phosphate",
                "--volts",
                "60",
                "--seconds",
                "1",
                "--from",
                "--to",
                "-3",
                "0",
                "--step",
                "--json",
                "@words",
                "${user.home}",
                "--",
                "-",
                "",
                "--help",
                "-V",
                "=",
                "--metal=",
                "--observer",
                "\u0000",
                "\ud800");
        Random random = new Random(11);
        for (int i = 0; i < 400; i++) {
            List<String> line = new ArrayList<>();
            for (int n = random.nextInt(7); n >= 0; n--) {
                line.add(words.get(random.nextInt(words.size())));
            }
            Ran ran = Ran.of(line.toArray(new String[0]));
            assertThat(ran.code()).as("%s", line).isBetween(0, 2);
            assertThat(ran.err()).as("%s", line).doesNotContain("a fault of the program", "\tat ");
        }
    }
}
