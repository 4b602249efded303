package tideband.sheet;

import java.util.Locale;
import java.util.Set;

/** Paper to print on, portrait. */
public enum Paper {
    /** ISO 216 A4. */
    A4("a4", 210, 297),
    /** US Letter, 8.5 by 11 inches (ANSI/ASME Y14.1, size A). */
    LETTER("letter", 215.9, 279.4);

    /** Where Letter is the usual paper: Unicode CLDR (UTS #35 part 6, measurementData), paperSize US-Letter. */
    private static final Set<String> LETTER_COUNTRIES =
            Set.of("BZ", "CA", "CL", "CO", "CR", "GT", "MX", "NI", "PA", "PH", "PR", "SV", "US", "VE");

    private final String key;
    private final double widthMm;
    private final double heightMm;

    Paper(String key, double widthMm, double heightMm) {
        this.key = key;
        this.widthMm = widthMm;
        this.heightMm = heightMm;
    }

    /**
     * The word for this paper in file names.
     *
     * @return {@code a4} or {@code letter}
     */
    public String key() {
        return key;
    }

    /**
     * Its width.
     *
     * @return mm
     */
    public double widthMm() {
        return widthMm;
    }

    /**
     * Its height.
     *
     * @return mm
     */
    public double heightMm() {
        return heightMm;
    }

    /**
     * The paper people use somewhere.
     *
     * @param place language and country
     * @return the usual paper there; A4 where the country is not known
     */
    public static Paper usualIn(Locale place) {
        return LETTER_COUNTRIES.contains(place.getCountry()) ? LETTER : A4;
    }
}
