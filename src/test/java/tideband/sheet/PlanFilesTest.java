package tideband.sheet;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.bench.BenchPlan;
import tideband.pull.Row;

class PlanFilesTest {
    private static final BenchPlan HOOK = BenchPlans.lanternHook();

    /** Reference: the contract of the plan file; each key spelt as other programs read it. */
    @Test
    void planHoldsTheKeysOfTheContract() throws Exception {
        JsonNode plan = new ObjectMapper().readTree(PlanJson.bytes(HOOK));
        assertThat(keys(plan))
                .contains("cost_min", "lower_bound_min", "proven", "bath", "bands", "immersions", "trial", "cautions");
        assertThat(keys(plan.get("bath")))
                .contains(
                        "metal",
                        "nm_per_volt",
                        "field_slope",
                        "native_nm",
                        "efficiency",
                        "resistance_ohm",
                        "ceiling_volts",
                        "index_scale");
        assertThat(keys(plan.at("/bands/0")))
                .contains(
                        "name",
                        "from_mm",
                        "to_mm",
                        "film_nm",
                        "volts",
                        "lab",
                        "srgb",
                        "order",
                        "name_of_colour",
                        "dE00");
        assertThat(keys(plan.at("/immersions/0")))
                .contains("end_down", "masked_before", "stripped_before", "masked", "finishes", "peak_nm", "pull");
        assertThat(keys(plan.at("/immersions/0/pull/0")))
                .contains("t_s", "volts", "line_mm", "depth_mm", "travel_mm", "what");
        assertThat(keys(plan.at("/trial/bands/0"))).contains("film_nm", "dE00_worst");
        assertThat(plan.get("cautions").get(0).isTextual()).isTrue();
    }

    /** Property: values survive, a fade in pairs and any other band in single values. */
    @Test
    void planHoldsTheValues() throws Exception {
        JsonNode plan = new ObjectMapper().readTree(PlanJson.bytes(HOOK));
        assertThat(plan.get("cost_min").doubleValue()).isEqualTo(16.5);
        assertThat(plan.get("proven").booleanValue()).isTrue();
        assertThat(plan.at("/bands/0/film_nm").doubleValue()).isEqualTo(150);
        assertThat(plan.at("/bands/0/lab")).hasSize(3);
        assertThat(plan.at("/bands/1/film_nm").toString()).isEqualTo("[150,46]");
        assertThat(plan.at("/bands/1/volts").toString()).isEqualTo("[83.3,25.6]");
        assertThat(plan.at("/bands/1/name_of_colour").toString()).isEqualTo("[\"violet\",\"deep blue\"]");
        assertThat(plan.at("/bands/1/lab/1")).hasSize(3);
        assertThat(plan.at("/trial/bands/1/film_nm")).hasSize(2);
        assertThat(plan.at("/immersions/1/masked").toString()).isEqualTo("[\"tip\",\"dusk\"]");
        assertThat(plan.at("/immersions/1/masked_before").toString()).isEqualTo("[\"tip\",\"dusk\"]");
        assertThat(plan.at("/immersions/0/pull"))
                .hasSize(HOOK.pulls().get(0).rows().size());
        assertThat(new String(PlanJson.bytes(BenchPlans.sixtyBands()), StandardCharsets.UTF_8))
                .doesNotContainPattern("[0-9][eE][-+]?[0-9]+[,\\s\\]]");
    }

    /** Property: half a surrogate pair in a name stops nothing. */
    @Test
    void anyNameCanBeWritten() throws Exception {
        JsonNode plan = new ObjectMapper().readTree(PlanJson.bytes(BenchPlans.lanternHook("\ud83d\"\u0000", "tsp")));
        assertThat(plan.get("title").textValue()).isEqualTo("?\"\u0000");
    }

    /** Reference: RFC 4180 lines (CRLF, 12 fields each); one row a mark. */
    @Test
    void timingHasOneRowAMark() {
        String csv = new String(TimingCsv.bytes(HOOK, BenchPlans.COLOURS), StandardCharsets.UTF_8);
        assertThat(csv).endsWith("\r\n");
        List<String> lines = csv.lines().filter(l -> !l.startsWith("#")).toList();
        assertThat(lines.get(0))
                .isEqualTo("immersion,end_down,t_s,clock,volts,line_mm,depth_mm,travel_mm,film_nm,colour,srgb,what");
        assertThat(lines)
                .hasSize(1
                        + HOOK.pulls().stream()
                                .mapToInt(p -> (int) p.rows().stream()
                                        .mapToDouble(Row::timeS)
                                        .distinct()
                                        .count())
                                .sum());
        assertThat(lines.get(1)).startsWith("1,A,0,0:00,0,110,107.9,0,3,natural (1),#");
        assertThat(csv).contains(",Hold 30 s\r\n");
        assertThat(lines.get(lines.size() - 1)).startsWith("2,B,35,0:35,25.6,50,47.9,0,46,deep blue (1),");
    }

