package tideband.design;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Supplier;

/** The faults found in a file so far; a very bad file is cut short. */
final class Faults {

    /** Most faults listed of one file. */
    static final int MOST = 100;

    private final List<Fault> list = new ArrayList<>();
    private int leftOut;

    void add(String at, String wrong, String right) {
        if (list.size() < MOST) {
            list.add(new Fault(at, wrong, right));
        } else {
            leftOut++;
        }
    }

    boolean none() {
        return list.isEmpty();
    }

    List<Fault> list() {
        List<Fault> all = new ArrayList<>(list);
        if (leftOut > 0) {
            all.add(new Fault("", leftOut + " more faults are not listed", "mend these first"));
        }
        return all;
    }

    /** The value if nothing was found wrong, all faults otherwise. */
    <T> Reading<T> orElse(Supplier<T> value) {
        return none() ? new Reading.Read<>(value.get()) : new Reading.Faulty<>(list());
    }
}
