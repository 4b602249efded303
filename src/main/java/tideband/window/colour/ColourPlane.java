package tideband.window.colour;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.Colours;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;
import tideband.colour.Srgb;

/**
 * All colours of one chroma, hue across and lightness up, as cells; of each it is known whether a film comes near it.
 *
 * <p>A cell counts as reached where one of the films every {@value #FILM_STEP_NM} nm is within the given dE00 of its middle.
 * Most films are passed over by their lightness alone: what hue and chroma add to a difference is never below 0 (ISO/CIE
 * 11664-6, the rotation term included), so dE00 is at least {@code dL / S_L}, and {@code S_L} is at most {@value #LARGEST_SL}.
 */
public final class ColourPlane {
    /** Cells across: one each 4 degrees of hue. */
    public static final int COLUMNS = 90;
    /** Cells up: one each 2 of lightness. */
    public static final int ROWS = 50;

    static final double FILM_STEP_NM = 0.5;
    /** {@code 1 + 0.015 · 50² / √(20 + 50²)}, where the mean lightness is 0 or 100. */
    static final double LARGEST_SL = 1.748;

    private final double chroma;
    private final int[] rgb = new int[COLUMNS * ROWS];
    private final boolean[] reached = new boolean[COLUMNS * ROWS];

    private ColourPlane(double chroma) {
        this.chroma = chroma;
    }

    /**
     * Works a plane out.
     *
     * @param colours the colours of the design
     * @param chroma the chroma C* of all cells
     * @param within how near is near enough, dE00
     * @return the plane
     */
    public static ColourPlane of(Colours colours, double chroma, double within) {
        List<Lab> films = new ArrayList<>();
        double endNm = colours.scale().ceilingNm();
        for (double filmNm = 0; filmNm < endNm; filmNm += FILM_STEP_NM) {
            films.add(colours.palette().labAt(filmNm));
        }
        films.add(colours.palette().labAt(endNm));
        ColourPlane plane = new ColourPlane(chroma);
        for (int row = 0; row < ROWS; row++) {
            for (int column = 0; column < COLUMNS; column++) {
                Lab lab = plane.labAt(column, row);
                int cell = row * COLUMNS + column;
                plane.rgb[cell] = rgb(colours, lab);
                plane.reached[cell] = reached(films, lab, within);
            }
        }
        return plane;
    }

    private static int rgb(Colours colours, Lab lab) {
        Srgb screen = colours.viewing().srgb(lab);
        return (int) Math.round(screen.red() * 255) << 16
                | (int) Math.round(screen.green() * 255) << 8
                | (int) Math.round(screen.blue() * 255);
    }

    private static boolean reached(List<Lab> films, Lab lab, double within) {
        for (Lab film : films) {
            if (Math.abs(film.lightness() - lab.lightness()) <= LARGEST_SL * within
                    && Ciede2000.between(film, lab) <= within) {
                return true;
            }
        }
        return false;
    }

    /**
     * The chroma of all cells.
     *
     * @return C*
     */
    public double chroma() {
        return chroma;
    }

    /**
     * The colour in the middle of a cell.
     *
     * @param column 0 for hue 0 upwards
     * @param row 0 for the darkest upwards
     * @return CIELAB against the white of the design's light
     */
    public Lab labAt(int column, int row) {
        return lab((column + 0.5) * 360 / COLUMNS, (row + 0.5) * 100 / ROWS, chroma);
    }

    /**
     * A colour by hue, lightness and chroma.
     *
     * @param hueDegrees hue angle in degrees
     * @param lightness L*
     * @param chroma C*
     * @return the colour
     */
    static Lab lab(double hueDegrees, double lightness, double chroma) {
        double angle = Math.toRadians(hueDegrees);
        return new Lab(lightness, chroma * Math.cos(angle), chroma * Math.sin(angle));
    }

    /**
     * How a screen shows a cell.
     *
     * @param column 0 for hue 0 upwards
     * @param row 0 for the darkest upwards
     * @return {@code 0xrrggbb}; paler than meant where the screen cannot show it
     */
    public int rgbAt(int column, int row) {
        return rgb[row * COLUMNS + column];
    }

    /**
     * Whether a film comes near a cell.
     *
     * @param column 0 for hue 0 upwards
     * @param row 0 for the darkest upwards
     * @return true if one does
     */
    public boolean reachedAt(int column, int row) {
        return reached[row * COLUMNS + column];
    }
}
