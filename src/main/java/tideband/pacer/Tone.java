package tideband.pacer;

/** A sound of the pacer, the most urgent last. */
public enum Tone {
    /** A second of the count-in, or one of the last three before a mark. */
    TICK,
    /** A mark. */
    MARK,
    /** A mark at which the supply goes on or off: a double sound. */
    SUPPLY,
    /** The end of the pull. */
    END,
    /** Paused or aborted: see to the supply. */
    ALARM
}
