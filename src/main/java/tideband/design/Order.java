package tideband.design;

/** The rule for the order of immersions. */
public enum Order {
    /** The highest newly finished film never rises from one immersion to the next. */
    THICKER_FIRST("thicker-first"),
    /** Any order; only the minutes count. */
    LEAST_MINUTES("least-minutes");

    private final String key;

    Order(String key) {
        this.key = key;
    }

    /**
     * The word for this order in files.
     *
     * @return {@code thicker-first} or {@code least-minutes}
     */
    public String key() {
        return key;
    }
}
