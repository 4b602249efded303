package tideband.window.field;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import tideband.bench.Colours;
import tideband.bench.DrawnFilm;
import tideband.colour.Srgb;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.match.ColourMatch;
import tideband.match.Match;
import tideband.piece.End;
import tideband.window.comfort.LengthUnit;

/** What a hand does to the drawing, without a screen. */
class FieldHandTest {
    private static final Modifiers SHIFT = new Modifiers(true, false, false);
    private static final Modifiers SHORTCUT = new Modifiers(false, true, false);
    private static final Modifiers ALT = new Modifiers(false, false, true);

    private final FieldDesk field = FieldDesk.over("snuffer-handle");
    private final Design start = field.design();

    private double toMm(int band) {
        return field.design().bands().get(band).toMm();
    }

    private DrawnFilm film(int band) {
        return field.model.shown().films().get(band);
    }

    private void undoGivesTheStartBack() {
        field.desk.drawing().undo();
        assertThat(field.design()).isEqualTo(start);
        assertThat(field.desk.drawing().undoNameProperty().get()).isEmpty();
    }

    @Test
    void anEdgeGoesSidewaysItsNeighboursGiveAndTake() {
        field.drag(new Part.EdgeAt(1), field.px(57.3) - field.px(50), 30, Modifiers.NONE);
        assertThat(toMm(1)).isEqualTo(57);
        assertThat(toMm(2)).isEqualTo(90);
        assertThat(field.model.readingProperty().get()).isEqualTo("edge 57 mm · was 50 mm");
        undoGivesTheStartBack();
    }

    @Test
    void withShiftAllThatFollowsMoves() {
        field.drag(new Part.EdgeAt(1), field.px(57.3) - field.px(50), 0, SHIFT);
        assertThat(List.of(toMm(1), toMm(2), toMm(3), toMm(4))).containsExactly(57.0, 97.0, 127.0, 150.0);
        assertThat(field.model.readingProperty().get()).contains("all that follows moves");
        undoGivesTheStartBack();
    }

    @Test
    void anEdgeIsLedToAStationAndSaysSo() {
        field.drag(new Part.EdgeAt(1), field.px(59.7) - field.px(50), 0, Modifiers.NONE);
        assertThat(toMm(1)).isEqualTo(60);
        assertThat(field.model.readingProperty().get()).endsWith("snapped to the station at 60 mm");
    }

    @Test
    void anEdgeIsLedToTheDryLengthToTheMirrorOfAnotherAndHalfway() {
        field.drag(new Part.EdgeAt(3), field.px(142.4) - field.px(120), 0, Modifiers.NONE);
        assertThat(field.model.readingProperty().get())
                .isEqualTo("edge 142 mm · was 120 mm · snapped to the dry length at end B");
        field.desk.drawing().undo();
        field.drag(new Part.EdgeAt(2), field.px(99.7) - field.px(90), 0, Modifiers.NONE);
        assertThat(field.model.readingProperty().get()).endsWith("snapped to the mirror of the edge at 50 mm");
        field.desk.drawing().undo();
        field.drag(new Part.EdgeAt(2), field.px(85.3) - field.px(90), 0, Modifiers.NONE);
        assertThat(field.model.readingProperty().get()).endsWith("snapped to halfway between its neighbours");
    }

    @Test
    void snappingCanBeTurnedOff() {
        for (Modifiers off : List.of(ALT, SHORTCUT)) {
            field.drag(new Part.EdgeAt(1), field.px(59.73) - field.px(50), 0, off);
            assertThat(toMm(1)).isCloseTo(59.73, within(0.001));
            undoGivesTheStartBack();
        }
    }

    @Test
    void anEdgeStopsWhereABandWouldBeTooShort() {
        field.drag(new Part.EdgeAt(1), 2000, 0, Modifiers.NONE);
        assertThat(toMm(1)).isEqualTo(89.5);
        assertThat(field.model.readingProperty().get()).contains("no band is shorter than 0.5 mm");
    }

