package tideband.window.files;

import java.nio.file.Path;

/** Names for design files. */
final class FileNames {
    private static final String ENDING = ".json";
    private static final int LONGEST = 60;

    private FileNames() {}

    /** A file name for a drawing of this name, which every system takes. */
    static String of(String name) {
        String plain = name.replaceAll("[/\\\\:*?\"<>|\\p{C}\\s.]+", " ").strip();
        int end = Math.min(plain.codePointCount(0, plain.length()), LONGEST);
        String cut = plain.substring(0, plain.offsetByCodePoints(0, end)).strip();
        return (cut.isEmpty() ? "drawing" : cut) + ENDING;
    }

    /** The file with an ending, if it was given none. */
    static Path withEnding(Path file) {
        String name = file.getFileName().toString();
        return name.indexOf('.', 1) > 0 ? file : file.resolveSibling(name + ENDING);
    }
}
