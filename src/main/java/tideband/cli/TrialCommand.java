package tideband.cli;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;
import tideband.bench.BenchBand;
import tideband.match.FilmColour;
import tideband.sheet.Csv;
import tideband.sheet.Figures;
import tideband.trial.TrialBand;

/** What each band of a plan will look like when it is carried out. */
@Command(
        name = "trial",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Carries a plan out on paper and tells what each band will look like.",
        description = {
            "",
            "Columns of the CSV:",
            "  " + TrialCommand.HEADER,
            "",
            "The design is planned first. Growth is worked out cell by cell along the piece, all that is wet sharing the supply's current. film is the median"
                    + " over the band's cells or, for a fade, either end of the straight line through them; dE00 is the CIEDE2000"
                    + " difference from the drawing, the median and the worst of the cells, waterline blur left out.",
            "The plan is carried out as written: errors of the bench (a slow hand, a bath a little off) are not simulated yet.",
            ""
        },
        footer = {
            "",
            "The lantern maker looks whether the fade of the hook comes out as drawn:",
            "  tideband trial designs/lantern-hook.json",
            "",
            "Exit codes: 0 done, 1 the design can't be made or its file is at fault, 2 wrong use."
        })
final class TrialCommand implements Callable<Integer> {
    static final String HEADER = "band,from_mm,to_mm,film_a_nm,film_b_nm,order_a,order_b,name_a,name_b,srgb_a,srgb_b,"
            + "dE00_median,dE00_worst";

    @Spec
    private CommandSpec spec;

    @Parameters(paramLabel = "DESIGN", description = "The design, a JSON file.")
    private Path design;

    @Override
    public Integer call() throws Refusal {
        WorkedDesign worked = WorkedDesign.of(design, spec.commandLine().getErr());
        CsvWriter csv = new CsvWriter(spec.commandLine().getOut());
        csv.comment("the plan carried out as written; errors of the bench are not simulated");
        csv.row(HEADER);
        for (int i = 0; i < worked.plan().bands().size(); i++) {
            write(
                    csv,
                    worked,
                    worked.plan().bands().get(i),
                    worked.plan().trial().bands().get(i));
        }
        return Program.DONE;
    }

    private static void write(CsvWriter csv, WorkedDesign worked, BenchBand band, TrialBand trial) {
        FilmColour aSide = colour(worked, trial.aSideNm());
        FilmColour bSide = colour(worked, trial.bSideNm());
        csv.row(
                Csv.text(band.name()),
                Figures.fixed(band.fromMm(), 2),
                Figures.fixed(band.toMm(), 2),
                Figures.fixed(trial.aSideNm(), 2),
                Figures.fixed(trial.bSideNm(), 2),
                Integer.toString(aSide.order()),
                Integer.toString(bSide.order()),
                aSide.name().text(),
                bSide.name().text(),
                aSide.srgbHex(),
                bSide.srgbHex(),
                Figures.fixed(trial.de00Median(), 3),
                Figures.fixed(trial.de00Worst(), 3));
    }

    /** The line fitted through a fade may end a little outside the films there are. */
    private static FilmColour colour(WorkedDesign worked, double filmNm) {
        double mostNm = worked.colours().palette().maxNm();
        return worked.colours().ofFilm(Math.min(mostNm, Math.max(0, filmNm)));
    }
}
