package tideband.oxide;

import java.util.List;
import java.util.Optional;

/**
 * Baths to start from, by metal, until a coupon has been run.
 *
 * <p>Field slope, native film and efficiency are the metal's usual ones. The anodizing ratios hold at 0.1 mA/cm²; the
 * sources they lean on differ by a fifth for titanium and by a tenth for niobium and tantalum. A bath's resistance of
 * 2 ohm is common practice, no source: it is that of plates of 100 cm² some 10 cm apart at 47 mS/cm.
 */
public final class BathPresets {

    private static final double RESISTANCE_OHM = 2;

    private static final String STARTING_POINT = " A starting point until a coupon has been run.";

    private static final String PHOSPHATE = "phosphate";
    private static final String SULFURIC = "sulfuric";
    private static final String BICARBONATE = "bicarbonate";
    private static final String CARBONATE = "carbonate";

    private static final String TITANIUM_PHOSPHATE =
            "Dilute phosphate or phosphoric acid. Ratio: common practice, near the 1.7 nm/V found in 1 M phosphoric acid"
                    + " (J. Electrochem. Soc. 163, E75, 2016). Ceiling: rough, crystalline film and sparks lie above it"
                    + " (common practice).";
    private static final String TITANIUM_SULFURIC =
            "Dilute sulfuric acid. Ratio: common practice, near the 1.5 nm/V found in 1 M sulfuric acid (J. Electrochem."
                    + " Soc. 163, E75, 2016).";
    private static final String TITANIUM_BICARBONATE =
            "Sodium bicarbonate. Ratio: 1.8 to 2.0 nm/V at 9.7 mA/cm² (J. Mater. Sci. 53, 7294, 2018). Ceiling: common"
                    + " practice.";
    private static final String TITANIUM_CARBONATE =
            "Weak sodium carbonate. Ratio and ceiling: common practice, no source.";
    private static final String SULFURIC_CEILING = " Ceiling: sparks from about 80 V (common practice).";
    private static final String ALLOY_SULFURIC_CEILING = " Ceiling: anatase from 70 V in 1 M (Coatings 7, 39, 2017).";
    private static final String ALLOY_RATIO =
            " For Ti-6Al-4V the ratio of titanium is raised by 5 % (common practice).";

    private static final String NIOBIUM =
            " Ratio: one value whatever the acid, between the 2.3 nm/V of fast growth (J. Electrochem. Soc. 113, 277, 1966)"
                    + " and the 2.6 to 2.8 nm/V of slow growth (Mater. Sci. Eng. R 11, 243, 1993), both from memory."
                    + " Ceiling: the film crystallises when held at 100 V in warm borate (Electrochim. Acta 53, 8203,"
                    + " 2008).";
    private static final String TANTALUM =
            " Ratio: one value whatever the acid, from 1.66 nm/V at 1 mA/cm² (L. Young, Anodic Oxide Films, 1961; from"
                    + " memory) and the slope of the high-field law. Ceiling: common practice in dilute acid.";

    private BathPresets() {}

    /**
     * The presets of a metal, the usual one first.
     *
     * @param metal the metal
     * @return at least one bath, their names all different
     */
    public static List<Bath> of(Metal metal) {
        return switch (metal) {
            case TITANIUM ->
                List.of(
                        bath(PHOSPHATE, metal, 1.80, 100, TITANIUM_PHOSPHATE),
                        bath(SULFURIC, metal, 1.65, 80, TITANIUM_SULFURIC + SULFURIC_CEILING),
                        bath(BICARBONATE, metal, 1.90, 100, TITANIUM_BICARBONATE),
                        bath(CARBONATE, metal, 1.45, 100, TITANIUM_CARBONATE));
            case TI_6AL_4V ->
                List.of(
                        bath(PHOSPHATE, metal, 1.89, 100, TITANIUM_PHOSPHATE + ALLOY_RATIO),
                        bath(SULFURIC, metal, 1.7325, 70, TITANIUM_SULFURIC + ALLOY_SULFURIC_CEILING + ALLOY_RATIO),
                        bath(BICARBONATE, metal, 1.995, 100, TITANIUM_BICARBONATE + ALLOY_RATIO),
                        bath(CARBONATE, metal, 1.5225, 100, TITANIUM_CARBONATE + ALLOY_RATIO));
            case NIOBIUM ->
                List.of(
                        bath(PHOSPHATE, metal, 2.45, 100, "Dilute phosphate or phosphoric acid." + NIOBIUM),
                        bath(SULFURIC, metal, 2.45, 100, "Dilute sulfuric acid." + NIOBIUM));
            case TANTALUM ->
                List.of(
                        bath(PHOSPHATE, metal, 1.77, 150, "Dilute phosphate or phosphoric acid." + TANTALUM),
                        bath(SULFURIC, metal, 1.77, 150, "Dilute sulfuric acid." + TANTALUM));
        };
    }

    /**
     * The preset that is used where none is named.
     *
     * @param metal the metal
     * @return its phosphate bath
     */
    public static Bath usual(Metal metal) {
        return of(metal).get(0);
    }

    /**
     * A preset by its name.
     *
     * @param metal the metal
     * @param name such as {@code phosphate}
     * @return the bath, if the metal has one of that name
     */
    public static Optional<Bath> named(Metal metal, String name) {
        return of(metal).stream().filter(bath -> bath.name().equals(name)).findFirst();
    }

    private static Bath bath(String name, Metal metal, double nmPerVolt, double ceilingVolts, String source) {
        return new Bath(
                name,
                metal,
                nmPerVolt,
                metal.fieldSlope(),
                metal.nativeNm(),
                metal.efficiency(),
                RESISTANCE_OHM,
                ceilingVolts,
                1,
                source + STARTING_POINT);
    }
}
