package tideband.window.pacer;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.TreeMap;
import javafx.geometry.VPos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.shape.Polygon;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.pacer.Call;
import tideband.pacer.FilmLeft;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Station;
import tideband.window.look.Look;

/**
 * The piece upright, the end that is down at the bottom, with its marks, its masks and the bath. What stands still is painted
 * once; only the water moves.
 */
final class BathView extends Region {
    private static final Color WATER_IN_DARK = Color.web("#6db3e8", 0.30);
    private static final Color WATER_IN_LIGHT = Color.web("#2a6fa8", 0.22);

    /** Bath at each side of the piece, as a share of the width. */
    private static final double VESSEL_SHARE = 0.12;

    private final PacerModel model;
    private final BenchPlan plan;
    private final Piece piece;
    private final End down;
    private final Rectangle nowFilm = new Rectangle();
    private final Canvas left = new Canvas();
    private final Rectangle aboveLine = new Rectangle();
    private final Canvas over = new Canvas();
    private final Rectangle water = new Rectangle();
    private final Rectangle line = new Rectangle();
    private final Polygon pointer = new Polygon();
    private final Text aimed = new Text();
    private double top;
    private double bottom;
    private double middle;
    private double across;
    private String nowHex = "";

    BathView(PacerModel model) {
        this.model = model;
        this.plan = model.script().plan();
        this.piece = plan.design().piece();
        this.down = plan.plan().immersions().get(model.script().immersion()).endDown();
        left.setClip(aboveLine);
        getChildren().addAll(nowFilm, left, over, water, line, pointer, aimed);
        getChildren().forEach(node -> node.setManaged(false));
        setMouseTransparent(true);
        model.look().darkProperty().addListener((value, before, after) -> requestLayout());
    }

    @Override
    protected void layoutChildren() {
        double width = Math.rint(getWidth());
        double height = Math.rint(getHeight());
        if (width < 10 || height < 10) {
            return;
        }
        double letterPx = letterPx();
        top = letterPx * 1.8;
        bottom = height - letterPx * 2.2;
        middle = width * 0.56;
        double mostMm =
                piece.stations().stream().mapToDouble(Station::sizeMm).max().orElse(1);
        double acrossPx = Math.max(width * 0.16, Math.min(width * 0.34, mostMm * along()));
        across = acrossPx / mostMm;
        left.setWidth(width);
        left.setHeight(height);
        over.setWidth(width);
        over.setHeight(height);
        paintFilmLeft();
        paintOver(width, height);
        boolean dark = model.look().darkProperty().get();
        Look look = Look.of(model.look());
        double vessel = acrossPx / 2 + width * VESSEL_SHARE;
        water.setX(middle - vessel);
        water.setWidth(2 * vessel);
        water.setFill(dark ? WATER_IN_DARK : WATER_IN_LIGHT);
        line.setX(middle - vessel);
        line.setWidth(2 * vessel);
        line.setHeight(Math.max(3, height / 220));
        line.setFill(look.ink());
        nowFilm.setX(middle - acrossPx / 2);
        nowFilm.setWidth(acrossPx);
        double wing = letterPx * 0.6;
        pointer.getPoints().setAll(0.0, 0.0, wing * 1.4, -wing, wing * 1.4, wing);
        pointer.setFill(look.accent());
        pointer.setTranslateX(middle + vessel + 2);
        // A style, since the style of the root would win over a font.
        aimed.setStyle(String.format(Locale.ROOT, "-fx-font-weight: bold; -fx-font-size: %.1fpx;", letterPx * 1.3));
        aimed.setFill(look.accent());
        aimed.setTextOrigin(VPos.CENTER);
        aimed.setX(middle + vessel + wing * 1.4 + 6);
        aboveLine.setWidth(width);
        model.board().place().ifPresent(this::show);
    }

    private double letterPx() {
        return Math.max(12, Math.min(getHeight() / 26, getWidth() / 11));
    }

    private double strokePx() {
        return Math.max(2, getHeight() / 350);
    }

    private double along() {
        return (bottom - top) / piece.lengthMm();
    }

