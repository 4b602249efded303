/**
 * The piece: a picture of the part below the drawing, to the same scale along its length, in the colours the trial predicts.
 *
 * <p>A {@link tideband.window.piece.PieceModel} decides what is shown: predicted or wanted colours or both, the tilt, the lamps,
 * and what is said of each band. The colour of a place is that of its film under the angle {@code θ} it is seen at, with
 *
 * <pre>
 *   cos θ = cos φ · cos τ,      sin φ = offset / half width,      τ the tilt along the length
 * </pre>
 *
 * read from a table of films and angles that is built beside the drawing; until it is there, colours are shown as they are
 * straight on. Shading by lamps is for show: in even light every pixel is the computed colour. Left out: the slant of a
 * taper, light that passes from one part of the piece to another, and the foreshortening of a tilted length.
 */
package tideband.window.piece;
