package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import tideband.oxide.Supply;
import tideband.pull.Pull;
import tideband.pull.Row;

/**
 * A mark of the hand timing table: all that is done at one moment of a pull, and until the next.
 *
 * <p>A pull has two rows at one time wherever its volts jump; at the bench that is one act.
 *
 * @param number its number in the pull, from 1
 * @param row the state once everything due at this moment is done
 * @param act what to do, in a few words to be read from afar
 * @param leadsTo where that leads until the next mark; may be empty
 */
public record HandMark(int number, Row row, String act, String leadsTo) {

    /**
     * The marks of a pull, in order.
     *
     * @param pull the pull
     * @param supply the supply, whose dial says how finely volts are told
     * @return one mark for each moment at which something is to be done; the last is the end of the pull
     */
    public static List<HandMark> of(Pull pull, Supply supply) {
        List<Row> rows = pull.rows();
        List<HandMark> marks = new ArrayList<>();
        for (int first = 0; first < rows.size(); ) {
            int last = first;
            while (last + 1 < rows.size()
                    && rows.get(last + 1).timeS() == rows.get(first).timeS()) {
                last++;
            }
            boolean end = last + 1 == rows.size();
            Row next = end ? rows.get(last) : rows.get(last + 1);
            marks.add(mark(marks.size() + 1, rows.get(first), rows.get(last), next, end, supply));
            first = last + 1;
        }
        return marks;
    }

    /**
     * Both parts as one sentence without its full stop.
     *
     * @return what to do and where that leads
     */
    public String sentence() {
        return leadsTo.isEmpty() ? act : act + ", " + leadsTo;
    }

    /**
     * The volts to set, {@code off}, or in brackets what the meter shows while the current limit holds it down.
     *
     * @param supply the supply, whose dial says how finely volts are told
     * @return the words for them, without a unit
     */
    public String volts(Supply supply) {
        if (row.volts() == 0) {
            return "off";
        }
        String volts = Figures.volts(row.volts(), supply);
        return row.act() == Row.Act.FOLLOW ? "(" + volts + ")" : volts;
    }

    private static HandMark mark(int number, Row before, Row now, Row next, boolean end, Supply supply) {
        if (end) {
            return new HandMark(number, now, "Rinse", "");
        }
        String seconds = Figures.plain(next.timeS() - now.timeS(), 1) + " s";
        String depth = "to " + Figures.fixed(next.depthMm(), 1) + " mm";
        String nextVolts = Figures.volts(next.volts(), supply) + " V";
        String on = before.volts() == 0 && now.volts() > 0 ? "On. " : "";
        return switch (now.act()) {
            case LOWERED, OFF -> new HandMark(number, now, "Stand " + seconds, "supply off");
            case RAISE -> new HandMark(number, now, on + "Raise " + seconds, "evenly to " + nextVolts);
            case HOLD -> new HandMark(number, now, on + "Hold " + seconds, "");
            case WITHDRAW -> new HandMark(number, now, "Off. Draw " + seconds, depth);
            case FADE ->
                new HandMark(
                        number,
                        now,
                        on + "Fade " + seconds,
                        next.volts() == now.volts() ? depth : depth + ", " + nextVolts);
            case FOLLOW -> new HandMark(number, now, on + "Follow " + seconds, depth + ", meter " + nextVolts);
            case LIFT_OUT -> new HandMark(number, now, "Off. Lift out", "");
        };
    }
}
