package tideband.design;

/**
 * The numbers a key of a file may have.
 *
 * @param low the least
 * @param high the most
 */
public record Range(double low, double high) {

    /**
     * Whether a number is one of them.
     *
     * @param number any number
     * @return whether it is; NaN is not
     */
    public boolean holds(double number) {
        return number >= low && number <= high;
    }

    /**
     * The nearest of them.
     *
     * @param number a number, not NaN
     * @return the number itself if it is one of them
     */
    public double nearest(double number) {
        return Math.min(Math.max(number, low), high) + 0.0;
    }
}
