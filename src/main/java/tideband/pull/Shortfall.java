package tideband.pull;

import java.util.List;

/**
 * Something a pull asks for that bath, supply or hand cannot give.
 *
 * @param band index of the band concerned, from end A, 0-based
 * @param reason what cannot be met, in plain words
 * @param change the nearest change that would meet it
 * @param cures those of the changes that are definite, nearest first; worked out for the pull at hand, so that a plan which
 *     becomes another by them may ask for a little more
 */
public record Shortfall(int band, String reason, String change, List<Cure> cures) {

    /** Copies the list, so that the value cannot change. */
    public Shortfall {
        cures = List.copyOf(cures);
    }
}
