package tideband.sheet;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.bench.Colours;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.match.FilmColour;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.plan.Cost;
import tideband.plan.Run;

/** Sentences and labels that more than one sheet uses. */
final class Wording {
    private static final String ARROW = " \u2192 ";

    /** Steps of a fade in a chip. */
    static final int CHIP_STEPS = 24;

    private Wording() {}

    static String film(BenchBand band) {
        return pair(
                band,
                Figures.fixed(band.aSide().filmNm(), 1),
                Figures.fixed(band.bSide().filmNm(), 1));
    }

    static String volts(BenchBand band, Design design) {
        return band.bare()
                ? "\u2013"
                : pair(
                        band,
                        Figures.volts(band.aSideVolts(), design.supply()),
                        Figures.volts(band.bSideVolts(), design.supply()));
    }

    static String colour(BenchBand band) {
        return band.bare() ? "bare metal" : pair(band, colour(band.aSide()), colour(band.bSide()));
    }

    /** A colour's name and order: deep blue (1). */
    static String colour(FilmColour colour) {
        return colour.name().text() + " (" + colour.order() + ")";
    }

    static String span(BenchBand band) {
        return Figures.plain(band.fromMm(), 1) + "\u2013" + Figures.plain(band.toMm(), 1);
    }

    private static String pair(BenchBand band, String aSide, String bSide) {
        return band.fade() ? aSide + ARROW + bSide : aSide;
    }

    /** Bands by number and name: 2 dusk, 3 collar. */
    static String bands(BenchPlan plan, List<Integer> indices) {
        return indices.stream()
                .map(i -> (i + 1) + " " + plan.bands().get(i).name())
                .collect(Collectors.joining(", "));
    }

    /** A run of neighbours: bands 2 dusk to 4 collar, 42–110 mm from end A. */
    static String run(BenchPlan plan, Run run) {
        BenchBand first = plan.bands().get(run.first());
        BenchBand last = plan.bands().get(run.last());
        String names = run.first() == run.last()
                ? "band " + (run.first() + 1) + " " + first.name()
                : "bands " + (run.first() + 1) + " " + first.name() + " to " + (run.last() + 1) + " " + last.name();
        return names + " (" + Figures.plain(first.fromMm(), 1) + " to " + Figures.plain(last.toMm(), 1)
                + " mm from end A)";
    }

    static String piece(Piece piece) {
        double low =
                piece.stations().stream().mapToDouble(Station::sizeMm).min().orElse(0);
        double high =
                piece.stations().stream().mapToDouble(Station::sizeMm).max().orElse(0);
        String size = Figures.plain(low, 2) + (low < high ? " to " + Figures.plain(high, 2) : "") + " mm";
        String shape;
        if (piece.section() instanceof Section.Flat flat) {
            shape = "flat, " + size + " wide, " + Figures.plain(flat.thicknessMm(), 2) + " mm thick";
        } else if (piece.section() instanceof Section.Tube tube) {
            shape = "tube, " + size + " across, bore " + Figures.plain(tube.boreMm(), 2) + " mm";
        } else {
            shape = "round, " + size + " across";
        }
        return shape + ", " + Figures.plain(piece.lengthMm(), 2) + " mm long";
    }

    static String light(Design design) {
        return design.light().key() + " light, " + design.observer().key() + "\u00b0 observer";
    }

    /** Whether the plan is surely the cheapest, and if not, what is known. */
    static String proof(BenchPlan plan) {
        String rule = " under the rule " + plan.design().order().key();
        if (plan.plan().proven()) {
            return "proven: no plan" + rule + " costs less";
        }
        double bound = plan.plan().lowerBoundMin();
        return "best found, not proven: no plan" + rule + " costs less than " + Figures.plain(bound, 1) + " min (gap "
                + Figures.plain(plan.plan().cost().minutes() - bound, 1) + " min)";
    }

    /** A sentence on what the other order would save, with a space before it, or nothing. */
    static String saved(BenchPlan plan) {
        return plan.plan().savedByOtherOrderMin().isPresent()
                        && plan.plan().savedByOtherOrderMin().getAsDouble() > 0
                ? " The order least-minutes would save "
                        + Figures.plain(plan.plan().savedByOtherOrderMin().getAsDouble(), 1) + " min."
                : "";
    }

    /** The bench cost, item by item, and its sum. */
    static String cost(BenchPlan plan) {
        Cost cost = plan.plan().cost();
        BenchTimes times = plan.design().bench();
        List<String> items = new ArrayList<>();
        item(items, cost.immersions(), "immersion", times.immersionMin());
        item(items, cost.runsMaskedFirst(), "run masked first", times.maskMin());
        item(items, cost.runsMaskedOver(), "run masked over colour", times.maskOverMin());
        item(items, cost.runsStripped(), "run stripped", times.stripMin());
        item(items, cost.turns(), "turn", times.turnMin());
        return (items.isEmpty() ? "nothing to do" : String.join(" + ", items)) + " = "
                + Figures.plain(cost.minutes(), 1) + " min";
    }

    private static void item(List<String> items, int count, String what, double minutes) {
        if (count > 0) {
            items.add(count + " \u00d7 " + what + " " + Figures.plain(minutes, 2));
        }
    }

    /** Colours of a band as drawn, from its A side to its B side: one, or for a fade so many steps. */
    static List<String> wantedHexes(BenchBand band, Colours colours, int steps) {
        if (!band.fade()) {
            return List.of(band.wantedHex());
        }
        List<String> hexes = new ArrayList<>();
        for (int i = 0; i < steps; i++) {
            double share = (i + 0.5) / steps;
            double film = band.aSide().filmNm()
                    + share * (band.bSide().filmNm() - band.aSide().filmNm());
            hexes.add(colours.ofFilm(film).srgbHex());
        }
        return hexes;
    }

    /** Colours of a band as the trial predicts it, from its A side to its B side. */
    static List<String> predictedHexes(BenchPlan plan, BenchBand band, Colours colours) {
        List<String> hexes = plan.trial().cells().stream()
                .filter(c -> {
                    double middle = (c.fromMm() + c.toMm()) / 2;
                    return middle >= band.fromMm() && middle <= band.toMm();
                })
                .map(c -> colours.hexOf(c.lab()))
                .toList();
        int most = CHIP_STEPS;
        if (hexes.size() <= most) {
            return hexes.isEmpty() ? List.of(band.aSide().srgbHex()) : hexes;
        }
        List<String> fewer = new ArrayList<>();
        for (int i = 0; i < most; i++) {
            fewer.add(hexes.get(i * hexes.size() / most));
        }
        return fewer;
    }
}
