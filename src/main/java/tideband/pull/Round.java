package tideband.pull;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import tideband.piece.End;
import tideband.plan.Immersion;

/** The whole plan gone through once, with its aims, its pulls, and the films that come of them. */
final class Round {
    /** No visit lasts longer, in s; films that would hardly gain in so long are not reckoned with. */
    private static final double LONGEST_VISIT_S = 10_000;

    private final Outfit outfit;
    private final List<Target> targets;
    private final List<Target> aims;
    private final double[][] volts;
    private final Cells cells;
    private final double[][] finishedNm;
    private final List<Pull> pulls = new ArrayList<>();
    private final List<Shortfall> shortfalls = new ArrayList<>();

    /**
     * Goes through the plan.
     *
     * @param targets the bands from end A to end B, as drawn
     * @param aims the films to make for, which differ from those drawn by what bands gain later
     * @param guessVolts for each band, volts near those of its A and its B side
     */
    Round(Outfit outfit, List<Target> targets, List<Immersion> immersions, List<Target> aims, double[][] guessVolts) {
        this.outfit = outfit;
        this.targets = targets;
        this.aims = aims;
        this.cells = new Cells(outfit.piece(), targets, outfit.bath().nativeNm());
        this.finishedNm = new double[targets.size()][];
        this.volts = Arrays.stream(guessVolts).map(double[]::clone).toArray(double[][]::new);
        for (Immersion immersion : immersions) {
            pulls.add(visit(immersion));
            for (int band : immersion.finishes()) {
                finishedNm[band] = cells.sides(band);
            }
        }
    }

    private Pull visit(Immersion immersion) {
        List<Leg> legs = Leg.of(immersion, aims, outfit.piece().lengthMm());
        List<String> notes = new ArrayList<>();
        Levels levels = new Levels(outfit, notes, shortfalls);
        Fades fades = new Fades(outfit, levels, notes);
        Leg first = legs.get(0);
        Visit visit = new Visit(outfit, cells, immersion, first.outerMm(), first.band(), LONGEST_VISIT_S);
        int outerSide = immersion.endDown() == End.B ? 0 : 1;
        for (Leg leg : legs) {
            if (leg.outerMm() < visit.lineMm()) {
                visit.moveOff(leg.outerMm());
            }
            visit.enter(leg.band());
            double guess = volts[leg.band()][outerSide];
            double outer = levels.hold(visit, leg.outerNm(), outfit.settings().holdS(), guess);
            double inner = leg.fade() ? fades.pull(visit, leg) : outer;
            for (int finished : leg.bands()) {
                volts[finished][outerSide] = outer;
                volts[finished][1 - outerSide] = inner;
            }
        }
        visit.liftOut();
        return visit.done(notes);
    }

    List<Pull> pulls() {
        return List.copyOf(pulls);
    }

    /** What cannot be met, one for each band. */
    List<Shortfall> shortfalls() {
        Map<Integer, Shortfall> first = new LinkedHashMap<>();
        shortfalls.forEach(shortfall -> first.putIfAbsent(shortfall.band(), shortfall));
        return List.copyOf(first.values());
    }

    /** The volts held at the A and the B side of each band. */
    double[][] volts() {
        return Arrays.stream(volts).map(double[]::clone).toArray(double[][]::new);
    }

    List<BandVolts> bandVolts() {
        return Arrays.stream(volts)
                .map(sides -> new BandVolts(sides[0], sides[1]))
                .toList();
    }

    /** How far all bands together end from their films: the sum of the squares, in nm². */
    double missSquared() {
        double sum = 0;
        for (int band = 0; band < targets.size(); band++) {
            Target target = targets.get(band);
            if (!target.bare()) {
                double[] endNm = cells.sides(band);
                sum += Math.pow(endNm[0] - target.aSideNm(), 2) + Math.pow(endNm[1] - target.bSideNm(), 2);
            }
        }
        return sum;
    }

    List<Target> aims() {
        return aims;
    }

    /** The films a band had at its A and its B side when the immersion that finishes it was over. */
    double[] finishedNm(int band) {
        return finishedNm[band].clone();
    }

    /** The films a band has at its A and its B side when all is over. */
    double[] endNm(int band) {
        return cells.sides(band);
    }
}
