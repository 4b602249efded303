package tideband.window.piece;

import java.util.Optional;
import tideband.optics.Finish;
import tideband.piece.Piece;
import tideband.window.drawing.Viewport;

/**
 * Everything a picture of the piece is painted from.
 *
 * @param view which stretch is in view
 * @param centrePx where the axis lies, in px from the top
 * @param acrossPxPerMm how many px a millimetre across is
 * @param piece the shape
 * @param finish the finish, for shading
 * @param upper the colours above the axis
 * @param lower the colours below it; the same strip where both halves are alike
 * @param table colours under angles; without it, colours stay as they are straight on
 * @param tiltDeg the tilt in degrees
 * @param lamps the lamps
 */
record Frame(
        Viewport view,
        double centrePx,
        double acrossPxPerMm,
        Piece piece,
        Finish finish,
        Strip upper,
        Strip lower,
        Optional<AngleTable> table,
        double tiltDeg,
        Lamps lamps) {}
