package tideband.bench;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.function.BiFunction;
import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import tideband.colour.Ciede2000;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.match.FilmColour;
import tideband.plan.Hindrance;
import tideband.plan.Immersion;
import tideband.plan.KnownBound;
import tideband.plan.Outcome;
import tideband.plan.Plan;
import tideband.plan.Planner;
import tideband.plan.Problem;
import tideband.plan.Stretch;
import tideband.pull.BandVolts;
import tideband.pull.Outfit;
import tideband.pull.Pull;
import tideband.pull.PullOutcome;
import tideband.pull.PullPlanner;
import tideband.pull.Shortfall;
import tideband.pull.Target;
import tideband.trial.Dip;
import tideband.trial.Trial;
import tideband.trial.TrialRun;
import tideband.trial.Wish;

/**
 * Works a design out: films for its bands, the plan, the pulls, the trial, the cautions. Start here.
 *
 * <p>Data flows one way, and each stage sees only what the one before it gave.
 */
public final class BenchPlanner {
    /** Up to so many bands a plan takes a few milliseconds, and every change of a pull can be tried; beyond, the first. */
    private static final int QUICK_BANDS = 12;

    private final Design design;
    private final Colours colours;
    private final KnownBound known;

    /**
     * A planner for one design.
     *
     * @param design the design
     * @param colours its colours; see {@link Colours#of}
     */
    public BenchPlanner(Design design, Colours colours) {
        this(design, colours, new KnownBound());
    }

    /**
     * A planner for one design of many, as while it is being drawn.
     *
     * @param design the design
     * @param colours its colours; see {@link Colours#of}
     * @param known what is kept from one design to the next; it makes the work quicker, never another
     */
    public BenchPlanner(Design design, Colours colours, KnownBound known) {
        this.known = known;
        this.design = design;
        this.colours = colours;
    }

    /**
     * Works a design out with nobody watching.
     *
     * @param design the design
     * @return how it is made, or why it can't be
     */
    public static Work work(Design design) {
        return Colours.obstacle(design)
                .<Work>map(obstacle -> new Work.CannotBeMade(List.of(obstacle)))
                .orElseGet(() -> new BenchPlanner(design, Colours.of(design)).work(stage -> {}, () -> false));
    }

    /**
     * Works the design out.
     *
     * @param progress told in a few words what is being done
     * @param cancelled asked now and then whether to give up; giving up throws {@link
     *     java.util.concurrent.CancellationException}
     * @return how it is made, or why it can't be
     */
    public Work work(Consumer<String> progress, BooleanSupplier cancelled) {
        return work((problem, stop) -> Planner.plan(problem, stop, known), progress, cancelled);
    }

    /**
     * Works the design out for showing while it is being drawn: the same, but for what the other order would save, which
     * takes the longest and can follow.
     *
     * @param cancelled asked now and then whether to give up; giving up throws {@link
     *     java.util.concurrent.CancellationException}
     * @return how it is made, or why it can't be
     */
    public Work workWhileDrawing(BooleanSupplier cancelled) {
        return work((problem, stop) -> Planner.planThisOrderOnly(problem, stop, known), stage -> {}, cancelled);
    }

    private Work work(
            BiFunction<Problem, BooleanSupplier, Outcome> planner,
            Consumer<String> progress,
            BooleanSupplier cancelled) {
        progress.accept("matching films");
        BandFilms films = new BandFilms(design, colours);
        List<DrawnBand> drawn = films.find();
        if (!films.obstacles().isEmpty()) {
            return new Work.CannotBeMade(films.obstacles());
        }
        progress.accept("planning immersions and masks");
        return carryOn(planner.apply(problem(drawn), cancelled), drawn, progress, cancelled);
    }

    private Work carryOn(Outcome outcome, List<DrawnBand> drawn, Consumer<String> progress, BooleanSupplier cancelled) {
        if (outcome instanceof Outcome.Impossible impossible) {
            return new Work.CannotBeMade(
                    impossible.hindrances().stream().map(this::obstacle).toList());
        }
        Plan plan = ((Outcome.Planned) outcome).plan();
        progress.accept("working out the pulls");
        PullOutcome pulled = new PullPlanner(outfit(), targets(drawn), plan.immersions()).plan();
        if (pulled instanceof PullOutcome.OutOfReach outOfReach) {
            return new Work.CannotBeMade(obstacles(outOfReach.shortfalls(), cancelled));
        }
        PullOutcome.Pulled pulls = (PullOutcome.Pulled) pulled;
        progress.accept("trying the plan on paper");
        Trial trial = new TrialRun(
                        design.piece(),
                        wishes(drawn),
                        colours.palette(),
                        colours.viewing().white())
                .carryOut(design.bath(), design.supply().maxAmps(), dips(plan, pulls.pulls()));
        List<BenchBand> bands = bands(drawn, pulls.volts());
        List<Caution> cautions = new ArrayList<>(Cautions.of(design, plan, pulls.pulls()));
        cautions.addAll(Cautions.ofColours(bands));
        return new Work.Worked(new BenchPlan(design, bands, plan, pulls.pulls(), trial, cautions));
    }

