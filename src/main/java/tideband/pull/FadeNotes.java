package tideband.pull;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;

/** What the person at the bench is told of a fade: how to set the supply, or why it is not pulled as asked and what would help. */
final class FadeNotes {
    private final Outfit outfit;

    FadeNotes(Outfit outfit) {
        this.outfit = outfit;
    }

    String setting(Leg leg, double setVolts, double limitAmps) {
        return text(
                "Fade at %.0f mm: set the supply to %s V with its current limit at %.3f A; its meter then climbs through"
                        + " the volts in brackets. Draw out so that each mark is passed at its time.",
                leg.outerMm(), plain(setVolts), limitAmps);
    }

    String tooMuchCurrent(Leg leg, double amps) {
        return text(
                "The fade at %.0f mm is pulled in steps: even at the hand's slowest %.2f mm/s it would draw %.2f A, and the"
                        + " supply gives %.2f A. A supply of %.1f A or a longer fade would let it be drawn evenly.",
                leg.outerMm(),
                outfit.settings().slowestMmPerS(),
                amps,
                outfit.supply().maxAmps(),
                amps / Outfit.SAFE_SHARE + 0.05);
    }

    String tooSteep(Visit visit, Leg leg, double volts) {
        double slowest = outfit.settings().slowestMmPerS();
        double slope = leg.riseNm() / (leg.outerMm() - leg.innerMm());
        double low = 0;
        double high = slope;
        while (high - low > 1e-4 * slope) {
            double middle = (low + high) / 2;
            double needed = visit.voltsForGrowth(leg.innerNm(), middle * slowest, leg.innerMm());
            if (needed > outfit.mostVolts()) {
                high = middle;
            } else {
                low = middle;
            }
        }
        double lengthMm = Math.ceil(leg.riseNm() / Math.max(low, 1e-9));
        String longer = lengthMm > outfit.piece().lengthMm()
                ? "A thinner thick side"
                : text("A fade of %.0f mm or longer, or a thinner thick side,", lengthMm);
        return text(
                "The fade at %.0f mm is pulled in steps: even at the hand's slowest %.2f mm/s its thick side would need %.1f"
                        + " V, and bath and supply allow %.1f V. %s would let it be drawn evenly.",
                leg.outerMm(), slowest, volts, outfit.mostVolts(), longer);
    }

    String tooQuickForSupply(Leg leg, double voltsPerS) {
        return text(
                "The fade at %.0f mm is pulled in steps: even at the hand's slowest %.2f mm/s its volts would rise by %.2f V/s,"
                        + " and the supply manages %.2f V/s. A longer fade would let it be drawn evenly.",
                leg.outerMm(),
                outfit.settings().slowestMmPerS(),
                voltsPerS,
                outfit.supply().slewVoltsPerS());
    }

    String uneven(Leg leg, double slowestMmPerS, double fastestMmPerS) {
        String speeds = Double.isInfinite(fastestMmPerS)
                ? "jump"
                : text("move at %.2f to %.2f mm/s", slowestMmPerS, fastestMmPerS);
        return text(
                "The fade at %.0f mm is pulled in steps: at fixed volts the hand would have to %s, and it keeps steady from %.2f to"
                        + " %.2f mm/s. A ramped fade may be possible.",
                leg.outerMm(),
                speeds,
                outfit.settings().slowestMmPerS(),
                outfit.settings().fastestMmPerS());
    }

    String coarse(Leg leg, int steps, double difference) {
        return text(
                "The fade at %.0f mm has %d steps, one a setting of the dial: neighbours differ by about %.1f dE00, and %.1f were"
                        + " wanted. A supply with finer settings than %s V would let them be more alike.",
                leg.outerMm(),
                steps + 1,
                difference,
                outfit.settings().stepDe00(),
                plain(outfit.supply().dialVolts()));
    }

    private static String text(String form, Object... values) {
        return String.format(Locale.ROOT, form, values);
    }

    private static String plain(double volts) {
        return BigDecimal.valueOf(volts)
                .setScale(3, RoundingMode.HALF_UP)
                .stripTrailingZeros()
                .toPlainString();
    }
}
