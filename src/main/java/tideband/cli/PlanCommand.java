package tideband.cli;

import java.io.IOException;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tideband.sheet.Exports;
import tideband.sheet.PlanJson;
import tideband.sheet.PlanText;

/** Plans a design. */
@Command(
        name = "plan",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Plans a design: films, volts, masks, immersions and pulls.",
        description = {
            "",
            "The plan gives a film and volts for every band, the fewest masks and immersions, the depth, volts and seconds of"
                    + " every pull, and what the piece will look like. It is printed to read.",
            "",
            "Without --out nothing is written to disk. With it all sheets are written too: preview (SVG), step sheet (PDF, A4"
                    + " and Letter), timing table (CSV) and the plan itself (JSON); files of those names are replaced, all"
                    + " of them or none.",
            ""
        },
        footer = {
            "",
            "A design is a JSON file; designs/lantern-hook.json is one to begin with. The lantern maker reads the plan of the"
                    + " hook, then prints its sheets:",
            "  tideband plan designs/lantern-hook.json",
            "  tideband plan designs/lantern-hook.json --out sheets",
            "and takes the minutes of another piece over into a ledger:",
            "  tideband plan designs/wick-key.json --json > wick-key-plan.json",
            "",
            "Exit codes: 0 done, 1 the design can't be made (with the nearest change that would work), its file is at fault"
                    + " (every fault with its place) or a sheet could not be written, 2 wrong use."
        })
final class PlanCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "DESIGN", description = "The design, a JSON file.")
    private Path design;

    @Option(names = "--out", paramLabel = "DIR", description = "Write all sheets into this folder; made if missing.")
    private Path folder;

    @Option(names = "--png", description = "With --out: also draw the preview as PNG. Needs a Java with fonts.")
    private boolean png;

    @Option(names = "--json", description = "Print the plan as JSON, for other programs, and not to read.")
    private boolean json;

    @Override
    public Integer call() throws Refusal {
        new Limits()
                .holds(!png || folder != null, "--png is a sheet like others: say with --out where to write it")
                .enforce(spec);
        PrintWriter out = spec.commandLine().getOut();
        PrintWriter talk = spec.commandLine().getErr();
        WorkedDesign worked = WorkedDesign.of(design, talk);
        if (folder != null) {
            for (Path file : write(worked)) {
                talk.print("wrote " + file + "\n");
            }
        }
        out.print(
                json ? new String(PlanJson.bytes(worked.plan()), StandardCharsets.UTF_8) : PlanText.of(worked.plan()));
        return Program.DONE;
    }

    private List<Path> write(WorkedDesign worked) throws Refusal {
        try {
            return Exports.write(worked.plan(), worked.colours(), folder, sheetName(), png);
        } catch (IOException e) {
            throw new Refusal("nothing was written into " + folder + ": " + Answers.reason(e), List.of());
        }
    }

    /** What the names of the sheets begin with: the design's file name without its ending, tame on every file system. */
    private String sheetName() {
        String file = design.getFileName().toString();
        String base = file.endsWith(".json") ? file.substring(0, file.length() - ".json".length()) : file;
        String tame = base.replaceAll("[\\p{Cntrl}/\\\\:*?\"<>|]", "-").strip();
        return tame.isEmpty() ? "design" : tame;
    }
}
