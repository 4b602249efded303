/**
 * The pacer on the whole screen, to be read from two metres away and worked in gloves.
 *
 * <p>{@link tideband.window.pacer.PacerModel} asks a {@link tideband.pacer.Pacer} what holds and puts it into a
 * {@link tideband.window.pacer.Board}; {@link tideband.window.pacer.PacerView} shows the board, sixty times a second at most.
 * Letters that must be read from the bath are at least a two-hundredth of the distance high (common practice, no source): 10 mm
 * at 2 m, which is 1/30 of a 24-inch screen's height. Start at {@link tideband.window.pacer.PacerWindow}.
 */
package tideband.window.pacer;
