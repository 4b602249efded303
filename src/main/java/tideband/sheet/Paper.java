package tideband.sheet;

/** Paper to print on, portrait. */
public enum Paper {
    /** ISO 216 A4. */
    A4("a4", 210, 297),
    /** US Letter, 8.5 by 11 inches (ANSI/ASME Y14.1, size A). */
    LETTER("letter", 215.9, 279.4);

    private final String key;
    private final double widthMm;
    private final double heightMm;

    Paper(String key, double widthMm, double heightMm) {
        this.key = key;
        this.widthMm = widthMm;
        this.heightMm = heightMm;
    }

    /**
     * The word for this paper in file names.
     *
     * @return {@code a4} or {@code letter}
     */
    public String key() {
        return key;
    }

    /**
     * Its width.
     *
     * @return mm
     */
    public double widthMm() {
        return widthMm;
    }

    /**
     * Its height.
     *
     * @return mm
     */
    public double heightMm() {
        return heightMm;
    }
}
