package tideband.window.field;

import com.sun.management.OperatingSystemMXBean;
import java.lang.management.ManagementFactory;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.Executor;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import javafx.application.Platform;
import javafx.beans.property.SimpleObjectProperty;
import javafx.scene.Scene;
import javafx.scene.image.WritableImage;
import javafx.scene.layout.StackPane;
import javafx.stage.Stage;
import tideband.bench.Colours;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.look.Look;
import tideband.window.work.TiltModel;
import tideband.window.work.WorkModel;

/**
 * Drags in a field on the screen and prints how long it takes from the hand's event to the finished picture, and what
 * ten thousand drags leave on the heap. Planning goes on beside as in the window. A program to be run by hand.
 */
final class DragTrace {
    private static final int EVENTS = 2000;
    private static final int MANY = 10_000;
    private final FieldModel model;
    private final DrawingModel drawing;
    private final Scene scene;
    private final FieldView view;

    private DragTrace(int width, int height, Executor beside) {
        Design design = TwelveBands.design();
        drawing = new DrawingModel(design);
        WorkModel work = new WorkModel(drawing.designProperty(), Colours.of(design), beside, Platform::runLater);
        ComfortModel comfort = new ComfortModel();
        model = new FieldModel(
                drawing,
                work,
                new TiltModel(work, beside, Platform::runLater),
                comfort,
                new SimpleObjectProperty<>(List.of()),
                match -> {},
                new SimpleObjectProperty<>(Optional.empty()),
                new SimpleObjectProperty<>(List.of()));
        view = new FieldView(model, comfort);
        StackPane root = new StackPane(view);
        Look.dress(root, comfort);
        scene = new Scene(root, width, height);
        Stage stage = new Stage();
        stage.setScene(scene);
        stage.show();
    }

    /** Runs the trace.
     *
     * @param sizes width and height, in px; 1000 and 400 where none are given; a third word leaves planning out
     * @throws InterruptedException if it is stopped
     */
    public static void main(String[] sizes) throws InterruptedException {
        int width = sizes.length > 0 ? Integer.parseInt(sizes[0]) : 1000;
        int height = sizes.length > 1 ? Integer.parseInt(sizes[1]) : 400;
        ExecutorService beside = Executors.newSingleThreadExecutor();
        boolean alone = sizes.length > 2;
        CountDownLatch done = new CountDownLatch(1);
        Platform.startup(() -> {
            DragTrace trace = new DragTrace(width, height, alone ? task -> {} : beside);
            trace.events(200, "to warm up");
            trace.events(EVENTS, "of an edge");
            trace.many();
            done.countDown();
        });
        done.await();
        beside.shutdownNow();
        Platform.exit();
    }

    private Handle of(Part part) {
        return model.shown().handles().stream()
                .filter(h -> h.part().equals(part))
                .findFirst()
                .orElseThrow();
    }

    private void events(int count, String what) {
        WritableImage picture = new WritableImage((int) scene.getWidth(), (int) scene.getHeight());
        scene.snapshot(picture);
        double[] whole = new double[count];
        double[] own = new double[count];
        double[] still = new double[count];
        double[] processor = new double[count];
        Handle edge = of(new Part.EdgeAt(4));
        model.hand().press(edge.xPx(), edge.yPx(), Modifiers.NONE);
        for (int i = 0; i < count; i++) {
            double x = edge.xPx() + 30 * Math.sin(i / 9.0) + i % 2;
            long processorBefore = processorNs();
            long before = System.nanoTime();
            model.hand().drag(x, edge.yPx() + i % 5, Modifiers.NONE);
            view.layout();
            long painted = System.nanoTime();
            scene.snapshot(picture);
            long after = System.nanoTime();
            processor[i] = (processorNs() - processorBefore) / 1e6;
            scene.snapshot(picture);
            still[i] = (System.nanoTime() - after) / 1e6;
            own[i] = (painted - before) / 1e6;
            whole[i] = (after - before) / 1e6;
        }
        model.hand().release();
        print(count + " events " + what + ", event to drawing commands", own);
        print(count + " events " + what + ", event to finished picture", whole);
        print(count + " events " + what + ", processor time of all threads, planning beside included", processor);
        print("a snapshot alone, with nothing to paint", still);
    }

    private static long processorNs() {
        return ((OperatingSystemMXBean) ManagementFactory.getOperatingSystemMXBean()).getProcessCpuTime();
    }

    private static void print(String what, double[] ms) {
        double[] sorted = ms.clone();
        Arrays.sort(sorted);
        System.out.printf(
                Locale.ROOT,
                "%s: mean %.2f ms, median %.2f ms, 95th percentile %.2f ms, most %.2f ms%n",
                what,
                Arrays.stream(sorted).average().orElseThrow(),
                sorted[sorted.length / 2],
                sorted[(int) (sorted.length * 0.95)],
                sorted[sorted.length - 1]);
    }

    private void many() {
        long beforeMb = heapMb();
        for (int i = 0; i < MANY; i++) {
            Handle edge = of(new Part.EdgeAt(4));
            model.hand().press(edge.xPx(), edge.yPx(), Modifiers.NONE);
            model.hand().drag(edge.xPx() + (i % 2 == 0 ? 20 : -20), edge.yPx(), Modifiers.NONE);
            model.hand().release();
            view.layout();
            if (i % 50 == 0) {
                // Else the canvases' commands would only pile up.
                scene.snapshot(null);
            }
        }
        System.out.println(
                "heap before " + beforeMb + " MB, after " + MANY + " drags " + heapMb() + " MB, each of them undoable");
    }

    private static long heapMb() {
        for (int i = 0; i < 3; i++) {
            System.gc();
        }
        Runtime runtime = Runtime.getRuntime();
        return (runtime.totalMemory() - runtime.freeMemory()) / (1 << 20);
    }
}
