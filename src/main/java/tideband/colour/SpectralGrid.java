package tideband.colour;

import java.util.stream.IntStream;

/** The wavelengths colour is summed at: 380 to 780 nm at 5 nm (ISO/CIE 11664-3). */
public final class SpectralGrid {

    /** The first wavelength, nm. */
    public static final double FIRST_NM = 380;
    /** The interval, nm. */
    public static final double STEP_NM = 5;
    /** How many wavelengths there are. */
    public static final int COUNT = 81;

    private SpectralGrid() {}

    /**
     * One of the wavelengths.
     *
     * @param index 0 to {@link #COUNT} − 1
     * @return wavelength in nm
     */
    public static double wavelengthNm(int index) {
        return FIRST_NM + STEP_NM * index;
    }

    /**
     * All of the wavelengths.
     *
     * @return wavelengths in nm, rising
     */
    public static double[] wavelengthsNm() {
        return IntStream.range(0, COUNT).mapToDouble(SpectralGrid::wavelengthNm).toArray();
    }
}
