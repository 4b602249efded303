package tideband.design;

/** What the file of a design allows; the same as in its JSON Schema. */
public final class Limits {

    /** Position of a station in mm from end A. */
    public static final Range AT_MM = new Range(0, 5000);
    /** Length of a piece in mm. */
    public static final Range LENGTH_MM = new Range(1, 5000);
    /** Diameter, width, thickness or bore of a piece in mm. */
    public static final Range SIZE_MM = new Range(0.05, 1000);
    /** Number of a piece's stations. */
    public static final Range STATIONS = new Range(2, 200);
    /** Inner measure of a vessel in mm. */
    public static final Range VESSEL_MM = new Range(1, 10_000);
    /** Dry length under the holder in mm. */
    public static final Range DRY_MM = new Range(0, 5000);
    /** The shortest band in mm. */
    public static final double SHORTEST_BAND_MM = 0.5;
    /** The most bands. */
    public static final int MOST_BANDS = 60;
    /** Most characters (code points) of a title or a name. */
    public static final int LONGEST_LINE = 80;
    /** Film of a band in nm. */
    public static final Range FILM_NM = new Range(1, 2000);
    /** Volts of a band. */
    public static final Range BAND_VOLTS = new Range(0.1, 500);
    /** CIELAB lightness of a colour. */
    public static final Range LIGHTNESS = new Range(0, 100);
    /** CIELAB a* and b* of a colour. */
    public static final Range CHROMATIC = new Range(-200, 200);
    /** The order a colour is wanted in. */
    public static final Range ORDER = new Range(1, 20);
    /** Highest volts of a supply. */
    public static final Range SUPPLY_VOLTS = new Range(1, 1000);
    /** Highest current of a supply in A. */
    public static final Range SUPPLY_AMPS = new Range(0.001, 1000);
    /** Step of a supply's dial in V. */
    public static final Range DIAL_VOLTS = new Range(0.001, 10);
    /** Fastest change of a supply's volts in V/s, where it does not jump. */
    public static final Range SLEW_VOLTS_PER_S = new Range(0.001, 1e6);
    /** What an act at the bench costs in minutes. */
    public static final Range BENCH_MIN = new Range(0, 1e6);
    /** Anodizing ratio of a bath, in nm/V. */
    public static final Range BATH_NM_PER_VOLT = new Range(0.1, 20);
    /** Field slope of a bath. */
    public static final Range BATH_FIELD_SLOPE = new Range(5, 200);
    /** Native film a bath starts from, in nm. */
    public static final Range BATH_NATIVE_NM = new Range(0.1, 20);
    /** Current efficiency of a bath. */
    public static final Range BATH_EFFICIENCY = new Range(0.01, 1);
    /** Resistance of a bath, in ohm. */
    public static final Range BATH_RESISTANCE_OHM = new Range(0, 10_000);
    /** Ceiling of a bath, in V. */
    public static final Range BATH_CEILING_VOLTS = new Range(1, 500);
    /** Factor of a bath on the index of its oxide. */
    public static final Range BATH_INDEX_SCALE = new Range(0.5, 1.5);
    /** Seconds a level is held. */
    public static final Range HOLD_S = new Range(1, 36_000);
    /** CIEDE2000 difference between neighbouring steps of a stepped fade. */
    public static final Range STEP_DE00 = new Range(0.2, 50);
    /** Speed of the hand in mm/s. */
    public static final Range HAND_MM_PER_S = new Range(0.001, 1000);

    private Limits() {}
}
