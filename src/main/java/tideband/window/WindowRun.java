package tideband.window;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.application.Platform;
import javafx.stage.Stage;
import tideband.document.Preferences;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.StateFolder;
import tideband.window.comfort.ComfortModel;
import tideband.window.comfort.LengthUnit;
import tideband.window.files.FilesView;

/** The program in its window: reads what is kept between runs, opens the window, and keeps what is to be kept. */
final class WindowRun {
    private final Path state = StateFolder.usual();
    private final Path preferencesFile = state.resolve("preferences");
    private final ComfortModel comfort = new ComfortModel();
    private Threads threads;
    private DrawingDesk desk;

    /**
     * Opens the window; the program ends when it is closed.
     *
     * @param stage the window
     * @param first what lies on the desk to begin with
     * @param design the file to open, if any
     */
    void start(Stage stage, Beginning first, Optional<Path> design) {
        threads = Threads.start(Platform::runLater);
        Preferences.Loaded loaded = Preferences.read(preferencesFile);
        List<String> notes = new ArrayList<>(loaded.notes());
        take(loaded.preferences());
        stage.setWidth(loaded.preferences().widthPx());
        stage.setHeight(loaded.preferences().heightPx());
        desk = new DrawingDesk(
                stage,
                first,
                comfort,
                threads,
                new Recovery(state),
                new RecentFiles(state.resolve("recent")),
                new FilesView(stage, comfort),
                System::nanoTime);
        Thread.setDefaultUncaughtExceptionHandler((thread, fault) -> {
            // The status line has room for one sentence; whoever is to mend it needs the whole of it.
            fault.printStackTrace();
            Platform.runLater(() -> desk.say(fault));
        });
        desk.show();
        notes.forEach(desk::say);
        design.ifPresentOrElse(desk.files()::open, desk::welcome);
    }

    /** Keeps what suits the user, and ends the threads. */
    void stop() throws IOException {
        threads.close();
        kept().write(preferencesFile);
    }

    private void take(Preferences preferences) {
        comfort.unitProperty().set(preferences.inches() ? LengthUnit.INCH : LengthUnit.MILLIMETRE);
        comfort.textPercentProperty().set(preferences.textPercent());
        comfort.darkProperty().set(preferences.dark());
        comfort.mutedProperty().set(preferences.muted());
    }

    private Preferences kept() {
        return new Preferences(
                comfort.unit() == LengthUnit.INCH,
                comfort.textPercentProperty().get(),
                comfort.darkProperty().get(),
                comfort.mutedProperty().get(),
                (int) desk.stage().getWidth(),
                (int) desk.stage().getHeight());
    }
}
