package tideband.window.piece;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.bench.Work;
import tideband.colour.Srgb;
import tideband.match.Palette;
import tideband.optics.FilmSystem;
import tideband.trial.TrialCell;
import tideband.window.work.Answer;

class PiecePainterTest {
    private static final int WIDTH = 900;
    private static final int HEIGHT = 160;

    private final int[] argb = new int[WIDTH * HEIGHT];
    private final PiecePainter painter = new PiecePainter();

    /** Property: in even light, straight on, every pixel inside a flat is the colour the trial gives its cell. */
    @Test
    void aFlatStraightOnShowsTheTrialsColoursExactly() {
        PieceDesk desk = desk("vent-plate", 0);
        Frame frame = paint(desk);
        int seen = 0;
        for (int x = 0; x < WIDTH; x++) {
            double atMm = frame.view().mm(x + 0.5);
            if (atMm > 0 && atMm < frame.piece().lengthMm()) {
                String hex = colours(desk).hexOf(cellAt(desk, atMm).lab());
                int reach = (int) (frame.piece().sizeMm(atMm) / 2 * frame.acrossPxPerMm()) - 4;
                for (int y = HEIGHT / 2 - reach; y < HEIGHT / 2 + reach; y++) {
                    assertThat(hex(x, y)).as("pixel %d, %d", x, y).isEqualTo(hex);
                    seen++;
                }
            }
        }
        assertThat(seen).isGreaterThan(20_000);
    }

    /** Property: the same along the middle of a round piece. */
    @ParameterizedTest
    @ValueSource(strings = {"lantern-hook", "burner-tube", "wick-pin", "chimney-post"})
    void theMiddleOfARoundPieceStraightOnShowsTheTrialsColours(String name) {
        PieceDesk desk = desk(name, 0);
        Frame frame = paint(desk);
        for (int x = 0; x < WIDTH; x++) {
            double atMm = frame.view().mm(x + 0.5);
            if (atMm > 0 && atMm < frame.piece().lengthMm()) {
                Srgb trial = Srgb.ofHex(colours(desk).hexOf(cellAt(desk, atMm).lab()));
                // The rows beside the axis are turned by half a pixel, which is a few degrees on a thin piece.
                assertNear(x, HEIGHT / 2, trial, 2);
            }
        }
    }

    /** Property: off the axis and tilted, a pixel is what a palette computes at the angle geometry gives. */
    @ParameterizedTest
    @ValueSource(doubles = {0, 30, 45, 70})
    void aTiltedRoundShowsWhatPalettesComputeAtEachTurn(double tiltDeg) {
        PieceDesk desk = desk("wick-key", tiltDeg);
        Frame frame = paint(desk);
        double atMm = 70;
        double filmNm = cellAt(desk, atMm).filmNm();
        double halfPx = frame.piece().sizeMm(atMm) / 2 * frame.acrossPxPerMm();
        int x = (int) frame.view().px(atMm);
        for (int y = HEIGHT / 2 - (int) (0.9 * halfPx); y < HEIGHT / 2 + 0.9 * halfPx; y += 3) {
            double share = (y + 0.5 - HEIGHT / 2.0) / halfPx;
            double cosine = Math.sqrt(1 - share * share) * Math.cos(Math.toRadians(tiltDeg));
            Palette palette = paletteAt(desk, Math.toDegrees(Math.acos(cosine)));
            assertNear(x, y, Srgb.ofHex(palette.at(filmNm).srgbHex()), 3);
        }
    }

    /** Property: a tilted flat is all of one angle. */
    @Test
    void aTiltedFlatShowsThePaletteOfItsTilt() {
        PieceDesk desk = desk("vent-plate", 60);
        Frame frame = paint(desk);
        double atMm = 90;
        Palette palette = paletteAt(desk, 60);
        Srgb computed = Srgb.ofHex(palette.at(cellAt(desk, atMm).filmNm()).srgbHex());
        assertNear((int) frame.view().px(atMm), HEIGHT / 2 - 30, computed, 1);
        assertNear((int) frame.view().px(atMm), HEIGHT / 2 + 30, computed, 1);
    }

