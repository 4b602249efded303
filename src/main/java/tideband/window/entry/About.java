package tideband.window.entry;

/**
 * What a setting is called and what it means.
 *
 * @param thing what undo calls it after "Set": {@code bath resistance}; it is like no other
 * @param name what it is called beside its field
 * @param help a sentence that says what it means
 */
public record About(String thing, String name, String help) {}
