package tideband.pull;

import java.util.List;

/**
 * The pull of one immersion.
 *
 * @param rows the polyline, in time order; at least two rows
 * @param currentLimitAmps what the supply's current limit is set to for this immersion, in A
 * @param peakAmps the highest current that flows, in A
 * @param notes what the person at the bench should know of this pull: limits met, errors left
 */
public record Pull(List<Row> rows, double currentLimitAmps, double peakAmps, List<String> notes) {

    /** Copies the lists, so that the value cannot change. */
    public Pull {
        rows = List.copyOf(rows);
        notes = List.copyOf(notes);
    }

    /**
     * How long the pull lasts.
     *
     * @return seconds from the first row to the last
     */
    public double durationS() {
        return rows.get(rows.size() - 1).timeS();
    }
}
