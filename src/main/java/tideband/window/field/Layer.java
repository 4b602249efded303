package tideband.window.field;

/** What lies over what in the field; each is painted anew only when it changes. */
public enum Layer {
    /** The colours of films, axes, what is out of reach or under the holder. */
    GROUND,
    /** The line: bands, edges. */
    DRAWING,
    /** Names, and what comes and goes: handles, focus, the hand, an immersion pointed at, films that come near a colour. */
    OVERLAY
}
