package tideband.window.pacer;

/** What the user can do in the pacer; each has a key and a large button. */
public enum PacerAct {
    /** Confirms the step of getting ready. */
    CONFIRM("Done", "Enter", "Confirms this step and shows the next"),
    /** Goes back a step. */
    BACK("Back", "\u2190", "Goes back to the step before"),
    /** Stops the clock. */
    PAUSE("Pause", "Space", "Stops the clock and says what to do with the supply"),
    /** Lets the clock go on. */
    RESUME("Go on", "Space", "Counts in, then lets the clock go on where it stopped"),
    /** Stops a count-in. */
    STOP_COUNT("Stop", "Space", "Stops the count-in"),
    /** Begins the count-in again. */
    COUNT_AGAIN("Count in again", "C", "Begins the count-in again"),
    /** Breaks off at once. */
    ABORT("Abort", "Esc", "Breaks off at once and says what to do"),
    /** Gets ready to go on where a run was broken off. */
    GO_ON("Go on from here", "Enter", "Gets ready to go on where the run was broken off"),
    /** Gets ready to do the immersion from its start. */
    AGAIN("From the start", "C", "Gets ready to do this immersion from its start"),
    /** Goes on to the next immersion. */
    NEXT("Next immersion", "N", "Opens the next immersion of the plan"),
    /** Turns sounds off or on. */
    MUTE("Sound", "M", "Turns sounds off or on"),
    /** Changes between dark and light. */
    LIGHT("Light", "L", "Changes between the dark and the light look"),
    /** Closes the pacer. */
    LEAVE("Leave", "Q", "Closes the pacer");

    private final String label;
    private final String key;
    private final String help;

    PacerAct(String label, String key, String help) {
        this.label = label;
        this.key = key;
        this.help = help;
    }

    /**
     * What stands on its button.
     *
     * @return a word or a few
     */
    public String label() {
        return label;
    }

    /**
     * Its key, as it is written on the key.
     *
     * @return the key
     */
    public String key() {
        return key;
    }

    /**
     * What it does.
     *
     * @return a sentence without its full stop
     */
    public String help() {
        return help;
    }
}
