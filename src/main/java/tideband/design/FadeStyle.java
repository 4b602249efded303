package tideband.design;

/** How a fade is pulled. */
public enum FadeStyle {
    /** Even withdrawal speed, volts a function of time. */
    RAMPED("ramped"),
    /** Constant volts with the current limit as throttle, depth a function of time. */
    FIXED_VOLTS("fixed-volts"),
    /** Steps of the dial at marks, as many as keep neighbouring steps alike to the eye. */
    STEPPED("stepped");

    private final String key;

    FadeStyle(String key) {
        this.key = key;
    }

    /**
     * The word for this style in files.
     *
     * @return {@code ramped}, {@code fixed-volts} or {@code stepped}
     */
    public String key() {
        return key;
    }
}
