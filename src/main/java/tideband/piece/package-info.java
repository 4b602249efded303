/**
 * The part: its shape along its length, its surface, and how it meets the liquid.
 *
 * <p>Position {@code x} runs from end A (0) to end B (the length), in mm. A {@link tideband.piece.Piece} is round, flat or
 * a tube, and its size runs straight between stations. The surface counted is what the bath wets: the outside, the bore
 * of a tube, and the face of an end.
 *
 * <p>Three lengths tell where the liquid stands on a piece held upright with one end down:
 *
 * <pre>
 *   line   = where the liquid's edge touches the piece, in mm from the end that is down
 *   depth  = line − rise        of that end below the flat level; what a gauge shows
 *   travel = (D0 − D1) − (displaced(D0) − displaced(D1)) / vessel's cross-section
 * </pre>
 *
 * <p>The rise is that of the {@link tideband.piece.Meniscus}: surface tension lifts the liquid's edge on a wetted piece,
 * by 3.9 mm on a wide plate and by less on a rod. How well the surface is wet is never quite known, and so the line is
 * blurred by some tenths of a millimetre. Travel is what the hand does: in a narrow {@link tideband.piece.Vessel} the
 * level falls as the piece leaves it. {@link tideband.piece.Waterline} brings the three together; start there.
 *
 * <p>Left out: the slant of a taper and the bore of a tube in the rise, the edges of a narrow strip, vessel walls nearer
 * than about four capillary lengths (11 mm), and the film of liquid the piece carries off.
 */
package tideband.piece;
