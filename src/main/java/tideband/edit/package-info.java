/** Editing a drawing, without a screen. */
package tideband.edit;
