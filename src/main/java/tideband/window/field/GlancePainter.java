package tideband.window.field;

import javafx.scene.canvas.GraphicsContext;
import tideband.design.Band;
import tideband.piece.End;
import tideband.window.work.Glance;

/** Paints one immersion over the drawing: what it gives as a dashed line, what is masked, what it finishes. */
final class GlancePainter {
    private final Brush brush;

    GlancePainter(Brush brush) {
        this.brush = brush;
    }

    void paint(FieldShown shown, Glance glance) {
        FieldArea area = shown.area();
        GraphicsContext gc = brush.gc;
        brush.type(0.9, true);
        for (Glance.Stretch stretch : glance.masked()) {
            masked(shown, stretch);
        }
        if (!glance.gives().isEmpty()) {
            gc.beginPath();
            boolean first = true;
            for (Glance.Point point : glance.gives()) {
                double x = shown.viewport().px(point.atMm());
                double y = shown.scale().px(point.filmNm());
                if (first) {
                    gc.moveTo(x, y);
                } else {
                    gc.lineTo(x, y);
                }
                first = false;
            }
            brush.dashes(14, 5, 3, 5);
            brush.strokePath(3);
            brush.dashes();
        }
        double y = area.bottomPx() - 1.6 * area.emPx();
        for (int band : glance.finishes()) {
            if (band < shown.design().bands().size()) {
                finished(shown, shown.design().bands().get(band), y);
            }
        }
        String words = "immersion " + (glance.immersion() + 1) + ": end " + glance.endDown() + " down";
        String whole = glance.endDown() == End.A ? "◄ " + words : words + " ►";
        double left = glance.endDown() == End.A ? area.leftPx() + 4 : area.rightPx() - brush.plateWidth(whole) - 4;
        brush.plate(whole, left, area.topPx() + 0.9 * area.emPx(), brush.look().accent());
    }

    private void masked(FieldShown shown, Glance.Stretch stretch) {
        FieldArea area = shown.area();
        double left = Math.max(shown.viewport().px(stretch.fromMm()), area.leftPx());
        double right = Math.min(shown.viewport().px(stretch.toMm()), area.rightPx());
        if (right <= left) {
            return;
        }
        GraphicsContext gc = brush.gc;
        gc.setGlobalAlpha(0.6);
        gc.setFill(brush.look().panel());
        gc.fillRect(left, area.topPx(), right - left, area.bottomPx() - area.topPx());
        gc.setGlobalAlpha(0.8);
        gc.setStroke(brush.look().ink());
        gc.setLineWidth(1);
        brush.hatch(left, area.topPx(), right, area.bottomPx(), 12, true);
        brush.hatch(left, area.topPx(), right, area.bottomPx(), 12, false);
        gc.setGlobalAlpha(1);
        double width = brush.plateWidth("masked");
        double middleY = (area.topPx() + area.bottomPx()) / 2;
        if (width <= right - left) {
            brush.plate(
                    "masked", (left + right - width) / 2, middleY, brush.look().ink());
        } else {
            gc.save();
            gc.translate((left + right) / 2, middleY + width / 2);
            gc.rotate(-90);
            brush.plate("masked", 0, 0, brush.look().ink());
            gc.restore();
        }
    }

    private void finished(FieldShown shown, Band band, double yPx) {
        double left = Math.max(shown.viewport().px(band.fromMm()), shown.area().leftPx());
        double right = Math.min(shown.viewport().px(band.toMm()), shown.area().rightPx());
        String words = brush.plateWidth("✓ finished") <= right - left ? "✓ finished" : "✓";
        if (right > left) {
            brush.plate(
                    words,
                    (left + right - brush.plateWidth(words)) / 2,
                    yPx,
                    brush.look().ink());
        }
    }
}
