package tideband.window.field;

import java.util.List;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Edge;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;

/** Paints the drawing: a line at every band's film, its edges, and what is selected or at fault. */
final class LinePainter {
    private static final double LINE_PX = 2.6;
    private static final double SELECTED_PX = 5;

    private final Brush brush;
    private FieldShown shown;
    private FieldArea area;
    private Viewport viewport;
    private NmScale scale;

    LinePainter(Canvas canvas) {
        brush = new Brush(canvas);
    }

    void paint(FieldShown next, Look look) {
        shown = next;
        area = next.area();
        viewport = next.viewport();
        scale = next.scale();
        brush.begin(look);
        List<Band> bands = shown.design().bands();
        for (int i = 0; i < bands.size(); i++) {
            if (i < bands.size() - 1) {
                edge(bands.get(i), i);
            }
            if (shown.films().get(i).bare()) {
                bare(bands.get(i));
            }
        }
        line(bands);
        for (int band : shown.selection().bands()) {
            selected(bands.get(band), shown.films().get(band));
        }
        for (int band : shown.faulty()) {
            faulty(bands.get(band), shown.films().get(band));
        }
        brush.wipeAround(area.leftPx(), area.topPx(), area.rightPx(), area.bottomPx() + 1);
        rail(bands);
    }

    private boolean inView(double xPx) {
        return xPx >= area.leftPx() - 1 && xPx <= area.rightPx() + 1;
    }

    /** Edges can be taken hold of here; a bracket stands over what is selected. */
    private void rail(List<Band> bands) {
        GraphicsContext gc = brush.gc;
        gc.setStroke(brush.look().accent());
        double y = area.topPx() - 0.3 * area.emPx();
        for (int band : shown.selection().bands()) {
            double left = Math.max(viewport.px(bands.get(band).fromMm()) + 2, area.leftPx());
            double right = Math.min(viewport.px(bands.get(band).toMm()) - 2, area.rightPx());
            if (right > left) {
                gc.setLineWidth(3);
                gc.strokeLine(left, y, right, y);
                gc.setLineWidth(2);
                gc.strokeLine(left, y - 3, left, y + 4);
                gc.strokeLine(right, y - 3, right, y + 4);
            }
        }
        for (int i = 0; i < bands.size() - 1; i++) {
            double x = viewport.px(bands.get(i).toMm());
            if (inView(x)) {
                EdgeTag.paint(brush, bands.get(i).edge(), x, area.railPx(), area.topPx());
            }
        }
    }

    private void edge(Band band, int index) {
        double x = viewport.px(band.toMm());
        if (!inView(x)) {
            return;
        }
        DrawnFilm before = shown.films().get(index);
        DrawnFilm after = shown.films().get(index + 1);
        double high = scale.px(Math.max(before.bSideNm(), after.aSideNm()));
        double low = scale.px(Math.min(before.bSideNm(), after.aSideNm()));
        if (band.edge() == Edge.CRISP) {
            brush.line(x, area.topPx(), x, area.bottomPx(), 1);
            brush.line(x, high, x, low, LINE_PX);
        } else {
            brush.dashes(2, 6);
            brush.line(x, area.topPx(), x, area.bottomPx(), 1);
            brush.dashes();
            wave(x, high, low);
        }
    }

    /** The step at a soft edge: a waterline, seen from the side. */
    private void wave(double x, double high, double low) {
        if (low - high < 2) {
            return;
        }
        GraphicsContext gc = brush.gc;
        double halfPx = 0.35 * area.emPx();
        gc.beginPath();
        gc.moveTo(x, high);
        double side = 0.28 * area.emPx();
        double y = high;
        while (y < low) {
            double next = Math.min(y + halfPx, low);
            gc.quadraticCurveTo(x + side, (y + next) / 2, x, next);
            side = -side;
            y = next;
        }
        brush.strokePath(1.8);
    }

    private void bare(Band band) {
        double left = Math.max(viewport.px(band.fromMm()), area.leftPx());
        double right = Math.min(viewport.px(band.toMm()), area.rightPx());
        double y = scale.px(0);
        if (right > left && y >= area.topPx()) {
            brush.hatchBoth(left, y - 0.9 * area.emPx(), right, y, 6, 0.9);
        }
    }

    private void line(List<Band> bands) {
        GraphicsContext gc = brush.gc;
        gc.beginPath();
        for (int i = 0; i < bands.size(); i++) {
            trace(bands.get(i), shown.films().get(i));
        }
        brush.strokePath(LINE_PX);
    }

    private void trace(Band band, DrawnFilm film) {
        double lift = film.bare() ? LINE_PX / 2 : 0;
        brush.gc.moveTo(viewport.px(band.fromMm()), scale.px(film.aSideNm()) - lift);
        brush.gc.lineTo(viewport.px(band.toMm()), scale.px(film.bSideNm()) - lift);
    }

    private void selected(Band band, DrawnFilm film) {
        brush.gc.beginPath();
        trace(band, film);
        brush.strokePath(SELECTED_PX);
    }

    private void faulty(Band band, DrawnFilm film) {
        double from = Math.max(viewport.px(band.fromMm()), area.leftPx());
        double to = Math.min(viewport.px(band.toMm()), area.rightPx());
        double tooth = 0.45 * area.emPx();
        GraphicsContext gc = brush.gc;
        gc.beginPath();
        boolean up = false;
        for (double x = from; x <= to; x += tooth) {
            double share = (viewport.mm(x) - band.fromMm()) / (band.toMm() - band.fromMm());
            double y = scale.px(film.aSideNm() + share * (film.bSideNm() - film.aSideNm()));
            double at =
                    Math.min(Math.max(y, area.topPx() + tooth), area.bottomPx() - tooth) + (up ? -tooth : tooth) / 1.3;
            if (x == from) {
                gc.moveTo(x, at);
            } else {
                gc.lineTo(x, at);
            }
            up = !up;
        }
        brush.strokePath(1.6);
    }
}
