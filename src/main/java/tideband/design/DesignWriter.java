package tideband.design;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.colour.Lab;
import tideband.colour.Viewing;
import tideband.design.JsonWriter.Inline;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Vessel;

/** Writes a design so that reading gives an equal one. Defaults are written too, as a later version may have others. */
final class DesignWriter {

    /** So many stations are still read at a glance side by side. */
    private static final int STATIONS_ON_A_LINE = 4;

    private final Design design;

    DesignWriter(Design design) {
        this.design = design;
    }

    byte[] bytes() {
        JsonWriter json = new JsonWriter()
                .line(new Inline()
                        .text("format", "tideband-design")
                        .number("version", Members.VERSION)
                        .text("title", design.title()))
                .line(new Inline()
                        .text("metal", design.metal().key())
                        .text("finish", design.finish().key())
                        .text("light", design.light().key())
                        .number("observer", design.observer().key()));
        json.line(new Inline().object("piece", piece()));
        design.vessel().ifPresent(vessel -> json.line(new Inline().object("vessel", vessel(vessel))));
        json.line(new Inline()
                        .object(
                                "holding",
                                new Inline()
                                        .texts(
                                                "ends_down",
                                                design.holding().endsDown().stream()
                                                        .map(End::name)
                                                        .toList())
                                        .number("dry_mm", design.holding().dryMm())))
                .line(new Inline().rows("bands", bands()))
                .line(new Inline()
                        .text("bath", design.bathFile().orElse(design.bath().name())))
                .line(new Inline().object("supply", supply(design.supply())))
                .line(new Inline().object("bench", bench()))
                .line(new Inline().object("pull", pull(design.pull())));
        return json.bytes();
    }

    private Inline piece() {
        Piece piece = design.piece();
        Inline json = new Inline();
        if (piece.section() instanceof Section.Flat flat) {
            json.text("shape", "flat").number("thickness_mm", flat.thicknessMm());
        } else if (piece.section() instanceof Section.Tube tube) {
            json.text("shape", "tube").number("bore_mm", tube.boreMm());
        } else {
            json.text("shape", "round");
        }
        List<Inline> stations = piece.stations().stream()
                .map(s -> new Inline().number("at_mm", s.atMm()).number("size_mm", s.sizeMm()))
                .toList();
        return stations.size() <= STATIONS_ON_A_LINE
                ? json.objects("stations", stations)
                : json.rows("stations", stations);
    }

    private static Inline vessel(Vessel vessel) {
        Inline json = new Inline();
        if (vessel instanceof Vessel.Rectangular box) {
            return json.number("width_mm", box.widthMm()).number("length_mm", box.lengthMm());
        }
        return json.number("bore_mm", vessel.narrowMm());
    }

    private List<Inline> bands() {
        Optional<Viewing> viewing = design.bands().stream().anyMatch(b -> b.wanted() instanceof Wanted.Colour)
                ? Optional.of(Viewing.of(design.light(), design.observer()))
                : Optional.empty();
        List<Inline> bands = new ArrayList<>();
        for (Band band : design.bands()) {
            Inline json = new Inline().text("name", band.name()).number("to_mm", band.toMm());
            if (band.wanted() instanceof Wanted.Film film) {
                if (film.aSideNm() == film.bSideNm()) {
                    json.number("film_nm", film.aSideNm());
                } else {
                    json.numbers("film_nm", film.aSideNm(), film.bSideNm());
                }
            } else if (band.wanted() instanceof Wanted.Volts volts) {
                json.number("volts", volts.volts());
            } else if (band.wanted() instanceof Wanted.Colour colour) {
                colour(json, colour, viewing.orElseThrow());
            } else {
                json.yes("bare");
            }
            bands.add(json.text("edge", band.edge().key()));
        }
        return bands;
    }

    private static void colour(Inline json, Wanted.Colour colour, Viewing viewing) {
        // What counts is the colour; its text stands for it only where it means the same in this light.
        if (Wanted.Colour.isHex(colour.text()) && colour.in(viewing).equals(colour)) {
            json.text("colour", colour.text());
        } else {
            Lab lab = colour.lab();
            json.object("colour", new Inline().numbers("lab", lab.lightness(), lab.a(), lab.b()));
        }
        colour.order().ifPresent(order -> json.number("order", order));
    }

    private static Inline supply(Supply supply) {
        Inline json = new Inline()
                .number("max_volts", supply.maxVolts())
                .number("max_amps", supply.maxAmps())
                .number("dial_volts", supply.dialVolts());
        return Double.isInfinite(supply.slewVoltsPerS())
                ? json
                : json.number("slew_volts_per_s", supply.slewVoltsPerS());
    }

    private Inline bench() {
        BenchTimes times = design.bench();
        return new Inline()
                .number("immersion_min", times.immersionMin())
                .number("mask_min", times.maskMin())
                .number("mask_over_min", times.maskOverMin())
                .number("strip_min", times.stripMin())
                .number("turn_min", times.turnMin())
                .number("hold_s", design.pull().holdS())
                .text("order", design.order().key());
    }

    private static Inline pull(PullSettings pull) {
        return new Inline()
                .text("fade", pull.fade().key())
                .number("step_dE00", pull.stepDe00())
                .number("slowest_mm_s", pull.slowestMmPerS())
                .number("fastest_mm_s", pull.fastestMmPerS());
    }
}
