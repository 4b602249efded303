package tideband.window.settings;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import tideband.design.Design;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.window.Desk;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;

/** Property: settings allow what the JSON Schemas allow, and call usual what these give as defaults. */
class SchemaOfSettingsTest {
    private static final String DESIGN = "tideband-design.schema.json";
    private static final String BATH = "tideband-bath.schema.json";

    // Where a schema speaks of a setting: file, then JSON pointer.
    private static final Map<String, List<String>> PLACES = new LinkedHashMap<>();

    static {
        design("thickness", "/properties/piece/properties/thickness_mm");
        design("bore", "/properties/piece/properties/bore_mm");
        design("vessel bore", "/properties/vessel/properties/bore_mm");
        design("vessel width", "/properties/vessel/properties/width_mm");
        design("vessel length", "/properties/vessel/properties/length_mm");
        design("dry length", "/properties/holding/properties/dry_mm");
        design("supply volts", "/properties/supply/properties/max_volts");
        design("supply amps", "/properties/supply/properties/max_amps");
        design("dial step", "/properties/supply/properties/dial_volts");
        design("supply slew", "/properties/supply/properties/slew_volts_per_s");
        design("immersion minutes", "/properties/bench/properties/immersion_min");
        design("mask minutes", "/properties/bench/properties/mask_min");
        design("mask over minutes", "/properties/bench/properties/mask_over_min");
        design("strip minutes", "/properties/bench/properties/strip_min");
        design("turn minutes", "/properties/bench/properties/turn_min");
        design("hold", "/properties/bench/properties/hold_s");
        design("largest step of a fade", "/properties/pull/properties/step_dE00");
        design("slowest hand", "/properties/pull/properties/slowest_mm_s");
        design("fastest hand", "/properties/pull/properties/fastest_mm_s");
        design("size at station 1", "/properties/piece/properties/stations/items/properties/size_mm");
        design("position of station 1", "/properties/piece/properties/stations/items/properties/at_mm");
        PLACES.put("bath ratio", List.of(BATH, "/properties/nm_per_volt"));
        PLACES.put("bath field slope", List.of(BATH, "/properties/field_slope"));
        PLACES.put("native film", List.of(BATH, "/properties/native_nm"));
        PLACES.put("current efficiency", List.of(BATH, "/properties/efficiency"));
        PLACES.put("bath resistance", List.of(BATH, "/properties/resistance_ohm"));
        PLACES.put("bath ceiling", List.of(BATH, "/properties/ceiling_volts"));
        PLACES.put("index scale", List.of(BATH, "/properties/index_scale"));
    }

    private static void design(String thing, String pointer) {
        PLACES.put(thing, List.of(DESIGN, pointer));
    }

    private final Desk desk = Desk.with("lantern-hook");
    private final SettingsModel model = new SettingsModel(desk.drawing(), desk.work(), desk.comfort(), Optional::empty);

    @Test
    void numbersKeepToTheSchemas() throws IOException {
        Set<String> compared = new TreeSet<>();
        for (NumberSetting number : numbers()) {
            String thing = number.about().thing();
            List<String> place = PLACES.get(thing);
            if (place == null) {
                // The length is the last station's position; the schema says its bounds in words only. Comfort is no
                // part of a design.
                assertThat(thing).isIn("length", "size of text");
                continue;
            }
            compared.add(thing);
            JsonNode schema = schema(place.get(0)).at(place.get(1));
            assertThat(number.bounds().range().get().low())
                    .as(thing)
                    .isEqualTo(schema.get("minimum").doubleValue());
            assertThat(number.bounds().range().get().high())
                    .as(thing)
                    .isEqualTo(schema.get("maximum").doubleValue());
            OptionalDouble usual = number.bounds().usual().get();
            if (schema.has("default")) {
                assertThat(usual).as(thing).hasValue(schema.get("default").doubleValue());
            } else if (place.get(0).equals(DESIGN)) {
                assertThat(usual.orElse(Double.POSITIVE_INFINITY)).as(thing).isEqualTo(Double.POSITIVE_INFINITY);
            }
        }
        assertThat(compared).isEqualTo(PLACES.keySet());
    }

    @Test
    void theLengthKeepsToWhatTheSchemaSays() throws IOException {
        String words = schema(DESIGN).at("/properties/piece/description").textValue();
        assertThat(words).contains("1 to 5000 mm");
        assertThat(number("length").boundsProperty().get()).isEqualTo("1 to 5000 mm");
    }

    @Test
    void numbersOfABathAreUsuallyThoseOfItsPreset() {
        Bath preset = BathPresets.usual(desk.drawing().design().metal());
        assertThat(number("bath ratio").bounds().usual().get()).hasValue(preset.nmPerVolt());
        assertThat(number("bath field slope").bounds().usual().get()).hasValue(preset.fieldSlope());
        assertThat(number("native film").bounds().usual().get()).hasValue(preset.nativeNm());
        assertThat(number("current efficiency").bounds().usual().get()).hasValue(preset.efficiency());
        assertThat(number("bath resistance").bounds().usual().get()).hasValue(preset.resistanceOhm());
        assertThat(number("bath ceiling").bounds().usual().get()).hasValue(preset.ceilingVolts());
    }

    @Test
    void thereAreAsManyChoicesAsTheSchemaHasWords() throws IOException {
        JsonNode schema = schema(DESIGN);
        Map<String, String> places = Map.of(
                "metal", "/properties/metal",
                "finish", "/properties/finish",
                "light", "/properties/light",
                "observer", "/properties/observer",
                "shape", "/properties/piece/properties/shape",
                "fade style", "/properties/pull/properties/fade",
                "order of immersions", "/properties/bench/properties/order");
        for (Map.Entry<String, String> place : places.entrySet()) {
            ChoiceSetting<?> choice = (ChoiceSetting<?>) setting(place.getKey());
            JsonNode words = schema.at(place.getValue());
            assertThat(choice.choices())
                    .as(place.getKey())
                    .hasSize(words.get("enum").size());
            if (words.has("default")) {
                String usual = words.get("default").asText();
                String shown = choice.boundsProperty().get().toLowerCase(Locale.ROOT);
                assertThat(shown.replace("-", " "))
                        .as(place.getKey())
                        .startsWith("usual: " + usual.toLowerCase(Locale.ROOT).replace("-", " "));
            }
        }
    }

    private List<NumberSetting> numbers() {
        List<NumberSetting> numbers = model.groups().stream()
                .flatMap(group -> group.settings().stream())
                .filter(NumberSetting.class::isInstance)
                .map(NumberSetting.class::cast)
                .collect(Collectors.toList());
        numbers.add(model.stations().rows().get(0).at());
        numbers.add(model.stations().rows().get(0).size());
        return numbers;
    }

    private NumberSetting number(String thing) {
        return (NumberSetting) setting(thing);
    }

    private Setting setting(String thing) {
        return model.groups().stream()
                .flatMap(group -> group.settings().stream())
                .filter(setting -> setting.about().thing().equals(thing))
                .findFirst()
                .orElseThrow();
    }

    private static JsonNode schema(String file) throws IOException {
        try (InputStream in = Design.class.getResourceAsStream(file)) {
            return new ObjectMapper().readTree(in);
        }
    }
}
