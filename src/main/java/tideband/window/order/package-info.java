/**
 * The order of work: the plan as cards, one an act at the bench as a person does it.
 *
 * <p>An immersion is turn, strip, mask, dip, then one card a hold or fade, then lift; many holds in a row are told in one
 * card. A card carries what is read at arm's length: the act, how deep, how many volts, how long, and a small picture of
 * the piece with the masks hatched and the colours reached. Where the design cannot be made, what stands in the way takes the
 * cards' place, each obstacle with the nearest change and a button that makes it.
 *
 * <p>Start at {@link tideband.window.order.OrderModel}, which decides, and {@link tideband.window.order.OrderView}, which shows.
 * Lengths are in mm from end A, except that the waterline and depths count from the end that is down.
 */
package tideband.window.order;
