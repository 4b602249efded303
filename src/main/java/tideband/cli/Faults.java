package tideband.cli;

import java.util.List;
import tideband.design.Fault;

/** Tells the faults of a file. */
final class Faults {
    private Faults() {}

    static Refusal refusal(String file, List<Fault> faults) {
        String count = faults.size() == 1 ? "1 fault" : faults.size() + " faults";
        return new Refusal(
                file + " is not right, " + count + ":",
                faults.stream().map(Fault::text).toList());
    }
}
