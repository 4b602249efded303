package tideband.window;

import java.lang.management.ManagementFactory;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.concurrent.locks.LockSupport;
import javafx.application.Platform;
import javafx.scene.Node;
import javafx.stage.Stage;
import javafx.stage.Window;

/**
 * Opens the window as the command does and prints how long after the start of the Java machine it is on the screen, and
 * how long until its first order of work is there too. Needs a screen, be it one in memory.
 */
final class StartTrace {
    private static final long LOOK_NS = 10_000_000;
    private static final long GIVE_UP_MS = 60_000;

    private final long begunMs = ManagementFactory.getRuntimeMXBean().getStartTime();
    private final boolean profiled = Boolean.getBoolean("trace.profile");
    private final Map<String, Integer> met = new HashMap<>();
    private int samples;
    private volatile boolean shown;
    private volatile boolean usable;

    private StartTrace() {}

    /** Opens the window with a design, waits for its first answer, prints and ends the program. */
    static void run(String design) throws InterruptedException {
        StartTrace trace = new StartTrace();
        trace.say("main method");
        Thread opening = new Thread(() -> DrawingWindow.open(Optional.of(Path.of(design))), "opening");
        opening.setDaemon(true);
        opening.start();
        while (!trace.usable && trace.elapsedMs() < GIVE_UP_MS) {
            trace.ask();
            trace.sample();
            LockSupport.parkNanos(LOOK_NS);
        }
        System.out.printf(
                Locale.ROOT,
                "  processor time of all threads %.2f s; %d classes; %s%n",
                ((com.sun.management.OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean())
                                .getProcessCpuTime()
                        / 1e9,
                ManagementFactory.getClassLoadingMXBean().getTotalLoadedClassCount(),
                Trace.load());
        trace.printProfile();
        Runtime.getRuntime().halt(0);
    }

    private long elapsedMs() {
        return System.currentTimeMillis() - begunMs;
    }

    private void say(String what) {
        System.out.printf(Locale.ROOT, "  %5d ms  %s%n", elapsedMs(), what);
    }

    private void ask() {
        try {
            Platform.runLater(this::look);
        } catch (IllegalStateException notYet) {
            // The toolkit has not been started; it will be asked again.
            return;
        }
    }

    private void look() {
        for (Window window : Window.getWindows()) {
            if (window instanceof Stage && window.isShowing() && window.getScene() != null) {
                if (!shown) {
                    shown = true;
                    say("window shown");
                    window.getScene().addPostLayoutPulseListener(new FirstFrame(window));
                }
            }
        }
    }

    /** Told of frames until the order of work is there. */
    private final class FirstFrame implements Runnable {
        private final Window window;
        private boolean first = true;

        FirstFrame(Window window) {
            this.window = window;
        }

        @Override
        public void run() {
            if (first) {
                first = false;
                Platform.runLater(() -> say("first frame"));
            }
            Node cards = window.getScene().lookup(".work-strip");
            if (!usable && cards != null && cards.isVisible()) {
                Platform.runLater(() -> {
                    if (!usable) {
                        say("order of work shown: usable");
                        usable = true;
                    }
                });
            }
        }
    }

    private void sample() {
        if (!profiled) {
            return;
        }
        for (Map.Entry<Thread, StackTraceElement[]> entry :
                Thread.getAllStackTraces().entrySet()) {
            String name = entry.getKey().getName();
            if (name.startsWith("JavaFX App") || name.equals("opening") || name.equals("tideband work")) {
                samples++;
                Map<String, Boolean> once = new TreeMap<>();
                for (StackTraceElement frame : entry.getValue()) {
                    once.put(name + ": " + frame.getClassName() + "." + frame.getMethodName(), true);
                }
                once.keySet().forEach(n -> met.merge(n, 1, Integer::sum));
            }
        }
    }

    private void printProfile() {
        met.entrySet().stream()
                .sorted(Map.Entry.<String, Integer>comparingByValue().reversed())
                .filter(e -> e.getValue() > 2)
                .limit(600)
                .forEach(e -> System.out.println("    " + e.getValue() + " of " + samples + " " + e.getKey()));
    }
}
