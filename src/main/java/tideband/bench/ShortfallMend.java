package tideband.bench;

import java.util.Optional;
import java.util.function.BiPredicate;
import tideband.design.Design;
import tideband.pull.Cure;
import tideband.pull.Shortfall;

/**
 * Finds the change that takes a shortfall of a pull away. A cure is worked out for one hold of one pull; as the plan may become
 * another by it, each is tried, and taken a little farther where it is not enough.
 */
final class ShortfallMend {
    private static final int MOST_TRIES = 3;
    private static final double FARTHER = 1.2;
    private static final double THINNER = 0.99;
    /** Design files take no longer holds. */
    private static final double LONGEST_HOLD_S = 36_000;

    private final Design design;
    private final BiPredicate<Design, Integer> standsInTheWay;

    /**
     * A finder.
     *
     * @param design the design as it is
     * @param standsInTheWay works a changed design out and says whether a band, or the whole design, still cannot be made
     */
    ShortfallMend(Design design, BiPredicate<Design, Integer> standsInTheWay) {
        this.design = design;
        this.standsInTheWay = standsInTheWay;
    }

    /** The nearest change that was seen to work. */
    Optional<Mend> of(Shortfall shortfall) {
        for (Cure cure : shortfall.cures()) {
            Optional<Mend> mend = tried(shortfall.band(), cure);
            if (mend.isPresent()) {
                return mend;
            }
        }
        return Optional.empty();
    }

    private Optional<Mend> tried(int band, Cure cure) {
        Cure now = cure;
        for (int tries = 0; tries < MOST_TRIES; tries++) {
            Mend mend = made(band, now);
            if (!standsInTheWay.test(mend.design(), band)) {
                return Optional.of(mend);
            }
            now = farther(now);
        }
        return Optional.empty();
    }

    private Mend made(int band, Cure cure) {
        Mends mends = new Mends(design);
        if (cure instanceof Cure.Hold hold) {
            return mends.heldFor(hold.holdS());
        }
        if (cure instanceof Cure.Amps amps) {
            return mends.atMostAmps(amps.amps());
        }
        return mends.thinner(band, ((Cure.Film) cure).mostNm());
    }

    private static Cure farther(Cure cure) {
        if (cure instanceof Cure.Hold hold) {
            return new Cure.Hold(Math.min(LONGEST_HOLD_S, Math.ceil(hold.holdS() * FARTHER)));
        }
        if (cure instanceof Cure.Amps amps) {
            return new Cure.Amps(Math.ceil(amps.amps() * FARTHER * 100) / 100);
        }
        return new Cure.Film(Math.floor(((Cure.Film) cure).mostNm() * THINNER * 10) / 10);
    }
}
