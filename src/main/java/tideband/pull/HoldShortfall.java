package tideband.pull;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.List;
import java.util.Locale;
import tideband.oxide.Coupon;

/** Says why a hold at the highest volts leaves a band short, and what would cure it. */
final class HoldShortfall {
    /** Design files take no longer holds. */
    private static final double LONGEST_HOLD_S = 36_000;

    private final Outfit outfit;

    HoldShortfall(Outfit outfit) {
        this.outfit = outfit;
    }

    /**
     * Explains.
     *
     * @param before the visit as it was before the hold, its supply raised
     * @param after the same after the hold
     */
    Shortfall explain(double aimNm, double holdS, Visit before, Visit after) {
        double limitAmps = outfit.supply().maxAmps();
        return after.amps() >= Levels.AT_LIMIT * limitAmps
                ? fewAmps(aimNm, holdS, before, after.filmNm())
                : fewVolts(after.band(), aimNm, holdS, after.filmNm());
    }

    private Shortfall fewAmps(double aimNm, double holdS, Visit before, double reachedNm) {
        double limitAmps = outfit.supply().maxAmps();
        double neededS = before.secondsUntil(aimNm, LONGEST_HOLD_S);
        // At the limit film grows by charge: as much more current as the film wants more time.
        double neededAmps = limitAmps * Math.max(neededS / holdS, aimNm / reachedNm);
        double wholeS = Math.ceil(neededS * outfit.settings().holdS() / holdS);
        Cure amps = new Cure.Amps(twoDigits(neededAmps, RoundingMode.UP).doubleValue());
        boolean holdHelps = neededS < LONGEST_HOLD_S;
        return new Shortfall(
                before.band(),
                text(
                        "the supply's %s A are not enough: at %s V for %s s the film gets to %s nm of %s nm",
                        plain(limitAmps, RoundingMode.HALF_UP), outfit.mostVolts(), holdS, reachedNm, aimNm),
                holdHelps
                        ? text(
                                "hold for about %s s, or use a supply of at least %s A",
                                wholeS, plain(neededAmps, RoundingMode.UP))
                        : text("use a supply of at least %s A", plain(neededAmps, RoundingMode.UP)),
                holdHelps && wholeS <= LONGEST_HOLD_S ? List.of(new Cure.Hold(wholeS), amps) : List.of(amps));
    }

    private Shortfall fewVolts(int band, double aimNm, double holdS, double reachedNm) {
        boolean bathLimits = outfit.bath().ceilingVolts() <= outfit.supply().maxVolts();
        double neededVolts = new Coupon(outfit.bath(), outfit.supply().maxAmps(), holdS, Coupon.USUAL_CM2).volts(aimNm);
        String limit = bathLimits
                ? text("the bath's ceiling of %s V", outfit.bath().ceilingVolts())
                : text("the supply's %s V", outfit.supply().maxVolts());
        String reason = text(
                "%s nm needs about %s V in this bath, more than %s, which gives %s nm in %s s",
                aimNm, neededVolts, limit, reachedNm, holdS);
        double mostNm = Math.floor(reachedNm * 10) / 10;
        String change = text("draw it at %s nm or less", mostNm)
                + (bathLimits
                        ? ", or use a bath with a higher ceiling or ratio"
                        : text(", or use a supply of at least %s V", Math.ceil(neededVolts)));
        return new Shortfall(band, reason, change, List.of(new Cure.Film(mostNm)));
    }

    /** Amps in two digits. */
    private static String plain(double amps, RoundingMode rounding) {
        return twoDigits(amps, rounding).toPlainString();
    }

    private static BigDecimal twoDigits(double amps, RoundingMode rounding) {
        return new BigDecimal(amps).round(new MathContext(2, rounding));
    }

    private static String text(String form, Object... values) {
        Object[] words = new Object[values.length];
        for (int i = 0; i < values.length; i++) {
            words[i] = values[i] instanceof Double ? number((Double) values[i]) : values[i];
        }
        return String.format(Locale.ROOT, form, words);
    }

    private static String number(double value) {
        String plain = String.format(Locale.ROOT, "%.1f", value);
        return plain.endsWith(".0") ? plain.substring(0, plain.length() - 2) : plain;
    }
}
