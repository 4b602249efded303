package tideband.window.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.Sample;
import tideband.edit.DesignEdits;
import tideband.window.action.Command;
import tideband.window.drawing.DrawingModel;

/** What becomes of a drawing's file, with a user whose answers are known. */
class FilesModelTest {
    @TempDir
    Path folder;

    private final HandClock clock = new HandClock();
    private final Answers user = new Answers();
    private DrawingModel drawing;
    private FilesModel files;
    private Path hook;

    @BeforeEach
    void aWindowOverAFile() throws IOException {
        hook = Files.copy(Path.of("designs/lantern-hook.json"), folder.resolve("hook.json"));
        drawing = new DrawingModel(Sample.WICK_KEY.design());
        files = new FilesModel(
                drawing,
                new Recovery(folder.resolve("state")),
                new RecentFiles(folder.resolve("state/recent")),
                user,
                clock,
                Runnable::run);
        files.start();
        files.open(hook);
    }

    private void edit(String title) {
        drawing.change("Change title", d -> DesignEdits.title(d, title));
    }

    private static Design read(Path file) {
        return ((Reading.Read<Design>) DesignFile.read(file)).value();
    }

    private long kept() throws IOException {
        Path store = folder.resolve("state/open-drawings");
        if (!Files.exists(store)) {
            return 0;
        }
        try (var list = Files.list(store)) {
            return list.count();
        }
    }

    @Test
    void changedMeansDifferentFromTheFile() {
        assertThat(files.titleProperty().get()).isEqualTo("hook");
        assertThat(files.changedProperty().get()).isFalse();
        edit("Other");
        assertThat(files.titleProperty().get()).isEqualTo("hook – changed");
        drawing.undo();
        assertThat(files.changedProperty().get()).isFalse();
        drawing.redo();
        files.save();
        assertThat(files.changedProperty().get()).isFalse();
        assertThat(read(hook)).isEqualTo(drawing.design());
        // Saved, undone, and edited differently: no count of steps is fooled into calling this saved.
        drawing.undo();
        edit("Third");
        assertThat(files.changedProperty().get()).isTrue();
        edit("Other");
        assertThat(files.changedProperty().get()).isFalse();
        assertThat(user.heard).isEmpty();
    }

    @Test
    void aNewDrawingIsAskedForAFileOnce() {
        user.will(Optional.of(Sample.VENT_PLATE.design()), Optional.of(folder.resolve("plate.json")));
        files.begin();
        assertThat(files.titleProperty().get()).isEqualTo("Vent plate, flat, three tones and a fade");
        assertThat(files.changedProperty().get()).isFalse();
        assertThat(files.fileProperty().get()).isEmpty();
        files.save();
        edit("Plate");
        files.save();
        assertThat(read(folder.resolve("plate.json"))).isEqualTo(drawing.design());
        assertThat(user.heard)
                .containsExactly("new drawing", "file to save Vent plate, flat, three tones and a fade.json");
        assertThat(files.recentFiles())
                .as("one list for good, so that a menu goes on hearing of it")
                .isSameAs(files.recentFiles())
                .containsExactly(folder.resolve("plate.json"), hook);
    }

    @Test
    void changesAreNotLostUnasked() {
        edit("Other");
        Design mine = drawing.design();
        user.will(Asks.Unsaved.KEEP_DRAWING);
        files.begin(Sample.WICK_PIN);
        assertThat(drawing.design()).isEqualTo(mine);
        user.will(Asks.Unsaved.SAVE);
        files.begin(Sample.WICK_PIN);
        assertThat(read(hook)).isEqualTo(mine);
        assertThat(drawing.design()).isEqualTo(Sample.WICK_PIN.design());
        assertThat(files.saidProperty().get()).contains(Sample.WICK_PIN.shows(), "Print");
        edit("Pin");
        user.will(Asks.Unsaved.DISCARD);
        files.open(hook);
        assertThat(drawing.design()).isEqualTo(mine);
        assertThat(files.saidProperty().get()).isEqualTo("Opened " + hook + ".");
        edit("Hook");
        files.save();
        assertThat(files.saidProperty().get()).isEqualTo("Saved to " + hook + ".");
        assertThat(user.allGiven()).isTrue();
    }

    @Test
    void closingAsksAndThenKeepsNothing() throws IOException {
        List<String> done = new ArrayList<>();
        edit("Other");
        clock.advance(1000);
        assertThat(kept()).isEqualTo(1);
        user.will(Asks.Unsaved.KEEP_DRAWING);
        files.close(() -> done.add("closed"));
        assertThat(done).isEmpty();
        // Save is chosen, but no file: the window stays.
        user.will(Optional.empty());
        files.saveAs();
        user.will(Asks.Unsaved.DISCARD);
        files.close(() -> done.add("closed"));
        assertThat(done).containsExactly("closed");
        assertThat(kept()).isZero();
        assertThat(clock.tasks()).isZero();
    }

    @Test
    void editsAreKeptWithinASecondAndForgottenWhenSaved() throws IOException {
        for (int i = 0; i < 30; i++) {
            edit("Edit " + i);
            clock.advance(100);
        }
        assertThat(kept()).isEqualTo(1);
        clock.advance(1000);
        drawing.undo();
        clock.advance(1000);
        Design last = drawing.design();
        Recovery.LeftBehind none = new Recovery(folder.resolve("state")).leftBehind();
        assertThat(none.drawings()).as("it belongs to a program that runs").isEmpty();
        files.save();
        clock.advance(1000);
        assertThat(kept()).isZero();
        assertThat(read(hook)).isEqualTo(last);
    }

