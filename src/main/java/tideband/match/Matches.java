package tideband.match;

import java.util.List;
import tideband.colour.Lab;

/**
 * Every film that comes near a wanted colour: the answer also when none comes near enough.
 *
 * @param wanted the colour asked for
 * @param within how near is near enough, dE00
 * @param bestFirst the films, smallest difference first and thinner first where equal; at least one
 */
public record Matches(Lab wanted, double within, List<Match> bestFirst) {

    /** Takes a copy, and refuses an empty answer. */
    public Matches {
        bestFirst = List.copyOf(bestFirst);
        if (bestFirst.isEmpty()) {
            throw new IllegalArgumentException("bestFirst must hold at least one film");
        }
    }

    /**
     * The nearest film.
     *
     * @return the first of the list
     */
    public Match best() {
        return bestFirst.get(0);
    }

    /**
     * Whether any film comes near enough.
     *
     * @return whether the best difference is at most {@link #within()}
     */
    public boolean reached() {
        return best().difference() <= within;
    }
}
