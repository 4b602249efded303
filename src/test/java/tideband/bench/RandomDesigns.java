package tideband.bench;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.Random;
import java.util.Set;
import tideband.colour.Illuminant;
import tideband.colour.Lab;
import tideband.colour.Observer;
import tideband.colour.Viewing;
import tideband.design.Band;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Edge;
import tideband.design.FadeStyle;
import tideband.design.Holding;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Wanted;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.oxide.Coupon;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.End;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;
import tideband.piece.Vessel;

/** Designs drawn by lot: the same number always gives the same design. */
public final class RandomDesigns {
    private static final double THICKEST_NM = 600;

    private final Map<Metal, Map<Finish, Palette>> palettes = new EnumMap<>(Metal.class);

    /** The colours of a design; palettes are shared, for they are costly and depend on metal and finish alone. */
    Colours colours(Design design) {
        Palette palette = palettes.computeIfAbsent(design.metal(), metal -> new EnumMap<>(Finish.class))
                .computeIfAbsent(
                        design.finish(),
                        finish -> new Palette(
                                FilmSystem.of(design.metal().opticsKey(), 1),
                                finish,
                                Viewing.daylight(),
                                0,
                                THICKEST_NM));
        return new Colours(palette, scale(design), Viewing.daylight());
    }

    private VoltScale scale(Design design) {
        Coupon coupon = new Coupon(
                design.bath(), design.supply().maxAmps(), design.pull().holdS(), Coupon.USUAL_CM2);
        double mostVolts = design.supply().highestVolts(design.bath().ceilingVolts());
        return new VoltScale(mostVolts, coupon::filmNm, coupon::volts);
    }

    /** How a design comes out. */
    Work work(Design design) {
        return new BenchPlanner(design, colours(design)).work(stage -> {}, () -> false);
    }

    /**
     * A design with a supply and a bath that can make most drawings; every twelfth has twelve bands.
     *
     * @param number which design
     * @return the design
     */
    public static Design design(int number) {
        return new Lot(new Random(1000L + number)).design(number);
    }

    /** What falls to one design. */
    private static final class Lot {
        private final Random random;

        Lot(Random random) {
            this.random = random;
        }

        Design design(int number) {
            Metal metal = pick(List.of(Metal.values()));
            Bath bath = pick(BathPresets.of(metal)).withResistanceOhm(pick(List.of(0.0, 2.0, 2.0, 6.0, 20.0)));
            int count = number % 12 == 11 ? 12 : 1 + random.nextInt(6);
            double lengthMm = count * (8 + random.nextInt(30));
            Piece piece = piece(lengthMm);
            Supply supply = new Supply(
                    pick(List.of(40.0, 90.0, 120.0, 150.0)),
                    pick(List.of(0.05, 0.3, 1.0, 2.0, 5.0)),
                    pick(List.of(0.1, 0.1, 0.5, 1.0)),
                    pick(List.of(Double.POSITIVE_INFINITY, Double.POSITIVE_INFINITY, 20.0, 2.0, 0.5)));
            Holding holding = new Holding(ends(), random.nextInt(3) == 0 ? 0 : random.nextInt(8));
            double largestMm = piece.largestSizeMm(0, lengthMm);
            Optional<Vessel> vessel = switch (random.nextInt(4)) {
                case 0 -> Optional.of(Vessel.round(largestMm * 1.5 + 6));
                case 1 -> Optional.of(Vessel.rectangular(largestMm + 8, 60));
                default -> Optional.empty();
            };
            double slowest = pick(List.of(0.1, 0.3, 0.3, 1.0));
            PullSettings pull = new PullSettings(
                    pick(List.of(5.0, 15.0, 30.0, 30.0, 120.0)),
                    pick(List.of(FadeStyle.values())),
                    pick(List.of(1.0, 2.0, 2.0, 5.0)),
                    slowest,
                    slowest + pick(List.of(1.0, 5.0, 9.7)));
            return new Design(
                    "Lamp part " + number,
                    metal,
                    pick(List.of(Finish.values())),
                    Illuminant.D65,
                    Observer.CIE_1931_2_DEGREE,
                    piece,
                    holding,
                    bands(count, lengthMm, bath, Math.min(bath.ceilingVolts(), supply.maxVolts())),
                    bath,
                    supply,
                    vessel,
                    BenchTimes.USUAL,
                    pick(List.of(Order.values())),
                    pull);
        }

        private Piece piece(double lengthMm) {
            double aMm = 2 + random.nextInt(12);
            double bMm = random.nextBoolean() ? aMm : 2 + random.nextInt(12);
            double middleMm = random.nextBoolean() ? (aMm + bMm) / 2 : 2 + random.nextInt(12);
            List<Station> stations =
                    List.of(new Station(0, aMm), new Station(lengthMm * 0.4, middleMm), new Station(lengthMm, bMm));
            Section section = switch (random.nextInt(3)) {
                case 0 -> new Section.Round();
                case 1 -> new Section.Flat(0.5 + random.nextInt(3));
                default -> new Section.Tube(1.5);
            };
            return new Piece(section, stations);
        }

        private Set<End> ends() {
            return switch (random.nextInt(5)) {
                case 0 -> EnumSet.of(End.A);
                case 1 -> EnumSet.of(End.B);
                default -> EnumSet.allOf(End.class);
            };
        }

        private List<Band> bands(int count, double lengthMm, Bath bath, double mostVolts) {
            List<Band> bands = new ArrayList<>();
            double fromMm = 0;
            double lastNm = film(bath, mostVolts);
            for (int i = 0; i < count; i++) {
                double toMm = i == count - 1 ? lengthMm : lengthMm * (i + 0.7 + 0.3 * random.nextDouble()) / count;
                double filmNm = random.nextInt(3) == 0 ? lastNm : film(bath, mostVolts);
                Wanted wanted = switch (random.nextInt(10)) {
                    case 0 -> new Wanted.Bare();
                    case 1 -> new Wanted.Volts(2 + random.nextInt((int) (mostVolts - 1)));
                    case 2 -> colour();
                    case 3, 4, 5 -> new Wanted.Film(lastNm, filmNm);
                    default -> new Wanted.Film(filmNm, filmNm);
                };
                Edge edge = random.nextBoolean() ? Edge.CRISP : Edge.SOFT;
                bands.add(new Band("b" + (i + 1), fromMm, toMm, wanted, edge));
                fromMm = toMm;
                lastNm = filmNm;
            }
            return bands;
        }

        private Wanted colour() {
            return new Wanted.Colour(
                    "a colour",
                    new Lab(20 + random.nextInt(70), random.nextInt(60) - 30, random.nextInt(80) - 40),
                    random.nextBoolean() ? OptionalInt.empty() : OptionalInt.of(1 + random.nextInt(3)));
        }

        /** A film in whole nanometres, up to nearly what the highest volts give; now and then far too thick or thin. */
        private double film(Bath bath, double mostVolts) {
            int most = (int) (0.95 * bath.nmPerVolt() * mostVolts);
            return switch (random.nextInt(60)) {
                case 0 -> most * 1.5;
                case 1 -> bath.nativeNm() + random.nextInt(3);
                default -> 12 + random.nextInt(most - 12);
            };
        }

        private <T> T pick(List<T> list) {
            return list.get(random.nextInt(list.size()));
        }
    }
}
