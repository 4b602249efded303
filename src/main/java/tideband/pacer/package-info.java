/**
 * Paces the hand through one immersion: at any moment, what to do now and next. Without a screen and without a clock of its
 * own; whoever asks says how late it is.
 *
 * <p>{@link tideband.pacer.PaceScript} is the immersion as a function of time. It reads the pull's rows and the marks of the
 * hand timing table, so that what is called out is what is printed:
 *
 * <pre>
 *   mark      all rows at one time; what holds from then on is the last of them
 *   between   volts, depth, hand travel and line run straight to the first row of the next mark
 *   film      straight in a fade; in a hold it follows the growth law between the films of its two marks
 * </pre>
 *
 * {@link tideband.pacer.Pacer} carries a run through its states: preparing, count-in, running, paused, finished, aborted.
 * {@link tideband.pacer.Paceclock} reads a monotonic clock and adds nothing up:
 *
 * <pre>   elapsed = now − start − time paused</pre>
 *
 * so it can neither drift nor lose a mark, however seldom it is asked.
 *
 * <p><b>Pausing.</b> Film grows as long as there are volts, whatever the clock says. A pause is clean only with the supply off:
 * film never shrinks, and with no volts it does not grow, so that the run goes on afterwards as if there had been no pause. What
 * grew before the switch was thrown stays; {@link tideband.pacer.Interruption} says how much that is, what an abort leaves
 * undone, and what a second run would add to bands that are done.
 *
 * <p>Left out: how quick the hand is, and what a piece does that dries between two visits.
 */
package tideband.pacer;
