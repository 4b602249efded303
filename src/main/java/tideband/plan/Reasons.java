package tideband.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import tideband.design.Order;

/**
 * Why a plan does what it does, found out from the plan itself: a mask's reason is what goes wrong without it, an end's
 * what goes wrong with the other end down, a place in the order what goes wrong in another. "Goes wrong" means that a
 * band is not finished, that a later immersion has nothing left to do, or that the plan gets dearer.
 */
final class Reasons {

    private final Problem problem;
    private final Needs needs;
    private final Tariff tariff;
    private final Draft draft;
    private final Wording wording;

    Reasons(Problem problem, Needs needs, Tariff tariff, Draft draft) {
        this.problem = problem;
        this.needs = needs;
        this.tariff = tariff;
        this.draft = draft;
        this.wording = new Wording(problem);
    }

    List<String> of(int visit) {
        List<String> why = new ArrayList<>();
        why.add(place(visit));
        why.add(end(visit));
        for (Run run : Masks.runList(draft.visits().get(visit).masked())) {
            why.add(mask(visit, Masks.of(run.first(), run.last())));
        }
        return why;
    }

    /** How many minutes another plan costs more than this, or empty if it is no plan. */
    private Optional<Double> extraMin(List<Visit> visits) {
        return Draft.of(visits, needs, problem.order(), tariff, new long[needs.bands()])
                .map(other -> tariff.minutes(other.price()) - tariff.minutes(draft.price()));
    }

    private List<Visit> with(int visit, Visit instead) {
        List<Visit> visits = new ArrayList<>(draft.visits());
        visits.set(visit, instead);
        return visits;
    }

    private String place(int visit) {
        if (draft.visits().size() == 1) {
            return "One immersion makes every band.";
        }
        if (problem.order() == Order.THICKER_FIRST) {
            long due = needs.due(finishedBefore(visit), Order.THICKER_FIRST)
                    & draft.newly().get(visit);
            int thickest = Long.numberOfTrailingZeros(due);
            return "It comes now because no band still to be made is thicker than " + wording.withFilm(thickest) + ".";
        }
        int first = Math.max(0, visit - 1);
        List<Visit> swapped = new ArrayList<>(draft.visits());
        swapped.set(first, draft.visits().get(first + 1));
        swapped.set(first + 1, draft.visits().get(first));
        String there = "It comes " + (visit == 0 ? "before immersion 2" : "after immersion " + visit);
        String outcome = extraMin(swapped)
                .map(extra -> extra > 0
                        ? " because the other way round would cost " + Wording.minutes(extra) + " more."
                        : "; the other way round would not be dearer.")
                .orElse(" because the other way round would leave an immersion with nothing to finish.");
        return there + outcome;
    }

    private long finishedBefore(int visit) {
        return draft.newly().subList(0, visit).stream().reduce(0L, (a, b) -> a | b);
    }

    private String end(int visit) {
        Visit v = draft.visits().get(visit);
        boolean turned = visit > 0 && draft.visits().get(visit - 1).end() != v.end();
        String turn = turned
                ? "The piece is turned (" + Wording.minutes(problem.times().turnMin()) + "): "
                : "";
        String down = turn + (turned ? "end " : "End ") + v.endDown() + " is down ";
        int other = 1 - v.end();
        if (!needs.mayGoDown(other)) {
            return down + "because no other end may go down.";
        }
        String with = "with end " + v.endDown().other() + " down ";
        long newly = draft.newly().get(visit);
        long never = newly & ~needs.finishable(other);
        if (never != 0) {
            int band = Long.numberOfTrailingZeros(never);
            boolean rises =
                    Needs.rises(problem.stretches().get(band), v.endDown().other());
            return down + "because "
                    + (rises
                            ? wording.withFilm(band) + " gets thinner away from it."
                            : with + wording.name(band) + " would reach under the holder.");
        }
        long missed = newly & ~needs.finished(v.masked(), other);
        if (missed != 0) {
            int band = Long.numberOfTrailingZeros(missed);
            long more = needs.all(other, band) & ~v.masked();
            return down + "because " + with + wording.names(more) + " would have to be masked too, for "
                    + wording.withFilm(band) + ".";
        }
        return extraMin(with(visit, new Visit(v.masked(), other)))
                .map(extra -> extra > 0
                        ? down + "because " + with + "it would cost " + Wording.minutes(extra) + " more."
                        : down + "; " + with + "it would not be dearer.")
                .orElse(down + "because " + with + "a later immersion would have nothing to do in its turn.")
                .replace(" ;", ";");
    }

