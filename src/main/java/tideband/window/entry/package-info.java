/**
 * Things that are set by typing or choosing, described as values: what one is called, its unit, what it may be, what is
 * usual, a sentence of help, and how it is read from and put into what it belongs to.
 *
 * <p>A {@link tideband.window.entry.Setting} decides and knows no screen; a {@link tideband.window.entry.SettingView} shows any
 * of them. What is typed changes nothing until it is committed; what cannot be accepted stays as it was typed, with the fault
 * beside it, until it is mended or taken back.
 */
package tideband.window.entry;
