package tideband.window.field;

import javafx.scene.canvas.GraphicsContext;
import tideband.design.Design;
import tideband.match.VoltScale;
import tideband.piece.End;

/** Says what the hatches of the ground mean; over the drawing, so that no line crosses the words. */
final class GroundWords {
    private final Brush brush;

    GroundWords(Brush brush) {
        this.brush = brush;
    }

    void write(FieldShown shown) {
        brush.type(0.85, false);
        outOfReach(shown.area(), shown.scale(), shown.volts());
        Design design = shown.design();
        boolean both = design.holding().endsDown().size() > 1;
        for (End down : design.holding().endsDown()) {
            double atMm = design.piece().fromEnd(down.other(), 0);
            double px = shown.viewport().px(atMm);
            boolean seen = px >= shown.area().leftPx() - 1 && px <= shown.area().rightPx() + 1;
            if (seen && design.holding().dryMm() > 0) {
                upright(both ? "dry while " + down + " is down" : "dry under the holder", down, shown.area());
            }
        }
    }

    private void outOfReach(FieldArea area, NmScale scale, VoltScale volts) {
        double ceilingPx = scale.px(volts.ceilingNm());
        if (ceilingPx <= area.topPx()) {
            return;
        }
        String above = "out of reach above " + FieldWords.nm(Math.floor(volts.ceilingNm() * 10) / 10);
        String words = brush.fitting(
                (area.rightPx() - area.leftPx()) * 0.6,
                above + ", " + FieldWords.volts(volts.ceilingVolts()) + ": all that bath and supply give",
                above + ", " + FieldWords.volts(volts.ceilingVolts()),
                "out of reach");
        double bottom = Math.min(ceilingPx, area.bottomPx());
        double middle = Math.max((area.topPx() + bottom) / 2, area.topPx() + brush.heightPx() / 2);
        brush.plate(
                words,
                area.rightPx() - brush.plateWidth(words) - 2 * area.emPx(),
                middle,
                brush.look().ink());
    }

    private void upright(String words, End down, FieldArea area) {
        if (brush.plateWidth(words) > area.bottomPx() - area.topPx() - 8) {
            return;
        }
        double insetPx = 0.75 * area.emPx();
        GraphicsContext gc = brush.gc;
        gc.save();
        gc.translate(down == End.B ? area.leftPx() + insetPx : area.rightPx() - insetPx, area.bottomPx() - 4);
        gc.rotate(-90);
        brush.plate(words, 0, 0, brush.look().ink());
        gc.restore();
    }
}
