/**
 * From a colour to a film to volts.
 *
 * <p>A {@link tideband.match.Palette} is the colour of every film on one metal, finish, light and angle. As a film grows its
 * hue runs round the circle again and again, so a wanted colour may be met more than once, in different <em>orders</em>; with
 * {@code h(d)} the unwrapped hue of the film series, falling as {@code d} grows,
 *
 * <pre>
 *   order(d) = 1 + how often h has fallen through 120°, −240°, −600° …, beginning at or below 120°
 * </pre>
 *
 * so that gold, purple, blue and silver are of the first order and the next begins with yellow. Near neutral, where a hue
 * means nothing, nothing is counted.
 *
 * <p>A match is a local minimum of {@code dE00(wanted, colour of film d)} over {@code 0 ≤ d ≤} the film at the bath's ceiling;
 * {@link tideband.match.ColourMatch} finds all of them. A colour that no film reaches, a true red say, is answered with the
 * nearest films and how far off they are. Films become volts through a {@link tideband.match.VoltScale} that the growth of
 * the oxide supplies.
 *
 * <p>Wanted colours and films are both CIELAB against their own white: what is matched is an appearance. Units: film in nm,
 * volts in V, differences in dE00 (CIEDE2000). Sources: ISO/CIE 11664-6 for the difference; where orders and names begin is
 * common practice and a choice made here.
 */
package tideband.match;
