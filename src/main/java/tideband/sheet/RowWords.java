package tideband.sheet;

import java.util.List;
import tideband.oxide.Supply;
import tideband.pull.Pull;
import tideband.pull.Row;

/** What is done from one row of a pull to the next, in words. */
final class RowWords {
    private final List<Row> rows;
    private final Supply supply;

    /**
     * The words for the rows of a pull.
     *
     * @param pull the pull
     * @param supply the supply, whose dial says how finely volts are told
     */
    RowWords(Pull pull, Supply supply) {
        this.rows = pull.rows();
        this.supply = supply;
    }

    /**
     * What to do at a row.
     *
     * @param index which row
     * @return a sentence without its full stop
     */
    String what(int index) {
        Row row = rows.get(index);
        if (index + 1 == rows.size()) {
            return switch (row.act()) {
                case LIFT_OUT -> "supply off, lift out, rinse";
                case LOWERED, RAISE, HOLD, OFF, WITHDRAW, FADE, FOLLOW ->
                    "end of the pull: supply off, lift out, rinse";
            };
        }
        Row next = rows.get(index + 1);
        double seconds = next.timeS() - row.timeS();
        String depth = Figures.fixed(next.depthMm(), 1) + " mm deep";
        String volts = Figures.volts(next.volts(), supply) + " V";
        return switch (row.act()) {
            case LOWERED -> "supply off, stand at " + Figures.fixed(row.depthMm(), 1) + " mm deep" + span(seconds);
            case RAISE ->
                next.act() == Row.Act.FOLLOW
                        ? "supply on at the fade's own setting, its meter showing " + volts
                        : seconds > 0 ? "raise evenly to " + volts + span(seconds) : "set " + volts + " at once";
            case HOLD -> "hold" + span(seconds);
            case OFF -> "supply off";
            case WITHDRAW -> "supply off, draw out to " + depth + span(seconds);
            case FADE ->
                "draw out evenly to " + depth + span(seconds)
                        + (next.volts() == row.volts() ? ", volts stay" : ", volts evenly to " + volts);
            case FOLLOW -> "draw out to " + depth + span(seconds) + ", the meter climbing to " + volts;
            case LIFT_OUT -> "supply off, lift out" + span(seconds);
        };
    }

    private static String span(double seconds) {
        return seconds > 0 ? ", " + Figures.plain(seconds, 1) + " s" : "";
    }
}
