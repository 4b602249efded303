package tideband.window.field;

import java.util.Optional;
import javafx.geometry.Rectangle2D;
import javafx.scene.canvas.GraphicsContext;
import tideband.design.Design;
import tideband.match.VoltScale;
import tideband.piece.End;

/** Says what the hatches of the ground mean; over the drawing, so that no line crosses the words. */
final class GroundWords {
    private static final double WORDS_EMS = 0.85;

    private final Brush brush;

    GroundWords(Brush brush) {
        this.brush = brush;
    }

    void write(FieldShown shown) {
        brush.type(WORDS_EMS, false);
        outOfReachPlate(shown)
                .ifPresent(plate -> brush.plate(
                        plate.words(),
                        plate.leftPx(),
                        plate.middlePx(),
                        brush.look().ink()));
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

    /** Where the words for what is out of reach stand, so that names can keep off them; nowhere where all is in reach. */
    Optional<Rectangle2D> outOfReachPlace(FieldShown shown) {
        brush.type(WORDS_EMS, false);
        return outOfReachPlate(shown).map(plate -> plate.place(brush));
    }

    private Optional<Plate> outOfReachPlate(FieldShown shown) {
        FieldArea area = shown.area();
        VoltScale volts = shown.volts();
        double ceilingPx = shown.scale().px(volts.ceilingNm());
        if (ceilingPx <= area.topPx()) {
            return Optional.empty();
        }
        String above = "out of reach above " + FieldWords.nm(Math.floor(volts.ceilingNm() * 10) / 10);
        String words = brush.fitting(
                (area.rightPx() - area.leftPx()) * 0.6,
                above + ", " + FieldWords.volts(volts.ceilingVolts()) + ": all that bath and supply give",
                above + ", " + FieldWords.volts(volts.ceilingVolts()),
                "out of reach");
        double bottom = Math.min(ceilingPx, area.bottomPx());
        double middle = Math.max((area.topPx() + bottom) / 2, area.topPx() + brush.heightPx() / 2);
        return Optional.of(new Plate(words, area.rightPx() - brush.plateWidth(words) - 2 * area.emPx(), middle));
    }

    // Words and the place of their left middle.
    private record Plate(String words, double leftPx, double middlePx) {
        Rectangle2D place(Brush brush) {
            return new Rectangle2D(leftPx, middlePx - brush.heightPx() / 2, brush.plateWidth(words), brush.heightPx());
        }
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
