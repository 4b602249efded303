package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

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
                ? new DesignReader(faults, new BathChoice(folder)).read(root.get())
                : new Reading.Faulty<>(faults.list());
    }

    /**
     * Reads a design from memory, with its bath's file from there too.
     *
     * @param bytes the file's content
     * @param besides the content of a file beside it by its name, where there is one
     * @return the design or every fault
     */
    public static Reading<Design> read(byte[] bytes, Function<String, Optional<byte[]>> besides) {
        Faults faults = new Faults();
        Optional<JsonNode> root = JsonText.parse(bytes, faults);
        return root.isPresent()
                ? new DesignReader(
                                faults,
                                new BathChoice(name -> besides.apply(name).map(BathFile::read)))
                        .read(root.get())
                : new Reading.Faulty<>(faults.list());
    }

    /**
     * Writes a design. A bath that is no preset has a file of its own, named by {@link Design#bathFile}, which {@link
     * BathFile#bytes} writes.
     *
     * @param design the design
     * @return the content of its file: UTF-8, always the same for the same design; read again, it gives an equal one unless
     *     it has {@link #faults}
     */
    public static byte[] bytes(Design design) {
        return new DesignWriter(design).bytes();
    }

    /**
     * What stands in the way of writing a design so that it can be read again: values beyond what a file can hold.
     *
     * @param design any design
     * @return the faults its file and that of its bath would have; none if all is well
     */
    public static List<Fault> faults(Design design) {
        Faults faults = new Faults();
        JsonNode root = JsonText.parse(bytes(design), faults).orElseThrow();
        BathChoice baths = new BathChoice(name -> Optional.of(BathFile.read(BathFile.bytes(design.bath()))));
        Reading<Design> reading = new DesignReader(faults, baths).read(root);
        return reading instanceof Reading.Faulty<Design> faulty ? faulty.faults() : List.of();
    }
}
