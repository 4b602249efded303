package tideband.design;

import java.util.List;

/**
 * What came of reading a file.
 *
 * @param <T> what the file holds
 */
public sealed interface Reading<T> {

    /**
     * The file is sound.
     *
     * @param <T> what the file holds
     * @param value what it holds
     */
    record Read<T>(T value) implements Reading<T> {}

    /**
     * The file is at fault.
     *
     * @param <T> what the file should have held
     * @param faults every fault found, at least one
     */
    record Faulty<T>(List<Fault> faults) implements Reading<T> {

        // Copies the faults, so that the value cannot change.
        public Faulty {
            faults = List.copyOf(faults);
            if (faults.isEmpty()) {
                throw new IllegalArgumentException("a faulty file has at least one fault");
            }
        }
    }
}
