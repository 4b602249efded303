package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.piece.Station;

/** The piece lying level, end A at the left, to a round scale: as predicted, as drawn, with a ruler and its bands. */
final class LevelPicture {
    /** Room for the letters of the ends, each side, in mm. */
    private static final double END_ROOM_MM = 9;

    /** Steps a fade is drawn in: too fine to see. */
    private static final int FADE_STEPS = 120;

    private static final double LEAST_ACROSS_MM = 7;
    private static final List<Double> ENLARGED = List.of(20.0, 10.0, 5.0, 4.0, 3.0, 2.0, 1.5, 1.0);
    private static final List<Double> REDUCED = List.of(1.5, 2.0, 2.5, 3.0, 4.0, 5.0, 6.0, 8.0, 10.0, 15.0, 20.0, 50.0);

    private final BenchPlan plan;
    private final Colours colours;
    private final double along;
    private final double across;
    private final double acrossMm;
    private final String scaleText;
    private final String widthNote;
    private final double startMm;
    private final double leftMm;
    private final double rightMm;

    /**
     * A picture of a plan's piece.
     *
     * @param leftMm left end of the room there is
     * @param widthMm width of the room, letters of the ends included
     * @param mostAcrossMm most the piece may take across
     */
    LevelPicture(BenchPlan plan, Colours colours, double leftMm, double widthMm, double mostAcrossMm) {
        this.plan = plan;
        this.colours = colours;
        this.leftMm = leftMm;
        this.rightMm = leftMm + widthMm;
        double lengthMm = plan.design().piece().lengthMm();
        double sizeMm = plan.design().piece().stations().stream()
                .mapToDouble(Station::sizeMm)
                .max()
                .orElse(0);
        double room = widthMm - 2 * END_ROOM_MM;
        double most = Math.min(room / lengthMm, mostAcrossMm / sizeMm);
        double times;
        if (most >= 1) {
            boolean fullSize = lengthMm >= 0.6 * room;
            times = fullSize
                    ? 1
                    : ENLARGED.stream().filter(s -> s <= most).findFirst().orElse(1.0);
            scaleText = Figures.plain(times, 1) + ":1";
        } else {
            double parts =
                    REDUCED.stream().filter(p -> 1 / p <= most).findFirst().orElse(Math.ceil(1 / most));
            times = 1 / parts;
            scaleText = "1:" + Figures.plain(parts, 1);
        }
        along = times;
        double widened = Math.max(1, Math.ceil(LEAST_ACROSS_MM / (sizeMm * along)));
        across = along * widened;
        startMm = leftMm + END_ROOM_MM + (room - lengthMm * along) / 2;
        acrossMm = sizeMm * across;
        widthNote = widened > 1 ? ", drawn " + Figures.plain(widened, 0) + " times as wide as it is" : "";
    }

    /** How much room the piece takes across, in mm of drawing. */
    double acrossMm() {
        return acrossMm;
    }

    /** The scale in words. */
    String scale() {
        return "scale " + scaleText + widthNote;
    }

    void predicted(Pen pen, double topMm) {
        List<PiecePicture.Slice> slices = plan.trial().cells().stream()
                .map(c -> new PiecePicture.Slice(c.fromMm(), c.toMm(), colours.hexOf(c.lab())))
                .toList();
        piece(pen, topMm, slices);
    }

    void wanted(Pen pen, double topMm) {
        List<PiecePicture.Slice> slices = new ArrayList<>();
        for (BenchBand band : plan.bands()) {
            List<String> hexes = Wording.wantedHexes(band, colours, FADE_STEPS);
            double each = (band.toMm() - band.fromMm()) / hexes.size();
            for (int i = 0; i < hexes.size(); i++) {
                double from = band.fromMm() + i * each;
                double to = i + 1 == hexes.size() ? band.toMm() : from + each;
                slices.add(new PiecePicture.Slice(from, to, hexes.get(i)));
            }
        }
        piece(pen, topMm, slices);
    }

