package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.Function;
import java.util.regex.Pattern;

/**
 * One object of a file. It hands out members of the type and range asked for, and notes everything else as a fault. An
 * empty answer means that the member is missing or at fault.
 */
final class Members {

    /** What a title, a name or the like may be: 1 to 80 characters on one line, not only spaces. */
    static final Pattern LINE_OF_TEXT =
            Pattern.compile("^(?=.*[^ ])[^\\p{Cc}\\p{Cs}\\u2028\\u2029]{1," + Limits.LONGEST_LINE + "}$");

    /** What a longer text may be: up to 1000 characters, on one line too. */
    static final Pattern PARAGRAPH = Pattern.compile("^[^\\p{Cc}\\p{Cs}\\u2028\\u2029]{0,1000}$");

    static final int VERSION = 1;

    private final JsonNode object;
    private final String pointer;
    private final Faults faults;

    private Members(JsonNode object, String pointer, Faults faults) {
        this.object = object;
        this.pointer = pointer;
        this.faults = faults;
    }

    /** The members of a value that must be an object with no other keys than the known ones. */
    static Optional<Members> of(JsonNode node, String pointer, Faults faults, List<String> known) {
        if (!node.isObject()) {
            faults.add(pointer, "is " + kind(node), "it must be an object with the keys " + Shown.quoted(known));
            return Optional.empty();
        }
        node.fieldNames().forEachRemaining(name -> {
            if (!known.contains(name)) {
                String meant = Nearest.to(name, known)
                        .map(near -> "did you mean " + Shown.quoted(near) + "? ")
                        .orElse("");
                faults.add(
                        JsonText.member(pointer, name),
                        "is not a known key",
                        meant + "the keys here are " + Shown.quoted(known));
            }
        });
        return Optional.of(new Members(node, pointer, faults));
    }

    boolean has(String key) {
        return object.has(key);
    }

    String pointer(String key) {
        return JsonText.member(pointer, key);
    }

    void fault(String key, String wrong, String right) {
        faults.add(pointer(key), wrong, right);
    }

    void require(String... keys) {
        for (String key : keys) {
            if (!has(key)) {
                fault(key, "is missing", "give it");
            }
        }
    }

    /** Whether a tree is a file of another kind, which its format says; then that is all there is to say about it. */
    static boolean isOther(JsonNode root, String format, Faults faults, String wrong, String right) {
        JsonNode given = root.path("format");
        if (!given.isTextual() || !given.textValue().equals(format)) {
            return false;
        }
        faults.add("/format", "is " + Shown.quoted(format) + ": " + wrong, right);
        return true;
    }

    /** Checks the two members every file begins with. */
    void checkFormat(String format) {
        word("format", List.of(format), Function.identity());
        value("version")
                .filter(version -> version.doubleValue() != VERSION)
                .ifPresent(version -> fault(
                        "version",
                        "is " + kind(version),
                        "it must be " + VERSION + ", the version this program reads"));
    }

    Optional<JsonNode> value(String key) {
        return Optional.ofNullable(object.get(key));
    }

    OptionalDouble number(String key, double low, double high) {
        return has(key) ? number(object.get(key), pointer(key), low, high) : OptionalDouble.empty();
    }

    OptionalDouble number(String key, Range range) {
        return number(key, range.low(), range.high());
    }

    OptionalDouble number(JsonNode node, String at, Range range) {
        return number(node, at, range.low(), range.high());
    }

