package tideband.window.order;

import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import tideband.window.Desk;
import tideband.window.comfort.LengthUnit;

/** How long the cards of twelve bands and many immersions take to follow a new answer; the aim is well under 5 ms. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 2)
@Measurement(iterations = 3, time = 3)
public class OrderBenchmark {
    private Desk desk;
    private OrderModel order;

    /** Works the design out. */
    @Setup
    public void prepare() {
        desk = Desk.with(TwelveBands.design());
        order = new OrderModel(desk.drawing(), desk.work(), desk.comfort());
        order.pointedProperty().set(Optional.of(5));
    }

    /**
     * All cards written anew, none of them the same as before, and the glance of the one pointed at.
     *
     * @return how many cards there are
     */
    @Benchmark
    public int everyCardAnew() {
        LengthUnit other = desk.comfort().unit() == LengthUnit.INCH ? LengthUnit.MILLIMETRE : LengthUnit.INCH;
        desk.comfort().unitProperty().set(other);
        return order.cards().size();
    }
}