    private double y(double fromDownMm) {
        return bottom - fromDownMm * along();
    }

    private double atMm(double y) {
        double fromDownMm = Math.max(0, Math.min(piece.lengthMm(), (bottom - y) / along()));
        return piece.fromEnd(down, fromDownMm);
    }

    private double half(double y) {
        return piece.sizeMm(atMm(y)) / 2 * across;
    }

    /** Moves the water. */
    void show(Board.Place place) {
        double lineY = y(place.lineMm());
        double levelY = Math.min(getHeight(), y(place.depthMm()));
        water.setY(levelY);
        water.setHeight(Math.max(0, getHeight() - levelY));
        line.setY(lineY - line.getHeight() / 2);
        aboveLine.setHeight(lineY);
        nowFilm.setY(lineY);
        nowFilm.setHeight(Math.max(0, bottom - lineY));
        if (!nowHex.equals(place.filmHex())) {
            nowHex = place.filmHex();
            nowFilm.setFill(Color.web(nowHex));
        }
        List<Call> calls = model.script().calls();
        Call aim = calls.get(Math.min(calls.size() - 1, place.markIndex() + 1));
        double aimY = y(aim.mark().row().lineMm());
        pointer.setTranslateY(aimY);
        aimed.setText(Integer.toString(aim.mark().number()));
        aimed.setY(aimY);
    }

    /** The films as the line leaves them, row by row. */
    private void paintFilmLeft() {
        GraphicsContext pen = left.getGraphicsContext2D();
        pen.clearRect(0, 0, left.getWidth(), left.getHeight());
        FilmLeft film = new FilmLeft(plan, model.script().immersion());
        for (double y = Math.floor(top); y < bottom; y++) {
            double filmNm = film.filmNm(atMm(y + 0.5));
            pen.setFill(Color.web(model.colours().ofFilm(filmNm).srgbHex()));
            pen.fillRect(middle - half(y) - 1, y, 2 * half(y) + 2, 1);
        }
    }

    /** All that stands still before them: earlier colours, bare metal, masks, outline, marks, vessel. */
    private void paintOver(double width, double height) {
        Look look = Look.of(model.look());
        GraphicsContext pen = over.getGraphicsContext2D();
        pen.clearRect(0, 0, width, height);
        int immersion = model.script().immersion();
        FilmLeft film = new FilmLeft(plan, immersion);
        double startMm = model.script().calls().get(0).mark().row().lineMm();
        for (double y = Math.floor(top); y < bottom; y++) {
            double at = atMm(y + 0.5);
            double beforeNm = FilmLeft.before(plan, immersion, at);
            boolean never = (bottom - y) / along() >= startMm;
            if (film.masked(at) || never || (beforeNm > 0 && beforeNm >= film.filmNm(at))) {
                pen.setFill(Color.web(model.colours()
                        .ofFilm(Math.max(beforeNm, plan.design().bath().nativeNm()))
                        .srgbHex()));
                pen.fillRect(middle - half(y) - 1, y, 2 * half(y) + 2, 1);
            }
        }
        for (int band : plan.plan().immersions().get(immersion).masked()) {
            hatch(pen, look, plan.bands().get(band));
        }
        outside(pen, look, width, height);
        ends(pen, look);
        marks(pen, look);
    }

    private void hatch(GraphicsContext pen, Look look, BenchBand band) {
        double a = y(piece.fromEnd(down, band.fromMm()));
        double b = y(piece.fromEnd(down, band.toMm()));
        double from = Math.min(a, b);
        double to = Math.max(a, b);
        double reach = across * piece.largestSizeMm(band.fromMm(), band.toMm()) / 2;
        pen.save();
        pen.beginPath();
        pen.rect(middle - reach, from, 2 * reach, to - from);
        pen.clip();
        pen.setFill(look.panel());
        pen.fillRect(middle - reach, from, 2 * reach, to - from);
        pen.setStroke(look.ink());
        pen.setLineWidth(strokePx());
        double step = letterPx() * 0.5;
        for (double x = -reach - (to - from); x < reach; x += step) {
            pen.strokeLine(middle + x, to, middle + x + (to - from), from);
        }
        pen.restore();
    }

