package tideband.document;

import java.util.List;
import tideband.design.Fault;

/** What came of saving. */
public sealed interface Saved {

    /**
     * The design and its bath are on disk.
     *
     * @param stamp what their files hold
     */
    record Done(DiskStamp stamp) implements Saved {}

    /** The file on disk is not what was last read or written here; nothing was written. */
    record ChangedOnDisk() implements Saved {}

    /**
     * Another bath, or something else, has the name of the design's bath file; nothing was written.
     *
     * @param bathFile the name
     * @param freeName a similar name that is free, or that already holds this very bath
     */
    record BathInTheWay(String bathFile, String freeName) implements Saved {}

    /**
     * The design cannot be saved so; nothing was written.
     *
     * @param faults why
     */
    record Refused(List<Fault> faults) implements Saved {

        // Copies the faults, so that the value cannot change.
        public Refused {
            faults = List.copyOf(faults);
        }
    }
}
