/**
 * Bench settings: everything about piece, metal, bath, supply, holder, vessel, hand and times, and what makes the window
 * comfortable. {@link tideband.window.settings.SettingsModel} describes each as a {@link tideband.window.entry.Setting} with
 * the range a design's file allows and what is usual; an edit that is accepted is one step of the drawing's history.
 */
package tideband.window.settings;
