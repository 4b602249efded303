package tideband.edit;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;
import tideband.design.Design;
import tideband.design.DesignFile;

/** Property: whatever is done to a drawing, it can be saved, and undone and redone to the byte. */
class EditsPropertyTest {

    @Test
    void fiveHundredDrawingsComeBackToTheByte() {
        for (int number = 0; number < 500; number++) {
            EditsByLot lot = new EditsByLot(number);
            Design first = lot.design();
            byte[] atFirst = DesignFile.bytes(first);
            History history = edited(number, lot, first);
            while (history.redoName().isPresent()) {
                history = history.redo();
            }
            byte[] atLast = DesignFile.bytes(history.design());
            Map<String, Integer> steps = new HashMap<>(Map.of("the first", 0));
            while (history.undoName().isPresent()) {
                steps.merge(history.undoName().get(), 1, Integer::sum);
                history = history.undo();
            }
            assertThat(DesignFile.bytes(history.design()))
                    .as("drawing %s undone", number)
                    .isEqualTo(atFirst);
            assertThat(history.design()).isEqualTo(first);
            while (history.redoName().isPresent()) {
                steps.merge(history.redoName().get(), -1, Integer::sum);
                history = history.redo();
            }
            assertThat(steps.values()).as("as many steps redone as undone").containsOnly(0);
            assertThat(DesignFile.bytes(history.design()))
                    .as("drawing %s redone", number)
                    .isEqualTo(atLast);
        }
    }

    private static History edited(int number, EditsByLot lot, Design first) {
        Random random = new Random(number);
        History history = History.of(first);
        for (int step = 0; step < 40; step++) {
            int die = random.nextInt(10);
            String gesture = random.nextInt(4) == 0 ? "drag " + step / 5 : "";
            if (die == 0) {
                history = history.undo();
            } else if (die == 1) {
                history = history.redo();
            } else {
                history = history.with("edit " + step, gesture, lot.edited(history.design()));
            }
            assertThat(DesignFile.faults(history.design()))
                    .as("drawing %s, step %s: %s", number, step, history.design())
                    .isEmpty();
        }
        return history;
    }
}