    @Test
    void stepsAlongThePieceFollowUnitAndScale() {
        assertThat(Snapping.stepMm(LengthUnit.MILLIMETRE, 4)).isEqualTo(1);
        assertThat(Snapping.stepMm(LengthUnit.MILLIMETRE, 20)).isEqualTo(0.5);
        assertThat(Snapping.stepMm(LengthUnit.INCH, 4)).isCloseTo(25.4 / 16, within(1e-12));
        assertThat(Snapping.stepMm(LengthUnit.INCH, 20)).isCloseTo(1.27, within(1e-12));
        field.desk.comfort().unitProperty().set(LengthUnit.INCH);
        field.drag(new Part.EdgeAt(0), field.px(2.13 * 25.4) - field.px(30), 0, Modifiers.NONE);
        assertThat(toMm(0)).isLessThanOrEqualTo(49.5);
        assertThat(field.model.readingProperty().get()).contains(" in");
    }

    @Test
    void aLevelGoesUpAndDownInWholeNm() {
        field.drag(new Part.Level(0), 0, field.py(70.4) - field.py(46), Modifiers.NONE);
        assertThat(film(0)).isEqualTo(new DrawnFilm(70, 70));
        String volts = FieldWords.volts(field.model.shown().volts().volts(70));
        assertThat(field.model.readingProperty().get())
                .startsWith("band cup 70 nm · " + volts + " · ")
                .contains("(1)")
                .endsWith("was 46 nm");
        undoGivesTheStartBack();
    }

    @Test
    void aLevelIsLedToItsNeighboursFilm() {
        field.drag(new Part.Level(0), 0, field.py(138.6) - field.py(46), Modifiers.NONE);
        assertThat(film(0).aSideNm()).isEqualTo(140);
        assertThat(field.model.readingProperty().get()).endsWith("snapped to the film of ring");
    }

    @Test
    void withShiftALevelGoesByTheDial() {
        field.drag(new Part.Level(0), 0, field.py(70.37) - field.py(46), SHIFT);
        double volts = field.model.shown().volts().volts(film(0).aSideNm());
        // The dial of this supply has steps of 0.5 V; films are kept to 0.01 nm.
        assertThat(volts).isCloseTo(Math.rint(volts * 2) / 2, within(0.02));
        assertThat(field.model.readingProperty().get()).contains("snapped to the dial at ");
    }

    @Test
    void downToTheBottomMakesItBareAndUpAgainAFilm() {
        field.drag(new Part.Level(0), 0, 400, Modifiers.NONE);
        assertThat(field.design().bands().get(0).wanted()).isEqualTo(new Wanted.Bare());
        assertThat(field.model.readingProperty().get()).contains("stays natural metal");
        field.drag(new Part.Level(0), 0, field.py(50) - field.py(0), Modifiers.NONE);
        assertThat(film(0)).isEqualTo(new DrawnFilm(50, 50));
        field.desk.drawing().undo();
        undoGivesTheStartBack();
    }

    @Test
    void aFadeMovesAsAWholeAndStopsWhereOneSideWouldBeNoFilm() {
        FieldDesk hook = FieldDesk.over("lantern-hook");
        hook.drag(new Part.Level(1), 0, hook.py(82) - hook.py(92), Modifiers.NONE);
        DrawnFilm film = hook.model.shown().films().get(1);
        assertThat(film.aSideNm() - film.bSideNm()).isEqualTo(136);
        assertThat(film.aSideNm()).isEqualTo(150);
        hook.drag(new Part.Level(1), 0, hook.py(20) - hook.py(82), Modifiers.NONE);
        assertThat(hook.model.shown().films().get(1)).isEqualTo(new DrawnFilm(137, 1));
    }

    @Test
    void selectedBandsMoveTogether() {
        field.desk.drawing().select(new Selection(List.of(0, 2, 4), Optional.of(new Part.Level(0))));
        field.drag(new Part.Level(2), 0, field.py(54.2) - field.py(34), Modifiers.NONE);
        assertThat(List.of(film(0).aSideNm(), film(1).aSideNm(), film(2).aSideNm(), film(4).aSideNm()))
                .containsExactly(66.0, 140.0, 54.0, 44.0);
        assertThat(field.desk.drawing().undoNameProperty().get()).isEqualTo("Move 3 bands");
        undoGivesTheStartBack();
    }

    @Test
    void anEndOfALevelBandMakesItAFadeAndBackLevel() {
        field.drag(new Part.FadeEnd(2, End.B), 0, field.py(90.3) - field.py(34), Modifiers.NONE);
        assertThat(film(2)).isEqualTo(new DrawnFilm(34, 90));
        field.drag(new Part.FadeEnd(2, End.B), 0, 0, Modifiers.NONE);
        assertThat(film(2)).isEqualTo(new DrawnFilm(34, 90));
        Handle end = field.handle(new Part.FadeEnd(2, End.B));
        field.drag(end.xPx(), end.yPx(), 0, field.py(34.5) - field.py(90), Modifiers.NONE);
        assertThat(film(2)).isEqualTo(new DrawnFilm(34, 34));
        assertThat(field.model.readingProperty().get()).endsWith("snapped to its other side: a level band");
    }

