package tideband.window.pacer;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.bench.PacedPlans;
import tideband.match.FilmColour;
import tideband.pacer.Call;
import tideband.pacer.PaceState;
import tideband.pacer.Tone;
import tideband.sheet.Figures;
import tideband.window.comfort.ComfortModel;

class PacerModelTest {
    private long nanos = 42;
    private final ComfortModel comfort = new ComfortModel();

    private PacerModel model(String name, int immersion) {
        BenchPlan plan = PacedPlans.shipped(name);
        return new PacerModel(plan, Colours.of(plan.design()), immersion, comfort, () -> nanos);
    }

    private void pass(double seconds) {
        nanos += Math.round(seconds * 1e9);
    }

    private static void ready(PacerModel model) {
        while (model.state() instanceof PaceState.Preparing) {
            model.perform(PacerAct.CONFIRM);
        }
    }

    @Test
    void theBoardSaysWhatTheTableSaysAtEveryMark() {
        Locale before = Locale.getDefault();
        Locale.setDefault(Locale.GERMANY);
        try {
            PacerModel model = model("wick-pin", 0);
            ready(model);
            pass(5);
            double atS = 0;
            List<Call> calls = model.script().calls();
            for (Call call : calls.subList(0, calls.size() - 1)) {
                pass(call.dueS() - atS);
                atS = call.dueS();
                model.poll();
                Board board = model.board();
                assertThat(board.words()).isEqualTo(call.words());
                assertThat(board.target()).isEqualTo(call.target());
                Board.Dials dials = board.dials().orElseThrow();
                assertThat(dials.volts()).isEqualTo(call.volts());
                assertThat(dials.depth())
                        .isEqualTo(Figures.fixed(call.mark().row().depthMm(), 1));
                FilmColour colour = model.colours().ofFilm(call.mark().row().filmNm());
                assertThat(dials.film())
                        .endsWith(colour.name().text() + " (" + colour.order() + ")")
                        .contains(Figures.fixed(call.mark().row().filmNm(), 1) + " nm");
                // wick-pin stands in a narrow vessel.
                assertThat(dials.travel())
                        .isEqualTo(Figures.fixed(call.mark().row().travelMm(), 1));
                assertThat(model.announcementProperty().get()).contains(call.line());
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void secondsAreNeverLessThanAreLeft() {
        PacerModel model = model("lantern-hook", 0);
        ready(model);
        pass(5 + 0.01);
        model.poll();
        assertThat(model.board().dials().orElseThrow().seconds()).isEqualTo("30");
        pass(20.5);
        model.poll();
        assertThat(model.board().dials().orElseThrow().seconds()).isEqualTo("9.5");
    }

    @Test
    void soundsAreMutedByTheUsersChoice() {
        PacerModel model = model("lantern-hook", 0);
        ready(model);
        pass(5);
        assertThat(model.poll()).contains(Tone.SUPPLY);
        model.perform(PacerAct.MUTE);
        assertThat(comfort.mutedProperty().get()).isTrue();
        pass(30);
        assertThat(model.poll()).isEmpty();
        assertThat(model.perform(PacerAct.PAUSE)).isEmpty();
        model.perform(PacerAct.MUTE);
        assertThat(model.perform(PacerAct.ABORT)).contains(Tone.ALARM);
    }

    @Test
    void pauseWithVoltsOnTurnsTheSupplyOffFirst() {
        PacerModel model = model("lantern-hook", 0);
        ready(model);
        pass(5 + 20);
        model.poll();
        model.perform(PacerAct.PAUSE);
        assertThat(model.board().words()).isEqualTo("SUPPLY OFF");
        assertThat(model.board().urgent()).isTrue();
        model.perform(PacerAct.RESUME);
        pass(5 + 12);
        model.poll();
        model.perform(PacerAct.PAUSE);
        assertThat(model.board().words()).isEqualTo("PAUSED");
        assertThat(model.board().target()).isEqualTo("supply stays off");
    }

    @Test
    void onlyWhatIsOfferedIsDone() {
        PacerModel model = model("snuffer-handle", 0);
        assertThat(model.board().acts())
                .contains(PacerAct.CONFIRM, PacerAct.LEAVE)
                .doesNotContain(PacerAct.ABORT);
        model.perform(PacerAct.ABORT);
        model.perform(PacerAct.PAUSE);
        assertThat(model.state()).isEqualTo(new PaceState.Preparing(0, 0));
        model.perform(PacerAct.CONFIRM);
        model.perform(PacerAct.BACK);
        assertThat(model.state()).isEqualTo(new PaceState.Preparing(0, 0));
        ready(model);
        assertThat(model.underWay()).isTrue();
        assertThat(model.board().acts()).doesNotContain(PacerAct.LEAVE);
        pass(1000);
        model.poll();
        assertThat(model.state()).isInstanceOf(PaceState.Finished.class);
        assertThat(model.underWay()).isFalse();
        assertThat(model.board().acts()).contains(PacerAct.NEXT, PacerAct.LEAVE);
        assertThat(model.nextImmersion()).hasValue(1);
        assertThat(model.paceAnother(2, () -> nanos).nextImmersion()).isEmpty();
    }

    @Test
    void everyActOfEveryStateHasAKeyOfItsOwn() {
        PacerModel model = model("carry-bail", 0);
        List<Board> boards = new ArrayList<>(List.of(model.board()));
        ready(model);
        boards.add(model.board());
        pass(40);
        model.poll();
        boards.add(model.board());
        model.perform(PacerAct.PAUSE);
        boards.add(model.board());
        model.perform(PacerAct.ABORT);
        boards.add(model.board());
        for (Board board : boards) {
            assertThat(board.acts().stream().map(PacerAct::key)).doesNotHaveDuplicates();
        }
    }

    @Test
    void theLookIsDarkAtFirstWhateverTheWindowIs() {
        PacerModel model = model("carry-bail", 0);
        assertThat(model.look().darkProperty().get()).isTrue();
        model.perform(PacerAct.LIGHT);
        assertThat(model.look().darkProperty().get()).isFalse();
        assertThat(comfort.darkProperty().get()).isFalse();
    }
}
