package tideband.bench;

/**
 * The film of a band as drawn.
 *
 * @param aSideNm film at its A side in nm; 0 when bare
 * @param bSideNm film at its B side in nm
 */
public record DrawnFilm(double aSideNm, double bSideNm) {

    /**
     * Whether the band stays natural metal.
     *
     * @return true if there is to be no film
     */
    public boolean bare() {
        return aSideNm == 0;
    }
}
