package tideband.window.colour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayDeque;
import java.util.Deque;
import org.junit.jupiter.api.Test;
import tideband.bench.Colours;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.window.Desk;

class PlaneModelTest {
    private final Desk desk = Desk.with("lantern-hook");
    private final WantedModel model = new WantedModel(desk.drawing(), desk.work(), Runnable::run, Runnable::run);

    /** Property: what is passed over by lightness changes nothing; checked against looking at every film. */
    @Test
    void aCellIsReachedExactlyWhereAFilmIsNear() {
        Colours colours = desk.work().coloursProperty().get();
        ColourPlane plane = ColourPlane.of(colours, 30, 5);
        int reached = 0;
        for (int column = 0; column < ColourPlane.COLUMNS; column += 3) {
            for (int row = 0; row < ColourPlane.ROWS; row += 3) {
                boolean near = false;
                for (double nm = 0; nm < colours.scale().ceilingNm(); nm += ColourPlane.FILM_STEP_NM) {
                    near |= Ciede2000.between(colours.palette().labAt(nm), plane.labAt(column, row)) <= 5;
                }
                assertThat(plane.reachedAt(column, row)).isEqualTo(near);
                reached += near ? 1 : 0;
            }
        }
        assertThat(reached).isBetween(5, 450);
    }

    @Test
    void choosingWantsThatColour() {
        model.plane().chromaProperty().set(40);
        model.plane().choose(-90, 45);
        assertThat(model.entryProperty().get()).isEqualTo("lab(45, 0, -40)");
        assertThat(model.plane().hueDegreesProperty().get()).isEqualTo(270);
        model.plane().choose(0, 130);
        assertThat(model.entryProperty().get()).isEqualTo("lab(100, 40, 0)");
    }

    @Test
    void goesToAColourTypedElsewhere() {
        model.entryProperty().set("lab(61, 0, -33)");
        assertThat(model.plane().hueDegreesProperty().get()).isCloseTo(270, within(1e-9));
        assertThat(model.plane().lightnessProperty().get()).isEqualTo(61);
        assertThat(model.plane().chromaProperty().get()).isCloseTo(33, within(1e-9));
        assertThat(model.entryProperty().get()).isEqualTo("lab(61, 0, -33)");
    }

    @Test
    void onlyTheLastOfManyPlanesIsWorkedOut() {
        Deque<Runnable> beside = new ArrayDeque<>();
        WantedModel slow = new WantedModel(desk.drawing(), desk.work(), beside::add, Runnable::run);
        slow.plane().show();
        for (int chroma = 0; chroma <= 50; chroma++) {
            slow.plane().chromaProperty().set(chroma);
        }
        int worked = 0;
        while (!beside.isEmpty()) {
            beside.remove().run();
            worked += slow.plane().planeProperty().get().isPresent() ? 1 : 0;
        }
        assertThat(worked).isEqualTo(1);
        assertThat(slow.plane().planeProperty().get().orElseThrow().chroma()).isEqualTo(50);
    }

    @Test
    void cellsLieWhereTheySay() {
        ColourPlane plane = ColourPlane.of(desk.work().coloursProperty().get(), 20, 5);
        Lab lab = plane.labAt(22, 24);
        assertThat(lab.hueDegrees()).isCloseTo(90, within(1e-9));
        assertThat(lab.lightness()).isCloseTo(49, within(1e-9));
    }
}
