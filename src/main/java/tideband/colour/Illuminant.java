package tideband.colour;

import java.util.Arrays;
import java.util.stream.Collectors;

/** The lights a colour can be judged in (ISO/CIE 11664-2 and CIE 15:2018). */
public enum Illuminant {
    /** Incandescent lamp, 2856 K. */
    A("A"),
    /** Horizon daylight, 5003 K; print. */
    D50("D50"),
    /** Noon daylight, 6504 K. */
    D65("D65"),
    /** Cool white fluorescent lamp, CIE table FL2. */
    F2("F2"),
    /** Narrow-band fluorescent lamp, 4000 K, CIE table FL11. */
    F11("F11"),
    /** Blue-pumped white LED, 4103 K, CIE table LED-B3. */
    LED_B3("LED-B3");

    private final String key;

    Illuminant(String key) {
        this.key = key;
    }

    /**
     * The word this light goes by in files and on the command line.
     *
     * @return such as {@code D65}
     */
    public String key() {
        return key;
    }

    /**
     * The light a word stands for.
     *
     * @param key such as {@code D65} or {@code LED-B3}
     * @return the illuminant
     * @throws IllegalArgumentException for any other word
     */
    public static Illuminant ofKey(String key) {
        for (Illuminant illuminant : values()) {
            if (illuminant.key.equals(key)) {
                return illuminant;
            }
        }
        String known = Arrays.stream(values()).map(Illuminant::key).collect(Collectors.joining(", "));
        throw new IllegalArgumentException("light must be one of " + known + ", but was " + key);
    }

    static SpectralTable powers() {
        return SpectralTable.read(Illuminant.class, "illuminants.csv");
    }
}
