package tideband.edit;

import java.util.Set;
import tideband.design.Limits;

/** A title or a name as a file can hold it: on one line and not too long. */
final class Line {

    private Line() {}

    /** What was typed, without what no line can hold; empty if nothing is left. */
    static String of(String typed) {
        return cut(typed.replaceAll("[\\p{Cc}\\p{Cs}\\u2028\\u2029]+", " ").strip(), Limits.LONGEST_LINE);
    }

    /** The name, made different from those taken by a number. */
    static String fresh(String name, Set<String> taken) {
        if (!taken.contains(name)) {
            return name;
        }
        String stem = name.replaceAll(" \\d+$", "");
        for (int number = 2; ; number++) {
            String ending = " " + number;
            String other = cut(stem, Limits.LONGEST_LINE - ending.length()) + ending;
            if (!taken.contains(other)) {
                return other;
            }
        }
    }

    private static String cut(String text, int most) {
        int count = text.codePointCount(0, text.length());
        return count <= most
                ? text
                : text.substring(0, text.offsetByCodePoints(0, most)).strip();
    }
}
