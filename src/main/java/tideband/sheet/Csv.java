package tideband.sheet;

import java.util.List;
import java.util.stream.Collectors;

/** Lines of a CSV file as RFC 4180 has them, safe to open in a spreadsheet. */
public final class Csv {
    private static final String LINE_END = "\r\n";

    /** A text that begins with one of these is taken for a formula by spreadsheets. */
    private static final String FORMULA_STARTS = "=+-@\t\r\n\uff1d\uff0b\uff0d\uff20";

    private Csv() {}

    /**
     * Text as a field: a quote mark before what a spreadsheet would run, and RFC 4180 quoting where it is needed.
     *
     * @param text any text
     * @return the field, ready to be written
     */
    public static String text(String text) {
        boolean formula = !text.isEmpty() && FORMULA_STARTS.indexOf(text.charAt(0)) >= 0;
        String plain = Typeface.clean(formula ? "'" + text : text);
        boolean quoted = plain.chars().anyMatch(c -> c == ',' || c == '"' || c == ';' || c == '\'');
        return quoted ? '"' + plain.replace("\"", "\"\"") + '"' : plain;
    }

    /** A row of fields that are ready to be written. */
    static String row(List<String> fields) {
        return String.join(",", fields) + LINE_END;
    }

    /** A comment line; what could open a new cell in it becomes a space. */
    static String comment(String text) {
        String plain = Typeface.clean(text)
                .chars()
                .mapToObj(c -> ",;\"'".indexOf(c) >= 0 ? " " : Character.toString((char) c))
                .collect(Collectors.joining());
        return "# " + plain + LINE_END;
    }
}
