package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.colour.Lab;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;

/** Property: what is written is read as the same. */
class WritingTest {

    private static String text(byte[] bytes) {
        return new String(bytes, StandardCharsets.UTF_8);
    }

    @Test
    void everyDesignComesBackAsItWas(@TempDir Path folder) throws IOException {
        DesignsByLot lot = new DesignsByLot(20);
        for (int i = 0; i < 600; i++) {
            Design design = lot.design();
            byte[] bytes = DesignFile.bytes(design);
            Path shelf = Files.createDirectory(folder.resolve("design " + i));
            if (design.bathFile().isPresent()) {
                Files.write(shelf.resolve(design.bathFile().get()), BathFile.bytes(design.bath()));
            }
            assertThat(DesignFile.read(bytes, Optional.of(shelf)))
                    .as("%s", text(bytes))
                    .isEqualTo(new Reading.Read<>(design));
            assertThat(DesignFile.faults(design)).isEmpty();
        }
    }

    @Test
    void everyBathComesBackAsItWas() {
        DesignsByLot lot = new DesignsByLot(3);
        for (int i = 0; i < 500; i++) {
            Bath bath = lot.bath(lot.pick(List.of(Metal.values())));
            assertThat(BathFile.read(BathFile.bytes(bath))).isEqualTo(new Reading.Read<>(bath));
        }
    }

