package tideband.window;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.IdentityHashMap;
import java.util.Locale;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.locks.LockSupport;
import java.util.function.Supplier;
import javafx.application.Platform;
import javafx.event.Event;
import javafx.event.EventType;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.PickResult;
import javafx.stage.Stage;
import tideband.design.Design;
import tideband.design.FadeStyle;
import tideband.design.PullSettings;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.edit.Part;
import tideband.piece.End;
import tideband.window.comfort.ComfortModel;
import tideband.window.field.FieldView;
import tideband.window.field.Handle;
import tideband.window.field.TwelveBands;
import tideband.window.files.FilesView;

/**
 * Drags in the whole window, by mouse events that come every 16 ms as a hand's do, and prints how long it takes from
 * event to painted field and to painted order of work, which threads were busy, and what ten thousand drags leave on the
 * heap. A program to be run by hand; its first word is {@code drags}, {@code heap} or {@code start}, then width and height in px.
 */
final class WindowTrace {
    private static final int EVENTS = 750;
    private static final int WARMING = 400;
    private static final int DRAGS = 10_000;
    private static final long BETWEEN_NS = 16_000_000;

    private final DrawingDesk desk;
    private final FieldView field;
    private final IdentityHashMap<Design, Integer> events = new IdentityHashMap<>();
    private int posted;

    private WindowTrace(Stage stage, Path state, int width, int height) {
        ComfortModel comfort = new ComfortModel();
        stage.setWidth(width);
        stage.setHeight(height);
        desk = new DrawingDesk(
                stage,
                Beginning.with(TwelveBands.design()),
                comfort,
                Threads.start(Platform::runLater),
                new Recovery(state),
                new RecentFiles(state.resolve("recent")),
                new FilesView(stage, comfort),
                System::nanoTime);
        field = desk.view().field();
        desk.model()
                .work()
                .answerProperty()
                .addListener((value, before, after) ->
                        after.map(a -> a.design()).map(events::get).ifPresent(Trace.Answered::mark));
        desk.show();
    }

    /**
     * Runs the trace.
     *
     * @param words what to trace, width and height
     * @throws Exception if it cannot be traced
     */
    public static void main(String[] words) throws Exception {
        String what = words.length > 0 ? words[0] : "drags";
        if (what.equals("start")) {
            StartTrace.run(words.length > 1 ? words[1] : "designs/lantern-hook.json");
            return;
        }
        int width = words.length > 1 ? Integer.parseInt(words[1]) : 1280;
        int height = words.length > 2 ? Integer.parseInt(words[2]) : 800;
        Path state = Files.createTempDirectory("trace");
        try (Trace trace = Trace.begun()) {
            DrawingWindow.prepareToPaint();
            Platform.startup(() -> {});
            WindowTrace window = onScreen(() -> new WindowTrace(new Stage(), state, width, height));
            System.out.printf("%d x %d px, %s%n", width, height, Trace.load());
            if (what.equals("heap")) {
                window.heap();
            } else {
                window.drags(trace, words.length > 3 ? words[3] : "all");
            }
        }
        Platform.exit();
        System.exit(0);
    }

    private void drags(Trace trace, String which) throws IOException {
        for (FadeStyle mode : FadeStyle.values()) {
            if (!which.equals("all") && !which.equals(mode.key())) {
                continue;
            }
            onScreen(() -> desk.model().drawing().change("Fades", d -> d.withPull(with(d.pull(), mode))));
            pause(2000);
            drag(new Part.EdgeAt(4), 30, 0, WARMING);
            drag(new Part.Level(2), 0, 25, WARMING);
            trace(trace, mode.key() + " fades, an edge", new Part.EdgeAt(4), 30, 0);
            trace(trace, mode.key() + " fades, a level", new Part.Level(2), 0, 25);
            trace(trace, mode.key() + " fades, an end of a fade", new Part.FadeEnd(7, End.B), 0, 20);
        }
    }

    private static PullSettings with(PullSettings pull, FadeStyle style) {
        return new PullSettings(pull.holdS(), style, pull.stepDe00(), pull.slowestMmPerS(), pull.fastestMmPerS());
    }

    private void trace(Trace trace, String what, Part part, double reachXPx, double reachYPx) throws IOException {
        pause(1000);
        trace.clear();
        drag(part, reachXPx, reachYPx, EVENTS);
        pause(1500);
        System.out.println(what);
        trace.print();
    }

