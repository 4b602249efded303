package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.DrawnFilm;
import tideband.design.Band;
import tideband.design.Design;
import tideband.piece.End;
import tideband.piece.Station;
import tideband.window.comfort.LengthUnit;

/** Leads a hand to places and films that mean something, and else to round numbers. */
final class Snapping {
    /** From this scale on, steps along the piece are fine ones. */
    private static final double FINE_PX_PER_MM = 8;

    private Snapping() {}

    /** The step along the piece that a hand can tell apart at this scale, in mm. */
    static double stepMm(LengthUnit unit, double pxPerMm) {
        boolean fine = pxPerMm >= FINE_PX_PER_MM;
        return switch (unit) {
            case MILLIMETRE -> fine ? 0.5 : 1;
            case INCH -> unit.inMm() * (fine ? 0.05 : 1.0 / 16);
        };
    }

    /** Leads an edge. */
    static Snap edge(Design design, int edge, double toMm, double reachMm, double stepMm, LengthUnit unit) {
        List<Snap> targets = new ArrayList<>();
        double lengthMm = design.piece().lengthMm();
        for (Station station : design.piece().stations()) {
            if (station.atMm() > 0 && station.atMm() < lengthMm) {
                targets.add(new Snap(station.atMm(), "the station at " + unit.text(station.atMm())));
            }
        }
        double dryMm = design.holding().dryMm();
        if (dryMm > 0) {
            for (End down : design.holding().endsDown()) {
                targets.add(
                        new Snap(design.piece().fromEnd(down.other(), dryMm), "the dry length at end " + down.other()));
            }
        }
        targets.add(new Snap(0, "end A"));
        targets.add(new Snap(lengthMm, "end B"));
        List<Band> bands = design.bands();
        for (int i = 0; i < bands.size() - 1; i++) {
            if (i != edge) {
                double atMm = bands.get(i).toMm();
                targets.add(new Snap(atMm, "the edge of " + bands.get(i).name()));
                targets.add(new Snap(lengthMm - atMm, "the mirror of the edge at " + unit.text(atMm)));
            }
        }
        targets.add(new Snap(
                (bands.get(edge).fromMm() + bands.get(edge + 1).toMm()) / 2, "halfway between its neighbours"));
        return nearest(targets, toMm, reachMm, stepMm);
    }

    /**
     * Leads a film.
     *
     * @param side the side that is led; null where a level band moves as a whole
     * @param alone whether the other side stays where it is
     */
    static Snap film(
            Design design,
            List<DrawnFilm> films,
            int band,
            End side,
            boolean alone,
            double toNm,
            double reachNm,
            double ceilingNm) {
        List<Snap> targets = new ArrayList<>();
        if (band > 0 && side != End.B && !films.get(band - 1).bare()) {
            targets.add(new Snap(
                    films.get(band - 1).bSideNm(),
                    "the film of " + design.bands().get(band - 1).name()));
        }
        if (band < films.size() - 1 && side != End.A && !films.get(band + 1).bare()) {
            targets.add(new Snap(
                    films.get(band + 1).aSideNm(),
                    "the film of " + design.bands().get(band + 1).name()));
        }
        if (alone) {
            DrawnFilm own = films.get(band);
            targets.add(new Snap(side == End.A ? own.bSideNm() : own.aSideNm(), "its other side: a level band"));
        }
        targets.add(new Snap(Math.floor(ceilingNm * 100) / 100, "the most that bath and supply give"));
        return nearest(targets, toNm, reachNm, 1);
    }

    private static Snap nearest(List<Snap> targets, double to, double reach, double step) {
        Snap best = new Snap(Math.rint(to / step) * step, "");
        double bestAway = reach;
        for (Snap target : targets) {
            double away = Math.abs(target.value() - to);
            if (away < bestAway) {
                best = target;
                bestAway = away;
            }
        }
        return best;
    }
}
