package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import picocli.CommandLine;

/** What the commands are called and take is a contract with other programs; what they say of themselves must teach. */
class HelpTest {
    private static CommandLine program() {
        PrintWriter nowhere = new PrintWriter(new StringWriter());
        return Program.commandLine(nowhere, nowhere);
    }

    /** Reference: the contract's list of commands, as far as they are there; nothing is listed that is not. */
    @Test
    void theCommands() {
        assertThat(program().getSubcommands().keySet())
                .containsExactly("draw", "plan", "colours", "match", "grow", "trial");
    }

    /** Reference: the contract's options; ours besides them are listed here too, so that none comes in unseen. */
    @ParameterizedTest
    @CsvSource({
        "plan, --out --json, --png",
        "colours, --metal --finish --from --to --step --light --observer --angle --svg, ''",
        "match, --metal --colour --bath --within, --finish --light --observer --angle --hold",
        "grow, --metal --bath --volts --seconds --area-cm2 --amps --resistance-ohm --efficiency, --every",
        "trial, '', ''"
    })
    void theOptions(String command, String contracted, String besides) {
        Set<String> names = new TreeSet<>();
        program().getSubcommands().get(command).getCommandSpec().options().forEach(o -> names.add(o.longestName()));
        Set<String> expected = new TreeSet<>(List.of("--help"));
        for (String name : (contracted + " " + besides).strip().split(" ", -1)) {
            if (!name.isEmpty()) {
                expected.add(name);
            }
        }
        assertThat(names).isEqualTo(expected);
    }

    /** Property: help goes to standard output, ends well, shows an example of the very command, units and exit codes. */
    @ParameterizedTest
    @ValueSource(strings = {"plan", "colours", "match", "grow", "trial"})
    void eachCommandTeaches(String command) {
        Ran help = Ran.of(command, "--help");
        assertThat(help.code()).isZero();
        assertThat(help.err()).isEmpty();
        assertThat(help.out())
                .contains("  tideband " + command + " ", "lantern maker", "Exit codes:")
                .doesNotContain("${", "null");
        assertThat(help.out().lines()).allMatch(line -> line.length() <= 96);
        assertThat(Ran.of(command, "-h")).isEqualTo(help);
    }

    /** Property: the examples in the help do what they say, or at least end well, where the designs lie. */
    @Test
    void theExamplesRun() {
        for (String command : List.of("colours", "match", "grow", "trial", "plan")) {
            List<String> examples = Ran.of(command, "--help")
                    .out()
                    .lines()
                    .filter(line -> line.startsWith("  tideband "))
                    .filter(line -> !line.contains("--svg") && !line.contains("--out"))
                    .map(line -> line.strip().replace("'", "").replaceAll(" >.*", ""))
                    .toList();
            assertThat(examples).isNotEmpty();
            for (String example : examples) {
                Ran ran = Ran.line(example.substring("tideband ".length()));
                assertThat(ran.code()).as(example).isZero();
                assertThat(ran.out()).as(example).isNotEmpty();
                assertThat(ran.err()).as(example).isEmpty();
            }
        }
    }

    /** Property: the program itself explains itself, and says which version it is. */
    @Test
    void theProgramItself() {
        Ran help = Ran.of("--help");
        assertThat(help.code()).isZero();
        assertThat(help.out()).contains("Exit codes:", "titanium, niobium and tantalum", "Local codes");
        Ran version = Ran.of("--version");
        assertThat(version.code()).isZero();
        assertThat(version.out().strip()).matches("tideband [0-9]+\\.[0-9]+\\.[0-9]+(-SNAPSHOT)?");
    }
}
