package tideband.window.sheets;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import java.util.stream.Stream;
import javafx.beans.value.ChangeListener;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.design.Wanted;
import tideband.edit.BandEdits;
import tideband.edit.Part;
import tideband.edit.Selection;
import tideband.sheet.Exports;
import tideband.sheet.Paper;
import tideband.sheet.SheetPrinter;
import tideband.window.Desk;

class SheetsModelTest {
    @TempDir
    Path folder;

    private static final String COLLAR = "shank";

    private final Desk desk = Desk.with("lantern-hook");

    private SheetsModel model(SheetsModel.Printers printers) {
        SheetsModel model =
                new SheetsModel(desk.drawing(), desk.work(), Runnable::run, Runnable::run, printers, folder, Locale.UK);
        model.form().nextTo(Optional.of(folder.resolve("out/lantern-hook.json")));
        return model;
    }

    private SheetsModel model() {
        return model(List::of);
    }

    /** A printer that takes pages, or fails. */
    private static final class Tray implements SheetPrinter {
        private final IOException fault;
        private int pages;

        Tray(IOException fault) {
            this.fault = fault;
        }

        @Override
        public String name() {
            return "Workshop";
        }

        @Override
        public Paper paper(Paper otherwise) {
            return Paper.LETTER;
        }

        @Override
        public void print(byte[] pdf, Paper paper, Consumer<String> progress, BooleanSupplier cancelled)
                throws IOException {
            if (fault != null) {
                throw fault;
            }
            for (int i = 1; i <= 3; i++) {
                progress.accept("printing page " + i + " of 3");
                if (cancelled.getAsBoolean()) {
                    throw new CancellationException();
                }
                pages++;
            }
        }
    }

    private List<String> files() throws IOException {
        if (!Files.exists(folder)) {
            return List.of();
        }
        try (Stream<Path> all = Files.walk(folder)) {
            return all.filter(Files::isRegularFile)
                    .map(f -> f.getFileName().toString())
                    .sorted()
                    .toList();
        }
    }

