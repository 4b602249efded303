package tideband.plan;

/**
 * The bound found for the last problem, kept for the next. It takes most of a planner's time, and depends only on which bands
 * need which masked, not on how long they are or exactly how thick: so while a drawing is edited it mostly stays the same.
 * What a planner answers does not depend on it. For one thread.
 */
public final class KnownBound {
    private Needs needs;
    private Tariff tariff;
    private int size;
    private Bound bound;

    /** Nothing is known to begin with. */
    public KnownBound() {}

    /** The same as {@link Bound#ofSelections}. */
    Bound ofSelections(Needs nextNeeds, Tariff nextTariff, int nextSize) {
        boolean same =
                bound != null && size == nextSize && tariff.equals(nextTariff) && needs.asksTheSameMasksAs(nextNeeds);
        if (!same) {
            bound = Bound.ofSelections(nextNeeds, nextTariff, nextSize);
            needs = nextNeeds;
            tariff = nextTariff;
            size = nextSize;
        }
        return bound;
    }
}
