package tideband.pull;

/**
 * A band as the pull sees it: where it is and the films it is to have.
 *
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param aSideNm film at its A side in nm; 0 when bare
 * @param bSideNm film at its B side in nm
 */
public record Target(double fromMm, double toMm, double aSideNm, double bSideNm) {

    /** Refuses bands that cannot be. */
    public Target {
        if (!(fromMm >= 0 && toMm > fromMm && aSideNm >= 0 && bSideNm >= 0)) {
            throw new IllegalArgumentException("a target runs up from fromMm to toMm with films of 0 or more, but was "
                    + fromMm + " to " + toMm + " mm, " + aSideNm + " to " + bSideNm + " nm");
        }
    }

    boolean fade() {
        return aSideNm != bSideNm;
    }

    boolean bare() {
        return aSideNm == 0;
    }

    Target withFilms(double otherASideNm, double otherBSideNm) {
        return new Target(fromMm, toMm, otherASideNm, otherBSideNm);
    }
}
