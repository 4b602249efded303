package tideband.plan;

import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import tideband.design.Order;

/** Finds the cheapest plan for a drawing. Start here. */
public final class Planner {

    /** Up to so many bands a plan is always proven the least. */
    private static final int EXACT_BANDS = 12;

    /** Masks of finished sets looked at beyond that: about a second. */
    private static final long MOST_WORK = 1 << 26;

    /** Bands of a sub-drawing whose promise steers the search in drawings of more than {@link #EXACT_BANDS}. */
    private static final int STEERING_BANDS = 7;

    /** By so many bands those of smaller drawings are smaller: what is saved by a better bound must pay for it. */
    private static final int UNSTEERED_BANDS = 5;

    /** Limits of the exact search rise by one part in so many of the price of the plan known. */
    private static final int LIMIT_STEPS = 16;

    /** Beginnings that go on in the search for a good plan: before an exact search, and in place of one. */
    private static final int FEW_BEGINNINGS = 2;

    private static final int MANY_BEGINNINGS = 40;

    /** Changes tried to each plan found. */
    private static final int POLISH_TRIES = 60_000;

    /** Bands of a row, and of a selection, in the bound for drawings too large for the exact search. */
    private static final int ROW_BANDS = 10;

    private static final int SELECTED_BANDS = 9;

    private final Problem problem;
    private final boolean bothOrders;
    private final Needs needs;
    private final Tariff tariff;
    private final long[] lengthSteps;
    private final BooleanSupplier cancelled;
    private final KnownBound known;

    private Planner(Problem problem, boolean bothOrders, BooleanSupplier cancelled, KnownBound known) {
        this.problem = problem;
        this.bothOrders = bothOrders;
        this.needs = new Needs(problem);
        this.tariff = Tariff.of(problem.times(), needs.bands());
        this.lengthSteps = problem.stretches().stream()
                .mapToLong(s -> Math.round(s.lengthMm() / Draft.LENGTH_STEP_MM))
                .toArray();
        this.cancelled = cancelled;
        this.known = known;
    }

    /**
     * Plans.
     *
     * @param problem the drawing and how it is held
     * @return the plan, or why there is none
     */
    public static Outcome plan(Problem problem) {
        return plan(problem, () -> false);
    }

    /**
     * Plans, and can be stopped.
     *
     * @param problem the drawing and how it is held
     * @param cancelled asked now and then, every few milliseconds; planning stops when it says true
     * @return the plan, or why there is none
     * @throws CancellationException if it was stopped
     */
    public static Outcome plan(Problem problem, BooleanSupplier cancelled) {
        return plan(problem, cancelled, new KnownBound());
    }

    /**
     * Plans, can be stopped, and goes on from what is known from the problem before.
     *
     * @param problem the drawing and how it is held
     * @param cancelled asked now and then, every few milliseconds; planning stops when it says true
     * @param known the bound last found; it makes the answer quicker, never another
     * @return the plan, or why there is none
     * @throws CancellationException if it was stopped
     */
    public static Outcome plan(Problem problem, BooleanSupplier cancelled, KnownBound known) {
        return plan(problem, true, cancelled, known);
    }

    /**
     * Plans under the problem's own order, without working out what the other would save: about twice as quick, for
     * showing a plan while the drawing changes.
     *
     * @param problem the drawing and how it is held
     * @param cancelled asked now and then, every few milliseconds; planning stops when it says true
     * @return the same plan as {@link #plan(Problem)} but for {@link Plan#savedByOtherOrderMin}, or why there is none
     * @throws CancellationException if it was stopped
     */
    public static Outcome planThisOrderOnly(Problem problem, BooleanSupplier cancelled) {
        return planThisOrderOnly(problem, cancelled, new KnownBound());
    }

    /**
     * The same, going on from what is known from the problem before.
     *
     * @param problem the drawing and how it is held
     * @param cancelled asked now and then, every few milliseconds; planning stops when it says true
     * @param known the bound last found; it makes the answer quicker, never another
     * @return the same plan as {@link #plan(Problem)} but for {@link Plan#savedByOtherOrderMin}, or why there is none
     * @throws CancellationException if it was stopped
     */
    public static Outcome planThisOrderOnly(Problem problem, BooleanSupplier cancelled, KnownBound known) {
        return plan(problem, false, cancelled, known);
    }

