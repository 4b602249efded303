package tideband.window.piece;

import java.util.List;
import java.util.Locale;
import javafx.geometry.VPos;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.paint.Color;
import javafx.scene.text.TextAlignment;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.window.look.Look;

/** What is drawn over the painted piece: the holder's dry length, the selection, the divider, the bore, notes and differences. */
final class PieceMarks {
    private static final double GAP_PX = 3;
    private static final double HATCH_PX = 5;
    private static final double[] TOPS = {2, 5, 10, 20, 50, 100};

    private final GraphicsContext pen;
    private final Look look;
    private final PieceModel model;
    private final Frame frame;
    private final Room room;

    PieceMarks(GraphicsContext pen, Look look, PieceModel model, Frame frame, Room room) {
        this.pen = pen;
        this.look = look;
        this.model = model;
        this.frame = frame;
        this.room = room;
    }

    /**
     * Draws all marks.
     *
     * @param width width of the picture in px
     * @param height its height in px
     */
    void draw(double width, double height) {
        pen.clearRect(0, 0, width, height);
        pen.setLineDashes();
        pen.setFont(look.font(0.85));
        pen.setTextBaseline(VPos.CENTER);
        Portrait portrait = model.portraitProperty().get();
        unknown();
        bore();
        portrait.dry().forEach(dry -> dry(dry, width));
        selection();
        if (portrait.split()) {
            divider(width);
        }
        if (!portrait.note().isEmpty()) {
            pen.setFill(look.ink());
            pen.setTextAlign(TextAlignment.CENTER);
            pen.fillText(portrait.note(), width / 2, headlinePx());
        }
        if (model.differenceShownProperty().get()) {
            differences(width);
        }
    }

    private double headlinePx() {
        return room.topPx() / 2;
    }

    private double halfPx(double atMm) {
        double within = Math.min(frame.piece().lengthMm(), Math.max(0, atMm));
        return frame.piece().sizeMm(within) / 2 * frame.acrossPxPerMm();
    }

    /** A film whose colour is not known is hatched. */
    private void unknown() {
        Strip strip = frame.lower();
        for (int i = 0; i < strip.size(); i++) {
            Strip.Stretch stretch = strip.get(i);
            if (!stretch.known()) {
                double half = halfPx((stretch.fromMm() + stretch.toMm()) / 2);
                hatch(
                        frame.view().px(stretch.fromMm()),
                        frame.view().px(stretch.toMm()),
                        frame.centrePx() - half,
                        frame.centrePx() + half,
                        look.ink());
            }
        }
    }

    private void hatch(double left, double right, double top, double bottom, Color ink) {
        pen.setStroke(ink);
        pen.setLineWidth(1);
        double tall = bottom - top;
        pen.beginPath();
        // Cut to the rectangle by reckoning: a clip costs a canvas in memory each time.
        for (double x = left - tall; x < right; x += HATCH_PX) {
            double from = Math.max(0, left - x);
            double to = Math.min(tall, right - x);
            if (to > from) {
                pen.moveTo(x + from, bottom - from);
                pen.lineTo(x + to, bottom - to);
            }
        }
        pen.stroke();
    }

    private void bore() {
        if (frame.piece().section() instanceof Section.Tube tube) {
            double half = tube.boreMm() / 2 * frame.acrossPxPerMm();
            double left = frame.view().px(0);
            double right = frame.view().px(frame.piece().lengthMm()) - PiecePainter.bendPx(frame, half);
            pen.setLineWidth(1);
            pen.setLineDashes(6, 5);
            for (double off : new double[] {-half, half}) {
                double y = Math.rint(frame.centrePx() + off) + 0.5;
                pen.setStroke(Color.gray(0, 0.45));
                pen.strokeLine(left, y, right, y);
                pen.setStroke(Color.gray(1, 0.4));
                pen.strokeLine(left, y + 1, right, y + 1);
            }
            pen.setLineDashes();
        }
    }

    /** Jaws above and below, and how long they keep the piece dry. */
    private void dry(Portrait.Dry dry, double width) {
        double left = frame.view().px(dry.fromMm());
        double right = frame.view().px(dry.toMm());
        double half = Math.max(halfPx(dry.fromMm()), halfPx(dry.toMm())) + GAP_PX;
        double thick = 0.4 * look.emPx();
        for (int side = -1; side <= 1; side += 2) {
            double edge = frame.centrePx() + side * half;
            double top = Math.min(edge, edge + side * thick);
            hatch(left, right, top, top + thick, look.faint());
            pen.setStroke(look.faint());
            pen.setLineWidth(1);
            pen.strokeLine(left, edge, right, edge);
        }
        String words = "dry " + model.length(dry.toMm() - dry.fromMm());
        pen.setFill(look.faint());
        boolean atStart = dry.fromMm() == 0;
        pen.setTextAlign(atStart ? TextAlignment.LEFT : TextAlignment.RIGHT);
        double y = Math.max(0.6 * look.emPx(), frame.centrePx() - half - thick - 0.65 * look.emPx());
        pen.fillText(words, atStart ? Math.max(2, left) : Math.min(width - 2, right), y);
    }

