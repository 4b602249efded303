package tideband.window.settings;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;
import tideband.window.entry.TextSetting;

/** The title and the shape of the piece, apart from its stations. */
final class PieceSettings {
    // Line breaks and characters without a form cannot stand in a title.
    private static final Pattern UNFIT = Pattern.compile("[\\p{Cc}\\p{Cs}\\u2028\\u2029]");

    private PieceSettings() {}

    static Group of(DesignSettings make) {
        return new Group(
                "Piece",
                () -> summary(make),
                List.of(title(make), shape(make), length(make), thickness(make), bore(make)));
    }

    private static Setting title(DesignSettings make) {
        About about = new About("title", "Title", "Stands on every sheet.");
        return new TextSetting(
                about,
                Terms.ALWAYS,
                "1 to " + Limits.LONGEST_LINE + " characters",
                () -> Optional.of(make.design().title()),
                PieceSettings::wrongLine,
                text -> make.drawing().change(DesignSettings.stepName(about), d -> DesignEdits.title(d, text)));
    }

    static String wrongLine(String text) {
        int count = text.codePointCount(0, text.length());
        return text.isBlank()
                        || count > Limits.LONGEST_LINE
                        || UNFIT.matcher(text).find()
                ? "must be 1 to " + Limits.LONGEST_LINE + " characters on one line"
                        + (count > 1 ? ", but has " + count : "")
                : "";
    }

    private static Setting shape(DesignSettings make) {
        return make.choice(
                new About("shape", "Shape", "The cross-section all along the piece."),
                List.of(
                        new Choice<>(PieceShape.Kind.ROUND, "Round", "Solid; sizes are diameters."),
                        new Choice<>(PieceShape.Kind.FLAT, "Flat", "A strip of even thickness; sizes are widths."),
                        new Choice<>(PieceShape.Kind.TUBE, "Tube", "Open, wet inside too; sizes are outer diameters.")),
                Optional.empty(),
                design -> PieceShape.kindOf(design.piece()),
                kind -> PieceShape.wrong(
                        make.design(), PieceShape.ofKind(make.design().piece(), kind), make),
                (design, kind) -> DesignEdits.piece(design, PieceShape.ofKind(design.piece(), kind)));
    }

    private static Setting length(DesignSettings make) {
        return make.number(
                new About(
                        "length",
                        "Length",
                        "From end A to end B. Bands and stations are drawn out with the piece, in proportion."),
                Terms.ALWAYS,
                make.length(),
                Bounds.of(Limits.LENGTH_MM),
                design -> design.piece().lengthMm(),
                lengthMm -> PieceShape.wrongLength(make.design(), lengthMm, make),
                (design, lengthMm) -> DesignEdits.piece(design, PieceShape.ofLength(design.piece(), lengthMm)));
    }

    private static Setting thickness(DesignSettings make) {
        return make.number(
                new About("thickness", "Thickness", "Of the strip, the same all along."),
                Terms.when(() -> make.design().piece().section() instanceof Section.Flat),
                make.length(),
                Bounds.of(Limits.SIZE_MM),
                design -> ((Section.Flat) design.piece().section()).thicknessMm(),
                mm -> PieceShape.wrong(make.design(), withSection(make.design().piece(), new Section.Flat(mm)), make),
                (design, mm) -> DesignEdits.piece(design, withSection(design.piece(), new Section.Flat(mm))));
    }

    private static Setting bore(DesignSettings make) {
        return make.number(
                new About("bore", "Bore", "The inner diameter, the same all along."),
                Terms.when(() -> make.design().piece().section() instanceof Section.Tube),
                make.length(),
                Bounds.of(Limits.SIZE_MM),
                design -> ((Section.Tube) design.piece().section()).boreMm(),
                mm -> {
                    double smallestMm = PieceShape.smallestMm(make.design().piece());
                    return mm < smallestMm
                            ? ""
                            : "must be less than the smallest outer diameter, " + make.text(smallestMm);
                },
                (design, mm) -> DesignEdits.piece(design, withSection(design.piece(), new Section.Tube(mm))));
    }

    private static Piece withSection(Piece piece, Section section) {
        List<Station> stations = piece.stations();
        return new Piece(section, stations);
    }

    private static String summary(DesignSettings make) {
        String shape = switch (PieceShape.kindOf(make.design().piece())) {
            case ROUND -> "round";
            case FLAT -> "flat";
            case TUBE -> "tube";
        };
        return shape + ", " + make.text(make.design().piece().lengthMm());
    }
}
