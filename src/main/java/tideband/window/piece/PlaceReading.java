package tideband.window.piece;

import java.util.Locale;
import java.util.OptionalDouble;

/**
 * What is at a place of the piece.
 *
 * @param atMm position in mm from end A
 * @param band the band there, 0-based
 * @param filmNm its film in nm
 * @param colour plain colour name with the order, such as {@code sky blue (1)}
 * @param de00 CIEDE2000 difference between wanted and predicted, where something is predicted
 */
public record PlaceReading(double atMm, int band, double filmNm, String colour, OptionalDouble de00) {

    /**
     * All in one line.
     *
     * @param place the position as lengths are shown
     * @return such as {@code 62.3 mm · 71.2 nm · sky blue (1) · dE00 0.8}
     */
    public String line(String place) {
        String line = String.format(Locale.ROOT, "%s · %.1f nm · %s", place, filmNm, colour);
        return de00.isPresent() ? line + String.format(Locale.ROOT, " · dE00 %.1f", de00.getAsDouble()) : line;
    }
}
