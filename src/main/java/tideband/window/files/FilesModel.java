package tideband.window.files;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Executor;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ScheduledFuture;
import java.util.concurrent.TimeUnit;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.document.DiskStamp;
import tideband.document.DocumentFile;
import tideband.document.Opened;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.Sample;
import tideband.document.Saved;
import tideband.edit.DesignEdits;
import tideband.window.drawing.DrawingModel;

/**
 * The drawing as a document: new, opened, saved, closed, and kept safe meanwhile. All is to be called on the screen's thread;
 * the disk is worked on beside it.
 */
public final class FilesModel {
    private static final long LOOK_EVERY_S = 2;

    private final DrawingModel drawing;
    private final RecentFiles recent;
    private final Asks asks;
    private final ScheduledExecutorService beside;
    private final Executor screen;
    private final Errands errands;
    private final KeptDrawing kept;
    private final LeftDrawings left;
    private final ReadOnlyObjectWrapper<Held> held;
    private final ReadOnlyStringWrapper said = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper title = new ReadOnlyStringWrapper("");
    private final ReadOnlyBooleanWrapper changed = new ReadOnlyBooleanWrapper(false);
    private final ReadOnlyObjectWrapper<Optional<Path>> file = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ObservableList<Path> recentFiles = FXCollections.observableArrayList();
    // Kept, as those who listen to it would hear nothing once it is collected.
    private final ObservableList<Path> shownRecent = FXCollections.unmodifiableObservableList(recentFiles);
    private ScheduledFuture<?> watch;
    private boolean keepingFailed;

    /**
     * A document around the drawing there is, which counts as new and not changed.
     *
     * @param drawing the drawing
     * @param recovery where changed drawings are kept
     * @param recent the recent files
     * @param asks questions to the user
     * @param beside does what touches the disk
     * @param screen the screen's thread
     */
    public FilesModel(
            DrawingModel drawing,
            Recovery recovery,
            RecentFiles recent,
            Asks asks,
            ScheduledExecutorService beside,
            Executor screen) {
        this.drawing = drawing;
        this.recent = recent;
        this.asks = asks;
        this.beside = beside;
        this.screen = screen;
        errands = new Errands(beside, screen);
        kept = new KeptDrawing(recovery.slot(), beside, e -> screen.execute(() -> cannotKeep(e)));
        left = new LeftDrawings(recovery, errands, asks, kept, this);
        held = new ReadOnlyObjectWrapper<>(Held.begun(drawing.design()));
        drawing.designProperty().addListener((value, before, after) -> {
            said.set("");
            update();
        });
        update();
    }

    /** Begins to watch the file, lists recent files and asks about drawings left behind by a crash. To be called once. */
    public void start() {
        listRecent();
        left.look();
        watch = beside.scheduleWithFixedDelay(
                () -> screen.execute(this::lookAtDisk), LOOK_EVERY_S, LOOK_EVERY_S, TimeUnit.SECONDS);
    }

    /**
     * What the window is called.
     *
     * @return the drawing's name, with "– changed" if it is
     */
    public ReadOnlyStringProperty titleProperty() {
        return title.getReadOnlyProperty();
    }

    /**
     * What was done with files last.
     *
     * @return a sentence or two; empty before anything was done
     */
    public ReadOnlyStringProperty saidProperty() {
        return said.getReadOnlyProperty();
    }

    /**
     * Whether the drawing differs from the one saved.
     *
     * @return a property; true too if what was saved is gone
     */
    public ReadOnlyBooleanProperty changedProperty() {
        return changed.getReadOnlyProperty();
    }

    /**
     * The drawing's file.
     *
     * @return a property; empty as long as it has none
     */
    public ReadOnlyObjectProperty<Optional<Path>> fileProperty() {
        return file.getReadOnlyProperty();
    }

    /**
     * Whether the disk is being worked on.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty busyProperty() {
        return errands.busyProperty();
    }

    /**
     * The designs opened or saved last.
     *
     * @return their files, the last first
     */
    public ObservableList<Path> recentFiles() {
        return shownRecent;
    }

    /**
     * How many drawings left behind by a crash wait to be opened or discarded.
     *
     * @return a property
     */
    public ReadOnlyObjectProperty<Integer> leftBehindProperty() {
        return left.countProperty();
    }

    /** Asks again about drawings left behind by a crash. */
    public void askAboutLeftBehind() {
        errands.inTurn(left::look);
    }

    /** Begins a new drawing of a shape the user chooses. */
    public void begin() {
        errands.inTurn(() ->
                letGo(() -> errands.ask(asks::newDrawing).ifPresent(design -> show(design, Held.begun(design)))));
    }

