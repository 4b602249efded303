package tideband.cli;

import java.io.PrintWriter;

/** Writes CSV to standard output: a comma between fields, a line feed after each row, and lines of remarks. */
final class CsvWriter {
    private static final int ROWS_A_LOOK = 256;

    private final PrintWriter out;
    private int rows;

    CsvWriter(PrintWriter out) {
        this.out = out;
    }

    void comment(String remark) {
        line("# " + remark);
    }

    /** Writes a row of fields that are ready to be written. */
    void row(String... fields) {
        line(String.join(",", fields));
        rows++;
    }

    private void line(String text) {
        out.print(text);
        out.print('\n');
    }

    /** Whether nobody reads any more, so that a long table need not be worked out; looks now and then. */
    boolean unread() {
        return rows % ROWS_A_LOOK == 0 && out.checkError();
    }
}
