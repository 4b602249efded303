package tideband.design;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;

/** Sound files, and ways to spoil them. */
final class Samples {

    /** A lantern hook. */
    static final String HOOK = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern hook",
              "metal": "titanium", "finish": "polished", "light": "D65", "observer": 2,
              "piece": { "shape": "round", "stations": [ { "at_mm": 0, "size_mm": 3.0 }, { "at_mm": 160, "size_mm": 8.0 } ] },
              "holding": { "ends_down": ["A", "B"], "dry_mm": 10 },
              "bands": [
                { "name": "tip",    "to_mm": 42,  "film_nm": 150, "edge": "soft" },
                { "name": "dusk",   "to_mm": 110, "film_nm": [150, 46], "edge": "soft" },
                { "name": "collar", "to_mm": 160, "colour": "#3a3f8f" }
              ],
              "bath": "phosphate",
              "supply": { "max_volts": 120, "max_amps": 2, "dial_volts": 0.1 },
              "bench": { "immersion_min": 4, "mask_min": 3, "mask_over_min": 6, "strip_min": 1, "turn_min": 1.5, "hold_s": 30, "order": "thicker-first" }
            }
            """;

    /** A lantern's shutter: flat, in a box, with every other key a design can have. */
    static final String SHUTTER = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern shutter",
              "metal": "niobium", "finish": "satin", "light": "LED-B3", "observer": 10,
              "piece": { "shape": "flat", "stations": [ { "at_mm": 0, "size_mm": 12 }, { "at_mm": 90, "size_mm": 20 } ], "thickness_mm": 0.8 },
              "vessel": { "width_mm": 30, "length_mm": 200 },
              "holding": { "ends_down": ["B"], "dry_mm": 5 },
              "bands": [
                { "to_mm": 20, "bare": true, "edge": "crisp" },
                { "name": "sky", "to_mm": 50, "volts": 28.5 },
                { "to_mm": 90, "colour": { "lab": [52.5, -3, 21] }, "order": 2, "edge": "crisp" }
              ],
              "bath": "sulfuric",
              "supply": { "max_volts": 90, "max_amps": 0.5, "dial_volts": 1, "slew_volts_per_s": 20 },
              "bench": { "immersion_min": 5, "mask_min": 2, "mask_over_min": 9, "strip_min": 0, "turn_min": 3, "hold_s": 12, "order": "least-minutes" },
              "pull": { "fade": "stepped", "step_dE00": 1.5, "slowest_mm_s": 0.5, "fastest_mm_s": 4 }
            }
            """;

    /** A lantern's pipe: a tube in a measuring cylinder, with as few keys as will do. */
    static final String PIPE = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern pipe", "metal": "tantalum",
              "piece": { "shape": "tube", "stations": [ { "at_mm": 0, "size_mm": 6 }, { "at_mm": 70, "size_mm": 6 } ], "bore_mm": 4 },
              "vessel": { "bore_mm": 25 },
              "bands": [ { "to_mm": 70, "film_nm": 60 } ]
            }
            """;

    static final String BATH = """
            {
              "format": "tideband-bath", "version": 1, "name": "workshop jar", "metal": "titanium",
              "nm_per_volt": 1.7, "field_slope": 26, "native_nm": 2.5, "efficiency": 0.8,
              "resistance_ohm": 3.5, "ceiling_volts": 95, "index_scale": 1.02, "source": "fitted to four coupons"
            }
            """;

    // Numbers as they are written, so that 1e400 stays what it is.
    private static final ObjectMapper MAPPER =
            new ObjectMapper().enable(DeserializationFeature.USE_BIG_DECIMAL_FOR_FLOATS);

    private Samples() {}

    static JsonNode tree(String json) {
        try {
            return MAPPER.readTree(json);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException(e);
        }
    }

    /** The same JSON with one value put in, replaced, or (where it is null) taken out. */
    static String with(String json, String pointer, String value) {
        JsonNode root = tree(json);
        JsonPointer at = JsonPointer.compile(pointer);
        JsonNode parent = root.at(at.head());
        String name = at.last().getMatchingProperty();
        if (parent instanceof ArrayNode array) {
            int index = at.last().getMatchingIndex();
            if (value == null) {
                array.remove(index);
            } else if (index == array.size()) {
                array.add(tree(value));
            } else {
                array.set(index, tree(value));
            }
        } else if (value == null) {
            ((ObjectNode) parent).remove(name);
        } else {
            ((ObjectNode) parent).set(name, tree(value));
        }
        return root.toString();
    }

    static byte[] bytes(String text) {
        return text.getBytes(StandardCharsets.UTF_8);
    }

    static Reading<Design> read(String json) {
        return DesignFile.read(bytes(json), Optional.empty());
    }

    static Design sound(String json) {
        Reading<Design> reading = read(json);
        assertThat(reading).isInstanceOf(Reading.Read.class);
        return ((Reading.Read<Design>) reading).value();
    }

    static <T> List<Fault> faults(Reading<T> reading) {
        return reading instanceof Reading.Faulty<T> faulty ? faulty.faults() : List.of();
    }

    static List<Fault> faults(String json) {
        return faults(read(json));
    }
}
