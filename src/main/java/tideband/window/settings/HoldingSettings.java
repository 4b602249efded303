package tideband.window.settings;

import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import tideband.design.Holding;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.piece.End;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;

/** How the piece is held. */
final class HoldingSettings {
    private static final String NOT_INTO_VESSEL =
            "so held, the piece does not go into the vessel; set a larger vessel first";

    private HoldingSettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Holder",
                () -> make.text(make.design().holding().dryMm()) + " dry",
                List.of(endsDown(make), dry(make)));
    }

    private static Setting endsDown(DesignSettings make) {
        return make.<Set<End>>choice(
                new About(
                        "ends down",
                        "Ends down",
                        "Which ends may go down into the bath. Turning the piece costs minutes."),
                List.of(
                        new Choice<>(
                                EnumSet.allOf(End.class), "A or B", "Either end, whichever makes the better plan."),
                        new Choice<>(EnumSet.of(End.A), "A only", "The holder sits at end B and stays there."),
                        new Choice<>(EnumSet.of(End.B), "B only", "The holder sits at end A and stays there.")),
                Optional.of(Holding.USUAL.endsDown()),
                design -> design.holding().endsDown(),
                ends -> NOT_INTO_VESSEL,
                (design, ends) -> DesignEdits.holding(
                        design, new Holding(ends, design.holding().dryMm())));
    }

    private static Setting dry(DesignSettings make) {
        return make.number(
                new About(
                        "dry length",
                        "Dry length",
                        "What must stay dry under the holder, measured from the end that is up. Bands in it are finished with"
                                + " the other end down, or not at all."),
                Terms.ALWAYS,
                make.length(),
                Bounds.of(Limits.DRY_MM, Holding.USUAL.dryMm()),
                design -> design.holding().dryMm(),
                dryMm -> wrong(make, dryMm),
                (design, dryMm) ->
                        DesignEdits.holding(design, new Holding(design.holding().endsDown(), dryMm)));
    }

    private static String wrong(DesignSettings make, double dryMm) {
        double lengthMm = make.design().piece().lengthMm();
        if (!(dryMm < lengthMm)) {
            return "must be less than the piece's length, " + make.text(lengthMm) + ", for anything to get wet";
        }
        Holding holding = new Holding(make.design().holding().endsDown(), dryMm);
        boolean goesIn = make.design()
                .vessel()
                .map(vessel -> holding.goesInto(vessel, make.design().piece()))
                .orElse(true);
        return goesIn ? "" : NOT_INTO_VESSEL;
    }
}
