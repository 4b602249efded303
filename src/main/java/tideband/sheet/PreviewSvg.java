package tideband.sheet;

import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.trial.TrialBand;

/**
 * The piece as the trial predicts it, to scale, over the piece as drawn, with a ruler and a key.
 *
 * <p>Nothing is said by colour alone: every band has its number, film, volts, colour name and order in words; crisp and
 * soft edges differ in line and sign.
 */
public final class PreviewSvg {
    private static final double WIDTH_MM = 297;
    private static final double EDGE_MM = 12;
    private static final double INNER_MM = WIDTH_MM - 2 * EDGE_MM;
    private static final double MOST_ACROSS_MM = 60;
    private static final double LABEL_MM = 3.3;
    private static final double LONGEST_NAME_MM = 42;
    private static final double KEY_ROW_MM = 6.4;

    private PreviewSvg() {}

    /**
     * The preview as an SVG file.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @return the file's bytes, UTF-8
     */
    public static byte[] bytes(BenchPlan plan, Colours colours) {
        return SvgWriter.bytes(drawing(plan, colours));
    }

    static Drawing drawing(BenchPlan plan, Colours colours) {
        Design design = plan.design();
        Pen pen = new Pen();
        double y = head(pen, plan);
        LevelPicture picture = new LevelPicture(plan, colours, EDGE_MM, INNER_MM, MOST_ACROSS_MM);
        pen.words("As predicted", EDGE_MM, y, 3.6, true, Mark.Anchor.START);
        pen.words(picture.scale(), WIDTH_MM - EDGE_MM, y, 3, false, Mark.Anchor.END);
        y += 3;
        double labelTop = y;
        double pieceTop = labelTop + 26;
        boolean labelled = picture.labels(pen, labels(plan), labelTop, LABEL_MM, pieceTop);
        double wantedTop = pieceTop + picture.acrossMm() + 22;
        if (!labelled) {
            picture.numbers(
                    pen,
                    pieceTop - 10,
                    pieceTop,
                    wantedTop + picture.acrossMm(),
                    wantedTop + picture.acrossMm() + 13,
                    3);
        }
        picture.predicted(pen, pieceTop);
        picture.edges(pen, pieceTop);
        picture.ruler(pen, pieceTop + picture.acrossMm() + 6);
        picture.wanted(pen, wantedTop);
        pen.words("As drawn", EDGE_MM, wantedTop - 3.4, 3.6, true, Mark.Anchor.START);
        y = wantedTop + picture.acrossMm() + (labelled ? 8 : 20);
        legend(pen, y);
        y = key(pen, plan, colours, y + 8);
        String title = design.title() + ": preview";
        return new Drawing(WIDTH_MM, y + 8, title, description(plan), withPaper(pen, y + 8));
    }

    private static List<Mark> withPaper(Pen pen, double heightMm) {
        Pen paper = new Pen();
        paper.box(0, 0, WIDTH_MM, heightMm, Ink.fill(Ink.WHITE));
        return Stream.concat(paper.marks().stream(), pen.marks().stream()).toList();
    }

    private static double head(Pen pen, BenchPlan plan) {
        Design design = plan.design();
        pen.words(Typeface.fit(design.title(), 8, true, INNER_MM), EDGE_MM, 18, 8, true, Mark.Anchor.START);
        String material = design.metal().key() + ", " + design.finish().key() + " \u00b7 "
                + Wording.piece(design.piece()) + " \u00b7 " + Wording.light(design) + " \u00b7 bath: "
                + design.bath().name();
        pen.words(Typeface.fit(material, 3.8, false, INNER_MM), EDGE_MM, 26, 3.8);
        String cost = Figures.count(plan.plan().immersions().size(), "immersion") + " \u00b7 bench cost "
                + Figures.plain(plan.plan().cost().minutes(), 1) + " min \u00b7 " + Wording.proof(plan);
        pen.words(Typeface.fit(cost, 3.8, false, INNER_MM), EDGE_MM, 32, 3.8);
        pen.line(EDGE_MM, 35, WIDTH_MM - EDGE_MM, 35, 0.4);
        return 41;
    }

