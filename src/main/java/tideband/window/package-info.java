/** The drawing window: JavaFX lives here and nowhere else. */
package tideband.window;
