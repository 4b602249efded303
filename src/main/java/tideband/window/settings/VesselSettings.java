package tideband.window.settings;

import java.util.List;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Vessel;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;

/** The vessel the bath stands in. */
final class VesselSettings {

    /** The vessels to choose from. */
    enum Kind {
        /** So wide that its level does not matter. */
        WIDE,
        /** Round. */
        ROUND,
        /** Rectangular. */
        RECTANGULAR
    }

    private VesselSettings() {}

    static Group of(DesignSettings make) {
        return new Group("Vessel", () -> summary(make), List.of(kind(make), bore(make), width(make), length(make)));
    }

    private static Kind kindOf(Design design) {
        return design.vessel()
                .map(vessel -> vessel instanceof Vessel.Round ? Kind.ROUND : Kind.RECTANGULAR)
                .orElse(Kind.WIDE);
    }

    private static Setting kind(DesignSettings make) {
        return make.choice(
                new About(
                        "vessel",
                        "Vessel",
                        "In a narrow vessel the level falls as the piece leaves it; the sheets then give hand travel too."),
                List.of(
                        new Choice<>(Kind.WIDE, "Wide", "So wide that its level hardly moves."),
                        new Choice<>(Kind.ROUND, "Round", "A tube or jar; starts at twice what the piece measures."),
                        new Choice<>(
                                Kind.RECTANGULAR, "Rectangular", "A tank; starts at twice what the piece measures.")),
                Optional.of(Kind.WIDE),
                VesselSettings::kindOf,
                kind -> tooNarrow(make),
                (design, kind) -> DesignEdits.vessel(design, start(design, kind)));
    }

    private static Optional<Vessel> start(Design design, Kind kind) {
        Piece piece = design.piece();
        double sizeMm = design.holding().largestWetSizeMm(piece);
        double acrossMm =
                piece.section() instanceof Section.Flat flat ? Math.hypot(sizeMm, flat.thicknessMm()) : sizeMm;
        double roomyMm = Limits.VESSEL_MM.nearest(Math.ceil(acrossMm / 5) * 10);
        return switch (kind) {
            case WIDE -> Optional.empty();
            case ROUND -> Optional.of(Vessel.round(roomyMm));
            case RECTANGULAR -> Optional.of(Vessel.rectangular(roomyMm, roomyMm));
        };
    }

    private static Setting bore(DesignSettings make) {
        return make.number(
                new About("vessel bore", "Bore", "Inner diameter of the vessel."),
                Terms.when(() -> kindOf(make.design()) == Kind.ROUND),
                make.length(),
                Bounds.of(Limits.VESSEL_MM),
                design -> ((Vessel.Round) design.vessel().orElseThrow()).boreMm(),
                mm -> wrong(make, Vessel.round(mm)),
                (design, mm) -> DesignEdits.vessel(design, Optional.of(Vessel.round(mm))));
    }

    private static Setting width(DesignSettings make) {
        return make.number(
                new About("vessel width", "Width", "Inner width of the vessel."),
                Terms.when(() -> kindOf(make.design()) == Kind.RECTANGULAR),
                make.length(),
                Bounds.of(Limits.VESSEL_MM),
                design -> rectangle(design).widthMm(),
                mm -> wrong(
                        make, Vessel.rectangular(mm, rectangle(make.design()).lengthMm())),
                (design, mm) -> DesignEdits.vessel(
                        design,
                        Optional.of(Vessel.rectangular(mm, rectangle(design).lengthMm()))));
    }

    private static Setting length(DesignSettings make) {
        return make.number(
                new About("vessel length", "Length", "Inner length of the vessel, across the width."),
                Terms.when(() -> kindOf(make.design()) == Kind.RECTANGULAR),
                make.length(),
                Bounds.of(Limits.VESSEL_MM),
                design -> rectangle(design).lengthMm(),
                mm -> wrong(make, Vessel.rectangular(rectangle(make.design()).widthMm(), mm)),
                (design, mm) -> DesignEdits.vessel(
                        design, Optional.of(Vessel.rectangular(rectangle(design).widthMm(), mm))));
    }

    private static Vessel.Rectangular rectangle(Design design) {
        return (Vessel.Rectangular) design.vessel().orElseThrow();
    }

    private static String wrong(DesignSettings make, Vessel vessel) {
        return make.design().holding().goesInto(vessel, make.design().piece()) ? "" : tooNarrow(make);
    }

    private static String tooNarrow(DesignSettings make) {
        double sizeMm = make.design().holding().largestWetSizeMm(make.design().piece());
        return "is too narrow: where the piece gets wet it is up to " + make.text(sizeMm) + " across";
    }

    private static String summary(DesignSettings make) {
        return make.design()
                .vessel()
                .map(vessel -> vessel instanceof Vessel.Round
                        ? "round, " + make.text(vessel.narrowMm())
                        : make.text(vessel.narrowMm()) + " by " + make.text(vessel.wideMm()))
                .orElse("wide");
    }
}
