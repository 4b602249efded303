package tideband.trial;

import tideband.colour.Lab;

/**
 * A short length of the piece after the trial.
 *
 * @param fromMm where it begins, in mm from end A
 * @param toMm where it ends
 * @param filmNm its film, mean round the piece, in nm
 * @param lab its colour, mixed round the piece
 */
public record TrialCell(double fromMm, double toMm, double filmNm, Lab lab) {}
