package tideband.window.field;

import java.util.List;
import java.util.Locale;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.text.TextAlignment;
import tideband.colour.Srgb;
import tideband.colour.Viewing;
import tideband.design.Design;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.piece.End;
import tideband.window.comfort.LengthUnit;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;

/** Paints what lies under the drawing: every height in the colour of its film, the axes, and what is out of reach. */
final class GroundPainter {
    private static final double TICK_EMS = 2.2;
    private static final double LENGTH_TICK_EMS = 4.5;

    // What the strip of colours depends on.
    private record Shades(Palette palette, NmScale scale) {}

    private final Brush brush;
    private Shades painted;
    private WritableImage strip;

    GroundPainter(Canvas canvas) {
        brush = new Brush(canvas);
    }

    void paint(FieldShown shown, Look look) {
        brush.begin(look);
        FieldArea area = shown.area();
        NmScale scale = shown.scale();
        GraphicsContext gc = brush.gc;
        gc.setFill(look.paper());
        gc.fillRect(0, 0, area.widthPx(), area.heightPx());
        double height = area.bottomPx() - area.topPx();
        gc.setImageSmoothing(false);
        gc.drawImage(
                strip(shown.palette(), shown.viewing(), scale, (int) Math.ceil(height)),
                area.leftPx(),
                area.topPx(),
                area.rightPx() - area.leftPx(),
                height);
        outOfReach(area, scale, shown.volts());
        dryLengths(area, shown.design(), shown.viewport());
        filmAxis(area, scale);
        voltAxis(area, scale, shown.volts());
        lengthAxis(area, shown.viewport(), shown.design().piece().lengthMm(), shown.unit());
        gc.setStroke(look.ink());
        gc.setLineWidth(1);
        gc.strokeRect(
                Math.floor(area.leftPx()) - 0.5,
                Math.floor(area.topPx()) - 0.5,
                Math.ceil(area.rightPx() - area.leftPx()) + 1,
                Math.ceil(height) + 1);
    }

    /** One px wide; made anew only when its colours or its scale change. */
    private WritableImage strip(Palette palette, Viewing viewing, NmScale scale, int heightPx) {
        Shades shades = new Shades(palette, scale);
        if (shades.equals(painted) && strip.getHeight() == heightPx) {
            return strip;
        }
        int[] colours = new int[heightPx];
        for (int i = 0; i < heightPx; i++) {
            double filmNm = scale.nm(scale.topPx() + i + 0.5);
            double within = Math.min(Math.max(filmNm, 0), palette.maxNm());
            Srgb screen = viewing.srgb(palette.labAt(within).toXyz(viewing.white()));
            colours[i] = 0xff000000 | eight(screen.red()) << 16 | eight(screen.green()) << 8 | eight(screen.blue());
        }
        if (strip == null || strip.getHeight() != heightPx) {
            strip = new WritableImage(1, heightPx);
        }
        strip.getPixelWriter().setPixels(0, 0, 1, heightPx, PixelFormat.getIntArgbInstance(), colours, 0, 1);
        painted = shades;
        return strip;
    }

    private static int eight(double channel) {
        return (int) Math.round(channel * 255);
    }

    private void outOfReach(FieldArea area, NmScale scale, VoltScale volts) {
        double ceilingPx = scale.px(volts.ceilingNm());
        if (ceilingPx <= area.topPx()) {
            return;
        }
        double bottom = Math.min(ceilingPx, area.bottomPx());
        GraphicsContext gc = brush.gc;
        gc.setGlobalAlpha(0.55);
        gc.setFill(brush.look().panel());
        gc.fillRect(area.leftPx(), area.topPx(), area.rightPx() - area.leftPx(), bottom - area.topPx());
        gc.setGlobalAlpha(1);
        brush.hatchBoth(area.leftPx(), area.topPx(), area.rightPx(), bottom, 9, 0.75);
        if (ceilingPx < area.bottomPx()) {
            brush.line(area.leftPx(), ceilingPx, area.rightPx(), ceilingPx, 1.5);
        }
    }

