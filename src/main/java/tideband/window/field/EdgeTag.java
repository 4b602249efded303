package tideband.window.field;

import javafx.scene.canvas.GraphicsContext;
import tideband.design.Edge;

/** The mark of an edge on the rail: a blade for a crisp one, a wave for a soft one. */
final class EdgeTag {
    private EdgeTag() {}

    static void paint(Brush brush, Edge edge, double xPx, double railPx, double topPx) {
        GraphicsContext gc = brush.gc;
        double half = 0.38 * brush.look().emPx();
        gc.setStroke(brush.look().ink());
        gc.setFill(brush.look().ink());
        if (edge == Edge.CRISP) {
            gc.beginPath();
            gc.moveTo(xPx - half, railPx - half * 1.3);
            gc.lineTo(xPx + half, railPx - half * 1.3);
            gc.lineTo(xPx + half, railPx);
            gc.lineTo(xPx, topPx);
            gc.lineTo(xPx - half, railPx);
            gc.closePath();
            gc.fill();
            return;
        }
        gc.setLineWidth(1);
        gc.strokeLine(xPx, railPx + half, xPx, topPx);
        gc.setLineWidth(2);
        for (int row = 0; row < 2; row++) {
            double y = railPx - half * 0.9 + row * half * 1.1;
            gc.beginPath();
            gc.moveTo(xPx - 2 * half, y);
            gc.quadraticCurveTo(xPx - half, y - half, xPx, y);
            gc.quadraticCurveTo(xPx + half, y + half, xPx + 2 * half, y);
            gc.stroke();
        }
    }
}
