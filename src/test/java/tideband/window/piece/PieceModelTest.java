package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.List;
import java.util.stream.Collectors;
import javafx.scene.input.KeyCombination;
import org.junit.jupiter.api.Test;
import tideband.bench.Colours;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.optics.Finish;
import tideband.window.Desk;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.comfort.LengthUnit;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

class PieceModelTest {

    @Test
    void readsEveryBandInWords() {
        PieceModel model = PieceDesk.straightOn("wick-key").model();
        assertThat(model.readingsProperty().get()).hasSize(2);
        BandReading bit = model.readingsProperty().get().get(0);
        assertThat(bit.title()).isEqualTo("1 bit");
        assertThat(bit.wantedHex()).isEqualTo("#3f4f9a");
        assertThat(bit.colourWords()).isEqualTo("deep blue (1)");
        BandReading.Predicted predicted = bit.predicted().orElseThrow();
        assertThat(predicted.filmNm()).isCloseTo(bit.filmWantedNm(), within(0.5));
        // The colour asked for is not one a film reaches, and that counts.
        assertThat(predicted.de00Median()).isGreaterThan(2);
        assertThat(predicted.nearness()).isEqualTo(Nearness.NEAR);
        assertThat(bit.sentences("0 mm", "40 mm"))
                .startsWith("Band 1 bit, 0 mm to 40 mm. Wanted: deep blue (1), 42.")
                .contains("(near)");
    }

    @Test
    void aFadeIsReadFromSideToSideAndBareMetalAsBare() {
        List<BandReading> readings =
                PieceDesk.straightOn("lantern-hook").model().readingsProperty().get();
        assertThat(readings.get(1).colourWords()).isEqualTo("blue (2) to gold (1)");
        assertThat(readings.get(1).filmWords()).isEqualTo("160.0–24.0 nm");
        assertThat(readings.get(3).colourWords()).isEqualTo("bare metal");
        assertThat(readings.get(3).predicted().orElseThrow().de00Worst()).isLessThan(0.01);
    }

    @Test
    void aPlaceIsReadInOneLine() {
        PieceDesk desk = PieceDesk.straightOn("wick-key");
        PlaceReading reading = desk.model().readingAt(62.3).orElseThrow();
        assertThat(reading.line(desk.model().length(62.3)))
                .matches("62\\.3 mm · 11[12]\\.\\d nm · yellow \\(2\\) · dE00 0\\.\\d");
        assertThat(desk.model().readingAt(-0.1)).isEmpty();
        assertThat(desk.model().readingAt(90.1)).isEmpty();
        assertThat(desk.model().readingAt(Double.NaN)).isEmpty();
        desk.model().comparisonProperty().set(Comparison.WANTED);
        assertThat(desk.model().readingAt(62.3).orElseThrow().de00()).isEmpty();
        desk.desk().comfort().unitProperty().set(LengthUnit.INCH);
        assertThat(desk.model().length(25.4)).isEqualTo("1 in");
    }

    @Test
    void whatCannotBeMadeIsShownAsWantedAndSaid() {
        PieceDesk desk = PieceDesk.straightOn("lantern-hook");
        desk.desk().drawing().change("Raise", d -> BandEdits.want(d, List.of(0), new Wanted.Film(900, 900)));
        Portrait portrait = desk.model().portraitProperty().get();
        assertThat(portrait.note()).isEqualTo("as wanted – it cannot be made as drawn");
        assertThat(portrait.split()).isFalse();
        assertThat(portrait.lower().get(0).known()).isFalse();
        assertThat(portrait.lower().get(1).known()).isTrue();
        BandReading tip = desk.model().readingsProperty().get().get(0);
        assertThat(tip.predicted()).isEmpty();
        assertThat(tip.wantedHex()).isEqualTo("unknown");
        assertThat(tip.sentences("0 mm", "30 mm"))
                .endsWith("Nothing is predicted: the design cannot be made as drawn.");
        assertThat(desk.model().readingAt(5).orElseThrow().colour()).isEqualTo("colour not known");
        desk.desk().drawing().undo();
        assertThat(desk.model().portraitProperty().get().note()).isEmpty();
    }

    @Test
    void differencesAgreeWithTheTrial() {
        PieceDesk desk = PieceDesk.straightOn("snuffer-handle");
        assertThat(desk.model().differencesProperty().get()).isEmpty();
        desk.model().differenceShownProperty().set(true);
        BandReading cup = desk.model().readingsProperty().get().get(0);
        double[] inBand = desk.model().differencesProperty().get().stream()
                .filter(point -> point.atMm() < cup.toMm())
                .mapToDouble(Differences.Point::de00)
                .sorted()
                .toArray();
        assertThat(inBand[inBand.length / 2])
                .isCloseTo(cup.predicted().orElseThrow().de00Median(), within(0.05));
    }

    @Test
    void theHolderKeepsTheEndDryThatIsUp() {
        assertThat(PieceDesk.straightOn("wick-pin")
                        .model()
                        .portraitProperty()
                        .get()
                        .dry())
                .containsExactly(new Portrait.Dry(62, 70));
        assertThat(PieceDesk.straightOn("carry-bail")
                        .model()
                        .portraitProperty()
                        .get()
                        .dry())
                .containsExactlyInAnyOrder(new Portrait.Dry(0, 10), new Portrait.Dry(210, 220));
    }

    @Test
    void aBandIsSelectedWhereThePieceIsClicked() {
        PieceDesk desk = PieceDesk.straightOn("lantern-hook");
        desk.model().selectAt(130);
        assertThat(desk.desk().drawing().selection().bands()).containsExactly(2);
        desk.model().selectAt(500);
        assertThat(desk.desk().drawing().selection().bands()).containsExactly(2);
    }

