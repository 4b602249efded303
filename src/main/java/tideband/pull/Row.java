package tideband.pull;

/**
 * One row of a pull: a mark in time.
 *
 * @param timeS seconds since the immersion began
 * @param volts volts at the supply's terminals; 0 is supply off
 * @param lineMm how far the colour line (depth plus meniscus) stands from the end that is down, in mm
 * @param depthMm depth of the end that is down below the flat bath, as a gauge shows it, in mm
 * @param travelMm how far the hand has moved up since the immersion began, in mm
 * @param filmNm the film at the colour line, in nm; the native film before any growth
 * @param act what is done from here to the next row
 */
public record Row(double timeS, double volts, double lineMm, double depthMm, double travelMm, double filmNm, Act act) {

    /** What is done from a row to the next. */
    public enum Act {
        /** The piece stands in the bath with the supply off. */
        LOWERED,
        /** The supply is switched on, or its volts go up, to what the next row says. */
        RAISE,
        /** Volts and depth stay. */
        HOLD,
        /** The supply is switched off. */
        OFF,
        /** The piece is drawn out to the next mark with the supply off. */
        WITHDRAW,
        /** The piece is drawn out slowly through a fade with the supply on. */
        FADE,
        /**
         * The piece is drawn out through a fade after the film: the supply stands at its setting for this fade, its current limit
         * holds the volts down, and the rows say what its meter shows.
         */
        FOLLOW,
        /** The supply is off and the piece leaves the bath. */
        LIFT_OUT
    }
}
