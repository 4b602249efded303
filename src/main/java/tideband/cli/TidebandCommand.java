package tideband.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.ScopeType;

/** The program itself; all is done by its commands. */
@Command(
        name = "tideband",
        versionProvider = Version.class,
        sortOptions = false,
        usageHelpWidth = 96,
        synopsisSubcommandLabel = "COMMAND",
        header = "Plans multi-colour anodizing of titanium, niobium and tantalum.",
        description = {
            "",
            "You draw colour bands and fades along a part. Tideband answers with an oxide film and a voltage for every band,"
                    + " the fewest masks and baths that make it, the depth, volts and seconds of every dip and pull, and"
                    + " sheets to work from.",
            ""
        },
        subcommands = {
            DrawCommand.class,
            PlanCommand.class,
            ColoursCommand.class,
            MatchCommand.class,
            GrowCommand.class,
            TrialCommand.class
        },
        commandListHeading = "%nCommands:%n",
        exitCodeListHeading = "%nExit codes:%n",
        exitCodeList = {
            "0:done",
            "1:the design can't be made, a file is at fault, or something could not be read or written",
            "2:wrong use of the command"
        },
        footer = {
            "",
            "A lantern maker's morning, with the designs that come with the program:",
            "  tideband draw designs/lantern-hook.json                 draw it, and see what becomes of it",
            "  tideband colours --metal titanium --to 160              what films show",
            "  tideband match --metal titanium --colour '#3a3f8f'      films near a colour, and their volts",
            "  tideband plan designs/lantern-hook.json                 the plan, to read",
            "  tideband plan designs/lantern-hook.json --out sheets    and all sheets, to work from",
            "",
            "Films are in nm, lengths in mm, volts in V, currents in mA/cm2 and A, times in s. Numbers have a point before"
                    + " their decimals. Data goes to standard output, talk to standard error. CSV is UTF-8; lines that"
                    + " open with # say where its numbers come from.",
            "Volts of a bath that no coupon has been run in are a starting point, not a promise. Local codes and licensed"
                    + " practice go before anything printed here.",
            "'tideband COMMAND --help' tells more of each command."
        })
final class TidebandCommand {
    @Option(
            names = {"-h", "--help"},
            usageHelp = true,
            scope = ScopeType.INHERIT,
            description = "Explain the command and end.")
    boolean helpAsked;

    @Option(
            names = {"-V", "--version"},
            versionHelp = true,
            description = "Tell the version and end.")
    boolean versionAsked;
}
