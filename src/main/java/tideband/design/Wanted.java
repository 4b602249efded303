package tideband.design;

import java.util.OptionalInt;
import java.util.regex.Pattern;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.colour.Viewing;

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
    record Colour(String text, Lab lab, OptionalInt order) implements Wanted {

        // In hexadecimal notation.
        static final Pattern HEX = Pattern.compile("^#[0-9a-fA-F]{6}$");

        // Minus zero becomes zero, as in a file.
        public Colour {
            lab = new Lab(lab.lightness() + 0.0, lab.a() + 0.0, lab.b() + 0.0);
        }

        /**
         * Whether a text gives a colour in hexadecimal notation.
         *
         * @param text any text
         * @return whether it is # and six hexadecimal digits
         */
        public static boolean isHex(String text) {
            return HEX.matcher(text).matches();
        }

        /**
         * A colour as a screen shows it.
         *
         * @param hex # and six hexadecimal digits
         * @param viewing the light and the eye it is to look so in
         * @param order the order wanted, where one is
         * @return the colour
         */
        public static Colour ofHex(String hex, Viewing viewing, OptionalInt order) {
            return new Colour(hex, viewing.lab(Srgb.ofHex(hex)), order);
        }

        /**
         * A colour by its CIELAB values.
         *
         * @param lab L*, a*, b* against the white of the design's light
         * @param order the order wanted, where one is
         * @return the colour
         */
        public static Colour ofLab(Lab lab, OptionalInt order) {
            String text = "lab(" + Shown.number(lab.lightness()) + ", " + Shown.number(lab.a()) + ", "
                    + Shown.number(lab.b()) + ")";
            return new Colour(text, lab, order);
        }

        /**
         * The same colour in another light: one in hexadecimal notation goes on meaning what a screen shows, one in CIELAB
         * keeps its values.
         *
         * @param viewing the light and the eye
         * @return the colour in it
         */
        public Colour in(Viewing viewing) {
            return isHex(text) ? ofHex(text, viewing, order) : this;
        }
    }

    /** Natural metal. */
    record Bare() implements Wanted {}
}
