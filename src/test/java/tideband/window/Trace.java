package tideband.window;

import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadInfo;
import java.lang.management.ThreadMXBean;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.NavigableMap;
import java.util.TreeMap;
import java.util.stream.Collectors;
import jdk.jfr.Event;
import jdk.jfr.Name;
import jdk.jfr.Recording;
import jdk.jfr.StackTrace;
import jdk.jfr.consumer.RecordedEvent;
import jdk.jfr.consumer.RecordedFrame;
import jdk.jfr.consumer.RecordingFile;

/**
 * A flight recording of drags: the toolkit's own events say when each frame was laid out, painted and brought to the
 * screen, and ours say which mouse event and which answer came when.
 */
final class Trace implements AutoCloseable {
    private static final String PHASE = "javafx.PulsePhase";
    private static final String SAMPLE = "jdk.ExecutionSample";
    private static final String NATIVE = "jdk.NativeMethodSample";
    private static final int LINES = 12;

    private final boolean profiled = Boolean.getBoolean("trace.profile");
    private Recording recording;
    private Map<String, Long> processorNs = Map.of();

    private Trace() {}

    /** A mouse event has come. */
    @Name("tideband.Posted")
    @StackTrace(false)
    static final class Posted extends Event {
        @SuppressWarnings("UnusedVariable") // read by the recorder
        private final int number;

        private Posted(int number) {
            this.number = number;
        }

        static void mark(int number) {
            new Posted(number).commit();
        }
    }

    /** A mouse event was dealt with. */
    @Name("tideband.Handled")
    @StackTrace(false)
    static final class Handled extends Event {
        @SuppressWarnings("UnusedVariable") // read by the recorder
        private final int number;

        @SuppressWarnings("UnusedVariable") // read by the recorder
        private boolean changed;

        Handled(int number) {
            this.number = number;
        }

        void end(boolean drawingChanged) {
            changed = drawingChanged;
            commit();
        }
    }

    /** The answer to the drawing as a mouse event left it is there. */
    @Name("tideband.Answered")
    @StackTrace(false)
    static final class Answered extends Event {
        @SuppressWarnings("UnusedVariable") // read by the recorder
        private final int number;

        private Answered(int number) {
            this.number = number;
        }

        static void mark(int number) {
            new Answered(number).commit();
        }
    }

    // A frame: when it began on the screen's thread, how long that thread took, when it was on the screen.
    private record Frame(Instant begun, Instant laidOut, Instant shown, double paintedMs) {}

    /** Begins to record; the toolkit must not have been started yet. */
    static Trace begun() {
        Trace trace = new Trace();
        trace.clear();
        return trace;
    }

    /** How busy the machine is. */
    static String load() {
        return String.format(
                Locale.ROOT,
                "load of the machine %.1f over the last minute",
                ManagementFactory.getOperatingSystemMXBean().getSystemLoadAverage());
    }

    /** Forgets what was recorded so far. */
    void clear() {
        close();
        recording = new Recording();
        recording.enable(PHASE).withoutThreshold();
        recording.enable("jdk.GCPhasePause").withoutThreshold();
        if (profiled) {
            recording.enable(SAMPLE).withPeriod(Duration.ofMillis(10));
            recording.enable("jdk.ObjectAllocationSample").with("throttle", "300/s");
            recording.enable(NATIVE).withPeriod(Duration.ofMillis(10));
        }
        recording.start();
        processorNs = processorNs();
    }

    @Override
    public void close() {
        if (recording != null) {
            recording.close();
        }
    }