    private void dryLengths(FieldArea area, Design design, Viewport viewport) {
        double dryMm = design.holding().dryMm();
        if (dryMm <= 0) {
            return;
        }
        for (End down : design.holding().endsDown()) {
            double onePx = viewport.px(design.piece().fromEnd(down.other(), 0));
            double otherPx = viewport.px(design.piece().fromEnd(down.other(), dryMm));
            double left = Math.max(Math.min(onePx, otherPx), area.leftPx());
            double right = Math.min(Math.max(onePx, otherPx), area.rightPx());
            if (right <= left) {
                continue;
            }
            brush.hatchBoth(left, area.topPx(), right, area.bottomPx(), 14, 0.35);
            double innerPx = down == End.B ? right : left;
            brush.dashes(7, 4);
            brush.line(innerPx, area.topPx(), innerPx, area.bottomPx(), 1);
            brush.dashes();
        }
    }

    private void filmAxis(FieldArea area, NmScale scale) {
        brush.type(0.85, false);
        for (double nm : Ticks.between(scale.fromNm(), scale.toNm(), TICK_EMS * area.emPx() / scale.pxPerNm())) {
            double y = scale.px(nm);
            tick(area.leftPx() - 4, y, area.leftPx());
            if (y > area.topPx() + 0.3 * area.emPx()) {
                brush.write(
                        number(nm),
                        area.leftPx() - 7,
                        y,
                        TextAlignment.RIGHT,
                        brush.look().ink());
            }
        }
        brush.type(0.85, true);
        brush.write(
                "film nm",
                4,
                0.8 * area.emPx(),
                TextAlignment.LEFT,
                brush.look().ink());
    }

    private void tick(double x1, double y, double x2) {
        brush.gc.setStroke(brush.look().ink());
        brush.gc.setLineWidth(1);
        brush.gc.strokeLine(x1, Math.floor(y) + 0.5, x2, Math.floor(y) + 0.5);
    }

    private void voltAxis(FieldArea area, NmScale scale, VoltScale volts) {
        brush.type(0.85, false);
        double topNm = Math.min(scale.toNm(), volts.ceilingNm());
        double fromV = volts.volts(scale.fromNm());
        double toV = volts.volts(topNm);
        if (toV > fromV) {
            double pxPerV = (scale.px(scale.fromNm()) - scale.px(topNm)) / (toV - fromV);
            for (double v : Ticks.between(fromV, toV, TICK_EMS * area.emPx() / pxPerV)) {
                double y = v == 0 ? scale.px(0) : scale.px(volts.filmNmAtVolts().applyAsDouble(v));
                if (y <= area.bottomPx() + 0.5) {
                    tick(area.rightPx(), y, area.rightPx() + 4);
                    brush.write(
                            number(v),
                            area.rightPx() + 7,
                            y,
                            TextAlignment.LEFT,
                            brush.look().ink());
                }
            }
        }
        brush.type(0.85, true);
        brush.write(
                "volts V",
                area.widthPx() - 4,
                0.8 * area.emPx(),
                TextAlignment.RIGHT,
                brush.look().ink());
    }

    private void lengthAxis(FieldArea area, Viewport viewport, double lengthMm, LengthUnit unit) {
        brush.type(0.85, false);
        double middle = area.bottomPx() + 1.05 * area.emPx();
        double fromMm = Math.max(0, viewport.fromMm());
        double toMm = Math.min(lengthMm, viewport.mm(area.rightPx()));
        double leastInUnit = LENGTH_TICK_EMS * area.emPx() / viewport.pxPerMm() / unit.inMm();
        List<Double> ticks = Ticks.between(fromMm / unit.inMm(), toMm / unit.inMm(), leastInUnit);
        for (double at : ticks) {
            double x = Math.floor(viewport.px(at * unit.inMm())) + 0.5;
            brush.gc.setStroke(brush.look().ink());
            brush.gc.setLineWidth(1);
            brush.gc.strokeLine(x, area.bottomPx(), x, area.bottomPx() + 4);
            // The first and the last stay off the words beside the axis.
            TextAlignment align = TextAlignment.CENTER;
            if (x < area.leftPx() + area.emPx()) {
                align = TextAlignment.LEFT;
            } else if (x > area.rightPx() - area.emPx()) {
                align = TextAlignment.RIGHT;
            }
            brush.write(number(at), x, middle, align, brush.look().ink());
        }
        brush.type(0.85, true);
        brush.write("end A", 4, middle, TextAlignment.LEFT, brush.look().ink());
        brush.write(
                "B · " + unit.symbol(),
                area.widthPx() - 4,
                middle,
                TextAlignment.RIGHT,
                brush.look().ink());
    }

    private static String number(double value) {
        return value == Math.rint(value)
                ? String.format(Locale.ROOT, "%.0f", value)
                : String.format(Locale.ROOT, "%.3f", value).replaceAll("0+$", "");
    }
}
