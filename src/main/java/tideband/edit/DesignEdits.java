package tideband.edit;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.design.Band;
import tideband.design.BathFile;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Holding;
import tideband.design.Limits;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Range;
import tideband.design.Wanted;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Vessel;

/**
 * Edits of what surrounds the bands. Each gives a valid design; one that cannot be made as asked is made as nearly as can
 * be, and one that cannot be made at all gives the design it was given.
 */
public final class DesignEdits {

    private DesignEdits() {}

    /**
     * Gives a title.
     *
     * @param design the design
     * @param title the title; brought onto one line of at most {@link Limits#LONGEST_LINE} characters
     * @return the changed design; the same if the title is blank
     */
    public static Design title(Design design, String title) {
        String line = Line.of(title);
        if (line.isEmpty()) {
            return design;
        }
        Draft draft = new Draft(design);
        draft.title = line;
        return draft.design();
    }

    /**
     * Takes another metal. A bath is fitted for one metal, so the bath becomes the preset of the same name, or else the
     * usual one.
     *
     * @param design the design
     * @param metal the metal
     * @return the changed design
     */
    public static Design metal(Design design, Metal metal) {
        if (metal == design.metal()) {
            return design;
        }
        Draft draft = new Draft(design);
        draft.metal = metal;
        draft.bath = BathPresets.named(metal, design.bath().name()).orElseGet(() -> BathPresets.usual(metal));
        draft.bathFile = Optional.empty();
        return draft.design();
    }

    /**
     * Takes another finish.
     *
     * @param design the design
     * @param finish the finish
     * @return the changed design
     */
    public static Design finish(Design design, Finish finish) {
        Draft draft = new Draft(design);
        draft.finish = finish;
        return draft.design();
    }

    /**
     * Judges colours in another light. Colours in hexadecimal notation go on meaning what a screen shows, those in CIELAB
     * keep their values.
     *
     * @param design the design
     * @param light the light
     * @return the changed design
     */
    public static Design light(Design design, Illuminant light) {
        return seen(design, light, design.observer());
    }

    /**
     * Judges colours by another standard observer; see {@link #light}.
     *
     * @param design the design
     * @param observer the observer
     * @return the changed design
     */
    public static Design observer(Design design, Observer observer) {
        return seen(design, design.light(), observer);
    }

    private static Design seen(Design design, Illuminant light, Observer observer) {
        Viewing viewing = Viewing.of(light, observer);
        Draft draft = new Draft(design);
        draft.light = light;
        draft.observer = observer;
        draft.bands = design.bands().stream()
                .map(b -> b.wanted() instanceof Wanted.Colour colour
                        ? new Band(b.name(), b.fromMm(), b.toMm(), colour.in(viewing), b.edge())
                        : b)
                .toList();
        return draft.design();
    }

    /**
     * Shapes the piece anew. If its length changes, the bands are scaled to cover it, none below
     * {@link Limits#SHORTEST_BAND_MM}; if the dry length is then as long as the piece, it is scaled too.
     *
     * @param design the design
     * @param piece the piece
     * @return the changed design; the same if a design's file cannot hold such a piece, if it is too short for the bands, or
     *     if it does not go into the vessel
     */
    public static Design piece(Design design, Piece piece) {
        if (!allowed(piece)) {
            return design;
        }
        double lengthMm = piece.lengthMm();
        Draft draft = new Draft(design);
        draft.piece = piece;
        if (lengthMm != design.piece().lengthMm()) {
            Optional<List<Band>> bands = Layout.fitted(design.bands(), lengthMm);
            if (bands.isEmpty()) {
                return design;
            }
            draft.bands = bands.get();
            double dryMm = design.holding().dryMm();
            if (!(dryMm < lengthMm)) {
                dryMm = Layout.clean(dryMm * lengthMm / design.piece().lengthMm());
                draft.holding = new Holding(design.holding().endsDown(), Math.min(dryMm, longestDryMm(piece)));
            }
        }
        return ifItGoesIn(draft).orElse(design);
    }

    private static boolean allowed(Piece piece) {
        List<Double> sizesMm = new ArrayList<>();
        piece.stations().forEach(s -> sizesMm.add(s.sizeMm()));
        if (piece.section() instanceof Section.Flat flat) {
            sizesMm.add(flat.thicknessMm());
        } else if (piece.section() instanceof Section.Tube tube) {
            sizesMm.add(tube.boreMm());
        }
        return Limits.STATIONS.holds(piece.stations().size())
                && Limits.LENGTH_MM.holds(piece.lengthMm())
                && sizesMm.stream().allMatch(Limits.SIZE_MM::holds);
    }

