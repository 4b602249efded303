package tideband.window.entry;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import tideband.window.comfort.ComfortModel;
import tideband.window.comfort.LengthUnit;

/** How a number is shown and typed; inside the program it has one unit, whatever it is shown in. */
public sealed interface Measure {

    /**
     * A number in a unit of its own.
     *
     * @param unit the unit's symbol; empty for a bare number
     * @param decimals how many decimals are shown at most
     */
    record Plain(String unit, int decimals) implements Measure {
        @Override
        public String symbol() {
            return unit;
        }

        @Override
        public double scale() {
            return 1;
        }

        @Override
        public OptionalDouble read(String typed) {
            String text = typed.strip();
            boolean withUnit = !unit.isEmpty()
                    && text.toLowerCase(Locale.ROOT).endsWith(unit.toLowerCase(Locale.ROOT))
                    && text.length() > unit.length();
            String digits =
                    withUnit ? text.substring(0, text.length() - unit.length()).strip() : text;
            return decimal(digits);
        }
    }

    /**
     * A length in mm, shown in the unit the user likes.
     *
     * @param liked the unit
     */
    record Length(Supplier<LengthUnit> liked) implements Measure {
        @Override
        public String symbol() {
            return liked.get().symbol();
        }

        @Override
        public double scale() {
            return liked.get().inMm();
        }

        @Override
        public int decimals() {
            return liked.get() == LengthUnit.MILLIMETRE ? 3 : 4;
        }

        @Override
        public OptionalDouble read(String typed) {
            OptionalDouble mm = liked.get().parseMm(typed);
            return mm.isPresent() ? OptionalDouble.of(clean(mm.getAsDouble())) : mm;
        }
    }

    /**
     * A speed in mm/s, shown in the unit of length the user likes, a second.
     *
     * @param liked the unit
     */
    record Speed(Supplier<LengthUnit> liked) implements Measure {
        @Override
        public String symbol() {
            return liked.get().symbol() + "/s";
        }

        @Override
        public double scale() {
            return liked.get().inMm();
        }

        @Override
        public int decimals() {
            return liked.get() == LengthUnit.MILLIMETRE ? 3 : 4;
        }

        @Override
        public OptionalDouble read(String typed) {
            OptionalDouble mm = liked.get().parseMm(typed.strip().replaceFirst("\\s*/\\s*s$", ""));
            return mm.isPresent() ? OptionalDouble.of(clean(mm.getAsDouble())) : mm;
        }
    }

    /**
     * Lengths as the user likes them.
     *
     * @param comfort what the user likes
     * @return the measure
     */
    static Measure length(ComfortModel comfort) {
        return new Length(comfort::unit);
    }

    /**
     * Speeds as the user likes them.
     *
     * @param comfort what the user likes
     * @return the measure
     */
    static Measure speed(ComfortModel comfort) {
        return new Speed(comfort::unit);
    }

    /**
     * The unit's symbol.
     *
     * @return such as {@code mm}; empty for a bare number
     */
    String symbol();

    /**
     * One of the unit that is shown, in the unit inside.
     *
     * @return the factor
     */
    double scale();

    /**
     * How many decimals are shown at most.
     *
     * @return the number of decimals
     */
    int decimals();

    /**
     * Reads what was typed; a comma is as good as a point, and the unit may stand after the number.
     *
     * @param typed what was typed
     * @return the value in the unit inside, or nothing if that is no number
     */
    OptionalDouble read(String typed);

    /**
     * A value as it is shown, without its unit.
     *
     * @param value the value, in the unit inside
     * @return such as {@code 42.5}
     */
    default String number(double value) {
        return number(value, RoundingMode.HALF_EVEN);
    }

    /**
     * The lowest value allowed, rounded so that what is shown is allowed.
     *
     * @param value the value, in the unit inside
     * @return such as {@code 0.002}
     */
    default String lowest(double value) {
        return number(value, RoundingMode.CEILING);
    }

    /**
     * The highest value allowed, rounded so that what is shown is allowed.
     *
     * @param value the value, in the unit inside
     * @return such as {@code 39.37}
     */
    default String highest(double value) {
        return number(value, RoundingMode.FLOOR);
    }

    private String number(double value, RoundingMode rounding) {
        // To twelve digits first, so that what binary fractions add is not rounded up to a step.
        BigDecimal shown =
                BigDecimal.valueOf(value / scale()).round(new MathContext(12)).setScale(decimals(), rounding);
        return shown.signum() == 0 ? "0" : shown.stripTrailingZeros().toPlainString();
    }

    private static OptionalDouble decimal(String digits) {
        try {
            double value = new BigDecimal(digits.replace(',', '.').replace('\u2212', '-')).doubleValue();
            return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
        } catch (NumberFormatException noNumber) {
            return OptionalDouble.empty();
        }
    }

    /** To the nanometre, so that 1.5 in is 38.1 mm and not a hair less. */
    private static double clean(double mm) {
        return Math.rint(mm * 1e6) / 1e6;
    }
}
