/**
 * How the window looks, in light and in dark: one style sheet for controls, and {@link tideband.window.look.Look} with the
 * same inks for what is painted on a canvas. Nothing that matters is told by colour alone.
 */
package tideband.window.look;