    /**
     * Begins a new drawing from a sample.
     *
     * @param sample the sample
     */
    public void begin(Sample sample) {
        errands.inTurn(() -> letGo(() -> {
            Design design = sample.design();
            show(design, Held.begun(design));
            said.set("This sample is yours to change. " + sample.shows()
                    + ". Print shows its step sheets, Pace leads through it at the bath.");
        }));
    }

    /** Opens a design the user chooses. */
    public void open() {
        errands.inTurn(
                () -> letGo(() -> errands.ask(() -> asks.fileToOpen(folder())).ifPresent(this::load)));
    }

    /**
     * Opens a design.
     *
     * @param design its file
     */
    public void open(Path design) {
        errands.inTurn(() -> letGo(() -> load(design)));
    }

    /** Saves the drawing to its file, or where the user chooses if it has none. */
    public void save() {
        errands.inTurn(() -> save(() -> {}));
    }

    /** Saves the drawing where the user chooses, and goes on there. */
    public void saveAs() {
        errands.inTurn(() -> saveAs(() -> {}));
    }

    /**
     * Lets the drawing go, if the user agrees.
     *
     * @param closed what to do then; not done if the user stays
     */
    public void close(Runnable closed) {
        errands.inTurn(() -> letGo(() -> {
            kept.want(Optional.empty(), held.get().file());
            errands.send(
                    () -> {
                        kept.putNow();
                        return true;
                    },
                    done -> closed(closed),
                    // It will be offered again at the next start, which is better than a window that does not close.
                    trouble -> closed(closed));
        }));
    }

    private void closed(Runnable closed) {
        if (watch != null) {
            watch.cancel(false);
        }
        closed.run();
    }

    /** Does something with the drawing let go: after its changes were saved, or the user wants none of them. */
    void letGo(Runnable then) {
        if (!changed.get()) {
            then.run();
            return;
        }
        switch (errands.ask(() -> asks.unsaved(name()))) {
            // What was drawn while saving is asked about again.
            case SAVE -> save(() -> letGo(then));
            case DISCARD -> then.run();
            case KEEP_DRAWING -> {}
        }
    }

    private void load(Path design) {
        errands.send(
                () -> DocumentFile.open(design),
                reading -> {
                    if (reading instanceof Reading.Read<Opened> read) {
                        Opened opened = read.value();
                        show(opened.design(), Held.in(design, opened.stamp(), Optional.of(opened.design())));
                        remember(design);
                        said.set("Opened " + design + ".");
                    } else {
                        tell("\"" + design.getFileName() + "\" could not be opened.", reading);
                        forgetIfGone(design);
                    }
                },
                trouble -> tell("\"" + design.getFileName() + "\" could not be opened.", trouble));
    }

    private void save(Runnable then) {
        Optional<Path> target = held.get().file();
        if (target.isEmpty()) {
            saveAs(then);
        } else {
            write(target.get(), held.get().stamp(), false, then);
        }
    }

    private void saveAs(Runnable then) {
        String name = FileNames.of(name());
        errands.ask(() -> asks.fileToSave(folder(), name))
                .ifPresent(target -> write(target, Optional.empty(), false, then));
    }

    private void write(Path target, Optional<DiskStamp> known, boolean replaceBath, Runnable then) {
        Design design = drawing.design();
        errands.send(
                () -> DocumentFile.save(target, design, known, replaceBath),
                saved -> written(target, design, known, saved, then),
                trouble -> errands.ask(() -> {
                    asks.say(
                            "The drawing could not be saved to \"" + target + "\": " + DocumentFile.reason(trouble)
                                    + ". What was there before is still there.",
                            "Make room or check that you may write there, then save again; or save it elsewhere.");
                    return true;
                }));
    }

    private void written(Path target, Design design, Optional<DiskStamp> known, Saved saved, Runnable then) {
        if (saved instanceof Saved.Done written) {
            hold(Held.in(target, written.stamp(), Optional.of(design)));
            remember(target);
            said.set("Saved to " + target + ".");
            then.run();
        } else if (saved instanceof Saved.Refused refused) {
            errands.ask(() -> {
                asks.faults("The drawing could not be saved to \"" + target + "\".", refused.faults());
                return true;
            });
        } else if (saved instanceof Saved.ChangedOnDisk) {
            switch (errands.ask(() -> asks.overwrite(target.getFileName().toString()))) {
                case REPLACE -> write(target, Optional.empty(), false, then);
                case LOAD -> load(target);
                case KEEP_DRAWING -> {}
            }
        } else if (saved instanceof Saved.BathInTheWay bath) {
            switch (errands.ask(() -> asks.bathInTheWay(bath.bathFile(), bath.freeName()))) {
                case OWN_NAME -> {
                    drawing.change("Name bath file", d -> DesignEdits.bath(d, d.bath(), Optional.of(bath.freeName())));
                    write(target, known, false, then);
                }
                case REPLACE -> write(target, known, true, then);
                case KEEP_DRAWING -> {}
            }
        }
    }

