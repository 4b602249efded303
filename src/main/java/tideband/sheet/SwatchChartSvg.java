package tideband.sheet;

import java.util.List;
import tideband.match.FilmColour;

/**
 * Films side by side over a scale in nm, and each of them again as a swatch with its film, colour name, order and screen
 * colour in words.
 */
public final class SwatchChartSvg {
    /** The most films a chart takes. */
    public static final int MOST_FILMS = 600;

    private static final double WIDTH_MM = 297;
    private static final double EDGE_MM = 12;
    private static final double INNER_MM = WIDTH_MM - 2 * EDGE_MM;
    private static final double STRIP_MM = 22;
    private static final int COLUMNS = 4;
    private static final double ROW_MM = 11;
    private static final double SWATCH_MM = 16;
    private static final double LABEL_MM = 3;
    private static final double FEWEST_MM_A_MARK = 12;
    private static final List<Double> MARKS_NM =
            List.of(0.01, 0.02, 0.05, 0.1, 0.2, 0.5, 1.0, 2.0, 5.0, 10.0, 20.0, 50.0, 100.0, 200.0, 500.0);

    private final Pen pen = new Pen();
    private final List<FilmColour> films;
    private final double firstNm;
    private final double lastNm;

    private SwatchChartSvg(List<FilmColour> films) {
        this.films = films;
        this.firstNm = films.get(0).filmNm();
        this.lastNm = films.get(films.size() - 1).filmNm();
    }

    /**
     * The chart as an SVG file.
     *
     * @param title what is shown
     * @param conditions metal, finish and light in words
     * @param films the films, thinnest first, 1 to {@value #MOST_FILMS}
     * @return the file's bytes, UTF-8
     */
    public static byte[] bytes(String title, String conditions, List<FilmColour> films) {
        if (films.isEmpty() || films.size() > MOST_FILMS) {
            throw new IllegalArgumentException(
                    "a chart takes 1 to " + MOST_FILMS + " films, but there were " + films.size());
        }
        return SvgWriter.bytes(new SwatchChartSvg(List.copyOf(films)).drawing(title, conditions));
    }

    private Drawing drawing(String title, String conditions) {
        int rows = (films.size() + COLUMNS - 1) / COLUMNS;
        double gridMm = 42 + STRIP_MM + 16;
        double heightMm = gridMm + rows * ROW_MM + 12;
        pen.box(0, 0, WIDTH_MM, heightMm, Ink.fill(Ink.WHITE));
        pen.words(Typeface.fit(title, 8, true, INNER_MM), EDGE_MM, 18, 8, true, Mark.Anchor.START);
        pen.words(Typeface.fit(conditions, 3.8, false, INNER_MM), EDGE_MM, 26, 3.8);
        strip(36);
        for (int i = 0; i < films.size(); i++) {
            int row = i / COLUMNS;
            int column = i % COLUMNS;
            swatch(films.get(i), EDGE_MM + column * (INNER_MM / COLUMNS), gridMm + row * ROW_MM);
        }
        pen.words(
                "The number after a name is its order. * lies outside what a screen can show: drawn with less chroma.",
                EDGE_MM,
                heightMm - 6,
                LABEL_MM);
        return new Drawing(WIDTH_MM, heightMm, title, description(title, conditions), pen.marks());
    }

    private void strip(double topMm) {
        double each = INNER_MM / films.size();
        for (int i = 0; i < films.size(); i++) {
            // Each patch runs to the right end, so that no seam shows between neighbours.
            double left = EDGE_MM + i * each;
            pen.box(
                    left,
                    topMm,
                    WIDTH_MM - EDGE_MM - left,
                    STRIP_MM,
                    Ink.fill(films.get(i).srgbHex()));
        }
        pen.box(EDGE_MM, topMm, INNER_MM, STRIP_MM, Ink.outline(Ink.BLACK, 0.25));
        double baseMm = topMm + STRIP_MM;
        for (int i = 1; i < films.size(); i++) {
            if (films.get(i).order() != films.get(i - 1).order()) {
                double at = EDGE_MM + i * each;
                pen.line(at, topMm - 3, at, topMm, 0.4);
                pen.words("order " + films.get(i).order(), at + 1, topMm - 1.2, LABEL_MM);
            }
        }
        if (films.size() == 1) {
            return;
        }
        double mmPerNm = (INNER_MM - each) / (lastNm - firstNm);
        double markNm = MARKS_NM.stream()
                .filter(nm -> nm * mmPerNm >= FEWEST_MM_A_MARK)
                .findFirst()
                .orElse(lastNm - firstNm);
        int decimals = markNm < 0.1 ? 2 : markNm < 1 ? 1 : 0;
        for (long mark = (long) Math.ceil(firstNm / markNm - 1e-9); mark * markNm <= lastNm + 1e-9; mark++) {
            double at = EDGE_MM + each / 2 + (mark * markNm - firstNm) * mmPerNm;
            pen.line(at, baseMm, at, baseMm + 2, 0.25);
            pen.words(Figures.fixed(mark * markNm, decimals), at, baseMm + 5.4, LABEL_MM, false, Mark.Anchor.MIDDLE);
        }
        pen.words("film, nm", WIDTH_MM - EDGE_MM, baseMm + 9.4, LABEL_MM, false, Mark.Anchor.END);
    }

    private void swatch(FilmColour film, double leftMm, double topMm) {
        pen.chip(List.of(film.srgbHex()), leftMm, topMm, SWATCH_MM, ROW_MM - 2);
        double textMm = leftMm + SWATCH_MM + 2;
        String nm = Figures.plain(film.filmNm(), 3) + " nm";
        pen.words(nm, textMm, topMm + 3.6, 3.2, true, Mark.Anchor.START);
        pen.words(
                Wording.colour(film) + (film.inGamut() ? "" : " *") + ", " + film.srgbHex(),
                textMm,
                topMm + 7.8,
                LABEL_MM);
    }

    private String description(String title, String conditions) {
        StringBuilder text = new StringBuilder(title + "; " + conditions + ". From thin to thick:");
        FilmColour before = null;
        for (FilmColour film : films) {
            if (before == null || before.name() != film.name() || before.order() != film.order()) {
                text.append(before == null ? " " : ", ")
                        .append(Figures.plain(film.filmNm(), 3))
                        .append(" nm ")
                        .append(Wording.colour(film));
            }
            before = film;
        }
        return text.append('.').toString();
    }
}
