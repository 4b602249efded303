package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.tuple;
import static tideband.design.Samples.BATH;
import static tideband.design.Samples.HOOK;
import static tideband.design.Samples.faults;
import static tideband.design.Samples.with;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.oxide.Bath;
import tideband.oxide.Metal;

class BathFileTest {

    private static final Bath JAR =
            new Bath("workshop jar", Metal.TITANIUM, 1.7, 26, 2.5, 0.8, 3.5, 95, 1.02, "fitted to four coupons");

    @TempDir
    Path folder;

    private Reading<Design> designWith(String bath) throws IOException {
        Path file = Files.writeString(folder.resolve("hook.json"), with(HOOK, "/bath", "\"" + bath + "\""));
        return DesignFile.read(file);
    }

    @Test
    void everyKey() throws IOException {
        assertThat(BathFile.read(Samples.bytes(BATH))).isEqualTo(new Reading.Read<>(JAR));
        assertThat(BathFile.read(Files.writeString(folder.resolve("b.json"), BATH)))
                .isEqualTo(new Reading.Read<>(JAR));
    }

    @Test
    void defaults() {
        String bare = with(with(BATH, "/index_scale", null), "/source", null);
        Bath bath = ((Reading.Read<Bath>) BathFile.read(Samples.bytes(bare))).value();
        assertThat(bath.indexScale()).isEqualTo(1);
        assertThat(bath.source()).isEqualTo("not stated");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "-              | /nm_per_volt    | is missing              | give it",
                "0              | /nm_per_volt    | is 0, out of range      | from 0.1 to 20",
                "1e400          | /field_slope    | is a number beyond all bounds, out of range | from 5 to 200",
                "true           | /native_nm      | is true                 | from 0.1 to 20",
                "1.01           | /efficiency     | is 1.01, out of range   | from 0.01 to 1",
                "-0.1           | /resistance_ohm | is -0.1, out of range   | from 0 to 10000",
                "501            | /ceiling_volts  | is 501, out of range    | from 1 to 500",
                "2              | /index_scale    | is 2, out of range      | from 0.5 to 1.5",
                "\"gold\"       | /metal          | is \"gold\"             | \"titanium\", \"ti-6al-4v\"",
                "\"a\\nb\"      | /source         | is \"a\\u000ab\"        | at most 1000 characters",
                "\"\"           | /name           | is \"\"                 | 1 to 80 characters",
                "1              | /nm_per_volts   | is not a known key      | did you mean \"nm_per_volt\"?",
                "\"tideband-design\" | /format    | is \"tideband-design\": this is a design, not a bath | \"format\": \"tideband-bath\"",
                "1.5            | /version        | is 1.5                  | it must be 1",
            })
    void oneFault(String value, String pointer, String wrong, String right) {
        Reading<Bath> reading = BathFile.read(Samples.bytes(with(BATH, pointer, value.equals("-") ? null : value)));
        assertThat(faults(reading)).singleElement().satisfies(fault -> {
            assertThat(fault.at()).isEqualTo(pointer);
            assertThat(fault.wrong()).isEqualTo(wrong);
            assertThat(fault.right()).contains(right);
        });
    }

    @Test
    void designTakesTheBathBesideIt() throws IOException {
        Files.writeString(folder.resolve("jar 2.json"), BATH);
        assertThat(((Reading.Read<Design>) designWith("jar 2.json")).value().bath())
                .isEqualTo(JAR);
    }

    @Test
    void faultsOfTheBathAreTheDesigns() throws IOException {
        Files.writeString(folder.resolve("jar.json"), with(with(BATH, "/efficiency", "7"), "/odd", "1"));
        assertThat(faults(designWith("jar.json")))
                .extracting(Fault::at, Fault::wrong)
                .containsExactlyInAnyOrder(
                        tuple("/bath", "in the file \"jar.json\" at /efficiency: is 7, out of range"),
                        tuple("/bath", "in the file \"jar.json\" at /odd: is not a known key"));
        Files.writeString(folder.resolve("jar.json"), "");
        assertThat(faults(designWith("jar.json")))
                .containsExactly(new Fault(
                        "/bath", "in the file \"jar.json\": the file is empty", "it must hold a JSON object"));
    }

    @Test
    void bathOfAnotherMetalIsRefused() throws IOException {
        Files.writeString(folder.resolve("jar.json"), with(BATH, "/metal", "\"niobium\""));
        assertThat(faults(designWith("jar.json")))
                .containsExactly(new Fault(
                        "/bath", "the file \"jar.json\" is for niobium", "take one for the design's metal, titanium"));
    }

    @Test
    void onlyRegularFilesBesideTheDesignAreBaths() throws IOException {
        Path outside = Files.createDirectory(folder.resolve("other"));
        Path real = Files.writeString(outside.resolve("jar.json"), BATH);
        Files.createSymbolicLink(folder.resolve("link.json"), real);
        for (String name : new String[] {"other", "link.json", "none.json"}) {
            assertThat(faults(designWith(name))).singleElement().satisfies(fault -> {
                assertThat(fault.at()).isEqualTo("/bath");
                assertThat(fault.wrong())
                        .isEqualTo("is \"" + name + "\", neither a preset nor a regular file beside the design");
            });
        }
        assertThat(faults(designWith("other/jar.json"))).hasSize(1);
    }
}
