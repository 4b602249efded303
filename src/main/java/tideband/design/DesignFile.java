package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.Optional;

/**
 * A design's file: JSON in UTF-8 with {@code "format": "tideband-design"}. Its keys, limits and defaults are written down
 * in the JSON Schema {@code tideband-design.schema.json} beside this class.
 *
 * <p>A file at fault is answered with all its faults, never with an exception. Nothing in a file is put right in silence.
 */
public final class DesignFile {

    private DesignFile() {}

    /**
     * Reads a design.
     *
     * @param file the file; a bath of its own is looked for beside it
     * @return the design or every fault
     */
    public static Reading<Design> read(Path file) {
        Faults faults = new Faults();
        Path folder = file.toAbsolutePath().getParent();
        Optional<byte[]> bytes = JsonText.bytes(file, faults);
        return bytes.isPresent() ? read(bytes.get(), Optional.ofNullable(folder)) : new Reading.Faulty<>(faults.list());
    }

    /**
     * Reads a design from memory.
     *
     * @param bytes the file's content
     * @param folder where a bath of its own is looked for; without one, only presets can be named
     * @return the design or every fault
     */
    public static Reading<Design> read(byte[] bytes, Optional<Path> folder) {
        Faults faults = new Faults();
        Optional<JsonNode> root = JsonText.parse(bytes, faults);
        return root.isPresent()
                ? new DesignReader(faults, folder).read(root.get())
                : new Reading.Faulty<>(faults.list());
    }
}
