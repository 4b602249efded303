package tideband.window.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.junit.jupiter.api.Test;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.piece.End;
import tideband.window.Desk;
import tideband.window.action.Command;
import tideband.window.comfort.LengthUnit;

/** All that can be done without a mouse, without a screen. */
class FieldKeyboardTest {
    private final FieldDesk field = FieldDesk.over("chimney-post");
    private final Design start = field.design();
    private final FieldKeyboard keyboard = field.model.keyboard();
    private final FieldEdits edits = field.model.edits();

    private void select(int... bands) {
        List<Integer> list = new ArrayList<>();
        for (int band : bands) {
            list.add(band);
        }
        field.desk.drawing().select(Selection.ofBands(list));
    }

    private void focus(Part part) {
        field.desk.drawing().select(Selection.of(part));
    }

    private String message() {
        return field.model.messageProperty().get();
    }

    private DrawnFilm film(int band) {
        return field.model.shown().films().get(band);
    }

    @Test
    void whatCouldNotBeDoneIsForgottenWhenTheDrawingGoesOn() {
        keyboard.stepBand(1, false);
        keyboard.stepBand(-1, false);
        assertThat(message()).contains("first band");
        field.desk.drawing().change("Mirror drawing", BandEdits::mirror);
        assertThat(message()).isEmpty();
    }

    @Test
    void theFocusWalksEveryHandleFromEndToEnd() {
        List<Part> walked = new ArrayList<>();
        do {
            keyboard.stepHandle(1);
            walked.add(field.desk.drawing().selection().focus().orElseThrow());
        } while (message().isEmpty());
        walked.remove(walked.size() - 1);
        assertThat(walked)
                .containsExactlyElementsOf(
                        field.model.shown().handles().stream().map(Handle::part).toList());
        assertThat(walked).contains(new Part.EdgeAt(3), new Part.FadeEnd(4, End.B), new Part.Level(2));
        assertThat(message()).isEqualTo("This is the last handle, at end B.");
        keyboard.stepHandle(-1);
        assertThat(field.desk.drawing().selection().focus()).contains(new Part.Level(4));
    }

    @Test
    void bandsAreWalkedAndMoreAreSelected() {
        keyboard.stepBand(1, false);
        keyboard.stepBand(1, true);
        keyboard.stepBand(1, true);
        assertThat(field.desk.drawing().selection())
                .isEqualTo(new Selection(List.of(0, 1, 2), Optional.of(new Part.Level(2))));
        assertThat(field.model.spokenProperty().getValue()).isEqualTo("band collar, 55 mm to 70 mm, bare metal");
        keyboard.lastBand();
        assertThat(field.model.spokenProperty().getValue())
                .startsWith("band finial, 95 mm to 130 mm, 46 nm · ")
                .contains(" to 95 nm");
        keyboard.stepBand(1, false);
        assertThat(message()).isEqualTo("This is the last band, at end B.");
    }