    @Test
    void anEndCannotBeBareAndSaysWhy() {
        field.drag(new Part.FadeEnd(2, End.B), 0, 400, Modifiers.NONE);
        assertThat(film(2)).isEqualTo(new DrawnFilm(34, 1));
        assertThat(field.model.readingProperty().get()).contains("move the whole band down");
    }

    @Test
    void coloursAndVoltsBecomeFilmsWhenMoved() {
        FieldDesk post = new FieldDesk(TwelveBands.design());
        DrawnFilm before = post.model.shown().films().get(3);
        assertThat(before.aSideNm()).isGreaterThan(10);
        post.drag(new Part.Level(3), 0, post.py(before.aSideNm() + 20) - post.py(before.aSideNm()), ALT);
        assertThat(post.design().bands().get(3).wanted()).isInstanceOf(Wanted.Film.class);
        assertThat(post.model.shown().films().get(3).aSideNm()).isCloseTo(before.aSideNm() + 20, within(0.02));
    }

    @Test
    void escapePutsEverythingBack() {
        for (Part part : List.of(new Part.EdgeAt(1), new Part.Level(1), new Part.FadeEnd(1, End.A))) {
            Selection before = field.desk.drawing().selection();
            Handle handle = field.handle(part);
            field.model.hand().press(handle.xPx(), handle.yPx(), Modifiers.NONE);
            field.model.hand().drag(handle.xPx() + 40, handle.yPx() + 60, Modifiers.NONE);
            assertThat(field.design()).isNotEqualTo(start);
            field.model.hand().cancel();
            assertThat(field.design()).isEqualTo(start);
            assertThat(field.desk.drawing().undoNameProperty().get()).isEmpty();
            assertThat(field.desk.drawing().selection()).isEqualTo(before);
            field.model.hand().drag(handle.xPx() + 90, handle.yPx(), Modifiers.NONE);
            field.model.hand().release();
            assertThat(field.design()).isEqualTo(start);
        }
    }

    @Test
    void aDragLetsGoWhenSomethingElseChangesTheDrawing() {
        Handle handle = field.handle(new Part.EdgeAt(1));
        field.model.hand().press(handle.xPx(), handle.yPx(), Modifiers.NONE);
        field.model.hand().drag(handle.xPx() + 40, handle.yPx(), Modifiers.NONE);
        field.desk.drawing().undo();
        field.model.hand().drag(handle.xPx() + 60, handle.yPx(), Modifiers.NONE);
        assertThat(field.design()).isEqualTo(start);
        assertThat(field.model.hand().busy()).isFalse();
    }

