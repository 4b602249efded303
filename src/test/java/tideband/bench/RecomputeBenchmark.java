package tideband.bench;

import java.nio.charset.StandardCharsets;
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
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.plan.KnownBound;

/**
 * How long a drawing of twelve bands takes from design to trial, as after every move of a hand that draws: films matched,
 * immersions planned, pulls worked out, the plan tried on 400 cells. The aim is a picture's time: 95 of 100 within 16 ms.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 3)
@Measurement(iterations = 3, time = 5)
public class RecomputeBenchmark {
    private static final String LANTERN_POST = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern post, twelve bands",
              "metal": "titanium", "finish": "satin",
              "piece": { "shape": "round", "stations": [
                { "at_mm": 0, "size_mm": 5 }, { "at_mm": 120, "size_mm": 8 }, { "at_mm": 200, "size_mm": 8 } ] },
              "holding": { "ends_down": ["A", "B"], "dry_mm": 8 },
              "bands": [
                { "to_mm": 16,  "film_nm": 150,       "edge": "soft" },
                { "to_mm": 40,  "film_nm": [150, 90], "edge": "soft" },
                { "to_mm": 55,  "film_nm": 90,        "edge": "crisp" },
                { "to_mm": 68,  "colour": "#3f4f9a",  "edge": "soft" },
                { "to_mm": 80,  "film_nm": 112,       "edge": "crisp" },
                { "to_mm": 96,  "bare": true,         "edge": "crisp" },
                { "to_mm": 110, "film_nm": 60,        "edge": "soft" },
                { "to_mm": 126, "film_nm": [60, 130], "edge": "soft" },
                { "to_mm": 140, "film_nm": 130,       "edge": "crisp" },
                { "to_mm": 156, "volts": 45,          "edge": "soft" },
                { "to_mm": 180, "film_nm": [84, 120], "edge": "soft" },
                { "to_mm": 200, "film_nm": 120 }
              ],
              "supply": { "max_volts": 120, "max_amps": 3, "dial_volts": 0.1 },
              "pull": { "fade": "%s" }
            }
            """;

    /** How fades are pulled. */
    @Param({"ramped", "fixed-volts", "stepped"})
    String fade;

    private final KnownBound known = new KnownBound();
    private Design design;
    private Colours colours;

    /** Reads the design and builds its colours, which stay while only bands change. */
    @Setup
    public void prepare() {
        byte[] file = LANTERN_POST.formatted(fade).getBytes(StandardCharsets.UTF_8);
        if (!(DesignFile.read(file, Optional.empty()) instanceof Reading.Read<Design> read)) {
            throw new IllegalStateException("the design of this benchmark is at fault");
        }
        design = read.value();
        colours = Colours.of(design);
    }

    /**
     * The whole job but for the colours.
     *
     * @return what comes of it
     */
    @Benchmark
    public Work recompute() {
        return new BenchPlanner(design, colours).work(stage -> {}, () -> false);
    }

    /**
     * The whole job as it is done while the design is being drawn, without what the other order would save.
     *
     * @return what comes of it
     */
    @Benchmark
    public Work whileDrawing() {
        return new BenchPlanner(design, colours).workWhileDrawing(() -> false);
    }

    /**
     * The same again and again, as while a hand draws: the bound found once is kept.
     *
     * @return what comes of it
     */
    @Benchmark
    public Work whileDrawingOn() {
        return new BenchPlanner(design, colours, known).workWhileDrawing(() -> false);
    }

    /**
     * The colours alone, as when metal, finish, light or bath change.
     *
     * @return the colours
     */
    @Benchmark
    public Colours coloursAnew() {
        return Colours.of(design);
    }
}
