package tideband.bench;

import java.util.Optional;
import java.util.OptionalInt;
import tideband.design.Design;

/**
 * A reason why a design cannot be made.
 *
 * @param where the band concerned, as {@code band "name"}, or {@code the design}
 * @param reason what stands in the way
 * @param change the nearest change that would work
 * @param band index of the band concerned, from end A, 0-based, where there is one
 * @param mend the nearest change ready to be made, where there is a definite one
 */
public record Obstacle(String where, String reason, String change, OptionalInt band, Optional<Mend> mend) {

    /**
     * The design with the nearest change made: this obstacle is gone then, though others may be left or come to light.
     *
     * @return the changed design, where there is a definite change
     */
    public Optional<Design> mended() {
        return mend.map(Mend::design);
    }
}
