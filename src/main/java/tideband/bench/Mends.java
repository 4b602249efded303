package tideband.bench;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Set;
import tideband.design.Band;
import tideband.design.Design;
import tideband.design.Holding;
import tideband.design.Wanted;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.plan.Change;

/** Makes changes of one design, each ready to be taken. */
final class Mends {
    private final Design design;

    Mends(Design design) {
        this.design = design;
    }

    /** A band as thin as {@code mostNm} wherever it is drawn thicker; a band drawn by volts or colour becomes a film. */
    Mend thinner(int band, double mostNm) {
        Wanted wanted = new Wanted.Film(mostNm, mostNm);
        if (design.bands().get(band).wanted() instanceof Wanted.Film film) {
            wanted = new Wanted.Film(Math.min(mostNm, film.aSideNm()), Math.min(mostNm, film.bSideNm()));
        }
        return drawn(band, wanted, text("draw it at %.1f nm", mostNm));
    }

    /** A band as thick as {@code leastNm} wherever it is drawn thinner. */
    Mend thicker(int band, Wanted.Film film, double leastNm) {
        Wanted wanted = new Wanted.Film(Math.max(leastNm, film.aSideNm()), Math.max(leastNm, film.bSideNm()));
        return drawn(band, wanted, text("draw it at %.1f nm", leastNm));
    }

    Mend atVolts(int band, double volts) {
        return drawn(band, new Wanted.Volts(volts), text("draw it at %s V", plain(volts)));
    }

    Mend inOrder(int band, Wanted.Colour colour, int order) {
        Wanted wanted = new Wanted.Colour(colour.text(), colour.lab(), OptionalInt.of(order));
        return drawn(band, wanted, text("draw it in order %d", order));
    }

    private Mend drawn(int index, Wanted wanted, String act) {
        List<Band> bands = new ArrayList<>(design.bands());
        Band band = bands.get(index);
        bands.set(index, new Band(band.name(), band.fromMm(), band.toMm(), wanted, band.edge()));
        return new Mend(act, design.withBands(bands));
    }

    /** Held as the nearest of some changes says. */
    Optional<Mend> held(List<Change> changes) {
        return changes.stream().findFirst().map(change -> {
            Set<End> ends = EnumSet.copyOf(design.holding().endsDown());
            change.alsoDown().ifPresent(ends::add);
            double dryMm = Math.min(
                    design.holding().dryMm(),
                    change.dryMm().orElse(design.holding().dryMm()));
            return new Mend(change.words(), design.withHolding(new Holding(ends, dryMm)));
        });
    }

    Mend heldFor(double holdS) {
        return new Mend(
                text("hold for %s s", plain(holdS)),
                design.withPull(design.pull().withHoldS(holdS)));
    }

    Mend atMostAmps(double amps) {
        Supply had = design.supply();
        return new Mend(
                text("use a supply of %s A", plain(amps)),
                design.withSupply(new Supply(had.maxVolts(), amps, had.dialVolts(), had.slewVoltsPerS())));
    }

    Mend atMostVolts(double volts) {
        Supply had = design.supply();
        return new Mend(
                text("let the supply go no higher than %s V", plain(volts)),
                design.withSupply(new Supply(volts, had.maxAmps(), had.dialVolts(), had.slewVoltsPerS())));
    }

    private static String plain(double value) {
        return new BigDecimal(text("%.3f", value)).stripTrailingZeros().toPlainString();
    }

    private static String text(String form, Object... values) {
        return String.format(Locale.ROOT, form, values);
    }
}
