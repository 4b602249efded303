package tideband.pacer;

import tideband.sheet.HandMark;

/**
 * A mark as it is called out to someone two metres away.
 *
 * @param mark the mark of the hand timing table
 * @param words what to do, in capitals: {@code OFF · DRAW}
 * @param target where that leads: {@code to 62.4 mm}; may be empty
 * @param volts the volts as the timing table has them: figures, {@code off}, or in brackets what the meter shows
 * @param clock its time as the timing table has it
 * @param switches whether the supply goes on or off here
 */
public record Call(HandMark mark, String words, String target, String volts, String clock, boolean switches) {

    /**
     * When it is due.
     *
     * @return seconds since the pull began
     */
    public double dueS() {
        return mark.row().timeS();
    }

    /**
     * Everything in one line.
     *
     * @return words and target
     */
    public String line() {
        return target.isEmpty() ? words : words + " " + target;
    }
}
