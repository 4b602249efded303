package tideband.design;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.optics.Finish;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Vessel;

/** Turns the JSON tree of a design into a design, or into its faults. */
final class DesignReader {

    static final String FORMAT = "tideband-design";

    private final Faults faults;
    private final BathChoice baths;

    DesignReader(Faults faults, BathChoice baths) {
        this.faults = faults;
        this.baths = baths;
    }

    Reading<Design> read(JsonNode root) {
        if (Members.isOther(
                root,
                BathFile.FORMAT,
                faults,
                "this is a bath, not a design",
                "open a design; to use this bath, put its file beside the design and give the file's name under"
                        + " \"bath\" there")) {
            return new Reading.Faulty<>(faults.list());
        }
        List<String> known = List.of(
                "format",
                "version",
                "title",
                "metal",
                "finish",
                "light",
                "observer",
                "piece",
                "vessel",
                "holding",
                "bands",
                "bath",
                "supply",
                "bench",
                "pull");
        Optional<Members> found = Members.of(root, "", faults, known);
        if (found.isEmpty()) {
            return new Reading.Faulty<>(faults.list());
        }
        Members design = found.get();
        design.require("format", "version", "title", "metal", "piece", "bands");
        design.checkFormat(FORMAT);
        Optional<String> title = design.line("title");
        Optional<Metal> metal = design.word("metal", List.of(Metal.values()), Metal::key);
        Finish finish =
                design.word("finish", List.of(Finish.values()), Finish::key).orElse(Finish.POLISHED);
        Illuminant light = design.word("light", List.of(Illuminant.values()), Illuminant::key)
                .orElse(Illuminant.D65);
        Observer observer = observer(design);
        PieceReader pieceReader = new PieceReader(faults);
        Optional<Piece> piece = pieceReader.piece(design);
        Holding holding = holding(design, piece);
        Optional<Vessel> vessel = pieceReader.vessel(design, piece, holding);
        OptionalDouble lengthMm =
                piece.isPresent() ? OptionalDouble.of(piece.get().lengthMm()) : OptionalDouble.empty();
        List<Band> bands = new BandsReader(faults, Viewing.of(light, observer)).bands(design, lengthMm);
        Optional<BathChoice.Chosen> bath = metal.flatMap(m -> baths.bath(design, m));
        Supply supply = supply(design);
        Optional<Members> bench = design.object(
                "bench",
                List.of("immersion_min", "mask_min", "mask_over_min", "strip_min", "turn_min", "hold_s", "order"));
        BenchTimes times = bench.map(DesignReader::times).orElse(BenchTimes.USUAL);
        Order order = bench.flatMap(b -> b.word("order", List.of(Order.values()), Order::key))
                .orElse(Order.THICKER_FIRST);
        PullSettings pull = pull(design, bench);
        return faults.orElse(() -> new Design(
                title.orElseThrow(),
                metal.orElseThrow(),
                finish,
                light,
                observer,
                piece.orElseThrow(),
                holding,
                bands,
                bath.orElseThrow().bath(),
                bath.orElseThrow().file(),
                supply,
                vessel,
                times,
                order,
                pull));
    }

    private static Observer observer(Members design) {
        Optional<JsonNode> degrees = design.value("observer");
        if (degrees.isEmpty()) {
            return Observer.CIE_1931_2_DEGREE;
        }
        for (Observer observer : Observer.values()) {
            if (degrees.get().isNumber() && observer.key() == degrees.get().doubleValue()) {
                return observer;
            }
        }
        design.fault("observer", "is " + Members.kind(degrees.get()), "it must be 2 or 10, in degrees");
        return Observer.CIE_1931_2_DEGREE;
    }

    private Holding holding(Members design, Optional<Piece> piece) {
        Optional<Members> found = design.object("holding", List.of("ends_down", "dry_mm"));
        Set<End> ends = found.map(this::endsDown).orElse(Holding.USUAL.endsDown());
        double dryMm = found.isPresent()
                ? found.get().number("dry_mm", Limits.DRY_MM).orElse(Holding.USUAL.dryMm())
                : Holding.USUAL.dryMm();
        if (piece.isPresent() && !(dryMm < piece.get().lengthMm())) {
            faults.add(
                    design.pointer("holding") + "/dry_mm",
                    "is " + Shown.number(dryMm)
                            + (found.isPresent() && found.get().has("dry_mm") ? "" : " by default"),
                    "it must be less than the piece's length, "
                            + Shown.number(piece.get().lengthMm()) + ", for anything to get wet");
        }
        return new Holding(ends, dryMm);
    }

