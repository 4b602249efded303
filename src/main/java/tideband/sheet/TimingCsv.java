package tideband.sheet;

import java.nio.charset.StandardCharsets;
import java.util.List;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.match.FilmColour;
import tideband.pull.Row;

/**
 * The pulls of all immersions as CSV (RFC 4180, UTF-8), one row a mark.
 *
 * <p>Columns: {@code immersion} (from 1), {@code end_down} (A or B), {@code t_s} (seconds since the immersion began),
 * {@code clock} (minutes:seconds), {@code volts}, {@code line_mm} (colour line from the end that is down),
 * {@code depth_mm} (by gauge in the flat bath), {@code travel_mm} (of the hand), {@code film_nm} (at the line),
 * {@code colour} (name and order of that film), {@code srgb}, {@code what} (what is done from here to the next row).
 * Lines that open with {@code #} say what the file is.
 */
public final class TimingCsv {
    private static final List<String> HEADER = List.of(
            "immersion",
            "end_down",
            "t_s",
            "clock",
            "volts",
            "line_mm",
            "depth_mm",
            "travel_mm",
            "film_nm",
            "colour",
            "srgb",
            "what");

    private TimingCsv() {}

    /**
     * The timing table.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @return the file's bytes
     */
    public static byte[] bytes(BenchPlan plan, Colours colours) {
        StringBuilder out = new StringBuilder();
        out.append(Csv.comment("Tideband timing table: " + plan.design().title()));
        out.append(Csv.comment(
                "one row a mark: set the volts (0 is supply off), then do what it says until the next mark"));
        out.append(Csv.row(HEADER));
        for (int i = 0; i < plan.pulls().size(); i++) {
            for (HandMark mark : HandMark.of(plan.pulls().get(i), plan.design().supply())) {
                out.append(Csv.row(fields(plan, colours, i, mark)));
            }
        }
        return out.toString().getBytes(StandardCharsets.UTF_8);
    }

    private static List<String> fields(BenchPlan plan, Colours colours, int immersion, HandMark mark) {
        Row row = mark.row();
        FilmColour colour = colours.ofFilm(row.filmNm());
        return List.of(
                Integer.toString(immersion + 1),
                plan.plan().immersions().get(immersion).endDown().name(),
                Figures.plain(row.timeS(), 2),
                Figures.clock(row.timeS()),
                Figures.plain(row.volts(), 3),
                Figures.plain(row.lineMm(), 3),
                Figures.plain(row.depthMm(), 3),
                Figures.plain(row.travelMm(), 3),
                Figures.plain(row.filmNm(), 2),
                Csv.text(Wording.colour(colour)),
                colour.srgbHex(),
                Csv.text(mark.sentence()));
    }
}
