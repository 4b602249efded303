package tideband.document;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import tideband.design.BathFile;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.oxide.Bath;

/**
 * Designs opened from and saved to files. A design whose bath is no preset has a bath file beside it, which other designs
 * may name too: it is written where there is none, left alone where it holds that bath already, and replaced only when told.
 */
public final class DocumentFile {

    private static final String ENDING = ".json";

    private DocumentFile() {}

    /**
     * Opens a design.
     *
     * @param file its file
     * @return the design, or every fault of its file
     */
    public static Reading<Opened> open(Path file) {
        try {
            // What changes between the reading and the stamp must show as a change later: so the stamp comes first.
            DiskStamp before = DiskStamp.of(file, Optional.empty());
            Reading<Design> reading = DesignFile.read(file);
            if (reading instanceof Reading.Faulty<Design> faulty) {
                return new Reading.Faulty<>(faulty.faults());
            }
            Design design = ((Reading.Read<Design>) reading).value();
            String bath = DiskStamp.of(file, design.bathFile()).bath();
            return new Reading.Read<>(new Opened(design, new DiskStamp(before.design(), bath)));
        } catch (IOException e) {
            return new Reading.Faulty<>(List.of(
                    new Fault("", "the file cannot be read (" + reason(e) + ")", "check that you may read it")));
        }
    }

    /**
     * Saves a design.
     *
     * @param file where to
     * @param design the design
     * @param known what the file is believed to hold; empty to replace whatever it holds
     * @param replaceBath whether another bath of the same file name may be replaced
     * @return what came of it
     * @throws IOException if it cannot be written; the design's file is then as it was
     */
    public static Saved save(Path file, Design design, Optional<DiskStamp> known, boolean replaceBath)
            throws IOException {
        Path target = file.toAbsolutePath();
        List<Fault> faults = DesignFile.faults(design);
        if (!faults.isEmpty()) {
            return new Saved.Refused(faults);
        }
        Optional<Fault> wrongPlace = wrongPlace(target, design);
        if (wrongPlace.isPresent()) {
            return new Saved.Refused(List.of(wrongPlace.get()));
        }
        if (known.isPresent() && changed(target, known.get())) {
            return new Saved.ChangedOnDisk();
        }
        byte[] bytes = DesignFile.bytes(design);
        Optional<Path> bathFile = design.bathFile().map(target::resolveSibling).filter(b -> !holds(b, design.bath()));
        if (bathFile.isEmpty()) {
            WholeFile.write(target, bytes);
        } else {
            if (!replaceBath && Files.exists(bathFile.get())) {
                String taken = bathFile.get().getFileName().toString();
                return new Saved.BathInTheWay(taken, freeName(target, taken, design));
            }
            // Both are written before either is put in place, so that a full disk harms neither.
            try (WholeFile.Staged bath = WholeFile.Staged.of(bathFile.get(), BathFile.bytes(design.bath()));
                    WholeFile.Staged whole = WholeFile.Staged.of(target, bytes)) {
                bath.place();
                whole.place();
            }
        }
        return new Saved.Done(DiskStamp.of(target, design.bathFile()));
    }

    /** A file that is gone can be written again without harm. */
    private static boolean changed(Path target, DiskStamp known) throws IOException {
        DiskStamp now = DiskStamp.of(target, Optional.empty());
        return !now.gone() && !now.design().equals(known.design());
    }

    private static Optional<Fault> wrongPlace(Path target, Design design) {
        if (target.getFileName() == null) {
            return Optional.of(new Fault("", "this is a folder", "name the file in it"));
        }
        String name = target.getFileName().toString();
        if (design.bathFile().filter(name::equalsIgnoreCase).isPresent()) {
            return Optional.of(new Fault("", "this is the name of the design's bath file", "save it by another name"));
        }
        if (Files.isRegularFile(target) && BathFile.read(target) instanceof Reading.Read<Bath>) {
            return Optional.of(
                    new Fault("", "this file is a bath, which designs may name", "save the design by another name"));
        }
        return Optional.empty();
    }

    private static boolean holds(Path file, Bath bath) {
        return Files.isRegularFile(file)
                && BathFile.read(file) instanceof Reading.Read<Bath> read
                && read.value().equals(bath);
    }

    private static String freeName(Path target, String taken, Design design) {
        String stem = taken.endsWith(ENDING) ? taken.substring(0, taken.length() - ENDING.length()) : taken;
        String plain = stem.replaceAll(" \\d+$", "");
        for (int number = 2; ; number++) {
            String name = plain + " " + number + ENDING;
            Path file = target.resolveSibling(name);
            boolean own = target.getFileName().toString().equalsIgnoreCase(name);
            if (!own && (!Files.exists(file) || holds(file, design.bath()))) {
                return name;
            }
        }
    }

    /**
     * What went wrong, without the Java of it.
     *
     * @param trouble an exception of reading or writing
     * @return words for people
     */
    public static String reason(IOException trouble) {
        return Reasons.of(trouble);
    }
}
