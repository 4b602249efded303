package tideband.design;

import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import java.util.Set;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Viewing;
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

/** Designs drawn by lot from all that a file can hold, with crooked numbers; made by a bench or not. */
public final class DesignsByLot {
    private static final List<String> NAMES = List.of(
            "tip",
            "dusk",
            "Öse",
            "a \"quoted\" one",
            "back\\slash",
            "火",
            "  two  spaces ",
            "𝄞 clef",
            "1",
            "\u00a0",
            "</b>&amp;");

    private final Random random;

    /**
     * A lot.
     *
     * @param seed the same seed gives the same designs
     */
    public DesignsByLot(long seed) {
        random = new Random(seed);
    }

    /**
     * Draws a design.
     *
     * @return one that a file can hold
     */
    public Design design() {
        Metal metal = pick(List.of(Metal.values()));
        Illuminant light = pick(List.of(Illuminant.values()));
        Observer observer = pick(List.of(Observer.values()));
        Piece piece = piece();
        Holding holding = new Holding(ends(), random.nextInt(3) == 0 ? 0 : number(0, piece.lengthMm() * 0.99));
        Optional<Bath> own = random.nextBoolean() ? Optional.of(bath(metal)) : Optional.empty();
        Optional<String> file = own.isPresent() && random.nextBoolean()
                ? Optional.of(pick(List.of("shop.json", "Bad 3.json", "sea-salt free", "火.json")))
                : Optional.empty();
        double slowest = number(0.001, 900);
        return new Design(
                pick(NAMES),
                metal,
                pick(List.of(Finish.values())),
                light,
                observer,
                piece,
                holding,
                bands(piece.lengthMm(), Viewing.of(light, observer)),
                own.orElse(pick(BathPresets.of(metal))),
                file,
                supply(),
                vessel(piece, holding),
                new BenchTimes(number(0, 9), number(0, 9), 0, number(0, 1e6), number(0, 9)),
                pick(List.of(Order.values())),
                new PullSettings(
                        number(1, 36_000),
                        pick(List.of(FadeStyle.values())),
                        number(0.2, 50),
                        slowest,
                        number(slowest + 0.01, 1000)));
    }

    /**
     * Draws a bath of a file.
     *
     * @param metal its metal
     * @return a bath that a file can hold
     */
    public Bath bath(Metal metal) {
        return new Bath(
                pick(NAMES),
                metal,
                number(0.1, 20),
                number(5, 200),
                number(0.1, 20),
                number(0.01, 1),
                number(0, 10_000),
                number(1, 500),
                number(0.5, 1.5),
                random.nextBoolean() ? "" : "fitted to \"coupons\" \\ 4");
    }

    private Piece piece() {
        double lengthMm = number(1, random.nextInt(4) == 0 ? 5000 : 200);
        int between = random.nextInt(8);
        List<Station> stations = new ArrayList<>(List.of(new Station(0, number(1, 1000))));
        for (int i = 1; i <= between; i++) {
            stations.add(new Station(lengthMm * i / (between + 1), number(1, 1000)));
        }
        stations.add(new Station(lengthMm, number(1, 1000)));
        Section section = switch (random.nextInt(3)) {
            case 0 -> new Section.Round();
            case 1 -> new Section.Flat(number(0.05, 1000));
            default -> new Section.Tube(number(0.05, 0.99));
        };
        return new Piece(section, stations);
    }

    private List<Band> bands(double lengthMm, Viewing viewing) {
        int count = 1 + random.nextInt((int) Math.min(12, lengthMm / 0.6));
        List<Band> bands = new ArrayList<>();
        double fromMm = 0;
        for (int i = 0; i < count; i++) {
            double most = lengthMm - 0.5 * (count - 1 - i);
            double toMm = i == count - 1 ? lengthMm : number(fromMm + 0.5, fromMm + 0.5 + (most - fromMm - 0.5) / 2);
            String name = (pick(NAMES) + " " + i);
            bands.add(new Band(name, fromMm, toMm, wanted(viewing), pick(List.of(Edge.values()))));
            fromMm = toMm;
        }
        return bands;
    }

    /**
     * Draws a wish.
     *
     * @param viewing the design's light and eye
     * @return what a band is to be
     */
    public Wanted wanted(Viewing viewing) {
        OptionalInt order = random.nextBoolean() ? OptionalInt.empty() : OptionalInt.of(1 + random.nextInt(20));
        return switch (random.nextInt(6)) {
            case 0 -> new Wanted.Bare();
            case 1 -> new Wanted.Volts(number(0.1, 500));
            case 2 -> Wanted.Colour.ofHex(pick(List.of("#3a3f8f", "#FFFFFF", "#00aaCC")), viewing, order);
            case 3 -> Wanted.Colour.ofLab(new Lab(number(0, 100), number(-200, 200), number(-200, 200)), order);
            case 4 -> new Wanted.Film(number(1, 2000), number(1, 2000));
            default -> {
                double filmNm = number(1, 2000);
                yield new Wanted.Film(filmNm, filmNm);
            }
        };
    }

    private Supply supply() {
        return new Supply(
                number(10, 1000),
                number(0.001, 1000),
                number(0.001, 10),
                random.nextBoolean() ? Double.POSITIVE_INFINITY : number(0.001, 1e6));
    }

    private Optional<Vessel> vessel(Piece piece, Holding holding) {
        Vessel vessel = random.nextBoolean()
                ? Vessel.round(number(1, 10_000))
                : Vessel.rectangular(number(1, 10_000), number(1, 10_000));
        return random.nextBoolean() && holding.goesInto(vessel, piece) ? Optional.of(vessel) : Optional.empty();
    }

    private Set<End> ends() {
        return switch (random.nextInt(3)) {
            case 0 -> EnumSet.of(End.A);
            case 1 -> EnumSet.of(End.B);
            default -> EnumSet.allOf(End.class);
        };
    }

    /** A number with few digits, with all of them, or the bound itself. */
    public double number(double low, double high) {
        double number = low + random.nextDouble() * (high - low);
        return switch (random.nextInt(8)) {
            case 0 -> low;
            case 1 -> high;
            case 2, 3, 4 -> Math.min(high, Math.max(low, Math.rint(number * 10) / 10 + 0.0));
            default -> number;
        };
    }

    /** One of several. */
    public <T> T pick(List<T> list) {
        return list.get(random.nextInt(list.size()));
    }
}
