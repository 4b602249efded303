package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import tideband.colour.Lab;
import tideband.colour.Viewing;

/** Reads the bands of a design. */
final class BandsReader {

    private static final double LEEWAY_MM = 1e-6;

    private static final List<String> WANTED_KEYS = List.of("film_nm", "volts", "colour", "bare");

    private final Faults faults;
    private final Viewing viewing;

    BandsReader(Faults faults, Viewing viewing) {
        this.viewing = viewing;
        this.faults = faults;
    }

    /** The bands; of account only when no fault was found. */
    List<Band> bands(Members design, OptionalDouble lengthMm) {
        List<JsonNode> elements = design.array("bands", 1, Limits.MOST_BANDS).orElse(List.of());
        List<Band> bands = new ArrayList<>();
        Map<String, String> pointerOfName = new HashMap<>();
        double fromMm = 0;
        for (int i = 0; i < elements.size(); i++) {
            String at = design.pointer("bands") + "/" + i;
            List<String> known = List.of("name", "to_mm", "film_nm", "volts", "colour", "order", "bare", "edge");
            Optional<Members> found = Members.of(elements.get(i), at, faults, known);
            if (found.isEmpty()) {
                continue;
            }
            Members band = found.get();
            band.require("to_mm");
            String name = band.line("name").orElse("band " + (i + 1));
            String earlier = pointerOfName.putIfAbsent(name, at);
            if (earlier != null) {
                band.fault(
                        "name",
                        "is " + Shown.quoted(name) + ", the name of " + earlier + " too",
                        "give every band a name of its own");
            }
            OptionalDouble givenMm = band.number("to_mm", Limits.AT_MM);
            boolean last = i == elements.size() - 1;
            double toMm = givenMm.isPresent() ? toMm(band, givenMm.getAsDouble(), fromMm, lengthMm, last) : fromMm;
            Optional<Wanted> wanted = wanted(band, at);
            Edge edge = band.word("edge", List.of(Edge.values()), Edge::key).orElse(Edge.SOFT);
            if (wanted.isPresent() && toMm > fromMm) {
                bands.add(new Band(name, fromMm, toMm, wanted.get(), edge));
            }
            fromMm = Math.max(fromMm, toMm);
        }
        return bands;
    }

    private static double toMm(Members band, double toMm, double fromMm, OptionalDouble lengthMm, boolean last) {
        if (toMm - fromMm < Limits.SHORTEST_BAND_MM - LEEWAY_MM) {
            band.fault(
                    "to_mm",
                    "is " + Shown.number(toMm),
                    "bands run from end A to end B and are at least 0.5 mm long, so it must be at least "
                            + Shown.number(fromMm + Limits.SHORTEST_BAND_MM));
        }
        if (last && lengthMm.isPresent()) {
            if (!(Math.abs(toMm - lengthMm.getAsDouble()) <= LEEWAY_MM)) {
                String length = Shown.number(lengthMm.getAsDouble());
                band.fault(
                        "to_mm", "is " + Shown.number(toMm), "the last band must end at the piece's length, " + length);
            }
            return lengthMm.getAsDouble();
        }
        if (lengthMm.isPresent() && toMm >= lengthMm.getAsDouble()) {
            String length = Shown.number(lengthMm.getAsDouble());
            band.fault(
                    "to_mm", "is " + Shown.number(toMm), "only the last band may reach the piece's length, " + length);
        }
        return toMm;
    }

    private Optional<Wanted> wanted(Members band, String at) {
        List<String> given = WANTED_KEYS.stream().filter(band::has).toList();
        Optional<Wanted> film = band.has("film_nm") ? film(band) : Optional.empty();
        Optional<Wanted> volts = volts(band);
        OptionalInt order = band.whole("order", (int) Limits.ORDER.low(), (int) Limits.ORDER.high());
        Optional<Wanted> colour = band.has("colour") ? colour(band, order) : Optional.empty();
        Optional<Wanted> bare = bare(band);
        if (band.has("order") && !band.has("colour")) {
            band.fault("order", "does not belong here", "only a colour is wanted in an order");
        }
        if (given.size() != 1) {
            faults.add(
                    at,
                    given.isEmpty()
                            ? "does not say what it is to be"
                            : "says what it is to be by " + Shown.quoted(given),
                    "give exactly one of " + Shown.quoted(WANTED_KEYS));
            return Optional.empty();
        }
        return film.or(() -> volts).or(() -> colour).or(() -> bare);
    }

