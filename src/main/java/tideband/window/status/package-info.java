/** The line at the foot of the window that says what happened last and what to do. */
package tideband.window.status;
