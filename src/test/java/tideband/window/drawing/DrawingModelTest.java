package tideband.window.drawing;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import tideband.design.Design;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.window.Desk;

class DrawingModelTest {
    private final Design start = Desk.shipped("lantern-hook");
    private final DrawingModel drawing = new DrawingModel(start);

    @Test
    void undoNamesWhatItUndoesAndGivesTheDesignBack() {
        drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 40));
        assertThat(drawing.undoNameProperty().get()).isEqualTo("Move edge");
        drawing.undo();
        assertThat(drawing.design()).isEqualTo(start);
        assertThat(drawing.undoNameProperty().get()).isEmpty();
        assertThat(drawing.redoNameProperty().get()).isEqualTo("Move edge");
        drawing.redo();
        assertThat(drawing.design().bands().get(0).toMm()).isEqualTo(40);
    }

    @Test
    void aDragIsOneStepHoweverFarItWent() {
        String gesture = drawing.newGesture();
        for (double toMm = 30; toMm <= 50; toMm += 0.5) {
            double atMm = toMm;
            drawing.change("Move edge", gesture, d -> BandEdits.moveEdge(d, 0, atMm));
        }
        drawing.undo();
        assertThat(drawing.design()).isEqualTo(start);
    }

    @Test
    void aDragBackToWhereItBeganLeavesNoStep() {
        String gesture = drawing.newGesture();
        drawing.change("Move edge", gesture, d -> BandEdits.moveEdge(d, 0, 50));
        drawing.change("Move edge", gesture, d -> BandEdits.moveEdge(d, 0, 30));
        assertThat(drawing.undoNameProperty().get()).isEmpty();
    }

    @Test
    void whatIsGoneIsNoLongerSelected() {
        drawing.select(Selection.of(new Part.Level(3)));
        drawing.change("Delete band", d -> BandEdits.delete(d, List.of(3)));
        assertThat(drawing.selection()).isEqualTo(Selection.NONE);
    }
}
