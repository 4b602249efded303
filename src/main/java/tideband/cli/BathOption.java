package tideband.cli;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import tideband.design.BathFile;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.sheet.Figures;

/** The bath: a preset of the metal, or a file. */
final class BathOption {
    @Option(
            names = "--bath",
            paramLabel = "BATH",
            description = "A preset of the metal (titanium and ti-6al-4v: phosphate, sulfuric, bicarbonate, carbonate;"
                    + " niobium and tantalum: phosphate, sulfuric) or a bath file. Default: phosphate.")
    private String bath;

    /**
     * The bath that was asked for.
     *
     * @throws ParameterException where the word is neither a preset nor a file
     * @throws Refusal where the file is at fault or for another metal
     */
    Bath of(Metal metal, CommandSpec command) throws Refusal {
        if (bath == null) {
            return BathPresets.usual(metal);
        }
        Optional<Bath> preset = BathPresets.named(metal, bath);
        return preset.isPresent() ? preset.get() : fromFile(metal, file(metal, command));
    }

    private Path file(Metal metal, CommandSpec command) {
        try {
            Path file = Path.of(bath);
            if (Files.isRegularFile(file)) {
                return file;
            }
        } catch (InvalidPathException e) {
            // Then it is no file either, and is answered as such.
        }
        String presets = BathPresets.of(metal).stream().map(Bath::name).collect(Collectors.joining(", "));
        throw new ParameterException(
                command.commandLine(),
                "Invalid value for option '--bath': '" + bath + "' is neither a preset for " + metal.key() + " ("
                        + presets + ") nor a file");
    }

    private Bath fromFile(Metal metal, Path file) throws Refusal {
        Reading<Bath> reading = BathFile.read(file);
        if (reading instanceof Reading.Faulty<Bath> faulty) {
            throw Faults.refusal(bath, faulty.faults());
        }
        Bath read = ((Reading.Read<Bath>) reading).value();
        if (read.metal() != metal) {
            throw Faults.refusal(
                    bath,
                    List.of(new Fault("/metal", "is " + read.metal().key(), "take a bath file for " + metal.key())));
        }
        return read;
    }

    /** Tells what the bath's numbers are and where they come from. */
    static void tell(CsvWriter csv, Bath bath) {
        csv.comment("bath " + bath.name() + " for " + bath.metal().key() + ": "
                + Figures.plain(bath.nmPerVolt(), 4) + " nm/V at 0.1 mA/cm2, field slope "
                + Figures.plain(bath.fieldSlope(), 3) + ", native film " + Figures.plain(bath.nativeNm(), 3)
                + " nm, efficiency " + Figures.plain(bath.efficiency(), 4) + ", "
                + Figures.plain(bath.resistanceOhm(), 4) + " ohm, ceiling " + Figures.plain(bath.ceilingVolts(), 2)
                + " V");
        csv.comment("bath source: " + bath.source().replaceAll("\\R", " "));
    }
}
