package tideband.edit;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.DesignsByLot;
import tideband.design.Edge;
import tideband.design.FadeStyle;
import tideband.design.Holding;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Wanted;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;

/** Every edit there is, drawn by lot, with sound and with impossible wishes. */
final class EditsByLot {
    private final Random random;
    private final DesignsByLot lot;

    EditsByLot(long seed) {
        random = new Random(seed);
        lot = new DesignsByLot(seed);
    }

    /** A design to begin with. */
    Design design() {
        return lot.design();
    }

    /** The design after one edit or other. */
    Design edited(Design design) {
        return random.nextInt(3) > 0 ? bandsEdited(design) : surroundingsEdited(design);
    }

    private Design bandsEdited(Design design) {
        int count = design.bands().size();
        int band = random.nextInt(count);
        int other = band + random.nextInt(count - band);
        List<Integer> some = some(count);
        double atMm = lot.number(-10, design.piece().lengthMm() + 10);
        return switch (random.nextInt(13)) {
            case 0 -> count > 1 ? BandEdits.moveEdge(design, random.nextInt(count - 1), atMm) : design;
            case 1 -> count > 1 ? BandEdits.moveEdgeAndFollowing(design, random.nextInt(count - 1), atMm) : design;
            case 2 -> BandEdits.want(design, some, wanted(design));
            case 3 -> BandEdits.want(design, some, BandEdits.film(lot.number(-5, 3000), lot.number(-5, 3000)));
            case 4 -> BandEdits.setEdge(design, some, lot.pick(List.of(Edge.values())));
            case 5 -> BandEdits.rename(design, band, name());
            case 6, 7 -> BandEdits.split(design, band, atMm);
            case 8 -> BandEdits.join(design, band, other);
            case 9 -> BandEdits.insert(design, band, wanted(design));
            case 10 -> BandEdits.duplicate(design, band, other);
            case 11 -> BandEdits.mirror(design);
            default -> BandEdits.delete(design, some);
        };
    }

    private List<Integer> some(int count) {
        List<Integer> some = new ArrayList<>();
        for (int i = 0; i < count; i++) {
            if (random.nextInt(3) == 0) {
                some.add(i);
            }
        }
        return some;
    }

    private Wanted wanted(Design design) {
        return switch (random.nextInt(6)) {
            case 0 -> new Wanted.Volts(lot.number(0.001, 900));
            case 1 -> new Wanted.Film(lot.number(0.01, 1), lot.number(1, 1e5));
            case 2 -> Wanted.Colour.ofLab(new Lab(lot.number(-20, 120), lot.number(-300, 0), -0.0), OptionalInt.of(90));
            default -> lot.wanted(Viewing.of(design.light(), design.observer()));
        };
    }

    private String name() {
        return switch (random.nextInt(7)) {
            case 0 -> "x".repeat(random.nextInt(200));
            case 1 -> "𝄞".repeat(79) + " 7";
            case 2 -> "two\nlines\u2028three\u0085four";
            case 3 -> "  ";
            case 4 -> "\ud834 alone";
            default -> lot.pick(List.of("tip", "tip 2", "dusk", "band"));
        };
    }

    private Design surroundingsEdited(Design design) {
        return switch (random.nextInt(13)) {
            case 0 -> DesignEdits.title(design, name());
            case 1 -> DesignEdits.metal(design, lot.pick(List.of(Metal.values())));
            case 2 -> DesignEdits.finish(design, lot.pick(List.of(Finish.values())));
            case 3 -> DesignEdits.light(design, lot.pick(List.of(Illuminant.values())));
            case 4 -> DesignEdits.observer(design, lot.pick(List.of(Observer.values())));
            case 5 -> DesignEdits.piece(design, piece(design.piece().lengthMm() * lot.number(0.2, 2)));
            case 6 -> DesignEdits.holding(design, holding(design));
            case 7 -> DesignEdits.bath(design, bath(design.metal()), file());
            case 8 ->
                DesignEdits.supply(
                        design,
                        new Supply(
                                lot.number(0.1, 3000),
                                lot.number(1e-6, 5000),
                                lot.number(1e-6, 50),
                                lot.number(1e-6, 1e9)));
            case 9 -> DesignEdits.vessel(design, vessel());
            case 10 -> DesignEdits.bench(design, new BenchTimes(lot.number(0, 9), -0.0, 1e6, 2, 0));
            case 11 -> DesignEdits.order(design, lot.pick(List.of(Order.values())));
            default -> DesignEdits.pull(design, pull());
        };
    }

    private Holding holding(Design design) {
        return new Holding(
                EnumSet.of(lot.pick(List.of(End.values()))),
                lot.number(0, 2 * design.piece().lengthMm()));
    }

    private PullSettings pull() {
        return new PullSettings(
                lot.number(1, 36_000),
                lot.pick(List.of(FadeStyle.values())),
                lot.number(0.2, 50),
                lot.number(1e-6, 0.01),
                lot.number(0.02, 1000));
    }

    private Optional<Vessel> vessel() {
        return switch (random.nextInt(3)) {
            case 0 -> Optional.empty();
            case 1 -> Optional.of(Vessel.round(lot.number(0.1, 20_000)));
            default -> Optional.of(Vessel.rectangular(lot.number(0.1, 20_000), lot.number(900, 2000)));
        };
    }

    private Bath bath(Metal metal) {
        return switch (random.nextInt(4)) {
            case 0 -> BathPresets.usual(metal);
            case 1 -> BathPresets.usual(metal).withResistanceOhm(lot.number(0, 50));
            case 2 -> lot.bath(lot.pick(List.of(Metal.values())));
            default -> new Bath("bad\nname", metal, 1.7, 26, 2.5, 0.8, 3.5, 95, 1, "");
        };
    }

    private Optional<String> file() {
        return lot.pick(List.of(
                Optional.empty(), Optional.of("shop.json"), Optional.of("../shop.json"), Optional.of("sulfuric")));
    }

    private Piece piece(double lengthMm) {
        Section section = switch (random.nextInt(3)) {
            case 0 -> new Section.Round();
            case 1 -> new Section.Flat(lot.number(0.01, 30));
            default -> new Section.Tube(lot.number(0.01, 0.9));
        };
        return new Piece(
                section,
                List.of(
                        new Station(0, lot.number(1, 1500)),
                        new Station(lengthMm / 3, lot.number(1, 1000)),
                        new Station(lengthMm, lot.number(1, 1000))));
    }
}
