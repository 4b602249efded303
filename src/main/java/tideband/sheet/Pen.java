package tideband.sheet;

import java.util.ArrayList;
import java.util.List;

/** Collects marks in the order they are drawn. */
final class Pen {
    private final List<Mark> marks = new ArrayList<>();

    List<Mark> marks() {
        return List.copyOf(marks);
    }

    void box(double xMm, double yMm, double widthMm, double heightMm, Ink ink) {
        marks.add(new Mark.Box(xMm, yMm, widthMm, heightMm, ink));
    }

    void shape(List<Point> corners, Ink ink) {
        marks.add(new Mark.Shape(corners, ink));
    }

    void line(double x1Mm, double y1Mm, double x2Mm, double y2Mm, double widthMm) {
        dashed(x1Mm, y1Mm, x2Mm, y2Mm, widthMm, 0, Ink.BLACK);
    }

    void dashed(double x1Mm, double y1Mm, double x2Mm, double y2Mm, double widthMm, double dashMm, String hex) {
        marks.add(new Mark.Line(new Point(x1Mm, y1Mm), new Point(x2Mm, y2Mm), hex, widthMm, dashMm));
    }

    void words(String text, double xMm, double yMm, double sizeMm) {
        words(text, xMm, yMm, sizeMm, false, Mark.Anchor.START);
    }

    void words(String text, double xMm, double yMm, double sizeMm, boolean bold, Mark.Anchor anchor) {
        words(text, xMm, yMm, sizeMm, bold, anchor, Ink.BLACK);
    }

    void words(String text, double xMm, double yMm, double sizeMm, boolean bold, Mark.Anchor anchor, String hex) {
        if (!text.isBlank()) {
            marks.add(new Mark.Words(text, new Point(xMm, yMm), sizeMm, bold, anchor, hex));
        }
    }

    /** A chip of colours side by side, outlined in black. */
    void chip(List<String> hexes, double xMm, double yMm, double widthMm, double heightMm) {
        double each = widthMm / hexes.size();
        for (int i = 0; i < hexes.size(); i++) {
            // Each patch runs to the right end, so that no seam shows between neighbours.
            box(xMm + i * each, yMm, widthMm - i * each, heightMm, Ink.fill(hexes.get(i)));
        }
        box(xMm, yMm, widthMm, heightMm, Ink.outline(Ink.BLACK, 0.25));
    }
}
