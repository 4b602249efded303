/**
 * The command line: thin commands over the core; data to standard output, talk to standard error.
 *
 * <p>Each command is one class: it checks its options, hands them to the core and writes what comes back. What a command
 * takes and writes is a contract with other programs: the names of commands and options, the columns of the CSV, the exit
 * codes.
 *
 * <pre>
 *   0  done
 *   1  the design can't be made, a file is at fault, or something could not be read or written
 *   2  wrong use of the command
 * </pre>
 *
 * <p>CSV is UTF-8 with a line feed after each row, a point in the decimals, as many decimals in every row, whatever the
 * locale; lines that open with {@code #} tell where numbers come from. Faults come as values or as a {@link
 * tideband.cli.Refusal}, and {@link tideband.cli.Answers} alone turns them into words and exit codes. Start at {@link
 * tideband.cli.Program}.
 */
package tideband.cli;
