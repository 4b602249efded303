package tideband.window.order;

import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.shape.ArcType;
import javafx.scene.text.TextAlignment;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.window.look.Look;
import tideband.window.work.Glance;

/** Paints the piece small: upright in the bath, or lying beside it, with its colours and masks. */
final class BathPainter {
    private static final double LABEL_EM = 0.95;
    private static final double WIDEST_EM = 1.1;
    private static final double NARROWEST_EM = 0.45;
    private static final double MASK_MORE_EM = 0.35;
    private static final double HATCH_EM = 0.38;
    private static final int SLICES = 6;
    private static final double WATER = 0.22;

    private final GraphicsContext pen;
    private final Look look;
    private final Piece piece;
    private final BenchPicture picture;
    private final double em;
    private final double widestMm;

    BathPainter(GraphicsContext pen, Look look, Piece piece, BenchPicture picture) {
        this.pen = pen;
        this.look = look;
        this.piece = piece;
        this.picture = picture;
        this.em = look.emPx();
        this.widestMm = piece.largestSizeMm(0, piece.lengthMm());
    }

    // Where the piece lies: along y upright, along x lying; "start" is end A's place, "px" pixels a mm towards end B.
    private record Place(boolean upright, double start, double pxPerMm, double middle) {
        double at(double mm) {
            return start + pxPerMm * mm;
        }
    }

    void upright(double x, double y, double width, double height, WorkCard.Kind kind) {
        double top = y + LABEL_EM * em;
        double bottom = y + height - LABEL_EM * em;
        double pxPerMm = (bottom - top) / piece.lengthMm();
        boolean aDown = picture.down() == End.A;
        Place place = new Place(true, aDown ? bottom : top, aDown ? -pxPerMm : pxPerMm, x + width * 0.42);
        boolean inBath = kind != WorkCard.Kind.TURN;
        double levelY = bottom - picture.toLineMm() * pxPerMm;
        if (inBath) {
            pen.setFill(alpha(look.faint(), WATER));
            pen.fillRect(x, levelY, width, y + height - levelY);
        }
        piece(place);
        if (inBath) {
            level(x, width, levelY);
            arrow(x + width - 0.4 * em, kind, bottom - picture.fromLineMm() * pxPerMm, levelY);
        } else {
            turn(x + width - 0.75 * em, (top + bottom) / 2);
        }
        label(picture.down().other().name(), place.middle(), y + LABEL_EM * em / 2, false);
        label(picture.down().name(), place.middle(), y + height - LABEL_EM * em / 2, true);
    }

    void lying(double x, double y, double width, double height) {
        double from = x + LABEL_EM * em;
        double to = x + width - LABEL_EM * em;
        Place place = new Place(false, from, (to - from) / piece.lengthMm(), y + height / 2);
        piece(place);
        label(End.A.name(), x + LABEL_EM * em / 3, place.middle(), true);
        label(End.B.name(), x + width - LABEL_EM * em / 3, place.middle(), true);
    }

    private void piece(Place place) {
        for (BenchPicture.Tint tint : picture.tints()) {
            pen.setFill(Color.web(tint.hex()));
            for (int i = 0; i < SLICES; i++) {
                double fromMm = tint.fromMm() + (tint.toMm() - tint.fromMm()) * i / SLICES;
                double toMm = tint.fromMm() + (tint.toMm() - tint.fromMm()) * (i + 1) / SLICES;
                slice(place, fromMm, toMm);
            }
        }
        for (Glance.Stretch masked : picture.masked()) {
            mask(place, masked, picture.touched().contains(masked));
        }
        for (Glance.Stretch touched : picture.touched()) {
            frame(place, touched);
        }
    }

    private double halfWidth(double atMm) {
        return Math.max(NARROWEST_EM, WIDEST_EM * piece.sizeMm(atMm) / widestMm) * em / 2;
    }

    private void slice(Place place, double fromMm, double toMm) {
        double half = halfWidth((fromMm + toMm) / 2);
        double from = Math.min(place.at(fromMm), place.at(toMm));
        double length = Math.abs(place.at(toMm) - place.at(fromMm)) + 0.5;
        if (place.upright()) {
            pen.fillRect(place.middle() - half, from, 2 * half, length);
        } else {
            pen.fillRect(from, place.middle() - half, length, 2 * half);
        }
    }

