package tideband.window;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import tideband.cli.Main;

/** Where there is no screen the program says so, and nothing else. */
@EnabledOnOs(OS.LINUX)
class NoScreenTest {

    @Test
    void saysSoInOneLine() throws IOException, InterruptedException {
        // As in daily use, without the screen in memory that the tests have.
        String classPath = Arrays.stream(System.getProperty("java.class.path").split(File.pathSeparator, -1))
                .filter(entry -> !entry.contains("monocle"))
                .collect(Collectors.joining(File.pathSeparator));
        ProcessBuilder builder = new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-cp",
                classPath,
                Main.class.getName(),
                "draw",
                "designs/lantern-hook.json");
        builder.environment().remove("DISPLAY");
        builder.environment().remove("WAYLAND_DISPLAY");
        Process program = builder.redirectErrorStream(true).start();
        String said = new String(program.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        assertThat(program.waitFor()).isEqualTo(1);
        assertThat(said.strip()).startsWith("tideband: ").doesNotContain("\n").contains("there is no screen");
    }
}