    @Test
    void aFileAtFaultSaysAllAndChangesNothing() throws IOException {
        Path bad = Files.writeString(
                folder.resolve("bad.json"),
                Files.readString(hook).replace("titanium", "tin").replace("round", "square"));
        files.open(bad);
        assertThat(user.heard)
                .singleElement()
                .asString()
                .contains("bad.json")
                .contains("/metal")
                .contains("/piece/shape");
        assertThat(files.titleProperty().get()).isEqualTo("hook");
        user.heard.clear();
        files.open(folder.resolve("none.json"));
        assertThat(user.heard).singleElement().asString().contains("no such file; check the name");
    }

    @Test
    void whatCannotBeSavedStaysChanged() throws IOException {
        edit("Other");
        Path nowhere = folder.resolve("none/hook.json");
        user.will(Optional.of(nowhere));
        files.saveAs();
        assertThat(user.heard).hasSize(2);
        assertThat(user.heard.get(1)).contains("could not be saved").contains("save again");
        assertThat(files.changedProperty().get()).isTrue();
        assertThat(files.fileProperty().get()).contains(hook);
        clock.advance(1000);
        assertThat(kept()).isEqualTo(1);
    }

    @Test
    void aChangeByAnotherProgramIsNoticed() throws IOException {
        Design theirs = DesignEdits.title(drawing.design(), "Theirs");
        Files.write(hook, DesignFile.bytes(theirs));
        user.will(Asks.Elsewhere.LOAD);
        clock.advance(2000);
        assertThat(drawing.design()).isEqualTo(theirs);
        assertThat(files.changedProperty().get()).isFalse();
        edit("Mine");
        Design mine = drawing.design();
        Files.write(hook, DesignFile.bytes(Sample.LANTERN_HOOK.design()));
        user.will(Asks.Elsewhere.KEEP_MINE);
        files.lookAtDisk();
        clock.advance(10_000);
        assertThat(drawing.design()).isEqualTo(mine);
        assertThat(files.changedProperty().get()).isTrue();
        files.save();
        assertThat(read(hook)).isEqualTo(mine);
        assertThat(user.heard).containsExactly("changed on disk hook.json", "changed on disk hook.json");
    }

    @Test
    void aChangeThatChangesNothingIsNotAskedAbout() throws IOException {
        Files.write(hook, DesignFile.bytes(drawing.design()));
        clock.advance(4000);
        edit("Other");
        Files.write(hook, DesignFile.bytes(drawing.design()));
        clock.advance(4000);
        assertThat(user.heard).isEmpty();
        assertThat(files.changedProperty().get()).isFalse();
    }

    @Test
    void aDeletedFileMakesTheDrawingUnsaved() throws IOException {
        Files.delete(hook);
        user.will(Asks.Elsewhere.KEEP_MINE);
        clock.advance(10_000);
        assertThat(user.heard).containsExactly("gone hook.json");
        assertThat(files.changedProperty().get()).isTrue();
        files.save();
        assertThat(files.changedProperty().get()).isFalse();
        assertThat(hook).exists();
    }

    @Test
    void savingNoticesAChangeThatWasNotLookedAtYet() throws IOException {
        edit("Mine");
        Files.writeString(hook, "{}");
        user.will(Asks.Overwrite.KEEP_DRAWING);
        files.save();
        assertThat(hook).hasContent("{}");
        assertThat(files.changedProperty().get()).isTrue();
        user.will(Asks.Overwrite.REPLACE);
        files.save();
        assertThat(read(hook)).isEqualTo(drawing.design());
        assertThat(files.changedProperty().get()).isFalse();
    }

    @Test
    void aBathInTheWayIsAskedAbout() throws IOException {
        Files.copy(Path.of("designs/burner-tube.json"), folder.resolve("tube.json"));
        Path bath = Files.copy(Path.of("designs/shop-tantalum.json"), folder.resolve("shop-tantalum.json"));
        files.open(folder.resolve("tube.json"));
        byte[] before = Files.readAllBytes(bath);
        drawing.change("Change bath", d -> DesignEdits.bath(d, d.bath().withResistanceOhm(9), d.bathFile()));
        user.will(Asks.BathChoice.OWN_NAME);
        files.save();
        assertThat(files.changedProperty().get()).isFalse();
        assertThat(drawing.design().bathFile()).contains("shop-tantalum 2.json");
        assertThat(Files.readAllBytes(bath)).isEqualTo(before);
        assertThat(read(folder.resolve("tube.json"))).isEqualTo(drawing.design());
    }

    @Test
    void everyCommandHasAKeyOrAMenuAndSaysWhatItDoes() {
        FileCommands commands = new FileCommands(files);
        List<Command> all = new ArrayList<>(commands.commands());
        all.add(commands.quit(() -> {}));
        all.addAll(commands.samples());
        assertThat(new HashSet<>(all.stream().map(Command::id).toList())).hasSameSizeAs(all);
        assertThat(all).allSatisfy(c -> assertThat(c.help()).endsWith("."));
        assertThat(all.stream().filter(c -> c.id().equals("left-behind")))
                .singleElement()
                .satisfies(c -> assertThat(c.possible().get()).isFalse());
    }
}
