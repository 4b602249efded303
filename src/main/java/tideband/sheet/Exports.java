package tideband.sheet;

import java.io.IOException;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;

/**
 * Writes the files of a plan, all or none.
 *
 * <p>Everything is rendered in memory, written to temporary files in the directory, and only then moved into place, one
 * whole file at a time. If anything fails, the temporary files go and files that were replaced come back.
 */
public final class Exports {
    private Exports() {}

    /**
     * Writes {@code NAME-preview.svg}, {@code NAME-steps-a4.pdf}, {@code NAME-steps-letter.pdf}, {@code NAME-timing.csv},
     * {@code NAME-plan.json} and, if asked for, {@code NAME-preview.png}; files of these names are replaced.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @param directory where to write; made if it is missing
     * @param name what the names begin with
     * @param png whether to draw the PNG too, which needs a Java with fonts
     * @return the files written, in the order above
     * @throws IllegalArgumentException if the name is empty or holds a path separator
     * @throws IOException if a file cannot be written or the PNG cannot be drawn; nothing has then changed
     */
    public static List<Path> write(BenchPlan plan, Colours colours, Path directory, String name, boolean png)
            throws IOException {
        if (name.isBlank() || name.chars().anyMatch(c -> c == '/' || c == '\\' || c == ':' || c < ' ')) {
            throw new IllegalArgumentException(
                    "name must be the beginning of a file name, without / \\ or :, but was '" + name + "'");
        }
        Map<String, byte[]> files = new LinkedHashMap<>();
        byte[] preview = PreviewSvg.bytes(plan, colours);
        files.put(name + "-preview.svg", preview);
        for (Paper paper : Paper.values()) {
            files.put(name + "-steps-" + paper.key() + ".pdf", StepSheetPdf.bytes(plan, colours, paper));
        }
        files.put(name + "-timing.csv", TimingCsv.bytes(plan, colours));
        files.put(name + "-plan.json", PlanJson.bytes(plan));
        if (png) {
            files.put(name + "-preview.png", PreviewPng.bytes(preview));
        }
        Files.createDirectories(directory);
        return place(directory, files);
    }

    /**
     * Writes one file, whole or not at all; a file of that name is replaced.
     *
     * @param file the file; its folder must be there
     * @param bytes its content
     * @throws IOException if it cannot be written; nothing has then changed
     */
    public static void write(Path file, byte[] bytes) throws IOException {
        Path absolute = file.toAbsolutePath();
        if (absolute.getParent() == null) {
            throw new IOException(file + " is a folder, so no file of that name can be written");
        }
        place(absolute.getParent(), Map.of(absolute.getFileName().toString(), bytes));
    }

    /** Puts whole files into a directory, all or none. */
    static List<Path> place(Path directory, Map<String, byte[]> files) throws IOException {
        List<Placed> all = new ArrayList<>();
        boolean done = false;
        try {
            for (Map.Entry<String, byte[]> file : files.entrySet()) {
                Placed placed = new Placed(directory.resolve(file.getKey()));
                all.add(placed);
                placed.stage(file.getValue());
            }
            for (Placed placed : all) {
                placed.move();
            }
            done = true;
            return all.stream().map(p -> p.target).toList();
        } finally {
            for (Placed placed : all) {
                placed.settle(done);
            }
        }
    }

    /** One file on its way into place. */
    private static final class Placed {
        private final Path target;
        private Path fresh;
        private Path former;
        private boolean moved;

        private Placed(Path target) {
            this.target = target;
        }

        private void stage(byte[] bytes) throws IOException {
            if (Files.isDirectory(target)) {
                throw new IOException(target + " is a folder, so no file of that name can be written");
            }
            fresh = beside("new");
            Files.write(fresh, bytes);
            if (Files.exists(target)) {
                former = beside("old");
                Files.copy(target, former, StandardCopyOption.REPLACE_EXISTING, StandardCopyOption.COPY_ATTRIBUTES);
            }
        }

        /** A hidden name in the same folder, of this process alone. */
        private Path beside(String part) {
            return target.resolveSibling(
                    "." + target.getFileName() + "." + ProcessHandle.current().pid() + "." + part);
        }

        private void move() throws IOException {
            replace(fresh, target);
            moved = true;
        }

        /** Clears up: forwards when all files are in place, backwards when one is not. */
        private void settle(boolean done) throws IOException {
            if (!done && moved) {
                if (former != null) {
                    replace(former, target);
                } else {
                    Files.deleteIfExists(target);
                }
            }
            if (fresh != null) {
                Files.deleteIfExists(fresh);
            }
            if (former != null) {
                Files.deleteIfExists(former);
            }
        }

        private static void replace(Path from, Path to) throws IOException {
            try {
                Files.move(from, to, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } catch (AtomicMoveNotSupportedException e) {
                // Some file systems cannot; the plain move still never leaves half a file under the name.
                Files.move(from, to, StandardCopyOption.REPLACE_EXISTING);
            }
        }
    }
}