    /** Paper all round the piece, so that what lies under it shows only within; then the outline and the vessel. */
    private void outside(GraphicsContext pen, Look look, double width, double height) {
        List<Double> ys = new ArrayList<>();
        for (double y = top; y < bottom; y += 2) {
            ys.add(y);
        }
        ys.add(bottom);
        int count = ys.size();
        double[] rightX = new double[count + 2];
        double[] leftX = new double[count + 2];
        double[] y = new double[count + 2];
        for (int i = 0; i < count; i++) {
            y[i] = ys.get(i);
            rightX[i] = middle + half(y[i]);
            leftX[i] = middle - half(y[i]);
        }
        y[count] = bottom;
        y[count + 1] = top;
        rightX[count] = width;
        rightX[count + 1] = width;
        pen.setFill(look.paper());
        pen.fillPolygon(leftX, y, count + 2);
        pen.fillPolygon(rightX, y, count + 2);
        pen.fillRect(0, 0, width, top);
        pen.fillRect(0, bottom, width, height - bottom);
        pen.setStroke(look.ink());
        pen.setLineWidth(strokePx());
        pen.strokePolyline(leftX, y, count);
        pen.strokePolyline(rightX, y, count);
        pen.strokeLine(leftX[0], top, rightX[0], top);
        pen.strokeLine(leftX[count - 1], bottom, rightX[count - 1], bottom);
        double vessel = across * piece.largestSizeMm(0, piece.lengthMm()) / 2 + width * VESSEL_SHARE;
        pen.setStroke(look.faint());
        pen.strokeLine(middle - vessel, top, middle - vessel, height - 1);
        pen.strokeLine(middle + vessel, top, middle + vessel, height - 1);
        pen.strokeLine(middle - vessel, height - 1, middle + vessel, height - 1);
    }

    private void ends(GraphicsContext pen, Look look) {
        double px = letterPx();
        pen.setFill(look.ink());
        pen.setFont(Font.font(null, FontWeight.BOLD, px * 1.2));
        pen.setTextAlign(TextAlignment.CENTER);
        pen.setTextBaseline(VPos.CENTER);
        pen.fillText(down.other().name(), middle, top - px * 0.9);
        pen.fillText(down.name() + " down", middle, bottom + px * 1.1);
    }

    /** Marks at their lines, numbered as on the sheet, as densely as the numbers fit. */
    private void marks(GraphicsContext pen, Look look) {
        TreeMap<Double, List<Integer>> byLine = new TreeMap<>();
        for (Call call : model.script().calls()) {
            double lineMm = Math.rint(call.mark().row().lineMm() * 20) / 20;
            byLine.computeIfAbsent(lineMm, place -> new ArrayList<>())
                    .add(call.mark().number());
        }
        double px = letterPx();
        double tick = across * piece.largestSizeMm(0, piece.lengthMm()) / 2;
        double wall = tick + over.getWidth() * VESSEL_SHARE;
        pen.setFont(Font.font(px));
        pen.setTextAlign(TextAlignment.RIGHT);
        pen.setTextBaseline(VPos.CENTER);
        pen.setStroke(look.ink());
        pen.setLineWidth(strokePx());
        pen.setFill(look.ink());
        double lowestFree = Double.POSITIVE_INFINITY;
        for (var entry : byLine.entrySet()) {
            double lineY = y(entry.getKey());
            pen.strokeLine(middle - wall - px * 0.4, lineY, middle - wall, lineY);
            pen.strokeLine(middle - tick - px * 0.5, lineY, middle - tick, lineY);
            if (lineY <= lowestFree - px * 1.1) {
                List<Integer> numbers = entry.getValue();
                String text = numbers.size() == 1
                        ? numbers.get(0).toString()
                        : numbers.get(0) + "\u2013" + numbers.get(numbers.size() - 1);
                pen.fillText(text, middle - wall - px * 0.6, lineY);
                lowestFree = lineY;
            }
        }
    }
}
