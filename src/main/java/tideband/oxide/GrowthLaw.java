package tideband.oxide;

/**
 * The high-field law of one bath, for one patch of surface: how current, field and growth hang together.
 *
 * <p>Source: the law {@code i = A exp(B E)} of Güntherschulze and Betz as treated by L. Young, Anodic Oxide Films
 * (Academic Press, 1961), written round the reference current {@value #REFERENCE_MA_PER_CM2} mA/cm², where
 * {@code E = 1 / k} and {@code B E = s}; growth is Faraday's law times the current efficiency.
 */
public final class GrowthLaw {
    /** The current density at which a bath's ratio and slope are stated, in mA/cm². */
    public static final double REFERENCE_MA_PER_CM2 = 0.1;

    private final double nmPerVolt;
    private final double fieldSlope;
    private final double nativeVolts;
    private final double nmPerMilliCoulombPerCm2;

    /**
     * The law of a bath.
     *
     * @param bath the bath
     */
    public GrowthLaw(Bath bath) {
        this.nmPerVolt = bath.nmPerVolt();
        this.fieldSlope = bath.fieldSlope();
        this.nativeVolts = bath.nativeNm() / bath.nmPerVolt();
        this.nmPerMilliCoulombPerCm2 = bath.efficiency() * bath.metal().filmNmPerMilliCoulombPerCm2();
    }

    /**
     * The current density through a film.
     *
     * @param filmVolts volts across the film
     * @param filmNm film in nm, above 0
     * @return current density in mA/cm²
     */
    public double currentMilliAmpsPerCm2(double filmVolts, double filmNm) {
        return REFERENCE_MA_PER_CM2 * Math.exp(fieldSlope * (nmPerVolt * filmVolts / filmNm - 1));
    }

    /**
     * How fast a current density grows film.
     *
     * @param milliAmpsPerCm2 current density in mA/cm²
     * @return growth in nm/s
     */
    public double growthNmPerS(double milliAmpsPerCm2) {
        return nmPerMilliCoulombPerCm2 * milliAmpsPerCm2;
    }

    /**
     * The current density that grows film at a wanted rate.
     *
     * @param growthNmPerS growth in nm/s
     * @return current density in mA/cm²
     */
    public double currentForGrowth(double growthNmPerS) {
        return growthNmPerS / nmPerMilliCoulombPerCm2;
    }

    /**
     * The law solved for volts: what must lie across a film for it to pass a current density.
     *
     * @param filmNm film in nm, above 0
     * @param milliAmpsPerCm2 current density in mA/cm², above 0
     * @return volts across the film
     */
    public double filmVolts(double filmNm, double milliAmpsPerCm2) {
        return filmNm / nmPerVolt * (1 + Math.log(milliAmpsPerCm2 / REFERENCE_MA_PER_CM2) / fieldSlope);
    }

    /**
     * Volts that the native film counts for: {@code d0 / k}, added to the supply's.
     *
     * @return volts
     */
    public double nativeVolts() {
        return nativeVolts;
    }

    double exponentPerVoltNm() {
        return fieldSlope * nmPerVolt;
    }

    double fieldSlope() {
        return fieldSlope;
    }
}
