/**
 * Editing a drawing, without a screen.
 *
 * <p>A design is a value, so an edit is a function from one design to the next: {@link tideband.edit.BandEdits} holds them
 * for bands, edges and fades, and each gives a design that is valid or leaves the one it was given as it was. A {@link
 * tideband.edit.History} keeps every design there has been, with the name of the edit that led to it; a gesture such as
 * a drag is one step however many designs it passed through. What is chosen to be edited next is a {@link
 * tideband.edit.Selection}.
 */
package tideband.edit;
