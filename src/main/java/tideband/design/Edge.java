package tideband.design;

/** The boundary between neighbouring bands. */
public enum Edge {
    /** A mask line. */
    CRISP("crisp"),
    /** A waterline will do. */
    SOFT("soft");

    private final String key;

    Edge(String key) {
        this.key = key;
    }

    /**
     * The word for this edge in files.
     *
     * @return {@code crisp} or {@code soft}
     */
    public String key() {
        return key;
    }
}
