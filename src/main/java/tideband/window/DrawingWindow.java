package tideband.window;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.function.Supplier;
import java.util.logging.Logger;
import javafx.application.Platform;
import javafx.stage.Stage;
import javafx.stage.WindowEvent;

/** Opens the drawing window. */
public final class DrawingWindow {
    private static final String LINUX_PACKAGES =
            "libgtk-3-0 libgl1 libxtst6 libxxf86vm1 libpangoft2-1.0-0 (Debian and Ubuntu: apt-get install them)";

    private static final String DIRECT_GROUNDS = "prism.disableRegionCaching";

    private DrawingWindow() {}

    /**
     * Opens the window and waits until it is closed.
     *
     * @param design a design to open in it
     * @return why it could not be opened, where it couldn't
     */
    public static Optional<String> open(Optional<Path> design) {
        // Sheets are drawn and printed without windows of their own; two toolkits on one screen would quarrel.
        System.setProperty("java.awt.headless", "true");
        // JavaFX warns at every start that it is on the class path, where it is kept on purpose; all else it has to say
        // is let through. The logger is held here while the window is open, or its filter would be lost.
        Logger toolkit = Logger.getLogger("javafx");
        toolkit.setFilter(
                record -> !String.valueOf(record.getMessage()).startsWith("Unsupported JavaFX configuration"));
        try {
            return launch(design);
        } finally {
            toolkit.setFilter(null);
        }
    }

    private static Optional<String> launch(Optional<Path> design) {
        prepareToPaint();
        CompletableFuture<Beginning> first = beside(() -> Beginning.of(design));
        CompletableFuture<Void> closed = new CompletableFuture<>();
        try {
            Platform.startup(() -> show(first, design, closed));
            closed.join();
            return Optional.empty();
        } catch (UnsupportedOperationException noScreen) {
            return Optional.of("there is no screen to open a window on (" + noScreen.getMessage()
                    + "). Start it from a desktop session; the other commands work without a screen.");
        } catch (RuntimeException fault) {
            return Optional.of(reason(fault));
        }
    }

    /** On another thread, so that it goes on while the toolkit starts. */
    private static <T> CompletableFuture<T> beside(Supplier<T> task) {
        return CompletableFuture.supplyAsync(task, command -> {
            Thread thread = new Thread(command, "tideband beginning");
            thread.setDaemon(true);
            thread.start();
        });
    }

    private static void show(
            CompletableFuture<Beginning> first, Optional<Path> design, CompletableFuture<Void> closed) {
        try {
            Stage stage = new Stage();
            WindowRun program = new WindowRun();
            stage.addEventHandler(WindowEvent.WINDOW_HIDDEN, event -> end(program, closed));
            program.start(stage, first.join(), design);
        } catch (RuntimeException | Error fault) {
            closed.completeExceptionally(fault);
            Platform.exit();
        }
    }

    private static void end(WindowRun program, CompletableFuture<Void> closed) {
        try {
            program.stop();
            closed.complete(null);
        } catch (IOException | RuntimeException fault) {
            closed.completeExceptionally(fault);
        }
    }

    /**
     * Has plain grounds painted directly. By default the toolkit keeps pictures of them and stretches those, which a graphics
     * card does for nothing but a processor painting by itself does so slowly that most of every frame goes into it.
     */
    static void prepareToPaint() {
        if (System.getProperty(DIRECT_GROUNDS) == null) {
            System.setProperty(DIRECT_GROUNDS, "true");
        }
    }

    private static String reason(RuntimeException fault) {
        for (Throwable cause : causes(fault)) {
            if (cause instanceof IOException) {
                return "the window was closed, but its size and what you chose for it could not be kept (" + cause
                        + "). Your drawings are not concerned.";
            }
            if (cause instanceof UnsatisfiedLinkError) {
                return "the window could not be opened, as a library of the system is missing (" + cause.getMessage()
                        + "). On Linux it needs " + LINUX_PACKAGES + ".";
            }
        }
        List<Throwable> all = causes(fault);
        return "the window could not be opened: " + all.get(all.size() - 1) + ". On Linux it needs a screen and "
                + LINUX_PACKAGES + ".";
    }

    private static List<Throwable> causes(Throwable fault) {
        return java.util.stream.Stream.iterate(fault, cause -> cause != null, Throwable::getCause)
                .toList();
    }
}
