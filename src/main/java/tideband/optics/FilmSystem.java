package tideband.optics;

import java.util.Set;
import org.apache.commons.math3.complex.Complex;

/**
 * A metal and its own oxide.
 *
 * @param metal optical constants of the metal
 * @param oxide optical constants of the oxide, as published
 * @param indexScale factor on the oxide's refractive index n (not on k), 1 for the published constants; a fitted film is
 *     often a little lighter or denser than the one in the table
 */
public record FilmSystem(Dispersion metal, Dispersion oxide, double indexScale) {

    private static final Set<String> KEYS = Set.of("titanium", "niobium", "tantalum");

    /** Refuses scales no film can have. */
    public FilmSystem {
        if (!(indexScale >= 0.5 && indexScale <= 1.5)) {
            throw new IllegalArgumentException("indexScale must be from 0.5 to 1.5, but was " + indexScale);
        }
    }

    /**
     * The default constants of a metal and its oxide.
     *
     * @param opticsKey {@code titanium}, {@code niobium} or {@code tantalum}
     * @param indexScale factor on the oxide's n
     * @return the pair
     * @throws IllegalArgumentException for another metal or a scale outside 0.5 to 1.5
     */
    public static FilmSystem of(String opticsKey, double indexScale) {
        if (!KEYS.contains(opticsKey)) {
            throw new IllegalArgumentException(
                    "optical constants are known for titanium, niobium and tantalum, but not for " + opticsKey);
        }
        return new FilmSystem(
                Dispersion.read(opticsKey + ".csv"), Dispersion.read(opticsKey + "-oxide.csv"), indexScale);
    }

    /**
     * The metal's index.
     *
     * @param wavelengthNm wavelength in nm
     * @return n + ik
     */
    public Complex metalIndex(double wavelengthNm) {
        return metal.at(wavelengthNm);
    }

    /**
     * The film's index, scaled.
     *
     * @param wavelengthNm wavelength in nm
     * @return indexScale · n + ik
     */
    public Complex filmIndex(double wavelengthNm) {
        Complex published = oxide.at(wavelengthNm);
        return new Complex(published.getReal() * indexScale, published.getImaginary());
    }
}