    /** An element of an array, or any other value, that must be a number. */
    OptionalDouble number(JsonNode node, String at, double low, double high) {
        String right = "it must be a number from " + Shown.number(low) + " to " + Shown.number(high);
        if (!node.isNumber()) {
            faults.add(at, "is " + kind(node), right);
            return OptionalDouble.empty();
        }
        double number = node.doubleValue();
        if (!(number >= low && number <= high)) {
            faults.add(at, "is " + shownNumber(number) + ", out of range", right);
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(number);
    }

    OptionalInt whole(String key, int low, int high) {
        OptionalDouble number = number(key, low, high);
        if (number.isEmpty()) {
            return OptionalInt.empty();
        }
        if (number.getAsDouble() != Math.rint(number.getAsDouble())) {
            fault(key, "is " + shownNumber(number.getAsDouble()), "it must be a whole number");
            return OptionalInt.empty();
        }
        return OptionalInt.of((int) number.getAsDouble());
    }

    Optional<String> line(String key) {
        return text(
                key, LINE_OF_TEXT, "1 to 80 characters on one line, not only spaces and without control characters");
    }

    Optional<String> paragraph(String key) {
        return text(key, PARAGRAPH, "at most 1000 characters on one line, without control characters");
    }

    private Optional<String> text(String key, Pattern pattern, String allowed) {
        Optional<String> text = text(key);
        if (text.isPresent() && !pattern.matcher(text.get()).matches()) {
            fault(key, "is " + Shown.quoted(text.get()), "it must be " + allowed);
            return Optional.empty();
        }
        return text;
    }

    Optional<String> text(String key) {
        Optional<JsonNode> node = value(key);
        if (node.isPresent() && !node.get().isTextual()) {
            fault(key, "is " + kind(node.get()), "it must be a text in double quotes");
            return Optional.empty();
        }
        return node.map(JsonNode::textValue);
    }

    /** A member that must be one of a few words. */
    <T> Optional<T> word(String key, List<T> values, Function<T, String> wordOf) {
        Optional<JsonNode> node = value(key);
        return node.isPresent() ? word(node.get(), pointer(key), values, wordOf) : Optional.empty();
    }

    /** An element of an array, or any other value, that must be one of a few words. */
    <T> Optional<T> word(JsonNode node, String at, List<T> values, Function<T, String> wordOf) {
        List<String> words = values.stream().map(wordOf).toList();
        int index = node.isTextual() ? words.indexOf(node.textValue()) : -1;
        if (index >= 0) {
            return Optional.of(values.get(index));
        }
        String meant = node.isTextual()
                ? Nearest.to(node.textValue(), words)
                        .map(near -> "did you mean " + Shown.quoted(near) + "? ")
                        .orElse("")
                : "";
        String one = words.size() == 1 ? "" : "one of ";
        faults.add(at, "is " + kind(node), meant + "it must be " + one + Shown.quoted(words));
        return Optional.empty();
    }

    Optional<Members> object(String key, List<String> known) {
        Optional<JsonNode> node = value(key);
        return node.isPresent() ? of(node.get(), pointer(key), faults, known) : Optional.empty();
    }

    /** The elements of a member that must be an array of a certain size. */
    Optional<List<JsonNode>> array(String key, int fewest, int most) {
        Optional<JsonNode> node = value(key);
        return node.isPresent() ? array(node.get(), pointer(key), fewest, most) : Optional.empty();
    }

    /** The elements of a value that must be an array of a certain size. */
    Optional<List<JsonNode>> array(JsonNode node, String at, int fewest, int most) {
        String right = "it must be an array of " + (fewest == most ? "" : fewest + " to ") + most;
        if (!node.isArray()) {
            faults.add(at, "is " + kind(node), right);
            return Optional.empty();
        }
        if (node.size() < fewest || node.size() > most) {
            faults.add(at, "has " + node.size() + " elements", right);
            return Optional.empty();
        }
        List<JsonNode> elements = new ArrayList<>();
        node.forEach(elements::add);
        return Optional.of(elements);
    }

    /** What a value is, as a message says it. */
    static String kind(JsonNode node) {
        return switch (node.getNodeType()) {
            case OBJECT -> "an object";
            case ARRAY -> "an array";
            case STRING -> Shown.quoted(node.textValue());
            case NUMBER -> shownNumber(node.doubleValue());
            case BOOLEAN -> String.valueOf(node.booleanValue());
            case NULL -> "null";
            case BINARY, MISSING, POJO -> throw new IllegalStateException("JSON text holds no " + node.getNodeType());
        };
    }

    private static String shownNumber(double number) {
        return Double.isInfinite(number) ? "a number beyond all bounds" : Shown.number(number);
    }
}
