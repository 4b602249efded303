package tideband.sheet;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Cautions;
import tideband.bench.Colours;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.design.Band;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.Holding;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Wanted;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;
import tideband.plan.Cost;
import tideband.plan.Immersion;
import tideband.plan.Plan;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.trial.Trial;
import tideband.trial.TrialBand;
import tideband.trial.TrialCell;

/** Plans made by hand, for laying out sheets: right in form, though no planner made them. */
final class BenchPlans {
    private static final double NM_PER_VOLT = 1.8;

    static final Colours COLOURS = new Colours(
            new Palette(FilmSystem.of("titanium", 1), Finish.POLISHED, Viewing.daylight(), 0, 300),
            new VoltScale(120, volts -> 3 + NM_PER_VOLT * volts, filmNm -> Math.max(0, (filmNm - 3) / NM_PER_VOLT)),
            Viewing.daylight());

    private BenchPlans() {}

    /** A lantern hook: a tip, a fade and a collar on a tapered titanium rod. */
    static BenchPlan lanternHook() {
        return lanternHook("Lantern hook", "phosphate");
    }

    static BenchPlan lanternHook(String title, String bathName) {
        Piece rod = new Piece(new Section.Round(), List.of(new Station(0, 3), new Station(160, 8)));
        List<BenchBand> bands = List.of(
                band("tip", 0, 42, 150, 150, false),
                band("dusk", 42, 110, 150, 46, false),
                band("collar", 110, 160, 46, 46, false));
        Immersion first = new Immersion(
                End.A,
                List.of(),
                List.of(),
                List.of(),
                List.of(0, 1),
                150,
                List.of(
                        "End A is down because the film falls from A to B.",
                        "No mask is needed: every edge is soft and a waterline will do.",
                        "It comes first because 150 nm is the thickest film of the piece."));
        Immersion second = new Immersion(
                End.B,
                List.of(new Run(0, 1)),
                List.of(),
                List.of(0, 1),
                List.of(2),
                46,
                List.of(
                        "End B is down because band 3 collar reaches under the holder when end A is down.",
                        "Bands 1 and 2 are masked so that their holder stays clean; they would keep their colour."));
        Plan plan = new Plan(
                List.of(first, second),
                List.of(new Run(0, 1)),
                new Cost(2, 0, 1, 1, 1, 110, 16.5),
                16.5,
                true,
                OptionalDouble.of(2.5));
        return plan(
                title,
                rod,
                bands,
                bathName,
                plan,
                List.of(fadePull(110, 42, 46, 150, 12), hold(50, 46)),
                Optional.of(Vessel.round(50)));
    }

    /** A tube in two tones with crisp edges and a bare middle. */
    static BenchPlan twoTone() {
        Piece tube = new Piece(new Section.Tube(9), List.of(new Station(0, 12), new Station(90, 12)));
        List<BenchBand> bands = List.of(
                band("lower", 0, 40, 92, 92, true), bare("ring", 40, 50, true), band("upper", 50, 90, 46, 46, true));
        Immersion first = new Immersion(
                End.A,
                List.of(new Run(1, 2)),
                List.of(),
                List.of(1, 2),
                List.of(0),
                92,
                List.of("Bands 2 and 3 are masked because the edge at 40 mm is crisp."));
        Immersion second = new Immersion(
                End.A,
                List.of(new Run(0, 0)),
                List.of(new Run(2, 2)),
                List.of(0, 1),
                List.of(2),
                46,
                List.of("Band 2 stays masked because it is to be bare metal."));
        Plan plan = new Plan(
                List.of(first, second),
                List.of(new Run(0, 1)),
                new Cost(2, 1, 1, 2, 0, 90, 19),
                17,
                false,
                OptionalDouble.empty());
        return plan(
                "Two-tone socket",
                tube,
                bands,
                "sulfuric",
                plan,
                List.of(hold(88, 92), hold(88, 46)),
                Optional.empty());
    }

    /** A long flat name plate, longer than a page. */
    static BenchPlan flatPlate() {
        Piece flat = new Piece(new Section.Flat(1.5), List.of(new Station(0, 40), new Station(420, 25)));
        List<BenchBand> bands = List.of(
                band("night", 0, 200, 180, 180, false),
                band("dawn", 200, 330, 112, 112, false),
                bare("grip under the clamp", 330, 420, false));
        Immersion only = new Immersion(
                End.A, List.of(), List.of(), List.of(), List.of(0, 1), 180, List.of("One stair makes both bands."));
        Plan plan = new Plan(List.of(only), List.of(), new Cost(1, 0, 0, 0, 0, 0, 4), 4, true, OptionalDouble.empty());
        List<Row> rows = new ArrayList<>();
        add(rows, 0, 0, 330, 3, Row.Act.LOWERED, 330);
        add(rows, 5, 0, 330, 3, Row.Act.RAISE, 330);
        add(rows, 5, volts(112), 330, 100, Row.Act.HOLD, 330);
        add(rows, 35, volts(112), 330, 112, Row.Act.WITHDRAW, 330);
        add(rows, 50, volts(112), 200, 112, Row.Act.RAISE, 330);
        add(rows, 54, volts(180), 200, 170, Row.Act.HOLD, 330);
        add(rows, 84, volts(180), 200, 180, Row.Act.LIFT_OUT, 330);
        return plan(
                "Name plate",
                flat,
                bands,
                "carbonate",
                plan,
                List.of(new Pull(rows, 1.5, 1.42, List.of())),
                Optional.empty());
    }

