package tideband.optics;

/** Which way the electric field swings, seen from the plane of incidence. */
public enum Polarisation {
    /** Electric field across the plane of incidence. */
    S,
    /** Electric field in the plane of incidence. */
    P
}
