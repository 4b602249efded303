/**
 * The plan: which immersions, with which masks and which end down, make the drawing at least bench cost.
 *
 * <p><b>The problem.</b> A drawing is a row of bands 1 to n from end A to end B; each has a film in nm at its two sides,
 * or is bare. Film never shrinks, so what a place ends up with is the largest film any immersion gave it, and a plan is
 * a cover of the drawing by immersions. An immersion is a pair (M, e): the bands masked, and the end that is down. The
 * volts rise while the piece comes out, so the film it gives never rises away from e, and no unmasked band may be given
 * more than its target.
 *
 * <p><b>The rule of one immersion.</b> Walk outward from e and keep the least target r of the unmasked bands passed. A
 * band is <em>finished</em> if its own target does not rise outward and its deep side is at most r; the walk stops at an
 * unmasked bare band and before the dry length under the holder. Where an edge is crisp, the thicker side can be
 * finished only with the thinner side masked. All this comes to one set of needed masks R(b, e) for each band and end,
 * or to "never from this end":
 *
 * <pre>  (M, e) finishes b   if and only if   b is finishable from e,  b not in M,  and  R(b, e) within M</pre>
 *
 * <p>R(b, e) holds the deeper bands that are thinner anywhere than b's deep side, and the next band outward if the edge
 * to it is crisp and it is thinner there ({@code Needs}). It follows that a drawing can be made if and only if each band
 * is finishable from some end that may go down; {@code Hindrances} says which is not, and what would help.
 *
 * <p><b>States and costs.</b> A state is (F, M, e): the bands finished, the masks on, the end down. An immersion (M', e')
 * leads to (F and what it newly finishes, M', e') and costs, in minutes ({@link tideband.design.BenchTimes}),
 *
 * <pre>  immersion + put * runs(M' \ M) + strip * runs(M \ M') + turn if e' is not e</pre>
 *
 * where runs counts maximal rows of neighbours, and put is less before the first immersion than over fresh colour. At
 * the end all masks come off. Each immersion must newly finish a band. Thicker-first demands that the highest film newly
 * finished never rises from one immersion to the next; since in the end all is finished, that is to say that each
 * immersion finishes one of the thickest bands still open, and so it is a rule on F alone.
 *
 * <p>The cost of changing masks is no metric: masking bands 1 to 3 in one run and stripping band 2 in the next
 * immersion may cost less than masking 1 and 3 apart. So no mask is ruled out because it looks needless, and no state
 * because another has finished more (which might leave an immersion with nothing to do, and that is not allowed).
 *
 * <p><b>The answer</b> has the least minutes, and among those, in this order, fewest runs masked, fewest turns, least
 * length masked, fewest immersions, end A before B at the first immersion that differs, and the lesser masks (as binary
 * numbers, band 1 the unit) there. Up to 12 bands it is exact: {@code ExactSearch} takes the finished sets in rising
 * order and prices all changes of masks at once, one band after another ({@code MaskSweep}), which takes n 2^n steps
 * instead of 4^n; {@code Bound} leaves out states that cannot come within a limit; the limit rises until a plan keeps
 * to it; {@code TieBreak} picks among the plans of least price. Minutes are summed as whole numbers of billionths of a
 * minute ({@code Tariff}), so that ties are ties.
 *
 * <p><b>The bound.</b> Take bands out of the drawing, and let immersions finish nothing if they like: no plan gets
 * dearer by it, so the least plan of a part never costs more than that of the whole ({@code SubDrawing} has the proof,
 * and how the parts of a drawing may be added up). Beyond 12 bands a good plan is sought ({@code BeamSearch}, {@code
 * Polish}) and the bound is stated beside it; up to 16, the exact search is tried too, for a set amount of work, and a
 * limit that it shows no plan keeps to is a bound. All work is limited by counts, never by the clock: the same problem always
 * gives the same plan.
 *
 * <p>Start at {@link tideband.plan.Planner}. What pulls give the films is not decided here.
 */
package tideband.plan;