    @Test
    void aPressOnEmptyFieldSelectsTheBandThereAndASweepSeveral() {
        field.click(field.px(70), field.py(100), Modifiers.NONE);
        assertThat(field.desk.drawing().selection()).isEqualTo(Selection.of(new Part.Level(2)));
        field.drag(field.px(70), field.py(100), field.px(130) - field.px(70), 10, Modifiers.NONE);
        assertThat(field.desk.drawing().selection().bands()).containsExactly(2, 3, 4);
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void shortcutAndShiftSelectMore() {
        field.click(field.px(15), field.py(100), Modifiers.NONE);
        field.click(field.px(70), field.py(100), SHORTCUT);
        assertThat(field.desk.drawing().selection().bands()).containsExactly(0, 2);
        field.click(field.px(15), field.py(100), SHORTCUT);
        assertThat(field.desk.drawing().selection().bands()).containsExactly(2);
        field.click(field.px(140), field.py(100), SHIFT);
        assertThat(field.desk.drawing().selection().bands()).containsExactly(2, 3, 4);
    }

    @Test
    void twiceSplitsAndOnAnEdgeChangesItsKind() {
        field.model.hand().pressTwice(field.px(70.3), field.py(100));
        assertThat(field.design().bands()).hasSize(6);
        assertThat(toMm(2)).isEqualTo(70);
        field.desk.drawing().undo();
        Handle edge = field.handle(new Part.EdgeAt(0));
        field.model.hand().pressTwice(edge.xPx(), edge.yPx());
        assertThat(field.design().bands().get(0).edge()).isEqualTo(Edge.SOFT);
        undoGivesTheStartBack();
    }

    @Test
    void whatIsNearestIsTaken() {
        for (Handle handle : field.model.shown().handles()) {
            assertThat(field.model.shown().partAt(handle.xPx(), handle.yPx())).contains(handle.part());
            assertThat(handle.hitPx()).isGreaterThanOrEqualTo(12);
        }
        assertThat(field.model.shown().partAt(field.px(60), field.py(34) - 9)).contains(new Part.Level(2));
        assertThat(field.model.shown().partAt(field.px(50) + 3, field.py(90))).contains(new Part.EdgeAt(1));
        assertThat(field.model.shown().partAt(field.px(70), field.py(100))).isEmpty();
        field.desk.comfort().textPercentProperty().set(200);
        assertThat(field.model.shown().handles().get(0).hitPx()).isEqualTo(24);
    }

    @Test
    void aMarkOfANearFilmIsTakenByOneClick() {
        Colours colours = field.desk.work().coloursProperty().get();
        List<Match> near = new ColourMatch(colours.palette(), colours.scale())
                .find(Srgb.ofHex("#3f4f9a").lab(), 2)
                .bestFirst();
        field.matches.set(near);
        assertThat(field.model.shown().marks()).hasSameSizeAs(near);
        MatchMark mark = field.model.shown().marks().get(0);
        field.click(mark.labelLeftPx() + 5, mark.labelTopPx() + 5, Modifiers.NONE);
        assertThat(field.taken).containsExactly(mark.match());
        assertThat(mark.text()).contains(" nm · ").contains(" V · dE00 ");
        assertThat(field.design()).isEqualTo(start);
        for (int i = 1; i < field.model.shown().marks().size(); i++) {
            MatchMark above = field.model.shown().marks().get(i - 1);
            MatchMark below = field.model.shown().marks().get(i);
            assertThat(below.labelTopPx()).isGreaterThanOrEqualTo(above.labelTopPx() + above.labelHeightPx() - 1e-9);
        }
    }

    @Test
    void theHandReadsWhatIsUnderIt() {
        field.model.hand().hover(field.px(42.5), field.py(62));
        assertThat(field.model.readingProperty().get())
                .startsWith("42.5 mm · 62 nm · ")
                .contains(" V · ")
                .endsWith("on band ring");
        field.model.hand().leave();
        assertThat(field.model.readingProperty().get()).isEmpty();
    }

    @Test
    void whatIsOutOfReachSaysSo() {
        double aboveNm = field.model.shown().volts().ceilingNm() * 1.05;
        field.model.hand().hover(field.px(42.5), field.py(aboveNm));
        assertThat(field.model.readingProperty().get()).contains("out of reach, the most is ");
    }

    @Test
    void panningMovesOnlyTheView() {
        field.model.sight().zoomAlong(10, field.px(75));
        double fromMm = field.model.viewportProperty().get().fromMm();
        field.model.hand().pressToPan(500, 200);
        field.model.hand().drag(400, 200, Modifiers.NONE);
        assertThat(field.model.viewportProperty().get().fromMm()).isGreaterThan(fromMm);
        field.model.hand().cancel();
        assertThat(field.model.viewportProperty().get().fromMm()).isEqualTo(fromMm);
        assertThat(field.design()).isEqualTo(start);
    }

    @Test
    void sixtyBandsAreTheMost() {
        Design many = start;
        while (many.bands().size() < BandEdits.MOST_BANDS) {
            int longest = 0;
            for (int i = 0; i < many.bands().size(); i++) {
                if (lengthMm(many, i) > lengthMm(many, longest)) {
                    longest = i;
                }
            }
            many = BandEdits.split(
                    many,
                    longest,
                    (many.bands().get(longest).fromMm()
                                    + many.bands().get(longest).toMm())
                            / 2);
        }
        FieldDesk full = new FieldDesk(many);
        full.model.edits().split(0, 1);
        assertThat(full.design()).isEqualTo(many);
        assertThat(full.model.messageProperty().get()).startsWith("60 bands are the most");
    }

    private static double lengthMm(Design design, int band) {
        return design.bands().get(band).toMm() - design.bands().get(band).fromMm();
    }
}
