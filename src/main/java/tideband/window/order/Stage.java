package tideband.window.order;

/**
 * A part of a pull that a person does as one act.
 *
 * @param kind hold, holds, fade, follow, lift or dip
 * @param lastRow index of the row of the pull at which it is over
 * @param holds how many holds it has
 * @param drawS seconds that pass before, while the piece is drawn out with the supply off; 0 where it stays
 * @param raiseS seconds that pass then, while volts go up; 0 where they jump
 * @param seconds seconds it lasts after that
 * @param fromVolts volts at its beginning
 * @param toVolts volts at its end
 * @param fromDepthMm depth at its beginning, in mm
 * @param toDepthMm depth at its end, in mm
 * @param fromLineMm how far the colour line stands from the end that is down at its beginning, in mm
 * @param toLineMm the same at its end
 */
public record Stage(
        WorkCard.Kind kind,
        int lastRow,
        int holds,
        double drawS,
        double raiseS,
        double seconds,
        double fromVolts,
        double toVolts,
        double fromDepthMm,
        double toDepthMm,
        double fromLineMm,
        double toLineMm) {

    /** Something done beside the bath. */
    static final Stage NONE = new Stage(WorkCard.Kind.MASK, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0);

    /** All that passes. */
    double wholeS() {
        return drawS + raiseS + seconds;
    }
}
