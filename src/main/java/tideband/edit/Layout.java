package tideband.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.design.Band;
import tideband.design.Edge;
import tideband.design.Limits;
import tideband.design.Wanted;

/** Bands laid end to end, none shorter than a design's file allows. */
final class Layout {

    /**
     * A band by its length.
     *
     * @param name its name
     * @param lengthMm its length in mm
     * @param wanted what it is to be
     * @param edge the edge at its B side
     */
    record Stretch(String name, double lengthMm, Wanted wanted, Edge edge) {
        static Stretch of(Band band) {
            return new Stretch(band.name(), band.toMm() - band.fromMm(), band.wanted(), band.edge());
        }

        Stretch named(String other) {
            return new Stretch(other, lengthMm, wanted, edge);
        }
    }

    private Layout() {}

    /** To the micrometre, so that sums of positions stay short numbers. */
    static double clean(double mm) {
        return Math.rint(mm * 1000) / 1000;
    }

    /** The place between two bounds that is nearest to a wish: a short number, unless only a bound itself will do. */
    static double between(double wishMm, double lowMm, double highMm) {
        double placeMm = clean(wishMm);
        return placeMm < lowMm ? lowMm : Math.min(placeMm, highMm);
    }

    /** Where a band ends that begins at {@code fromMm} and has so many after it. */
    static double end(double wishMm, double fromMm, double lengthMm, int bandsAfter) {
        return between(wishMm, fromMm + Limits.SHORTEST_BAND_MM, lengthMm - Limits.SHORTEST_BAND_MM * bandsAfter);
    }

    /** Stretches in the same proportion that fill a length, none too short. */
    static List<Stretch> stretched(List<Stretch> stretches, double roomMm) {
        double spareMm = roomMm - Limits.SHORTEST_BAND_MM * stretches.size();
        double nowMm = stretches.stream()
                .mapToDouble(s -> Math.max(0, s.lengthMm - Limits.SHORTEST_BAND_MM))
                .sum();
        List<Stretch> fitted = new ArrayList<>();
        for (Stretch one : stretches) {
            double share =
                    nowMm > 0 ? Math.max(0, one.lengthMm - Limits.SHORTEST_BAND_MM) / nowMm : 1.0 / stretches.size();
            fitted.add(new Stretch(one.name, Limits.SHORTEST_BAND_MM + share * spareMm, one.wanted, one.edge));
        }
        return fitted;
    }

    /** Stretches laid from end A to cover a length; nothing if it is too short for them. */
    static Optional<List<Band>> laid(List<Stretch> stretches, double lengthMm) {
        if (lengthMm < Limits.SHORTEST_BAND_MM * stretches.size()) {
            return Optional.empty();
        }
        List<Band> bands = new ArrayList<>();
        double fromMm = 0;
        double exactMm = 0;
        for (int i = 0; i < stretches.size(); i++) {
            Stretch one = stretches.get(i);
            int after = stretches.size() - 1 - i;
            exactMm += one.lengthMm;
            double toMm = after == 0 ? lengthMm : end(exactMm, fromMm, lengthMm, after);
            bands.add(new Band(one.name, fromMm, toMm, one.wanted, one.edge));
            fromMm = toMm;
        }
        return Optional.of(bands);
    }

    /**
     * Bands scaled to cover another length. Those that would become too short are made just long enough, and the others give
     * the length for it.
     */
    static Optional<List<Band>> fitted(List<Band> bands, double lengthMm) {
        double beforeMm = bands.get(bands.size() - 1).toMm();
        List<Stretch> scaled = bands.stream()
                .map(Stretch::of)
                .map(s -> new Stretch(s.name, s.lengthMm * lengthMm / beforeMm, s.wanted, s.edge))
                .toList();
        boolean longEnough = scaled.stream().allMatch(s -> s.lengthMm >= Limits.SHORTEST_BAND_MM);
        return laid(longEnough ? scaled : stretched(scaled, lengthMm), lengthMm);
    }
}