    @Test
    void writesTheWholeSetAndSaysWhere() throws IOException {
        SheetsModel model = model();
        List<Double> shares = new ArrayList<>();
        List<String> said = new ArrayList<>();
        model.standingProperty().addListener((value, before, after) -> {
            if (after instanceof Standing.Working working) {
                shares.add(working.share());
                said.add(working.stage());
            }
        });
        model.export();
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.Asked(Errand.EXPORT));
        assertThat(model.form().nameProperty().get()).isEqualTo("lantern-hook");
        assertThat(model.form().noteProperty().get()).contains("will be made");
        model.write();
        Standing.Written written = (Standing.Written) model.standingProperty().get();
        assertThat(written.names()).isEqualTo(Exports.names("lantern-hook", true));
        assertThat(written.said()).isEqualTo("6 files have been written to " + folder.resolve("out") + ".");
        assertThat(files()).containsExactlyInAnyOrderElementsOf(Exports.names("lantern-hook", true));
        assertThat(shares).isSorted().allMatch(s -> s >= 0 && s < 1);
        assertThat(said).hasSize(1 + 4 + Exports.stages(true)).contains("planning immersions and masks");
        assertThat(Files.readAllBytes(folder.resolve("out/lantern-hook-plan.json")))
                .isEqualTo(Files.readAllBytes(Path.of("exports/lantern-hook-plan.json")));
    }

    @Test
    void calledOffAtAnyStageItLeavesNothing() throws IOException {
        int stages = 1 + 4 + Exports.stages(true);
        for (int stage = 1; stage <= stages; stage++) {
            SheetsModel model = model();
            model.export();
            callOffAt(model, stage);
            model.write();
            assertThat(model.standingProperty().get())
                    .as("stage %d", stage)
                    .isEqualTo(new Standing.CalledOff(Errand.EXPORT, false));
            assertThat(folder).isEmptyDirectory();
            model.back();
            assertThat(model.standingProperty().get()).isEqualTo(new Standing.Asked(Errand.EXPORT));
        }
    }

    private static void callOffAt(SheetsModel model, int stage) {
        int[] seen = {0};
        ChangeListener<Standing> listener = (value, before, after) -> {
            if (after instanceof Standing.Working working && !working.stopping() && ++seen[0] == stage) {
                model.cancel();
            }
        };
        model.standingProperty().addListener(listener);
    }

    @Test
    void asksOnceBeforeItReplaces() throws IOException {
        Path out = Files.createDirectories(folder.resolve("out"));
        Files.writeString(out.resolve("lantern-hook-plan.json"), "mine");
        SheetsModel model = model();
        model.export();
        model.write();
        Standing.InTheWay inTheWay =
                (Standing.InTheWay) model.standingProperty().get();
        assertThat(inTheWay.names()).containsExactly("lantern-hook-plan.json");
        model.back();
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.Asked(Errand.EXPORT));
        assertThat(out.resolve("lantern-hook-plan.json")).hasContent("mine");
        model.write();
        model.replace();
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Written.class);
        assertThat(files()).hasSize(6);
    }

    @Test
    void refusesAFolderThatIsAFile() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "x");
        SheetsModel model = model();
        model.export();
        model.form().folderProperty().set(file.toString());
        assertThat(model.form().faultProperty().get()).contains("a file and no folder");
        model.write();
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.Asked(Errand.EXPORT));
        model.form().folderProperty().set(file.resolve("below").toString());
        model.write();
        Standing.Failed failed = (Standing.Failed) model.standingProperty().get();
        assertThat(failed.said()).contains(file.toString()).contains("Nothing was changed. Choose another folder");
        assertThat(files()).containsExactly("file");
    }

    @Test
    void aFolderInTheWayOfAFileLeavesAllAsItWas() throws IOException {
        Files.createDirectories(folder.resolve("out/lantern-hook-timing.csv"));
        SheetsModel model = model();
        model.export();
        model.write();
        model.replace();
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Failed.class);
        assertThat(files()).isEmpty();
    }

    @Test
    void withoutAFileTheNamesFollowTheTitleUntilOneIsTyped() {
        SheetsModel model = model();
        model.form().nextTo(Optional.empty());
        model.export();
        assertThat(model.form().nameProperty().get()).isEqualTo("lantern-hook-rainbow-pull");
        model.form().nameProperty().set("mine");
        model.close();
        model.export();
        assertThat(model.form().nameProperty().get()).isEqualTo("mine");
    }

    @Test
    void saysWhatNamesCannotBe() {
        SheetsModel model = model();
        model.export();
        model.form().nameProperty().set("a/b");
        assertThat(model.form().faultProperty().get()).contains("lantern-hook");
        model.form().nameProperty().set("mine");
        assertThat(model.form().faultProperty().get()).isEmpty();
        model.form().folderProperty().set(" ");
        assertThat(model.form().faultProperty().get()).contains("browse");
    }

    @Test
    void whatCannotBeMadeIsRefusedWithItsObstacles() throws IOException {
        desk.drawing().change("Film", d -> BandEdits.want(d, List.of(2), new Wanted.Film(1500, 1500)));
        SheetsModel model = model();
        for (Runnable command : List.<Runnable>of(model::export, model::print)) {
            command.run();
            Standing.Refused refused =
                    (Standing.Refused) model.standingProperty().get();
            assertThat(refused.obstacles().get(0).where()).isEqualTo("band \"" + COLLAR + "\"");
            model.point(refused.obstacles().get(0));
            assertThat(desk.drawing().selection()).isEqualTo(Selection.of(new Part.Level(2)));
            assertThat(model.standingProperty().get()).isEqualTo(new Standing.Idle());
        }
        assertThat(files()).isEmpty();
    }

    @Test
    void withoutAPrinterThePdfIsWritten() throws IOException {
        SheetsModel model = model();
        model.print();
        assertThat(model.standingProperty().get().said()).startsWith("No printer was found.");
        model.askForPdf();
        model.write();
        assertThat(model.standingProperty().get().said())
                .contains(folder.resolve("out/lantern-hook-steps-a4.pdf").toString())
                .contains("print it from there");
        assertThat(Files.readAllBytes(folder.resolve("out/lantern-hook-steps-a4.pdf")))
                .isEqualTo(Files.readAllBytes(Path.of("exports/lantern-hook-steps-a4.pdf")));
        assertThat(files()).hasSize(1);
    }

    @Test
    void aSystemThatCannotBeAskedForPrintersIsNoObstacle() {
        SheetsModel model = model(() -> {
            throw new IOException("no print library");
        });
        model.print();
        assertThat(model.standingProperty().get().said())
                .contains("no print library")
                .contains("PDF");
    }

    @Test
    void printsOnThePaperOfThePrinter() {
        Tray tray = new Tray(null);
        SheetsModel model = model(() -> List.of(tray));
        model.print();
        assertThat(model.pages().paperProperty().get()).isEqualTo(Paper.LETTER);
        model.printOn(tray);
        assertThat(tray.pages).isEqualTo(3);
        assertThat(model.standingProperty().get().said())
                .contains("printer Workshop")
                .contains("ruler");
    }

    @Test
    void printingCanBeCalledOff() {
        Tray tray = new Tray(null);
        SheetsModel model = model(() -> List.of(tray));
        model.print();
        callOffAt(model, 3);
        model.printOn(tray);
        assertThat(tray.pages).isEqualTo(1);
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.CalledOff(Errand.PRINT, true));
        model.back();
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Shown.class);
    }

    @Test
    void makingTheSheetsCanBeCalledOff() {
        for (int stage = 1; stage <= 7; stage++) {
            SheetsModel model = model();
            callOffAt(model, stage);
            model.print();
            assertThat(model.standingProperty().get())
                    .as("stage %d", stage)
                    .isEqualTo(new Standing.CalledOff(Errand.PRINT, false));
        }
    }

    @Test
    void aPrinterThatFailsIsAnsweredWithWhatToDo() {
        Tray tray = new Tray(new IOException("out of paper"));
        SheetsModel model = model(() -> List.of(tray));
        model.print();
        model.printOn(tray);
        assertThat(model.standingProperty().get().said())
                .contains("Workshop")
                .contains("out of paper")
                .contains("write the PDF");
        model.back();
        assertThat(model.standingProperty().get()).isInstanceOf(Standing.Shown.class);
    }

    @Test
    void leafsWithinTheSheet() throws IOException {
        SheetsModel model = model();
        model.print();
        int count = model.pages().count();
        assertThat(count).isGreaterThan(3);
        model.pages().turn(-1);
        assertThat(model.pages().pageProperty().get()).isZero();
        model.pages().turn(count + 5);
        assertThat(model.pages().pageProperty().get()).isEqualTo(count - 1);
        assertThat(model.pages().pictureProperty().get().orElseThrow().page()).isEqualTo(count - 1);
        model.close();
        assertThat(model.pages().pictureProperty().get()).isEmpty();
        assertThat(model.standingProperty().get()).isEqualTo(new Standing.Idle());
    }
}
