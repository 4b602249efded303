package tideband.window.piece;

/** How the piece is lit in its picture. */
public enum Lamps {
    /** White from everywhere: no shading, so every hue and lightness is the computed one. */
    EVEN("even light"),
    /** A long lamp above the bench, along the piece. */
    ONE("one lamp"),
    /** A long lamp above and a weaker one below. */
    TWO("two lamps");

    private final String text;

    Lamps(String text) {
        this.text = text;
    }

    /**
     * Its name for people to read.
     *
     * @return two lower-case words
     */
    public String text() {
        return text;
    }

    /**
     * The next, and the first after the last.
     *
     * @return other lamps
     */
    public Lamps next() {
        return switch (this) {
            case EVEN -> ONE;
            case ONE -> TWO;
            case TWO -> EVEN;
        };
    }
}
