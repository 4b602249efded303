package tideband.oxide;

/**
 * A bath: the electrolyte and everything fitted to it for one metal.
 *
 * @param name what the user calls it
 * @param metal the metal it is fitted for
 * @param nmPerVolt anodizing ratio {@code k} at 0.1 mA/cm², in nm/V
 * @param fieldSlope field slope {@code s} at 0.1 mA/cm², dimensionless
 * @param nativeNm native film {@code d0} in nm, where growth starts
 * @param efficiency current efficiency, above 0 to 1
 * @param resistanceOhm resistance between the supply's terminals and the film, in ohm
 * @param ceilingVolts volts not to be passed in this bath (breakdown, crystallisation)
 * @param indexScale factor on the oxide's refractive index, 1 for the published constants
 * @param source where the numbers come from, for people to read
 */
public record Bath(
        String name,
        Metal metal,
        double nmPerVolt,
        double fieldSlope,
        double nativeNm,
        double efficiency,
        double resistanceOhm,
        double ceilingVolts,
        double indexScale,
        String source) {

    /** Refuses values no bath can have. */
    public Bath {
        requireBetween("nmPerVolt", nmPerVolt, 0.1, 20);
        requireBetween("fieldSlope", fieldSlope, 5, 200);
        requireBetween("nativeNm", nativeNm, 0.1, 20);
        requireBetween("efficiency", efficiency, 0.01, 1);
        requireBetween("resistanceOhm", resistanceOhm, 0, 10_000);
        requireBetween("ceilingVolts", ceilingVolts, 1, 500);
        requireBetween("indexScale", indexScale, 0.5, 1.5);
        resistanceOhm += 0.0; // minus zero becomes zero
    }

    private static void requireBetween(String name, double value, double low, double high) {
        if (!(value >= low && value <= high)) {
            throw new IllegalArgumentException(name + " must be from " + low + " to " + high + ", but was " + value);
        }
    }

    /**
     * The same bath with another resistance.
     *
     * @param ohm resistance in ohm
     * @return the changed bath
     */
    public Bath withResistanceOhm(double ohm) {
        return new Bath(
                name, metal, nmPerVolt, fieldSlope, nativeNm, efficiency, ohm, ceilingVolts, indexScale, source);
    }

    /**
     * The same bath with another current efficiency.
     *
     * @param share efficiency, above 0 to 1
     * @return the changed bath
     */
    public Bath withEfficiency(double share) {
        return new Bath(
                name, metal, nmPerVolt, fieldSlope, nativeNm, share, resistanceOhm, ceilingVolts, indexScale, source);
    }
}
