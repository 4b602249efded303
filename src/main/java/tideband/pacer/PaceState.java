package tideband.pacer;

/** How far a run has come. */
public sealed interface PaceState {

    /**
     * Getting ready: the user confirms one step after the other.
     *
     * @param step index of the step to confirm, 0-based
     * @param fromS where the pull will begin, in s: 0, or where it was broken off
     */
    record Preparing(int step, double fromS) implements PaceState {}

    /**
     * The seconds before the clock goes.
     *
     * @param leftS seconds left, above 0
     * @param fromS where the pull will begin or go on, in s
     */
    record CountIn(double leftS, double fromS) implements PaceState {}

    /**
     * The pull is under way.
     *
     * @param elapsedS seconds since it began
     */
    record Running(double elapsedS) implements PaceState {}

    /**
     * The clock is stopped.
     *
     * @param elapsedS where it was stopped, in s
     * @param sinceS how long ago, in s
     */
    record Paused(double elapsedS, double sinceS) implements PaceState {}

    /**
     * The pull is done.
     *
     * @param elapsedS how long it took, in s
     */
    record Finished(double elapsedS) implements PaceState {}

    /**
     * The run was broken off.
     *
     * @param elapsedS where, in s
     */
    record Aborted(double elapsedS) implements PaceState {}
}
