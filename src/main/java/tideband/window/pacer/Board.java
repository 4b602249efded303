package tideband.window.pacer;

import java.util.List;
import java.util.Optional;

/**
 * All that the pacer shows at a moment.
 *
 * @param title immersion, end down, state and time, to be read from near
 * @param words what to do, to be read from afar
 * @param target where that leads; may be empty
 * @param urgent whether the words warn
 * @param sentences what else is to be read; empty while the dials are shown
 * @param dials the numbers of a pull under way
 * @param place where the piece stands, where it stands in the bath
 * @param wholeShare how much of the pull, or of getting ready, is done, 0 to 1
 * @param progress the same in words
 * @param acts what the user can do, the weightiest first
 */
public record Board(
        String title,
        String words,
        String target,
        boolean urgent,
        List<String> sentences,
        Optional<Dials> dials,
        Optional<Place> place,
        double wholeShare,
        String progress,
        List<PacerAct> acts) {

    /** Copies the lists, so that the value cannot change. */
    public Board {
        sentences = List.copyOf(sentences);
        acts = List.copyOf(acts);
    }

    /**
     * The numbers of a pull under way.
     *
     * @param volts volts now: figures, {@code off}, or in brackets what the meter shows
     * @param depth depth now in mm, or {@code out}
     * @param travel hand travel in mm, where the vessel is narrow; else empty
     * @param seconds seconds to the next mark
     * @param leftShare how much of the way to the next mark is left, 1 to 0
     * @param next the next mark: its words, volts and depth
     * @param hint how to set the supply before the next mark, where that changes; else empty
     * @param film film and colour at the line
     * @param filmHex that colour
     * @param live whether there are volts
     * @param caution what applies at these volts
     */
    public record Dials(
            String volts,
            String depth,
            String travel,
            String seconds,
            double leftShare,
            String next,
            String hint,
            String film,
            String filmHex,
            boolean live,
            String caution) {}

    /**
     * Where the piece stands in the bath.
     *
     * @param lineMm the colour line, in mm from the end that is down
     * @param depthMm depth of that end below the flat level, in mm
     * @param filmHex colour of the film at the line
     * @param markIndex index of the mark that holds, 0-based
     */
    public record Place(double lineMm, double depthMm, String filmHex, int markIndex) {}
}
