/**
 * From a wanted colour to the films that come near.
 *
 * <p>A colour is typed, taken from the colours the metal can show ({@link tideband.window.colour.NamedFilms}), chosen in a
 * plane of hue and lightness ({@link tideband.window.colour.PlaneModel}) or read from a picture ({@link
 * tideband.window.colour.ImageModel}). All four ways end in one place, {@link tideband.window.colour.WantedModel}, which
 * finds every film that comes near and gives one of them to the selected bands.
 */
package tideband.window.colour;
