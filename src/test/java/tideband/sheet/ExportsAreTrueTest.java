package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.junit.jupiter.api.io.TempDir;
import tideband.bench.BenchPlanner;
import tideband.bench.Colours;
import tideband.bench.Work;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/** Regression: the files in exports/ are, byte for byte, what the program makes of designs/ today. */
class ExportsAreTrueTest {
    private static final Path DESIGNS = Path.of("designs");
    private static final Path EXPORTS = Path.of("exports");

    @TempDir
    private Path fresh;

    @TestFactory
    Stream<DynamicTest> everyDesignMakesItsExports() throws IOException {
        return designs().stream()
                .map(name -> DynamicTest.dynamicTest(name, () -> {
                    for (Path made : export(name)) {
                        Path kept = EXPORTS.resolve(made.getFileName());
                        assertThat(kept).exists();
                        assertThat(Files.readAllBytes(made))
                                .as("%s is what the program makes today", kept)
                                .isEqualTo(Files.readAllBytes(kept));
                    }
                }));
    }

    @Test
    void nothingElseIsKept() throws IOException {
        List<String> kept;
        try (Stream<Path> files = Files.list(EXPORTS)) {
            kept = files.map(file -> file.getFileName().toString()).toList();
        }
        List<String> designs = designs();
        assertThat(kept).isNotEmpty().allMatch(file -> designs.stream().anyMatch(name -> file.startsWith(name + "-")));
    }

    private static List<String> designs() throws IOException {
        try (Stream<Path> files = Files.list(DESIGNS)) {
            return files.filter(file -> DesignFile.read(file) instanceof Reading.Read<Design>)
                    .map(file -> file.getFileName().toString().replace(".json", ""))
                    .sorted()
                    .toList();
        }
    }

    private List<Path> export(String name) throws IOException {
        Design design = ((Reading.Read<Design>) DesignFile.read(DESIGNS.resolve(name + ".json"))).value();
        Colours colours = Colours.of(design);
        Work work = new BenchPlanner(design, colours).work(stage -> {}, () -> false);
        return Exports.write(((Work.Worked) work).plan(), colours, fresh, name, false);
    }
}
