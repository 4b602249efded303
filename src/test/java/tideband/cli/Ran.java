package tideband.cli;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/**
 * A command that was run in this JVM.
 *
 * @param code its exit code
 * @param out what it wrote to standard output
 * @param err what it wrote to standard error
 */
record Ran(int code, String out, String err) {

    static Ran of(String... words) {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        ByteArrayOutputStream err = new ByteArrayOutputStream();
        int code = Program.run(words, out, err);
        return new Ran(code, out.toString(StandardCharsets.UTF_8), err.toString(StandardCharsets.UTF_8));
    }

    /** A command line without quotes, split at spaces. */
    static Ran line(String line) {
        return of(line.split(" ", -1));
    }

    /** The remarks of a CSV. */
    List<String> remarks() {
        return out.lines().filter(line -> line.startsWith("#")).toList();
    }

    /** The header of a CSV. */
    String header() {
        return out.lines().filter(line -> !line.startsWith("#")).findFirst().orElse("");
    }

    /** The rows of a CSV below its header, as fields; none of the fields may hold a comma. */
    List<List<String>> rows() {
        return out.lines()
                .filter(line -> !line.startsWith("#"))
                .skip(1)
                .map(line -> Arrays.asList(line.split(",", -1)))
                .toList();
    }

    double number(int row, int column) {
        return Double.parseDouble(rows().get(row).get(column));
    }
}
