/**
 * What a film on metal reflects.
 *
 * <p>Light comes through air ({@code N0 = 1}) onto an oxide film of thickness {@code d} on metal. Conventions: time factor
 * {@code exp(−iωt)}; complex index {@code N = n + ik} with {@code k ≥ 0} where light is absorbed; angle of incidence
 * {@code θ} from the normal, in air. In every medium {@code sin θ} is carried over (Snell), so with
 * {@code q_j = N_j cos θ_j = √(N_j² − sin² θ)}, the root that decays forwards, the Fresnel amplitudes of a boundary are
 *
 * <pre>
 *   s:  r_jk = (q_j − q_k) / (q_j + q_k)
 *   p:  r_jk = (N_k² q_j − N_j² q_k) / (N_k² q_j + N_j² q_k)
 * </pre>
 *
 * (so at normal incidence {@code r_p = −r_s}, and both give one reflectance), and the film's waves add up to Airy's sum
 *
 * <pre>
 *   r = (r01 + r12 e^{2iβ}) / (1 + r01 r12 e^{2iβ}),   2β = 4π d q1 / λ,   R = |r|²
 * </pre>
 *
 * Unpolarised light is the mean of s and p. At {@code d = 0} the bare metal's boundary is used, not a limit. Sources: M. Born
 * and E. Wolf, Principles of Optics, sections 1.5, 1.6 and 14 (section numbers from memory).
 *
 * <p>A real surface is not one mirror: {@link tideband.optics.Finish} says how its tilt and its film vary, and
 * {@link tideband.optics.Surface} averages over them. {@link tideband.optics.Airy} is the plain kernel;
 * {@link tideband.optics.FilmSeries} colours many evenly spaced films fast and is tested against it.
 *
 * <p>Optical constants are published tables ({@link tideband.optics.Dispersion}), never extrapolated. Units: nm, degrees.
 * Left out: scattering in the film, crystallites, birefringence, layers beyond one.
 */
package tideband.optics;
