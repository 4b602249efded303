package tideband.window.piece;

/**
 * How near a colour comes to the one wanted, in a word.
 *
 * <p>Common practice, no source: a difference of 1 in CIEDE2000 is about the least that two fields side by side betray; below 2
 * one has to look for it; below 5 it is seen side by side, yet passes for the same colour on different pieces; from 5 on
 * it is another colour.
 */
public enum Nearness {
    /** Below 1. */
    SAME("same to the eye", 1),
    /** Below 2. */
    CLOSE("close", 2),
    /** Below 5. */
    NEAR("near", 5),
    /** From 5 on. */
    OFF("off", Double.POSITIVE_INFINITY);

    private final String text;
    private final double below;

    Nearness(String text, double below) {
        this.text = text;
        this.below = below;
    }

    /**
     * The word.
     *
     * @return one to three lower-case words
     */
    public String text() {
        return text;
    }

    /**
     * The word for a difference.
     *
     * @param de00 CIEDE2000 difference, at least 0
     * @return how near it is
     */
    public static Nearness of(double de00) {
        for (Nearness nearness : values()) {
            if (de00 < nearness.below) {
                return nearness;
            }
        }
        return OFF;
    }
}
