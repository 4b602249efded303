/**
 * The bands in exact numbers, and how their colours come out: {@link tideband.window.bands.ReadoutView} says under each band what
 * its colour is, for those who cannot tell it by looking.
 */
package tideband.window.bands;