    private Set<End> endsDown(Members holding) {
        EnumSet<End> ends = EnumSet.noneOf(End.class);
        List<JsonNode> elements = holding.array("ends_down", 1, 2).orElse(List.of());
        for (int i = 0; i < elements.size(); i++) {
            String at = holding.pointer("ends_down") + "/" + i;
            Optional<End> end = holding.word(elements.get(i), at, List.of(End.values()), End::name);
            if (end.isPresent() && !ends.add(end.get())) {
                faults.add(at, "is given more than once", "name each end once");
            }
        }
        return ends.isEmpty() ? Holding.USUAL.endsDown() : ends;
    }

    private Supply supply(Members design) {
        Optional<Members> found =
                design.object("supply", List.of("max_volts", "max_amps", "dial_volts", "slew_volts_per_s"));
        if (found.isEmpty()) {
            return Supply.USUAL;
        }
        Members supply = found.get();
        double maxVolts = supply.number("max_volts", Limits.SUPPLY_VOLTS).orElse(Supply.USUAL.maxVolts());
        double dialVolts = supply.number("dial_volts", Limits.DIAL_VOLTS).orElse(Supply.USUAL.dialVolts());
        if (dialVolts > maxVolts) {
            supply.fault(
                    "dial_volts",
                    "is " + Shown.number(dialVolts),
                    "a step of the dial must not be above the highest volts, " + Shown.number(maxVolts));
        }
        return new Supply(
                maxVolts,
                supply.number("max_amps", Limits.SUPPLY_AMPS).orElse(Supply.USUAL.maxAmps()),
                dialVolts,
                supply.number("slew_volts_per_s", Limits.SLEW_VOLTS_PER_S).orElse(Supply.USUAL.slewVoltsPerS()));
    }

    private static BenchTimes times(Members bench) {
        return new BenchTimes(
                bench.number("immersion_min", Limits.BENCH_MIN).orElse(BenchTimes.USUAL.immersionMin()),
                bench.number("mask_min", Limits.BENCH_MIN).orElse(BenchTimes.USUAL.maskMin()),
                bench.number("mask_over_min", Limits.BENCH_MIN).orElse(BenchTimes.USUAL.maskOverMin()),
                bench.number("strip_min", Limits.BENCH_MIN).orElse(BenchTimes.USUAL.stripMin()),
                bench.number("turn_min", Limits.BENCH_MIN).orElse(BenchTimes.USUAL.turnMin()));
    }

    private static PullSettings pull(Members design, Optional<Members> bench) {
        PullSettings usual = PullSettings.USUAL;
        double holdS =
                bench.isPresent() ? bench.get().number("hold_s", Limits.HOLD_S).orElse(usual.holdS()) : usual.holdS();
        Optional<Members> found = design.object("pull", List.of("fade", "step_dE00", "slowest_mm_s", "fastest_mm_s"));
        if (found.isEmpty()) {
            return new PullSettings(
                    holdS, usual.fade(), usual.stepDe00(), usual.slowestMmPerS(), usual.fastestMmPerS());
        }
        Members pull = found.get();
        FadeStyle fade =
                pull.word("fade", List.of(FadeStyle.values()), FadeStyle::key).orElse(usual.fade());
        double stepDe00 = pull.number("step_dE00", Limits.STEP_DE00).orElse(usual.stepDe00());
        double slowestMmPerS = pull.number("slowest_mm_s", Limits.HAND_MM_PER_S).orElse(usual.slowestMmPerS());
        double fastestMmPerS = pull.number("fastest_mm_s", Limits.HAND_MM_PER_S).orElse(usual.fastestMmPerS());
        if (!(slowestMmPerS < fastestMmPerS)) {
            String key = pull.has("slowest_mm_s") ? "slowest_mm_s" : "fastest_mm_s";
            pull.fault(
                    key,
                    "makes the slowest speed " + Shown.number(slowestMmPerS) + " and the fastest "
                            + Shown.number(fastestMmPerS),
                    "the slowest must be below the fastest");
            return usual;
        }
        return new PullSettings(holdS, fade, stepDe00, slowestMmPerS, fastestMmPerS);
    }
}
