package tideband.window.field;

import java.nio.charset.StandardCharsets;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/** A lantern post of twelve bands of every kind. */
public final class TwelveBands {
    private static final String LANTERN_POST = """
            {
              "format": "tideband-design", "version": 1, "title": "Lantern post, twelve bands",
              "metal": "titanium", "finish": "satin",
              "piece": { "shape": "round", "stations": [
                { "at_mm": 0, "size_mm": 5 }, { "at_mm": 120, "size_mm": 8 }, { "at_mm": 200, "size_mm": 8 } ] },
              "holding": { "ends_down": ["A", "B"], "dry_mm": 8 },
              "bands": [
                { "name": "foot", "to_mm": 16,  "film_nm": 150,       "edge": "soft" },
                { "name": "dusk", "to_mm": 40,  "film_nm": [150, 90], "edge": "soft" },
                { "name": "rose", "to_mm": 55,  "film_nm": 90,        "edge": "crisp" },
                { "name": "night", "to_mm": 68,  "colour": "#3f4f9a",  "edge": "soft" },
                { "name": "ring", "to_mm": 80,  "film_nm": 112,       "edge": "crisp" },
                { "name": "gap", "to_mm": 96,  "bare": true,         "edge": "crisp" },
                { "name": "collar", "to_mm": 110, "film_nm": 60,        "edge": "soft" },
                { "name": "rising", "to_mm": 126, "film_nm": [60, 130], "edge": "soft" },
                { "name": "crest", "to_mm": 140, "film_nm": 130,       "edge": "crisp" },
                { "name": "by volts", "to_mm": 156, "volts": 45,          "edge": "soft" },
                { "name": "swell", "to_mm": 180, "film_nm": [84, 120], "edge": "soft" },
                { "name": "cap", "to_mm": 200, "film_nm": 120 }
              ],
              "supply": { "max_volts": 120, "max_amps": 3, "dial_volts": 0.1 }
            }
            """;

    private TwelveBands() {}

    /**
     * The lantern post.
     *
     * @return the design
     */
    public static Design design() {
        byte[] file = LANTERN_POST.getBytes(StandardCharsets.UTF_8);
        if (DesignFile.read(file, Optional.empty()) instanceof Reading.Read<Design> read) {
            return read.value();
        }
        throw new AssertionError("the twelve bands are at fault");
    }
}
