/**
 * What makes the window comfortable for the one who sits before it: unit of length, size of text, light or dark, sounds.
 */
package tideband.window.comfort;