    /** One drag to and fro, an event every 16 ms whether or not the last has been dealt with. */
    private void drag(Part part, double reachXPx, double reachYPx, int count) {
        Handle handle = handle(part);
        onScreen(() -> fire(MouseEvent.MOUSE_PRESSED, handle.xPx(), handle.yPx()));
        long next = System.nanoTime();
        for (int i = 1; i <= count; i++) {
            next += BETWEEN_NS;
            while (System.nanoTime() < next) {
                LockSupport.parkNanos(next - System.nanoTime());
            }
            double x = handle.xPx() + reachXPx * Math.sin(i / 9.0) + (reachXPx > 0 ? i % 2 : 0);
            double y = handle.yPx() - reachYPx * (1 - Math.cos(i / 9.0)) - (reachYPx > 0 ? i % 2 : 0);
            int number = posted++;
            Trace.Posted.mark(number);
            Platform.runLater(() -> {
                Trace.Handled handled = new Trace.Handled(number);
                handled.begin();
                Design before = desk.model().drawing().design();
                fire(MouseEvent.MOUSE_DRAGGED, x, y);
                Design after = desk.model().drawing().design();
                events.put(after, number);
                handled.end(!after.equals(before));
            });
        }
        onScreen(() -> {
            fire(MouseEvent.MOUSE_RELEASED, handle.xPx(), handle.yPx());
            events.clear();
            events.put(desk.model().drawing().design(), posted - 1);
            return true;
        });
    }

    private Handle handle(Part part) {
        return onScreen(() -> desk.model().field().shown().handles().stream()
                .filter(h -> h.part().equals(part))
                .findFirst()
                .orElseThrow());
    }

    private boolean fire(EventType<MouseEvent> type, double xPx, double yPx) {
        double stripPx = field.getHeight() - desk.model().field().shown().area().heightPx();
        double x = xPx;
        double y = yPx + stripPx;
        var scene = field.localToScene(x, y);
        boolean down = type != MouseEvent.MOUSE_RELEASED;
        Event.fireEvent(
                field,
                new MouseEvent(
                        field,
                        field,
                        type,
                        x,
                        y,
                        scene.getX(),
                        scene.getY(),
                        MouseButton.PRIMARY,
                        1,
                        false,
                        false,
                        false,
                        false,
                        down,
                        false,
                        false,
                        false,
                        false,
                        type != MouseEvent.MOUSE_DRAGGED,
                        new PickResult(field, scene.getX(), scene.getY())));
        return true;
    }

    private void heap() {
        pause(2000);
        many(500);
        pause(2000);
        long before = heapBytes();
        int stepsBefore = 0;
        for (int part = 1; part <= 5; part++) {
            many(DRAGS / 5);
            pause(2500);
            long now = heapBytes();
            System.out.printf(
                    Locale.ROOT,
                    "after %d drags: live heap %.1f MB, %.1f MB at first%n",
                    stepsBefore += DRAGS / 5,
                    now / 1e6,
                    before / 1e6);
        }
        int undone = onScreen(() -> {
            int steps = 0;
            while (!desk.model().drawing().undoNameProperty().get().isEmpty()) {
                desk.model().drawing().undo();
                steps++;
            }
            return steps;
        });
        System.out.println("steps that could be undone: " + undone);
    }

    /** Drags of one event each; painted now and then, as a hand could not be so quick. */
    private void many(int count) {
        for (int i = 0; i < count; i++) {
            double by = i % 2 == 0 ? 20 : -20;
            Part part = new Part.EdgeAt(4);
            Handle handle = handle(part);
            onScreen(() -> {
                fire(MouseEvent.MOUSE_PRESSED, handle.xPx(), handle.yPx());
                fire(MouseEvent.MOUSE_DRAGGED, handle.xPx() + by, handle.yPx());
                return fire(MouseEvent.MOUSE_RELEASED, handle.xPx() + by, handle.yPx());
            });
            if (i % 4 == 0) {
                pause(1);
            }
        }
    }

    private static long heapBytes() {
        for (int i = 0; i < 3; i++) {
            System.gc();
        }
        Runtime runtime = Runtime.getRuntime();
        return runtime.totalMemory() - runtime.freeMemory();
    }

    private static <T> T onScreen(Supplier<T> act) {
        CompletableFuture<T> done = new CompletableFuture<>();
        Platform.runLater(() -> {
            try {
                done.complete(act.get());
            } catch (RuntimeException | Error fault) {
                done.completeExceptionally(fault);
            }
        });
        return done.join();
    }

    private static void pause(long ms) {
        LockSupport.parkNanos(ms * 1_000_000);
    }
}
