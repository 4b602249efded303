package tideband.cli;

import java.util.List;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;
import tideband.match.ColourMatch;
import tideband.match.Match;
import tideband.match.Matches;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.optics.FilmSystem;
import tideband.oxide.Bath;
import tideband.oxide.Coupon;
import tideband.oxide.Supply;
import tideband.sheet.Figures;

/** The films that come near a colour, and their volts. */
@Command(
        name = "match",
        sortOptions = false,
        usageHelpWidth = 96,
        header = "Finds every film that comes near a colour, and its volts, best first.",
        description = {
            "",
            "Columns of the CSV, a row for each film nearer than the films beside it:",
            "  film_nm,order,name,volts,dE00,volts_low,volts_high,L,a,b,srgb",
            "",
            "Films go from 0 to what the bath's ceiling gives. volts are those of a small coupon (1 cm2, a supply of 2 A) at the"
                    + " end of its hold; dE00 is the CIEDE2000 difference from the colour. From volts_low to volts_high the"
                    + " colour stays within --within of the one asked for or, where the film does not come so near, of the"
                    + " film's own. A colour no film reaches is answered with the nearest, and a remark says how far off.",
            ""
        },
        footer = {
            "",
            "The lantern maker wants the collar in dusk blue, on satin niobium:",
            "  tideband match --metal niobium --finish satin --colour '#3a3f8f'",
            "  tideband match --metal titanium --bath bicarbonate --colour lab:45,10,-38 --within 3",
            "",
            "Exit codes: 0 done (also where no film comes near), 1 the bath file is at fault, 2 wrong use."
        })
final class MatchCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Mixin
    private LookOptions look;

    @Option(
            names = "--colour",
            required = true,
            converter = WantedColour.Reader.class,
            paramLabel = "COLOUR",
            description = "'#rrggbb' (in quotes, as a shell takes # for the start of a remark) or lab:L,a,b against the"
                    + " light's own white.")
    private WantedColour colour;

    @Mixin
    private BathOption bathOption;

    @Option(
            names = "--within",
            converter = Decimal.class,
            defaultValue = "5",
            paramLabel = "DE00",
            description = "How near is near enough, above 0 to 100. Default: ${DEFAULT-VALUE}.")
    private double within;

    @Option(
            names = "--hold",
            converter = Decimal.class,
            defaultValue = "30",
            paramLabel = "S",
            description = "How long the coupon is held, 0.1 to 100000 s. Default: ${DEFAULT-VALUE}.")
    private double holdS;

    @Override
    public Integer call() throws Refusal {
        Limits limits =
                new Limits().within("--within", within, 1e-6, 100, "dE00").within("--hold", holdS, 0.1, 1e5, "s");
        look.check(limits);
        limits.enforce(spec);
        Bath bath = bathOption.of(look.metal(), spec);
        Coupon coupon = new Coupon(bath, Supply.USUAL.maxAmps(), holdS, Coupon.USUAL_CM2);
        VoltScale scale = new VoltScale(bath.ceilingVolts(), coupon::filmNm, coupon::volts);
        if (scale.ceilingNm() > Palette.MOST_NM) {
            throw new Refusal(
                    "bath " + bath.name() + " gives " + Figures.plain(scale.ceilingNm(), 0) + " nm at its ceiling of "
                            + Figures.plain(bath.ceilingVolts(), 2) + " V, but colours are known up to "
                            + Figures.plain(Palette.MOST_NM, 0) + " nm; lower the ceiling in its file",
                    List.of());
        }
        FilmSystem system = FilmSystem.of(look.metal().opticsKey(), bath.indexScale());
        Matches matches = new ColourMatch(look.palette(system, scale.ceilingNm()), scale)
                .find(colour.labIn().apply(look.viewing()), within);
        CsvWriter csv = new CsvWriter(spec.commandLine().getOut());
        csv.comment("films near " + colour.text() + " on " + look.words());
        look.tell(csv, system);
        BathOption.tell(csv, bath);
        csv.comment("volts of a coupon of " + Figures.plain(Coupon.USUAL_CM2, 2) + " cm2 held "
                + Figures.plain(holdS, 3) + " s, a starting point until a coupon has been run");
        csv.comment(nearness(matches));
        csv.row("film_nm", "order", "name", "volts", "dE00", "volts_low", "volts_high", "L", "a", "b", "srgb");
        matches.bestFirst().forEach(match -> write(csv, match));
        return Program.DONE;
    }

    private static String nearness(Matches matches) {
        long near = matches.bestFirst().stream()
                .filter(match -> match.difference() <= matches.within())
                .count();
        String limit = Figures.plain(matches.within(), 6) + " dE00";
        if (near > 0) {
            return near + " of " + matches.bestFirst().size() + " come within " + limit;
        }
        Match best = matches.best();
        return "no film comes within " + limit + ": the nearest, "
                + best.colour().name().text() + " of order " + best.order() + " at " + Figures.fixed(best.filmNm(), 2)
                + " nm, is " + Figures.fixed(best.difference(), 2) + " off";
    }

    private static void write(CsvWriter csv, Match match) {
        csv.row(
                Figures.fixed(match.filmNm(), 2),
                Integer.toString(match.order()),
                match.colour().name().text(),
                Figures.fixed(match.volts(), 3),
                Figures.fixed(match.difference(), 4),
                Figures.fixed(match.windowLowVolts(), 3),
                Figures.fixed(match.windowHighVolts(), 3),
                Figures.fixed(match.colour().lab().lightness(), 4),
                Figures.fixed(match.colour().lab().a(), 4),
                Figures.fixed(match.colour().lab().b(), 4),
                match.colour().srgbHex());
    }
}
