package tideband.window.entry;

import java.util.OptionalDouble;
import java.util.function.DoubleSupplier;
import java.util.function.Supplier;
import tideband.design.Range;

/**
 * What a number may be and what it usually is, in the unit inside.
 *
 * @param range what it may be now
 * @param usual what is usual now; empty where nothing is
 * @param word a word that may be typed in place of a number and stands for no limit; empty where there is none
 */
public record Bounds(Supplier<Range> range, Supplier<OptionalDouble> usual, String word) {

    /**
     * A range with nothing usual in it.
     *
     * @param range what the number may be
     * @return the bounds
     */
    public static Bounds of(Range range) {
        return new Bounds(() -> range, OptionalDouble::empty, "");
    }

    /**
     * A range with a usual value.
     *
     * @param range what the number may be
     * @param usual what is usual
     * @return the bounds
     */
    public static Bounds of(Range range, double usual) {
        return new Bounds(() -> range, () -> OptionalDouble.of(usual), "");
    }

    /**
     * A range in which what is usual depends on something else.
     *
     * @param range what the number may be
     * @param usual what is usual now
     * @return the bounds
     */
    public static Bounds with(Range range, DoubleSupplier usual) {
        return new Bounds(() -> range, () -> OptionalDouble.of(usual.getAsDouble()), "");
    }

    /**
     * A range that depends on something else.
     *
     * @param range what the number may be now
     * @return the bounds
     */
    public static Bounds now(Supplier<Range> range) {
        return new Bounds(range, OptionalDouble::empty, "");
    }
}
