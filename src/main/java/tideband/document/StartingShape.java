package tideband.document;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.design.Band;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Edge;
import tideband.design.Fault;
import tideband.design.Holding;
import tideband.design.Limits;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.design.Range;
import tideband.design.Reading;
import tideband.design.Wanted;
import tideband.optics.Finish;
import tideband.oxide.BathPresets;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.Piece;
import tideband.piece.Section;
import tideband.piece.Station;

/** Pieces to begin a drawing with: bare, and as large as the user says. */
public enum StartingShape {
    /** A round rod. */
    ROUND_ROD("Round rod", "the same diameter all along"),
    /** A round piece that tapers. */
    TAPERED_ROUND("Tapered round", "a diameter at each end, straight in between"),
    /** A flat strip. */
    FLAT_STRIP("Flat strip", "the same width all along"),
    /** A flat piece that tapers. */
    TAPERED_FLAT("Tapered flat", "a width at each end, straight in between"),
    /** A tube. */
    TUBE("Tube", "open at both ends, wet inside and out");

    /** A measure of a shape. */
    public enum Size {
        /** From end A to end B. */
        LENGTH("Length", 100),
        /** Of a rod. */
        DIAMETER("Diameter", 6),
        /** At end A. */
        DIAMETER_A("Diameter at end A", 3),
        /** At end B. */
        DIAMETER_B("Diameter at end B", 8),
        /** Of a strip. */
        WIDTH("Width", 20),
        /** At end A. */
        WIDTH_A("Width at end A", 12),
        /** At end B. */
        WIDTH_B("Width at end B", 24),
        /** Of a flat piece. */
        THICKNESS("Thickness", 1.5),
        /** Of a tube. */
        OUTER_DIAMETER("Outer diameter", 9),
        /** Of a tube, inside. */
        BORE("Bore", 7);

        private final String title;
        private final double usualMm;

        Size(String title, double usualMm) {
            this.title = title;
            this.usualMm = usualMm;
        }

        /**
         * What it is called.
         *
         * @return such as {@code Diameter at end A}
         */
        public String title() {
            return title;
        }

        /**
         * A size to begin with.
         *
         * @return size in mm
         */
        public double usualMm() {
            return usualMm;
        }

        /**
         * What it may be.
         *
         * @return sizes in mm
         */
        public Range allowedMm() {
            return this == LENGTH ? Limits.LENGTH_MM : Limits.SIZE_MM;
        }
    }

    private final String title;
    private final String about;

    StartingShape(String title, String about) {
        this.title = title;
        this.about = about;
    }

    /**
     * What it is called.
     *
     * @return such as {@code Round rod}
     */
    public String title() {
        return title;
    }

    /**
     * What it is like.
     *
     * @return a few words
     */
    public String about() {
        return about;
    }

    /**
     * The measures it has.
     *
     * @return in the order they are asked for
     */
    public List<Size> sizes() {
        return switch (this) {
            case ROUND_ROD -> List.of(Size.LENGTH, Size.DIAMETER);
            case TAPERED_ROUND -> List.of(Size.LENGTH, Size.DIAMETER_A, Size.DIAMETER_B);
            case FLAT_STRIP -> List.of(Size.LENGTH, Size.WIDTH, Size.THICKNESS);
            case TAPERED_FLAT -> List.of(Size.LENGTH, Size.WIDTH_A, Size.WIDTH_B, Size.THICKNESS);
            case TUBE -> List.of(Size.LENGTH, Size.OUTER_DIAMETER, Size.BORE);
        };
    }

    /**
     * A bare drawing of this shape.
     *
     * @param title the drawing's title
     * @param metal the metal
     * @param sizesMm its measures in mm; the usual ones for those not given
     * @return the drawing, or what is wrong with each measure, its title being the place
     */
    public Reading<Design> design(String title, Metal metal, Map<Size, Double> sizesMm) {
        EnumMap<Size, Double> mm = new EnumMap<>(Size.class);
        List<Fault> faults = new ArrayList<>();
        for (Size size : sizes()) {
            double given = sizesMm.getOrDefault(size, size.usualMm);
            mm.put(size, given);
            if (!size.allowedMm().holds(given)) {
                faults.add(new Fault(
                        size.title,
                        "is not from " + plain(size.allowedMm().low()) + " to "
                                + plain(size.allowedMm().high()) + " mm",
                        "give a size in between"));
            }
        }
        if (faults.isEmpty() && this == TUBE && !(mm.get(Size.BORE) < mm.get(Size.OUTER_DIAMETER))) {
            faults.add(new Fault(Size.BORE.title, "is not smaller than the outer diameter", "give a smaller one"));
        }
        if (!faults.isEmpty()) {
            return new Reading.Faulty<>(faults);
        }
        Design design = bare(title, metal, piece(mm));
        List<Fault> inFile = DesignFile.faults(design);
        return inFile.isEmpty() ? new Reading.Read<>(design) : new Reading.Faulty<>(inFile);
    }

    private Piece piece(Map<Size, Double> mm) {
        return switch (this) {
            case ROUND_ROD -> piece(new Section.Round(), mm, Size.DIAMETER, Size.DIAMETER);
            case TAPERED_ROUND -> piece(new Section.Round(), mm, Size.DIAMETER_A, Size.DIAMETER_B);
            case FLAT_STRIP -> piece(new Section.Flat(mm.get(Size.THICKNESS)), mm, Size.WIDTH, Size.WIDTH);
            case TAPERED_FLAT -> piece(new Section.Flat(mm.get(Size.THICKNESS)), mm, Size.WIDTH_A, Size.WIDTH_B);
            case TUBE -> piece(new Section.Tube(mm.get(Size.BORE)), mm, Size.OUTER_DIAMETER, Size.OUTER_DIAMETER);
        };
    }

    private static Piece piece(Section section, Map<Size, Double> mm, Size atA, Size atB) {
        return new Piece(section, List.of(new Station(0, mm.get(atA)), new Station(mm.get(Size.LENGTH), mm.get(atB))));
    }

    private static Design bare(String title, Metal metal, Piece piece) {
        // A short piece is held by less.
        double dryMm = Math.min(Holding.USUAL.dryMm(), Math.rint(piece.lengthMm()) / 4);
        return new Design(
                title,
                metal,
                Finish.POLISHED,
                Illuminant.D65,
                Observer.CIE_1931_2_DEGREE,
                piece,
                new Holding(Holding.USUAL.endsDown(), dryMm),
                List.of(new Band("band 1", 0, piece.lengthMm(), new Wanted.Bare(), Edge.SOFT)),
                BathPresets.usual(metal),
                Supply.USUAL,
                Optional.empty(),
                BenchTimes.USUAL,
                Order.THICKER_FIRST,
                PullSettings.USUAL);
    }

    private static String plain(double number) {
        return new BigDecimal(Double.toString(number)).stripTrailingZeros().toPlainString();
    }
}
