package tideband.optics;

import org.apache.commons.math3.complex.Complex;
import tideband.colour.SpectralTable;

/** The complex refractive index {@code N = n + ik} of a material by wavelength: one published table, linear between rows. */
public final class Dispersion {

    private final SpectralTable table;

    private Dispersion(SpectralTable table) {
        this.table = table;
    }

    static Dispersion read(String resource) {
        return new Dispersion(SpectralTable.read(Dispersion.class, resource));
    }

    /**
     * The index at a wavelength.
     *
     * @param wavelengthNm wavelength in nm, within the table
     * @return n + ik
     * @throws IllegalArgumentException for a wavelength outside the table
     */
    public Complex at(double wavelengthNm) {
        return new Complex(table.at("n", wavelengthNm), table.at("k", wavelengthNm));
    }

    /**
     * The shortest wavelength known.
     *
     * @return wavelength in nm
     */
    public double firstNm() {
        return table.firstNm();
    }

    /**
     * The longest wavelength known.
     *
     * @return wavelength in nm
     */
    public double lastNm() {
        return table.lastNm();
    }

    /**
     * Where the numbers come from.
     *
     * @return citation and remarks, one a line
     */
    public String source() {
        return table.header();
    }
}
