package tideband.bench;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/** Designs written as their files are. */
final class DesignTexts {

    private DesignTexts() {}

    /** A titanium rod of 5 mm in phosphate; bands and other members as given, the latter each with a comma before it. */
    static Design rod(int lengthMm, String bands, String members) {
        return read(String.format(Locale.ROOT, """
                {
                  "format": "tideband-design", "version": 1, "title": "Lantern rod", "metal": "titanium",
                  "piece": { "shape": "round", "stations": [
                    { "at_mm": 0, "size_mm": 5 }, { "at_mm": %d, "size_mm": 5 } ] },
                  "bands": [ %s ]
                  %s
                }
                """, lengthMm, bands, members));
    }

    static Design read(String json) {
        Reading<Design> reading = DesignFile.read(json.getBytes(StandardCharsets.UTF_8), Optional.empty());
        if (reading instanceof Reading.Read<Design> read) {
            return read.value();
        }
        throw new IllegalArgumentException(reading + " in " + json);
    }
}
