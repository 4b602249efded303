package tideband.pull;

/** A change that would let a pull give what is asked of it. */
public sealed interface Cure {

    /**
     * Holding longer.
     *
     * @param holdS seconds a level is held, as the design's settings would say it
     */
    record Hold(double holdS) implements Cure {}

    /**
     * A supply of more amps.
     *
     * @param amps its current limit
     */
    record Amps(double amps) implements Cure {}

    /**
     * A thinner film.
     *
     * @param mostNm the thickest that works, in nm
     */
    record Film(double mostNm) implements Cure {}
}
