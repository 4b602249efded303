package tideband.plan;

/**
 * A band as the planner sees it: the films at its two sides and the kind of edge at its B side.
 *
 * @param lengthMm its length in mm
 * @param aSideNm film at its A side in nm, 0 when bare
 * @param bSideNm film at its B side in nm, 0 when bare
 * @param bare whether it stays natural metal
 * @param crispAtB whether the edge to the next band towards B is crisp (a mask line)
 */
public record Stretch(double lengthMm, double aSideNm, double bSideNm, boolean bare, boolean crispAtB) {

    /** Refuses stretches that cannot be. */
    public Stretch {
        if (!(lengthMm > 0 && Double.isFinite(lengthMm))) {
            throw new IllegalArgumentException("lengthMm must be finite and above 0, but was " + lengthMm);
        }
        boolean filmed = aSideNm > 0 && bSideNm > 0 && Double.isFinite(aSideNm) && Double.isFinite(bSideNm);
        if (bare ? aSideNm != 0 || bSideNm != 0 : !filmed) {
            throw new IllegalArgumentException(
                    "a bare stretch has films 0 and any other has films above 0, but they were " + aSideNm + " and "
                            + bSideNm);
        }
    }
}
