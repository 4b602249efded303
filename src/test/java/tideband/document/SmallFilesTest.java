package tideband.document;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.oxide.Metal;

/** Recent files, preferences, samples, shapes, and where things are kept. */
class SmallFilesTest {
    @TempDir
    Path folder;

    @Test
    void tenRecentFilesTheLastFirst() throws IOException {
        Path file = folder.resolve("new/recent");
        RecentFiles recent = new RecentFiles(file);
        assertThat(recent.list()).isEmpty();
        for (int i = 0; i < 12; i++) {
            recent.opened(folder.resolve(i + ".json"));
        }
        recent.opened(folder.resolve("x/../5.json"));
        assertThat(recent.list()).hasSize(10).startsWith(folder.resolve("5.json"), folder.resolve("11.json"));
        recent.forget(folder.resolve("5.json"));
        assertThat(new RecentFiles(file).list()).hasSize(9).startsWith(folder.resolve("11.json"));
    }

    @Test
    void aDamagedListBeginsAnew() throws IOException {
        Path file = Files.write(folder.resolve("recent"), new byte[] {0, -1, 10, '/', 'a', 10, 'b', 10, '/', 'a', 10});
        RecentFiles recent = new RecentFiles(file);
        assertThat(recent.list()).containsExactly(Path.of("/a"));
    }

    @Test
    void preferencesComeBack() throws IOException {
        Path file = folder.resolve("new/preferences");
        assertThat(Preferences.read(file)).isEqualTo(new Preferences.Loaded(Preferences.USUAL, List.of()));
        Preferences mine = new Preferences(true, 150, true, true, 1400, 900);
        mine.write(file);
        assertThat(Preferences.read(file)).isEqualTo(new Preferences.Loaded(mine, List.of()));
    }

    @Test
    void damagedPreferencesAreSaidAndTheRestHolds() throws IOException {
        Path file = folder.resolve("preferences");
        Files.writeString(file, "unit=in\ntext-percent=15O\nnonsense\ndark=maybe\nlater-key=7\n");
        Preferences.Loaded loaded = Preferences.read(file);
        assertThat(loaded.preferences()).isEqualTo(new Preferences(true, 100, false, false, 1280, 800));
        assertThat(loaded.notes()).hasSize(2);
        assertThat(loaded.notes().get(0))
                .contains("text-percent")
                .contains("15O")
                .contains("from 100 to 200");
        Files.write(file, new byte[] {-1, -2});
        assertThat(Preferences.read(file).preferences()).isEqualTo(Preferences.USUAL);
        assertThat(Preferences.read(file).notes()).hasSize(1);
    }

    @Test
    void everyShippedDesignIsASample() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("designs"))) {
            List<Path> designs = files.filter(f -> DesignFile.read(f) instanceof Reading.Read<Design>)
                    .toList();
            assertThat(designs).hasSameSizeAs(Sample.values());
            for (Sample sample : Sample.values()) {
                assertThat(DesignFile.read(Path.of("designs", sample.file() + ".json")))
                        .isEqualTo(new Reading.Read<>(sample.design()));
                assertThat(sample.title()).isNotBlank();
                assertThat(sample.shows()).isNotBlank();
            }
        }
    }

    @Test
    void everyShapeBeginsASoundDrawing() {
        for (StartingShape shape : StartingShape.values()) {
            for (Metal metal : Metal.values()) {
                Reading<Design> reading = shape.design("Lamp part", metal, Map.of());
                assertThat(reading).isInstanceOf(Reading.Read.class);
            }
            for (boolean high : new boolean[] {false, true}) {
                Map<StartingShape.Size, Double> extremes = new EnumMap<>(StartingShape.Size.class);
                for (StartingShape.Size size : shape.sizes()) {
                    extremes.put(
                            size,
                            high ? size.allowedMm().high() : size.allowedMm().low());
                }
                if (shape == StartingShape.TUBE) {
                    extremes.put(StartingShape.Size.BORE, extremes.get(StartingShape.Size.BORE) * 0.99 + 0.0005);
                    extremes.put(StartingShape.Size.OUTER_DIAMETER, high ? 1000.0 : 0.06);
                }
                assertThat(shape.design("Lamp part", Metal.NIOBIUM, extremes))
                        .as("%s %s", shape, extremes)
                        .isInstanceOf(Reading.Read.class);
            }
        }
    }

    @Test
    void everyWrongSizeIsSaid() {
        Reading<Design> reading = StartingShape.TUBE.design(
                "Lamp part",
                Metal.TANTALUM,
                Map.of(StartingShape.Size.LENGTH, 0.0, StartingShape.Size.BORE, Double.NaN));
        assertThat(((Reading.Faulty<Design>) reading).faults())
                .extracting(f -> f.text())
                .containsExactly(
                        "Length: is not from 1 to 5000 mm; give a size in between",
                        "Bore: is not from 0.05 to 1000 mm; give a size in between");
        Reading<Design> wide =
                StartingShape.TUBE.design("Lamp part", Metal.TANTALUM, Map.of(StartingShape.Size.BORE, 9.0));
        assertThat(((Reading.Faulty<Design>) wide).faults()).hasSize(1);
    }

    @Test
    void theStateFolderIsWhereTheSystemWantsIt() {
        Path home = Path.of("/home/lamp");
        assertThat(StateFolder.of(Map.of(), "Linux", home)).isEqualTo(home.resolve(".local/state/tideband"));
        assertThat(StateFolder.of(Map.of("XDG_STATE_HOME", "/s"), "Linux", home))
                .isEqualTo(Path.of("/s/tideband"));
        assertThat(StateFolder.of(Map.of("XDG_STATE_HOME", "s"), "Linux", home))
                .isEqualTo(home.resolve(".local/state/tideband"));
        assertThat(StateFolder.of(Map.of("LOCALAPPDATA", "/l"), "Windows 11", home))
                .isEqualTo(Path.of("/l/tideband"));
        assertThat(StateFolder.of(Map.of(), "Mac OS X", home))
                .isEqualTo(home.resolve("Library/Application Support/tideband"));
    }
}
