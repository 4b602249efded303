package tideband.pull;

/**
 * The supply volts that finish a band.
 *
 * @param aSideVolts volts while its A side is finished; 0 for a bare band
 * @param bSideVolts volts while its B side is finished; equal to the A side unless the band is a fade
 */
public record BandVolts(double aSideVolts, double bSideVolts) {}
