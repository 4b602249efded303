package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import java.util.stream.IntStream;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.piece.Piece;
import tideband.piece.Station;
import tideband.plan.Immersion;
import tideband.pull.Row;
import tideband.sheet.Mark.Anchor;

/** The piece in the bath at the start of an immersion: which end is down, masks, water, and where the line will go. */
final class BathPicture {
    /** Room the picture takes. */
    static final double WIDTH_MM = 84;

    static final double HEIGHT_MM = 142;

    private static final double PIECE_MM = 100;
    private static final String WATER = "#dfe9ee";
    private static final double SMALL_MM = Flow.mm(11);
    private static final double MOST_LINES = 8;

    private final BenchPlan plan;
    private final Colours colours;
    private final int index;
    private final Immersion immersion;
    private final Placing placing;
    private final double leftMm;
    private final double middleMm;
    private final double downMm;

    BathPicture(BenchPlan plan, Colours colours, int index, double leftMm, double topMm) {
        this.plan = plan;
        this.colours = colours;
        this.index = index;
        this.immersion = plan.plan().immersions().get(index);
        this.leftMm = leftMm;
        this.middleMm = leftMm + 35;
        this.downMm = topMm + 17 + PIECE_MM;
        Piece piece = plan.design().piece();
        double along = PIECE_MM / piece.lengthMm();
        double size =
                piece.stations().stream().mapToDouble(Station::sizeMm).max().orElse(0);
        double wide = Math.min(20, Math.max(9, size * along));
        this.placing = new Placing(
                new Point(middleMm, downMm),
                along,
                wide / size,
                Placing.Lie.hanging(immersion.endDown()),
                piece.lengthMm());
    }

    void draw(Pen pen) {
        double waterMm = downMm - depthMm() * placing.along();
        vessel(pen, waterMm);
        piece(pen);
        pen.words(immersion.endDown().name(), middleMm, downMm + 7, Flow.mm(18), true, Anchor.MIDDLE);
        pen.words(
                immersion.endDown().other().name(),
                middleMm,
                downMm - PIECE_MM - 9.5,
                Flow.mm(18),
                true,
                Anchor.MIDDLE);
        states(pen);
        depth(pen, waterMm);
        lines(pen);
        pen.words("Start of the pull; not to scale", middleMm, downMm + 22, SMALL_MM, false, Anchor.MIDDLE);
    }

    private double depthMm() {
        return plan.pulls().get(index).rows().get(0).depthMm();
    }

    private void vessel(Pen pen, double waterMm) {
        double left = leftMm + 16;
        double right = leftMm + 54;
        double bottom = downMm + 13;
        pen.box(left, waterMm, right - left, bottom - waterMm, Ink.fill(WATER));
        pen.line(left, waterMm, right, waterMm, 0.6);
        pen.line(left, waterMm - 6, left, bottom, 0.8);
        pen.line(right, waterMm - 6, right, bottom, 0.8);
        pen.line(left, bottom, right, bottom, 0.8);
    }

    private void piece(Pen pen) {
        PiecePicture picture = new PiecePicture(plan.design().piece(), placing);
        double top = downMm - PIECE_MM;
        pen.box(middleMm - 1.5, top - 8, 3, 9, new Ink(Ink.PALE, Ink.BLACK, 0.3));
        List<PiecePicture.Slice> slices = new ArrayList<>();
        for (int i = 0; i < plan.bands().size(); i++) {
            BenchBand band = plan.bands().get(i);
            State state = state(i);
            List<String> hexes = state == State.NOW || state == State.DONE
                    ? Wording.wantedHexes(band, colours, 60)
                    : List.of(Ink.WHITE);
            double each = (band.toMm() - band.fromMm()) / hexes.size();
            for (int j = 0; j < hexes.size(); j++) {
                double from = band.fromMm() + j * each;
                slices.add(
                        new PiecePicture.Slice(from, j + 1 == hexes.size() ? band.toMm() : from + each, hexes.get(j)));
            }
        }
        picture.slices(pen, slices);
        picture.frame(pen);
        for (BenchBand band : plan.bands().subList(0, plan.bands().size() - 1)) {
            List<Point> edge = picture.outline(band.toMm(), band.toMm(), 0);
            Point a = edge.get(0);
            Point b = edge.get(edge.size() - 1);
            pen.dashed(a.xMm(), a.yMm(), b.xMm(), b.yMm(), 0.25, band.crispAtB() ? 0 : 0.8, Ink.BLACK);
        }
        for (int band : immersion.masked()) {
            picture.mask(
                    pen, plan.bands().get(band).fromMm(), plan.bands().get(band).toMm());
        }
    }

    /** What becomes of a band in this immersion. */
    private enum State {
        MASKED("masked"),
        NOW("now"),
        DONE("done"),
        BARE("bare"),
        LATER("later");

