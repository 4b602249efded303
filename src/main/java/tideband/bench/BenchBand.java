package tideband.bench;

import tideband.match.FilmColour;

/**
 * A band with everything the bench needs to know of it.
 *
 * @param name its name
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param aSide the film and colour at its A side
 * @param bSide the same at its B side; equals {@code aSide} unless the band is a fade
 * @param bare whether it stays natural metal
 * @param crispAtB whether the edge at its B side is crisp
 * @param aSideVolts supply volts that give the A side in this plan; 0 when bare
 * @param bSideVolts supply volts that give the B side
 * @param wantedHex the colour the drawing wants at the A side, as {@code #rrggbb}
 * @param wantedDe00 CIEDE2000 difference between the colour the drawing asks for and that of the film chosen
 */
public record BenchBand(
        String name,
        double fromMm,
        double toMm,
        FilmColour aSide,
        FilmColour bSide,
        boolean bare,
        boolean crispAtB,
        double aSideVolts,
        double bSideVolts,
        String wantedHex,
        double wantedDe00) {

    /**
     * Whether the film runs from one thickness to another.
     *
     * @return true for a fade
     */
    public boolean fade() {
        return aSide.filmNm() != bSide.filmNm();
    }
}
