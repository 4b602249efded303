package tideband.design;

/**
 * A fault in a file.
 *
 * @param at where: a JSON pointer (RFC 6901, empty for the whole file), or line and column where the text is not JSON
 * @param wrong what is wrong
 * @param right what would be right
 */
public record Fault(String at, String wrong, String right) {

    /**
     * The fault in one line.
     *
     * @return place, what is wrong and what would be right
     */
    public String text() {
        return (at.isEmpty() ? "" : at + ": ") + wrong + "; " + right;
    }
}
