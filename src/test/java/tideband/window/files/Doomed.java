package tideband.window.files;

import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.concurrent.Executors;
import java.util.concurrent.ScheduledExecutorService;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.Sample;
import tideband.edit.DesignEdits;
import tideband.window.drawing.DrawingModel;

/** A program that draws until it is killed: arguments are a design and a state folder. */
final class Doomed {
    private Doomed() {}

    /** Edits every 20 ms, and writes down in the state folder which edit it is at, with the time. */
    public static void main(String[] arguments) throws Exception {
        Path design = Path.of(arguments[0]);
        Path state = Path.of(arguments[1]);
        ScheduledExecutorService beside = Executors.newSingleThreadScheduledExecutor();
        ScheduledExecutorService screen = Executors.newSingleThreadScheduledExecutor();
        DrawingModel drawing = new DrawingModel(Sample.WICK_KEY.design());
        FilesModel files = new FilesModel(
                drawing, new Recovery(state), new RecentFiles(state.resolve("recent")), new Answers(), beside, screen);
        screen.submit(() -> files.open(design)).get();
        for (int i = 0; ; i++) {
            int number = i;
            screen.submit(() -> {
                        if (files.fileProperty().get().isPresent()) {
                            drawing.change("Change title", d -> DesignEdits.title(d, "Edit " + number));
                        }
                    })
                    .get();
            Files.writeString(state.resolve("log.new"), number + " " + System.currentTimeMillis() + "\n");
            Files.move(state.resolve("log.new"), state.resolve("log-" + number), StandardCopyOption.ATOMIC_MOVE);
            Thread.sleep(20);
        }
    }
}
