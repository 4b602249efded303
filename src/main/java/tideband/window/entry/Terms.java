package tideband.window.entry;

import java.util.function.BooleanSupplier;
import java.util.function.Supplier;

/**
 * Under what terms a setting can be changed.
 *
 * @param placed whether it has a place at the moment
 * @param lock why it cannot be changed at the moment; empty where it can be
 */
public record Terms(BooleanSupplier placed, Supplier<String> lock) {

    /** It can always be changed. */
    public static final Terms ALWAYS = new Terms(() -> true, () -> "");

    /**
     * It has a place only at times.
     *
     * @param placed whether it has one at the moment
     * @return the terms
     */
    public static Terms when(BooleanSupplier placed) {
        return new Terms(placed, () -> "");
    }

    /**
     * It always has a place, and can be changed only at times.
     *
     * @param lock why it cannot be changed at the moment; empty where it can be
     * @return the terms
     */
    public static Terms unless(Supplier<String> lock) {
        return new Terms(() -> true, lock);
    }
}
