package tideband.window.sheets;

/** What can be done with the sheets. */
public enum Errand {
    /** All files of the plan are written. */
    EXPORT("Export sheets"),
    /** The step sheets are looked at and printed. */
    PRINT("Print step sheets");

    private final String title;

    Errand(String title) {
        this.title = title;
    }

    /**
     * What it is called.
     *
     * @return a few words
     */
    public String title() {
        return title;
    }
}
