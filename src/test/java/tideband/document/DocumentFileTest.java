package tideband.document;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.BathFile;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.edit.DesignEdits;

/** Saving puts whole files in place, and nothing else. */
class DocumentFileTest {
    private static final Design HOOK = Sample.LANTERN_HOOK.design();
    private static final Design TUBE = Sample.BURNER_TUBE.design();
    private static final Design OTHER_BATH = DesignEdits.bath(TUBE, TUBE.bath().withResistanceOhm(9), TUBE.bathFile());

    @TempDir
    Path folder;

    private List<String> names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(f -> f.getFileName().toString()).sorted().toList();
        }
    }

    private DiskStamp saved(Path file, Design design) throws IOException {
        Saved saved = DocumentFile.save(file, design, Optional.empty(), false);
        assertThat(saved).isInstanceOf(Saved.Done.class);
        return ((Saved.Done) saved).stamp();
    }

    @Test
    void whatIsSavedOpensTheSame() throws IOException {
        for (Sample sample : Sample.values()) {
            Path file = folder.resolve(sample.file() + ".json");
            DiskStamp stamp = saved(file, sample.design());
            assertThat(DocumentFile.open(file)).isEqualTo(new Reading.Read<>(new Opened(sample.design(), stamp)));
        }
        assertThat(names()).hasSize(Sample.values().length + 1).contains("shop-tantalum.json");
    }

    @Test
    void aFolderIsNoFileToOpen() {
        assertThat(DocumentFile.open(folder))
                .isEqualTo(new Reading.Faulty<>(List.of(new Fault("", "this is a folder", "name the file in it"))));
    }

    @Test
    void savingReplacesTheFileAndLeavesNothingBehind() throws IOException {
        Path file = folder.resolve("hook.json");
        DiskStamp first = saved(file, HOOK);
        Files.setPosixFilePermissions(file, PosixFilePermissions.fromString("rw-r-----"));
        Saved again = DocumentFile.save(file, DesignEdits.title(HOOK, "Other"), Optional.of(first), false);
        assertThat(again).isInstanceOf(Saved.Done.class);
        assertThat(Files.getPosixFilePermissions(file)).isEqualTo(PosixFilePermissions.fromString("rw-r-----"));
        assertThat(names()).containsExactly("hook.json");
    }

    @Test
    void aLinkGoesOnLeadingToTheFile() throws IOException {
        Path file = folder.resolve("hook.json");
        saved(file, HOOK);
        Path link = Files.createSymbolicLink(folder.resolve("link.json"), file);
        saved(link, DesignEdits.title(HOOK, "Other"));
        assertThat(link).isSymbolicLink();
        assertThat(Files.readString(file)).contains("\"Other\"");
    }

    @Test
    void whatAnotherProgramWroteIsNotReplacedUnasked() throws IOException {
        Path file = folder.resolve("hook.json");
        DiskStamp known = saved(file, HOOK);
        Files.writeString(file, "mine");
        assertThat(DocumentFile.save(file, HOOK, Optional.of(known), false)).isEqualTo(new Saved.ChangedOnDisk());
        assertThat(file).hasContent("mine");
        Files.delete(file);
        assertThat(DocumentFile.save(file, HOOK, Optional.of(known), false)).isInstanceOf(Saved.Done.class);
    }

    @Test
    void anotherBathIsNotReplacedUnasked() throws IOException {
        Path file = folder.resolve("tube.json");
        saved(file, TUBE);
        byte[] design = Files.readAllBytes(file);
        Path bath = folder.resolve("shop-tantalum.json");
        byte[] before = Files.readAllBytes(bath);
        assertThat(DocumentFile.save(file, OTHER_BATH, Optional.empty(), false))
                .isEqualTo(new Saved.BathInTheWay("shop-tantalum.json", "shop-tantalum 2.json"));
        assertThat(Files.readAllBytes(bath)).isEqualTo(before);
        assertThat(Files.readAllBytes(file)).isEqualTo(design);
        assertThat(DocumentFile.save(file, OTHER_BATH, Optional.empty(), true)).isInstanceOf(Saved.Done.class);
        assertThat(BathFile.read(bath)).isEqualTo(new Reading.Read<>(OTHER_BATH.bath()));
    }

    @Test
    void aBathThatIsThereAlreadyKeepsItsBytes() throws IOException {
        Path bath = folder.resolve("shop-tantalum.json");
        Files.copy(Path.of("designs/shop-tantalum.json"), bath);
        byte[] before = Files.readAllBytes(bath);
        saved(folder.resolve("tube.json"), TUBE);
        assertThat(Files.readAllBytes(bath)).isEqualTo(before);
    }

    @Test
    void aDesignIsNotSavedOverABath() throws IOException {
        saved(folder.resolve("tube.json"), TUBE);
        Path bath = folder.resolve("shop-tantalum.json");
        assertThat(DocumentFile.save(bath, HOOK, Optional.empty(), true)).isInstanceOf(Saved.Refused.class);
        assertThat(DocumentFile.save(bath, TUBE, Optional.empty(), true)).isInstanceOf(Saved.Refused.class);
        assertThat(DocumentFile.open(bath))
                .isInstanceOfSatisfying(
                        Reading.Faulty.class,
                        faulty -> assertThat(faulty.faults().toString()).contains("this is a bath, not a design"));
    }

    @Test
    void whatCannotBeWrittenLeavesTheFileAsItWas() throws IOException {
        assertThatExceptionOfType(IOException.class)
                .isThrownBy(() -> DocumentFile.save(folder.resolve("none/hook.json"), HOOK, Optional.empty(), false));
        Path file = folder.resolve("hook.json");
        saved(file, HOOK);
        assertThatExceptionOfType(IOException.class)
                .isThrownBy(() -> DocumentFile.save(folder, HOOK, Optional.empty(), false));
        Path inTheWay = Files.createDirectory(folder.resolve("shop-tantalum.json"));
        assertThat(DocumentFile.save(file, TUBE, Optional.empty(), false)).isInstanceOf(Saved.BathInTheWay.class);
        assertThatExceptionOfType(IOException.class)
                .isThrownBy(() -> DocumentFile.save(file, TUBE, Optional.empty(), true));
        assertThat(DocumentFile.open(file)).isInstanceOf(Reading.Read.class);
        Files.delete(inTheWay);
        assertThat(names()).containsExactly("hook.json");
    }

    @Test
    void stampsTellContentAndNothingElse() throws IOException {
        Path file = folder.resolve("tube.json");
        DiskStamp stamp = saved(file, TUBE);
        assertThat(stamp.gone()).isFalse();
        Files.write(file, Files.readAllBytes(file));
        assertThat(DiskStamp.of(file, TUBE.bathFile())).isEqualTo(stamp);
        Files.writeString(folder.resolve("shop-tantalum.json"), "x");
        assertThat(DiskStamp.of(file, TUBE.bathFile())).isNotEqualTo(stamp);
        Files.delete(file);
        assertThat(DiskStamp.of(file, Optional.empty()).gone()).isTrue();
    }
}
