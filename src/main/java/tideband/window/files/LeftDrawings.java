package tideband.window.files;

import java.io.IOException;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import tideband.design.Reading;
import tideband.document.DocumentFile;
import tideband.document.Leftover;
import tideband.document.Opened;
import tideband.document.Recovery;

/** What is done about drawings left behind by a crash. */
final class LeftDrawings {
    private final Recovery recovery;
    private final Errands errands;
    private final Asks asks;
    private final KeptDrawing kept;
    private final FilesModel files;
    private final ReadOnlyObjectWrapper<Integer> count = new ReadOnlyObjectWrapper<>(0);

    // A drawing taken over, with its place in the store and what its file holds now.
    private record Taken(Optional<Recovery.Slot> slot, Optional<Reading<Opened>> onDisk) {}

    LeftDrawings(Recovery recovery, Errands errands, Asks asks, KeptDrawing kept, FilesModel files) {
        this.recovery = recovery;
        this.errands = errands;
        this.asks = asks;
        this.kept = kept;
        this.files = files;
    }

    ReadOnlyObjectProperty<Integer> countProperty() {
        return count.getReadOnlyProperty();
    }

    /** Looks for drawings left behind and asks about them, until one is opened or all is decided. */
    void look() {
        errands.send(() -> recovery.leftBehind(), this::found, this::trouble);
    }

    private void found(Recovery.LeftBehind behind) {
        count.set(behind.drawings().size());
        for (String note : behind.notes()) {
            say(note, "If the drawing matters, keep that folder and look into its design.json.");
        }
        if (behind.drawings().isEmpty()) {
            return;
        }
        errands.ask(() -> asks.leftBehind(behind.drawings())).ifPresent(choice -> {
            Leftover drawing = choice.drawing();
            switch (choice.act()) {
                case OPEN -> files.letGo(() -> open(drawing));
                case DISCARD -> discard(drawing);
            }
        });
    }

    private void discard(Leftover drawing) {
        errands.send(
                () -> {
                    recovery.discard(drawing);
                    return true;
                },
                done -> look(),
                this::trouble);
    }

    private void open(Leftover drawing) {
        errands.send(() -> taken(drawing), taken -> show(drawing, taken), this::trouble);
    }

    private Taken taken(Leftover drawing) throws IOException {
        Optional<Recovery.Slot> slot = recovery.take(drawing);
        if (slot.isPresent()) {
            kept.moveTo(slot.get(), drawing.design(), drawing.belongs());
        }
        return new Taken(slot, drawing.belongs().map(DocumentFile::open));
    }

    private void show(Leftover drawing, Taken taken) {
        if (taken.slot.isEmpty()) {
            say("Another window has opened or discarded \"" + drawing.design().title() + "\" meanwhile.", "");
            return;
        }
        count.set(Math.max(0, count.get() - 1));
        Optional<Opened> onDisk = taken.onDisk.flatMap(
                reading -> reading instanceof Reading.Read<Opened> read ? Optional.of(read.value()) : Optional.empty());
        files.show(
                drawing.design(), new Held(drawing.belongs(), onDisk.map(Opened::stamp), onDisk.map(Opened::design)));
    }

    private void trouble(IOException e) {
        say(
                "A drawing left behind could not be taken over: " + DocumentFile.reason(e) + ".",
                "It stays where it is and is offered again at the next start.");
    }

    private void say(String what, String remedy) {
        errands.ask(() -> {
            asks.say(what, remedy);
            return true;
        });
    }
}