    /** Twelve bands, five immersions, with masks, turns and a fade of forty rows. */
    static BenchPlan twelveBands() {
        Piece rod = new Piece(
                new Section.Round(),
                List.of(new Station(0, 6), new Station(60, 10), new Station(120, 10), new Station(240, 5)));
        double[] films = {180, 160, 145, 112, 92, 75, 60, 75, 92, 112, 145, 160};
        List<BenchBand> bands = new ArrayList<>();
        for (int i = 0; i < films.length; i++) {
            double from = i * 20;
            bands.add(
                    i == 4
                            ? band("fade of the long winter evening over the harbour", from, from + 20, 112, 60, false)
                            : band("band " + (char) ('a' + i), from, from + 20, films[i], films[i], i % 3 == 0));
        }
        List<Immersion> immersions = List.of(
                new Immersion(
                        End.A,
                        List.of(new Run(5, 7), new Run(9, 9), new Run(11, 11)),
                        List.of(),
                        List.of(5, 6, 7, 9, 11),
                        List.of(0, 1, 2),
                        180,
                        List.of("Bands 6 to 8 are masked because the edge at 100 mm is crisp.")),
                new Immersion(
                        End.B,
                        List.of(new Run(0, 2)),
                        List.of(new Run(11, 11)),
                        List.of(0, 1, 2, 5, 6, 7, 9),
                        List.of(11, 10),
                        160,
                        List.of("End B is down for the thick films at B.")),
                new Immersion(
                        End.A,
                        List.of(new Run(11, 11)),
                        List.of(new Run(0, 2), new Run(9, 9)),
                        List.of(5, 6, 7, 11),
                        List.of(3, 4),
                        112,
                        List.of("The fade falls from A to B, so end A is down.")),
                new Immersion(
                        End.B,
                        List.of(),
                        List.of(new Run(5, 7)),
                        List.of(11),
                        List.of(7, 8, 9),
                        112,
                        List.of("Films fall from B towards the middle.")),
                new Immersion(
                        End.A,
                        List.of(),
                        List.of(new Run(11, 11)),
                        List.of(),
                        List.of(5, 6),
                        75,
                        List.of("The thinnest films come last, with nothing masked.")));
        Plan plan =
                new Plan(immersions, List.of(), new Cost(5, 3, 2, 6, 4, 240, 53), 49.5, false, OptionalDouble.of(6.5));
        List<Pull> pulls =
                List.of(hold(118, 180), hold(70, 160), fadePull(96, 82, 60, 112, 40), hold(100, 112), hold(138, 75));
        return plan(
                "Lantern pole with a title that goes on for rather longer than a line of a page can hold, by far",
                rod,
                bands,
                "bicarbonate",
                plan,
                pulls,
                Optional.empty());
    }

    /** Sixty bands of 4 mm each, one stair. */
    static BenchPlan sixtyBands() {
        Piece rod = new Piece(new Section.Round(), List.of(new Station(0, 8), new Station(250, 8)));
        List<BenchBand> bands = new ArrayList<>();
        List<Integer> all = new ArrayList<>();
        for (int i = 0; i < 60; i++) {
            double film = 190 - 2.5 * i;
            bands.add(band("stripe number " + (i + 1), i * 4, i == 59 ? 250 : i * 4 + 4, film, film, false));
            all.add(i);
        }
        Immersion only =
                new Immersion(End.A, List.of(), List.of(), List.of(), all, 190, List.of("One stair makes all bands."));
        Plan plan = new Plan(List.of(only), List.of(), new Cost(1, 0, 0, 0, 0, 0, 4), 4, true, OptionalDouble.empty());
        return plan(
                "Sixty stripes",
                rod,
                bands,
                "phosphate",
                plan,
                List.of(fadePull(238, 4, 42, 190, 60)),
                Optional.empty());
    }

    /** A piece that is to stay as it is. */
    static BenchPlan allBare() {
        Piece rod = new Piece(new Section.Round(), List.of(new Station(0, 4), new Station(50, 4)));
        Plan plan = new Plan(List.of(), List.of(), new Cost(0, 0, 0, 0, 0, 0, 0), 0, true, OptionalDouble.empty());
        return plan("Plain peg", rod, List.of(bare("all", 0, 50, false)), "borax", plan, List.of(), Optional.empty());
    }

    static List<BenchPlan> all() {
        return List.of(lanternHook(), twoTone(), flatPlate(), twelveBands(), sixtyBands(), allBare());
    }

