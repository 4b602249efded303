package tideband.pull;

import java.util.List;

/** What comes of planning the pulls. */
public sealed interface PullOutcome {

    /**
     * The pulls, one an immersion.
     *
     * @param pulls the pulls in order
     * @param volts what finishes each band, from end A to end B
     */
    record Pulled(List<Pull> pulls, List<BandVolts> volts) implements PullOutcome {
        public Pulled {
            pulls = List.copyOf(pulls);
            volts = List.copyOf(volts);
        }
    }

    /**
     * The pulls ask for what cannot be given.
     *
     * @param shortfalls what and why, at least one
     */
    record OutOfReach(List<Shortfall> shortfalls) implements PullOutcome {
        public OutOfReach {
            shortfalls = List.copyOf(shortfalls);
            if (shortfalls.isEmpty()) {
                throw new IllegalArgumentException("pulls out of reach name at least one shortfall");
            }
        }
    }
}