    @Test
    void nudgesOfOneHandleAreOneStepUntilTheFocusMoves() {
        focus(new Part.EdgeAt(0));
        keyboard.nudgeAlong(1, false);
        keyboard.nudgeAlong(10, false);
        keyboard.nudgeAlong(0.1, false);
        assertThat(field.design().bands().get(0).toMm()).isEqualTo(46.1);
        keyboard.stepHandle(1);
        keyboard.stepHandle(-1);
        keyboard.nudgeAlong(1, false);
        field.desk.drawing().undo();
        assertThat(field.design().bands().get(0).toMm()).isEqualTo(46.1);
        field.desk.drawing().undo();
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void inInchesAStepIsATwentieth() {
        field.desk.comfort().unitProperty().set(LengthUnit.INCH);
        focus(new Part.EdgeAt(0));
        keyboard.nudgeAlong(2, true);
        assertThat(field.design().bands().get(0).toMm()).isCloseTo(35 + 2.54, within(1e-3));
        assertThat(field.design().bands().get(1).toMm()).isCloseTo(55 + 2.54, within(1e-3));
    }

    @Test
    void anEdgeAtItsLimitSaysSo() {
        focus(new Part.EdgeAt(0));
        keyboard.nudgeAlong(19.5, false);
        assertThat(message()).isEmpty();
        keyboard.nudgeAlong(1, false);
        assertThat(message()).contains("no band is shorter than 0.5 mm");
        keyboard.nudgeUp(1);
        assertThat(message()).startsWith("Up and down move films");
        focus(new Part.Level(0));
        keyboard.nudgeAlong(1, false);
        assertThat(message()).startsWith("Left and right move edges");
    }

    @Test
    void filmsGoUpAndDownToBareAndBack() {
        focus(new Part.Level(1));
        keyboard.nudgeUp(10);
        keyboard.nudgeUp(-0.1);
        assertThat(film(1).aSideNm()).isEqualTo(55.9);
        for (int i = 0; i < 6; i++) {
            keyboard.nudgeUp(-10);
        }
        assertThat(film(1).bare()).isTrue();
        keyboard.nudgeUp(-1);
        assertThat(message()).isEqualTo("This band is bare already.");
        keyboard.nudgeUp(1);
        // Up from bare to what the supply can give at all: titanium has 3 nm from the beginning.
        assertThat(film(1).aSideNm()).isBetween(3.0, 6.0);
        field.desk.drawing().undo();
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void sidesGoAloneAndBandsTogether() {
        focus(new Part.FadeEnd(4, End.A));
        keyboard.nudgeUp(10);
        assertThat(film(4)).isEqualTo(new DrawnFilm(56, 95));
        select(0, 4);
        keyboard.nudgeUp(-1);
        assertThat(film(0)).isEqualTo(new DrawnFilm(119, 119));
        assertThat(film(4)).isEqualTo(new DrawnFilm(55, 94));
    }

    @Test
    void theDialMovesFilmsAndVolts() {
        focus(new Part.Level(0));
        keyboard.nudgeDial(1);
        double volts = field.model.shown().volts().volts(film(0).aSideNm());
        assertThat(volts).isCloseTo(Math.rint(volts * 10) / 10, within(0.01));
        keyboard.nudgeDial(100000);
        assertThat(film(0).aSideNm()).isCloseTo(field.model.shown().volts().ceilingNm(), within(0.01));
        keyboard.nudgeDial(1);
        assertThat(message()).startsWith("The dial goes no farther");
        focus(new Part.Level(4));
        keyboard.nudgeDial(1);
        assertThat(message()).startsWith("A fade runs through many volts");
        FieldDesk post = new FieldDesk(TwelveBands.design());
        post.desk.drawing().select(Selection.of(new Part.Level(9)));
        post.model.keyboard().nudgeDial(-2);
        assertThat(post.design().bands().get(9).wanted()).isEqualTo(new Wanted.Volts(44.8));
    }

    @Test
    void splitJoinInsertDuplicateDelete() {
        select(0);
        edits.splitMiddle();
        assertThat(field.design().bands()).hasSize(6);
        assertThat(field.desk.drawing().selection().bands()).containsExactly(1);
        edits.joinNext();
        assertThat(field.design().bands()).hasSize(5);
        edits.insertAfter();
        assertThat(field.design().bands()).hasSize(6);
        select(0, 1);
        edits.duplicate();
        assertThat(field.desk.drawing().selection().bands()).containsExactly(2, 3);
        edits.delete();
        assertThat(field.design().bands()).hasSize(6);
        select(0, 1, 2);
        edits.joinSelected();
        assertThat(field.design().bands()).hasSize(4);
        for (int i = 0; i < 6; i++) {
            field.desk.drawing().undo();
        }
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void whatCannotBeDoneIsSaidAndLeavesTheDrawing() {
        edits.delete();
        assertThat(message()).startsWith("No band is selected.");
        select(4);
        edits.joinNext();
        assertThat(message()).contains("is the last one");
        edits.toggleEdge();
        assertThat(message()).contains("ends where the piece ends");
        edits.joinSelected();
        assertThat(message()).startsWith("One band alone");
        select(0, 2);
        edits.joinSelected();
        assertThat(message()).contains("side by side");
        edits.selectAll();
        edits.delete();
        assertThat(message()).startsWith("A drawing keeps at least one band");
        select(2);
        edits.makeFade();
        assertThat(message()).contains("Give it a film first");
        edits.makeLevel();
        assertThat(message()).contains("No fade is selected");
        assertThat(field.design()).isEqualTo(start);
        assertThat(field.desk.drawing().undoNameProperty().get()).isEmpty();
    }

    @Test
    void aBandTooShortToSplitSaysSo() {
        field.desk.drawing().change("Move edge", d -> BandEdits.moveEdge(d, 0, 0.7));
        select(0);
        Design before = field.design();
        edits.splitMiddle();
        edits.insertAfter();
        assertThat(field.design()).isEqualTo(before);
        assertThat(message()).startsWith("Band foot is 0.7 mm long, too short to hold another: it takes 1 mm.");
    }

    @Test
    void bareEdgesLevelsAndFadesAreToggled() {
        select(2);
        edits.toggleBare();
        assertThat(film(2)).isEqualTo(new DrawnFilm(46, 46));
        edits.toggleBare();
        assertThat(field.design()).isEqualTo(start);
        focus(new Part.EdgeAt(0));
        edits.toggleEdge();
        assertThat(field.design().bands().get(0).edge()).isEqualTo(Edge.CRISP);
        edits.toggleEdge();
        focus(new Part.FadeEnd(4, End.B));
        edits.makeLevel();
        assertThat(film(4)).isEqualTo(new DrawnFilm(95, 95));
        edits.makeFade();
        assertThat(film(4)).isEqualTo(new DrawnFilm(46, 95));
        assertThat(field.design().bands().stream().map(Band::wanted).toList())
                .isEqualTo(start.bands().stream().map(Band::wanted).toList());
    }

    @Test
    void mirrorTwiceIsTheDrawing() {
        select(0);
        edits.mirror();
        assertThat(field.desk.drawing().selection().bands()).containsExactly(4);
        assertThat(field.design()).isNotEqualTo(start);
        edits.mirror();
        assertThat(field.design().bands().stream().map(Band::name).toList())
                .isEqualTo(start.bands().stream().map(Band::name).toList());
    }

    @Test
    void zoomKeepsThePointAndStaysOnThePiece() {
        double mm = field.model.viewportProperty().get().mm(300);
        field.model.sight().zoomAlong(3, 300);
        assertThat(field.model.viewportProperty().get().mm(300)).isCloseTo(mm, within(1e-9));
        field.model.sight().zoomAlong(1000, 300);
        FieldArea area = field.model.shown().area();
        double seenMm = field.model.viewportProperty().get().mm(area.rightPx())
                - field.model.viewportProperty().get().mm(area.leftPx());
        assertThat(seenMm).isCloseTo(130.0 / 50, within(1e-9));
        assertThat(field.model.sight().pan(1e6, 0)).isTrue();
        assertThat(field.model.viewportProperty().get().mm(area.rightPx())).isCloseTo(130, within(1e-9));
        assertThat(field.model.sight().pan(1, 0)).isFalse();
        double nm = field.model.scaleProperty().get().nm(200);
        field.model.sight().zoomUp(4, 200);
        assertThat(field.model.scaleProperty().get().nm(200)).isCloseTo(nm, within(1e-9));
        field.model.sight().fit();
        assertThat(field.model.viewportProperty().get().mm(area.leftPx())).isEqualTo(0);
        assertThat(field.model.scaleProperty().get().fromNm()).isEqualTo(0);
    }

    @Test
    void theFocusIsBroughtIntoView() {
        field.model.sight().zoomAlong(10, field.px(0));
        keyboard.lastBand();
        Handle handle = field.handle(new Part.Level(4));
        assertThat(handle.xPx())
                .isBetween(
                        field.model.shown().area().leftPx(),
                        field.model.shown().area().rightPx());
    }

    @Test
    void commandsHaveKeysOfTheirOwn() {
        Set<String> taken = new HashSet<>(List.of(
                "Shortcut+N",
                "Shortcut+O",
                "Shortcut+S",
                "Shortcut+Shift+S",
                "Shortcut+W",
                "Shortcut+Q",
                "Shortcut+Z",
                "Shortcut+Y",
                "Shortcut+Shift+Z",
                "Shortcut+E",
                "Shortcut+P",
                "F1",
                "F11"));
        Set<String> ids = new HashSet<>();
        for (Command command : field.model.commands()) {
            assertThat(taken.add(command.key())).as(command.key()).isTrue();
            assertThat(ids.add(command.id())).as(command.id()).isTrue();
            assertThat(command.help()).endsWith(".");
        }
    }

    @Test
    void everyCommandLeavesADrawingThatCanBeUndone() {
        for (Command command : field.model.commands()) {
            select(1);
            command.act().run();
            while (!field.desk.drawing().undoNameProperty().get().isEmpty()) {
                field.desk.drawing().undo();
            }
            assertThat(field.design()).as(command.id()).isEqualTo(start);
        }
        assertThat(start).isEqualTo(Desk.shipped("chimney-post"));
    }

    @Test
    void enterOpensExactValues() {
        List<String> opened = new ArrayList<>();
        field.model.exactValuesProperty().set(() -> opened.add("exact"));
        field.model.openExactValues();
        assertThat(opened).containsExactly("exact");
    }
}
