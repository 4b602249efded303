package tideband.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import picocli.CommandLine;
import picocli.CommandLine.ExecutionException;

class StreamsTest {
    private final Locale locale = Locale.getDefault();
    private final TimeZone zone = TimeZone.getDefault();

    @TempDir
    private Path folder;

    @AfterEach
    void restore() {
        Locale.setDefault(locale);
        TimeZone.setDefault(zone);
    }

    /** Property: the same command gives the same bytes, wherever and how often it is run. */
    @ParameterizedTest
    @ValueSource(strings = {"tr-TR", "ar-EG-u-nu-arab", "hi-IN-u-nu-deva", "de-CH", "th-TH-u-ca-buddhist-nu-thai"})
    void sameBytesInAnyLocale(String tag) {
        List<String> lines = List.of(
                "colours --metal titanium --step 25 --light F11",
                "match --metal niobium --colour #C0A030",
                "grow --metal tantalum --volts 12.5 --seconds 10 --every 2.5",
                "plan designs/wick-key.json",
                "plan designs/wick-pin.json --json",
                "trial designs/wick-key.json",
                "plan none.json",
                "grow --metal titanium --volts 1e4 --seconds 0.01",
                "grow --help");
        Locale.setDefault(Locale.ROOT);
        TimeZone.setDefault(TimeZone.getTimeZone("UTC"));
        List<Ran> plain = lines.stream().map(Ran::line).toList();
        Locale.setDefault(Locale.forLanguageTag(tag));
        TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
        for (int i = 0; i < lines.size(); i++) {
            assertThat(Ran.line(lines.get(i))).isEqualTo(plain.get(i));
        }
    }

    /** Property: sheets are the same bytes in another locale, too. */
    @Test
    void sameSheetsInAnyLocale() throws Exception {
        for (String tag : List.of("und", "ar-EG-u-nu-arab")) {
            Locale.setDefault(Locale.forLanguageTag(tag));
            Ran.of("plan", "designs/wick-key.json", "--out", folder.resolve(tag).toString());
        }
        for (String sheet : List.of("preview.svg", "steps-a4.pdf", "timing.csv", "plan.json")) {
            assertThat(Files.readAllBytes(folder.resolve("und").resolve("wick-key-" + sheet)))
                    .isEqualTo(
                            Files.readAllBytes(folder.resolve("ar-EG-u-nu-arab").resolve("wick-key-" + sheet)));
        }
    }

    private static OutputStream failing(String reason, int after) {
        return new OutputStream() {
            private int count;

            @Override
            public void write(int value) throws IOException {
                if (++count > after) {
                    throw new IOException(reason);
                }
            }
        };
    }

    /** Property: a reader that has seen enough, as head has, ends the program without a word. */
    @Test
    void brokenPipeIsQuiet() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        String[] words = "colours --metal titanium --to 990 --step 0.01".split(" ", -1);
        assertThat(Program.run(words, failing("Broken pipe", 100), err)).isZero();
        assertThat(err.toString(StandardCharsets.UTF_8)).isEmpty();
    }

    /** Property: data that is lost otherwise is not passed over in silence. */
    @Test
    void aFullDiskIsSaid() {
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        String[] words = "colours --metal titanium".split(" ", -1);
        assertThat(Program.run(words, failing("No space left on device", 100), err))
                .isEqualTo(Program.AT_FAULT);
        assertThat(err.toString(StandardCharsets.UTF_8))
                .isEqualTo("tideband: standard output could not be written: No space left on device\n");
    }

    /** Property: a fault of our own is two lines, with its kind and place, and no stack trace. */
    @Test
    void ourOwnFaults() {
        for (Throwable fault :
                List.of(new IllegalStateException("first\nsecond"), new StackOverflowError(), new OutOfMemoryError())) {
            StringWriter talk = new StringWriter();
            CommandLine program = Program.commandLine(new PrintWriter(new StringWriter()), new PrintWriter(talk));
            int code = Answers.trouble(new ExecutionException(program, "while running", fault), program, null);
            assertThat(code).isEqualTo(Program.AT_FAULT);
            assertThat(talk.toString()).startsWith("tideband: ").doesNotContain("\tat ");
            assertThat(talk.toString().lines().count()).isLessThanOrEqualTo(2);
        }
        StringWriter talk = new StringWriter();
        CommandLine program = Program.commandLine(new PrintWriter(new StringWriter()), new PrintWriter(talk));
        Answers.trouble(new IllegalStateException("first\nsecond"), program, null);
        assertThat(talk.toString()).contains("IllegalStateException: first second at StreamsTest.java:");
    }

    /** Property: work that takes long says what it is at, and work that does not says nothing. */
    @Test
    void progressIsPatient() {
        StringWriter talk = new StringWriter();
        try (Progress progress = new Progress(new PrintWriter(talk))) {
            progress.accept("planning");
            progress.accept("pulling");
        }
        assertThat(talk.toString()).isEmpty();
    }
}
