package tideband.cli;

import java.util.function.Function;
import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.colour.Viewing;

/**
 * A colour as it was asked for: a screen colour, which stands for something else in each light, or CIELAB.
 *
 * @param text how it was written
 * @param labIn what it stands for, against the white of the light it is seen in
 */
record WantedColour(String text, Function<Viewing, Lab> labIn) {
    private static final Pattern HEX = Pattern.compile("#[0-9a-fA-F]{6}");
    private static final String LAB = "lab:";
    private static final double MOST_CHROMATIC = 200;

    /** Reads a colour from an option. */
    static final class Reader implements ITypeConverter<WantedColour> {
        @Override
        public WantedColour convert(String given) {
            if (HEX.matcher(given).matches()) {
                return new WantedColour(given, viewing -> viewing.lab(Srgb.ofHex(given)));
            }
            String[] parts =
                    given.startsWith(LAB) ? given.substring(LAB.length()).split(",", -1) : new String[0];
            if (parts.length != 3) {
                throw new TypeConversionException("'" + given
                        + "' is neither '#rrggbb' (six hexadecimal digits; in quotes, as a shell takes # for the start"
                        + " of a remark) nor lab:L,a,b such as lab:45,10,-38");
            }
            Decimal decimal = new Decimal();
            Lab lab = new Lab(decimal.convert(parts[0]), decimal.convert(parts[1]), decimal.convert(parts[2]));
            if (!(lab.lightness() >= 0
                    && lab.lightness() <= 100
                    && Math.abs(lab.a()) <= MOST_CHROMATIC
                    && Math.abs(lab.b()) <= MOST_CHROMATIC)) {
                throw new TypeConversionException(
                        "'" + given + "' is out of bounds: L is from 0 to 100, a and b from -200 to 200");
            }
            return new WantedColour(given, viewing -> lab);
        }
    }
}
