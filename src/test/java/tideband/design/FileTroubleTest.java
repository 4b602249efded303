package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assumptions.assumeTrue;
import static tideband.design.Samples.HOOK;
import static tideband.design.Samples.faults;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Files that are no JSON, or cannot be had at all. */
class FileTroubleTest {

    @TempDir
    Path folder;

    private static Fault only(List<Fault> faults) {
        assertThat(faults).hasSize(1);
        return faults.get(0);
    }

    private static Fault faultOf(Path file) {
        return only(faults(DesignFile.read(file)));
    }

    private static Fault faultOf(byte[] bytes) {
        return only(faults(DesignFile.read(bytes, Optional.empty())));
    }

    private static byte[] join(byte[] head, byte[] tail) {
        byte[] all = new byte[head.length + tail.length];
        System.arraycopy(head, 0, all, 0, head.length);
        System.arraycopy(tail, 0, all, head.length, tail.length);
        return all;
    }

    @Test
    void missingFolderAndOddFiles() throws IOException {
        assertThat(faultOf(folder.resolve("none.json")))
                .isEqualTo(new Fault("", "there is no such file", "check the name"));
        assertThat(faultOf(folder)).isEqualTo(new Fault("", "this is a folder", "name the file in it"));
        assertThat(only(faults(BathFile.read(folder)))).isEqualTo(faultOf(folder));
        Path nowhere = folder.resolve("nowhere.json");
        Files.createSymbolicLink(nowhere, folder.resolve("none.json"));
        assertThat(faultOf(nowhere).wrong()).isEqualTo("there is no such file");
    }

    @Test
    void deviceIsNoFile() {
        Path device = Path.of("/dev/zero");
        assumeTrue(Files.exists(device), "needs a device file");
        assertThat(faultOf(device)).isEqualTo(new Fault("", "this is not a regular file", "name a file on disk"));
    }

    @Test
    void unreadableFile() throws IOException {
        Path locked = Files.writeString(folder.resolve("locked.json"), HOOK);
        // Whoever may read everything needs a file whose reading fails for another reason.
        Path unreadable =
                locked.toFile().setReadable(false) && !Files.isReadable(locked) ? locked : Path.of("/proc/self/mem");
        assumeTrue(Files.isRegularFile(unreadable), "needs a file that cannot be read");
        Fault fault = faultOf(unreadable);
        assertThat(fault.wrong()).startsWith("the file cannot be read (").endsWith(")");
        assertThat(fault.right()).isEqualTo("check that you may read it");
    }

    @Test
    void hugeFile() throws IOException {
        Path huge = folder.resolve("huge.json");
        byte[] spaces = " ".repeat(1 << 20).getBytes(StandardCharsets.US_ASCII);
        try (var out = Files.newOutputStream(huge)) {
            out.write(HOOK.getBytes(StandardCharsets.UTF_8));
            for (int i = 0; i < 50; i++) {
                out.write(spaces);
            }
        }
        assertThat(faultOf(huge).wrong()).isEqualTo("the file is larger than 1 MiB");
        String full = HOOK + " ".repeat(JsonText.MOST_BYTES - HOOK.length());
        assertThat(faults(full)).isEmpty();
        assertThat(faults(full + " ")).hasSize(1);
    }

    @Test
    void emptyFiles() {
        Fault empty = new Fault("", "the file is empty", "it must hold a JSON object");
        assertThat(faultOf(new byte[0])).isEqualTo(empty);
        assertThat(only(faults(" \n\t "))).isEqualTo(empty);
    }

    @Test
    void otherEncodings() {
        byte[] hook = HOOK.getBytes(StandardCharsets.UTF_8);
        byte[] latin = HOOK.replace("hook", "h\u00f6\u00f6k").getBytes(StandardCharsets.ISO_8859_1);
        assertThat(faultOf(latin)).isEqualTo(new Fault("", "the file is not UTF-8", "save it as UTF-8"));
        byte[] mark = {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF};
        assertThat(faultOf(join(mark, hook)))
                .isEqualTo(new Fault("", "the file begins with a byte order mark", "save it as UTF-8 without one"));
        byte[] overlong = {'"', (byte) 0xC0, (byte) 0x80, '"'};
        assertThat(faultOf(overlong).wrong()).isEqualTo("the file is not UTF-8");
        byte[] surrogate = {'"', (byte) 0xED, (byte) 0xA0, (byte) 0x80, '"'};
        assertThat(faultOf(surrogate).wrong()).isEqualTo("the file is not UTF-8");
        assertThat(faultOf(HOOK.getBytes(StandardCharsets.UTF_16)).wrong()).isEqualTo("the file is not UTF-8");
        assertThat(faultOf(HOOK.getBytes(StandardCharsets.UTF_16LE)).wrong()).startsWith("this is not JSON");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '\0',
            value = {
                "{ \"a\": NaN }      | 1 | this is not JSON, near",
                "{ \"a\": Infinity } | 1 | this is not JSON, near",
                "{ \"a\": -Infinity }| 1 | this is not JSON, near",
                "{ \"a\": 01 }       | 1 | this is not JSON, near",
                "{ \"a\": .5 }       | 1 | this is not JSON, near",
                "{ \"a\": +5 }       | 1 | this is not JSON, near",
                "{ 'a': 5 }          | 1 | this is not JSON, near",
                "{ a: 5 }            | 1 | this is not JSON, near",
                "{ \"a\": 5, }       | 1 | this is not JSON, near",
                "{ \"a\": 5 // no }  | 1 | this is not JSON, near",
                "[1, 2 3]            | 1 | this is not JSON, near",
                "{ \"a\": 5          | 1 | the file ends too soon",
                "{ \"a\": \"b        | 1 | the file ends too soon",
                "{} {}               | 1 | something follows the end of the JSON",
                "{} ]                | 1 | this is not JSON, near",
            })
    void brokenJson(String json, int line, String wrong) {
        Fault fault = only(faults("\n" + json));
        assertThat(fault.at()).startsWith("line " + (line + 1) + ", column ");
        assertThat(fault.wrong()).startsWith(wrong);
        assertThat(fault.right()).isNotBlank();
    }

    @Test
    void placeOfABrokenLine() {
        String broken = HOOK.replace("\"bath\": \"phosphate\",", "\"bath\": \"phosphate\"");
        Fault fault = only(faults(broken));
        assertThat(fault.at()).isEqualTo("line 12, column 3");
        assertThat(fault.wrong()).isEqualTo("this is not JSON, near \"\"supply\": { \"max_vol\"");
    }

    @Test
    void deepNesting() {
        assertThat(only(faults("[".repeat(100_000))).wrong()).startsWith("the JSON is nested more than 32 deep");
        assertThat(only(faults("{\"a\":".repeat(100_000))).wrong()).startsWith("the JSON is nested more than 32 deep");
        assertThat(only(faults("[".repeat(33) + "]".repeat(33))).wrong()).contains("deep");
        assertThat(only(faults("[".repeat(32) + "]".repeat(32))).wrong()).isEqualTo("is an array");
    }

    @Test
    void endlessNumbersAndNames() {
        assertThat(only(faults("{ \"title\": " + "9".repeat(2000) + "}")).wrong())
                .contains("far too long");
        assertThat(only(faults("{ \"" + "k".repeat(100_000) + "\": 1}")).wrong())
                .contains("far too long");
        assertThat(faults("{ \"observer\": 1" + "0".repeat(900) + "}"))
                .extracting(Fault::wrong)
                .contains("is a number beyond all bounds");
    }
}
