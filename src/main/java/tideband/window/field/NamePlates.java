package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.geometry.Rectangle2D;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.text.TextAlignment;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Wanted;
import tideband.edit.Part;

/** Writes the names of bands along the line, where there is room and where none covers another; and marks those at fault. */
final class NamePlates {
    private static final int FEWEST_LETTERS = 3;
    private static final double GAP_EMS = 0.55;
    /** Names keep off the ring of the focus. */
    private static final double RING_EMS = 1.15;

    private final Brush brush;
    private final List<Rectangle2D> taken = new ArrayList<>();

    NamePlates(Brush brush) {
        this.brush = brush;
    }

    // Where something is to stand: about the middle of what is seen of a band.
    private record Spot(FieldShown shown, int index, double fromPx, double toPx) {
        Band band() {
            return shown.design().bands().get(index);
        }

        DrawnFilm film() {
            return shown.films().get(index);
        }

        double linePx(double xPx) {
            Band band = band();
            double share = (shown.viewport().mm(xPx) - band.fromMm()) / (band.toMm() - band.fromMm());
            double within = Math.min(Math.max(share, 0), 1);
            return shown.scale().px(film().aSideNm() + within * (film().bSideNm() - film().aSideNm()));
        }
    }

    /** Writes them where nothing else stands, such as the words for what is out of reach. */
    void write(FieldShown shown, Optional<Rectangle2D> occupied) {
        taken.clear();
        occupied.ifPresent(taken::add);
        FieldArea area = shown.area();
        List<Band> bands = shown.design().bands();
        List<Spot> spots = new ArrayList<>();
        for (int i = 0; i < bands.size(); i++) {
            double from = Math.max(shown.viewport().px(bands.get(i).fromMm()), area.leftPx());
            double to = Math.min(shown.viewport().px(bands.get(i).toMm()), area.rightPx());
            if (to > from) {
                spots.add(new Spot(shown, i, from, to));
            }
        }
        List<Integer> faulty = shown.faulty();
        spots.stream().filter(s -> faulty.contains(s.index)).forEach(this::badge);
        spots.forEach(this::name);
    }

    private void name(Spot spot) {
        boolean selected = spot.shown.selection().bands().contains(spot.index);
        brush.type(0.9, selected);
        double roomPx = spot.toPx - spot.fromPx - 4;
        String text = fitted(spot, roomPx);
        if (brush.plateWidth(text) <= roomPx) {
            place(spot, brush.plateWidth(text), brush.heightPx())
                    .ifPresent(at -> brush.plate(
                            text,
                            at.getMinX(),
                            (at.getMinY() + at.getMaxY()) / 2,
                            brush.look().ink()));
        } else if (brush.heightPx() <= roomPx) {
            place(spot, brush.heightPx(), brush.plateWidth(text)).ifPresent(at -> upright(text, at));
        }
    }

    private void upright(String text, Rectangle2D at) {
        GraphicsContext gc = brush.gc;
        gc.save();
        gc.translate((at.getMinX() + at.getMaxX()) / 2, at.getMaxY());
        gc.rotate(-90);
        brush.plate(text, 0, 0, brush.look().ink());
        gc.restore();
    }

    /** The words that fit; where none do, those that are to stand upright. */
    private String fitted(Spot spot, double roomPx) {
        Band band = spot.band();
        String name = band.name() + beyond(spot);
        String longest = name;
        if (spot.film().bare()) {
            longest = name + " · bare";
        } else if (band.wanted() instanceof Wanted.Colour colour) {
            longest = name + " " + colour.text();
        } else if (band.wanted() instanceof Wanted.Volts volts) {
            longest = name + " " + FieldWords.volts(volts.volts());
        }
        String shortest = spot.film().bare() ? "bare" : name;
        String text = brush.fitting(roomPx, longest, shortest);
        for (int letters = name.length() - 1;
                letters >= FEWEST_LETTERS && !spot.film().bare() && brush.plateWidth(text) > roomPx;
                letters--) {
            text = name.substring(0, letters).stripTrailing() + "…";
        }
        return brush.plateWidth(text) <= roomPx ? text : shortest;
    }

    /** Where the line is when it is not in view. */
    private static String beyond(Spot spot) {
        double yPx = spot.linePx((spot.fromPx + spot.toPx) / 2);
        if (yPx > spot.shown.area().bottomPx() + 1) {
            return " ▼";
        }
        return yPx < spot.shown.area().topPx() - 1 ? " ▲" : "";
    }

    private Optional<Rectangle2D> place(Spot spot, double width, double height) {
        FieldArea area = spot.shown.area();
        double left = (spot.fromPx + spot.toPx - width) / 2;
        double high = Math.min(spot.linePx(left), spot.linePx(left + width));
        double low = Math.max(spot.linePx(left), spot.linePx(left + width));
        boolean ringed =
                spot.shown.selection().focus().orElse(null) instanceof Part.Level level && level.band() == spot.index;
        double gap = (ringed || spot.film().bare() ? RING_EMS : GAP_EMS) * area.emPx();
        double lowest = area.bottomPx() - 1 - height;
        double highest = area.topPx() + 1;
        double above = Math.min(Math.max(high - gap - height, highest), lowest);
        double below = Math.min(Math.max(low + gap, highest), lowest);
        for (double top : new double[] {above, below, above - height - 2, below + height + 2}) {
            Rectangle2D at = new Rectangle2D(Math.max(0, left), Math.max(0, top), width, height);
            boolean clear = top + height <= high - 0.8 * gap || top >= low + 0.8 * gap;
            boolean inside = top >= highest && top <= lowest;
            if (inside && clear && taken.stream().noneMatch(at::intersects)) {
                taken.add(at);
                return Optional.of(at);
            }
        }
        return Optional.empty();
    }

    private void badge(Spot spot) {
        double half = 0.85 * brush.look().emPx();
        place(spot, 2 * half + 4, 1.6 * half + 4).ifPresent(at -> {
            double x = (at.getMinX() + at.getMaxX()) / 2;
            double top = at.getMinY() + 2;
            GraphicsContext gc = brush.gc;
            double[] xs = {x - half, x, x + half};
            double[] ys = {top + 1.6 * half, top, top + 1.6 * half};
            gc.setStroke(Brush.HALO);
            gc.setLineWidth(4);
            gc.strokePolygon(xs, ys, 3);
            gc.setFill(brush.look().warn());
            gc.fillPolygon(xs, ys, 3);
            brush.type(0.95, true);
            brush.write(
                    "!",
                    x,
                    top + 1.05 * half,
                    TextAlignment.CENTER,
                    brush.look().panel());
        });
    }
}
