/**
 * The whole job, from a design to all that is needed at the bench.
 *
 * <p>Data flows one way, and each stage sees only what the one before it gave:
 *
 * <pre>
 *   design → films of the bands → immersions and masks → pulls → trial → cautions
 * </pre>
 *
 * A design that cannot be made ends at the first stage that cannot go on, with every {@link tideband.bench.Obstacle} that stage
 * sees: its reason, and the nearest change that would take it away. A change may uncover obstacles of a later stage.
 *
 * <p>What is costly and stays while only bands change is in {@link tideband.bench.Colours}. The same design gives the same plan,
 * to the last digit. Start at {@link tideband.bench.BenchPlanner}.
 */
package tideband.bench;
