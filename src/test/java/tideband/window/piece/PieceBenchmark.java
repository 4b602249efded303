package tideband.window.piece;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tideband.bench.Work;
import tideband.window.work.Answer;

/** How long a picture of a tapered round piece with a long fade takes, and what comes before it. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class PieceBenchmark {

    /** Width and height of the picture in px. */
    @Param({"1000x120", "3600x300"})
    String size;

    /** The tilt in degrees. */
    @Param({"0", "45"})
    double tiltDeg;

    private final PiecePainter painter = new PiecePainter();
    private int width;
    private int height;
    private int[] argb;
    private Frame frame;
    private Answer answer;

    /** Works the lantern hook out; {@code designs} must be below the working directory. */
    @Setup
    public void prepare() {
        if (!Path.of("designs").toFile().isDirectory()) {
            throw new IllegalStateException("run this from the project's folder");
        }
        String[] sides = size.split("x", 2);
        width = Integer.parseInt(sides[0]);
        height = Integer.parseInt(sides[1]);
        argb = new int[width * height];
        PieceDesk desk = PieceDesk.with("lantern-hook");
        desk.model().tiltDegProperty().set(tiltDeg);
        Frame plain = desk.frame(width, height);
        // As tall as the picture, which is the most there can be to paint.
        double across =
                (height - 4) / plain.piece().largestSizeMm(0, plain.piece().lengthMm());
        frame = new Frame(
                plain.view(),
                plain.centrePx(),
                across,
                plain.piece(),
                plain.finish(),
                plain.upper(),
                plain.lower(),
                plain.table(),
                plain.tiltDeg(),
                plain.lamps());
        answer = desk.desk().work().answerProperty().get().orElseThrow();
    }

    /**
     * Paints the picture anew, as after every move of the tilt or of an edge.
     *
     * @return the picture
     */
    @Benchmark
    public int[] repaint() {
        painter.paint(argb, width, height, frame);
        return argb;
    }

    /**
     * Makes an answer ready to be painted: its strip and its readings.
     *
     * @return the readings and the strip
     */
    @Benchmark
    public Object takeAnswer() {
        AsDrawn drawn = AsDrawn.of(answer.design(), answer.colours());
        Work.Worked worked = (Work.Worked) answer.work();
        return Optional.of(
                new Object[] {Readings.of(drawn, worked), Strip.of(worked.plan().trial(), answer.colours())});
    }
}
