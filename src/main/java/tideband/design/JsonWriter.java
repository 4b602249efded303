package tideband.design;

import java.math.BigDecimal;
import java.math.MathContext;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * Writes JSON: an object with few members on a line, and whatever is inside them on the same line, except for long lists,
 * which have a line for each element. The same content always gives the same bytes.
 */
final class JsonWriter {

    /** Up to so many digits, a decimal number is the only one that short for its double (DBL_DIG of IEEE 754). */
    private static final int DIGITS_IN_DOUBT = 15;

    /** An object on one line. */
    static final class Inline {
        private final Map<String, String> members = new LinkedHashMap<>();

        Inline text(String key, String value) {
            members.put(key, quoted(value));
            return this;
        }

        Inline number(String key, double value) {
            members.put(key, JsonWriter.number(value));
            return this;
        }

        Inline numbers(String key, double... values) {
            members.put(
                    key,
                    array(Arrays.stream(values).mapToObj(JsonWriter::number).toList()));
            return this;
        }

        Inline texts(String key, List<String> values) {
            members.put(key, array(values.stream().map(JsonWriter::quoted).toList()));
            return this;
        }

        Inline object(String key, Inline value) {
            members.put(key, value.json());
            return this;
        }

        Inline objects(String key, List<Inline> values) {
            members.put(key, array(values.stream().map(Inline::json).toList()));
            return this;
        }

        /** Each on a line of its own, where there are many. */
        Inline rows(String key, List<Inline> values) {
            List<String> each = values.stream().map(v -> "    " + v.json()).toList();
            members.put(key, "[\n" + String.join(",\n", each) + "\n  ]");
            return this;
        }

        Inline yes(String key) {
            members.put(key, "true");
            return this;
        }

        private String json() {
            List<String> parts = new ArrayList<>();
            members.forEach((key, value) -> parts.add(quoted(key) + ": " + value));
            return "{ " + String.join(", ", parts) + " }";
        }

        private static String array(List<String> values) {
            return "[" + String.join(", ", values) + "]";
        }
    }

    private final List<String> lines = new ArrayList<>();

    /** Members side by side on one line. */
    JsonWriter line(Inline members) {
        String json = members.json();
        lines.add("  " + json.substring(2, json.length() - 2));
        return this;
    }

    byte[] bytes() {
        return ("{\n" + String.join(",\n", lines) + "\n}\n").getBytes(StandardCharsets.UTF_8);
    }

    /** The fewest digits that are read as this very number, without an exponent. */
    static String number(double value) {
        // Before JDK 19 this may have a digit too many (JDK-4511638), and files must not depend on the JDK.
        BigDecimal shortest = new BigDecimal(Double.toString(value)).stripTrailingZeros();
        BigDecimal exact = shortest.precision() < DIGITS_IN_DOUBT ? shortest : new BigDecimal(value);
        for (int digits = shortest.precision() - 1; digits >= DIGITS_IN_DOUBT; digits--) {
            BigDecimal fewer = exact.round(new MathContext(digits));
            if (fewer.doubleValue() != value) {
                break;
            }
            shortest = fewer;
        }
        return plain(shortest);
    }

    private static String plain(BigDecimal value) {
        return value.signum() == 0 ? "0" : value.stripTrailingZeros().toPlainString();
    }

    private static String quoted(String text) {
        StringBuilder json = new StringBuilder("\"");
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == '"' || c == '\\') {
                json.append('\\').append(c);
            } else if (c < ' ' || (Character.isSurrogate(c) && !paired(text, i))) {
                json.append("\\u").append(HexFormat.of().toHexDigits(c));
            } else {
                json.append(c);
            }
        }
        return json.append('"').toString();
    }

    private static boolean paired(String text, int at) {
        return Character.isHighSurrogate(text.charAt(at))
                ? at + 1 < text.length() && Character.isLowSurrogate(text.charAt(at + 1))
                : at > 0 && Character.isHighSurrogate(text.charAt(at - 1));
    }
}