    /** Reference: RFC 4180, 2.5 to 2.7, for quotes; leading = + - @ and tab are what spreadsheets run. */
    @Test
    void csvTextIsNeutralised() {
        assertThat(Csv.text("plain")).isEqualTo("plain");
        assertThat(Csv.text("a,b \"c\"")).isEqualTo("\"a,b \"\"c\"\"\"");
        for (String start : List.of("=", "+", "-", "@", "\t")) {
            assertThat(Csv.text(start + "1")).startsWith("\"'");
        }
        assertThat(Csv.comment("x\r\n,=1;\"+2\t@3")).isEqualTo("# x   =1  +2 @3\r\n");
        BenchPlan evil = BenchPlans.lanternHook("=cmd\r\n=2,=3", "phosphate");
        assertThat(new String(TimingCsv.bytes(evil, BenchPlans.COLOURS), StandardCharsets.UTF_8).lines())
                .allSatisfy(l -> assertThat(l).matches("(# [^,;\"]*)|([a-z0-9].*)"));
    }

    /** Property: all files, under their names, replacing former ones, and nothing else. */
    @Test
    void exportsAllFiles(@TempDir Path folder) throws Exception {
        Files.writeString(folder.resolve("hook-timing.csv"), "former");
        List<Path> written = Exports.write(HOOK, BenchPlans.COLOURS, folder, "hook", false);
        assertThat(written.stream().map(p -> p.getFileName().toString()))
                .containsExactly(
                        "hook-preview.svg",
                        "hook-steps-a4.pdf",
                        "hook-steps-letter.pdf",
                        "hook-timing.csv",
                        "hook-plan.json");
        assertThat(names(folder)).hasSize(5);
        assertThat(folder.resolve("hook-timing.csv")).hasBinaryContent(TimingCsv.bytes(HOOK, BenchPlans.COLOURS));
        assertThat(Exports.write(HOOK, BenchPlans.COLOURS, folder.resolve("new/folder"), "hook", false))
                .hasSize(5);
    }

    /** Property: where this Java has fonts there is a PNG too; where it has none, nothing is written and it says why. */
    @Test
    void pngIsDrawnOrRefused(@TempDir Path folder) throws Exception {
        try {
            Exports.write(HOOK, BenchPlans.COLOURS, folder, "hook", true);
            assertThat(names(folder)).hasSize(6);
            assertThat(Files.readAllBytes(folder.resolve("hook-preview.png"))).startsWith(0x89, 'P', 'N', 'G');
        } catch (IOException e) {
            assertThat(e).hasMessageContaining("leave the PNG out");
            assertThat(names(folder)).isEmpty();
        }
    }

    /** Property: a target that cannot be written leaves everything as it was. */
    @Test
    void failedExportLeavesNothing(@TempDir Path folder) throws Exception {
        Files.writeString(folder.resolve("hook-preview.svg"), "former");
        Files.createDirectory(folder.resolve("hook-plan.json"));
        assertThatExceptionOfType(IOException.class)
                .isThrownBy(() -> Exports.write(HOOK, BenchPlans.COLOURS, folder, "hook", false))
                .withMessageContaining("hook-plan.json is a folder");
        assertThat(names(folder)).containsExactlyInAnyOrder("hook-preview.svg", "hook-plan.json");
        assertThat(folder.resolve("hook-preview.svg")).hasContent("former");
    }

    /** Property: a file that cannot even be staged takes the others back with it. */
    @Test
    void failedStagingLeavesNothing(@TempDir Path folder) throws Exception {
        Map<String, byte[]> files = new LinkedHashMap<>();
        files.put("first.txt", new byte[] {1});
        files.put("missing/second.txt", new byte[] {2});
        assertThatExceptionOfType(IOException.class).isThrownBy(() -> Exports.place(folder, files));
        assertThat(names(folder)).isEmpty();
    }

    @Test
    void namesThatLeadElsewhereAreRefused(@TempDir Path folder) {
        for (String name : List.of("", "a/b", "..\\x", "c:x")) {
            assertThatIllegalArgumentException()
                    .isThrownBy(() -> Exports.write(HOOK, BenchPlans.COLOURS, folder, name, false))
                    .withMessageContaining("name must be");
        }
    }

    /** Property. */
    @Test
    void numbersArePlain() {
        assertThat(Figures.plain(1e7, 4)).isEqualTo("10000000");
        assertThat(Figures.plain(-0.00001, 4)).isEqualTo("0");
        assertThat(Figures.fixed(42, 1)).isEqualTo("42.0");
        assertThat(Figures.clock(59.6)).isEqualTo("1:00");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Figures.plain(Double.NaN, 1))
                .withMessageContaining("must be finite, but was NaN");
    }

    private static List<String> keys(JsonNode node) {
        List<String> keys = new ArrayList<>();
        node.fieldNames().forEachRemaining(keys::add);
        return keys;
    }

    private static List<String> names(Path folder) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(p -> p.getFileName().toString()).toList();
        }
    }
}