    private Optional<Wanted> film(Members band) {
        JsonNode node = band.value("film_nm").orElseThrow();
        String at = band.pointer("film_nm");
        if (!node.isArray()) {
            OptionalDouble nm = filmNm(band, node, at);
            return nm.isPresent() ? Optional.of(new Wanted.Film(nm.getAsDouble(), nm.getAsDouble())) : Optional.empty();
        }
        Optional<List<JsonNode>> sides = band.array(node, at, 2, 2);
        if (sides.isEmpty()) {
            return Optional.empty();
        }
        OptionalDouble aSide = filmNm(band, sides.get().get(0), at + "/0");
        OptionalDouble bSide = filmNm(band, sides.get().get(1), at + "/1");
        return aSide.isPresent() && bSide.isPresent()
                ? Optional.of(new Wanted.Film(aSide.getAsDouble(), bSide.getAsDouble()))
                : Optional.empty();
    }

    private OptionalDouble filmNm(Members band, JsonNode node, String at) {
        if (node.isNumber() && node.doubleValue() == 0) {
            faults.add(at, "is 0", "say \"bare\": true for natural metal; a film is a number from 1 to 2000");
            return OptionalDouble.empty();
        }
        return band.number(node, at, Limits.FILM_NM);
    }

    private static Optional<Wanted> volts(Members band) {
        OptionalDouble volts = band.number("volts", Limits.BAND_VOLTS);
        return volts.isPresent() ? Optional.of(new Wanted.Volts(volts.getAsDouble())) : Optional.empty();
    }

    private static Optional<Wanted> bare(Members band) {
        Optional<JsonNode> bare = band.value("bare");
        if (bare.isEmpty()) {
            return Optional.empty();
        }
        if (!(bare.get().isBoolean() && bare.get().booleanValue())) {
            band.fault("bare", "is " + Members.kind(bare.get()), "it must be true, or left out");
            return Optional.empty();
        }
        return Optional.of(new Wanted.Bare());
    }

    private Optional<Wanted> colour(Members band, OptionalInt order) {
        JsonNode node = band.value("colour").orElseThrow();
        if (node.isTextual() && Wanted.Colour.isHex(node.textValue())) {
            return Optional.of(Wanted.Colour.ofHex(node.textValue(), viewing, order));
        }
        if (!node.isObject()) {
            band.fault(
                    "colour",
                    "is " + Members.kind(node),
                    "it must be \"#rrggbb\" in hexadecimal, or {\"lab\": [L, a, b]}");
            return Optional.empty();
        }
        Members colour =
                Members.of(node, band.pointer("colour"), faults, List.of("lab")).orElseThrow();
        colour.require("lab");
        Optional<List<JsonNode>> lab = colour.array("lab", 3, 3);
        if (lab.isEmpty()) {
            return Optional.empty();
        }
        String at = colour.pointer("lab");
        OptionalDouble l = colour.number(lab.get().get(0), at + "/0", Limits.LIGHTNESS);
        OptionalDouble a = colour.number(lab.get().get(1), at + "/1", Limits.CHROMATIC);
        OptionalDouble b = colour.number(lab.get().get(2), at + "/2", Limits.CHROMATIC);
        if (l.isEmpty() || a.isEmpty() || b.isEmpty()) {
            return Optional.empty();
        }
        Lab value = new Lab(l.getAsDouble(), a.getAsDouble(), b.getAsDouble());
        return Optional.of(Wanted.Colour.ofLab(value, order));
    }
}