    private String mask(int visit, long run) {
        Visit v = draft.visits().get(visit);
        Map<Integer, Long> neededBy = new TreeMap<>();
        long idle = run;
        for (int band : Masks.list(run)) {
            int forBand = neededFor(visit, band);
            if (forBand >= 0) {
                neededBy.merge(forBand, 1L << band, (x, y) -> x | y);
                idle &= ~(1L << band);
            }
        }
        List<String> clauses = new ArrayList<>();
        neededBy.forEach((forBand, masked) -> clauses.addAll(needs(v, masked, forBand)));
        if (idle != 0) {
            clauses.add(idle(visit, idle));
        }
        return String.join("; ", clauses) + ".";
    }

    /** The thickest band newly finished for which another must be masked, or -1. */
    private int neededFor(int visit, int masked) {
        Visit v = draft.visits().get(visit);
        int thickest = -1;
        for (int band : Masks.list(draft.newly().get(visit))) {
            if (Masks.has(needs.all(v.end(), band), masked)
                    && (thickest < 0 || needs.peakNm(band) > needs.peakNm(thickest))) {
                thickest = band;
            }
        }
        return thickest;
    }

    /** Why bands are masked for one that is made beyond them, or beside them. */
    private List<String> needs(Visit v, long masked, int band) {
        long inner = masked & needs.inner(v.end(), band);
        long bare = inner & ~needs.filmed();
        long thinner = inner & needs.filmed();
        long crisp = masked & ~inner;
        List<String> clauses = new ArrayList<>();
        if (thinner != 0) {
            String deep = Wording.number(needs.deepNm(v.end(), band), 2) + " nm";
            clauses.add(wording.withLows(thinner) + are(thinner) + "masked because "
                    + (single(thinner) ? "it is" : "they are") + " to be thinner than the " + deep + " of "
                    + wording.name(band) + ", which is made beyond " + (single(thinner) ? "it" : "them"));
        }
        if (bare != 0) {
            clauses.add(wording.names(bare) + are(bare) + "masked because " + (single(bare) ? "it stays" : "they stay")
                    + " bare and " + wording.withFilm(band) + " is made beyond");
        }
        if (crisp != 0) {
            clauses.add(wording.withFilm(Long.numberOfTrailingZeros(crisp)) + " is masked because its edge to "
                    + wording.withFilm(band) + " is crisp and it is the thinner there");
        }
        return clauses;
    }

    private static String are(long bands) {
        return single(bands) ? " is " : " are ";
    }

    /** Why bands are masked although this immersion would do without. */
    private String idle(int visit, long idle) {
        Visit v = draft.visits().get(visit);
        boolean before = visit > 0 && (draft.visits().get(visit - 1).masked() & idle) == idle;
        String stays = single(idle) ? " stays masked" : " stay masked";
        String along = single(idle) ? " is masked along" : " are masked along";
        String start = wording.names(idle) + (before ? stays : along);
        String without = before ? "taking the mask off here would" : "doing without it here would";
        int later = nextNeed(visit, idle);
        String until = later < 0 ? "" : " for immersion " + (later + 1);
        return extraMin(with(visit, new Visit(v.masked() & ~idle, v.end())))
                .map(extra -> extra > 0
                        ? start + until + " because " + without + " cost " + Wording.minutes(extra) + " more"
                        : start + until + "; " + without
                                + (extra < 0 ? " save " + Wording.minutes(-extra) : " save nothing"))
                .orElse(start
                        + " because otherwise a band would be finished here already, and a later immersion would have"
                        + " nothing to do in its turn");
    }

    private static boolean single(long bands) {
        return Long.bitCount(bands) == 1;
    }

    private int nextNeed(int visit, long bands) {
        for (int later = visit + 1; later < draft.visits().size(); later++) {
            for (int band : Masks.list(bands)) {
                if (neededFor(later, band) >= 0) {
                    return later;
                }
            }
        }
        return -1;
    }
}
