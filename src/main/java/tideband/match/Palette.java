package tideband.match;

import java.util.List;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.Srgb;
import tideband.colour.TradeName;
import tideband.colour.Viewing;
import tideband.colour.Xyz;
import tideband.optics.FilmSeries;
import tideband.optics.FilmSystem;
import tideband.optics.Finish;
import tideband.optics.Surface;

/**
 * The colour of every film on one metal, with one finish, in one light, under one angle.
 *
 * <p>{@link #at} computes the colour of just that film. {@link #labAt} is many times quicker: it reads a table of films every
 * {@value #STEP_NM} nm by cubic interpolation
 * of X, Y and Z, within 1e-5 dE00 of the computed colour.
 */
public final class Palette {

    /** The thickest film a palette may reach, nm. */
    public static final int MOST_NM = 2000;

    /** Interval of the table, nm. */
    static final double STEP_NM = 0.25;

    /** A film no thicker than this that changes the bare colour by less than a casual look sees is called natural. */
    private static final double NATURAL_UP_TO_NM = 10;

    private static final double UNNOTICED = 3;

    private final Surface surface;
    private final Viewing viewing;
    private final double maxNm;
    private final double[] x;
    private final double[] y;
    private final double[] z;
    private final Orders orders;
    private final Lab bare;

    /**
     * A palette.
     *
     * @param system metal and oxide
     * @param finish how far the surface is from a mirror
     * @param viewing how it is looked at
     * @param angleDegrees viewing angle from the normal in degrees, 0 to 85
     * @param maxNm thickest film in nm, above 0 to {@link #MOST_NM}
     */
    public Palette(FilmSystem system, Finish finish, Viewing viewing, double angleDegrees, double maxNm) {
        this(new Surface(system, finish, angleDegrees), viewing, maxNm);
    }

    private Palette(Surface surface, Viewing viewing, double maxNm) {
        if (!(maxNm > 0 && maxNm <= MOST_NM)) {
            throw new IllegalArgumentException("maxNm must be above 0 to " + MOST_NM + " nm, but was " + maxNm);
        }
        this.surface = surface;
        this.viewing = viewing;
        this.maxNm = maxNm;
        // Two films beyond the last, so that a cubic fits around every place.
        int count = (int) Math.ceil(maxNm / STEP_NM) + 3;
        List<Xyz> films = FilmSeries.colours(surface, viewing, STEP_NM, count);
        x = films.stream().mapToDouble(Xyz::x).toArray();
        y = films.stream().mapToDouble(Xyz::y).toArray();
        z = films.stream().mapToDouble(Xyz::z).toArray();
        List<Lab> colours = films.stream().map(viewing::lab).toList();
        orders = new Orders(STEP_NM, colours);
        bare = colours.get(0);
    }

    /**
     * The same films seen from another side.
     *
     * @param angleDegrees viewing angle from the normal in degrees, 0 to 85
     * @return the palette at that angle
     */
    public Palette seenAt(double angleDegrees) {
        return new Palette(surface.seenAt(angleDegrees), viewing, maxNm);
    }

    /**
     * The thickest film of this palette.
     *
     * @return film thickness in nm
     */
    public double maxNm() {
        return maxNm;
    }

    /**
     * The colour of a film, computed for just that film.
     *
     * @param filmNm film thickness in nm, 0 to {@link #maxNm()}
     * @return its colour, order and name
     * @throws IllegalArgumentException for a film outside the palette
     */
    public FilmColour at(double filmNm) {
        requireWithin(filmNm);
        Xyz xyz = viewing.xyz(surface.reflectance(filmNm));
        Lab lab = viewing.lab(xyz);
        Srgb screen = viewing.srgb(xyz);
        return new FilmColour(filmNm, orders.at(filmNm), name(filmNm, lab), xyz, lab, screen.hex(), screen.inGamut());
    }

    private TradeName name(double filmNm, Lab lab) {
        boolean unseen = filmNm <= NATURAL_UP_TO_NM && Ciede2000.between(bare, lab) < UNNOTICED;
        return unseen ? TradeName.NATURAL : TradeName.of(lab);
    }

    /**
     * The CIELAB colour of a film, read from the table.
     *
     * @param filmNm film thickness in nm, 0 to {@link #maxNm()}
     * @return its colour, within 1e-5 dE00 of {@link #at}
     * @throws IllegalArgumentException for a film outside the palette
     */
    public Lab labAt(double filmNm) {
        requireWithin(filmNm);
        double place = filmNm / STEP_NM;
        int first = Math.min(Math.max((int) place - 1, 0), x.length - 4);
        double t = place - first;
        // Lagrange's cubic through the four films around the place.
        double w0 = -(t - 1) * (t - 2) * (t - 3) / 6;
        double w1 = t * (t - 2) * (t - 3) / 2;
        double w2 = -t * (t - 1) * (t - 3) / 2;
        double w3 = t * (t - 1) * (t - 2) / 6;
        return viewing.lab(new Xyz(
                w0 * x[first] + w1 * x[first + 1] + w2 * x[first + 2] + w3 * x[first + 3],
                w0 * y[first] + w1 * y[first + 1] + w2 * y[first + 2] + w3 * y[first + 3],
                w0 * z[first] + w1 * z[first + 1] + w2 * z[first + 2] + w3 * z[first + 3]));
    }

    /**
     * The order of a film: how many times the hue circle has been passed on the way to it.
     *
     * @param filmNm film thickness in nm, 0 to {@link #maxNm()}
     * @return 1, 2, 3 …
     * @throws IllegalArgumentException for a film outside the palette
     */
    public int orderAt(double filmNm) {
        requireWithin(filmNm);
        return orders.at(filmNm);
    }

    /**
     * The name of a film's colour, read from the table: as {@link #at} names it, but for a film within 1e-5 dE00 of where one
     * name ends and the next begins.
     *
     * @param filmNm film thickness in nm, 0 to {@link #maxNm()}
     * @return the name
     * @throws IllegalArgumentException for a film outside the palette
     */
    public TradeName nameAt(double filmNm) {
        return name(filmNm, labAt(filmNm));
    }

    private void requireWithin(double filmNm) {
        if (!(filmNm >= 0 && filmNm <= maxNm)) {
            throw new IllegalArgumentException("filmNm must be from 0 to " + maxNm + " nm, but was " + filmNm);
        }
    }
}
