package tideband.colour;

/**
 * A 3 × 3 matrix, by rows.
 *
 * @param m00 row 0, column 0
 * @param m01 row 0, column 1
 * @param m02 row 0, column 2
 * @param m10 row 1, column 0
 * @param m11 row 1, column 1
 * @param m12 row 1, column 2
 * @param m20 row 2, column 0
 * @param m21 row 2, column 1
 * @param m22 row 2, column 2
 */
record Matrix3(
        double m00, double m01, double m02, double m10, double m11, double m12, double m20, double m21, double m22) {

    static Matrix3 diagonal(double first, double second, double third) {
        return new Matrix3(first, 0, 0, 0, second, 0, 0, 0, third);
    }

    Xyz times(Xyz v) {
        return new Xyz(
                m00 * v.x() + m01 * v.y() + m02 * v.z(),
                m10 * v.x() + m11 * v.y() + m12 * v.z(),
                m20 * v.x() + m21 * v.y() + m22 * v.z());
    }

    Matrix3 times(Matrix3 o) {
        Xyz first = times(new Xyz(o.m00, o.m10, o.m20));
        Xyz second = times(new Xyz(o.m01, o.m11, o.m21));
        Xyz third = times(new Xyz(o.m02, o.m12, o.m22));
        return new Matrix3(
                first.x(), second.x(), third.x(), first.y(), second.y(), third.y(), first.z(), second.z(), third.z());
    }

    /** Inverse by cofactors. */
    Matrix3 inverse() {
        double c00 = m11 * m22 - m12 * m21;
        double c01 = m12 * m20 - m10 * m22;
        double c02 = m10 * m21 - m11 * m20;
        double determinant = m00 * c00 + m01 * c01 + m02 * c02;
        return new Matrix3(
                c00 / determinant,
                (m02 * m21 - m01 * m22) / determinant,
                (m01 * m12 - m02 * m11) / determinant,
                c01 / determinant,
                (m00 * m22 - m02 * m20) / determinant,
                (m02 * m10 - m00 * m12) / determinant,
                c02 / determinant,
                (m01 * m20 - m00 * m21) / determinant,
                (m00 * m11 - m01 * m10) / determinant);
    }
}