    /** Looks whether another program changed the file; also to be called when the window gets the focus. */
    public void lookAtDisk() {
        Held now = held.get();
        if (!errands.idle() || now.file().isEmpty()) {
            return;
        }
        Path path = now.file().get();
        Optional<String> bathFile = now.saved().flatMap(Design::bathFile);
        // Not an errand: looking must not hold up the user.
        beside.execute(() -> {
            try {
                DiskStamp stamp = DiskStamp.of(path, bathFile);
                if (!Optional.of(stamp).equals(now.stamp())) {
                    Reading<Opened> reading = DocumentFile.open(path);
                    screen.execute(() -> foundChanged(now, path, stamp, reading));
                }
            } catch (IOException unreadable) {
                // Saving will say so; until then nothing is lost.
                return;
            }
        });
    }

    private void foundChanged(Held before, Path path, DiskStamp stamp, Reading<Opened> reading) {
        // Otherwise it is looked at again in a moment.
        if (errands.idle() && held.get().equals(before)) {
            errands.inTurn(() -> takeUpChange(before, path, stamp, reading));
        }
    }

    private void takeUpChange(Held before, Path path, DiskStamp stamp, Reading<Opened> reading) {
        Optional<Opened> opened =
                reading instanceof Reading.Read<Opened> read ? Optional.of(read.value()) : Optional.empty();
        Optional<Design> onDisk = opened.map(Opened::design);
        DiskStamp now = opened.map(Opened::stamp).orElse(stamp);
        // If only the wording changed, or to what is drawn here, there is nothing to choose.
        if (onDisk.isPresent() && (onDisk.equals(before.saved()) || onDisk.get().equals(drawing.design()))) {
            hold(Held.in(path, now, onDisk));
            return;
        }
        String name = path.getFileName().toString();
        boolean gone = stamp.gone();
        if (errands.ask(() -> asks.changedElsewhere(name, gone, changed.get())) == Asks.Elsewhere.KEEP_MINE || gone) {
            hold(Held.in(path, now, onDisk));
        } else if (opened.isPresent()) {
            show(opened.get().design(), Held.in(path, now, onDisk));
        } else {
            hold(Held.in(path, now, onDisk));
            tell("\"" + name + "\" could not be loaded, so yours is kept.", reading);
        }
    }

    /** Shows another drawing. */
    void show(Design design, Held other) {
        held.set(other);
        drawing.open(design);
        update();
    }

    private void hold(Held other) {
        held.set(other);
        update();
    }

    private void update() {
        Design design = drawing.design();
        Held now = held.get();
        boolean differs = now.differs(design);
        changed.set(differs);
        file.set(now.file());
        title.set(now.name(design) + (differs ? " – changed" : ""));
        kept.want(differs ? Optional.of(design) : Optional.empty(), now.file());
    }

    private String name() {
        return held.get().name(drawing.design());
    }

    private Optional<Path> folder() {
        return held.get()
                .folder()
                .or(() -> recentFiles.stream().findFirst().map(Path::getParent))
                .filter(Files::isDirectory);
    }

    private void tell(String what, Reading<Opened> reading) {
        List<Fault> faults = reading instanceof Reading.Faulty<Opened> faulty ? faulty.faults() : List.of();
        errands.ask(() -> {
            asks.faults(what, faults);
            return true;
        });
    }

    private void tell(String what, IOException trouble) {
        errands.ask(() -> {
            asks.say(what, "The reason: " + DocumentFile.reason(trouble) + ".");
            return true;
        });
    }

    private void cannotKeep(IOException trouble) {
        if (!keepingFailed) {
            keepingFailed = true;
            errands.ask(() -> {
                asks.say(
                        "Changes cannot be kept against a crash: " + DocumentFile.reason(trouble) + ".",
                        "Save often; this is said only once.");
                return true;
            });
        }
    }

    private void listRecent() {
        beside.execute(() -> {
            List<Path> paths = recent.list();
            screen.execute(() -> recentFiles.setAll(paths));
        });
    }

    private void remember(Path path) {
        changeRecent(() -> recent.opened(path));
    }

    private void forgetIfGone(Path path) {
        changeRecent(() -> {
            if (!Files.exists(path)) {
                recent.forget(path);
            }
        });
    }

    /** Writes a small file; without it there is only a list less. */
    private interface RecentChange {
        void make() throws IOException;
    }

    private void changeRecent(RecentChange change) {
        beside.execute(() -> {
            try {
                change.make();
            } catch (IOException listOfConveniences) {
                return;
            }
            List<Path> paths = recent.list();
            screen.execute(() -> recentFiles.setAll(paths));
        });
    }
}
