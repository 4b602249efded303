package tideband.edit;

import java.util.OptionalInt;
import tideband.colour.Lab;
import tideband.colour.Viewing;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.design.Wanted;

/** What a band can be wished to be. */
final class Wishes {

    private Wishes() {}

    /** The wish, as near as a design's file can hold it; a colour in hexadecimal notation is seen in the design's light. */
    static Wanted allowed(Design design, Wanted wanted) {
        if (wanted instanceof Wanted.Film film) {
            return new Wanted.Film(Limits.FILM_NM.nearest(film.aSideNm()), Limits.FILM_NM.nearest(film.bSideNm()));
        }
        if (wanted instanceof Wanted.Volts volts) {
            return new Wanted.Volts(Limits.BAND_VOLTS.nearest(volts.volts()));
        }
        if (!(wanted instanceof Wanted.Colour colour)) {
            return wanted;
        }
        OptionalInt order = colour.order().isPresent()
                ? OptionalInt.of((int) Limits.ORDER.nearest(colour.order().getAsInt()))
                : OptionalInt.empty();
        if (Wanted.Colour.isHex(colour.text())) {
            return Wanted.Colour.ofHex(colour.text(), Viewing.of(design.light(), design.observer()), order);
        }
        Lab lab = colour.lab();
        return Wanted.Colour.ofLab(
                new Lab(
                        Limits.LIGHTNESS.nearest(lab.lightness()),
                        Limits.CHROMATIC.nearest(lab.a()),
                        Limits.CHROMATIC.nearest(lab.b())),
                order);
    }
}
