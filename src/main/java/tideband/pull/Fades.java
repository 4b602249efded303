package tideband.pull;

import java.util.List;
import java.util.OptionalDouble;

/** Pulls a fade in the way the design asks for, or in steps where that way cannot be gone. */
final class Fades {
    private final Outfit outfit;
    private final RampedFade ramped;
    private final FixedVoltsFade fixedVolts;
    private final SteppedFade stepped;

    Fades(Outfit outfit, Levels levels, List<String> notes) {
        this.outfit = outfit;
        this.ramped = new RampedFade(outfit, notes);
        this.fixedVolts = new FixedVoltsFade(outfit, notes);
        this.stepped = new SteppedFade(outfit, levels, notes);
    }

    /**
     * Pulls the leg; the line is at its outer edge and the film there has its outer value.
     *
     * @return the volts at its inner edge
     */
    double pull(Visit visit, Leg leg) {
        OptionalDouble even = switch (outfit.settings().fade()) {
            case RAMPED -> ramped.pull(visit, leg);
            case FIXED_VOLTS -> fixedVolts.pull(visit, leg);
            case STEPPED -> OptionalDouble.empty();
        };
        return even.isPresent() ? even.getAsDouble() : stepped.pull(visit, leg);
    }
}
