package tideband.pacer;

/**
 * A sound that is due.
 *
 * @param tone the sound
 * @param dueS when it was due, in s since the pull began; below 0 in the count-in
 */
public record Cue(Tone tone, double dueS) {}