    @Test
    void shippedDesignsComeBackAsTheyWere() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("designs"))) {
            for (Path file :
                    files.filter(f -> !f.endsWith("shop-tantalum.json")).toList()) {
                Reading<Design> reading = DesignFile.read(file);
                byte[] bytes = DesignFile.bytes(((Reading.Read<Design>) reading).value());
                assertThat(DesignFile.read(bytes, Optional.of(Path.of("designs"))))
                        .isEqualTo(reading);
            }
        }
    }

    /** Regression: the look of the file. */
    @Test
    void writesWhatPeopleCanRead() {
        assertThat(text(DesignFile.bytes(Samples.sound(Samples.SHUTTER)))).isEqualTo("""
                {
                  "format": "tideband-design", "version": 1, "title": "Lantern shutter",
                  "metal": "niobium", "finish": "satin", "light": "LED-B3", "observer": 10,
                  "piece": { "shape": "flat", "thickness_mm": 0.8, "stations": [{ "at_mm": 0, "size_mm": 12 }, { "at_mm": 90, "size_mm": 20 }] },
                  "vessel": { "width_mm": 30, "length_mm": 200 },
                  "holding": { "ends_down": ["B"], "dry_mm": 5 },
                  "bands": [
                    { "name": "band 1", "to_mm": 20, "bare": true, "edge": "crisp" },
                    { "name": "sky", "to_mm": 50, "volts": 28.5, "edge": "soft" },
                    { "name": "band 3", "to_mm": 90, "colour": { "lab": [52.5, -3, 21] }, "order": 2, "edge": "crisp" }
                  ],
                  "bath": "sulfuric",
                  "supply": { "max_volts": 90, "max_amps": 0.5, "dial_volts": 1, "slew_volts_per_s": 20 },
                  "bench": { "immersion_min": 5, "mask_min": 2, "mask_over_min": 9, "strip_min": 0, "turn_min": 3, "hold_s": 12, "order": "least-minutes" },
                  "pull": { "fade": "stepped", "step_dE00": 1.5, "slowest_mm_s": 0.5, "fastest_mm_s": 4 }
                }
                """);
        assertThat(text(BathFile.bytes(((Reading.Read<Bath>) BathFile.read(Samples.bytes(Samples.BATH))).value())))
                .isEqualTo("""
                {
                  "format": "tideband-bath", "version": 1, "name": "workshop jar",
                  "metal": "titanium",
                  "nm_per_volt": 1.7, "field_slope": 26, "native_nm": 2.5, "efficiency": 0.8, "resistance_ohm": 3.5,
                  "ceiling_volts": 95, "index_scale": 1.02,
                  "source": "fitted to four coupons"
                }
                """);
    }

    @Test
    void writesTheSameAtEveryLocale() {
        Design design = new DesignsByLot(5).design();
        String before = text(DesignFile.bytes(design));
        Locale usual = Locale.getDefault();
        try {
            Locale.setDefault(Locale.forLanguageTag("ar-EG-u-nu-arab"));
            assertThat(text(DesignFile.bytes(design))).isEqualTo(before);
        } finally {
            Locale.setDefault(usual);
        }
    }

    @Test
    void numbersAreExactAndShort() {
        assertThat(JsonWriter.number(0.1 + 0.2)).isEqualTo("0.30000000000000004");
        assertThat(JsonWriter.number(2.0e-3)).isEqualTo("0.002");
        assertThat(JsonWriter.number(1e6)).isEqualTo("1000000");
        assertThat(JsonWriter.number(-0.0)).isEqualTo("0");
        Random random = new Random(1);
        for (int i = 0; i < 20_000; i++) {
            double number = Double.longBitsToDouble(random.nextLong());
            if (Double.isFinite(number)) {
                String written = JsonWriter.number(number);
                assertThat(Double.parseDouble(written)).isEqualTo(number);
                assertThat(written).doesNotContain("E");
                assertThat(digits(written)).isLessThanOrEqualTo(digits(Double.toString(number)));
            }
        }
    }

    private static int digits(String number) {
        return new BigDecimal(number).stripTrailingZeros().precision();
    }

    @Test
    void colourThatIsNotWhatItsTextSaysIsWrittenByItsValues() {
        Design hook = Samples.sound(Samples.HOOK);
        List<Band> bands = List.of(new Band(
                "all", 0, 160, new Wanted.Colour("#3a3f8f", new Lab(50, 0, 0), OptionalInt.empty()), Edge.SOFT));
        Design other = new Design(
                hook.title(),
                hook.metal(),
                hook.finish(),
                hook.light(),
                hook.observer(),
                hook.piece(),
                hook.holding(),
                bands,
                hook.bath(),
                hook.supply(),
                hook.vessel(),
                hook.bench(),
                hook.order(),
                hook.pull());
        assertThat(text(DesignFile.bytes(other))).contains("\"colour\": { \"lab\": [50, 0, 0] }");
    }

    @Test
    void faultsOfADesignThatNoFileCanHold() {
        Design hook = Samples.sound(Samples.HOOK);
        Bath bath = new Bath("two\nlines", Metal.TITANIUM, 1.7, 26, 2.5, 0.8, 3.5, 95, 1, "");
        Design bad = new Design(
                "",
                hook.metal(),
                hook.finish(),
                hook.light(),
                hook.observer(),
                hook.piece(),
                hook.holding(),
                hook.bands(),
                bath,
                hook.supply(),
                hook.vessel(),
                hook.bench(),
                hook.order(),
                hook.pull());
        assertThat(bad.bathFile()).contains("two lines.json");
        assertThat(DesignFile.faults(bad)).extracting(Fault::at).containsExactly("/title", "/bath");
    }

    @Test
    void bathThatIsNoPresetHasAFile() {
        Design hook = Samples.sound(Samples.HOOK);
        assertThat(hook.bathFile()).isEmpty();
        assertThat(BathChoice.fileFor(BathPresets.usual(Metal.TITANIUM).withResistanceOhm(7)))
                .contains("phosphate.json");
        assertThat(BathChoice.fileFor(new Bath("../a: <b>", Metal.TITANIUM, 1.7, 26, 2.5, 0.8, 3.5, 95, 1, "")))
                .hasValueSatisfying(name -> assertThat(name).isEqualTo("a b.json"));
    }

    @Test
    void aFileOfTheOtherKindHasOneFault() {
        assertThat(Samples.faults(Samples.BATH)).singleElement().satisfies(fault -> {
            assertThat(fault.at()).isEqualTo("/format");
            assertThat(fault.text()).contains("this is a bath").contains("beside the design");
        });
        assertThat(Samples.faults(BathFile.read(Samples.bytes(Samples.HOOK))))
                .singleElement()
                .satisfies(fault -> assertThat(fault.text()).contains("this is a design, not a bath"));
    }
}
