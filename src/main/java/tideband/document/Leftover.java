package tideband.document;

import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;
import tideband.design.Design;

/**
 * A drawing that was open when the program stopped without closing it.
 *
 * @param design the drawing
 * @param belongs the file it was opened from or saved to; empty if it had none yet
 * @param at when it was last kept
 * @param folder where it lies in the recovery store
 */
public record Leftover(Design design, Optional<Path> belongs, Instant at, Path folder) {}
