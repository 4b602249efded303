/**
 * The pull: depth and volts of one immersion against time.
 *
 * <p>Within an immersion every wet unmasked place that started bare has the same film, so the film at the waterline is one function
 * of time, and what a place keeps is the film at the moment the line leaves it. An immersion is therefore gone through from its
 * shallowest band to its deepest, while volts rise:
 *
 * <pre>
 *   level   hold at the volts V for which  film(V, hold, wet area, current limit) = aim
 *   fade    let the line move at v while film at it grows at  dd/dt = v · slope of the fade
 *   creep   aim = film wanted − what the band gains when it is wet again later
 * </pre>
 *
 * <p>A pull is a polyline in time: volts and line run straight between its {@link tideband.pull.Row rows}, and two rows at one
 * time are a jump of the volts. Volts are settings of the dial, but for a fade at fixed volts, where rows give what the meter
 * shows while the current limit holds it below the setting. The supply is off while the piece is drawn from level to level.
 *
 * <p>The three ways through a fade are {@code RampedFade}, {@code FixedVoltsFade} and {@code SteppedFade}; where volts, amps,
 * slew or hand forbid the first two, the fade is made in steps and the pull says why. What even the highest volts cannot make in
 * a hold is a {@link tideband.pull.Shortfall}, with the change that would do.
 *
 * <p>For planning, a level band is one cell and a fade is {@code 12}; the trial cuts finer and is the judge. Left out: the film
 * of electrolyte that a piece drawn out carries with it, and the growth under it. Start at {@link tideband.pull.PullPlanner}.
 */
package tideband.pull;
