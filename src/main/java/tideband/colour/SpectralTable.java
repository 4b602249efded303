package tideband.colour;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * A published table of values by wavelength, linear between its rows; wavelengths outside it are refused, never
 * extrapolated.
 *
 * <p>File form: lines that start with {@code #} are the header (source, method); the next line names the columns, of which
 * the first is {@code wavelength_nm}; then one row a wavelength, strictly rising.
 */
public final class SpectralTable {

    private final String name;
    private final String header;
    private final List<String> columns;
    private final double[] wavelengthsNm;
    private final double[][] values;

    private SpectralTable(String name, String header, List<String> columns, List<double[]> rows) {
        this.name = name;
        this.header = header;
        this.columns = columns;
        this.wavelengthsNm = new double[rows.size()];
        this.values = new double[columns.size()][rows.size()];
        for (int row = 0; row < rows.size(); row++) {
            double[] cells = rows.get(row);
            wavelengthsNm[row] = cells[0];
            if (row > 0 && !(cells[0] > wavelengthsNm[row - 1])) {
                throw new IllegalStateException(name + ": wavelengths must rise, but " + cells[0] + " nm follows "
                        + wavelengthsNm[row - 1] + " nm");
            }
            for (int column = 0; column < columns.size(); column++) {
                values[column][row] = cells[column + 1];
            }
        }
    }

    /**
     * Reads a table that ships beside a class.
     *
     * @param owner the class beside which the file lies
     * @param resource the file's name
     * @return the table
     * @throws IllegalStateException where the file is missing or is no such table
     */
    public static SpectralTable read(Class<?> owner, String resource) {
        StringBuilder header = new StringBuilder();
        List<String> columns = null;
        List<double[]> rows = new ArrayList<>();
        try (BufferedReader lines = open(owner, resource)) {
            for (String line = lines.readLine(); line != null; line = lines.readLine()) {
                if (line.startsWith("#")) {
                    header.append(line.substring(1).strip()).append('\n');
                } else if (columns == null) {
                    columns = namesOf(resource, line);
                } else if (!line.isBlank()) {
                    rows.add(numbersOf(resource, line, columns.size() + 1));
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(resource + " could not be read", e);
        }
        if (columns == null || rows.size() < 2) {
            throw new IllegalStateException(resource + " must name its columns and hold at least two rows");
        }
        return new SpectralTable(resource, header.toString(), columns, rows);
    }

    private static BufferedReader open(Class<?> owner, String resource) {
        InputStream stream = owner.getResourceAsStream(resource);
        if (stream == null) {
            throw new IllegalStateException(resource + " is missing beside " + owner.getName());
        }
        return new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8));
    }

    private static List<String> namesOf(String resource, String line) {
        List<String> cells = List.of(line.split(",", -1));
        if (!cells.get(0).equals("wavelength_nm")) {
            throw new IllegalStateException(
                    resource + ": the first column must be wavelength_nm, but was " + cells.get(0));
        }
        return cells.subList(1, cells.size());
    }

    private static double[] numbersOf(String resource, String line, int count) {
        double[] numbers = Arrays.stream(line.split(",", -1))
                .mapToDouble(Double::parseDouble)
                .toArray();
        if (numbers.length != count) {
            throw new IllegalStateException(resource + ": a row must have " + count + " cells, but one reads " + line);
        }
        return numbers;
    }

    /**
     * Where the values come from.
     *
     * @return the header's lines, one source or remark a line
     */
    public String header() {
        return header;
    }

    /**
     * The shortest wavelength the table covers.
     *
     * @return wavelength in nm
     */
    public double firstNm() {
        return wavelengthsNm[0];
    }

    /**
     * The longest wavelength the table covers.
     *
     * @return wavelength in nm
     */
    public double lastNm() {
        return wavelengthsNm[wavelengthsNm.length - 1];
    }

    /**
     * A value by wavelength, linear between rows.
     *
     * @param column the column's name
     * @param wavelengthNm wavelength in nm, within the table
     * @return the value, in the column's unit
     * @throws IllegalArgumentException for a wavelength outside the table or an unknown column
     */
    public double at(String column, double wavelengthNm) {
        int index = columns.indexOf(column);
        if (index < 0) {
            throw new IllegalArgumentException(name + " has no column " + column + "; it has " + columns);
        }
        if (!(wavelengthNm >= firstNm() && wavelengthNm <= lastNm())) {
            throw new IllegalArgumentException("wavelengthNm must be from " + firstNm() + " to " + lastNm() + " ("
                    + name + " is not extrapolated), but was " + wavelengthNm);
        }
        int found = Arrays.binarySearch(wavelengthsNm, wavelengthNm);
        if (found >= 0) {
            return values[index][found];
        }
        int above = -found - 1;
        double low = wavelengthsNm[above - 1];
        double share = (wavelengthNm - low) / (wavelengthsNm[above] - low);
        return values[index][above - 1] * (1 - share) + values[index][above] * share;
    }
}
