/** Designs as documents on disk, without a screen. */
package tideband.document;
