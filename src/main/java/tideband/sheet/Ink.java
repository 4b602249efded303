package tideband.sheet;

/**
 * How a closed shape is filled and outlined.
 *
 * @param fillHex the fill as {@code #rrggbb}, or empty for none
 * @param lineHex the outline as {@code #rrggbb}, or empty for none
 * @param lineMm width of the outline in mm
 */
record Ink(String fillHex, String lineHex, double lineMm) {
    static final String BLACK = "#000000";
    static final String WHITE = "#ffffff";
    static final String GREY = "#6b6b6b";
    static final String PALE = "#ececec";

    /** Refuses anything that is not a colour. */
    Ink {
        if (!fillHex.isEmpty()) {
            requireHex(fillHex);
        }
        if (!lineHex.isEmpty()) {
            requireHex(lineHex);
        }
    }

    static Ink fill(String hex) {
        return new Ink(hex, "", 0);
    }

    static Ink outline(String hex, double lineMm) {
        return new Ink("", hex, lineMm);
    }

    /** A colour chip: filled, with a thin black outline so that it shows on white paper. */
    static Ink chip(String hex) {
        return new Ink(hex, BLACK, 0.2);
    }

    static String requireHex(String hex) {
        if (!hex.matches("#[0-9a-fA-F]{6}")) {
            throw new IllegalArgumentException("a colour must be #rrggbb, but was " + hex);
        }
        return hex;
    }
}
