package tideband.window.comfort;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.OptionalDouble;

/** The unit lengths are shown and typed in; inside the program they are always millimetres. */
public enum LengthUnit {
    /** Millimetres, to 0.01. */
    MILLIMETRE("mm", 1, 2),
    /** Inches, to 0.001; 25.4 mm exactly (international yard and pound agreement, 1959). */
    INCH("in", 25.4, 3);

    private final String symbol;
    private final double inMm;
    private final int decimals;

    LengthUnit(String symbol, double inMm, int decimals) {
        this.symbol = symbol;
        this.inMm = inMm;
        this.decimals = decimals;
    }

    /**
     * Its symbol.
     *
     * @return {@code mm} or {@code in}
     */
    public String symbol() {
        return symbol;
    }

    /**
     * One of it in millimetres.
     *
     * @return mm a unit
     */
    public double inMm() {
        return inMm;
    }

    /**
     * A length without its unit, with no needless zeros.
     *
     * @param mm the length in mm
     * @return such as {@code 42.5}
     */
    public String number(double mm) {
        BigDecimal rounded = BigDecimal.valueOf(mm / inMm).setScale(decimals, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }

    /**
     * A length with its unit.
     *
     * @param mm the length in mm
     * @return such as {@code 42.5 mm}
     */
    public String text(double mm) {
        return number(mm) + " " + symbol;
    }

    /**
     * Reads a length; the unit may be given, this one is meant where it is not. A comma is as good as a point.
     *
     * @param typed what was typed: {@code 42.5}, {@code 42,5 mm}, {@code 1.5 in}, {@code 1.5"}
     * @return the length in mm, or nothing if that is no length
     */
    public OptionalDouble parseMm(String typed) {
        String text = typed.strip().toLowerCase(Locale.ROOT).replace(',', '.').replace("\"", "in");
        LengthUnit unit = this;
        for (LengthUnit each : values()) {
            if (text.endsWith(each.symbol)) {
                unit = each;
                text = text.substring(0, text.length() - each.symbol.length()).strip();
                break;
            }
        }
        try {
            double value = new BigDecimal(text).doubleValue() * unit.inMm;
            return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
        } catch (NumberFormatException noNumber) {
            return OptionalDouble.empty();
        }
    }
}
