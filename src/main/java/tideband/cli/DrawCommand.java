package tideband.cli;

import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tideband.window.DrawingWindow;

/** {@code tideband draw}: opens the drawing window. */
@Command(
        name = "draw",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Opens the drawing window, with a design or to begin one.",
        description = {
            "",
            "Draw bands and fades along the piece and see what they look like, what they cost at the bench and why; print the"
                    + " sheets, or be paced through a pull. Every command of the window and its key is listed there by F1."
                    + " The program ends when the window is closed; what was not saved is offered again after a crash.",
            ""
        })
final class DrawCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(arity = "0..1", paramLabel = "DESIGN", description = "The design to open, a JSON file.")
    private Path design;

    @Override
    public Integer call() {
        return DrawingWindow.open(Optional.ofNullable(design))
                .map(this::refused)
                .orElse(Program.DONE);
    }

    private int refused(String reason) {
        spec.commandLine().getErr().println("tideband: " + reason);
        return Program.AT_FAULT;
    }
}
