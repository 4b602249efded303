package tideband.piece;

/** An upright vessel of even cross-section that holds the bath; measures are inside ones. */
public sealed interface Vessel {

    /**
     * A round vessel.
     *
     * @param boreMm its inner diameter in mm
     */
    record Round(double boreMm) implements Vessel {

        // Refuses sizes no vessel has.
        public Round {
            requireSize("boreMm", boreMm);
        }

        @Override
        public double areaMm2() {
            return Math.PI / 4 * boreMm * boreMm;
        }

        @Override
        public double narrowMm() {
            return boreMm;
        }

        @Override
        public double wideMm() {
            return boreMm;
        }
    }

    /**
     * A rectangular vessel.
     *
     * @param widthMm its inner width in mm
     * @param lengthMm its inner length in mm
     */
    record Rectangular(double widthMm, double lengthMm) implements Vessel {

        // Refuses sizes no vessel has.
        public Rectangular {
            requireSize("widthMm", widthMm);
            requireSize("lengthMm", lengthMm);
        }

        @Override
        public double areaMm2() {
            return widthMm * lengthMm;
        }

        @Override
        public double narrowMm() {
            return Math.min(widthMm, lengthMm);
        }

        @Override
        public double wideMm() {
            return Math.max(widthMm, lengthMm);
        }
    }

    private static void requireSize(String name, double sizeMm) {
        if (!(sizeMm > 0 && Double.isFinite(sizeMm))) {
            throw new IllegalArgumentException(name + " must be finite and above 0, but was " + sizeMm);
        }
    }

    /**
     * Its inside cross-section.
     *
     * @return area in mm²
     */
    double areaMm2();

    /**
     * The smaller of its inner measures across.
     *
     * @return size in mm
     */
    double narrowMm();

    /**
     * The larger of its inner measures across; that of a round vessel is its bore too.
     *
     * @return size in mm
     */
    double wideMm();

    /**
     * A round vessel.
     *
     * @param boreMm its inner diameter in mm
     * @return the vessel
     */
    static Vessel round(double boreMm) {
        return new Round(boreMm);
    }

    /**
     * A rectangular vessel.
     *
     * @param widthMm its inner width in mm
     * @param lengthMm its inner length in mm
     * @return the vessel
     */
    static Vessel rectangular(double widthMm, double lengthMm) {
        return new Rectangular(widthMm, lengthMm);
    }

    /**
     * How far the hand moves a piece up to bring it from one depth to another. Liquid is neither lost nor gained, so the
     * level sinks by the volume that leaves it over the vessel's cross-section, and that much less travel is needed.
     * Liquid lifted by the meniscus and carried off as a film is left out: it is the same at both depths, or too little.
     *
     * @param piece the piece
     * @param down the end that is down
     * @param fromDepthMm depth of that end below the level before, in mm, at most the length; below 0 is above the level
     * @param toDepthMm the same after
     * @return travel in mm, positive upwards
     * @throws IllegalArgumentException if the part under the level is not smaller across than the vessel
     */
    default double travelMm(Piece piece, End down, double fromDepthMm, double toDepthMm) {
        double sinkMm = (displacedMm3(piece, down, fromDepthMm) - displacedMm3(piece, down, toDepthMm)) / areaMm2();
        return fromDepthMm - toDepthMm - sinkMm;
    }

    private double displacedMm3(Piece piece, End down, double depthMm) {
        double immersedMm = Math.max(depthMm, 0);
        double endMm = piece.fromEnd(down, 0);
        double levelMm = piece.fromEnd(down, immersedMm);
        double lowMm = Math.min(endMm, levelMm);
        double highMm = Math.max(endMm, levelMm);
        double outlineMm2 = piece.section().outlineAreaMm2(piece.largestSizeMm(lowMm, highMm));
        if (!(outlineMm2 < areaMm2())) {
            throw new IllegalArgumentException(
                    "the vessel must be larger across than the piece in it, but its inside is " + areaMm2()
                            + " mm² and the piece takes up " + outlineMm2 + " mm²; take a larger vessel");
        }
        return piece.volumeMm3(lowMm, highMm);
    }
}
