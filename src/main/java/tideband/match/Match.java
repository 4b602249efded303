package tideband.match;

/**
 * A film that comes nearer to a wanted colour than the films beside it.
 *
 * @param colour the film and what it looks like
 * @param volts the volts that grow it, in V
 * @param difference how far its colour is from the wanted one, dE00
 * @param windowLowVolts lowest volts of its window, in V
 * @param windowHighVolts highest volts of its window, in V; for what the window means see {@link ColourMatch#find}
 */
public record Match(FilmColour colour, double volts, double difference, double windowLowVolts, double windowHighVolts) {

    /**
     * The film.
     *
     * @return film thickness in nm
     */
    public double filmNm() {
        return colour.filmNm();
    }

    /**
     * Which time round the hue circle the film is.
     *
     * @return 1, 2, 3 …
     */
    public int order() {
        return colour.order();
    }
}
