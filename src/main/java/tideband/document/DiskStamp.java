package tideband.document;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.Optional;

/**
 * What a design's file and its bath's file held at one time. Two stamps are equal if the content is; the time a file was
 * written is of no account, as copying tools set it as they like.
 *
 * @param design SHA-256 of the design's file, empty where there is none
 * @param bath SHA-256 of the bath's file, empty where there is none
 */
public record DiskStamp(String design, String bath) {

    /**
     * Takes a stamp.
     *
     * @param file the design's file
     * @param bathFile the name of the bath's file beside it
     * @return the stamp of what is there now
     * @throws IOException if a file that is there cannot be read
     */
    public static DiskStamp of(Path file, Optional<String> bathFile) throws IOException {
        String bath = bathFile.isPresent() ? hash(file.toAbsolutePath().resolveSibling(bathFile.get())) : "";
        return new DiskStamp(hash(file), bath);
    }

    /**
     * Whether the design's file is not there.
     *
     * @return whether it is gone
     */
    public boolean gone() {
        return design.isEmpty();
    }

    private static String hash(Path file) throws IOException {
        if (!Files.isRegularFile(file)) {
            return "";
        }
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(Files.readAllBytes(file)));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
