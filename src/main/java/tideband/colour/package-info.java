/**
 * Light and the eye: from a reflectance to the colour a person sees, and how far two colours are apart.
 *
 * <p>A {@link tideband.colour.Viewing} is an illuminant and an observer. With {@code S} the illuminant's relative power
 * and {@code x̄, ȳ, z̄} the observer's colour-matching functions, the tristimulus values of a reflectance {@code R} are sums
 * at 5 nm from 380 to 780 nm (ISO/CIE 11664-3 allows the interval):
 *
 * <pre>
 *   X = K Σ R S x̄,   Y = K Σ R S ȳ,   Z = K Σ R S z̄,   K = 100 / Σ S ȳ
 * </pre>
 *
 * so the perfect reflector ({@code R = 1} everywhere) has {@code Y = 100}, and its {@code X, Y, Z} are the viewing's white.
 *
 * <p>CIELAB (ISO/CIE 11664-4) is taken against that own white {@code Xn, Yn, Zn}, with the exact constants:
 *
 * <pre>
 *   f(t) = ∛t where t &gt; 216/24389, else (24389/27 · t + 16)/116
 *   L* = 116 f(Y/Yn) − 16,   a* = 500 (f(X/Xn) − f(Y/Yn)),   b* = 200 (f(Y/Yn) − f(Z/Zn))
 *   C* = √(a*² + b*²),       h = atan2(b*, a*) in degrees, 0 to 360
 * </pre>
 *
 * Differences are CIEDE2000 (ISO/CIE 11664-6) with all three weights 1. The screen gets sRGB (IEC 61966-2-1): a colour seen
 * under another light is first carried to sRGB's D65 white by the Bradford transform; one that no screen of that kind can
 * show is reported as such and drawn with its chroma lowered at constant lightness and hue.
 *
 * <p>A colour wanted as {@code #rrggbb} is a wanted <em>appearance</em>: its CIELAB against sRGB's own white is what films
 * are compared with, whatever the light.
 *
 * <p>Left out: fluorescence, appearance models beyond CIELAB, metamerism indices. Start at {@link tideband.colour.Viewing}.
 */
package tideband.colour;
