package tideband.cli;

import java.util.ArrayList;
import java.util.List;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import tideband.sheet.Figures;

/** Gathers options that are out of bounds, so that all are told at once. */
final class Limits {
    private final List<String> faults = new ArrayList<>();

    /** Takes note unless the value lies from {@code low} to {@code high}; a value that is no number never does. */
    Limits within(String option, double value, double low, double high, String unit) {
        return holds(
                value >= low && value <= high,
                option + " must be from " + plain(low) + " to " + plain(high) + unit(unit) + ", but was "
                        + (Double.isFinite(value) ? plain(value) : value));
    }

    /** Takes note of a fault unless a condition holds. */
    Limits holds(boolean condition, String fault) {
        if (!condition) {
            faults.add(fault);
        }
        return this;
    }

    /**
     * Ends the gathering.
     *
     * @throws ParameterException with all faults, if there are any
     */
    void enforce(CommandSpec command) {
        if (!faults.isEmpty()) {
            throw new ParameterException(command.commandLine(), String.join("\n  ", faults));
        }
    }

    private static String unit(String unit) {
        return unit.isEmpty() ? "" : " " + unit;
    }

    private static String plain(double value) {
        return Figures.plain(value, 9);
    }
}
