package tideband.pull;

import java.util.ArrayList;
import java.util.List;

/** A fade in level steps, as many as keep neighbours alike to the eye; each lies astride the drawn fade. */
final class SteppedFade {
    private static final double HOLD_SHARE = 0.25;
    private static final double SHORTEST_HOLD_S = 3;
    /** Steps stay below the chosen colour difference by so much, for the dial rounds their films. */
    private static final double WITHIN = 0.98;

    private static final int SLICES = 100;

    private final Outfit outfit;
    private final Levels levels;
    private final FadeNotes says;
    private final List<String> notes;

    SteppedFade(Outfit outfit, Levels levels, List<String> notes) {
        this.outfit = outfit;
        this.levels = levels;
        this.says = new FadeNotes(outfit);
        this.notes = notes;
    }

    /**
     * Pulls the leg.
     *
     * @return the volts of the innermost step
     */
    double pull(Visit visit, Leg leg) {
        List<Double> films = stepFilms(leg);
        double holdS = Visit.onTheClock(
                Math.max(SHORTEST_HOLD_S, HOLD_SHARE * outfit.settings().holdS()));
        double nmPerVolt = outfit.bath().nmPerVolt();
        double volts = 0;
        for (int step = 0; step < films.size(); step++) {
            double filmNm = films.get(step);
            double startNm = step == 0 ? leg.outerNm() : (films.get(step - 1) + filmNm) / 2;
            double lineMm = leg.lineMm((startNm - leg.outerNm()) / leg.riseNm());
            if (lineMm < visit.lineMm()) {
                visit.moveOff(lineMm);
            }
            double guessVolts = visit.stoodVolts() + Math.max(0, filmNm - visit.filmNm()) / nmPerVolt;
            volts = levels.hold(visit, filmNm, holdS, guessVolts);
        }
        return volts;
    }

    /**
     * Films from the outer to the inner value, evenly spread in colour: as many as keep neighbours less than the chosen difference
     * apart, but no more than the dial has settings for.
     */
    private List<Double> stepFilms(Leg leg) {
        double[] travelled = new double[SLICES + 1];
        for (int i = 1; i <= SLICES; i++) {
            double last = leg.filmNm((i - 1.0) / SLICES);
            double film = leg.filmNm((double) i / SLICES);
            travelled[i] = travelled[i - 1] + outfit.colourDifference().applyAsDouble(last, film);
        }
        double whole = travelled[SLICES];
        int wanted = Math.max(1, (int) Math.ceil(whole / (outfit.settings().stepDe00() * WITHIN)));
        double settingNm = outfit.supply().dialVolts() * outfit.bath().nmPerVolt();
        int settings = Math.max(1, (int) (leg.riseNm() / settingNm));
        int steps = Math.min(wanted, settings);
        if (steps < wanted) {
            notes.add(says.coarse(leg, steps, whole / steps));
        }
        List<Double> films = new ArrayList<>();
        int slice = 1;
        for (int step = 0; step <= steps; step++) {
            double place = whole * step / steps;
            while (slice < SLICES && travelled[slice] < place) {
                slice++;
            }
            double span = travelled[slice] - travelled[slice - 1];
            double share = span > 0 ? Math.max(0, Math.min(1, (place - travelled[slice - 1]) / span)) : 1;
            films.add(leg.filmNm((slice - 1 + share) / SLICES));
        }
        return films;
    }
}
