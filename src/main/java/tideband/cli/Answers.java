package tideband.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import java.nio.file.NotDirectoryException;
import java.util.Arrays;
import picocli.CommandLine;
import picocli.CommandLine.ExecutionException;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** Turns what went wrong into words on standard error and an exit code. No stack trace reaches the user. */
final class Answers {
    private Answers() {}

    /** Wrong use of a command: exit code 2. */
    static int wrongUse(ParameterException trouble, String[] args) {
        CommandLine command = trouble.getCommandLine();
        String name = command.getCommandSpec().qualifiedName();
        PrintWriter talk = command.getErr();
        say(talk, name + ": " + trouble.getMessage());
        UnmatchedArgumentException.printSuggestions(trouble, talk);
        say(talk, "Try '" + name + " --help'.");
        return Program.WRONG_USE;
    }

    /** Trouble while a command ran: exit code 1. */
    static int trouble(Exception trouble, CommandLine command, ParseResult parsed) {
        Throwable cause =
                trouble instanceof ExecutionException && trouble.getCause() != null ? trouble.getCause() : trouble;
        PrintWriter talk = command.getErr();
        String name = command.getCommandSpec().qualifiedName();
        if (cause instanceof Refusal refusal) {
            say(talk, name + ": " + refusal.getMessage());
            refusal.points().forEach(point -> say(talk, "  " + point));
        } else if (cause instanceof IOException e) {
            say(talk, name + ": " + reason(e));
        } else if (cause instanceof OutOfMemoryError) {
            say(talk, name + ": there is not enough memory; give Java more with -Xmx, or ask for fewer rows");
        } else {
            say(talk, name + ": a fault of the program, not of what you gave it: " + described(cause));
            say(talk, "Please report it with this line, the command and the design.");
        }
        return Program.AT_FAULT;
    }

    private static void say(PrintWriter talk, String line) {
        talk.print(line);
        talk.print('\n');
    }

    /** A fault of ours in one line: its kind, its message and the place in our code it came from. */
    private static String described(Throwable fault) {
        String place = Arrays.stream(fault.getStackTrace())
                .filter(frame -> frame.getClassName().startsWith("tideband."))
                .findFirst()
                .map(frame -> " at " + frame.getFileName() + ":" + frame.getLineNumber())
                .orElse("");
        String message =
                fault.getMessage() == null ? "" : ": " + fault.getMessage().replaceAll("\\R", " ");
        return fault.getClass().getSimpleName() + message + place;
    }

    /** Why a file cannot be read or written, without its name; the JDK's own message is often the bare path. */
    static String reason(IOException e) {
        if (e instanceof FileSystemException file) {
            return reason(file);
        }
        return String.valueOf(e.getMessage());
    }

    private static String reason(FileSystemException e) {
        if (e instanceof AccessDeniedException) {
            return "access is denied";
        }
        if (e instanceof NoSuchFileException) {
            return "there is no such file or folder";
        }
        if (e instanceof FileAlreadyExistsException || e instanceof NotDirectoryException) {
            return "something that is no folder is in the way";
        }
        return e.getReason() == null ? e.getClass().getSimpleName() : e.getReason();
    }
}
