package tideband.colour;

/**
 * The Bradford chromatic adaptation in its linear form: cone-like responses are scaled from one white to another.
 *
 * <p>Matrix: K. M. Lam, thesis, University of Bradford (1985), in the digits of ICC.1:2022 annex E.
 */
final class Bradford {

    private static final Matrix3 RESPONSE = new Matrix3(
            0.8951, 0.2664, -0.1614, //
            -0.7502, 1.7135, 0.0367, //
            0.0389, -0.0685, 1.0296);

    private Bradford() {}

    static Matrix3 between(Xyz fromWhite, Xyz toWhite) {
        Xyz from = RESPONSE.times(fromWhite);
        Xyz to = RESPONSE.times(toWhite);
        Matrix3 scale = Matrix3.diagonal(to.x() / from.x(), to.y() / from.y(), to.z() / from.z());
        return RESPONSE.inverse().times(scale).times(RESPONSE);
    }
}