    private static BenchPlan plan(
            String title,
            Piece piece,
            List<BenchBand> bands,
            String bathName,
            Plan plan,
            List<Pull> pulls,
            Optional<Vessel> vessel) {
        Bath bath = new Bath(
                bathName,
                Metal.TITANIUM,
                NM_PER_VOLT,
                27.7,
                3,
                0.9,
                2,
                100,
                1,
                "common practice, weak bath; see the notes on baths");
        List<Band> drawn = bands.stream()
                .map(b -> new Band(
                        b.name(),
                        b.fromMm(),
                        b.toMm(),
                        b.bare()
                                ? new Wanted.Bare()
                                : new Wanted.Film(b.aSide().filmNm(), b.bSide().filmNm()),
                        b.crispAtB() ? Edge.CRISP : Edge.SOFT))
                .toList();
        Design design = new Design(
                title,
                Metal.TITANIUM,
                Finish.POLISHED,
                Illuminant.D65,
                Observer.CIE_1931_2_DEGREE,
                piece,
                new Holding(EnumSet.allOf(End.class), 10),
                drawn,
                bath,
                new Supply(120, 2, 0.1, Double.POSITIVE_INFINITY),
                vessel,
                BenchTimes.USUAL,
                Order.THICKER_FIRST,
                PullSettings.USUAL);
        return new BenchPlan(design, bands, plan, pulls, trial(bands), Cautions.of(design, plan, pulls));
    }

    private static Trial trial(List<BenchBand> bands) {
        List<TrialCell> cells = new ArrayList<>();
        List<TrialBand> results = new ArrayList<>();
        for (BenchBand band : bands) {
            int count = (int) Math.max(1, Math.rint((band.toMm() - band.fromMm()) * 2));
            double each = (band.toMm() - band.fromMm()) / count;
            for (int i = 0; i < count; i++) {
                double share = (i + 0.5) / count;
                double film = (band.aSide().filmNm()
                                + share * (band.bSide().filmNm() - band.aSide().filmNm()))
                        * 1.01;
                double from = band.fromMm() + i * each;
                double to = i + 1 == count ? band.toMm() : from + each;
                cells.add(new TrialCell(from, to, film, COLOURS.ofFilm(film).lab()));
            }
            results.add(new TrialBand(band.aSide().filmNm() * 1.01, band.bSide().filmNm() * 1.01, 0.6, 1.4));
        }
        return new Trial(cells, results);
    }

    private static BenchBand band(String name, double from, double to, double aNm, double bNm, boolean crisp) {
        return new BenchBand(
                name,
                from,
                to,
                COLOURS.ofFilm(aNm),
                COLOURS.ofFilm(bNm),
                false,
                crisp,
                volts(aNm),
                volts(bNm),
                COLOURS.ofFilm(aNm).srgbHex(),
                0);
    }

    private static BenchBand bare(String name, double from, double to, boolean crisp) {
        return new BenchBand(
                name,
                from,
                to,
                COLOURS.ofFilm(0),
                COLOURS.ofFilm(0),
                true,
                crisp,
                0,
                0,
                COLOURS.ofFilm(0).srgbHex(),
                0);
    }

    private static double volts(double filmNm) {
        return Math.rint(filmNm / NM_PER_VOLT * 10) / 10;
    }

    private static Pull hold(double lineMm, double filmNm) {
        List<Row> rows = new ArrayList<>();
        add(rows, 0, 0, lineMm, 3, Row.Act.LOWERED, lineMm);
        add(rows, 5, 0, lineMm, 3, Row.Act.RAISE, lineMm);
        add(rows, 5 + volts(filmNm) / 10, volts(filmNm), lineMm, filmNm * 0.9, Row.Act.HOLD, lineMm);
        add(rows, 35, volts(filmNm), lineMm, filmNm, Row.Act.LIFT_OUT, lineMm);
        return new Pull(rows, 0.8, 0.62, List.of());
    }

    private static Pull fadePull(double deepMm, double shallowMm, double thinNm, double thickNm, int steps) {
        List<Row> rows = new ArrayList<>();
        add(rows, 0, 0, deepMm, 3, Row.Act.LOWERED, deepMm);
        add(rows, 5, 0, deepMm, 3, Row.Act.RAISE, deepMm);
        add(rows, 8, volts(thinNm), deepMm, thinNm * 0.9, Row.Act.HOLD, deepMm);
        for (int i = 0; i <= steps; i++) {
            double share = (double) i / steps;
            double film = thinNm + share * (thickNm - thinNm);
            double line = deepMm + share * (shallowMm - deepMm);
            add(rows, 38 + 100 * share, volts(film), line, film, i == steps ? Row.Act.HOLD : Row.Act.FADE, deepMm);
        }
        add(rows, 168, volts(thickNm), shallowMm, thickNm, Row.Act.LIFT_OUT, deepMm);
        return new Pull(rows, 0.8, 0.74, List.of("The fade is drawn at 0.7 mm/s, within what a steady hand can do."));
    }

    private static void add(
            List<Row> rows, double timeS, double volts, double lineMm, double filmNm, Row.Act act, double deepestMm) {
        double depth = lineMm - 2.1;
        double travel = (deepestMm - 2.1 - depth) * 0.98;
        rows.add(new Row(timeS, volts, lineMm, depth, travel, filmNm, act));
    }
}
