package tideband.match;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.OptionalInt;
import java.util.function.DoubleUnaryOperator;
import tideband.colour.Ciede2000;
import tideband.colour.Lab;

/**
 * Finds the films that come near a wanted colour.
 *
 * <p>The difference dE00 is read on a grid of films no wider than {@value #GRID_NM} nm from 0 to the film at the bath's ceiling;
 * where a film is nearer than the films beside it, the stretch between those is read every {@value #FINE_NM} nm and the lowest place
 * closed in by golden-section search (J. Kiefer, Proc. Amer. Math. Soc. 4, 502 (1953)). The fine reading is there because
 * CIEDE2000 jumps a little where two hues are opposite, which the search alone could miss. The two ends count where the
 * difference falls towards them.
 */
public final class ColourMatch {

    /** Widest interval of the grid, nm. */
    private static final double GRID_NM = 0.25;
    /** Interval a minimum is read at before it is closed in, nm: the promise. */
    private static final double FINE_NM = 0.01;
    /** Where the closing in stops, nm. */
    private static final double FILM_TOLERANCE_NM = 1e-4;

    private static final double GOLDEN = (Math.sqrt(5) - 1) / 2;

    private final Palette palette;
    private final VoltScale scale;
    private final double maxNm;
    private final int intervals;

    /**
     * A search over one palette and one bath.
     *
     * @param palette the colours of films
     * @param scale film and volts in the bath
     * @throws IllegalArgumentException where the palette ends below the film at the bath's ceiling
     */
    public ColourMatch(Palette palette, VoltScale scale) {
        this.palette = palette;
        this.scale = scale;
        this.maxNm = scale.ceilingNm();
        if (!(maxNm > 0 && maxNm <= palette.maxNm())) {
            throw new IllegalArgumentException("the film at the ceiling of " + scale.ceilingVolts()
                    + " V must be above 0 and within the palette's " + palette.maxNm() + " nm, but was " + maxNm
                    + " nm; build the palette up to it");
        }
        this.intervals = (int) Math.ceil(maxNm / GRID_NM);
    }

    /**
     * Every film that comes near a colour.
     *
     * <p>A match's window is how far the volts may stray. Where the match is within {@code within} of the wanted colour, the
     * window runs as far as the difference to the <em>wanted</em> colour stays so. Where it is not, no volts would do, and the
     * window runs as far as the difference to the <em>matched</em> colour stays within {@code within}. Either ends at film 0
     * and at the ceiling.
     *
     * @param wanted the colour, CIELAB against the white of its own light
     * @param within how near is near enough, dE00, above 0
     * @return every film nearer than its neighbours, nearest first
     */
    public Matches find(Lab wanted, double within) {
        if (!(within > 0 && Double.isFinite(within))) {
            throw new IllegalArgumentException("within must be a finite dE00 above 0, but was " + within);
        }
        List<Match> matches = new ArrayList<>();
        for (double filmNm : nearFilmsNm(from(wanted))) {
            matches.add(match(wanted, within, filmNm));
        }
        matches.sort(Comparator.comparingDouble(Match::difference).thenComparingDouble(Match::filmNm));
        return new Matches(wanted, within, matches);
    }

    /**
     * The film to draw a colour with: what {@link #find} would put first, at a fraction of the cost, for volts and windows are left
     * out.
     *
     * @param wanted the colour, CIELAB against the white of its own light
     * @param order the order asked for, if any
     * @return the nearest film, in nm; empty where no film of that order comes near it
     */
    public OptionalDouble nearestFilmNm(Lab wanted, OptionalInt order) {
        DoubleUnaryOperator difference = from(wanted);
        return nearFilmsNm(difference).stream()
                .filter(film -> order.isEmpty() || palette.orderAt(film) == order.getAsInt())
                .min(Comparator.comparingDouble((Double film) -> difference.applyAsDouble(film))
                        .thenComparingDouble(film -> film))
                .map(OptionalDouble::of)
                .orElseGet(OptionalDouble::empty);
    }

