package tideband.oxide;

/**
 * The high-field law in the form it is published in, {@code i = i0 exp(beta E)}, with a pair (i0, beta) for each oxide.
 *
 * <p>The form is that of A. Güntherschulze and H. Betz (Z. Phys. 92, 367, 1934) and L. Young, Anodic Oxide Films (Academic
 * Press, 1961). The pairs are derived, not published: each is fitted to the oxide's nm/V at 1 mA/cm² (2.00, 2.30, 1.66)
 * with beta·E of 30 and 36 there.
 */
enum FieldPair {
    TIO2(Metal.TITANIUM, 9.4e-17, 6.0e-6),
    NB2O5(Metal.NIOBIUM, 2.1e-19, 8.3e-6),
    TA2O5(Metal.TANTALUM, 2.1e-19, 6.0e-6);

    private static final double REFERENCE_A_PER_CM2 = 1e-4;
    private static final double NM_PER_CM = 1e7;

    final Metal metal;
    final double i0AmpsPerCm2;
    final double betaCmPerVolt;

    FieldPair(Metal metal, double i0AmpsPerCm2, double betaCmPerVolt) {
        this.metal = metal;
        this.i0AmpsPerCm2 = i0AmpsPerCm2;
        this.betaCmPerVolt = betaCmPerVolt;
    }

    /** Film a volt at a current density: {@code 1 / E}. */
    double nmPerVolt(double ampsPerCm2) {
        return betaCmPerVolt * NM_PER_CM / Math.log(ampsPerCm2 / i0AmpsPerCm2);
    }

    /**
     * The same law as a bath without resistance, at full efficiency: {@code k = 1 / E_ref}, {@code s = beta E_ref} at 0.1
     * mA/cm². Its native film is the thinnest a bath may have.
     */
    Bath bath() {
        double slope = Math.log(REFERENCE_A_PER_CM2 / i0AmpsPerCm2);
        return new Bath("pair", metal, nmPerVolt(REFERENCE_A_PER_CM2), slope, 0.1, 1, 0, 500, 1, "derived");
    }
}
