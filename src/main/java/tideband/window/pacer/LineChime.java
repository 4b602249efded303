package tideband.window.pacer;

import java.util.EnumMap;
import java.util.Map;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import javax.sound.sampled.AudioFormat;
import javax.sound.sampled.AudioSystem;
import javax.sound.sampled.LineUnavailableException;
import javax.sound.sampled.SourceDataLine;
import tideband.pacer.Tone;

/**
 * Plays made tones on the computer's audio line, on a thread of its own. Where there is no line it is silent and says so.
 */
public final class LineChime implements Chime {
    /** What is said where there is no audio line. */
    static final String NO_DEVICE = "no sound device: watch the screen";

    private static final float RATE_HZ = 44_100;
    private static final int WAITING = 4;
    private static final int LINE_BYTES = 8_820;

    private final AudioFormat format = new AudioFormat(RATE_HZ, 16, 1, true, false);
    private final Map<Tone, byte[]> tones = new EnumMap<>(Tone.class);
    // One thread, a short queue, and what comes late is dropped: a tone that is late would mislead.
    private final ThreadPoolExecutor beside = new ThreadPoolExecutor(
            1,
            1,
            0,
            TimeUnit.SECONDS,
            new ArrayBlockingQueue<>(WAITING),
            work -> {
                Thread thread = new Thread(work, "pacer sounds");
                thread.setDaemon(true);
                return thread;
            },
            new ThreadPoolExecutor.DiscardOldestPolicy());
    private final LineSource source;
    private volatile String trouble = "";
    private SourceDataLine line;

    /** Where an audio line comes from. */
    interface LineSource {
        SourceDataLine open(AudioFormat format) throws LineUnavailableException;
    }

    /** A chime on the computer's own audio line. */
    public LineChime() {
        this(AudioSystem::getSourceDataLine);
    }

    LineChime(LineSource source) {
        this.source = source;
        for (Tone tone : Tone.values()) {
            tones.put(tone, Beeps.of(tone, RATE_HZ));
        }
        beside.execute(this::openLine);
    }

    private void openLine() {
        try {
            SourceDataLine opened = source.open(format);
            opened.open(format, LINE_BYTES);
            opened.start();
            line = opened;
        } catch (LineUnavailableException | IllegalArgumentException | SecurityException noLine) {
            trouble = NO_DEVICE;
        }
    }

    @Override
    public void sound(Tone tone) {
        if (!beside.isShutdown()) {
            beside.execute(() -> play(tones.get(tone)));
        }
    }

    private void play(byte[] samples) {
        if (line != null) {
            line.write(samples, 0, samples.length);
        }
    }

    @Override
    public String trouble() {
        return trouble;
    }

    @Override
    public void close() {
        beside.execute(() -> {
            if (line != null) {
                line.drain();
                line.close();
            }
        });
        beside.shutdown();
    }
}
