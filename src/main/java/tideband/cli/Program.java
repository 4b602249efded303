package tideband.cli;

import java.io.BufferedWriter;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;

/** One run of the program: the words of a command line in, two streams of bytes and an exit code out. */
final class Program {
    /** All went well. */
    static final int DONE = 0;
    /** The design can't be made, or what was given is at fault. */
    static final int AT_FAULT = 1;
    /** The command was used wrongly. */
    static final int WRONG_USE = 2;

    private Program() {}

    /**
     * Runs a command.
     *
     * @param args the words of the command line
     * @param out where data goes, as UTF-8
     * @param err where talk goes, as UTF-8
     * @return the exit code
     */
    static int run(String[] args, OutputStream out, OutputStream err) {
        WatchedStream watched = new WatchedStream(out);
        PrintWriter data = writer(watched);
        PrintWriter talk = writer(err);
        int code = commandLine(data, talk).execute(args);
        data.flush();
        Optional<IOException> lost = watched.failure();
        if (lost.isPresent() && !watched.readerGone()) {
            talk.println("tideband: standard output could not be written: " + Answers.reason(lost.get()));
            code = code == DONE ? AT_FAULT : code;
        }
        talk.flush();
        return code;
    }

    static CommandLine commandLine(PrintWriter data, PrintWriter talk) {
        return new CommandLine(new TidebandCommand())
                .setOut(data)
                .setErr(talk)
                .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF))
                .setExpandAtFiles(false)
                .setUsageHelpLongOptionsMaxWidth(30)
                .setParameterExceptionHandler(Answers::wrongUse)
                .setExecutionExceptionHandler(Answers::trouble);
    }

    private static PrintWriter writer(OutputStream stream) {
        // The line separator of println is not used for data: see CsvWriter.
        return new PrintWriter(new BufferedWriter(new OutputStreamWriter(stream, StandardCharsets.UTF_8)), false);
    }
}
