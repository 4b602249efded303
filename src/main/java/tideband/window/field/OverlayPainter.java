package tideband.window.field;

import javafx.geometry.VPos;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.TextAlignment;
import tideband.design.Band;
import tideband.edit.Part;
import tideband.window.look.Look;

/** Paints names, and what comes and goes: handles, the focus, the hand's crosshair, marks of near films, an immersion pointed at. */
final class OverlayPainter {
    /** Where a band is narrower than this many ems, its handles are shown only when a hand is near or it is selected. */
    private static final double ROOMY_EMS = 5;

    private final Brush brush;
    private final GlancePainter glances;
    private final GroundWords groundWords;
    private final NamePlates names;

    OverlayPainter(Canvas canvas) {
        brush = new Brush(canvas);
        glances = new GlancePainter(brush);
        groundWords = new GroundWords(brush);
        names = new NamePlates(brush);
    }

    void paint(FieldShown shown, FieldHand hand, boolean focused, Look look) {
        brush.begin(look);
        FieldArea area = shown.area();
        GraphicsContext gc = brush.gc;
        shown.glance().ifPresent(glance -> glances.paint(shown, glance));
        groundWords.write(shown);
        names.write(shown, groundWords.outOfReachPlace(shown));
        brush.wipeAround(area.leftPx(), area.topPx(), area.rightPx(), area.bottomPx());
        hand.crosshair().ifPresent(at -> crosshair(area, at));
        Part under = hand.hovered().orElse(null);
        Part focus = shown.selection().focus().orElse(null);
        for (Handle handle : shown.handles()) {
            if (handle.xPx() < area.leftPx() - 1 || handle.xPx() > area.rightPx() + 1) {
                continue;
            }
            boolean lit = handle.part().equals(under);
            boolean has = handle.part().equals(focus);
            if (lit || has || shows(shown, handle, under)) {
                handle(handle, lit, look);
            }
            if (has) {
                ring(handle, focused, look);
            }
        }
        for (MatchMark mark : shown.marks()) {
            mark(area, mark);
        }
        if (focused) {
            gc.setStroke(look.accent());
            gc.setLineWidth(2);
            gc.strokeRect(1, 1, area.widthPx() - 2, area.heightPx() - 2);
        }
    }

    private static boolean shows(FieldShown shown, Handle handle, Part under) {
        int band = handle.part().band();
        if (handle.part() instanceof Part.EdgeAt) {
            return false;
        }
        if (shown.selection().bands().contains(band) || (under != null && under.band() == band)) {
            return true;
        }
        Band drawn = shown.design().bands().get(band);
        double widthPx = (drawn.toMm() - drawn.fromMm()) * shown.viewport().pxPerMm();
        return widthPx >= ROOMY_EMS * shown.area().emPx();
    }

    private void handle(Handle handle, boolean lit, Look look) {
        GraphicsContext gc = brush.gc;
        double half = (lit ? 0.5 : 0.34) * look.emPx();
        double x = handle.xPx();
        double y = handle.yPx();
        gc.setStroke(Brush.CORE);
        gc.setFill(Color.WHITE);
        gc.setLineWidth(1.5);
        if (handle.part() instanceof Part.FadeEnd) {
            double[] xs = {x - half, x, x + half, x};
            double[] ys = {y, y - half, y, y + half};
            gc.fillPolygon(xs, ys, 4);
            gc.strokePolygon(xs, ys, 4);
        } else if (handle.part() instanceof Part.Level) {
            gc.fillRoundRect(x - 1.7 * half, y - 0.8 * half, 3.4 * half, 1.6 * half, half, half);
            gc.strokeRoundRect(x - 1.7 * half, y - 0.8 * half, 3.4 * half, 1.6 * half, half, half);
        } else {
            gc.setStroke(look.accent());
            gc.setLineWidth(2);
            gc.strokeLine(x - 1.6 * half, y, x - 0.9 * half, y);
            gc.strokeLine(x + 0.9 * half, y, x + 1.6 * half, y);
        }
    }

    /** The focus: two rings, dark and light, so that they can be seen on any colour; thick while the field has the keyboard. */
    private void ring(Handle handle, boolean focused, Look look) {
        GraphicsContext gc = brush.gc;
        double radius = 0.95 * look.emPx();
        gc.setStroke(Color.WHITE);
        gc.setLineWidth(focused ? 5 : 3);
        gc.strokeOval(handle.xPx() - radius, handle.yPx() - radius, 2 * radius, 2 * radius);
        gc.setStroke(Brush.CORE);
        gc.setLineWidth(focused ? 2.5 : 1);
        gc.strokeOval(handle.xPx() - radius, handle.yPx() - radius, 2 * radius, 2 * radius);
    }

    private void crosshair(FieldArea area, FieldHand.Crosshair at) {
        double x = Math.floor(at.xPx()) + 0.5;
        double y = Math.floor(at.yPx()) + 0.5;
        brush.dashes(1, 3);
        brush.line(x, area.topPx(), x, area.bottomPx(), 1);
        brush.line(area.leftPx(), y, area.rightPx(), y, 1);
        brush.dashes();
    }

    private void mark(FieldArea area, MatchMark mark) {
        brush.dashes(10, 3, 2, 3);
        brush.line(area.leftPx(), mark.yPx(), area.rightPx(), mark.yPx(), 1.4);
        brush.dashes();
        double x = area.rightPx() - 0.4 * area.emPx();
        double top = Math.max(mark.windowTopPx(), area.topPx());
        double bottom = Math.min(mark.windowBottomPx(), area.bottomPx());
        brush.line(x, top, x, bottom, 2);
        brush.line(x - 4, top, x + 4, top, 2);
        brush.line(x - 4, bottom, x + 4, bottom, 2);
        GraphicsContext gc = brush.gc;
        gc.setFill(brush.look().panel());
        gc.fillRoundRect(mark.labelLeftPx(), mark.labelTopPx(), mark.labelWidthPx(), mark.labelHeightPx() - 1, 6, 6);
        gc.setStroke(brush.look().ink());
        gc.setLineWidth(1);
        gc.strokeRoundRect(mark.labelLeftPx(), mark.labelTopPx(), mark.labelWidthPx(), mark.labelHeightPx() - 1, 6, 6);
        brush.type(0.9, false);
        gc.setTextAlign(TextAlignment.LEFT);
        gc.setTextBaseline(VPos.CENTER);
        gc.setFill(brush.look().ink());
        gc.fillText(
                mark.text(),
                mark.labelLeftPx() + 0.4 * area.emPx(),
                mark.labelTopPx() + mark.labelHeightPx() / 2,
                mark.labelWidthPx() - 0.8 * area.emPx());
    }
}
