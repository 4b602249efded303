package tideband.design;

import java.util.OptionalInt;
import tideband.colour.Lab;

/** What a band is to be: exactly one of a film, volts, a colour, or bare metal. */
public sealed interface Wanted {

    /**
     * A film, running straight from one side of the band to the other.
     *
     * @param aSideNm film at the A side in nm
     * @param bSideNm film at the B side in nm; equal to the A side unless the band is a fade
     */
    record Film(double aSideNm, double bSideNm) implements Wanted {

        // Refuses films that are none.
        public Film {
            if (!(aSideNm > 0 && bSideNm > 0 && Double.isFinite(aSideNm) && Double.isFinite(bSideNm))) {
                throw new IllegalArgumentException(
                        "films must be finite and above 0 nm, but they were " + aSideNm + " and " + bSideNm);
            }
        }
    }

    /**
     * The film a small coupon would have at the end of a hold at these volts.
     *
     * @param volts supply volts
     */
    record Volts(double volts) implements Wanted {

        // Refuses volts that grow nothing.
        public Volts {
            if (!(volts > 0 && Double.isFinite(volts))) {
                throw new IllegalArgumentException("volts must be finite and above 0, but was " + volts);
            }
        }
    }

    /**
     * A colour, to be matched by a film.
     *
     * @param text the colour as the design gave it, for showing
     * @param lab the colour in CIELAB
     * @param order the order wanted, where one is
     */
    record Colour(String text, Lab lab, OptionalInt order) implements Wanted {}

    /** Natural metal. */
    record Bare() implements Wanted {}
}
