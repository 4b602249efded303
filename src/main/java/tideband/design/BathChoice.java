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

    private static final int LONGEST_STEM = 80;

    private final Optional<Shelf> shelf;

    /** Where baths that are no presets come from. */
    interface Shelf {
        /** The bath of that name; nothing if there is no file for it. */
        Optional<Reading<Bath>> bath(String name);
    }

    /** Looks for baths in a folder; without one, only presets can be named. */
    BathChoice(Optional<Path> folder) {
        this.shelf = folder.map(f -> name -> beside(f.resolve(name)));
    }

    /** Takes baths from elsewhere. */
    BathChoice(Shelf shelf) {
        this.shelf = Optional.of(shelf);
    }

    private static Optional<Reading<Bath>> beside(Path file) {
        // A link could lead out of the folder.
        return Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)
                ? Optional.of(BathFile.read(file))
                : Optional.empty();
    }

    /**
     * A bath with the file it stands in.
     *
     * @param bath the bath
     * @param file the file's name; empty for a preset
     */
    record Chosen(Bath bath, Optional<String> file) {}

    Optional<Chosen> bath(Members design, Metal metal) {
        if (!design.has("bath")) {
            return Optional.of(new Chosen(BathPresets.usual(metal), Optional.empty()));
        }
        Optional<String> given = design.text("bath");
        if (given.isEmpty()) {
            return Optional.empty();
        }
        String name = given.get();
        return BathPresets.named(metal, name)
                .map(bath -> new Chosen(bath, Optional.empty()))
                .or(() -> fromFile(design, metal, name).map(bath -> new Chosen(bath, Optional.of(name))));
    }

    /** Whether a design of this metal can name a bath file so. */
    static boolean isFileName(Metal metal, String name) {
        return PLAIN_NAME.matcher(name).matches()
                && BathPresets.named(metal, name).isEmpty();
    }

    /** The name of a file for a bath that has none yet, made from its own; empty for a preset, which needs none. */
    static Optional<String> fileFor(Bath bath) {
        if (BathPresets.named(bath.metal(), bath.name()).filter(bath::equals).isPresent()) {
            return Optional.empty();
        }
        String stem =
                bath.name().replaceAll("[/\\\\:*?\"<>|\\p{C}\\s]+", " ").strip().replaceAll("^\\.+", "");
        int end = Math.min(stem.codePointCount(0, stem.length()), LONGEST_STEM);
        stem = stem.substring(0, stem.offsetByCodePoints(0, end)).strip();
        return Optional.of((stem.isEmpty() ? "bath" : stem) + ".json");
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
        if (shelf.isEmpty()) {
            design.fault("bath", "is " + Shown.quoted(name) + ", which is no preset", meant + right);
            return Optional.empty();
        }
        Optional<Reading<Bath>> found = shelf.get().bath(name);
        if (found.isEmpty()) {
            design.fault(
                    "bath",
                    "is " + Shown.quoted(name) + ", neither a preset nor a regular file beside the design",
                    meant + right);
            return Optional.empty();
        }
        Reading<Bath> reading = found.get();
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