    @Test
    void wantedStandsAbovePredicted() {
        PieceDesk desk = desk("wick-key", 0);
        desk.model().comparisonProperty().set(Comparison.BOTH);
        Frame frame = paint(desk);
        int x = (int) frame.view().px(20);
        assertNear(x, HEIGHT / 2 - 2, Srgb.ofHex("#3f4f9a"), 2);
        Srgb predicted = Srgb.ofHex(colours(desk).hexOf(cellAt(desk, 20).lab()));
        assertNear(x, HEIGHT / 2 + 1, predicted, 2);
    }

    @Test
    void nothingIsPaintedBesideThePiece() {
        PieceDesk desk = desk("wick-key", 0);
        Frame frame = paint(desk);
        assertThat(argb[HEIGHT / 2 * WIDTH + (int) frame.view().px(0) - 2]).isZero();
        assertThat(argb[HEIGHT / 2 * WIDTH + (int) frame.view().px(90) + 2]).isZero();
        assertThat(argb[2 * WIDTH + WIDTH / 2]).isZero();
    }

    @Test
    void aPieceOutOfViewLeavesThePictureClear() {
        PieceDesk desk = desk("wick-key", 45);
        Frame frame = desk.frame(WIDTH, HEIGHT);
        for (double fromMm : new double[] {-5000, 5000}) {
            Frame away = new Frame(
                    new tideband.window.drawing.Viewport(0, 5, fromMm),
                    frame.centrePx(),
                    frame.acrossPxPerMm(),
                    frame.piece(),
                    frame.finish(),
                    frame.upper(),
                    frame.lower(),
                    frame.table(),
                    45,
                    Lamps.ONE);
            painter.paint(argb, WIDTH, HEIGHT, away);
            assertThat(argb).containsOnly(0);
        }
    }

    private static PieceDesk desk(String name, double tiltDeg) {
        PieceDesk desk = PieceDesk.with(name);
        desk.model().lampsProperty().set(Lamps.EVEN);
        desk.model().tiltDegProperty().set(tiltDeg);
        return desk;
    }

    private Frame paint(PieceDesk desk) {
        Frame frame = desk.frame(WIDTH, HEIGHT);
        painter.paint(argb, WIDTH, HEIGHT, frame);
        return frame;
    }

    private static Answer answer(PieceDesk desk) {
        return desk.desk().work().answerProperty().get().orElseThrow();
    }

    private static Colours colours(PieceDesk desk) {
        return answer(desk).colours();
    }

    private static TrialCell cellAt(PieceDesk desk, double atMm) {
        BenchPlan plan = ((Work.Worked) answer(desk).work()).plan();
        return plan.trial().cells().stream()
                .filter(cell -> atMm < cell.toMm())
                .findFirst()
                .orElseThrow();
    }

    private static Palette paletteAt(PieceDesk desk, double angleDeg) {
        Answer answer = answer(desk);
        return new Palette(
                FilmSystem.of(
                        answer.design().metal().opticsKey(),
                        answer.design().bath().indexScale()),
                answer.design().finish(),
                answer.colours().viewing(),
                angleDeg,
                answer.colours().palette().maxNm());
    }

    private String hex(int x, int y) {
        return String.format(Locale.ROOT, "#%06x", argb[y * WIDTH + x] & 0xffffff);
    }

    private void assertNear(int x, int y, Srgb expected, int steps) {
        Srgb shown = Srgb.ofHex(hex(x, y));
        double off = Math.max(
                Math.abs(shown.red() - expected.red()),
                Math.max(Math.abs(shown.green() - expected.green()), Math.abs(shown.blue() - expected.blue())));
        assertThat(off * 255)
                .as("pixel %d, %d: %s beside %s", x, y, shown.hex(), expected.hex())
                .isLessThanOrEqualTo(steps + 0.01);
    }
}
