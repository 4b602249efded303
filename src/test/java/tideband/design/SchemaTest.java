package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import tideband.oxide.Bath;

/**
 * Property: schema and reader say the same. The schema's tree is walked along sound files, and at every place its keys,
 * limits, words and types are tried on the reader.
 */
class SchemaTest {

    private record Kind(String file, List<String> samples, Function<String, List<Fault>> reader) {}

    @Test
    void readerOfDesignsKeepsToTheSchema() throws IOException {
        check(new Kind(
                "tideband-design.schema.json", List.of(Samples.HOOK, Samples.SHUTTER, Samples.PIPE), Samples::faults));
    }

    @Test
    void whatIsWrittenKeepsToTheSchema() throws IOException {
        check(new Kind(
                "tideband-design.schema.json",
                Stream.of(Samples.HOOK, Samples.SHUTTER, Samples.PIPE)
                        .map(text -> new String(DesignFile.bytes(Samples.sound(text)), StandardCharsets.UTF_8))
                        .toList(),
                Samples::faults));
        Bath bath = ((Reading.Read<Bath>) BathFile.read(Samples.bytes(Samples.BATH))).value();
        check(new Kind(
                "tideband-bath.schema.json",
                List.of(new String(BathFile.bytes(bath), StandardCharsets.UTF_8)),
                json -> Samples.faults(BathFile.read(Samples.bytes(json)))));
    }

    @Test
    void readerOfBathsKeepsToTheSchema() throws IOException {
        check(new Kind(
                "tideband-bath.schema.json",
                List.of(Samples.BATH),
                json -> Samples.faults(BathFile.read(Samples.bytes(json)))));
    }

    private static void check(Kind kind) throws IOException {
        JsonNode schema;
        try (InputStream in = Fault.class.getResourceAsStream(kind.file)) {
            schema = new ObjectMapper().readTree(in);
        }
        assertThat(schema.get("$schema").textValue()).isEqualTo("https://json-schema.org/draft/2020-12/schema");
        Set<String> tried = new TreeSet<>();
        for (String sample : kind.samples) {
            assertThat(kind.reader.apply(sample)).isEmpty();
            new Walk(kind, schema, sample, tried).at(schema, "", "");
        }
        Set<String> all = new TreeSet<>();
        collect(schema, "", all);
        assertThat(tried).isEqualTo(all);
    }

    /** The places of all schemas in the tree that say what a value may be. */
    private static void collect(JsonNode schema, String place, Set<String> all) {
        if (schema.has("oneOf") && !schema.has("properties")) {
            for (int i = 0; i < schema.get("oneOf").size(); i++) {
                collect(schema.get("oneOf").get(i), place + "|" + i, all);
            }
            return;
        }
        all.add(place);
        schema.path("properties")
                .fieldNames()
                .forEachRemaining(key -> collect(schema.get("properties").get(key), place + "/" + key, all));
        for (int i = 0; i < schema.path("prefixItems").size(); i++) {
            collect(schema.get("prefixItems").get(i), place + "/" + i, all);
        }
        if (schema.has("items")) {
            collect(schema.get("items"), place + "/*", all);
        }
    }

    private record Walk(Kind kind, JsonNode root, String sample, Set<String> tried) {

        void at(JsonNode given, String pointer, String place) {
            JsonNode value = Samples.tree(sample).at(pointer);
            JsonNode schema =
                    given.has("$ref") ? root.at(given.get("$ref").textValue().substring(1)) : given;
            if (schema.has("oneOf") && !schema.has("properties")) {
                for (int i = 0; i < schema.get("oneOf").size(); i++) {
                    JsonNode choice = schema.get("oneOf").get(i);
                    if ((value.isNumber() && choice.get("type").textValue().equals("number"))
                            || choice.get("type")
                                    .textValue()
                                    .equalsIgnoreCase(value.getNodeType().name())) {
                        at(choice, pointer, place + "|" + i);
                    }
                }
                return;
            }
            tried.add(place);
            if (schema.has("const") || schema.has("enum")) {
                tryWords(schema, pointer);
            } else {
                switch (schema.get("type").textValue()) {
                    case "object" -> tryObject(schema, value, pointer, place);
                    case "array" -> tryArray(schema, value, pointer, place);
                    case "number", "integer" -> tryNumber(schema, pointer);
                    case "string" -> tryText(schema, pointer);
                    default -> throw new AssertionError("no rule for " + schema);
                }
            }
        }

