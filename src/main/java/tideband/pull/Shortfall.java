package tideband.pull;

/**
 * Something a pull asks for that bath, supply or hand cannot give.
 *
 * @param band index of the band concerned, from end A, 0-based
 * @param reason what cannot be met, in plain words
 * @param change the nearest change that would meet it
 */
public record Shortfall(int band, String reason, String change) {}