    /** Prints what was recorded since the last clearing. */
    void print() throws IOException {
        Map<String, Long> after = processorNs();
        recording.stop();
        Path file = Files.createTempFile("trace", ".jfr");
        recording.dump(file);
        List<RecordedEvent> all = RecordingFile.readAllEvents(file);
        Files.delete(file);
        List<Frame> frames = frames(all);
        NavigableMap<Integer, RecordedEvent> posted = numbered(all, "tideband.Posted");
        NavigableMap<Integer, RecordedEvent> handled = numbered(all, "tideband.Handled");
        NavigableMap<Integer, RecordedEvent> answered = numbered(all, "tideband.Answered");
        List<Double> handling = new ArrayList<>();
        List<Double> waiting = new ArrayList<>();
        List<Double> working = new ArrayList<>();
        List<Double> field = new ArrayList<>();
        List<Double> answering = new ArrayList<>();
        List<Double> order = new ArrayList<>();
        for (int number : posted.keySet()) {
            Instant came = posted.get(number).getStartTime();
            RecordedEvent deal = handled.get(number);
            if (!deal.getBoolean("changed")) {
                // Snapped to where it was: there is nothing to paint.
                continue;
            }
            handling.add(ms(deal.getDuration()));
            Frame frame = after(frames, deal.getEndTime());
            if (frame != null) {
                waiting.add(ms(Duration.between(deal.getEndTime(), frame.begun)));
                working.add(ms(deal.getDuration()) + ms(Duration.between(frame.begun, frame.shown)));
                field.add(ms(Duration.between(came, frame.shown)));
            }
            Map.Entry<Integer, RecordedEvent> answer = firstAnswer(answered, number);
            if (answer != null) {
                answering.add(ms(Duration.between(came, answer.getValue().getStartTime())));
                Frame shown = after(frames, answer.getValue().getEndTime());
                if (shown != null) {
                    order.add(ms(Duration.between(came, shown.shown)));
                }
            }
        }
        print("handler", handling);
        print("frame: on the screen's thread", laidOut(frames));
        print("frame: painting", frames.stream().map(Frame::paintedMs).toList());
        print("wait for the toolkit's clock", waiting);
        print("handler and frame, without that wait", working);
        print("event to field on the screen", field);
        print("event to answer", answering);
        print("event to piece and order of work on the screen", order);
        System.out.printf(
                Locale.ROOT,
                "  %d events, %d of them with a change; %d frames, %d answers shown%n",
                posted.size(),
                handling.size(),
                frames.size(),
                answered.size());
        printProcessor(after, "an event", posted.size());
        printProcessor(after, "a frame", frames.size());
        printPauses(all);
        printProfile(all);
        printAllocated(all);
    }

    private static Map.Entry<Integer, RecordedEvent> firstAnswer(
            NavigableMap<Integer, RecordedEvent> answered, int number) {
        Map.Entry<Integer, RecordedEvent> first = null;
        for (Map.Entry<Integer, RecordedEvent> later :
                answered.tailMap(number, true).entrySet()) {
            if (first == null
                    || later.getValue().getStartTime().isBefore(first.getValue().getStartTime())) {
                first = later;
            }
        }
        return first;
    }

    /** Of an answer given twice, at first for showing and then whole, the first counts. */
    private static NavigableMap<Integer, RecordedEvent> numbered(List<RecordedEvent> all, String name) {
        NavigableMap<Integer, RecordedEvent> found = new TreeMap<>();
        for (RecordedEvent event : all) {
            if (event.getEventType().getName().equals(name)) {
                found.merge(
                        event.getInt("number"),
                        event,
                        (one, other) -> one.getStartTime().isBefore(other.getStartTime()) ? one : other);
            }
        }
        return found;
    }

    private static List<Frame> frames(List<RecordedEvent> all) {
        Map<Integer, List<RecordedEvent>> pulses = new TreeMap<>();
        for (RecordedEvent event : all) {
            if (event.getEventType().getName().equals(PHASE)) {
                pulses.computeIfAbsent(event.getInt("pulseId"), id -> new ArrayList<>())
                        .add(event);
            }
        }
        List<Frame> frames = new ArrayList<>();
        for (List<RecordedEvent> phases : pulses.values()) {
            Instant begun = Instant.MAX;
            Instant laidOut = Instant.MIN;
            Instant shown = null;
            double painted = 0;
            for (RecordedEvent phase : phases) {
                boolean onScreen = phase.getThread().getJavaName().startsWith("JavaFX");
                if (onScreen) {
                    begun = phase.getStartTime().isBefore(begun) ? phase.getStartTime() : begun;
                    laidOut = phase.getEndTime().isAfter(laidOut) ? phase.getEndTime() : laidOut;
                } else {
                    painted += ms(phase.getDuration());
                    shown = shown == null || phase.getEndTime().isAfter(shown) ? phase.getEndTime() : shown;
                }
            }
            if (shown != null && laidOut.isAfter(Instant.MIN)) {
                frames.add(new Frame(begun, laidOut, shown, painted));
            }
        }
        return frames;
    }

    private static List<Double> laidOut(List<Frame> frames) {
        return frames.stream()
                .map(f -> ms(Duration.between(f.begun, f.laidOut)))
                .toList();
    }

    private static Frame after(List<Frame> frames, Instant moment) {
        return frames.stream()
                .filter(f -> !f.begun.isBefore(moment))
                .findFirst()
                .orElse(null);
    }

    private static double ms(Duration duration) {
        return duration.toNanos() / 1e6;
    }

    private static void print(String what, List<Double> ms) {
        double[] sorted = ms.stream().mapToDouble(v -> v).sorted().toArray();
        if (sorted.length == 0) {
            System.out.println("  " + what + ": never");
            return;
        }
        System.out.printf(
                Locale.ROOT,
                "  %-48s median %6.2f   95th percentile %6.2f   99th %6.2f   most %7.2f ms%n",
                what,
                sorted[sorted.length / 2],
                sorted[(int) (sorted.length * 0.95)],
                sorted[(int) (sorted.length * 0.99)],
                sorted[sorted.length - 1]);
    }

