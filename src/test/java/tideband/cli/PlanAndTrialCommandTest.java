package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class PlanAndTrialCommandTest {
    private static final String HOOK = "designs/lantern-hook.json";
    private static final String KEY = "designs/wick-key.json";

    @TempDir
    private Path folder;

    private static List<Path> files(Path directory) throws Exception {
        try (Stream<Path> files = Files.list(directory)) {
            return files.sorted().toList();
        }
    }

    private String changed(String design, String what, String into) throws Exception {
        String text = Files.readString(Path.of(design));
        assertThat(text).contains(what);
        return Files.writeString(folder.resolve("changed.json"), text.replace(what, into))
                .toString();
    }

    /** Property: the plan to read names cost, proof, every band with its volts, masks, marks and cautions; writes nothing. */
    @Test
    void theSummary() throws Exception {
        List<Path> before = files(Path.of("."));
        Ran ran = Ran.of("plan", KEY);
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.out())
                .contains("Bench cost:", "2 × immersion 4", "13.5 min", "Proven:", "Immersion 1 of 2", "Mask band")
                .contains("Strip band", "Cautions", "Never salt", "On. Hold 30 s", "Off. Lift out")
                .doesNotContain("\r", "null");
        JsonNode plan =
                new ObjectMapper().readTree(Ran.of("plan", KEY, "--json").out());
        for (JsonNode band : plan.get("bands")) {
            assertThat(ran.out()).contains(band.get("name").asText());
            if (band.get("volts").isNumber() && band.get("volts").asDouble() > 0) {
                assertThat(ran.out()).contains(" " + band.get("volts").asText());
            }
        }
        assertThat(files(Path.of("."))).isEqualTo(before);
    }

    /** Reference: the contract's keys; standard output is the plan and nothing else. */
    @Test
    void theJson() throws Exception {
        Ran ran = Ran.of("plan", HOOK, "--json");
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        JsonNode plan = new ObjectMapper().readTree(ran.out());
        for (String key : List.of("cost_min", "lower_bound_min", "proven", "bath", "bands", "immersions", "trial")) {
            assertThat(plan.has(key)).as(key).isTrue();
        }
        assertThat(plan.get("cost_min").asDouble()).isEqualTo(4);
        assertThat(ran.out()).startsWith("{").endsWith("}\n");
    }

    /** Property: with a folder all sheets are written and listed, the plan among them the one that is printed. */
    @Test
    void theSheets() throws Exception {
        Path out = folder.resolve("for the wall");
        Ran ran = Ran.of("plan", KEY, "--out", out.toString(), "--json");
        assertThat(ran.code()).isZero();
        List<Path> written = files(out);
        assertThat(written)
                .extracting(path -> path.getFileName().toString())
                .containsExactly(
                        "wick-key-plan.json",
                        "wick-key-preview.svg",
                        "wick-key-steps-a4.pdf",
                        "wick-key-steps-letter.pdf",
                        "wick-key-timing.csv");
        assertThat(ran.err().lines())
                .containsExactlyInAnyOrderElementsOf(
                        written.stream().map(file -> "wrote " + file).toList());
        assertThat(ran.out())
                .isEqualTo(Files.readString(out.resolve("wick-key-plan.json"), StandardCharsets.UTF_8))
                .isEqualTo(Ran.of("plan", KEY, "--json").out());
        Ran toRead = Ran.of("plan", KEY, "--out", out.toString());
        assertThat(toRead.out()).isEqualTo(Ran.of("plan", KEY).out());
    }

    /** Property: where nothing can be written, that is said, and nothing is printed as if all were well. */
    @Test
    void theSheetsCannotBeWritten() throws Exception {
        Path file = Files.writeString(folder.resolve("in-the-way"), "x");
        for (Path out : List.of(file, file.resolve("deeper"))) {
            Ran ran = Ran.of("plan", KEY, "--out", out.toString());
            assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
            assertThat(ran.out()).isEmpty();
            assertThat(ran.err()).startsWith("tideband plan: nothing was written into " + out + ": ");
        }
        assertThat(files(folder)).containsExactly(file);
    }

    /** Property: every fault of a file is told with its place and what would be right, exit code 1. */
    @Test
    void aFileAtFault() throws Exception {
        String file = changed(HOOK, "\"dry_mm\": 10", "\"dry_mm\": -10, \"wet_mm\": 3");
        for (String command : List.of("plan", "trial")) {
            Ran ran = Ran.of(command, file);
            assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
            assertThat(ran.out()).isEmpty();
            assertThat(ran.err()).contains("2 faults", "/holding/dry_mm: ", "/holding/wet_mm: ", "; ");
            assertThat(ran.err().lines()).hasSize(3);
        }
    }

    /** Property: a name that leads nowhere, or to a folder, is a fault of the input. */
    @Test
    void noSuchFile() {
        assertThat(Ran.of("plan", folder.resolve("none.json").toString()).code())
                .isEqualTo(Program.AT_FAULT);
        assertThat(Ran.of("plan", folder.resolve("none.json").toString()).err()).contains("there is no such file");
        assertThat(Ran.of("trial", folder.toString()).err()).contains("this is a folder");
    }

    /** Property: a design that can't be made is answered with each reason and the nearest change that would work. */
    @Test
    void aDesignThatCannotBeMade() throws Exception {
        String file = changed(HOOK, "160", "260");
        Ran ran = Ran.of("plan", file, "--out", folder.resolve("out").toString());
        assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
        assertThat(ran.out()).isEmpty();
        assertThat(ran.err())
                .contains(
                        "can't be made as it is drawn",
                        "band \"tip\"",
                        "band \"rainbow\"",
                        "the bath's ceiling is 100.0 V")
                .contains("draw it at ");
        assertThat(folder.resolve("out")).doesNotExist();
    }

    /** Property: a bath that would grow films beyond all known colours is such a reason, too. */
    @Test
    void aBathTooThick() throws Exception {
        Files.writeString(folder.resolve("thick.json"), """
                {"format": "tideband-bath", "version": 1, "name": "thick", "metal": "titanium", "nm_per_volt": 20,
                 "field_slope": 30, "native_nm": 4, "efficiency": 0.8, "resistance_ohm": 5, "ceiling_volts": 120}
                """);
        Ran ran = Ran.of("plan", changed(HOOK, "\"bath\": \"phosphate\"", "\"bath\": \"thick.json\""));
        assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
        assertThat(ran.err())
                .contains("colours are known for films up to 1584 nm")
                .doesNotContain("Exception");
    }

    /** Property: the trial tells each band's film, colour and distance from the drawing, as the plan's own trial has it. */
    @Test
    void theTrial() throws Exception {
        Ran ran = Ran.of("trial", HOOK);
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.header())
                .isEqualTo("band,from_mm,to_mm,film_a_nm,film_b_nm,order_a,order_b,name_a,name_b,srgb_a,srgb_b,"
                        + "dE00_median,dE00_worst");
        assertThat(ran.rows()).extracting(row -> row.get(0)).containsExactly("tip", "rainbow", "shank", "stub");
        JsonNode trial = new ObjectMapper()
                .readTree(Ran.of("plan", HOOK, "--json").out())
                .at("/trial/bands");
        for (int i = 0; i < ran.rows().size(); i++) {
            JsonNode film = trial.get(i).get("film_nm");
            double aSide = film.isArray() ? film.get(0).asDouble() : film.asDouble();
            double bSide = film.isArray() ? film.get(1).asDouble() : film.asDouble();
            assertThat(ran.number(i, 3)).isCloseTo(aSide, within(0.00501));
            assertThat(ran.number(i, 4)).isCloseTo(bSide, within(0.00501));
            assertThat(ran.number(i, 12)).isGreaterThanOrEqualTo(ran.number(i, 11));
        }
    }

    /** Property: a band's name is only ever text: it opens no column and no line, and runs nothing in a spreadsheet. */
    @Test
    void namesAreText() throws Exception {
        String file = changed(HOOK, "\"tip\"", "\"=2+3, \\\"tip\\\"\"");
        Ran ran = Ran.of("trial", file);
        assertThat(ran.code()).isZero();
        assertThat(ran.out()
                        .lines()
                        .filter(line -> !line.startsWith("#"))
                        .toList()
                        .get(1))
                .startsWith("\"'=2+3, \"\"tip\"\"\",0.00,");
        assertThat(Ran.of("plan", file).out()).contains("=2+3, \"tip\"");
    }
}
