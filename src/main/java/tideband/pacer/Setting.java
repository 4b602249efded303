package tideband.pacer;

/**
 * Where supply, hand and film stand at a moment.
 *
 * @param volts volts at the supply's terminals; 0 with the supply off
 * @param depthMm depth of the end that is down below the flat bath, as a gauge shows it, in mm
 * @param travelMm how far the hand has moved up since the immersion began, in mm
 * @param lineMm how far the colour line stands from the end that is down, in mm
 * @param filmNm the film at the line, in nm
 */
public record Setting(double volts, double depthMm, double travelMm, double lineMm, double filmNm) {}