    private static List<List<String>> labels(BenchPlan plan) {
        return IntStream.range(0, plan.bands().size())
                .mapToObj(i -> {
                    BenchBand band = plan.bands().get(i);
                    String name = Typeface.fit((i + 1) + " " + band.name(), LABEL_MM, true, LONGEST_NAME_MM);
                    if (band.bare()) {
                        return List.of(name, Wording.colour(band));
                    }
                    return List.of(
                            name,
                            Wording.film(band) + " nm",
                            Wording.volts(band, plan.design()) + " V",
                            Wording.colour(band));
                })
                .toList();
    }

    private static void legend(Pen pen, double baseMm) {
        LevelPicture.edge(pen, EDGE_MM + 1, baseMm - 3.4, true);
        pen.words("crisp edge: a mask line", EDGE_MM + 4, baseMm, 3.2);
        LevelPicture.edge(pen, 61, baseMm - 3.4, false);
        pen.words("soft edge: a waterline will do", 64, baseMm, 3.2);
        pen.words("positions in mm from end A", WIDTH_MM - EDGE_MM, baseMm, 3.2, false, Mark.Anchor.END);
    }

    /** Columns of the key: where each begins, in mm. */
    private static double key(Pen pen, BenchPlan plan, Colours colours, double topMm) {
        double y = topMm;
        double[] at = {EDGE_MM, 20, 63, 86, 116, 143, 206, 223, 240, 251, 267.5};
        String[] heads = {
            "no.",
            "band",
            "from\u2013to mm",
            "film nm",
            "volts",
            "colour (order)",
            "drawn",
            "predicted",
            "edge",
            "\u0394E00 film",
            "\u0394E00 worst"
        };
        for (int i = 0; i < at.length; i++) {
            pen.words(heads[i], at[i], y, 2.8, true, Mark.Anchor.START);
        }
        pen.line(EDGE_MM, y + 1.6, WIDTH_MM - EDGE_MM, y + 1.6, 0.3);
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            TrialBand trial = plan.trial().bands().get(i);
            boolean last = i == plan.bands().size() - 1;
            String[] cells = {
                Integer.toString(i + 1),
                band.name(),
                Wording.span(band),
                band.bare() ? "\u2013" : Wording.film(band),
                Wording.volts(band, plan.design()),
                Wording.colour(band),
                "",
                "",
                last ? "end B" : band.crispAtB() ? "crisp" : "soft",
                Figures.fixed(band.wantedDe00(), 1),
                Figures.fixed(trial.de00Worst(), 1)
            };
            y += KEY_ROW_MM;
            for (int j = 0; j < at.length; j++) {
                double room = (j + 1 < at.length ? at[j + 1] : WIDTH_MM - EDGE_MM) - at[j] - 1.5;
                pen.words(
                        Typeface.fit(cells[j], LABEL_MM, j == 0, room), at[j], y, LABEL_MM, j == 0, Mark.Anchor.START);
            }
            pen.chip(Wording.wantedHexes(band, colours, Wording.CHIP_STEPS), at[6], y - 3.9, 14, 5);
            pen.chip(Wording.predictedHexes(plan, band, colours), at[7], y - 3.9, 14, 5);
            pen.dashed(EDGE_MM, y + 1.8, WIDTH_MM - EDGE_MM, y + 1.8, 0.1, 0, Ink.GREY);
        }
        y += 7;
        pen.words(
                "\u0394E00: CIEDE2000 difference from the drawing; 'film' for the film chosen, 'worst' for the worst place"
                        + " of the band in the trial, waterline blur left out.",
                EDGE_MM,
                y,
                2.8);
        return y;
    }

    private static String description(BenchPlan plan) {
        return IntStream.range(0, plan.bands().size())
                .mapToObj(i -> {
                    BenchBand band = plan.bands().get(i);
                    return String.format(
                            Locale.ROOT,
                            "Band %d, %s, %s mm from end A: %s%s.",
                            i + 1,
                            band.name(),
                            Wording.span(band),
                            Wording.colour(band),
                            band.bare()
                                    ? ""
                                    : ", film " + Wording.film(band) + " nm, " + Wording.volts(band, plan.design())
                                            + " V");
                })
                .collect(Collectors.joining(" "));
    }
}
