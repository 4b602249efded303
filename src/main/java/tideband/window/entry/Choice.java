package tideband.window.entry;

/**
 * One of several things to choose from.
 *
 * @param <T> the kind of thing
 * @param value the thing
 * @param name what it is called, short
 * @param meaning what it is, in a sentence; empty where the name says it all
 */
public record Choice<T>(T value, String name, String meaning) {}