        private void tryObject(JsonNode schema, JsonNode value, String pointer, String place) {
            assertThat(schema.get("additionalProperties").booleanValue()).isFalse();
            List<String> keys = new ArrayList<>();
            schema.get("properties").fieldNames().forEachRemaining(keys::add);
            Fault unknown = faultAt(pointer + "/qqqqqqqq", "1");
            assertThat(unknown.wrong()).isEqualTo("is not a known key");
            assertThat(unknown.right()).isEqualTo("the keys here are " + Shown.quoted(keys));
            schema.path("required")
                    .forEach(key -> assertThat(faultAt(pointer + "/" + key.textValue(), null))
                            .isEqualTo(new Fault(pointer + "/" + key.textValue(), "is missing", "give it")));
            for (String key : keys) {
                if (value.has(key)) {
                    at(schema.get("properties").get(key), pointer + "/" + key, place + "/" + key);
                    // Whatever else the reader asks for, the schema asks for under a condition.
                    String conditions =
                            schema.path("required").toString() + schema.path("allOf") + schema.path("oneOf");
                    if (!conditions.contains("\"" + key + "\"")) {
                        assertThat(faultsAt(pointer + "/" + key, null)).isEmpty();
                    }
                }
            }
            if (!pointer.isEmpty()) {
                assertThat(faultAt(pointer, "7").right()).contains(pointer.endsWith("colour") ? "lab" : "an object");
            }
        }

        private void tryArray(JsonNode schema, JsonNode value, String pointer, String place) {
            int fewest = schema.get("minItems").intValue();
            int most = schema.get("maxItems").intValue();
            String size = fewest == most ? "an array of " + most : "an array of " + fewest + " to " + most;
            assertThat(faultAt(pointer, "[" + "0,".repeat(most) + "0]").right()).isEqualTo("it must be " + size);
            for (int i = 0; i < value.size(); i++) {
                JsonNode items =
                        schema.has("prefixItems") ? schema.get("prefixItems").get(i) : schema.get("items");
                at(items, pointer + "/" + i, place + (schema.has("prefixItems") ? "/" + i : "/*"));
            }
        }

        private void tryNumber(JsonNode schema, String pointer) {
            double low = schema.get("minimum").doubleValue();
            double high = schema.get("maximum").doubleValue();
            String right = "it must be a number from " + Shown.number(low) + " to " + Shown.number(high);
            for (String wrong :
                    List.of("\"1\"", "null", "true", Double.toString(high + 0.5), Double.toString(low - 0.01))) {
                Fault fault = faultAt(pointer, wrong);
                assertThat(fault.right())
                        .matches(
                                said -> said.equals(right) || (said.startsWith("say \"bare\"") && wrong.equals("0.0")));
            }
            for (double sound : new double[] {low, high}) {
                assertThat(faultsAt(pointer, Double.toString(sound)))
                        .noneMatch(fault -> fault.wrong().contains("out of range"));
            }
            if (schema.get("type").textValue().equals("integer")) {
                assertThat(faultAt(pointer, Double.toString(low + 0.5)).right()).isEqualTo("it must be a whole number");
            }
        }

        private void tryText(JsonNode schema, String pointer) {
            assertThat(faultsAt(pointer, "7")).hasSize(1);
            assertThat(Stream.of(Members.LINE_OF_TEXT, Members.PARAGRAPH, BathChoice.PLAIN_NAME, Wanted.Colour.HEX))
                    .anyMatch(pattern ->
                            pattern.pattern().equals(schema.get("pattern").textValue()));
            assertThat(faultsAt(pointer, "\"\\u0007\"")).hasSize(1);
        }

        private void tryWords(JsonNode schema, String pointer) {
            List<JsonNode> words = new ArrayList<>();
            if (schema.has("const")) {
                words.add(schema.get("const"));
            } else {
                schema.get("enum").forEach(words::add);
            }
            for (String wrong : List.of("\"qqqqqqqq\"", "null", "[]", "77")) {
                String right = faultAt(pointer, wrong).right();
                int before = 0;
                for (JsonNode word : words) {
                    int found = right.indexOf(word.toString(), before);
                    assertThat(found).as("%s in %s", word, right).isGreaterThanOrEqualTo(before);
                    before = found + word.toString().length();
                }
                // Whatever is in quotes beyond the last word would be a word the schema does not have.
                assertThat(right.indexOf('"', before)).isEqualTo(-1);
            }
            for (JsonNode word : words) {
                assertThat(faultsAt(pointer, word.toString()))
                        .noneMatch(fault -> fault.right().contains("must be one of"));
            }
        }

        private List<Fault> faultsAt(String pointer, String value) {
            return kind.reader.apply(Samples.with(sample, pointer, value)).stream()
                    .filter(fault -> fault.at().equals(pointer))
                    .toList();
        }

        private Fault faultAt(String pointer, String value) {
            List<Fault> faults = faultsAt(pointer, value);
            assertThat(faults).as("%s at %s", value, pointer).isNotEmpty();
            return faults.get(0);
        }
    }
}
