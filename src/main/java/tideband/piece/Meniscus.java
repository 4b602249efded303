package tideband.piece;

/**
 * How far liquid climbs a wetted piece above its flat level.
 *
 * <p>The liquid is taken as water at 20 °C in a wide vessel: surface tension 72.8 mN/m, density 998.2 kg/m³. Salts raise
 * the tension by 1 to 3 %, and the rise by half as much at most; a surfactant may halve it, and then the rise is about 0.7
 * of what is given here. The piece stands upright; the slant of a taper is left out.
 *
 * <p>Lengths in units of the capillary length {@code lc} make the shape of the meniscus outside a cylinder of radius
 * {@code X} the solution of the Young-Laplace equation {@code (1/x) d(x sin φ)/dx = z} with {@code z → 0} far away and a
 * slope of 90° less the contact angle at {@code x = X}. It has no closed form, but three limits do: a thin rod (D. F.
 * James, J. Fluid Mech. 63, 657, 1974; B. V. Derjaguin, Dokl. Akad. Nauk SSSR 51, 517, 1946), a flat wall, and a slope so
 * small that the equation is linear, where {@code z} is a modified Bessel function {@code K0}. {@link #rodRiseMm} is a
 * formula of our own that has all three limits; it keeps within 0.4 % of the numerical solution for every radius and angle.
 */
public final class Meniscus {

    /** Surface tension of water at 20 °C, N/m. */
    static final double SURFACE_TENSION_N_PER_M = 72.8e-3;

    /** Density of water at 20 °C, kg/m³. */
    static final double DENSITY_KG_PER_M3 = 998.2;

    /** Standard acceleration of free fall, m/s²: 3rd CGPM (1901). */
    static final double GRAVITY_M_PER_S2 = 9.80665;

    /** The capillary length {@code sqrt(γ / (ρ g))}, in mm: 2.727. */
    public static final double CAPILLARY_LENGTH_MM =
            1e3 * Math.sqrt(SURFACE_TENSION_N_PER_M / (DENSITY_KG_PER_M3 * GRAVITY_M_PER_S2));

    // Where the formula turns from thin rod to wall; fitted to the numerical solution for X from 3e-4 to 300.
    private static final double TURN_FACTOR = 0.93;
    private static final double TURN_POWER = 1.13;

    private Meniscus() {}

    /**
     * The rise on a piece.
     *
     * <p>Round pieces and tubes are rods of their outer radius; what happens in the bore is not considered. A flat piece is
     * taken as a wide plate, which is too much for a narrow strip: its edges lift less, and the rise lies between this
     * and that of a rod with the same outline.
     *
     * @param piece the piece
     * @param atMm where the liquid's edge is, in mm from end A
     * @param contactAngleDeg contact angle in degrees, 0 (fully wet) to 90
     * @return rise above the flat level in mm
     */
    public static double riseMm(Piece piece, double atMm, double contactAngleDeg) {
        double sizeMm = piece.sizeMm(atMm);
        return piece.section() instanceof Section.Flat
                ? plateRiseMm(contactAngleDeg)
                : rodRiseMm(sizeMm / 2, contactAngleDeg);
    }

    /**
     * How far the line may lie from its middle place, as a clean surface may meet the liquid at anything from 0 to 20
     * degrees: half the difference of the two rises.
     *
     * @param piece the piece
     * @param atMm where the liquid's edge is, in mm from end A
     * @return half the width of the blurred stretch in mm
     */
    public static double blurMm(Piece piece, double atMm) {
        double wettedMm = riseMm(piece, atMm, Waterline.WETTED_ANGLE_DEG);
        return (wettedMm - riseMm(piece, atMm, Waterline.CLEAN_OXIDE_ANGLE_DEG)) / 2;
    }

    /**
     * The rise on a wide upright plate, {@code lc · sqrt(2 (1 − sin θ))}: exact (L. D. Landau and E. M. Lifshitz, Fluid
     * Mechanics, 2nd ed. 1987, section 61).
     *
     * @param contactAngleDeg contact angle in degrees, 0 to 90
     * @return rise above the flat level in mm
     */
    public static double plateRiseMm(double contactAngleDeg) {
        requireAngle(contactAngleDeg);
        return CAPILLARY_LENGTH_MM * Math.sqrt(2 * (1 - Math.sin(Math.toRadians(contactAngleDeg))));
    }

    /**
     * The rise on the outside of an upright rod of any radius, within 0.4 % of the Young-Laplace equation.
     *
     * <p>With {@code p = sqrt((1 + sin θ) / 2)} the rise is {@code lc (cos θ / q) K0(qX) / K1(qX)}. A thin rod needs
     * {@code q = p²} and a wall {@code q = p}; at small slopes {@code p = 1}. In between {@code q = p^(2 − w)} with
     * {@code w = X^n / (X^n + c)}, {@code c = 0.93} and {@code n = 1.13}.
     *
     * @param radiusMm radius of the rod in mm, above 0
     * @param contactAngleDeg contact angle in degrees, 0 to 90
     * @return rise above the flat level in mm
     */
    public static double rodRiseMm(double radiusMm, double contactAngleDeg) {
        requireAngle(contactAngleDeg);
        if (!(radiusMm > 0 && Double.isFinite(radiusMm))) {
            throw new IllegalArgumentException("radiusMm must be finite and above 0, but was " + radiusMm);
        }
        double angle = Math.toRadians(contactAngleDeg);
        double radius = radiusMm / CAPILLARY_LENGTH_MM;
        double power = Math.pow(radius, TURN_POWER);
        double wallness = power / (power + TURN_FACTOR);
        double q = Math.pow((1 + Math.sin(angle)) / 2, 1 - wallness / 2);
        return CAPILLARY_LENGTH_MM * Math.cos(angle) / q * besselK0OverK1(q * radius);
    }

    /**
     * The ratio of the modified Bessel functions {@code K0} and {@code K1}, from {@code Kν(x) = ∫ exp(−x cosh t) cosh(νt)
     * dt} over t from 0 (NIST Digital Library of Mathematical Functions, equation 10.32.9) by the trapezoidal rule, whose
     * error for so smooth an integrand is below 1e-12 of the value.
     *
     * @param x argument, above 0
     * @return the ratio, from 0 towards 1
     */
    static double besselK0OverK1(double x) {
        int steps = 48;
        // Beyond this the integrand is below e^-40 of its value at 0.
        double reach = Math.log1p(40 / x + Math.sqrt(40 / x * (40 / x + 2)));
        double k0 = 0.5;
        double k1 = 0.5;
        for (int i = 1; i <= steps; i++) {
            double t = reach * i / steps;
            double half = Math.sinh(t / 2);
            double falling = Math.exp(-2 * x * half * half);
            k0 += falling;
            k1 += falling * Math.cosh(t);
        }
        return k0 / k1;
    }

    private static void requireAngle(double contactAngleDeg) {
        if (!(contactAngleDeg >= 0 && contactAngleDeg <= 90)) {
            throw new IllegalArgumentException(
                    "contactAngleDeg must be from 0 to 90 degrees, but was " + contactAngleDeg);
        }
    }
}
