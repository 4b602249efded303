package tideband.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.IntStream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tideband.match.FilmColour;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.sheet.Exports;
import tideband.sheet.Figures;
import tideband.sheet.SwatchChartSvg;

/** What films show: a table of film, order, name and colour. */
@Command(
        name = "colours",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Tells what colour each film shows.",
        description = {
            "",
            "Columns of the CSV:",
            "  film_nm,order,name,X,Y,Z,L,a,b,srgb,in_gamut",
            "",
            "X, Y, Z with Y = 100 for the perfect reflector; L, a, b against the light's own white; srgb is the screen colour,"
                    + " with less chroma where in_gamut is false. order counts how often the hues have gone round.",
            ""
        },
        footer = {
            "",
            "The lantern maker looks for the blue of a collar, and prints a chart for the wall:",
            "  tideband colours --metal titanium --from 30 --to 60 --step 1",
            "  tideband colours --metal niobium --finish satin --svg niobium.svg",
            "",
            "Exit codes: 0 done, 1 the chart could not be written, 2 wrong use."
        })
final class ColoursCommand implements Callable<Integer> {
    private static final int MOST_ROWS = 100_000;
    /** Films are taken as written, so that a row is the colour of the very film it names. */
    private static final int FILM_DECIMALS = 3;

    private static final int DECIMALS = 4;

    @Spec
    private CommandSpec spec;

    @Mixin
    private LookOptions look;

    @Option(
            names = "--from",
            converter = Decimal.class,
            defaultValue = "0",
            paramLabel = "NM",
            description = "First film, 0 to 2000 nm. Default: ${DEFAULT-VALUE}.")
    private double fromNm;

    @Option(
            names = "--to",
            converter = Decimal.class,
            defaultValue = "250",
            paramLabel = "NM",
            description = "No film above this, up to 2000 nm. Default: ${DEFAULT-VALUE}.")
    private double toNm;

    @Option(
            names = "--step",
            converter = Decimal.class,
            defaultValue = "5",
            paramLabel = "NM",
            description = "From film to film, at least 0.01 nm; at most 100000 rows. Default: ${DEFAULT-VALUE}.")
    private double stepNm;

    @Option(
            names = "--svg",
            paramLabel = "FILE",
            description = "Also draw the films, at most 600, as a chart of swatches.")
    private Path svg;

    @Override
    public Integer call() throws Refusal {
        long rows = checkedRows();
        FilmSystem system = FilmSystem.of(look.metal().opticsKey(), 1);
        Palette palette = look.palette(system, Math.max(1, toNm));
        if (svg != null) {
            List<FilmColour> films = IntStream.range(0, Math.toIntExact(rows))
                    .mapToObj(row -> palette.at(filmNm(row)))
                    .toList();
            draw(films);
        }
        CsvWriter csv = new CsvWriter(spec.commandLine().getOut());
        csv.comment("films on " + look.words());
        look.tell(csv, system);
        csv.row("film_nm", "order", "name", "X", "Y", "Z", "L", "a", "b", "srgb", "in_gamut");
        for (long row = 0; row < rows && !csv.unread(); row++) {
            write(csv, palette.at(filmNm(row)));
        }
        return Program.DONE;
    }

    private void draw(List<FilmColour> films) throws Refusal {
        try {
            Exports.write(svg, SwatchChartSvg.bytes("Films on " + look.metal().key(), look.words(), films));
        } catch (IOException e) {
            throw new Refusal("the chart was not written to " + svg + ": " + Answers.reason(e), List.of());
        }
    }

    private long checkedRows() {
        Limits limits = new Limits()
                .within("--from", fromNm, 0, Palette.MOST_NM, "nm")
                .within("--to", toNm, 0, Palette.MOST_NM, "nm")
                .within("--step", stepNm, 0.01, Palette.MOST_NM, "nm")
                .holds(fromNm <= toNm, "--from must not be above --to");
        look.check(limits);
        limits.enforce(spec);
        long rows = (long) Math.floor((toNm - fromNm) / stepNm + 1e-9) + 1;
        limits.holds(
                        rows <= MOST_ROWS,
                        "that would be " + rows + " rows; choose a larger --step for at most " + MOST_ROWS)
                .holds(
                        svg == null || rows <= SwatchChartSvg.MOST_FILMS,
                        "--svg draws at most " + SwatchChartSvg.MOST_FILMS + " films, and these are " + rows
                                + "; choose a larger --step")
                .enforce(spec);
        return rows;
    }

    private double filmNm(long row) {
        return Double.parseDouble(Figures.fixed(Math.min(toNm, fromNm + row * stepNm), FILM_DECIMALS));
    }

    private static void write(CsvWriter csv, FilmColour film) {
        csv.row(
                Figures.fixed(film.filmNm(), FILM_DECIMALS),
                Integer.toString(film.order()),
                film.name().text(),
                Figures.fixed(film.xyz().x(), DECIMALS),
                Figures.fixed(film.xyz().y(), DECIMALS),
                Figures.fixed(film.xyz().z(), DECIMALS),
                Figures.fixed(film.lab().lightness(), DECIMALS),
                Figures.fixed(film.lab().a(), DECIMALS),
                Figures.fixed(film.lab().b(), DECIMALS),
                film.srgbHex(),
                Boolean.toString(film.inGamut()));
    }
}
