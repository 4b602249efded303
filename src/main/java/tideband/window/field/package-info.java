/** The field: the drawing as a line over the colours that films have, with its handles. */
package tideband.window.field;
