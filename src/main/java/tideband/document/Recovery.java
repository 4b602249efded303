package tideband.document;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.UUID;
import java.util.function.Predicate;
import java.util.stream.Stream;
import tideband.design.Design;
import tideband.design.Reading;

/**
 * Keeps open drawings where they are found again after a crash. Each open drawing has a folder in the store, named after the
 * running program it belongs to; it goes when the drawing is saved or closed. What belongs to a program that no longer runs
 * was left behind. Programs that run at the same time share the store and touch only what is theirs.
 */
public final class Recovery {
    private static final String STORE = "open-drawings";
    private static final String SET_ASIDE = "damaged-drawings";

    private final Path state;
    private final Path store;
    private final Owner self;
    private final Predicate<Owner> alive;

    /**
     * A store for this program.
     *
     * @param state the folder the program keeps its own in, such as {@link StateFolder#usual}; it need not be there
     */
    public Recovery(Path state) {
        this(state, Owner.self(), Owner::alive);
    }

    Recovery(Path state, Owner self, Predicate<Owner> alive) {
        this.state = state;
        this.store = state.resolve(STORE);
        this.self = self;
        this.alive = alive;
    }

    /**
     * What was left behind.
     *
     * @param drawings the drawings, the last kept first
     * @param notes what was found damaged and where it lies now, for the user
     */
    public record LeftBehind(List<Leftover> drawings, List<String> notes) {

        // Copies the lists, so that the value cannot change.
        public LeftBehind {
            drawings = List.copyOf(drawings);
            notes = List.copyOf(notes);
        }
    }

    /** The place of one open drawing in the store; may be used on any thread. */
    public final class Slot {
        private final String drawing;
        private Optional<Path> kept;
        private long number;

        private Slot(String drawing, Optional<Path> kept, long number) {
            this.drawing = drawing;
            this.kept = kept;
            this.number = number;
        }

        /**
         * Keeps a drawing as it stands, in place of what was kept before.
         *
         * @param design the drawing
         * @param belongs the file it was opened from or saved to
         * @throws IOException if it cannot be kept; what was kept before still is
         */
        public synchronized void keep(Design design, Optional<Path> belongs) throws IOException {
            number++;
            Path fresh = Snapshot.write(store, Snapshot.name(self, drawing, number), design, belongs);
            Optional<Path> before = kept;
            kept = Optional.of(fresh);
            if (before.isPresent()) {
                Snapshot.discard(before.get());
            }
        }

        /**
         * Forgets the drawing, as it is saved or closed.
         *
         * @throws IOException if it cannot be taken out of the store
         */
        public synchronized void clear() throws IOException {
            if (kept.isPresent()) {
                Snapshot.discard(kept.get());
                kept = Optional.empty();
            }
        }
    }

    /**
     * A place for a drawing.
     *
     * @return the place, with nothing kept yet
     */
    public Slot slot() {
        return new Slot(UUID.randomUUID().toString(), Optional.empty(), 0);
    }

    /**
     * Looks for drawings that were left behind. What is damaged is set aside, not deleted.
     *
     * @return the drawings and notes
     */
    public LeftBehind leftBehind() {
        List<Leftover> drawings = new ArrayList<>();
        List<String> notes = new ArrayList<>();
        try {
            for (List<Snapshot> snapshots : orphans().values()) {
                newest(snapshots, notes).ifPresent(drawings::add);
            }
        } catch (IOException e) {
            notes.add("Whether drawings were left open when Tideband last stopped is not known: " + store
                    + " cannot be read (" + Reasons.of(e) + "). Check that you may read it.");
        }
        drawings.sort(Comparator.comparing(Leftover::at).reversed().thenComparing(Leftover::folder));
        return new LeftBehind(drawings, notes);
    }

