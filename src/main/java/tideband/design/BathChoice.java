package tideband.design;

import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;

/** Finds the bath a design names: a preset of its metal, or else a file beside the design. */
final class BathChoice {

    /** A plain file name: it does not begin with a dot and holds nothing that could lead elsewhere. */
    static final Pattern PLAIN_NAME = Pattern.compile("^[^./\\\\:*?\"<>|\\p{C}][^/\\\\:*?\"<>|\\p{C}]{0,99}$");

    private final Optional<Path> folder;

    BathChoice(Optional<Path> folder) {
        this.folder = folder;
    }

    Optional<Bath> bath(Members design, Metal metal) {
        if (!design.has("bath")) {
            return Optional.of(BathPresets.usual(metal));
        }
        Optional<String> given = design.text("bath");
        if (given.isEmpty()) {
            return Optional.empty();
        }
        String name = given.get();
        return BathPresets.named(metal, name).or(() -> fromFile(design, metal, name));
    }

    private Optional<Bath> fromFile(Members design, Metal metal, String name) {
        List<String> presets = BathPresets.of(metal).stream().map(Bath::name).toList();
        String right = "the presets for " + metal.key() + " are " + Shown.quoted(presets)
                + "; any other name is a bath file beside the design";
        if (!PLAIN_NAME.matcher(name).matches()) {
            design.fault("bath", "is " + Shown.quoted(name) + ", neither a preset nor a plain file name", right);
            return Optional.empty();
        }
        String meant = Nearest.to(name, presets)
                .map(near -> "did you mean " + Shown.quoted(near) + "? ")
                .orElse("");
        if (folder.isEmpty()) {
            design.fault("bath", "is " + Shown.quoted(name) + ", which is no preset", meant + right);
            return Optional.empty();
        }
        Path file = folder.get().resolve(name);
        // A link could lead out of the folder.
        if (!Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)) {
            design.fault(
                    "bath",
                    "is " + Shown.quoted(name) + ", neither a preset nor a regular file beside the design",
                    meant + right);
            return Optional.empty();
        }
        Reading<Bath> reading = BathFile.read(file);
        if (reading instanceof Reading.Faulty<Bath> faulty) {
            for (Fault fault : faulty.faults()) {
                String place = fault.at().isEmpty() ? "" : " at " + fault.at();
                design.fault("bath", "in the file " + Shown.quoted(name) + place + ": " + fault.wrong(), fault.right());
            }
            return Optional.empty();
        }
        Bath bath = ((Reading.Read<Bath>) reading).value();
        if (bath.metal() != metal) {
            design.fault(
                    "bath",
                    "the file " + Shown.quoted(name) + " is for " + bath.metal().key(),
                    "take one for the design's metal, " + metal.key());
            return Optional.empty();
        }
        return Optional.of(bath);
    }
}
