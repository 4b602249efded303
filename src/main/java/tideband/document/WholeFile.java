package tideband.document;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.PosixFilePermission;
import java.util.Comparator;
import java.util.List;
import java.util.Set;
import java.util.UUID;
import java.util.stream.Stream;

/** Files written whole or not at all, and on the disk before anything says that they are. */
final class WholeFile {

    private WholeFile() {}

    /** Puts a file in place of what was there; if that fails, what was there stays. */
    static void write(Path file, byte[] bytes) throws IOException {
        try (Staged staged = Staged.of(file, bytes)) {
            staged.place();
        }
    }

    /** A file written beside the one it is to replace. */
    static final class Staged implements AutoCloseable {
        private final Path fresh;
        private final Path target;

        private Staged(Path fresh, Path target) {
            this.fresh = fresh;
            this.target = target;
        }

        static Staged of(Path file, byte[] bytes) throws IOException {
            // Through a link the file it leads to is replaced, not the link.
            Path target = Files.exists(file) ? file.toRealPath() : file.toAbsolutePath();
            if (Files.isDirectory(target)) {
                throw new IOException(file + " is a folder");
            }
            if (Files.exists(target) && !Files.isWritable(target)) {
                throw new IOException(file + " is write-protected");
            }
            Path fresh = target.resolveSibling("." + target.getFileName() + "." + UUID.randomUUID() + ".new");
            Staged staged = new Staged(fresh, target);
            try {
                writeThrough(fresh, bytes);
                if (Files.exists(target) && Files.getFileStore(target).supportsFileAttributeView("posix")) {
                    Set<PosixFilePermission> rights = Files.getPosixFilePermissions(target);
                    Files.setPosixFilePermissions(fresh, rights);
                }
            } catch (IOException e) {
                staged.close();
                throw e;
            }
            return staged;
        }

        void place() throws IOException {
            try {
                Files.move(fresh, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } catch (AtomicMoveNotSupportedException e) {
                // Some file systems cannot; the plain move still never leaves half a file under the name.
                Files.move(fresh, target, StandardCopyOption.REPLACE_EXISTING);
            }
            syncFolder(target.getParent());
        }

        @Override
        public void close() throws IOException {
            Files.deleteIfExists(fresh);
        }
    }

    /** A new file with its content on the disk when this returns. */
    static void writeThrough(Path file, byte[] bytes) throws IOException {
        try (FileChannel channel = FileChannel.open(file, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE)) {
            ByteBuffer left = ByteBuffer.wrap(bytes);
            while (left.hasRemaining()) {
                channel.write(left);
            }
            channel.force(true);
        }
    }

    /** Names in the folder on the disk, on systems where that can be asked for. */
    static void syncFolder(Path folder) {
        try (FileChannel channel = FileChannel.open(folder, StandardOpenOption.READ)) {
            channel.force(true);
        } catch (IOException notEverywhere) {
            // Windows opens no folders; there the file system looks after its names itself.
            return;
        }
    }

    /** A folder with all that is in it, gone. */
    static void deleteFolder(Path folder) throws IOException {
        List<Path> all;
        try (Stream<Path> inside = Files.walk(folder)) {
            all = inside.sorted(Comparator.reverseOrder()).toList();
        }
        for (Path path : all) {
            Files.deleteIfExists(path);
        }
    }
}
