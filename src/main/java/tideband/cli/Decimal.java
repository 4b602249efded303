package tideband.cli;

import java.util.regex.Pattern;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads a number as people write it: digits with a point, perhaps an exponent; no names, no hexadecimals. */
final class Decimal implements ITypeConverter<Double> {
    private static final Pattern NUMBER = Pattern.compile("[+-]?([0-9]+(\\.[0-9]*)?|\\.[0-9]+)([eE][+-]?[0-9]+)?");

    @Override
    public Double convert(String given) {
        if (!NUMBER.matcher(given).matches()) {
            throw new TypeConversionException("'" + given + "' is not a number such as 12 or 0.5");
        }
        return Double.valueOf(given);
    }
}
