package tideband.window.field;

import java.util.LinkedHashMap;
import java.util.Map;
import javafx.geometry.VPos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.StrokeLineCap;
import javafx.scene.shape.StrokeLineJoin;
import javafx.scene.text.Font;
import javafx.scene.text.Text;
import javafx.scene.text.TextAlignment;
import tideband.window.look.Look;

/** Lines, hatches and words that can be read over any colour: a dark core in a light halo, words on a ground of their own. */
final class Brush {
    static final Color CORE = Color.web("#111315");
    static final Color HALO = Color.web("#ffffff", 0.86);
    private static final double GROUND_OPACITY = 0.9;
    private static final int MOST_MEASURED = 400;

    final GraphicsContext gc;
    private final Canvas canvas;
    private final Text ruler = new Text();
    private final Map<String, Double> widths = new LinkedHashMap<>();
    private Look look;
    private Color ground;
    private Font plain;
    private Font bold;
    private boolean isBold;
    private double ems;

    Brush(Canvas canvas) {
        this.canvas = canvas;
        this.gc = canvas.getGraphicsContext2D();
        gc.setLineCap(StrokeLineCap.BUTT);
        gc.setLineJoin(StrokeLineJoin.ROUND);
    }

    /** Wipes the canvas and takes up the inks. */
    void begin(Look inks) {
        if (!inks.equals(look)) {
            widths.clear();
            look = inks;
            ground = inks.panel().deriveColor(0, 1, 1, GROUND_OPACITY);
            ems = 0;
        }
        gc.clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
    }

    /** Wipes what was painted beyond a rectangle. Far cheaper than to clip: a clip costs a canvas in memory each time. */
    void wipeAround(double left, double top, double right, double bottom) {
        gc.clearRect(0, 0, left, canvas.getHeight());
        gc.clearRect(right, 0, canvas.getWidth() - right, canvas.getHeight());
        gc.clearRect(left, 0, right - left, top);
        gc.clearRect(left, bottom, right - left, canvas.getHeight() - bottom);
    }

    Look look() {
        return look;
    }

    /** Type for what is written next. */
    void type(double nextEms, boolean nextBold) {
        if (nextEms != ems) {
            ems = nextEms;
            plain = look.font(ems);
            bold = look.bold(ems);
        }
        isBold = nextBold;
        gc.setFont(isBold ? bold : plain);
    }

    double width(String text) {
        String key = (isBold ? "b" : "p") + ems + text;
        Double known = widths.get(key);
        if (known != null) {
            return known;
        }
        if (widths.size() > MOST_MEASURED) {
            widths.clear();
        }
        ruler.setFont(isBold ? bold : plain);
        ruler.setText(text);
        double width = ruler.getLayoutBounds().getWidth();
        widths.put(key, width);
        return width;
    }

    double heightPx() {
        return ems * look.emPx() * 1.4;
    }

    void write(String text, double xPx, double middlePx, TextAlignment align, Color ink) {
        gc.setTextAlign(align);
        gc.setTextBaseline(VPos.CENTER);
        gc.setFill(ink);
        gc.fillText(text, xPx, middlePx);
    }

    /** Words on a ground of their own. */
    void plate(String text, double leftPx, double middlePx, Color ink) {
        double padPx = 0.35 * look.emPx();
        double widthPx = width(text) + 2 * padPx;
        double heightPx = heightPx();
        gc.setFill(ground);
        gc.fillRoundRect(leftPx, middlePx - heightPx / 2, widthPx, heightPx, 6, 6);
        write(text, leftPx + padPx, middlePx, TextAlignment.LEFT, ink);
    }

    /** The first of some words that fits; the last if none does. */
    String fitting(double roomPx, String... words) {
        for (String each : words) {
            if (plateWidth(each) <= roomPx) {
                return each;
            }
        }
        return words[words.length - 1];
    }

    double plateWidth(String text) {
        return width(text) + 0.7 * look.emPx();
    }

    void line(double x1, double y1, double x2, double y2, double corePx) {
        gc.setStroke(HALO);
        gc.setLineWidth(corePx + 2);
        gc.strokeLine(x1, y1, x2, y2);
        gc.setStroke(CORE);
        gc.setLineWidth(corePx);
        gc.strokeLine(x1, y1, x2, y2);
    }

    /** Strokes the path that was begun, in a halo. */
    void strokePath(double corePx) {
        gc.setStroke(HALO);
        gc.setLineWidth(corePx + 3);
        gc.stroke();
        gc.setStroke(CORE);
        gc.setLineWidth(corePx);
        gc.stroke();
    }

    void dashes(double... px) {
        gc.setLineDashes(px);
    }

    /** Slanting lines in a rectangle; rising to the right, or falling. */
    void hatch(double left, double top, double right, double bottom, double gapPx, boolean rising) {
        double height = bottom - top;
        if (right - left < 1 || height < 1) {
            return;
        }
        gc.beginPath();
        for (double offset = -height; offset < right - left; offset += gapPx) {
            double from = Math.max(0, -offset);
            double to = Math.min(height, right - left - offset);
            if (to > from) {
                double x1 = left + offset + from;
                double x2 = left + offset + to;
                gc.moveTo(x1, rising ? bottom - from : top + from);
                gc.lineTo(x2, rising ? bottom - to : top + to);
            }
        }
        gc.stroke();
    }

    /** Slanting dark lines with light ones beside them. */
    void hatchBoth(double left, double top, double right, double bottom, double gapPx, double opacity) {
        gc.setGlobalAlpha(opacity);
        gc.setLineWidth(1.2);
        gc.setStroke(HALO);
        hatch(left + 1.5, top, right, bottom, gapPx, true);
        gc.setStroke(CORE);
        hatch(left, top, right, bottom, gapPx, true);
        gc.setGlobalAlpha(1);
    }
}