    private void selection() {
        pen.setStroke(look.accent());
        pen.setLineWidth(2);
        for (int band : model.selectionProperty().get().bands()) {
            if (band < model.readingsProperty().get().size()) {
                BandReading reading = model.readingsProperty().get().get(band);
                double fromMm = Math.min(reading.fromMm(), frame.piece().lengthMm());
                double toMm = Math.min(reading.toMm(), frame.piece().lengthMm());
                for (int side = -1; side <= 1; side += 2) {
                    line(fromMm, toMm, side);
                }
            }
        }
    }

    /** A line along the outline, a little outside it. */
    private void line(double fromMm, double toMm, int side) {
        pen.beginPath();
        pen.moveTo(frame.view().px(fromMm) + 1, outsidePx(fromMm, side));
        for (Station station : frame.piece().stations()) {
            if (station.atMm() > fromMm && station.atMm() < toMm) {
                pen.lineTo(frame.view().px(station.atMm()), outsidePx(station.atMm(), side));
            }
        }
        pen.lineTo(frame.view().px(toMm) - 1, outsidePx(toMm, side));
        pen.stroke();
    }

    private double outsidePx(double atMm, int side) {
        return frame.centrePx() + side * (halfPx(atMm) + GAP_PX);
    }

    private void divider(double width) {
        double left = Math.max(0, frame.view().px(0));
        double right = Math.min(width, frame.view().px(frame.piece().lengthMm()));
        double y = frame.centrePx();
        pen.setLineWidth(1);
        pen.setStroke(Color.gray(1, 0.85));
        pen.strokeLine(left, y - 0.5, right, y - 0.5);
        pen.setStroke(Color.gray(0, 0.85));
        pen.strokeLine(left, y + 0.5, right, y + 0.5);
        double middle = (left + right) / 2;
        double half = halfPx(frame.view().mm(middle)) + 2 * GAP_PX + 0.55 * look.emPx();
        pen.setFill(look.ink());
        pen.setTextAlign(TextAlignment.CENTER);
        pen.fillText("upper half: wanted", middle, y - half);
        pen.fillText("lower half: predicted", middle, y + half);
    }

    private void differences(double width) {
        List<Differences.Point> line = model.differencesProperty().get();
        double top = room.graphTopPx() + 0.9 * look.emPx();
        double base = room.graphBottomPx() - 3;
        pen.setStroke(look.rule());
        pen.setLineWidth(1);
        pen.strokeLine(0, Math.rint(base) + 0.5, width, Math.rint(base) + 0.5);
        pen.setTextAlign(TextAlignment.LEFT);
        pen.setFill(look.faint());
        if (line.isEmpty()) {
            pen.fillText("no difference to show: nothing is predicted", 2, (top + base) / 2);
            return;
        }
        double most = line.stream().mapToDouble(Differences.Point::de00).max().orElse(0);
        double scale = TOPS[TOPS.length - 1];
        for (int i = TOPS.length - 1; i >= 0 && TOPS[i] >= most; i--) {
            scale = TOPS[i];
        }
        pen.setLineDashes(2, 3);
        pen.strokeLine(0, Math.rint(top) + 0.5, width, Math.rint(top) + 0.5);
        pen.setLineDashes();
        pen.fillText(String.format(Locale.ROOT, "dE00 up to %.0f", scale), 2, room.graphTopPx() + 0.4 * look.emPx());
        double[] x = new double[line.size()];
        double[] y = new double[line.size()];
        for (int i = 0; i < x.length; i++) {
            x[i] = frame.view().px(line.get(i).atMm());
            y[i] = base - (base - top) * Math.min(1, line.get(i).de00() / scale);
        }
        pen.setStroke(look.ink());
        pen.setLineWidth(1.2);
        pen.strokePolyline(x, y, x.length);
        numbers(base, top, scale);
    }

    /** The median of each band, over the line. */
    private void numbers(double base, double top, double scale) {
        pen.setFill(look.ink());
        pen.setTextAlign(TextAlignment.CENTER);
        for (BandReading reading : model.readingsProperty().get()) {
            double left = frame.view().px(reading.fromMm());
            double right = frame.view().px(reading.toMm());
            if (reading.predicted().isPresent() && right - left > 2.2 * look.emPx()) {
                double de00 = reading.predicted().get().de00Median();
                double y = base - (base - top) * Math.min(1, de00 / scale) - 0.7 * look.emPx();
                pen.fillText(String.format(Locale.ROOT, "%.1f", de00), (left + right) / 2, y);
            }
        }
    }
}
