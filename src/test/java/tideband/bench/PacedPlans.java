package tideband.bench;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/** Plans to pace: all shipped designs, and some drawn by lot. */
public final class PacedPlans {
    private static final List<String> SHIPPED = List.of(
            "lantern-hook",
            "wick-key",
            "snuffer-handle",
            "carry-bail",
            "wick-pin",
            "vent-plate",
            "chimney-post",
            "burner-tube");

    private PacedPlans() {}

    /** Plans of the shipped designs. */
    public static List<BenchPlan> shipped() {
        return SHIPPED.stream().map(PacedPlans::shipped).toList();
    }

    /** The plan of a shipped design. */
    public static BenchPlan shipped(String name) {
        Reading<Design> reading = DesignFile.read(Path.of("designs", name + ".json"));
        Design design = ((Reading.Read<Design>) reading).value();
        Work work = new BenchPlanner(design, Colours.of(design)).work(stage -> {}, () -> false);
        return ((Work.Worked) work).plan();
    }

    /** Plans of random designs that can be made. */
    public static List<BenchPlan> byLot(int count) {
        RandomDesigns designs = new RandomDesigns();
        List<BenchPlan> plans = new ArrayList<>();
        for (int number = 0; plans.size() < count; number++) {
            if (designs.work(RandomDesigns.design(number)) instanceof Work.Worked worked) {
                plans.add(worked.plan());
            }
        }
        return plans;
    }

    /** Both. */
    public static List<BenchPlan> all() {
        return Stream.concat(shipped().stream(), byLot(30).stream()).toList();
    }
}
