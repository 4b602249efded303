package tideband.window.files;

import java.nio.file.Path;
import java.util.Optional;
import tideband.design.Design;
import tideband.document.DiskStamp;

/**
 * Where the drawing stands with the disk.
 *
 * @param file its file, once it has one
 * @param stamp what the file held when last looked at
 * @param saved the design that need not be saved again: that of the file, or of a new drawing as it began; empty if what is
 *     here is nowhere else
 */
record Held(Optional<Path> file, Optional<DiskStamp> stamp, Optional<Design> saved) {

    static Held begun(Design design) {
        return new Held(Optional.empty(), Optional.empty(), Optional.of(design));
    }

    static Held in(Path file, DiskStamp stamp, Optional<Design> saved) {
        return new Held(Optional.of(file.toAbsolutePath().normalize()), Optional.of(stamp), saved);
    }

    boolean differs(Design design) {
        return saved.isEmpty() || !saved.get().equals(design);
    }

    /** What the drawing is called. */
    String name(Design design) {
        if (file.isEmpty()) {
            return design.title();
        }
        String name = file.get().getFileName().toString();
        return name.endsWith(".json") ? name.substring(0, name.length() - ".json".length()) : name;
    }

    Optional<Path> folder() {
        return file.map(Path::getParent);
    }
}
