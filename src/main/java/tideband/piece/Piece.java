package tideband.piece;

import java.util.List;

/**
 * A piece: a cross-section whose size runs straight between stations.
 *
 * <p>Areas and volumes are exact for this shape, across stations too.
 *
 * @param section the kind of cross-section
 * @param stations sizes along the piece, the first at 0 mm, positions rising; the last is at the length
 */
public record Piece(Section section, List<Station> stations) {

    /** Refuses shapes that cannot be. */
    public Piece {
        stations = List.copyOf(stations);
        if (stations.size() < 2 || stations.get(0).atMm() != 0) {
            throw new IllegalArgumentException("a piece has at least two stations, the first at 0 mm");
        }
        for (int i = 1; i < stations.size(); i++) {
            if (!(stations.get(i).atMm() > stations.get(i - 1).atMm())) {
                throw new IllegalArgumentException("stations must rise in position, but station " + i + " does not");
            }
        }
        if (section instanceof Section.Tube tube) {
            for (Station station : stations) {
                if (!(station.sizeMm() > tube.boreMm())) {
                    throw new IllegalArgumentException("a tube must be wider than its bore of " + tube.boreMm()
                            + " mm everywhere, but at " + station.atMm() + " mm it was " + station.sizeMm() + " mm");
                }
            }
        }
    }

    /**
     * The length from end A to end B.
     *
     * @return length in mm
     */
    public double lengthMm() {
        return stations.get(stations.size() - 1).atMm();
    }

    /**
     * The position that lies so far from an end. It also answers the reverse question: how far a position lies from
     * that end.
     *
     * @param end the end measured from
     * @param distanceMm distance from it in mm, 0 to the length
     * @return position in mm from end A
     */
    public double fromEnd(End end, double distanceMm) {
        requireOnPiece("distanceMm", distanceMm);
        return switch (end) {
            case A -> distanceMm;
            case B -> lengthMm() - distanceMm;
        };
    }

    /**
     * The size at a position.
     *
     * @param atMm position in mm from end A, 0 to the length
     * @return size in mm
     */
    public double sizeMm(double atMm) {
        requireOnPiece("atMm", atMm);
        int i = 1;
        while (stations.get(i).atMm() < atMm) {
            i++;
        }
        return sizeMm(stations.get(i - 1), stations.get(i), atMm);
    }

    private static double sizeMm(Station low, Station high, double atMm) {
        double share = (atMm - low.atMm()) / (high.atMm() - low.atMm());
        return (1 - share) * low.sizeMm() + share * high.sizeMm();
    }

    /**
     * The largest size in a stretch.
     *
     * @param fromMm where the stretch begins, in mm from end A
     * @param toMm where it ends
     * @return size in mm
     */
    public double largestSizeMm(double fromMm, double toMm) {
        requireStretch(fromMm, toMm);
        double largest = Math.max(sizeMm(fromMm), sizeMm(toMm));
        for (Station station : stations) {
            if (station.atMm() > fromMm && station.atMm() < toMm) {
                largest = Math.max(largest, station.sizeMm());
            }
        }
        return largest;
    }

    /**
     * The length of the outer outline at a position.
     *
     * @param atMm position in mm from end A, 0 to the length
     * @return outline in mm
     */
    public double perimeterMm(double atMm) {
        return section.perimeterMm(sizeMm(atMm));
    }

    /**
     * The area of metal in the cross-section at a position.
     *
     * @param atMm position in mm from end A, 0 to the length
     * @return area in mm²
     */
    public double sectionAreaMm2(double atMm) {
        return section.metalAreaMm2(sizeMm(atMm));
    }

    /**
     * The surface the bath wets in a stretch: the outside with the slant of its tapers, the bore of a tube, and the
     * face of an end where the stretch reaches one.
     *
     * @param fromMm where the stretch begins, in mm from end A
     * @param toMm where it ends, at or beyond {@code fromMm}
     * @return area in mm²
     */
    public double wetAreaMm2(double fromMm, double toMm) {
        double areaMm2 = sum(fromMm, toMm, section::sideAreaMm2);
        if (fromMm == 0) {
            areaMm2 += sectionAreaMm2(0);
        }
        if (toMm == lengthMm()) {
            areaMm2 += sectionAreaMm2(toMm);
        }
        return areaMm2;
    }

    /**
     * The metal in a stretch, which is also the liquid it displaces: a tube is open and fills.
     *
     * @param fromMm where the stretch begins, in mm from end A
     * @param toMm where it ends, at or beyond {@code fromMm}
     * @return volume in mm³
     */
    public double volumeMm3(double fromMm, double toMm) {
        return sum(fromMm, toMm, section::volumeMm3);
    }

    /** A quantity of a span over which the size runs straight. */
    private interface SpanQuantity {
        double of(double fromSizeMm, double toSizeMm, double lengthMm);
    }

    private double sum(double fromMm, double toMm, SpanQuantity quantity) {
        requireStretch(fromMm, toMm);
        double total = 0;
        for (int i = 1; i < stations.size(); i++) {
            Station low = stations.get(i - 1);
            Station high = stations.get(i);
            double startMm = Math.max(fromMm, low.atMm());
            double stopMm = Math.min(toMm, high.atMm());
            if (stopMm > startMm) {
                total += quantity.of(sizeMm(low, high, startMm), sizeMm(low, high, stopMm), stopMm - startMm);
            }
        }
        return total;
    }

    private void requireStretch(double fromMm, double toMm) {
        requireOnPiece("fromMm", fromMm);
        requireOnPiece("toMm", toMm);
        if (fromMm > toMm) {
            throw new IllegalArgumentException(
                    "fromMm must not be beyond toMm, but they were " + fromMm + " and " + toMm + " mm");
        }
    }

    private void requireOnPiece(String name, double valueMm) {
        if (!(valueMm >= 0 && valueMm <= lengthMm())) {
            throw new IllegalArgumentException(
                    name + " must be from 0 to " + lengthMm() + " mm, the piece's length, but was " + valueMm);
        }
    }
}
