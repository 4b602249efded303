/**
 * The trial: the plan carried out on paper, cell by cell, to see what the piece would look like.
 *
 * <p>It knows only what is done at the bench (pulls and masks), the piece, the bath and the supply. It does not know what the
 * planner meant, so a wrong plan shows. All cells that are wet and not covered share one supply:
 *
 * <pre>
 *   i = i_ref exp( s ( k V_film / d − 1 ) )     dd/dt = eta M / (z F rho) · i
 *   V_film = V − I R + d0 / k                   I = Σ A i, at most the current limit
 * </pre>
 *
 * and a cell keeps the film it has when the line passes its middle. A waterline is blurred, since how well the surface is wet is
 * never quite known: three lanes of the surface are passed at slightly different heights, and a cell's film is their mean, its
 * colour the mixture of theirs.
 *
 * <p>Then each band is held against the drawing: a level by the median of its cells, a fade by the straight line fitted through
 * them; colours cell by cell in CIEDE2000, the blurred edges left out.
 *
 * <p>Left out: creep under masks, uneven current (edges and far sides get the same as near ones), and what a hand does wrong.
 * Start at {@link tideband.trial.TrialRun}.
 */
package tideband.trial;
