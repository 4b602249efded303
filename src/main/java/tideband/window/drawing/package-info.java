/**
 * What all parts of the window share: the drawing as it stands, its history and what is selected in it. Every change of
 * the drawing goes through {@link tideband.window.drawing.DrawingModel}, so that every change can be undone.
 */
package tideband.window.drawing;