    private double[] box(Place place, Glance.Stretch stretch) {
        double half = (WIDEST_EM / 2 + MASK_MORE_EM / 2) * em;
        double from = Math.min(place.at(stretch.fromMm()), place.at(stretch.toMm()));
        double length = Math.abs(place.at(stretch.toMm()) - place.at(stretch.fromMm()));
        return place.upright()
                ? new double[] {place.middle() - half, from, 2 * half, length}
                : new double[] {from, place.middle() - half, length, 2 * half};
    }

    private void mask(Place place, Glance.Stretch stretch, boolean fresh) {
        double[] box = box(place, stretch);
        pen.setFill(look.panel());
        pen.fillRect(box[0], box[1], box[2], box[3]);
        pen.setStroke(look.ink());
        pen.setLineWidth(fresh ? 1.5 : 1);
        double step = HATCH_EM * em;
        for (double offset = step / 2; offset < box[2] + box[3]; offset += step) {
            double fromX = Math.max(0, offset - box[3]);
            double toX = Math.min(box[2], offset);
            pen.strokeLine(box[0] + fromX, box[1] + offset - fromX, box[0] + toX, box[1] + offset - toX);
        }
        pen.strokeRect(box[0], box[1], box[2], box[3]);
    }

    private void frame(Place place, Glance.Stretch stretch) {
        double[] box = box(place, stretch);
        pen.setStroke(look.accent());
        pen.setLineWidth(2.5);
        pen.strokeRect(box[0] - 1, box[1] - 1, box[2] + 2, box[3] + 2);
    }

    /** The level, with the mark that drawings have for it. */
    private void level(double x, double width, double y) {
        pen.setStroke(look.ink());
        pen.setLineWidth(1.5);
        pen.strokeLine(x, y, x + width, y);
        double half = 0.28 * em;
        pen.setFill(look.ink());
        pen.fillPolygon(new double[] {x, x + 2 * half, x + half}, new double[] {y - 2 * half, y - 2 * half, y}, 3);
    }

    private void arrow(double x, WorkCard.Kind kind, double fromY, double toY) {
        boolean down = kind == WorkCard.Kind.DIP;
        if (!down && Math.abs(fromY - toY) < 0.5) {
            return;
        }
        // The piece moves; the level stays where it is. So the arrow tells which way the hand goes.
        double middle = Math.max(toY - 1.3 * em, 2.9 * em);
        double half = 0.8 * em;
        double tip = down ? middle + half : middle - half;
        double tail = down ? middle - half : middle + half;
        double head = 0.42 * em;
        double neck = down ? tip - 1.3 * head : tip + 1.3 * head;
        pen.setStroke(look.accent());
        pen.setFill(look.accent());
        pen.setLineWidth(0.2 * em);
        pen.strokeLine(x, tail, x, neck);
        pen.fillPolygon(new double[] {x - head, x + head, x}, new double[] {neck, neck, tip}, 3);
    }

    private void turn(double x, double y) {
        double r = 0.75 * em;
        pen.setStroke(look.accent());
        pen.setFill(look.accent());
        pen.setLineWidth(0.2 * em);
        pen.strokeArc(x - r, y - 2 * r, 2 * r, 4 * r, -90, 180, ArcType.OPEN);
        double head = 0.42 * em;
        pen.fillPolygon(
                new double[] {x + 0.2 * em, x + 0.2 * em, x - 1.1 * head},
                new double[] {y + 2 * r - head, y + 2 * r + head, y + 2 * r},
                3);
    }

    private void label(String text, double x, double y, boolean bold) {
        pen.setFill(bold ? look.ink() : look.faint());
        pen.setFont(bold ? look.bold(LABEL_EM) : look.font(LABEL_EM));
        pen.setTextAlign(TextAlignment.CENTER);
        pen.setTextBaseline(VPos.CENTER);
        pen.fillText(text, x, y);
        pen.setTextAlign(TextAlignment.LEFT);
        pen.setTextBaseline(VPos.BASELINE);
    }

    private static Color alpha(Color ink, double opacity) {
        return new Color(ink.getRed(), ink.getGreen(), ink.getBlue(), opacity);
    }
}
