package tideband.document;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.Design;
import tideband.edit.DesignEdits;

/** What is kept is found again after a crash, and only then. */
class RecoveryTest {
    private static final Design HOOK = Sample.LANTERN_HOOK.design();
    private static final Design TUBE = Sample.BURNER_TUBE.design();
    private static final Owner CRASHED = new Owner(10, 1000);
    private static final Owner RUNNING = new Owner(11, 2000);
    private static final Owner SELF = new Owner(12, 3000);

    @TempDir
    Path state;

    private Recovery of(Owner owner) {
        return new Recovery(state, owner, o -> !o.equals(CRASHED));
    }

    private List<Path> store() throws IOException {
        Path store = state.resolve("open-drawings");
        if (!Files.exists(store)) {
            return List.of();
        }
        try (Stream<Path> folders = Files.list(store)) {
            return folders.sorted().toList();
        }
    }

    private static List<Design> designs(Recovery recovery) {
        Recovery.LeftBehind left = recovery.leftBehind();
        assertThat(left.notes()).isEmpty();
        return left.drawings().stream().map(Leftover::design).toList();
    }

    @Test
    void whatACrashedProgramKeptIsFound() throws IOException {
        Recovery.Slot slot = of(CRASHED).slot();
        slot.keep(HOOK, Optional.of(Path.of("/workshop/hook.json")));
        Design later = DesignEdits.title(HOOK, "Later");
        slot.keep(later, Optional.of(Path.of("/workshop/hook.json")));
        of(CRASHED).slot().keep(TUBE, Optional.empty());
        of(RUNNING).slot().keep(HOOK, Optional.empty());
        assertThat(store()).hasSize(3);
        assertThat(designs(of(SELF))).containsExactlyInAnyOrder(later, TUBE);
        assertThat(of(SELF).leftBehind().drawings())
                .filteredOn(d -> d.design().equals(later))
                .singleElement()
                .satisfies(d -> assertThat(d.belongs()).contains(Path.of("/workshop/hook.json")));
    }

    @Test
    void aBathMayBeCalledLikeAnything() throws IOException {
        for (String name : List.of("design.json", "about", "x")) {
            Design design = DesignEdits.bath(TUBE, TUBE.bath(), Optional.of(name));
            Recovery.Slot slot = of(CRASHED).slot();
            slot.keep(design, Optional.empty());
            assertThat(designs(of(SELF))).containsExactly(design);
            slot.clear();
        }
    }

    @Test
    void whatIsSavedOrClosedIsForgotten() throws IOException {
        Recovery.Slot slot = of(CRASHED).slot();
        slot.clear();
        slot.keep(HOOK, Optional.empty());
        slot.clear();
        assertThat(store()).isEmpty();
        assertThat(designs(of(SELF))).isEmpty();
    }

    @Test
    void oneOfSeveralWindowsTakesADrawing() throws IOException {
        of(CRASHED).slot().keep(HOOK, Optional.empty());
        Leftover drawing = of(SELF).leftBehind().drawings().get(0);
        Optional<Recovery.Slot> mine = of(SELF).take(drawing);
        assertThat(mine).isPresent();
        assertThat(of(RUNNING).take(drawing)).isEmpty();
        of(RUNNING).discard(drawing);
        assertThat(designs(of(RUNNING))).isEmpty();
        // It goes on being kept for the one that took it.
        assertThat(new Recovery(state, RUNNING, o -> o.equals(RUNNING))
                        .leftBehind()
                        .drawings())
                .hasSize(1);
        mine.get().keep(TUBE, Optional.empty());
        assertThat(store()).hasSize(1);
        mine.get().clear();
        assertThat(store()).isEmpty();
    }

    @Test
    void discardedMeansGone() throws IOException {
        of(CRASHED).slot().keep(HOOK, Optional.empty());
        Recovery recovery = of(SELF);
        recovery.discard(recovery.leftBehind().drawings().get(0));
        assertThat(store()).isEmpty();
        assertThat(designs(recovery)).isEmpty();
    }

    @Test
    void whatIsDamagedIsSetAsideAndSaid() throws IOException {
        of(CRASHED).slot().keep(HOOK, Optional.empty());
        Path folder = store().get(0);
        Files.writeString(folder.resolve("design.json"), "{ \"format\": \"tideband-de");
        Recovery.LeftBehind left = of(SELF).leftBehind();
        assertThat(left.drawings()).isEmpty();
        assertThat(left.notes()).singleElement().asString().contains("damaged").contains("the file ends too soon");
        Path aside = state.resolve("damaged-drawings").resolve(folder.getFileName());
        assertThat(aside.resolve("design.json")).content().startsWith("{ \"format\"");
        assertThat(of(SELF).leftBehind().notes()).isEmpty();
    }

    @Test
    void aHalfWrittenSnapshotDoesNotHideTheWholeOneBefore() throws IOException {
        of(CRASHED).slot().keep(HOOK, Optional.empty());
        Path whole = store().get(0);
        String name = whole.getFileName().toString();
        Path half = Files.createDirectory(whole.resolveSibling(name.substring(0, name.length() - 1) + "2.unfinished"));
        assertThat(designs(of(SELF))).containsExactly(HOOK);
        assertThat(half).doesNotExist();
        Files.createDirectory(half);
        Files.writeString(half.resolve("about"), "");
        Recovery.LeftBehind left = of(SELF).leftBehind();
        assertThat(left.drawings()).extracting(Leftover::design).containsExactly(HOOK);
        assertThat(left.notes()).hasSize(1);
        assertThat(whole).exists();
    }

    @Test
    void strangersInTheStoreAreLeftAlone() throws IOException {
        Path stranger = Files.createDirectories(state.resolve("open-drawings/notes"));
        Files.writeString(state.resolve("open-drawings/1-2.txt"), "x");
        assertThat(designs(of(SELF))).isEmpty();
        assertThat(stranger).exists();
    }

    @Test
    void aProcessIsToldFromALaterOneOfTheSameNumber() {
        Owner self = Owner.self();
        assertThat(self.alive()).isTrue();
        assertThat(new Owner(self.pid(), self.startMillis() - 60_000).alive()).isFalse();
        assertThat(new Owner(Integer.MAX_VALUE, 0).alive()).isFalse();
    }
}
