package tideband.match;

import tideband.colour.Lab;
import tideband.colour.TradeName;
import tideband.colour.Xyz;

/**
 * What a film looks like.
 *
 * @param filmNm film thickness in nm
 * @param order which time round the hue circle, 1 for the thinnest films
 * @param name plain colour name used in the trade
 * @param xyz tristimulus values, the perfect reflector having Y = 100
 * @param lab CIELAB against the light's own white
 * @param srgbHex screen colour {@code #rrggbb}
 * @param inGamut whether the screen colour is true; if not, its chroma was lowered to fit
 */
public record FilmColour(double filmNm, int order, TradeName name, Xyz xyz, Lab lab, String srgbHex, boolean inGamut) {}
