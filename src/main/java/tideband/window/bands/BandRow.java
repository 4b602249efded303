package tideband.window.bands;

/**
 * A band in the table.
 *
 * @param number its number from end A, 1 for the first
 * @param name its name
 * @param place where it runs, in the unit the user likes, such as {@code 42–110}
 * @param film its film in nm, such as {@code 150 → 46}; {@code bare} for natural metal
 * @param volts supply volts that give it in the plan; empty while none are known
 * @param colour what its colour is called; empty while it is not known
 * @param aSideHex its colour at the A side as {@code #rrggbb}; empty while it is not known
 * @param bSideHex the same at its B side
 */
public record BandRow(
        int number,
        String name,
        String place,
        String film,
        String volts,
        String colour,
        String aSideHex,
        String bSideHex) {}
