package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.match.FilmColour;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;

class ColoursCommandTest {
    @TempDir
    private Path folder;

    /** Reference: the contract's header, to the byte, and rows that end in a line feed alone. */
    @Test
    void theTable() {
        Ran ran = Ran.line("colours --metal titanium");
        assertThat(ran.code()).isZero();
        assertThat(ran.err()).isEmpty();
        assertThat(ran.header()).isEqualTo("film_nm,order,name,X,Y,Z,L,a,b,srgb,in_gamut");
        assertThat(ran.out()).doesNotContain("\r").endsWith("\n");
        assertThat(ran.rows()).hasSize(51).allMatch(row -> row.size() == 11);
        assertThat(ran.rows().get(0).get(0)).isEqualTo("0.000");
        assertThat(ran.rows().get(50).get(0)).isEqualTo("250.000");
        assertThat(ran.remarks()).anyMatch(line -> line.contains("Mash")).anyMatch(line -> line.contains("Siefke"));
    }

    /** Property: each row is the palette's colour of the film it names, in the light, finish and angle asked for. */
    @Test
    void eachRowIsItsFilm() {
        Ran ran = Ran.line("colours --metal tantalum --finish satin --light LED-B3 --observer 10 --angle 40"
                + " --from 12.3456 --to 180 --step 7.77");
        Palette palette = new Palette(
                FilmSystem.of("tantalum", 1),
                Finish.SATIN,
                Viewing.of(Illuminant.LED_B3, Observer.CIE_1964_10_DEGREE),
                40,
                180);
        assertThat(ran.rows()).hasSize(22);
        for (int i = 0; i < ran.rows().size(); i++) {
            FilmColour film = palette.at(ran.number(i, 0));
            assertThat(film.filmNm()).isCloseTo(12.3456 + 7.77 * i, within(0.00051));
            assertThat(ran.rows().get(i).get(1)).isEqualTo(Integer.toString(film.order()));
            assertThat(ran.rows().get(i).get(2)).isEqualTo(film.name().text());
            double[] expected = {
                film.xyz().x(),
                film.xyz().y(),
                film.xyz().z(),
                film.lab().lightness(),
                film.lab().a(),
                film.lab().b()
            };
            for (int j = 0; j < expected.length; j++) {
                assertThat(ran.number(i, 3 + j)).isCloseTo(expected[j], within(0.5001e-4));
            }
            assertThat(ran.rows().get(i).get(9)).isEqualTo(film.srgbHex());
            assertThat(ran.rows().get(i).get(10)).isEqualTo(Boolean.toString(film.inGamut()));
        }
    }

    /** Property: films run from the first by even steps and never pass the last, to the edges of what is allowed. */
    @ParameterizedTest
    @CsvSource({
        "0, 0, 5, 1, 0.000",
        "0, 0.3, 0.1, 4, 0.300",
        "10, 19.99, 5, 2, 15.000",
        "0, 0.05, 0.01, 6, 0.050",
        "1990, 2000, 5, 3, 2000.000",
        "7, 2000, 2000, 1, 7.000",
        "0.1, 1e1, 1.1, 10, 10.000"
    })
    void theGrid(String from, String to, String step, int rows, String last) {
        Ran ran = Ran.of("colours", "--metal", "niobium", "--from", from, "--to", to, "--step", step);
        assertThat(ran.code()).isZero();
        assertThat(ran.rows()).hasSize(rows);
        assertThat(ran.rows().get(rows - 1).get(0)).isEqualTo(last);
    }

    /** Property: Ti-6Al-4V is drawn with titanium's constants, and says so. */
    @Test
    void theAlloySaysWhoseConstantsItTakes() {
        Ran alloy = Ran.line("colours --metal ti-6al-4v --step 50");
        assertThat(alloy.rows())
                .isEqualTo(Ran.line("colours --metal titanium --step 50").rows());
        assertThat(alloy.remarks()).anyMatch(line -> line.contains("these are titanium's"));
    }

    /** Property: the chart shows every film of the table in words, is the same on every run, and lies alone in its folder. */
    @Test
    void theChart() throws Exception {
        Path chart = folder.resolve("films.svg");
        Ran ran = Ran.of("colours", "--metal", "niobium", "--step", "10", "--svg", chart.toString());
        assertThat(ran.code()).isZero();
        assertThat(ran.out())
                .isEqualTo(Ran.line("colours --metal niobium --step 10").out());
        String svg = Files.readString(chart, StandardCharsets.UTF_8);
        for (List<String> row : ran.rows()) {
            String film = row.get(0).replace(".000", "") + " nm";
            assertThat(svg).contains(">" + film + "<", row.get(2) + " (" + row.get(1) + ")", row.get(9));
        }
        byte[] first = Files.readAllBytes(chart);
        Ran.of("colours", "--metal", "niobium", "--step", "10", "--svg", chart.toString());
        assertThat(Files.readAllBytes(chart)).isEqualTo(first);
        try (Stream<Path> files = Files.list(folder)) {
            assertThat(files).containsExactly(chart);
        }
    }

    /** Property: a chart that cannot be written is said so, with nothing half done and no table before it. */
    @Test
    void theChartCannotBeWritten() {
        for (Path place : List.of(folder, folder.resolve("none").resolve("films.svg"), folder.getRoot())) {
            Ran ran = Ran.of("colours", "--metal", "niobium", "--svg", place.toString());
            assertThat(ran.code()).isEqualTo(Program.AT_FAULT);
            assertThat(ran.out()).isEmpty();
            assertThat(ran.err())
                    .contains("the chart was not written to " + place)
                    .doesNotContain("Exception");
        }
        assertThat(folder).isEmptyDirectory();
    }

    /** Property: a chart of one film and one of the most films can be drawn. */
    @Test
    void smallestAndLargestChart() {
        for (String step : List.of("2000", "0.1")) {
            Path chart = folder.resolve("chart.svg");
            Ran ran =
                    Ran.of("colours", "--metal", "titanium", "--to", "59.9", "--step", step, "--svg", chart.toString());
            assertThat(ran.code()).isZero();
            assertThat(chart).isNotEmptyFile();
        }
    }
}
