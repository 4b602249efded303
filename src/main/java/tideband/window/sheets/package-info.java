/**
 * Exporting and printing the sheets.
 *
 * <p>{@link tideband.window.sheets.SheetsModel} carries out one errand at a time on another thread, always from the drawing
 * as it stands, worked out whole; where the errand has got to is one value, a {@link tideband.window.sheets.Standing}, and
 * the view shows that value.
 */
package tideband.window.sheets;
