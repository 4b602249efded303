package tideband.edit;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.colour.Viewing;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.design.Wanted;

/**
 * A colour as people type it: {@code #rrggbb}, which stands for something else in each light, or {@code lab(L, a, b)}, which
 * is CIELAB against the white of the light it is judged in.
 */
public final class ColourText {
    /** Largest a* and b* either way: what a design's file allows. */
    public static final double MOST_CHROMATIC = 200;
    /** Lightness of white. */
    public static final double LIGHTEST = 100;

    private static final Pattern HEX = Pattern.compile("#?[0-9a-fA-F]{6}");
    private static final Pattern LAB = Pattern.compile("lab\\s*\\(([^()]*)\\)?", Pattern.CASE_INSENSITIVE);
    private static final String HOW = "type #rrggbb (six hexadecimal digits) or lab(L, a, b) such as lab(45, 10, -38)";

    private final String text;
    private final Optional<Lab> lab;

    private ColourText(String text, Optional<Lab> lab) {
        this.text = text;
        this.lab = lab;
    }

    /**
     * Reads a colour. The number sign may be left out; numbers are parted by commas, semicolons or spaces and have a decimal
     * point.
     *
     * @param typed what was typed
     * @return the colour or every fault; a fault in a number is at {@code L}, {@code a} or {@code b}
     */
    public static Reading<ColourText> read(String typed) {
        String line = typed.strip();
        if (line.isEmpty()) {
            return faulty("", "there is no colour", HOW);
        }
        if (HEX.matcher(line).matches()) {
            String digits = line.startsWith("#") ? line.substring(1) : line;
            return new Reading.Read<>(new ColourText("#" + digits.toLowerCase(Locale.ROOT), Optional.empty()));
        }
        Matcher numbers = LAB.matcher(line);
        if (numbers.matches()) {
            return lab(numbers.group(1).strip());
        }
        return faulty("", "that is no colour", HOW);
    }

    /**
     * A colour in CIELAB as it is typed.
     *
     * @param lab the colour, within what a design's file allows
     * @return it in words, {@code lab(L, a, b)}, unrounded
     */
    public static ColourText of(Lab lab) {
        return new ColourText(
                "lab(" + number(lab.lightness()) + ", " + number(lab.a()) + ", " + number(lab.b()) + ")",
                Optional.of(lab));
    }

    /**
     * The colour in its one form: lower case, no needless zeros.
     *
     * @return such as {@code #3a3f8f} or {@code lab(45, 10, -38)}
     */
    public String text() {
        return text;
    }

    /**
     * What it stands for in a light.
     *
     * @param viewing the light and the eye
     * @return CIELAB against that light's white
     */
    public Lab labIn(Viewing viewing) {
        return lab.orElseGet(() -> viewing.lab(Srgb.ofHex(text)));
    }

    /**
     * This colour as a band can want it.
     *
     * @param viewing the light and the eye of the design
     * @param order the order wanted, where one is
     * @return what the band is to be, as reading the design's file would give it
     */
    public Wanted.Colour wanted(Viewing viewing, OptionalInt order) {
        return new Wanted.Colour(text, labIn(viewing), order);
    }

    private static Reading<ColourText> lab(String list) {
        String[] parts = list.isEmpty() ? new String[0] : list.split("\\s*[,;]\\s*|\\s+", -1);
        if (parts.length != 3) {
            return faulty("", parts.length + " numbers stand in the brackets", "give three, as lab(45, 10, -38)");
        }
        List<Fault> faults = new ArrayList<>();
        OptionalDouble lightness = coordinate("L", parts[0], 0, LIGHTEST, faults);
        OptionalDouble a = coordinate("a", parts[1], -MOST_CHROMATIC, MOST_CHROMATIC, faults);
        OptionalDouble b = coordinate("b", parts[2], -MOST_CHROMATIC, MOST_CHROMATIC, faults);
        return faults.isEmpty()
                ? new Reading.Read<>(of(new Lab(lightness.getAsDouble(), a.getAsDouble(), b.getAsDouble())))
                : new Reading.Faulty<>(faults);
    }

    private static OptionalDouble coordinate(String name, String typed, double low, double high, List<Fault> faults) {
        String right = name + " must be a number from " + number(low) + " to " + number(high);
        try {
            // The minus sign of typesetters is as good as that of keyboards; minus zero is zero.
            double value = new BigDecimal(typed.replace('\u2212', '-')).doubleValue() + 0.0;
            if (value >= low && value <= high) {
                return OptionalDouble.of(value);
            }
            faults.add(new Fault(name, "is " + typed, right));
        } catch (NumberFormatException noNumber) {
            faults.add(new Fault(name, "is no number", right));
        }
        return OptionalDouble.empty();
    }

    private static Reading<ColourText> faulty(String at, String wrong, String right) {
        return new Reading.Faulty<>(List.of(new Fault(at, wrong, right)));
    }

    private static String number(double value) {
        return value == 0 ? "0" : BigDecimal.valueOf(value).stripTrailingZeros().toPlainString();
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof ColourText that && text.equals(that.text) && lab.equals(that.lab);
    }

    @Override
    public int hashCode() {
        return text.hashCode();
    }

    @Override
    public String toString() {
        return text;
    }
}
