package tideband.window.sheets;

import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import javafx.beans.property.BooleanProperty;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import tideband.sheet.Exports;

/** Where the files are to go and what their names begin with. */
public final class SheetsForm {
    private final StringProperty folder = new SimpleStringProperty();
    private final StringProperty name = new SimpleStringProperty("");
    private final BooleanProperty png = new SimpleBooleanProperty(true);
    private final ReadOnlyStringWrapper fault = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper note = new ReadOnlyStringWrapper("");
    private String offered = "";
    private Optional<String> stem = Optional.empty();

    SheetsForm(Path start) {
        folder.set(start.toString());
        folder.addListener((value, before, after) -> check());
        name.addListener((value, before, after) -> check());
    }

    /** Offers a name for a title; one the user has typed stays, and so does that of the design's file. */
    void offer(String title) {
        String plain = title.toLowerCase(Locale.ROOT)
                .replaceAll("[^\\p{L}\\p{N}]+", "-")
                .replaceAll("^-|-$", "");
        offerName(stem.orElse(plain.isEmpty() ? "design" : plain));
        check();
    }

    private void offerName(String next) {
        if (name.get().isBlank() || name.get().equals(offered)) {
            name.set(next);
        }
        offered = next;
    }

    /**
     * Puts the sheets beside the design's file, named after it.
     *
     * @param design the file; empty if the design is in none yet
     */
    public void nextTo(Optional<Path> design) {
        stem = design.map(d -> d.getFileName().toString().replaceFirst("\\.json$", ""));
        stem.ifPresent(this::offerName);
        design.map(Path::toAbsolutePath).map(Path::getParent).ifPresent(parent -> folder.set(parent.toString()));
        check();
    }

    private void check() {
        fault.set("");
        note.set("");
        if (!Exports.canName(name.get())) {
            fault.set("The names must begin with something, without / \\ or :. Type a name such as " + offered + ".");
            return;
        }
        Optional<Path> path = path();
        if (path.isEmpty()) {
            fault.set("That is no folder. Type one, or browse for one.");
        } else if (Files.isRegularFile(path.get())) {
            fault.set("That is a file and no folder. Type a folder, or browse for one.");
        } else if (!Files.exists(path.get())) {
            note.set("This folder is not there yet; it will be made.");
        }
    }

    /** The folder as it is typed, if it can be one. */
    Optional<Path> path() {
        if (folder.get() == null || folder.get().isBlank()) {
            return Optional.empty();
        }
        try {
            return Optional.of(Path.of(folder.get().strip()).toAbsolutePath().normalize());
        } catch (InvalidPathException noPath) {
            return Optional.empty();
        }
    }

    /** Those of the files that are there already. */
    static List<String> existing(Path folder, List<String> names) {
        return names.stream().filter(n -> Files.exists(folder.resolve(n))).toList();
    }

    /**
     * The folder the files go to; made if it is missing.
     *
     * @return a property
     */
    public StringProperty folderProperty() {
        return folder;
    }

    /**
     * What the names of the files begin with.
     *
     * @return a property
     */
    public StringProperty nameProperty() {
        return name;
    }

    /**
     * Whether the preview is drawn in pixels too.
     *
     * @return a property
     */
    public BooleanProperty pngProperty() {
        return png;
    }

    /**
     * What is wrong with folder or name, and what to do.
     *
     * @return a property; empty when nothing is
     */
    public ReadOnlyStringProperty faultProperty() {
        return fault.getReadOnlyProperty();
    }

    /**
     * What else is to be known.
     *
     * @return a property; empty when nothing is
     */
    public ReadOnlyStringProperty noteProperty() {
        return note.getReadOnlyProperty();
    }
}