    private void piece(Pen pen, double topMm, List<PiecePicture.Slice> slices) {
        double middle = topMm + acrossMm / 2;
        double lengthMm = plan.design().piece().lengthMm();
        Placing placing = new Placing(new Point(startMm, middle), along, across, Placing.Lie.LEVEL, lengthMm);
        PiecePicture picture = new PiecePicture(plan.design().piece(), placing);
        picture.slices(pen, slices);
        picture.frame(pen);
        pen.words("A", startMm - 3, middle + 2, 5.6, true, Mark.Anchor.END);
        pen.words("B", startMm + lengthMm * along + 3, middle + 2, 5.6, true, Mark.Anchor.START);
    }

    /** Marks of the edges below a piece, 4 mm high: a solid line on a wedge if crisp, a dashed one on a ring if soft. */
    void edges(Pen pen, double pieceTopMm) {
        double top = pieceTopMm + acrossMm;
        for (BenchBand band : plan.bands().subList(0, plan.bands().size() - 1)) {
            double x = startMm + band.toMm() * along;
            edge(pen, x, top, band.crispAtB());
        }
    }

    static void edge(Pen pen, double xMm, double topMm, boolean crisp) {
        if (crisp) {
            pen.line(xMm, topMm, xMm, topMm + 2.4, 0.45);
            pen.shape(
                    List.of(
                            new Point(xMm, topMm + 1.6),
                            new Point(xMm + 1.1, topMm + 3.8),
                            new Point(xMm - 1.1, topMm + 3.8)),
                    Ink.fill(Ink.BLACK));
        } else {
            pen.dashed(xMm, topMm, xMm, topMm + 2.2, 0.3, 0.55, Ink.BLACK);
            List<Point> ring = IntStream.range(0, 16)
                    .mapToObj(i -> new Point(
                            xMm + 0.8 * StrictMath.cos(i * Math.PI / 8),
                            topMm + 3 + 0.8 * StrictMath.sin(i * Math.PI / 8)))
                    .toList();
            pen.shape(ring, new Ink(Ink.WHITE, Ink.BLACK, 0.3));
        }
    }

    /** A ruler along the piece in mm from end A; takes 9 mm of height. */
    void ruler(Pen pen, double topMm) {
        double lengthMm = plan.design().piece().lengthMm();
        double major = List.of(1, 2, 5, 10, 20, 50, 100, 200, 500, 1000, 2000, 5000).stream()
                .filter(m -> m * along >= 12)
                .findFirst()
                .orElse(10_000);
        double minor = major / 10 * along >= 1 ? major / 10 : major / 5;
        pen.line(startMm, topMm, startMm + lengthMm * along, topMm, 0.25);
        int perMajor = (int) Math.rint(major / minor);
        for (int i = 0; i * minor <= lengthMm + 1e-9; i++) {
            double x = startMm + i * minor * along;
            boolean labelled = i % perMajor == 0;
            pen.line(
                    x,
                    topMm,
                    x,
                    topMm + (labelled ? 3 : i % perMajor * 2 == perMajor ? 2.2 : 1.4),
                    labelled ? 0.3 : 0.15);
            if (labelled) {
                pen.words(Figures.plain(i * minor, 1), x, topMm + 6.4, 3, false, Mark.Anchor.MIDDLE);
            }
        }
        pen.words("mm", startMm + lengthMm * along + 5, topMm + 3, 3, false, Mark.Anchor.START);
    }

