package tideband.sheet;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tideband.oxide.Supply;

/** Numbers as people and programs read them: no exponent, a point for the decimals, the same in every locale. */
public final class Figures {
    private Figures() {}

    /**
     * A number rounded half to even, without trailing zeros.
     *
     * @param value any finite number
     * @param decimals most decimals kept
     * @return the rounded number; never a negative zero
     */
    static BigDecimal rounded(double value, int decimals) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException("a number on a sheet must be finite, but was " + value);
        }
        BigDecimal shortest = BigDecimal.valueOf(value)
                .setScale(decimals, RoundingMode.HALF_EVEN)
                .stripTrailingZeros();
        return shortest.scale() < 0 ? shortest.setScale(0) : shortest;
    }

    /**
     * A number with at most so many decimals, trailing zeros dropped: 42, 0.5.
     *
     * @param value any finite number
     * @param decimals most decimals written
     * @return its figures
     */
    public static String plain(double value, int decimals) {
        return rounded(value, decimals).toPlainString();
    }

    /**
     * A number with exactly so many decimals: 42.0.
     *
     * @param value any finite number
     * @param decimals decimals written
     * @return its figures
     */
    public static String fixed(double value, int decimals) {
        return rounded(value, decimals).setScale(decimals).toPlainString();
    }

    /**
     * Volts as finely as the supply's dial has them, and with one decimal at least.
     *
     * @param volts any finite number of volts
     * @param supply the supply with the dial
     * @return its figures, without a unit
     */
    public static String volts(double volts, Supply supply) {
        return fixed(volts, Math.max(1, rounded(supply.dialVolts(), 3).scale()));
    }

    /**
     * Seconds as a clock shows them, to the nearest second: 75.2 is 1:15.
     *
     * @param seconds seconds, at least 0
     * @return minutes and seconds
     */
    public static String clock(double seconds) {
        long whole = Math.round(seconds);
        long rest = whole % 60;
        return whole / 60 + (rest < 10 ? ":0" : ":") + rest;
    }

    /** A count and its noun: 1 mask, 3 masks. */
    static String count(int number, String noun) {
        return number + " " + noun + (number == 1 ? "" : "s");
    }
}
