package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;

/** Reads the piece and the vessel of a design. */
final class PieceReader {

    private enum Shape {
        ROUND("round"),
        FLAT("flat"),
        TUBE("tube");

        private final String key;

        Shape(String key) {
            this.key = key;
        }

        private String key() {
            return key;
        }
    }

    private final Faults faults;

    PieceReader(Faults faults) {
        this.faults = faults;
    }

    Optional<Piece> piece(Members design) {
        Optional<Members> found = design.object("piece", List.of("shape", "stations", "thickness_mm", "bore_mm"));
        if (found.isEmpty()) {
            return Optional.empty();
        }
        Members piece = found.get();
        piece.require("shape", "stations");
        Optional<Section> section = section(piece);
        Optional<List<Station>> stations = stations(piece);
        if (section.isEmpty() || stations.isEmpty()) {
            return Optional.empty();
        }
        if (section.get() instanceof Section.Tube tube) {
            for (int i = 0; i < stations.get().size(); i++) {
                double sizeMm = stations.get().get(i).sizeMm();
                if (sizeMm <= tube.boreMm()) {
                    faults.add(
                            piece.pointer("stations") + "/" + i + "/size_mm",
                            "is " + Shown.number(sizeMm) + ", no larger than the bore",
                            "it must be larger than the bore of " + Shown.number(tube.boreMm()) + " mm");
                    return Optional.empty();
                }
            }
        }
        return Optional.of(new Piece(section.get(), stations.get()));
    }

    private Optional<Section> section(Members piece) {
        Optional<Shape> shape = piece.word("shape", List.of(Shape.values()), Shape::key);
        OptionalDouble thicknessMm = piece.number("thickness_mm", Limits.SIZE_MM);
        OptionalDouble boreMm = piece.number("bore_mm", Limits.SIZE_MM);
        if (shape.isEmpty()) {
            return Optional.empty();
        }
        if (shape.get() != Shape.FLAT && piece.has("thickness_mm")) {
            piece.fault("thickness_mm", "does not belong here", "only a flat piece has a thickness");
        }
        if (shape.get() != Shape.TUBE && piece.has("bore_mm")) {
            piece.fault("bore_mm", "does not belong here", "only a tube has a bore");
        }
        return switch (shape.get()) {
            case ROUND -> Optional.of(new Section.Round());
            case FLAT -> {
                piece.require("thickness_mm");
                yield thicknessMm.isPresent()
                        ? Optional.of(new Section.Flat(thicknessMm.getAsDouble()))
                        : Optional.empty();
            }
            case TUBE -> {
                piece.require("bore_mm");
                yield boreMm.isPresent() ? Optional.of(new Section.Tube(boreMm.getAsDouble())) : Optional.empty();
            }
        };
    }

    private Optional<List<Station>> stations(Members piece) {
        Optional<List<JsonNode>> elements =
                piece.array("stations", (int) Limits.STATIONS.low(), (int) Limits.STATIONS.high());
        if (elements.isEmpty()) {
            return Optional.empty();
        }
        List<Station> stations = new ArrayList<>();
        double beforeMm = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < elements.get().size(); i++) {
            String at = piece.pointer("stations") + "/" + i;
            Optional<Members> found = Members.of(elements.get().get(i), at, faults, List.of("at_mm", "size_mm"));
            if (found.isEmpty()) {
                continue;
            }
            Members station = found.get();
            station.require("at_mm", "size_mm");
            OptionalDouble atMm = station.number("at_mm", Limits.AT_MM);
            OptionalDouble sizeMm = station.number("size_mm", Limits.SIZE_MM);
            if (atMm.isPresent()) {
                boolean fits = checkPosition(station, i, beforeMm, atMm.getAsDouble());
                beforeMm = atMm.getAsDouble();
                if (fits && sizeMm.isPresent()) {
                    stations.add(new Station(atMm.getAsDouble(), sizeMm.getAsDouble()));
                }
            }
        }
        if (stations.size() < elements.get().size()) {
            return Optional.empty();
        }
        double lengthMm = stations.get(stations.size() - 1).atMm();
        if (lengthMm < Limits.LENGTH_MM.low()) {
            faults.add(
                    piece.pointer("stations") + "/" + (stations.size() - 1) + "/at_mm",
                    "makes the piece " + Shown.number(lengthMm) + " mm long",
                    "a piece must be at least 1 mm long");
            return Optional.empty();
        }
        return Optional.of(stations);
    }

    private static boolean checkPosition(Members station, int index, double beforeMm, double atMm) {
        if (index == 0 && atMm != 0) {
            station.fault("at_mm", "is " + Shown.number(atMm), "the first station must be at 0, end A");
            return false;
        }
        if (!(atMm > beforeMm)) {
            station.fault(
                    "at_mm",
                    "is " + Shown.number(atMm),
                    "stations run from end A to end B, so it must be above " + Shown.number(beforeMm)
                            + ", where the one before is");
            return false;
        }
        return true;
    }

    /** The vessel; whether the piece goes into it is looked at where both are sound. */
    Optional<Vessel> vessel(Members design, Optional<Piece> piece, Holding holding) {
        Optional<Members> found = design.object("vessel", List.of("bore_mm", "width_mm", "length_mm"));
        if (found.isEmpty()) {
            return Optional.empty();
        }
        Members vessel = found.get();
        OptionalDouble boreMm = vessel.number("bore_mm", Limits.VESSEL_MM);
        OptionalDouble widthMm = vessel.number("width_mm", Limits.VESSEL_MM);
        OptionalDouble lengthMm = vessel.number("length_mm", Limits.VESSEL_MM);
        boolean rectangular = vessel.has("width_mm") || vessel.has("length_mm");
        if (vessel.has("bore_mm") == rectangular) {
            faults.add(
                    design.pointer("vessel"),
                    rectangular ? "is both round and rectangular" : "has no size",
                    "give either \"bore_mm\", or \"width_mm\" and \"length_mm\"");
            return Optional.empty();
        }
        Optional<Vessel> made = Optional.empty();
        if (rectangular) {
            vessel.require("width_mm", "length_mm");
            if (widthMm.isPresent() && lengthMm.isPresent()) {
                made = Optional.of(Vessel.rectangular(widthMm.getAsDouble(), lengthMm.getAsDouble()));
            }
        } else if (boreMm.isPresent()) {
            made = Optional.of(Vessel.round(boreMm.getAsDouble()));
        }
        if (made.isPresent()
                && piece.isPresent()
                && holding.dryMm() < piece.get().lengthMm()
                && !holding.goesInto(made.get(), piece.get())) {
            faults.add(
                    design.pointer("vessel"),
                    "is too narrow: where the piece gets wet it is up to "
                            + Shown.number(holding.largestWetSizeMm(piece.get())) + " mm across",
                    "take a larger vessel; sizes are measured inside");
        }
        return made;
    }
}