    /** Labels of some lines each above the piece, with leaders; false, and nothing drawn, if there is no room. */
    boolean labels(Pen pen, List<List<String>> labels, double topMm, double sizeMm, double pieceTopMm) {
        List<Double> widths = labels.stream()
                .map(lines -> IntStream.range(0, lines.size())
                        .mapToDouble(i -> Typeface.widthMm(lines.get(i), sizeMm, i == 0))
                        .max()
                        .orElse(0))
                .toList();
        if (!Labels.fit(widths, 3, leftMm, rightMm)) {
            return false;
        }
        List<Double> wishes = plan.bands().stream().map(this::middleMm).toList();
        List<Double> middles = Labels.spread(wishes, widths, 3, leftMm, rightMm);
        double pitch = sizeMm * 1.25;
        for (int i = 0; i < labels.size(); i++) {
            double x = middles.get(i);
            for (int j = 0; j < labels.get(i).size(); j++) {
                pen.words(labels.get(i).get(j), x, topMm + sizeMm + j * pitch, sizeMm, j == 0, Mark.Anchor.MIDDLE);
            }
            leader(pen, x, topMm + sizeMm + (labels.get(i).size() - 1) * pitch + 1.4, wishes.get(i), pieceTopMm);
        }
        return true;
    }

    /** Numbers of the bands: all above the piece, or every other one below, or as many as there is room for. */
    void numbers(Pen pen, double aboveMm, double pieceTopMm, double pieceBottomMm, double belowMm, double sizeMm) {
        int count = plan.bands().size();
        double width = numberMm(sizeMm);
        int room = numbersInARow(sizeMm);
        List<Integer> all = IntStream.range(0, count).boxed().toList();
        if (!numbersBelow(sizeMm)) {
            row(pen, all, aboveMm, pieceTopMm, sizeMm, width);
            return;
        }
        int step = (count + 2 * room - 1) / (2 * room);
        List<Integer> shown = all.stream().filter(i -> i % step == 0).toList();
        row(pen, everyOther(shown, 0), aboveMm, pieceTopMm, sizeMm, width);
        row(pen, everyOther(shown, 1), belowMm, pieceBottomMm, sizeMm, width);
    }

    /** Whether there are too many numbers for one row, so that every other one stands below. */
    boolean numbersBelow(double sizeMm) {
        return plan.bands().size() > numbersInARow(sizeMm);
    }

    private int numbersInARow(double sizeMm) {
        return (int) Math.floor((rightMm - leftMm) / (numberMm(sizeMm) + 1));
    }

    private double numberMm(double sizeMm) {
        return Typeface.widthMm(Integer.toString(plan.bands().size()), sizeMm, true);
    }

    private static List<Integer> everyOther(List<Integer> all, int first) {
        return IntStream.range(0, all.size())
                .filter(i -> i % 2 == first)
                .mapToObj(all::get)
                .toList();
    }

    private void row(Pen pen, List<Integer> bands, double baseMm, double pieceMm, double sizeMm, double width) {
        List<Double> wishes =
                bands.stream().map(i -> middleMm(plan.bands().get(i))).toList();
        List<Double> middles =
                Labels.spread(wishes, bands.stream().map(i -> width).toList(), 1, leftMm, rightMm);
        boolean above = baseMm < pieceMm;
        for (int i = 0; i < bands.size(); i++) {
            pen.words(Integer.toString(bands.get(i) + 1), middles.get(i), baseMm, sizeMm, true, Mark.Anchor.MIDDLE);
            leader(pen, middles.get(i), above ? baseMm + 1 : baseMm - sizeMm, wishes.get(i), pieceMm);
        }
    }

    private double middleMm(BenchBand band) {
        return startMm + (band.fromMm() + band.toMm()) / 2 * along;
    }

    private static void leader(Pen pen, double labelXMm, double labelYMm, double bandXMm, double pieceYMm) {
        double bend = pieceYMm + (labelYMm < pieceYMm ? -1.2 : 1.2);
        pen.dashed(labelXMm, labelYMm, bandXMm, bend, 0.15, 0, Ink.GREY);
        pen.dashed(bandXMm, bend, bandXMm, pieceYMm, 0.15, 0, Ink.GREY);
    }
}
