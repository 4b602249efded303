package tideband.optics;

import java.util.List;
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
import org.openjdk.jmh.infra.Blackhole;
import tideband.colour.Viewing;
import tideband.colour.Xyz;

/** How long 1001 films at 81 wavelengths take to become XYZ, CIELAB and sRGB, on one thread. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class FilmColourBenchmark {

    /** The metal. */
    @Param({"titanium", "niobium", "tantalum"})
    String metal;

    private final Viewing viewing = Viewing.daylight();
    private Surface surface;

    /** Reads the optical constants. */
    @Setup
    public void prepare() {
        surface = new Surface(FilmSystem.of(metal, 1), Finish.MIRROR, 0);
    }

    /**
     * Films 0 to 250 nm every 0.25 nm, as far as the screen colour.
     *
     * @param sink takes the colours
     */
    @Benchmark
    public void xyzLabAndSrgb(Blackhole sink) {
        for (Xyz xyz : FilmSeries.colours(surface, viewing, 0.25, 1001)) {
            sink.consume(viewing.lab(xyz));
            sink.consume(viewing.srgb(xyz));
        }
    }

    /**
     * The same films, only as far as the tristimulus values.
     *
     * @return the values
     */
    @Benchmark
    public List<Xyz> xyzAlone() {
        return FilmSeries.colours(surface, viewing, 0.25, 1001);
    }
}
