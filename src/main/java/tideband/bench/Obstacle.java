package tideband.bench;

/**
 * A reason why a design cannot be made.
 *
 * @param where the band concerned, as {@code band "name"}, or {@code the design}
 * @param reason what stands in the way
 * @param change the nearest change that would work
 */
public record Obstacle(String where, String reason, String change) {}
