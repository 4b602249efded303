package tideband.cli;

import java.io.PrintWriter;
import java.util.concurrent.Callable;
import java.util.stream.DoubleStream;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tideband.oxide.Bath;
import tideband.oxide.Growth;
import tideband.oxide.Metal;
import tideband.sheet.Figures;

/** Film against time at set volts, from the growth law. */
@Command(
        name = "grow",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Grows film on bare metal at set volts, by the high-field law.",
        description = {
            "",
            "Columns of the CSV:",
            "  t_s,film_nm,current_mA_cm2,supply_V",
            "",
            "supply_V is what stands at the supply's terminals: the set volts, or less for as long as the current limit holds."
                    + " The first row, at 0 s, is the native film at the moment the supply is switched on; the last is at exactly"
                    + " --seconds. Between them rows are --every apart. Without it there are 200 even intervals, and the first of"
                    + " them is halved eight times over towards 0 s, where film grows fastest.",
            ""
        },
        footer = {
            "",
            "The lantern maker wonders what a minute instead of half a minute does at 60 V:",
            "  tideband grow --metal titanium --bath phosphate --volts 60 --seconds 60 --every 10",
            "and whether half an ampere would do for a piece of 40 cm2:",
            "  tideband grow --metal titanium --volts 60 --seconds 60 --area-cm2 40 --amps 0.5",
            "",
            "Exit codes: 0 done, 1 the bath file is at fault, 2 wrong use."
        })
final class GrowCommand implements Callable<Integer> {
    private static final int INTERVALS = 200;
    private static final int HALVINGS = 8;
    private static final int MOST_ROWS = 100_000;
    private static final int TIME_DECIMALS = 6;

    @Spec
    private CommandSpec spec;

    @Option(
            names = "--metal",
            required = true,
            converter = Words.OfMetal.class,
            paramLabel = "METAL",
            description = "titanium, ti-6al-4v, niobium or tantalum.")
    private Metal metal;

    @Mixin
    private BathOption bathOption;

    @Option(
            names = "--volts",
            required = true,
            converter = Decimal.class,
            paramLabel = "V",
            description = "The supply's set volts, 0 to 500 V. Above the bath's ceiling the law alone is no guide.")
    private double volts;

    @Option(
            names = "--seconds",
            required = true,
            converter = Decimal.class,
            paramLabel = "S",
            description = "How long, 0.1 to 1000000 s.")
    private double seconds;

    @Option(
            names = "--area-cm2",
            converter = Decimal.class,
            defaultValue = "10",
            paramLabel = "CM2",
            description = "Wet area, 0.001 to 100000 cm2. Default: ${DEFAULT-VALUE}.")
    private double areaCm2;

    @Option(
            names = "--amps",
            converter = Decimal.class,
            defaultValue = "1",
            paramLabel = "A",
            description = "The supply's current limit, 0.000001 to 10000 A. Default: ${DEFAULT-VALUE}.")
    private double amps;

    @Option(
            names = "--resistance-ohm",
            converter = Decimal.class,
            paramLabel = "R",
            description = "Between the terminals and the film, 0 to 10000 ohm. Default: the bath's.")
    private Double resistanceOhm;

    @Option(
            names = "--efficiency",
            converter = Decimal.class,
            paramLabel = "E",
            description = "Share of the current that grows film, 0.01 to 1. Default: the bath's.")
    private Double efficiency;

    @Option(
            names = "--every",
            converter = Decimal.class,
            paramLabel = "S",
            description = "Seconds from row to row, at least 0.0001 s; at most 100000 rows.")
    private Double everyS;

    @Override
    public Integer call() throws Refusal {
        check();
        Bath bath = bathOption.of(metal, spec);
        if (resistanceOhm != null) {
            bath = bath.withResistanceOhm(resistanceOhm);
        }
        if (efficiency != null) {
            bath = bath.withEfficiency(efficiency);
        }
        if (volts > bath.ceilingVolts()) {
            PrintWriter talk = spec.commandLine().getErr();
            talk.print("tideband grow: " + Figures.plain(volts, 3) + " V is above the bath's ceiling of "
                    + Figures.plain(bath.ceilingVolts(), 2)
                    + " V, where film breaks down; the law knows nothing of that\n");
        }
        CsvWriter csv = new CsvWriter(spec.commandLine().getOut());
        BathOption.tell(csv, bath);
        csv.comment(Figures.plain(volts, 6) + " V, limit " + Figures.plain(amps, 6) + " A, " + Figures.plain(areaCm2, 6)
                + " cm2");
        csv.row("t_s", "film_nm", "current_mA_cm2", "supply_V");
        Growth growth = new Growth(bath, amps, new double[] {bath.nativeNm()}, new double[] {areaCm2});
        growth.settle(volts);
        double timeS = 0;
        for (double nextS : times()) {
            growth.advance(nextS - timeS, volts, volts);
            timeS = nextS;
            csv.row(
                    Figures.fixed(timeS, TIME_DECIMALS),
                    Figures.fixed(growth.filmNm(0), 4),
                    Figures.fixed(growth.amps() * 1e3 / areaCm2, 6),
                    Figures.fixed(growth.terminalVolts(), 4));
        }
        return Program.DONE;
    }

    private void check() {
        Limits limits = new Limits()
                .within("--volts", volts, 0, 500, "V")
                .within("--seconds", seconds, 0.1, 1e6, "s")
                .within("--area-cm2", areaCm2, 1e-3, 1e5, "cm2")
                .within("--amps", amps, 1e-6, 1e4, "A");
        if (resistanceOhm != null) {
            limits.within("--resistance-ohm", resistanceOhm, 0, 1e4, "ohm");
        }
        if (efficiency != null) {
            limits.within("--efficiency", efficiency, 0.01, 1, "");
        }
        if (everyS != null) {
            limits.within("--every", everyS, 1e-4, 1e6, "s")
                    .holds(
                            !(seconds / everyS > MOST_ROWS),
                            "--every gives more than " + MOST_ROWS + " rows; choose a larger one");
        }
        limits.enforce(spec);
    }

    /** The times of the rows as they are written, rising from 0 to the end. */
    private double[] times() {
        DoubleStream times = everyS != null ? evenly(everyS) : halvedFirst(seconds / INTERVALS);
        return DoubleStream.concat(times.filter(timeS -> timeS < seconds), DoubleStream.of(seconds))
                .map(timeS -> Double.parseDouble(Figures.fixed(timeS, TIME_DECIMALS)))
                .distinct()
                .toArray();
    }

    private DoubleStream evenly(double intervalS) {
        return DoubleStream.iterate(0, i -> i * intervalS < seconds * (1 - 1e-12), i -> i + 1)
                .map(i -> i * intervalS);
    }

    private DoubleStream halvedFirst(double intervalS) {
        DoubleStream halves =
                DoubleStream.iterate(HALVINGS, i -> i >= 1, i -> i - 1).map(i -> intervalS * Math.pow(2, -i));
        return DoubleStream.concat(
                DoubleStream.concat(DoubleStream.of(0), halves),
                evenly(intervalS).skip(1));
    }
}
