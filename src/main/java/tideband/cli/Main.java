package tideband.cli;

import java.io.FileDescriptor;
import java.io.FileOutputStream;

/** Entry point of the program. */
public final class Main {
    private Main() {}

    /**
     * Starts the program, and ends the Java virtual machine with the exit code.
     *
     * @param args the words of the command line
     */
    public static void main(String[] args) {
        System.exit(
                Program.run(args, new FileOutputStream(FileDescriptor.out), new FileOutputStream(FileDescriptor.err)));
    }
}
