package tideband.trial;

import java.util.Optional;
import tideband.colour.Lab;

/**
 * What the drawing wants of a stretch of the piece.
 *
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param aSideNm the film wanted at its A side, in nm; the native film where it is to stay bare
 * @param bSideNm the film wanted at its B side
 * @param lab the colour wanted, where the drawing names a colour and not a film
 */
public record Wish(double fromMm, double toMm, double aSideNm, double bSideNm, Optional<Lab> lab) {

    double filmNm(double atMm) {
        return aSideNm + (bSideNm - aSideNm) * (atMm - fromMm) / (toMm - fromMm);
    }
}
