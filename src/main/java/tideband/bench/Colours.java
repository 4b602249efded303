package tideband.bench;

import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalInt;
import tideband.colour.Lab;
import tideband.colour.Viewing;
import tideband.design.Design;
import tideband.match.FilmColour;
import tideband.match.Palette;
import tideband.match.VoltScale;
import tideband.optics.FilmSystem;
import tideband.oxide.Coupon;

/**
 * The colours a design's metal, finish, light and bath can show, and the volts of a coupon that give them. Costly to
 * build and good for as long as none of these changes.
 *
 * @param palette the colour of every film
 * @param scale between films and the volts of a coupon at the end of the design's hold, up to what bath and supply allow
 * @param viewing light and observer
 */
public record Colours(Palette palette, VoltScale scale, Viewing viewing) {
    /** Films may come out above the ceiling's by creep and by rounding; the palette reaches this much farther. */
    private static final double MARGIN = 1.25;

    private static final double MARGIN_NM = 20;

    /**
     * The colours of a design.
     *
     * @param design the design
     * @return its colours
     * @throws IllegalArgumentException where there is an {@link #obstacle}
     */
    public static Colours of(Design design) {
        VoltScale scale = scale(design);
        Viewing viewing = Viewing.of(design.light(), design.observer());
        Palette palette = new Palette(
                FilmSystem.of(design.metal().opticsKey(), design.bath().indexScale()),
                design.finish(),
                viewing,
                0,
                reachNm(scale));
        return new Colours(palette, scale, viewing);
    }

    /**
     * Why a design has no colours, where its bath and supply could grow films thicker than colours are known for.
     *
     * @param design the design
     * @return what stands in the way, or nothing
     */
    public static Optional<Obstacle> obstacle(Design design) {
        VoltScale scale = scale(design);
        if (reachNm(scale) <= Palette.MOST_NM) {
            return Optional.empty();
        }
        return Optional.of(new Obstacle(
                "the design",
                String.format(
                        Locale.ROOT,
                        "this bath gives up to %.0f nm at %.1f V, and colours are known for films up to %.0f nm",
                        scale.ceilingNm(),
                        scale.ceilingVolts(),
                        (Palette.MOST_NM - MARGIN_NM) / MARGIN),
                "take a bath of less film a volt or of a lower ceiling, or a supply of fewer volts",
                OptionalInt.empty(),
                fewerVolts(design)));
    }

    /** The supply kept, but turned no higher than colours are known for. */
    private static Optional<Mend> fewerVolts(Design design) {
        double volts = coupon(design).volts((Palette.MOST_NM - MARGIN_NM) / MARGIN);
        double dialVolts = design.supply().dialVolts();
        for (double most = design.supply().highestVolts(volts);
                most > 0;
                most = design.supply().highestVolts(most - dialVolts)) {
            Mend mend = new Mends(design).atMostVolts(most);
            if (reachNm(scale(mend.design())) <= Palette.MOST_NM) {
                return Optional.of(mend);
            }
        }
        return Optional.empty();
    }

    /** These colours for a changed design: the palette is kept where it still holds, for it is costly. */
    Colours fittedTo(Design before, Design changed) {
        boolean same = before.metal() == changed.metal()
                && before.finish() == changed.finish()
                && before.light() == changed.light()
                && before.observer() == changed.observer()
                && before.bath().equals(changed.bath());
        VoltScale changedScale = scale(changed);
        return same && changedScale.ceilingNm() * MARGIN <= palette.maxNm()
                ? new Colours(palette, changedScale, viewing)
                : of(changed);
    }

    private static VoltScale scale(Design design) {
        Coupon coupon = coupon(design);
        double mostVolts = design.supply().highestVolts(design.bath().ceilingVolts());
        return new VoltScale(mostVolts, coupon::filmNm, coupon::volts);
    }

    private static Coupon coupon(Design design) {
        return new Coupon(
                design.bath(), design.supply().maxAmps(), design.pull().holdS(), Coupon.USUAL_CM2);
    }

    private static double reachNm(VoltScale scale) {
        return scale.ceilingNm() * MARGIN + MARGIN_NM;
    }

    /**
     * The films of a design's bands as they are drawn, whether or not they are within reach: colours matched, volts turned
     * into films.
     *
     * @param design a design these colours are good for
     * @return one a band, from end A to end B
     */
    public List<DrawnFilm> filmsOf(Design design) {
        return new BandFilms(design, this)
                .find().stream()
                        .map(drawn -> new DrawnFilm(drawn.aSideNm(), drawn.bSideNm()))
                        .toList();
    }

    /**
     * The colour of a film.
     *
     * @param filmNm film in nm, 0 for bare metal, up to the palette's end
     * @return the colour it shows
     */
    public FilmColour ofFilm(double filmNm) {
        return palette.at(filmNm);
    }

    /**
     * A colour as a screen shows it.
     *
     * @param lab the colour in CIELAB against the design's own light
     * @return {@code #rrggbb}, mapped into the gamut of sRGB
     */
    public String hexOf(Lab lab) {
        return viewing.srgb(lab).hex();
    }
}
