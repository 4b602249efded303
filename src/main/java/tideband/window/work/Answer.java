package tideband.window.work;

import tideband.bench.Colours;
import tideband.bench.Work;
import tideband.design.Design;

/**
 * What working a design out came to.
 *
 * @param design the design
 * @param colours its colours
 * @param work how it is made, or why it can't be
 * @param whole whether everything was worked out, what the other order of immersions would save included
 */
public record Answer(Design design, Colours colours, Work work, boolean whole) {}
