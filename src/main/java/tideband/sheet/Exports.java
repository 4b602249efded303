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
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;

/**
 * Writes the files of a plan, all or none.
 *
 * <p>Everything is rendered in memory, written to temporary files in the directory, and only then moved into place, one
 * whole file at a time. If anything fails, the temporary files go and files that were replaced come back.
 */
public final class Exports {
    private static final String PREVIEW = "-preview.svg";
    private static final String TIMING = "-timing.csv";
    private static final String PLAN = "-plan.json";
    private static final String PIXELS = "-preview.png";

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
        return write(plan, colours, directory, name, png, stage -> {}, () -> false);
    }

    /**
     * Writes the same files as {@link #write(BenchPlan, Colours, Path, String, boolean)}, telling how it goes.
     *
     * @param plan the plan
     * @param colours the colours of films for the plan's design
     * @param directory where to write; made if it is missing
     * @param name what the names begin with
     * @param png whether to draw the PNG too, which needs a Java with fonts
     * @param progress told in a few words what is being done: {@link #stages} times
     * @param cancelled asked at every stage whether to give up; giving up throws {@link CancellationException} and leaves
     *     everything as it was
     * @return the files written, in the order of {@link #names}
     * @throws IllegalArgumentException if the name is empty or holds a path separator
     * @throws IOException if a file cannot be written or the PNG cannot be drawn; nothing has then changed
     */
    public static List<Path> write(
            BenchPlan plan,
            Colours colours,
            Path directory,
            String name,
            boolean png,
            Consumer<String> progress,
            BooleanSupplier cancelled)
            throws IOException {
        if (!canName(name)) {
            throw new IllegalArgumentException(
                    "name must be the beginning of a file name, without / \\ or :, but was '" + name + "'");
        }
        Consumer<String> stage = what -> {
            progress.accept(what);
            if (cancelled.getAsBoolean()) {
                throw new CancellationException("given up while " + what);
            }
        };
        Map<String, byte[]> files = new LinkedHashMap<>();
        stage.accept("drawing the preview");
        byte[] preview = PreviewSvg.bytes(plan, colours);
        files.put(name + PREVIEW, preview);
        for (Paper paper : Paper.values()) {
            stage.accept("drawing the step sheet for " + paper.key() + " paper");
            files.put(name + steps(paper), StepSheetPdf.bytes(plan, colours, paper));
        }
        stage.accept("listing the pulls and the plan");
        files.put(name + TIMING, TimingCsv.bytes(plan, colours));
        files.put(name + PLAN, PlanJson.bytes(plan));
        if (png) {
            stage.accept("drawing the preview in pixels");
            files.put(name + PIXELS, PreviewPng.bytes(preview));
        }
        stage.accept("writing the files");
        Files.createDirectories(directory);
        return place(directory, files);
    }

    /**
     * Whether file names can begin so.
     *
     * @param name what the names are to begin with
     * @return false if it is blank or holds what separates the parts of a path
     */
    public static boolean canName(String name) {
        return !name.isBlank() && name.chars().noneMatch(c -> c == '/' || c == '\\' || c == ':' || c < ' ');
    }

    /**
     * The names of the files that writing gives.
     *
     * @param name what they begin with
     * @param png whether the PNG is among them
     * @return the names, in the order they are written
     */
    public static List<String> names(String name, boolean png) {
        List<String> names = new ArrayList<>();
        names.add(name + PREVIEW);
        for (Paper paper : Paper.values()) {
            names.add(name + steps(paper));
        }
        names.add(name + TIMING);
        names.add(name + PLAN);
        if (png) {
            names.add(name + PIXELS);
        }
        return names;
    }

    /**
     * How many stages writing has.
     *
     * @param png whether the PNG is drawn too
     * @return the number of times progress is told
     */
    public static int stages(boolean png) {
        return Paper.values().length + (png ? 4 : 3);
    }

    /**
     * What the name of a step sheet ends with.
     *
     * @param paper the paper it is for
     * @return such as {@code -steps-a4.pdf}
     */
    public static String steps(Paper paper) {
        return "-steps-" + paper.key() + ".pdf";
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