    @Test
    void commandsDoWhatTheySayAndHaveKeysOfTheirOwn() {
        PieceModel model = PieceDesk.straightOn("wick-key").model();
        List<Command> commands = model.commands();
        assertThat(commands.stream().map(c -> KeyCombination.valueOf(c.key())).collect(Collectors.toSet()))
                .hasSize(commands.size());
        Command more = commands.get(0);
        Command straight = commands.get(2);
        assertThat(straight.possible().get()).isFalse();
        for (int i = 0; i < 20; i++) {
            more.act().run();
        }
        assertThat(model.tiltDegProperty().get()).isEqualTo(TiltModel.MOST_DEG);
        assertThat(more.possible().get()).isFalse();
        commands.get(1).act().run();
        assertThat(model.tiltDegProperty().get()).isEqualTo(75);
        straight.act().run();
        assertThat(model.tiltDegProperty().get()).isZero();
        assertThat(commands.get(3).name().getValue()).isEqualTo("Show piece: wanted");
        commands.get(3).act().run();
        assertThat(model.comparisonProperty().get()).isEqualTo(Comparison.WANTED);
        commands.get(4).act().run();
        assertThat(model.lampsProperty().get()).isEqualTo(Lamps.TWO);
        commands.get(5).act().run();
        assertThat(model.differenceShownProperty().get()).isTrue();
    }

    @Test
    void theTableIsBuiltAngleByAngleAndKeptWhileColoursStay() {
        Desk desk = Desk.with("wick-key");
        Deque<Runnable> beside = new ArrayDeque<>();
        PieceModel model = new PieceModel(
                desk.drawing(), desk.work(), desk.tilt(), desk.comfort(), beside::add, Runnable::run, task -> {});
        for (int angle = 0; angle < AngleTable.ANGLES; angle++) {
            assertThat(model.tableProperty().get()).isEmpty();
            beside.remove().run();
        }
        AngleTable table = model.tableProperty().get().orElseThrow();
        desk.drawing().change("Move edge", d -> BandEdits.moveEdge(d, 0, 44));
        assertThat(beside).isEmpty();
        assertThat(model.tableProperty().get()).containsSame(table);
        desk.drawing().change("Finish", d -> withFinish(d, Finish.MIRROR));
        assertThat(model.tableProperty().get()).isEmpty();
        assertThat(beside).hasSize(1);
    }

    private static tideband.design.Design withFinish(tideband.design.Design d, Finish finish) {
        return new tideband.design.Design(
                d.title(),
                d.metal(),
                finish,
                d.light(),
                d.observer(),
                d.piece(),
                d.holding(),
                d.bands(),
                d.bath(),
                d.supply(),
                d.vessel(),
                d.bench(),
                d.order(),
                d.pull());
    }

    /** A desk whose planner waits until it is told. */
    private static final class SlowDesk {
        final DrawingModel drawing = new DrawingModel(Desk.shipped("snuffer-handle"));
        final Deque<Runnable> planning = new ArrayDeque<>();
        final Deque<Runnable> later = new ArrayDeque<>();
        final WorkModel work =
                new WorkModel(drawing.designProperty(), Colours.of(drawing.design()), planning::add, Runnable::run);
        final TiltModel tilt = new TiltModel(work, Runnable::run, Runnable::run);
        final PieceModel model =
                new PieceModel(drawing, work, tilt, new ComfortModel(), Runnable::run, Runnable::run, later::add);

        void patienceRunsOut() {
            List<Runnable> waited = List.copyOf(later);
            later.clear();
            waited.forEach(Runnable::run);
        }
    }

    @Test
    void beforeTheFirstAnswerColoursAreShownAsWanted() {
        SlowDesk desk = new SlowDesk();
        assertThat(desk.model.portraitProperty().get().note()).isEqualTo("as wanted – the prediction follows");
        assertThat(desk.model.readingsProperty().get()).isEmpty();
        desk.planning.remove().run();
        assertThat(desk.model.portraitProperty().get().note()).isEmpty();
        assertThat(desk.model.readingsProperty().get()).hasSize(5);
    }

    @Test
    void aPredictionStaysForAMomentAndThenGivesWayToWhatIsWanted() {
        SlowDesk desk = new SlowDesk();
        desk.planning.remove().run();
        desk.patienceRunsOut();
        Portrait first = desk.model.portraitProperty().get();
        desk.drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 40));
        assertThat(desk.model.portraitProperty().get()).isSameAs(first);
        desk.patienceRunsOut();
        assertThat(desk.model.behindProperty().get()).isTrue();
        assertThat(desk.model.portraitProperty().get().note()).isEqualTo("as wanted – the prediction follows");
        assertThat(desk.model.portraitProperty().get().lower().get(0).toMm()).isEqualTo(40);
        desk.drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 42));
        assertThat(desk.model.portraitProperty().get().lower().get(0).toMm()).isEqualTo(42);
        desk.planning.remove().run();
        assertThat(desk.model.behindProperty().get()).isFalse();
        assertThat(desk.model.portraitProperty().get().note()).isEmpty();
    }

    @Test
    void anAnswerInTimeIsNotFollowedByWhatIsWanted() {
        SlowDesk desk = new SlowDesk();
        desk.planning.remove().run();
        desk.drawing.change("Move edge", d -> BandEdits.moveEdge(d, 0, 40));
        desk.planning.remove().run();
        desk.patienceRunsOut();
        assertThat(desk.model.behindProperty().get()).isFalse();
    }
}
