/**
 * The metals, their baths and the growth of anodic oxide.
 *
 * <p>Growth is the high-field law. With {@code d} the film in nm, {@code V} the volts across it and {@code i} the
 * current density in mA/cm²:
 *
 * <pre>
 *   i     = i_ref · exp(s · (k · V / d − 1)),     i_ref = 0.1 mA/cm²
 *   dd/dt = eta · M / (z · F · rho) · i
 *   V     = V_supply − I · R + d0 / k
 * </pre>
 *
 * {@code k} (nm/V) is the anodizing ratio at {@code i_ref}, {@code s} the dimensionless field slope there
 * ({@code beta · E}), {@code d0} the native film the metal starts with, {@code I} the current of all wet, unmasked
 * metal together and {@code R} the resistance between the terminals and the film. Film never shrinks.
 *
 * <p>Units: film in nm, volts in V, time in s, current density in mA/cm², current in A, area in cm².
 *
 * <p>Sources: L. Young, Anodic Oxide Films (Academic Press, 1961) for the law; the constants carry theirs. Left out:
 * dissolution, breakdown and crystallisation (a bath's ceiling keeps clear of them) and temperature.
 */
package tideband.oxide;
