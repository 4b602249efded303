package tideband.pacer;

import tideband.sheet.Figures;

/**
 * Something that was done in a run.
 *
 * @param elapsedS the time of the pull then, in s
 * @param words what was done
 */
public record LogEntry(double elapsedS, String words) {

    /**
     * Time and words in one line.
     *
     * @return such as {@code 0:41 paused}
     */
    public String line() {
        return Figures.clock(elapsedS) + " " + words;
    }
}
