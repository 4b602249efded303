/**
 * The work behind the drawing, done beside it: films, plan, pulls and trial are worked out on another thread after every
 * edit, the newest edit first, and what has become out of date is given up. The drawing itself never waits for it.
 */
package tideband.window.work;
