/** Paces the hand through one immersion, without a screen. */
package tideband.pacer;
