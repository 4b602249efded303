package tideband.design;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.exc.StreamConstraintsException;
import com.fasterxml.jackson.core.io.JsonEOFException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;

/**
 * The outermost layer of a file: bytes, UTF-8, and the grammar of JSON (RFC 8259) without leniency. Names in an object
 * must differ, numbers are doubles.
 */
final class JsonText {

    /** Largest file, in bytes. */
    static final int MOST_BYTES = 1 << 20;

    /** Deepest nesting of objects and arrays. */
    static final int DEEPEST = 32;

    private static final JsonFactory FACTORY = JsonFactory.builder()
            .streamReadConstraints(
                    StreamReadConstraints.builder().maxNestingDepth(DEEPEST).build())
            .disable(JsonFactory.Feature.INTERN_FIELD_NAMES)
            .disable(JsonFactory.Feature.CANONICALIZE_FIELD_NAMES)
            .build();

    private static final char BYTE_ORDER_MARK = '\uFEFF';

    private final String text;
    private final Faults faults;

    private JsonText(String text, Faults faults) {
        this.text = text;
        this.faults = faults;
    }

    /** The bytes of a regular file that is not too large. */
    static Optional<byte[]> bytes(Path file, Faults faults) {
        if (Files.isDirectory(file)) {
            faults.add("", "this is a folder", "name the file in it");
        } else if (!Files.exists(file)) {
            faults.add("", "there is no such file", "check the name");
        } else if (!Files.isRegularFile(file)) {
            faults.add("", "this is not a regular file", "name a file on disk");
        } else {
            try (InputStream in = Files.newInputStream(file)) {
                return Optional.of(in.readNBytes(MOST_BYTES + 1));
            } catch (IOException e) {
                String reason = String.valueOf(e.getMessage());
                faults.add("", "the file cannot be read (" + Shown.plain(reason) + ")", "check that you may read it");
            }
        }
        return Optional.empty();
    }

    /** The tree of a JSON text; an empty answer has left its reason in the faults. */
    static Optional<JsonNode> parse(byte[] bytes, Faults faults) {
        if (bytes.length > MOST_BYTES) {
            faults.add("", "the file is larger than 1 MiB", "a file of this kind is far smaller; check the name");
            return Optional.empty();
        }
        String text;
        try {
            text = StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString();
        } catch (CharacterCodingException e) {
            faults.add("", "the file is not UTF-8", "save it as UTF-8");
            return Optional.empty();
        }
        if (text.isBlank()) {
            faults.add("", "the file is empty", "it must hold a JSON object");
            return Optional.empty();
        }
        if (text.charAt(0) == BYTE_ORDER_MARK) {
            faults.add("", "the file begins with a byte order mark", "save it as UTF-8 without one");
            return Optional.empty();
        }
        return new JsonText(text, faults).parse();
    }

    private Optional<JsonNode> parse() {
        try (JsonParser parser = FACTORY.createParser(text)) {
            return document(parser);
        } catch (IOException e) {
            throw new UncheckedIOException("a text in memory does not fail to be read", e);
        }
    }

    private Optional<JsonNode> document(JsonParser parser) throws IOException {
        try {
            parser.nextToken();
            JsonNode root = value(parser, "");
            if (parser.nextToken() == null) {
                return Optional.of(root);
            }
            String place = place(parser.currentTokenLocation());
            faults.add(place, "something follows the end of the JSON", "end the file there");
        } catch (StreamConstraintsException e) {
            faults.add(
                    place(parser.currentLocation()),
                    "the JSON is nested more than " + DEEPEST + " deep, or a name or number is far too long",
                    "a file of this kind needs none of that");
        } catch (JsonEOFException e) {
            faults.add(place(e.getLocation()), "the file ends too soon", "close every quote, bracket and brace");
        } catch (JsonProcessingException e) {
            int at = (int) Math.min(e.getLocation().getCharOffset(), text.length());
            String near = text.substring(at, Math.min(text.length(), at + 20)).strip();
            faults.add(
                    place(e.getLocation()),
                    "this is not JSON, near " + Shown.quoted(near),
                    "look there and just before for a comma, quote, bracket or brace too many or too few; names and"
                            + " texts stand in double quotes, numbers are plain decimals, and there are no comments");
        }
        return Optional.empty();
    }

    private static String place(JsonLocation location) {
        return "line " + location.getLineNr() + ", column " + location.getColumnNr();
    }

    private JsonNode value(JsonParser parser, String pointer) throws IOException {
        JsonNodeFactory nodes = JsonNodeFactory.instance;
        JsonToken token = parser.currentToken();
        return switch (token) {
            case START_OBJECT -> object(parser, pointer);
            case START_ARRAY -> array(parser, pointer);
            case VALUE_STRING -> nodes.textNode(parser.getText());
            case VALUE_NUMBER_INT, VALUE_NUMBER_FLOAT -> nodes.numberNode(parser.getDoubleValue() + 0.0);
            case VALUE_TRUE -> nodes.booleanNode(true);
            case VALUE_FALSE -> nodes.booleanNode(false);
            case VALUE_NULL -> nodes.nullNode();
            case NOT_AVAILABLE, END_OBJECT, END_ARRAY, FIELD_NAME, VALUE_EMBEDDED_OBJECT ->
                throw new IllegalStateException("no value begins with " + token);
        };
    }

    private ObjectNode object(JsonParser parser, String pointer) throws IOException {
        ObjectNode object = JsonNodeFactory.instance.objectNode();
        while (parser.nextToken() == JsonToken.FIELD_NAME) {
            String name = parser.currentName();
            String memberPointer = member(pointer, name);
            parser.nextToken();
            JsonNode value = value(parser, memberPointer);
            if (object.has(name)) {
                faults.add(memberPointer, "is given more than once", "keep one of them");
            } else {
                object.set(name, value);
            }
        }
        return object;
    }

    private ArrayNode array(JsonParser parser, String pointer) throws IOException {
        ArrayNode array = JsonNodeFactory.instance.arrayNode();
        while (parser.nextToken() != JsonToken.END_ARRAY) {
            array.add(value(parser, pointer + "/" + array.size()));
        }
        return array;
    }

    /** The pointer of a member of an object (RFC 6901, section 3), shown so that it is harmless. */
    static String member(String pointer, String name) {
        return pointer + "/" + Shown.plain(name.replace("~", "~0").replace("/", "~1"));
    }
}
