package tideband.window.order;

import java.math.BigDecimal;
import java.math.RoundingMode;
import tideband.oxide.Supply;
import tideband.sheet.Figures;
import tideband.window.comfort.LengthUnit;

/** Depths, volts, seconds and minutes as they are read at the bench. */
final class BenchFigures {
    private static final int DIAL_DECIMALS = 3;
    private static final double GAUGE_PER_MM = 10;

    private final LengthUnit unit;
    private final int voltDecimals;

    BenchFigures(LengthUnit unit, Supply supply) {
        this.unit = unit;
        this.voltDecimals = Math.max(
                1,
                BigDecimal.valueOf(supply.dialVolts())
                        .setScale(DIAL_DECIMALS, RoundingMode.HALF_EVEN)
                        .stripTrailingZeros()
                        .scale());
    }

    /** A depth as a gauge shows it, to a tenth of a millimetre. */
    String depth(double mm) {
        return number(mm) + " " + unit.symbol();
    }

    String depths(double fromMm, double toMm) {
        String from = number(fromMm);
        String to = number(toMm);
        return from.equals(to) ? from + " " + unit.symbol() : from + " \u2192 " + to + " " + unit.symbol();
    }

    private String number(double mm) {
        return unit.number(unit == LengthUnit.MILLIMETRE ? Math.rint(mm * GAUGE_PER_MM) / GAUGE_PER_MM : mm);
    }

    /** Volts as finely as the supply's dial has them. */
    String volts(double volts) {
        return Figures.fixed(volts, voltDecimals) + " V";
    }

    String volts(double from, double to) {
        String first = Figures.fixed(from, voltDecimals);
        String last = Figures.fixed(to, voltDecimals);
        return first.equals(last) ? first + " V" : first + " \u2192 " + last + " V";
    }

    /** What a meter climbs through while the current limit holds the volts down: nothing to be set, so in whole volts. */
    static String meter(double fromVolts, double toVolts) {
        return "meter " + Figures.fixed(fromVolts, 0) + " \u2192 " + Figures.fixed(toVolts, 0) + " V";
    }

    static String seconds(double seconds) {
        return Figures.plain(seconds, 1) + " s";
    }

    static String minutes(double minutes) {
        return Figures.plain(minutes, 2) + " min";
    }

    static String amps(double amps) {
        return Figures.plain(amps, 3) + " A";
    }
}