    /** The films nearer than the films beside them, thinnest first; at least one. */
    private List<Double> nearFilmsNm(DoubleUnaryOperator difference) {
        double[] onGrid = new double[intervals + 1];
        for (int i = 0; i <= intervals; i++) {
            onGrid[i] = difference.applyAsDouble(film(i));
        }
        List<Double> films = new ArrayList<>();
        for (int i = 0; i <= intervals; i++) {
            boolean fallsTowards = i == 0 || onGrid[i] <= onGrid[i - 1];
            boolean risesAfter = i == intervals || onGrid[i] < onGrid[i + 1];
            if (fallsTowards && risesAfter) {
                double low = film(Math.max(0, i - 1));
                double high = film(Math.min(intervals, i + 1));
                films.add(lowest(difference, low, high));
            }
        }
        return films;
    }

    private double film(int i) {
        return maxNm * i / intervals;
    }

    private DoubleUnaryOperator from(Lab reference) {
        return filmNm -> Ciede2000.between(reference, palette.labAt(filmNm));
    }

    /** The film of least difference between two films, either of which may be it. */
    private static double lowest(DoubleUnaryOperator difference, double from, double to) {
        int parts = (int) Math.ceil((to - from) / FINE_NM);
        double nearest = from;
        double least = difference.applyAsDouble(from);
        for (int i = 1; i <= parts; i++) {
            double film = from + (to - from) * i / parts;
            double there = difference.applyAsDouble(film);
            if (there < least) {
                least = there;
                nearest = film;
            }
        }
        double pitch = (to - from) / parts;
        double closer = closedIn(difference, Math.max(from, nearest - pitch), Math.min(to, nearest + pitch));
        return difference.applyAsDouble(closer) < least ? closer : nearest;
    }

    private static double closedIn(DoubleUnaryOperator difference, double from, double to) {
        double low = from;
        double high = to;
        double left = high - GOLDEN * (high - low);
        double right = low + GOLDEN * (high - low);
        double atLeft = difference.applyAsDouble(left);
        double atRight = difference.applyAsDouble(right);
        while (high - low > FILM_TOLERANCE_NM) {
            if (atLeft <= atRight) {
                high = right;
                right = left;
                atRight = atLeft;
                left = high - GOLDEN * (high - low);
                atLeft = difference.applyAsDouble(left);
            } else {
                low = left;
                left = right;
                atLeft = atRight;
                right = low + GOLDEN * (high - low);
                atRight = difference.applyAsDouble(right);
            }
        }
        return (low + high) / 2;
    }

    private Match match(Lab wanted, double within, double filmNm) {
        FilmColour colour = palette.at(filmNm);
        double difference = Ciede2000.between(wanted, colour.lab());
        DoubleUnaryOperator strayed = from(difference <= within ? wanted : colour.lab());
        return new Match(
                colour,
                scale.volts(filmNm),
                difference,
                scale.volts(edge(strayed, within, filmNm, -GRID_NM)),
                scale.volts(edge(strayed, within, filmNm, GRID_NM)));
    }

    /** The last film, going out from one by steps, before the difference first passes a limit. */
    private double edge(DoubleUnaryOperator strayed, double within, double fromNm, double stepNm) {
        double inside = fromNm;
        while (inside > 0 || stepNm > 0) {
            double next = Math.min(maxNm, Math.max(0, inside + stepNm));
            if (next == inside) {
                return inside;
            }
            if (strayed.applyAsDouble(next) > within) {
                return bisected(strayed, within, inside, next);
            }
            inside = next;
        }
        return inside;
    }

    private static double bisected(DoubleUnaryOperator strayed, double within, double insideNm, double outsideNm) {
        double inside = insideNm;
        double outside = outsideNm;
        while (Math.abs(outside - inside) > FILM_TOLERANCE_NM) {
            double middle = (inside + outside) / 2;
            if (strayed.applyAsDouble(middle) > within) {
                outside = middle;
            } else {
                inside = middle;
            }
        }
        return inside;
    }
}
