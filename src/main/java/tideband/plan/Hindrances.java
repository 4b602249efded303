package tideband.plan;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.stream.Collectors;
import tideband.piece.End;

/**
 * Why a drawing cannot be made. Each band alone decides: with all it needs masked, a band that is finishable from an
 * end that may go down can be finished by an immersion of its own, whatever else was done before. So a drawing can be
 * made if and only if each of its bands is finishable from some end that may go down.
 */
final class Hindrances {

    private Hindrances() {}

    static List<Hindrance> of(Problem problem) {
        List<Hindrance> found = new ArrayList<>();
        for (int band = 0; band < problem.stretches().size(); band++) {
            int b = band;
            boolean bare = problem.stretches().get(band).bare();
            if (!bare
                    && problem.endsDown().stream()
                            .noneMatch(end -> faults(problem, b, end).isEmpty())) {
                found.add(hindrance(problem, band));
            }
        }
        return found;
    }

    /** What keeps a band from being finished with an end down, were it allowed to go down. */
    private static List<String> faults(Problem problem, int band, End end) {
        List<String> faults = new ArrayList<>();
        if (Needs.rises(problem.stretches().get(band), end)) {
            faults.add("its film rises away from end " + end);
        }
        if (Needs.dry(problem, band, end)) {
            double inMm = problem.dryMm() - Needs.clearMm(problem, band, end);
            faults.add("it reaches " + Wording.number(inMm, Change.DRY_DIGITS)
                    + " mm into the dry length under the holder at end " + end.other());
        }
        return faults;
    }

    private static Hindrance hindrance(Problem problem, int band) {
        List<String> reasons = new ArrayList<>();
        for (End end : End.values()) {
            reasons.add(
                    problem.endsDown().contains(end)
                            ? "with end " + end + " down " + String.join(" and ", faults(problem, band, end))
                            : "end " + end + " may not go down");
        }
        String reason = problem.nameOf(band) + " cannot be finished: " + String.join(", and ", reasons);
        List<Change> changes = changes(problem, band);
        List<String> words = changes.stream().map(Change::words).toList();
        return new Hindrance(
                OptionalInt.of(band), reason, words.stream().distinct().collect(Collectors.joining(", or ")), changes);
    }

    /** One change an end that could do: first those that ask for least, then end A before B. */
    private static List<Change> changes(Problem problem, int band) {
        List<Change> changes = new ArrayList<>();
        for (End end : End.values()) {
            if (Needs.rises(problem.stretches().get(band), end)) {
                continue;
            }
            Optional<End> also = problem.endsDown().contains(end) ? Optional.empty() : Optional.of(end);
            OptionalDouble dry = Needs.dry(problem, band, end)
                    ? OptionalDouble.of(roundedDown(Needs.clearMm(problem, band, end)))
                    : OptionalDouble.empty();
            changes.add(new Change(also, dry));
        }
        changes.sort(Comparator.comparingInt(Hindrances::size)
                .thenComparing(change -> -change.dryMm().orElse(0)));
        return changes;
    }

    private static int size(Change change) {
        return (change.alsoDown().isPresent() ? 1 : 0) + (change.dryMm().isPresent() ? 1 : 0);
    }

    /** Rounded down, so that what is advised works. */
    private static double roundedDown(double mm) {
        return BigDecimal.valueOf(mm)
                .setScale(Change.DRY_DIGITS, RoundingMode.FLOOR)
                .doubleValue();
    }
}
