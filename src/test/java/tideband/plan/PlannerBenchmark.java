package tideband.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tideband.design.Order;

/**
 * Planning random drawings, one after another. Each batch takes every drawing once, so p50 and p100 of the sample are the
 * median and the worst. The plain search goes over the same states without a bound; it is shown at 8 bands, beyond which
 * it takes too long.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.SampleTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Fork(1)
@Warmup(iterations = 1, time = 20)
@Measurement(iterations = 1, time = 60)
public class PlannerBenchmark {

    /** Bands and how many drawings. */
    @Param({"8x200", "12x1000", "30x20", "60x10"})
    public String drawings;

    private final List<Problem> thickerFirst = new ArrayList<>();
    private final List<Problem> leastMinutes = new ArrayList<>();
    private int next;

    /** Draws the drawings. */
    @Setup(Level.Trial)
    public void draw() {
        int bands = Integer.parseInt(drawings.substring(0, drawings.indexOf('x')));
        int count = Integer.parseInt(drawings.substring(drawings.indexOf('x') + 1));
        Random random = new Random(2026);
        for (int i = 0; i < count; i++) {
            Problem problem = Drawings.possible(random, bands, Order.THICKER_FIRST);
            thickerFirst.add(problem);
            leastMinutes.add(problem.under(Order.LEAST_MINUTES));
        }
    }

    private Problem next(List<Problem> problems) {
        next = (next + 1) % problems.size();
        return problems.get(next);
    }

    /**
     * Thicker first, with what the other order would save.
     *
     * @return the outcome
     */
    @Benchmark
    public Outcome thickerFirst() {
        return Planner.plan(next(thickerFirst));
    }

    /**
     * Thicker first alone.
     *
     * @return the outcome
     */
    @Benchmark
    public Outcome thickerFirstAlone() {
        return Planner.planThisOrderOnly(next(thickerFirst), () -> false);
    }

    /**
     * Least minutes.
     *
     * @return the outcome
     */
    @Benchmark
    public Outcome leastMinutes() {
        return Planner.plan(next(leastMinutes));
    }

    /**
     * Thicker first by plain uniform-cost search; only for 8 bands.
     *
     * @return the way found
     */
    @Benchmark
    public Optional<Exhaustive.Way> plainThickerFirst() {
        return plain(next(thickerFirst));
    }

    /**
     * Least minutes by plain uniform-cost search; only for 8 bands.
     *
     * @return the way found
     */
    @Benchmark
    public Optional<Exhaustive.Way> plainLeastMinutes() {
        return plain(next(leastMinutes));
    }

    private static Optional<Exhaustive.Way> plain(Problem problem) {
        if (problem.stretches().size() > 8) {
            throw new IllegalArgumentException("the plain search is shown at 8 bands only");
        }
        return new Exhaustive(problem).least();
    }
}
