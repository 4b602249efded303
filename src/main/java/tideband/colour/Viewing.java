package tideband.colour;

/**
 * How a colour is looked at: an illuminant and an observer, as weights on a reflectance at the wavelengths of
 * {@link SpectralGrid}, normalised so that the perfect reflector has {@code Y = 100}.
 */
public final class Viewing {
    /** Halvings of the chroma when it is lowered; 2⁻⁴⁰ of it is far below what a display can step. */
    private static final int HALVINGS = 40;
    /** A lightness may stray from 0 to 100 by this much through rounding and still counts as inside. */
    private static final double ROUNDING = 1e-9;

    private final Illuminant illuminant;
    private final Observer observer;
    private final double[] weightsX = new double[SpectralGrid.COUNT];
    private final double[] weightsY = new double[SpectralGrid.COUNT];
    private final double[] weightsZ = new double[SpectralGrid.COUNT];
    private final Xyz white;
    private final Matrix3 toScreenWhite;
    private final Matrix3 fromScreenWhite;

    private Viewing(Illuminant illuminant, Observer observer) {
        this.illuminant = illuminant;
        this.observer = observer;
        SpectralTable powers = Illuminant.powers();
        SpectralTable functions = observer.colourMatchingFunctions();
        double sumY = 0;
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            double nm = SpectralGrid.wavelengthNm(i);
            double power = powers.at(illuminant.key(), nm);
            weightsX[i] = power * functions.at("xbar", nm);
            weightsY[i] = power * functions.at("ybar", nm);
            weightsZ[i] = power * functions.at("zbar", nm);
            sumY += weightsY[i];
        }
        double k = 100 / sumY;
        double[] perfect = new double[SpectralGrid.COUNT];
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            weightsX[i] *= k;
            weightsY[i] *= k;
            weightsZ[i] *= k;
            perfect[i] = 1;
        }
        white = xyz(perfect);
        toScreenWhite = Bradford.between(white, Srgb.WHITE);
        fromScreenWhite = Bradford.between(Srgb.WHITE, white);
    }

    /**
     * A viewing.
     *
     * @param illuminant the light
     * @param observer the eye
     * @return the viewing
     */
    public static Viewing of(Illuminant illuminant, Observer observer) {
        return new Viewing(illuminant, observer);
    }

    /**
     * The usual viewing: noon daylight, 2 degree observer.
     *
     * @return D65, CIE 1931
     */
    public static Viewing daylight() {
        return of(Illuminant.D65, Observer.CIE_1931_2_DEGREE);
    }

    /**
     * The light.
     *
     * @return the illuminant
     */
    public Illuminant illuminant() {
        return illuminant;
    }

    /**
     * The eye.
     *
     * @return the observer
     */
    public Observer observer() {
        return observer;
    }

    /**
     * The perfect reflector in this light.
     *
     * @return its tristimulus values, Y = 100
     */
    public Xyz white() {
        return white;
    }

    /**
     * What each wavelength's reflectance adds to X.
     *
     * @return a fresh array of {@link SpectralGrid#COUNT} weights
     */
    public double[] weightsX() {
        return weightsX.clone();
    }

    /**
     * What each wavelength's reflectance adds to Y.
     *
     * @return a fresh array of {@link SpectralGrid#COUNT} weights
     */
    public double[] weightsY() {
        return weightsY.clone();
    }

    /**
     * What each wavelength's reflectance adds to Z.
     *
     * @return a fresh array of {@link SpectralGrid#COUNT} weights
     */
    public double[] weightsZ() {
        return weightsZ.clone();
    }

    /**
     * The tristimulus values of a reflectance.
     *
     * @param reflectance shares 0 to 1 at the wavelengths of {@link SpectralGrid}
     * @return X, Y, Z
     * @throws IllegalArgumentException where the number of wavelengths is another
     */
    public Xyz xyz(double[] reflectance) {
        if (reflectance.length != SpectralGrid.COUNT) {
            throw new IllegalArgumentException("reflectance must have " + SpectralGrid.COUNT
                    + " values, 380 to 780 nm at 5 nm, but had " + reflectance.length);
        }
        double x = 0;
        double y = 0;
        double z = 0;
        for (int i = 0; i < SpectralGrid.COUNT; i++) {
            x += weightsX[i] * reflectance[i];
            y += weightsY[i] * reflectance[i];
            z += weightsZ[i] * reflectance[i];
        }
        return new Xyz(x, y, z);
    }

    /**
     * The CIELAB colour of tristimulus values in this light, against its own white.
     *
     * @param colour X, Y, Z
     * @return L*, a*, b*
     */
    public Lab lab(Xyz colour) {
        return Lab.of(colour, white);
    }

    /**
     * The colour a screen colour stands for in this light: the way back from {@link #srgb}, adapted by the Bradford transform
     * from sRGB's white to this light's.
     *
     * @param screen a screen colour
     * @return L*, a*, b* against this light's white
     */
    public Lab lab(Srgb screen) {
        return lab(fromScreenWhite.times(screen.lab().toXyz(Srgb.WHITE)));
    }

    /**
     * How a screen shows tristimulus values seen in this light: adapted by the Bradford transform from this light's white to
     * sRGB's.
     *
     * @param colour X, Y, Z
     * @return the screen colour
     */
    public Srgb srgb(Xyz colour) {
        return Srgb.of(toScreenWhite.times(colour));
    }

    /**
     * How a screen shows a CIELAB colour seen in this light. Adaptation mixes the channels, so that a very strong colour could
     * come out lighter than white or darker than black; its chroma is lowered until it does not.
     *
     * @param colour L* from 0 to 100, a*, b* against this light's white
     * @return the screen colour
     */
    public Srgb srgb(Lab colour) {
        if (showable(colour)) {
            return srgb(colour.toXyz(white));
        }
        double low = 0;
        double high = 1;
        for (int i = 0; i < HALVINGS; i++) {
            double middle = (low + high) / 2;
            if (showable(colour.withChromaTimes(middle))) {
                low = middle;
            } else {
                high = middle;
            }
        }
        Srgb nearest = srgb(colour.withChromaTimes(low).toXyz(white));
        return new Srgb(nearest.red(), nearest.green(), nearest.blue(), false);
    }

    private boolean showable(Lab colour) {
        double lightness =
                Lab.of(toScreenWhite.times(colour.toXyz(white)), Srgb.WHITE).lightness();
        return lightness >= -ROUNDING && lightness <= 100 + ROUNDING;
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Viewing that && illuminant == that.illuminant && observer == that.observer;
    }

    @Override
    public int hashCode() {
        return toString().hashCode();
    }

    @Override
    public String toString() {
        return illuminant.key() + "/" + observer.key();
    }
}