    private static Map<String, Long> processorNs() {
        ThreadMXBean threads = ManagementFactory.getThreadMXBean();
        Map<String, Long> used = new HashMap<>();
        for (ThreadInfo thread : threads.getThreadInfo(threads.getAllThreadIds())) {
            if (thread != null) {
                used.merge(thread.getThreadName(), threads.getThreadCpuTime(thread.getThreadId()), Long::sum);
            }
        }
        return used;
    }

    private void printProcessor(Map<String, Long> after, String each, int count) {
        String used = after.entrySet().stream()
                .filter(e -> e.getKey().startsWith("JavaFX App")
                        || e.getKey().startsWith("Quantum")
                        || e.getKey().startsWith("tideband"))
                .sorted(Map.Entry.comparingByKey())
                .map(e -> String.format(
                        Locale.ROOT,
                        "%s %.2f ms",
                        e.getKey(),
                        (e.getValue() - processorNs.getOrDefault(e.getKey(), 0L)) / 1e6 / count))
                .collect(Collectors.joining(", "));
        System.out.println("  processor time " + each + ": " + used + "; " + load());
    }

    private static void printPauses(List<RecordedEvent> all) {
        double[] pauses = all.stream()
                .filter(e -> e.getEventType().getName().equals("jdk.GCPhasePause"))
                .mapToDouble(e -> ms(e.getDuration()))
                .toArray();
        System.out.printf(
                Locale.ROOT,
                "  pauses of the collector: %d, longest %.1f ms%n",
                pauses.length,
                Arrays.stream(pauses).max().orElse(0));
    }

    /** The methods most often met on top of a stack, and of ours anywhere in it, by thread. */
    private void printProfile(List<RecordedEvent> all) {
        if (!profiled) {
            return;
        }
        Map<String, Map<String, Integer>> met = new TreeMap<>();
        for (RecordedEvent event : all) {
            String type = event.getEventType().getName();
            if ((!type.equals(SAMPLE) && !type.equals(NATIVE)) || event.getStackTrace() == null) {
                continue;
            }
            String thread = event.getThread("sampledThread").getJavaName();
            List<RecordedFrame> stack = event.getStackTrace().getFrames();
            met.computeIfAbsent(thread, t -> new HashMap<>()).merge("* all", 1, Integer::sum);
            met.computeIfAbsent(thread, t -> new HashMap<>()).merge("top " + name(stack.get(0)), 1, Integer::sum);
            stack.stream()
                    .map(Trace::name)
                    .distinct()
                    .forEach(n -> met.get(thread).merge("in  " + n, 1, Integer::sum));
        }
        met.forEach((thread, counts) -> {
            System.out.println("  " + thread + ": " + counts.get("* all"));
            for (String kind : List.of("top", "in ")) {
                counts.entrySet().stream()
                        .filter(e -> e.getKey().startsWith(kind))
                        .sorted(Map.Entry.<String, Integer>comparingByValue().reversed())
                        .limit(kind.equals("top") ? LINES : 5 * LINES)
                        .forEach(e -> System.out.println("    " + e.getValue() + " " + e.getKey()));
            }
        });
    }

    /** Where what ends on the heap comes from: our own methods, and the share of each in all that was allocated. */
    private void printAllocated(List<RecordedEvent> all) {
        if (!profiled) {
            return;
        }
        Map<String, Long> bytes = new HashMap<>();
        long sum = 0;
        for (RecordedEvent event : all) {
            if (event.getEventType().getName().equals("jdk.ObjectAllocationSample") && event.getStackTrace() != null) {
                long weight = event.getLong("weight");
                sum += weight;
                String thread = event.getThread().getJavaName();
                bytes.merge(thread, weight, Long::sum);
                event.getStackTrace().getFrames().stream()
                        .filter(f -> f.getMethod().getType().getName().startsWith("tideband"))
                        .map(Trace::name)
                        .distinct()
                        .forEach(n -> bytes.merge(thread + ": " + n, weight, Long::sum));
            }
        }
        long whole = Math.max(1, sum);
        System.out.printf("  allocated: %d MB%n", whole / 1_000_000);
        bytes.entrySet().stream()
                .sorted(Map.Entry.<String, Long>comparingByValue().reversed())
                .limit(4 * LINES)
                .forEach(e -> System.out.println("    " + 100 * e.getValue() / whole + " % " + e.getKey()));
    }

    private static String name(RecordedFrame frame) {
        String type = frame.getMethod().getType().getName();
        return type.substring(type.lastIndexOf('.') + 1) + "."
                + frame.getMethod().getName();
    }
}