        private final String word;

        State(String word) {
            this.word = word;
        }
    }

    private State state(int band) {
        if (immersion.masked().contains(band)) {
            return State.MASKED;
        }
        if (immersion.finishes().contains(band)) {
            return State.NOW;
        }
        if (plan.bands().get(band).bare()) {
            return State.BARE;
        }
        boolean done = plan.plan().immersions().subList(0, index).stream()
                .anyMatch(i -> i.finishes().contains(band));
        return done ? State.DONE : State.LATER;
    }

    /** At the right: neighbours in one state, by number. */
    private void states(Pen pen) {
        List<String> words = new ArrayList<>();
        List<Double> wishes = new ArrayList<>();
        int first = 0;
        int count = plan.bands().size();
        for (int i = 1; i <= count; i++) {
            if (i < count && state(i) == state(first)) {
                continue;
            }
            words.add((first + 1 == i ? "" + i : first + 1 + "\u2013" + i) + " " + state(first).word);
            double middle =
                    (plan.bands().get(first).fromMm() + plan.bands().get(i - 1).toMm()) / 2;
            wishes.add(placing.at(middle, 0).yMm());
            first = i;
        }
        column(pen, words, wishes, leftMm + 57, Anchor.START, middleMm + 11, leftMm + 56);
    }

    /** At the left: where the colour line stops, in mm from the end that is down. */
    private void lines(Pen pen) {
        TreeSet<Double> stops = new TreeSet<>();
        for (Row row : plan.pulls().get(index).rows()) {
            if (row.act() == Row.Act.HOLD) {
                stops.add(Math.rint(row.lineMm() * 10) / 10);
            }
        }
        if (stops.size() > MOST_LINES) {
            // Too many to read: the deepest and the shallowest say where the pull goes.
            stops.retainAll(List.of(stops.first(), stops.last()));
        }
        List<Double> wishes = new ArrayList<>();
        List<String> words = new ArrayList<>();
        for (double stop : stops) {
            double y = downMm - stop * placing.along();
            wishes.add(y);
            words.add(Figures.fixed(stop, 1));
            pen.dashed(middleMm - 12, y, middleMm + 12, y, 0.5, 1.2, Ink.BLACK);
        }
        column(pen, words, wishes, leftMm + 13.5, Anchor.END, middleMm - 12, leftMm + 14.5);
        pen.words("line,", leftMm + 13.5, downMm + 8, SMALL_MM, false, Anchor.END);
        pen.words("mm", leftMm + 13.5, downMm + 12.6, SMALL_MM, false, Anchor.END);
    }

    private void column(
            Pen pen, List<String> words, List<Double> wishesMm, double xMm, Anchor anchor, double fromMm, double toMm) {
        double top = downMm - PIECE_MM;
        double pitch = SMALL_MM * 1.2;
        int most = (int) Math.floor((PIECE_MM + 4) / (pitch + 0.4));
        int step = (words.size() + most - 1) / Math.max(1, most);
        List<Integer> order = IntStream.range(0, words.size())
                .filter(i -> i % Math.max(1, step) == 0)
                .boxed()
                .sorted((a, b) -> Double.compare(wishesMm.get(a), wishesMm.get(b)))
                .toList();
        List<Double> middles = Labels.spread(
                order.stream().map(wishesMm::get).toList(),
                order.stream().map(i -> pitch).toList(),
                0.4,
                top - 2,
                downMm + 2);
        for (int i = 0; i < order.size(); i++) {
            double y = middles.get(i);
            pen.words(
                    Typeface.fit(words.get(order.get(i)), SMALL_MM, true, 27),
                    xMm,
                    y + SMALL_MM * 0.36,
                    SMALL_MM,
                    true,
                    anchor);
            pen.dashed(fromMm, wishesMm.get(order.get(i)), toMm, y, 0.15, 0, Ink.GREY);
        }
    }

    private void depth(Pen pen, double waterMm) {
        double x = leftMm + 50;
        pen.line(x, waterMm, x, downMm, 0.4);
        pen.line(x - 1.5, downMm, x + 1.5, downMm, 0.4);
        pen.line(x, waterMm, x - 1.2, waterMm + 2.4, 0.4);
        pen.line(x, waterMm, x + 1.2, waterMm + 2.4, 0.4);
        pen.line(x, downMm, x - 1.2, downMm - 2.4, 0.4);
        pen.line(x, downMm, x + 1.2, downMm - 2.4, 0.4);
        pen.words(
                "depth " + Figures.fixed(depthMm(), 1) + " mm, end " + immersion.endDown() + " down",
                middleMm,
                downMm + 17.6,
                SMALL_MM,
                true,
                Anchor.MIDDLE);
    }
}
