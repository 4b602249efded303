package tideband.window.colour;

import java.util.List;
import tideband.colour.Lab;
import tideband.edit.ColourText;
import tideband.match.Match;
import tideband.match.Matches;

/**
 * A wanted colour and the films found for it.
 *
 * @param text the colour as it was asked for
 * @param lab what it stands for in the design's light
 * @param hex how a screen shows it, {@code #rrggbb}
 * @param matches every film nearer than its neighbours
 */
public record Found(ColourText text, Lab lab, String hex, Matches matches) {
    /** So many of the nearest films are shown where none comes near enough. */
    private static final int NEAREST_SHOWN = 3;

    /**
     * The films worth showing, nearest first: those near enough, or where there are none the few nearest.
     *
     * @return at least one
     */
    public List<Match> shown() {
        List<Match> all = matches.bestFirst();
        return matches.reached()
                ? all.stream().filter(m -> m.difference() <= matches.within()).toList()
                : all.subList(0, Math.min(NEAREST_SHOWN, all.size()));
    }
}
