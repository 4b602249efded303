package tideband.bench;

import java.util.Optional;
import tideband.colour.Lab;
import tideband.design.Band;

/**
 * A band with the film found for it.
 *
 * @param band the band as drawn
 * @param aSideNm film at its A side in nm; 0 when bare
 * @param bSideNm film at its B side in nm
 * @param wanted the colour the drawing names, where it names one
 * @param difference CIEDE2000 difference between that colour and the film's; 0 where it names none
 */
record DrawnBand(Band band, double aSideNm, double bSideNm, Optional<Lab> wanted, double difference) {

    boolean bare() {
        return aSideNm == 0;
    }
}
