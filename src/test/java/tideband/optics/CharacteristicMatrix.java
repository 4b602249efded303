package tideband.optics;

import org.apache.commons.math3.complex.Complex;

/**
 * A second, separately written formulation for the tests: any number of layers by characteristic matrices and tilted
 * admittances (H. A. Macleod, Thin-Film Optical Filters, chapter 2; location from memory). Same signs as the package page.
 */
record CharacteristicMatrix(Complex reflected, Complex transmitted, double reflectance, double transmittance) {

    /**
     * The amplitudes of a stack.
     *
     * @param index first medium (real), layers, last medium
     * @param thicknessNm thickness of each layer
     */
    static CharacteristicMatrix of(
            Complex[] index, double[] thicknessNm, double wavelengthNm, double angleRadians, Polarisation way) {
        Complex sine = index[0].multiply(Math.sin(angleRadians));
        Complex b = Complex.ONE;
        Complex c = admittance(index[index.length - 1], sine, way);
        for (int layer = thicknessNm.length; layer >= 1; layer--) {
            Complex cosine = cosine(index[layer], sine);
            Complex delta = index[layer].multiply(cosine).multiply(2 * Math.PI * thicknessNm[layer - 1] / wavelengthNm);
            Complex eta = admittance(index[layer], sine, way);
            Complex minusI = Complex.I.negate();
            Complex nextB = delta.cos()
                    .multiply(b)
                    .add(minusI.multiply(delta.sin()).multiply(c).divide(eta));
            Complex nextC = delta.cos()
                    .multiply(c)
                    .add(minusI.multiply(delta.sin()).multiply(eta).multiply(b));
            b = nextB;
            c = nextC;
        }
        Complex eta0 = admittance(index[0], sine, way);
        Complex etaLast = admittance(index[index.length - 1], sine, way);
        Complex sum = eta0.multiply(b).add(c);
        // In admittances r is that of the tangential electric field: for p its sign is the opposite of the package
        // page's.
        Complex r = eta0.multiply(b).subtract(c).divide(sum);
        double reflectance = Math.pow(r.abs(), 2);
        double transmittance = 4 * eta0.getReal() * etaLast.getReal() / Math.pow(sum.abs(), 2);
        return new CharacteristicMatrix(
                way == Polarisation.P ? r.negate() : r, eta0.multiply(2).divide(sum), reflectance, transmittance);
    }

    private static Complex cosine(Complex index, Complex sine) {
        Complex share = sine.divide(index);
        return Complex.ONE.subtract(share.multiply(share)).sqrt();
    }

    private static Complex admittance(Complex index, Complex sine, Polarisation way) {
        Complex cosine = cosine(index, sine);
        return way == Polarisation.S ? index.multiply(cosine) : index.divide(cosine);
    }
}
