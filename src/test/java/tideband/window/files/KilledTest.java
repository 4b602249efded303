package tideband.window.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import tideband.document.RecentFiles;
import tideband.document.Recovery;
import tideband.document.Sample;
import tideband.window.drawing.DrawingModel;

/** A program is really killed (SIGKILL), and what was drawn is found again, but for the last moments. */
class KilledTest {
    private static final long MOST_LOST_MS = 2000;

    @TempDir
    Path folder;

    private Path state;

    @BeforeEach
    void aStateFolder() throws IOException {
        state = Files.createDirectory(folder.resolve("state"));
    }

    /** Lets a program draw up to an edit, and kills it; the answer is the time of that. */
    private long killed(Path hook, int edit) throws IOException, InterruptedException {
        Process doomed = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-cp",
                        System.getProperty("java.class.path"),
                        Doomed.class.getName(),
                        hook.toString(),
                        state.toString())
                .redirectErrorStream(true)
                .redirectOutput(folder.resolve("output").toFile())
                .start();
        long deadline = System.nanoTime() + TimeUnit.SECONDS.toNanos(60);
        while (!Files.exists(state.resolve("log-" + edit)) && System.nanoTime() < deadline && doomed.isAlive()) {
            Thread.sleep(20);
        }
        assertThat(doomed.isAlive())
                .as(Files.readString(folder.resolve("output")))
                .isTrue();
        assertThat(new Recovery(state).leftBehind().drawings())
                .as("still running")
                .isEmpty();
        long atMs = System.currentTimeMillis();
        doomed.destroyForcibly().waitFor();
        return atMs;
    }

    private FilesModel started(DrawingModel drawing, Answers user, HandClock clock) {
        RecentFiles recent = new RecentFiles(state.resolve("recent"));
        FilesModel files = new FilesModel(drawing, new Recovery(state), recent, user, clock, Runnable::run);
        files.start();
        return files;
    }

    @Test
    void atMostTwoSecondsAreLost() throws IOException, InterruptedException {
        Path hook = Files.copy(Path.of("designs/lantern-hook.json"), folder.resolve("hook.json"));
        long killedMs = killed(hook, 150);
        Answers user = new Answers().will(Asks.LeftChoice.Act.OPEN);
        DrawingModel drawing = new DrawingModel(Sample.WICK_KEY.design());
        HandClock clock = new HandClock();
        FilesModel files = started(drawing, user, clock);
        assertThat(user.heard).containsExactly("left behind 1");
        String title = drawing.design().title();
        assertThat(title).startsWith("Edit ");
        String log = Files.readString(state.resolve("log-" + title.substring("Edit ".length())));
        long lostMs = killedMs - Long.parseLong(log.strip().split(" ", -1)[1]);
        assertThat(lostMs).isLessThan(MOST_LOST_MS);
        assertThat(files.fileProperty().get()).contains(hook);
        assertThat(files.changedProperty().get()).isTrue();
        files.save();
        clock.advance(1000);
        assertThat(Files.readString(hook)).contains(title);
        assertThat(new Recovery(state).leftBehind().drawings()).isEmpty();
        try (var store = Files.list(state.resolve("open-drawings"))) {
            assertThat(store).isEmpty();
        }
    }

    @Test
    void whatIsDecidedLaterIsOfferedAgainAndWhatIsDiscardedIsNot() throws IOException, InterruptedException {
        killed(Files.copy(Path.of("designs/lantern-hook.json"), folder.resolve("hook.json")), 60);
        Answers user = new Answers().will("later");
        FilesModel files = started(new DrawingModel(Sample.WICK_KEY.design()), user, new HandClock());
        assertThat(files.leftBehindProperty().get()).isEqualTo(1);
        user.will(Asks.LeftChoice.Act.DISCARD);
        files.askAboutLeftBehind();
        assertThat(files.leftBehindProperty().get()).isZero();
        assertThat(new Recovery(state).leftBehind().drawings()).isEmpty();
        files.askAboutLeftBehind();
        assertThat(user.heard).containsExactly("left behind 1", "left behind 1");
    }
}
