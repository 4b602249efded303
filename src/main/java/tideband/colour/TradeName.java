package tideband.colour;

/**
 * Plain colour names the trade uses for anodized titanium, niobium and tantalum, as regions of CIELAB lightness, chroma and
 * hue.
 *
 * <p>The names are common practice; where one ends and the next begins is a choice made here, no source. {@link #NATURAL}
 * cannot be told from a colour alone (a pale film looks the same) and is given by whoever knows the film is too thin to show.
 */
public enum TradeName {
    /** Metal that looks bare. */
    NATURAL("natural"),
    /** Near neutral and light. */
    SILVER("silver"),
    /** Near neutral and dark. */
    GREY("grey"),
    /** The first tint of a thin film. */
    STRAW("straw"),
    /** Strong yellow of middling lightness. */
    GOLD("gold"),
    /** Dark orange to red-brown. */
    BRONZE("bronze"),
    /** Dark red-violet. */
    PURPLE("purple"),
    /** Dark blue. */
    DEEP_BLUE("deep blue"),
    /** Blue of middling lightness. */
    BLUE("blue"),
    /** Light blue. */
    SKY_BLUE("sky blue"),
    /** Light, weak yellow. */
    PALE_YELLOW("pale yellow"),
    /** Light, strong yellow. */
    YELLOW("yellow"),
    /** Yellow-red. */
    ORANGE("orange"),
    /** Strong red; no film reaches it. */
    RED("red"),
    /** Light red to pink. */
    ROSE("rose"),
    /** Strong red-violet. */
    MAGENTA("magenta"),
    /** Blue-violet of middling lightness. */
    VIOLET("violet"),
    /** Blue-green. */
    TEAL("teal"),
    /** Green. */
    GREEN("green");

    /** Below this chroma a colour counts as neutral. */
    private static final double NEUTRAL_CHROMA = 10;
    /** The straw tint is noticed sooner, as bare metal lies beside it. */
    private static final double STRAW_CHROMA = 6;
    /** Violets, blues and browns darker than this get the name of the dark shade. */
    private static final double DARK_BELOW = 45;

    private final String text;

    TradeName(String text) {
        this.text = text;
    }

    /**
     * The name for people to read.
     *
     * @return one or two lower-case words
     */
    public String text() {
        return text;
    }

    /**
     * The name of a colour.
     *
     * @param colour CIELAB against the white of its light
     * @return the name of the region it falls in; never {@link #NATURAL}
     */
    public static TradeName of(Lab colour) {
        double lightness = colour.lightness();
        double chroma = colour.chroma();
        double hue = colour.hueDegrees();
        boolean strawTint = hue >= 70 && hue < 112 && lightness >= 60 && chroma >= STRAW_CHROMA;
        if (chroma < NEUTRAL_CHROMA && !strawTint) {
            return lightness >= 60 ? SILVER : GREY;
        }
        if (hue < 45) {
            return ofReds(lightness, chroma, hue);
        }
        if (hue < 112) {
            return ofYellows(lightness, chroma, hue);
        }
        if (hue < 240) {
            return ofGreens(lightness, chroma, hue);
        }
        return hue < 305 ? ofBlues(lightness, hue) : ofViolets(lightness, chroma, hue);
    }

    private static TradeName ofReds(double lightness, double chroma, double hue) {
        if (hue >= 15 && chroma >= 55 && lightness >= 30 && lightness < 62) {
            return RED;
        }
        if (lightness >= DARK_BELOW) {
            return ROSE;
        }
        return hue < 15 ? PURPLE : BRONZE;
    }

    private static TradeName ofYellows(double lightness, double chroma, double hue) {
        if (lightness < DARK_BELOW) {
            return BRONZE;
        }
        if (hue >= 75 && lightness < (hue < 85 ? 62 : 68)) {
            return chroma < 22 ? STRAW : GOLD;
        }
        if (hue < 85 && chroma >= 30) {
            return ORANGE;
        }
        if (hue < 70) {
            return ROSE;
        }
        if (chroma >= 35) {
            return YELLOW;
        }
        boolean straw = chroma < NEUTRAL_CHROMA || (lightness < 75 && chroma < 22);
        return straw ? STRAW : PALE_YELLOW;
    }

    private static TradeName ofGreens(double lightness, double chroma, double hue) {
        if (chroma < 14 && lightness >= 60 && hue >= 140 && hue < 215) {
            return SILVER;
        }
        if (hue < 145 && chroma < 40 && lightness >= 72) {
            return PALE_YELLOW;
        }
        if (hue < 175) {
            return GREEN;
        }
        return hue >= 200 && ((lightness >= 70 && chroma < 40) || chroma < 25) ? SKY_BLUE : TEAL;
    }

    private static TradeName ofBlues(double lightness, double hue) {
        if (hue >= 292) {
            return lightness < 40 ? DEEP_BLUE : VIOLET;
        }
        if (hue >= 265 && lightness < DARK_BELOW) {
            return DEEP_BLUE;
        }
        return lightness >= 57 ? SKY_BLUE : BLUE;
    }

    private static TradeName ofViolets(double lightness, double chroma, double hue) {
        if (lightness < DARK_BELOW) {
            return PURPLE;
        }
        if (hue < 320) {
            return VIOLET;
        }
        return chroma >= 40 && hue < 352 ? MAGENTA : ROSE;
    }
}