    private static Outcome plan(Problem problem, boolean bothOrders, BooleanSupplier cancelled, KnownBound known) {
        List<Hindrance> hindrances = Hindrances.of(problem);
        return hindrances.isEmpty()
                ? new Outcome.Planned(new Planner(problem, bothOrders, cancelled, known).solve())
                : new Outcome.Impossible(hindrances);
    }

    private Plan solve() {
        PlanWriter writer = new PlanWriter(problem, needs, tariff);
        if (needs.filmed() == 0) {
            return writer.write(draft(List.of(), problem.order()), 0, OptionalDouble.empty());
        }
        if (needs.bands() <= EXACT_BANDS) {
            return exactly(writer);
        }
        return needs.bands() <= ExactSearch.MOST_BANDS ? perhapsExactly(writer) : nearly(writer);
    }

    /** The least plan, and what the other order would save. */
    private Plan exactly(PlanWriter writer) {
        int size = Math.max(1, needs.bands() - UNSTEERED_BANDS);
        Bound bound = known.ofSelections(needs, tariff, size);
        Draft good = good(bound, problem.order(), FEW_BEGINNINGS);
        Draft best = least(bound, good, problem.order(), Long.MAX_VALUE).draft();
        OptionalDouble saved = OptionalDouble.empty();
        if (bothOrders && problem.order() == Order.THICKER_FIRST) {
            Draft other =
                    least(bound, best, Order.LEAST_MINUTES, Long.MAX_VALUE).draft();
            saved = OptionalDouble.of(
                    writer.cost(best).minutes() - writer.cost(other).minutes());
        }
        return writer.write(best, best.price(), saved);
    }

    /** The least plan if it is found within the work allowed, else a good one and a bound. */
    private Plan perhapsExactly(PlanWriter writer) {
        Bound bound = known.ofSelections(needs, tariff, STEERING_BANDS);
        Draft good = good(bound, problem.order(), MANY_BEGINNINGS);
        Found found = least(bound, good, problem.order(), MOST_WORK);
        return writer.write(found.draft(), found.bound(), OptionalDouble.empty());
    }

    /** A good plan and a bound. */
    private Plan nearly(PlanWriter writer) {
        Bound steering = Bound.ofRows(needs, tariff, STEERING_BANDS);
        Draft best = good(steering, problem.order(), MANY_BEGINNINGS);
        long bound = Math.max(
                Bound.ofRows(needs, tariff, ROW_BANDS).start(),
                Bound.ofSelections(needs, tariff, SELECTED_BANDS).start());
        return writer.write(best, bound, OptionalDouble.empty());
    }

    private Draft draft(List<Visit> visits, Order order) {
        return Draft.of(visits, needs, order, tariff, lengthSteps).orElseThrow();
    }

    /** A good plan, without a claim. */
    private Draft good(Bound steering, Order order, int width) {
        BeamSearch search = new BeamSearch(problem.stretches(), needs, tariff, order, steering, cancelled);
        Polish polish = new Polish(needs, tariff, order);
        return search.plans(width).stream()
                .map(visits -> polished(polish, visits, order))
                .min(Comparator.naturalOrder())
                .orElseThrow();
    }

    private Draft polished(Polish polish, List<Visit> visits, Order order) {
        if (cancelled.getAsBoolean()) {
            throw new CancellationException("planning was cancelled");
        }
        return draft(polish.polished(visits, POLISH_TRIES), order);
    }

    /**
     * A plan and a bound.
     *
     * @param draft the plan
     * @param bound no plan has a lower price
     */
    private record Found(Draft draft, long bound) {}

    /**
     * The least plan, or the plan known if the work allowed does not suffice. Searching up to a limit not far above the
     * least price is much quicker than up to that of the plan known, so limits are raised from the bound by small steps
     * until a plan keeps to one. A limit that no plan keeps to is a bound itself.
     */
    private Found least(Bound bound, Draft good, Order order, long work) {
        ExactSearch search = new ExactSearch(needs, tariff, order, bound, work, cancelled);
        long step = 1 + good.price() / LIMIT_STEPS;
        long proven = Math.min(good.price(), bound.start());
        while (true) {
            long limit = Math.min(good.price(), proven + step);
            ExactSearch.Layer[] layers = search.layers(limit);
            if (search.exhausted()) {
                return new Found(good, proven);
            }
            if (layers[layers.length - 1] != null) {
                Draft least = draft(new TieBreak(search, tariff, layers, lengthSteps).visits(), order);
                return new Found(least, least.price());
            }
            if (limit == good.price()) {
                throw new IllegalStateException("the search missed a plan it was given: " + good);
            }
            proven = limit + 1;
        }
    }
}