    /** What is left over gets wet; a piece is at least twice as long. */
    private static double longestDryMm(Piece piece) {
        return Math.min(piece.lengthMm() - Limits.SHORTEST_BAND_MM, Limits.DRY_MM.high());
    }

    private static Optional<Design> ifItGoesIn(Draft draft) {
        boolean goesIn = draft.vessel.isEmpty() || draft.holding.goesInto(draft.vessel.get(), draft.piece);
        return goesIn ? Optional.of(draft.design()) : Optional.empty();
    }

    /**
     * Holds the piece in another way.
     *
     * @param design the design
     * @param holding the holding; its dry length is kept {@link Limits#SHORTEST_BAND_MM} below the piece's length
     * @return the changed design; the same if the piece, so held, does not go into the vessel
     */
    public static Design holding(Design design, Holding holding) {
        Draft draft = new Draft(design);
        draft.holding = holding.dryMm() < design.piece().lengthMm() && Limits.DRY_MM.holds(holding.dryMm())
                ? holding
                : new Holding(holding.endsDown(), longestDryMm(design.piece()));
        return ifItGoesIn(draft).orElse(design);
    }

    /**
     * Takes another bath.
     *
     * @param design the design
     * @param bath the bath
     * @param bathFile the plain name of the file it stands in, beside the design's; empty for a preset, and for a bath that
     *     has no file yet and gets the name of one from its own
     * @return the changed design; the same if the bath is for another metal or its name or source cannot stand in a file
     */
    public static Design bath(Design design, Bath bath, Optional<String> bathFile) {
        if (bath.metal() != design.metal() || !BathFile.canHold(bath)) {
            return design;
        }
        Draft draft = new Draft(design);
        draft.bath = bath;
        draft.bathFile = bathFile.filter(name -> Design.isBathFileName(design.metal(), name));
        return draft.design();
    }

    /**
     * Takes another supply.
     *
     * @param design the design
     * @param supply the supply; its values are brought within what a file can hold
     * @return the changed design
     */
    public static Design supply(Design design, Supply supply) {
        double maxVolts = Limits.SUPPLY_VOLTS.nearest(supply.maxVolts());
        double slew = supply.slewVoltsPerS();
        Draft draft = new Draft(design);
        draft.supply = new Supply(
                maxVolts,
                Limits.SUPPLY_AMPS.nearest(supply.maxAmps()),
                Math.min(Limits.DIAL_VOLTS.nearest(supply.dialVolts()), maxVolts),
                slew == Double.POSITIVE_INFINITY ? slew : Limits.SLEW_VOLTS_PER_S.nearest(slew));
        return draft.design();
    }

    /**
     * Takes another vessel.
     *
     * @param design the design
     * @param vessel the vessel; empty where it is so wide that it does not matter
     * @return the changed design; the same if the piece does not go into it or a file cannot hold its measures
     */
    public static Design vessel(Design design, Optional<Vessel> vessel) {
        Range allowed = Limits.VESSEL_MM;
        if (vessel.isPresent()
                && !(allowed.holds(vessel.get().narrowMm())
                        && allowed.holds(vessel.get().wideMm()))) {
            return design;
        }
        Draft draft = new Draft(design);
        draft.vessel = vessel;
        return ifItGoesIn(draft).orElse(design);
    }

    /**
     * Says anew what each act at the bench costs.
     *
     * @param design the design
     * @param bench the times
     * @return the changed design
     */
    public static Design bench(Design design, BenchTimes bench) {
        Draft draft = new Draft(design);
        draft.bench = bench;
        return draft.design();
    }

    /**
     * Takes another rule for the order of immersions.
     *
     * @param design the design
     * @param order the rule
     * @return the changed design
     */
    public static Design order(Design design, Order order) {
        return design.withOrder(order);
    }

    /**
     * Draws the piece out in another way.
     *
     * @param design the design
     * @param pull the settings; the slowest speed is brought within what a file can hold
     * @return the changed design; the same if no speed is left between slowest and fastest
     */
    public static Design pull(Design design, PullSettings pull) {
        double slowest = Limits.HAND_MM_PER_S.nearest(pull.slowestMmPerS());
        if (!(slowest < pull.fastestMmPerS())) {
            return design;
        }
        Draft draft = new Draft(design);
        draft.pull = new PullSettings(pull.holdS(), pull.fade(), pull.stepDe00(), slowest, pull.fastestMmPerS());
        return draft.design();
    }
}
