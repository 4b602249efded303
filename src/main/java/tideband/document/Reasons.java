package tideband.document;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.ReadOnlyFileSystemException;

/** Why a file could not be read or written, for people. */
final class Reasons {

    private Reasons() {}

    static String of(IOException trouble) {
        if (trouble instanceof AccessDeniedException denied) {
            return "you have no right to " + denied.getFile();
        }
        if (trouble instanceof NoSuchFileException missing) {
            return "there is no " + missing.getFile();
        }
        if (trouble.getCause() instanceof ReadOnlyFileSystemException) {
            return "the disk can only be read";
        }
        if (trouble instanceof FileSystemException named && named.getReason() != null) {
            return named.getReason() + ": " + named.getFile();
        }
        return trouble.getMessage() == null ? "the reason is not known" : trouble.getMessage();
    }
}
