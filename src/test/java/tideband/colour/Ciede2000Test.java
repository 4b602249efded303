package tideband.colour;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.DoubleRange;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class Ciede2000Test {

    /** Reference: Sharma, Wu and Dalal (2005), table 1, every row of the file, both ways; printed to 4 decimals. */
    @ParameterizedTest
    @MethodSource("sharmaPairs")
    void agreesWithThePublishedPairs(double[] row) {
        Lab first = new Lab(row[0], row[1], row[2]);
        Lab second = new Lab(row[3], row[4], row[5]);
        assertThat(Ciede2000.between(first, second)).isCloseTo(row[6], within(0.5e-4 + 1e-9));
        assertThat(Ciede2000.between(second, first)).isCloseTo(row[6], within(0.5e-4 + 1e-9));
    }

    @Test
    void thePublishedTableIsWhole() throws IOException {
        // Reference: table 1 of Sharma, Wu and Dalal (2005) numbers its pairs 1 to 34.
        assertThat(sharmaPairs()).hasSize(34);
    }

    static List<double[]> sharmaPairs() throws IOException {
        try (InputStream stream =
                Objects.requireNonNull(Ciede2000Test.class.getResourceAsStream("ciede2000-sharma-2005.csv"))) {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#") && !line.startsWith("L1"))
                    .map(line -> Arrays.stream(line.split(",", -1))
                            .mapToDouble(Double::parseDouble)
                            .toArray())
                    .toList();
        }
    }

    /** Property: a difference is the same both ways and nothing from itself. */
    @Property(tries = 500)
    void isSymmetricAndZeroForEquals(
            @ForAll @DoubleRange(min = 0, max = 100) double l,
            @ForAll @DoubleRange(min = -90, max = 90) double a,
            @ForAll @DoubleRange(min = -90, max = 90) double b) {
        Lab one = new Lab(l, a, b);
        Lab other = new Lab(100 - l, b, 0.5 * a);
        assertThat(Ciede2000.between(one, one)).isZero();
        assertThat(Ciede2000.between(one, other)).isCloseTo(Ciede2000.between(other, one), within(1e-9));
    }
}