    /** The snapshots of programs that no longer run, by drawing, the newest first. */
    private Map<String, List<Snapshot>> orphans() throws IOException {
        Map<String, List<Snapshot>> orphans = new TreeMap<>();
        if (!Files.isDirectory(store)) {
            return orphans;
        }
        try (Stream<Path> folders = Files.list(store)) {
            for (Path folder : folders.sorted().toList()) {
                if (folder.getFileName().toString().endsWith(Snapshot.DISCARDED)) {
                    deleteQuietly(folder);
                }
                Snapshot.in(folder)
                        .filter(s -> !s.owner().equals(self) && !alive.test(s.owner()))
                        .ifPresent(s -> orphans.computeIfAbsent(s.drawing(), d -> new ArrayList<>())
                                .add(s));
            }
        }
        orphans.values()
                .forEach(list ->
                        list.sort(Comparator.comparingLong(Snapshot::number).reversed()));
        return orphans;
    }

    private Optional<Leftover> newest(List<Snapshot> snapshots, List<String> notes) {
        Optional<Leftover> found = Optional.empty();
        for (Snapshot snapshot : snapshots) {
            if (found.isPresent() || (!snapshot.whole() && empty(snapshot.folder()))) {
                deleteQuietly(snapshot.folder());
                continue;
            }
            Reading<Leftover> reading = snapshot.read();
            if (reading instanceof Reading.Read<Leftover> read) {
                found = Optional.of(read.value());
            } else if (Files.isDirectory(snapshot.folder())) {
                setAside(
                        snapshot.folder(),
                        ((Reading.Faulty<Leftover>) reading).faults().get(0).wrong(),
                        notes);
            }
        }
        return found;
    }

    private static boolean empty(Path folder) {
        try (Stream<Path> inside = Files.list(folder)) {
            return inside.findAny().isEmpty();
        } catch (IOException unknown) {
            // Then it is not taken for empty, and is set aside.
            return false;
        }
    }

    private static void deleteQuietly(Path folder) {
        try {
            WholeFile.deleteFolder(folder);
        } catch (IOException nextTime) {
            // Nobody misses it, and it is tried again at the next start.
            return;
        }
    }

    private void setAside(Path folder, String reason, List<String> notes) {
        try {
            Path aside = Files.createDirectories(state.resolve(SET_ASIDE)).resolve(folder.getFileName());
            Files.move(folder, aside);
            notes.add("A drawing was left open when Tideband last stopped, but what was kept of it is damaged ("
                    + reason + "). Nothing was deleted: it lies in " + aside + ".");
        } catch (NoSuchFileException taken) {
            // Another window was faster.
            return;
        } catch (IOException e) {
            notes.add("A drawing was left open when Tideband last stopped, but what was kept of it in " + folder
                    + " is damaged (" + reason + ") and cannot be set aside (" + Reasons.of(e) + ").");
        }
    }

    /**
     * Takes a drawing that was left behind as one of this program.
     *
     * @param leftover the drawing
     * @return its place, where it goes on being kept; nothing if another window took or discarded it first
     * @throws IOException if the store cannot be changed
     */
    public Optional<Slot> take(Leftover leftover) throws IOException {
        Snapshot snapshot = Snapshot.in(leftover.folder()).orElse(null);
        if (snapshot == null) {
            return Optional.empty();
        }
        String drawing = UUID.randomUUID().toString();
        Path own = store.resolve(Snapshot.name(self, drawing, snapshot.number()));
        try {
            // One rename succeeds, whoever else tries.
            Files.move(leftover.folder(), own, StandardCopyOption.ATOMIC_MOVE);
            return Optional.of(new Slot(drawing, Optional.of(own), snapshot.number()));
        } catch (NoSuchFileException taken) {
            return Optional.empty();
        }
    }

    /**
     * Discards a drawing that was left behind.
     *
     * @param leftover the drawing
     * @throws IOException if it cannot be taken out of the store
     */
    public void discard(Leftover leftover) throws IOException {
        try {
            Snapshot.discard(leftover.folder());
        } catch (NoSuchFileException gone) {
            // Another window discarded or took it.
            return;
        }
    }
}
