package tideband.oxide;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** How long growth takes to compute, on one thread. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Fork(1)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 5, time = 1)
public class GrowthBenchmark {
    private static final double LIMIT_AMPS = 2;
    private static final double HOLD_S = 30;
    private static final int CELLS = 400;

    private final Bath bath = BathPresets.usual(Metal.TITANIUM);

    /**
     * Bare titanium, 10 cm², held at 60 V for 30 s.
     *
     * @return the film
     */
    @Benchmark
    public double oneHold() {
        Growth growth = new Growth(bath, LIMIT_AMPS, new double[] {bath.nativeNm()}, new double[] {10});
        growth.advance(HOLD_S, 60, 60);
        return growth.filmNm(0);
    }

    /**
     * The volts that give a coupon 110 nm in 30 s.
     *
     * @return the volts
     */
    @Benchmark
    public double oneCouponSolved() {
        return new Coupon(bath, LIMIT_AMPS, HOLD_S, Coupon.USUAL_CM2).volts(110);
    }

    /**
     * 400 cells of as many different films, 3 to 123 nm, held together at 60 V for 30 s.
     *
     * @return the film of one
     */
    @Benchmark
    public double fourHundredFilmsHeld() {
        double[] filmNm = new double[CELLS];
        double[] areaCm2 = new double[CELLS];
        for (int cell = 0; cell < CELLS; cell++) {
            filmNm[cell] = bath.nativeNm() + 0.3 * cell;
            areaCm2[cell] = 0.1;
        }
        Patchwork patchwork = new Patchwork(bath, LIMIT_AMPS, filmNm, areaCm2, 60, HOLD_S);
        patchwork.growth().advance(HOLD_S, 60, 60);
        return patchwork.filmNm(CELLS / 2);
    }

    /**
     * 400 cells of 40 to 120 nm under volts that rise from 30 to 60 V in 30 s.
     *
     * @return the film of one
     */
    @Benchmark
    public double fourHundredFilmsRamped() {
        double[] filmNm = new double[CELLS];
        double[] areaCm2 = new double[CELLS];
        for (int cell = 0; cell < CELLS; cell++) {
            filmNm[cell] = 40 + 0.2 * cell;
            areaCm2[cell] = 0.1;
        }
        Patchwork patchwork = new Patchwork(bath, LIMIT_AMPS, filmNm, areaCm2, 60, HOLD_S);
        patchwork.growth().advance(HOLD_S, 30, 60);
        return patchwork.filmNm(CELLS / 2);
    }
}
