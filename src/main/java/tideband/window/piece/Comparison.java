package tideband.window.piece;

/** Whose colours the picture shows. */
public enum Comparison {
    /** Those the trial predicts. */
    PREDICTED("predicted"),
    /** Those the drawing wants. */
    WANTED("wanted"),
    /** The wanted ones on the upper half, the predicted ones on the lower. */
    BOTH("both");

    private final String text;

    Comparison(String text) {
        this.text = text;
    }

    /**
     * Its name for people to read.
     *
     * @return a lower-case word
     */
    public String text() {
        return text;
    }

    /**
     * The next, and the first after the last.
     *
     * @return another comparison
     */
    public Comparison next() {
        return switch (this) {
            case PREDICTED -> WANTED;
            case WANTED -> BOTH;
            case BOTH -> PREDICTED;
        };
    }
}
