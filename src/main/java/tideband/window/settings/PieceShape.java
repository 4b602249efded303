package tideband.window.settings;

import java.util.ArrayList;
import java.util.List;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.edit.DesignEdits;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;

/** Shapes a piece anew, and says why a shape cannot be. */
final class PieceShape {

    /** The cross-sections to choose from. */
    enum Kind {
        /** Solid round. */
        ROUND,
        /** Flat. */
        FLAT,
        /** An open tube. */
        TUBE
    }

    private PieceShape() {}

    static Kind kindOf(Piece piece) {
        if (piece.section() instanceof Section.Flat) {
            return Kind.FLAT;
        }
        return piece.section() instanceof Section.Tube ? Kind.TUBE : Kind.ROUND;
    }

    /** The same sizes on another cross-section; thickness and bore begin at half the smallest size. */
    static Piece ofKind(Piece piece, Kind kind) {
        double half = clean(smallestMm(piece) / 2);
        return switch (kind) {
            case ROUND -> new Piece(new Section.Round(), piece.stations());
            case FLAT -> new Piece(new Section.Flat(Limits.SIZE_MM.nearest(half)), piece.stations());
            case TUBE -> new Piece(new Section.Tube(half), piece.stations());
        };
    }

    static double smallestMm(Piece piece) {
        return piece.stations().stream().mapToDouble(Station::sizeMm).min().orElseThrow();
    }

    /** The piece drawn out to another length, its stations in proportion. */
    static Piece ofLength(Piece piece, double lengthMm) {
        List<Station> stations = new ArrayList<>();
        int last = piece.stations().size() - 1;
        for (int i = 0; i <= last; i++) {
            Station old = piece.stations().get(i);
            double atMm = i == last ? lengthMm : clean(old.atMm() * lengthMm / piece.lengthMm());
            stations.add(new Station(atMm, old.sizeMm()));
        }
        return new Piece(piece.section(), stations);
    }

    /** Why the piece cannot be drawn out to a length; empty where it can. */
    static String wrongLength(Design design, double lengthMm, DesignSettings make) {
        double leastMm = Limits.SHORTEST_BAND_MM * design.bands().size();
        if (lengthMm < leastMm) {
            return "must be at least " + make.text(leastMm) + " for "
                    + design.bands().size() + " bands of at least " + make.text(Limits.SHORTEST_BAND_MM)
                    + "; delete or join bands first";
        }
        double beforeMm = -1;
        int last = design.piece().stations().size() - 1;
        for (int i = 0; i <= last; i++) {
            double atMm = clean(design.piece().stations().get(i).atMm()
                    * lengthMm
                    / design.piece().lengthMm());
            if (!(atMm > beforeMm)) {
                return "is so short that stations would fall together; remove some first";
            }
            beforeMm = atMm;
        }
        return wrong(design, ofLength(design.piece(), lengthMm), make);
    }

    /** Why a piece that can be does not fit the design; empty where it does. */
    static String wrong(Design design, Piece piece, DesignSettings make) {
        if (piece.equals(design.piece())
                || !DesignEdits.piece(design, piece).piece().equals(design.piece())) {
            return "";
        }
        return design.vessel()
                .map(vessel -> "the piece would no longer go into the vessel, " + make.text(vessel.narrowMm())
                        + " across inside; set a larger vessel first")
                .orElse(DesignSettings.NOT_TAKEN);
    }

    static double clean(double mm) {
        return Math.rint(mm * 1e6) / 1e6;
    }
}