    private Obstacle obstacle(Hindrance hindrance) {
        OptionalInt band = hindrance.band();
        return new Obstacle(
                band.isPresent() ? BandFilms.where(design.bands().get(band.getAsInt())) : "the design",
                hindrance.reason(),
                hindrance.remedy(),
                band,
                new Mends(design).held(hindrance.changes()));
    }

    private List<Obstacle> obstacles(List<Shortfall> shortfalls, BooleanSupplier cancelled) {
        ShortfallMend finder = new ShortfallMend(
                design,
                (changed, band) ->
                        new BenchPlanner(changed, colours.fittedTo(design, changed)).standsInTheWay(band, cancelled));
        int mended = design.bands().size() <= QUICK_BANDS ? shortfalls.size() : 1;
        List<Obstacle> obstacles = new ArrayList<>();
        for (Shortfall s : shortfalls) {
            obstacles.add(new Obstacle(
                    BandFilms.where(design.bands().get(s.band())),
                    s.reason(),
                    s.change(),
                    OptionalInt.of(s.band()),
                    obstacles.size() < mended ? finder.of(s) : Optional.empty()));
        }
        return obstacles;
    }

    /** Whether a band still falls short in this design, or the design does not even come to its pulls. */
    private boolean standsInTheWay(int band, BooleanSupplier cancelled) {
        BandFilms films = new BandFilms(design, colours);
        List<DrawnBand> drawn = films.find();
        return !films.obstacles().isEmpty()
                || !(Planner.planThisOrderOnly(problem(drawn), cancelled) instanceof Outcome.Planned planned)
                || (new PullPlanner(outfit(), targets(drawn), planned.plan().immersions()).plan()
                                instanceof PullOutcome.OutOfReach outOfReach
                        && outOfReach.shortfalls().stream().anyMatch(s -> s.band() == band));
    }

    private Problem problem(List<DrawnBand> drawn) {
        List<Stretch> stretches = drawn.stream()
                .map(d -> new Stretch(
                        d.band().toMm() - d.band().fromMm(),
                        d.aSideNm(),
                        d.bSideNm(),
                        d.bare(),
                        d.band().edge() == Edge.CRISP))
                .toList();
        return new Problem(
                stretches,
                design.bands().stream().map(Band::name).toList(),
                design.holding().endsDown(),
                design.holding().dryMm(),
                design.bench(),
                design.order());
    }

    private Outfit outfit() {
        return new Outfit(
                design.piece(),
                design.bath(),
                design.supply(),
                design.vessel(),
                design.pull(),
                (some, other) -> Ciede2000.between(
                        colours.palette().labAt(some), colours.palette().labAt(other)));
    }

    private static List<Target> targets(List<DrawnBand> drawn) {
        return drawn.stream()
                .map(d -> new Target(d.band().fromMm(), d.band().toMm(), d.aSideNm(), d.bSideNm()))
                .toList();
    }

    private List<Wish> wishes(List<DrawnBand> drawn) {
        double nativeNm = design.bath().nativeNm();
        return drawn.stream()
                .map(d -> new Wish(
                        d.band().fromMm(),
                        d.band().toMm(),
                        d.bare() ? nativeNm : d.aSideNm(),
                        d.bare() ? nativeNm : d.bSideNm(),
                        d.wanted()))
                .toList();
    }

    private List<Dip> dips(Plan plan, List<Pull> pulls) {
        List<Dip> dips = new ArrayList<>();
        for (int i = 0; i < pulls.size(); i++) {
            Immersion immersion = plan.immersions().get(i);
            List<Dip.Cover> covers = immersion.masked().stream()
                    .map(band -> design.bands().get(band))
                    .map(band -> new Dip.Cover(band.fromMm(), band.toMm()))
                    .toList();
            dips.add(new Dip(immersion.endDown(), covers, pulls.get(i)));
        }
        return dips;
    }

    private List<BenchBand> bands(List<DrawnBand> drawn, List<BandVolts> volts) {
        List<BenchBand> bands = new ArrayList<>();
        // A fade and the levels beside it share films, and a film's colour is costly.
        Map<Double, FilmColour> known = new HashMap<>();
        for (int i = 0; i < drawn.size(); i++) {
            DrawnBand d = drawn.get(i);
            FilmColour aSide = known.computeIfAbsent(d.aSideNm(), colours::ofFilm);
            FilmColour bSide = known.computeIfAbsent(d.bSideNm(), colours::ofFilm);
            bands.add(new BenchBand(
                    d.band().name(),
                    d.band().fromMm(),
                    d.band().toMm(),
                    aSide,
                    bSide,
                    d.bare(),
                    d.band().edge() == Edge.CRISP,
                    volts.get(i).aSideVolts(),
                    volts.get(i).bSideVolts(),
                    wantedHex(d, aSide),
                    d.difference()));
        }
        return bands;
    }

    private String wantedHex(DrawnBand d, FilmColour film) {
        return d.wanted().map(colours::hexOf).orElse(film.srgbHex());
    }
}
