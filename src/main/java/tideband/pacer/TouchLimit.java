package tideband.pacer;

import java.util.Optional;

/**
 * Levels of direct voltage above which touching becomes worse. Planner's levels: a local code may set lower ones, and it goes first.
 */
public enum TouchLimit {
    /** IEC 60204-1, 6.4.1: bare parts in wet places. */
    WET_HANDS(15, "OVER 15 V: dry gloves, one hand"),
    /** IEC 60364-4-41, 414.4.5: bare parts in other than dry conditions. */
    NO_WET_CONTACT(30, "OVER 30 V: do not touch anything wet"),
    /** IEC 60364-4-41, 414.4.5: bare parts in dry conditions. */
    GUARD(60, "OVER 60 V: guard closed, hands clear"),
    /** IEC 61558-1:2005, 3.7.16: end of extra-low voltage. */
    NOT_EXTRA_LOW(120, "OVER 120 V: deadly, interlock shut, never alone");

    private final double aboveV;
    private final String words;

    TouchLimit(double aboveV, String words) {
        this.aboveV = aboveV;
        this.words = words;
    }

    /**
     * The level.
     *
     * @return volts
     */
    public double aboveV() {
        return aboveV;
    }

    /**
     * What applies above it, in a few words.
     *
     * @return the words
     */
    public String words() {
        return words;
    }

    /**
     * The highest limit that a voltage exceeds.
     *
     * @param volts direct volts
     * @return the limit, or nothing
     */
    public static Optional<TouchLimit> exceededBy(double volts) {
        Optional<TouchLimit> found = Optional.empty();
        for (TouchLimit limit : values()) {
            if (volts > limit.aboveV) {
                found = Optional.of(limit);
            }
        }
        return found;
    }
}
