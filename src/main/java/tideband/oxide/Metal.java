package tideband.oxide;

/**
 * A metal that colours by anodizing, with what Faraday's law and the high-field law need to know of its oxide.
 *
 * <p>Densities, efficiencies, native films and slopes are working defaults derived from the literature and from common
 * practice; a coupon replaces them.
 */
public enum Metal {
    /** Commercially pure titanium, grades 1 and 2; oxide TiO2. */
    TITANIUM("titanium", "titanium", 79.866, 4, 3.8, 27.7, 3.0, 0.9),
    /** Ti-6Al-4V; takes titanium's optical constants, as no open set of its own was found; oxide TiO2. */
    TI_6AL_4V("ti-6al-4v", "titanium", 79.866, 4, 3.8, 27.7, 3.0, 0.9),
    /** Niobium; oxide Nb2O5. */
    NIOBIUM("niobium", "niobium", 265.81, 10, 4.6, 33.7, 4.0, 0.95),
    /** Tantalum; oxide Ta2O5. */
    TANTALUM("tantalum", "tantalum", 441.893, 10, 8.0, 33.7, 3.3, 1.0);

    /** Faraday constant, C/mol: exact since the 2019 SI (CODATA 2018). */
    public static final double FARADAY_C_PER_MOL = 96_485.332_12;

    private final String key;
    private final String opticsKey;
    private final double oxideMolarMassGPerMol;
    private final int electronsPerFormula;
    private final double oxideDensityGPerCm3;
    private final double fieldSlope;
    private final double nativeNm;
    private final double efficiency;

    Metal(
            String key,
            String opticsKey,
            double oxideMolarMassGPerMol,
            int electronsPerFormula,
            double oxideDensityGPerCm3,
            double fieldSlope,
            double nativeNm,
            double efficiency) {
        this.key = key;
        this.opticsKey = opticsKey;
        this.oxideMolarMassGPerMol = oxideMolarMassGPerMol;
        this.electronsPerFormula = electronsPerFormula;
        this.oxideDensityGPerCm3 = oxideDensityGPerCm3;
        this.fieldSlope = fieldSlope;
        this.nativeNm = nativeNm;
        this.efficiency = efficiency;
    }

    /**
     * The word for this metal in files and on the command line.
     *
     * @return a lower-case word such as {@code titanium}
     */
    public String key() {
        return key;
    }

    /**
     * The name of the set of optical constants this metal is drawn with.
     *
     * @return {@code titanium}, {@code niobium} or {@code tantalum}
     */
    public String opticsKey() {
        return opticsKey;
    }

    /**
     * The usual field slope {@code s = beta · E} at 0.1 mA/cm².
     *
     * @return the slope, dimensionless
     */
    public double fieldSlope() {
        return fieldSlope;
    }

    /**
     * The usual thickness of the film the metal has before it is anodized.
     *
     * @return the native film in nm
     */
    public double nativeNm() {
        return nativeNm;
    }

    /**
     * The usual share of the current that grows oxide.
     *
     * @return the current efficiency, 0 to 1
     */
    public double efficiency() {
        return efficiency;
    }

    /**
     * Film grown by a charge at full efficiency, Faraday's law {@code M / (z F rho)}.
     *
     * @return nm of film per mC/cm² of charge
     */
    public double filmNmPerMilliCoulombPerCm2() {
        double cm3PerCoulomb = oxideMolarMassGPerMol / (electronsPerFormula * FARADAY_C_PER_MOL * oxideDensityGPerCm3);
        // 1 mC is 1e-3 C and 1 cm is 1e7 nm.
        return cm3PerCoulomb * 1e4;
    }
}
