package tideband.pacer;

import java.util.Optional;

/**
 * A moment of a pull.
 *
 * @param elapsedS seconds since the pull began
 * @param markIndex index of the mark that holds, 0-based
 * @param now the mark that holds
 * @param next the mark to come; nothing after the last
 * @param setting where supply, hand and film stand
 * @param volts the volts at this moment in words: figures, {@code off}, or in brackets what the meter shows
 * @param leftS seconds to the next mark; 0 after the last
 * @param doneShare how much of the way to the next mark is done, 0 to 1
 * @param wholeShare how much of the pull is done, 0 to 1
 * @param live whether there are volts from this mark to the next
 * @param limit the limit that the volts exceed before the next mark, where they exceed one
 */
public record Moment(
        double elapsedS,
        int markIndex,
        Call now,
        Optional<Call> next,
        Setting setting,
        String volts,
        double leftS,
        double doneShare,
        double wholeShare,
        boolean live,
        Optional<TouchLimit> limit) {}
