package tideband.document;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;

/** The designs opened or saved last, in a file that several windows share. */
public final class RecentFiles {
    /** The most that are kept. */
    public static final int MOST = 10;

    private final Path file;

    /**
     * A list in a file.
     *
     * @param file its file; it need not be there
     */
    public RecentFiles(Path file) {
        this.file = file;
    }

    /**
     * The designs, the last first.
     *
     * @return absolute paths; empty if the list cannot be read
     */
    public synchronized List<Path> list() {
        List<Path> paths = new ArrayList<>();
        try {
            String text = Files.exists(file) ? new String(Files.readAllBytes(file), StandardCharsets.UTF_8) : "";
            for (String line : text.lines().toList()) {
                add(paths, line);
            }
        } catch (IOException unreadable) {
            // A list of conveniences; a new one begins.
            return List.of();
        }
        return List.copyOf(paths.subList(0, Math.min(paths.size(), MOST)));
    }

    private static void add(List<Path> paths, String line) {
        try {
            Path path = Path.of(line);
            if (path.isAbsolute() && !paths.contains(path)) {
                paths.add(path);
            }
        } catch (InvalidPathException damaged) {
            // A line that names no file is no recent file.
            return;
        }
    }

    /**
     * Puts a design first.
     *
     * @param opened its file
     * @throws IOException if the list cannot be written
     */
    public synchronized void opened(Path opened) throws IOException {
        Path path = opened.toAbsolutePath().normalize();
        List<Path> paths = new ArrayList<>(list());
        paths.remove(path);
        paths.add(0, path);
        write(paths);
    }

    /**
     * Takes a design off the list, as one that is no longer there.
     *
     * @param gone its file
     * @throws IOException if the list cannot be written
     */
    public synchronized void forget(Path gone) throws IOException {
        List<Path> paths = new ArrayList<>(list());
        if (paths.remove(gone.toAbsolutePath().normalize())) {
            write(paths);
        }
    }

    private void write(List<Path> paths) throws IOException {
        StringBuilder text = new StringBuilder();
        paths.stream()
                .map(Path::toString)
                .filter(path -> path.lines().count() == 1)
                .limit(MOST)
                .forEach(path -> text.append(path).append('\n'));
        Files.createDirectories(file.toAbsolutePath().getParent());
        WholeFile.write(file, text.toString().getBytes(StandardCharsets.UTF_8));
    }
}
