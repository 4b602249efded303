package tideband.plan;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import tideband.piece.End;

/**
 * A change of holding that lets a band be finished.
 *
 * @param alsoDown an end that must be allowed to go down too
 * @param dryMm the longest dry length that works, in mm
 */
public record Change(Optional<End> alsoDown, OptionalDouble dryMm) {

    /** Dry lengths are told to a thousandth of a mm. */
    static final int DRY_DIGITS = 3;

    /**
     * The change in words.
     *
     * @return such as {@code let end B go down too and shorten the dry length to 4 mm}
     */
    public String words() {
        List<String> words = new ArrayList<>();
        alsoDown.ifPresent(end -> words.add("let end " + end + " go down too"));
        dryMm.ifPresent(mm -> words.add("shorten the dry length to " + Wording.number(mm, DRY_DIGITS) + " mm"));
        return String.join(" and ", words);
    }

    /**
     * Makes the change.
     *
     * @param problem the problem as it was
     * @return the problem held otherwise; its dry length is never made longer
     */
    public Problem applyTo(Problem problem) {
        Set<End> ends = EnumSet.copyOf(problem.endsDown());
        alsoDown.ifPresent(ends::add);
        double dry = Math.min(problem.dryMm(), dryMm.orElse(problem.dryMm()));
        return new Problem(problem.stretches(), problem.names(), ends, dry, problem.times(), problem.order());
    }
}
