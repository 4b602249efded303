package tideband.design;

import java.math.BigDecimal;
import java.util.Collection;
import java.util.stream.Collectors;

/** How parts of a file at fault are quoted in messages: short, on one line, and harmless to a terminal. */
final class Shown {

    private static final int MOST_CHARACTERS = 60;

    private Shown() {}

    static String number(double value) {
        if (value == 0 || !Double.isFinite(value) || Math.abs(value) >= 1e9 || Math.abs(value) < 1e-6) {
            return value == 0 ? "0" : Double.toString(value);
        }
        return BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }

    static String quoted(String text) {
        return '"' + plain(text) + '"';
    }

    static String quoted(Collection<String> words) {
        return words.stream().map(Shown::quoted).collect(Collectors.joining(", "));
    }

    /** The text cut short, with whatever is not printable escaped as in JSON. */
    static String plain(String text) {
        StringBuilder shown = new StringBuilder();
        int taken = 0;
        for (int i = 0; i < text.length(); ) {
            if (taken++ == MOST_CHARACTERS) {
                return shown.append('…').toString();
            }
            int codePoint = text.codePointAt(i);
            i += Character.charCount(codePoint);
            if (printable(codePoint)) {
                shown.appendCodePoint(codePoint);
            } else {
                for (char unit : Character.toChars(codePoint)) {
                    String hex = Integer.toHexString(unit);
                    shown.append("\\u").append("0".repeat(4 - hex.length())).append(hex);
                }
            }
        }
        return shown.toString();
    }

    private static boolean printable(int codePoint) {
        return switch (Character.getType(codePoint)) {
            case Character.CONTROL,
                    Character.FORMAT,
                    Character.SURROGATE,
                    Character.PRIVATE_USE,
                    Character.UNASSIGNED,
                    Character.LINE_SEPARATOR,
                    Character.PARAGRAPH_SEPARATOR -> false;
            default -> true;
        };
    }
}
