package tideband.cli;

import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import tideband.bench.BenchPlan;
import tideband.bench.BenchPlanner;
import tideband.bench.Colours;
import tideband.bench.Obstacle;
import tideband.bench.Work;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;

/**
 * A design read from its file and worked out.
 *
 * @param plan everything the bench needs
 * @param colours the colours of its films
 */
record WorkedDesign(BenchPlan plan, Colours colours) {

    /**
     * Reads a design and works it out.
     *
     * @param file its file
     * @param talk told what is being done, if it takes long
     * @throws Refusal with every fault of the file, or with all that stands in the way of the design
     */
    static WorkedDesign of(Path file, PrintWriter talk) throws Refusal {
        Reading<Design> reading = DesignFile.read(file);
        if (reading instanceof Reading.Faulty<Design> faulty) {
            throw Faults.refusal(file.toString(), faulty.faults());
        }
        Design design = ((Reading.Read<Design>) reading).value();
        try (Progress progress = new Progress(talk)) {
            progress.accept("working out the colours");
            Optional<Obstacle> obstacle = Colours.obstacle(design);
            if (obstacle.isPresent()) {
                throw refusal(file, List.of(obstacle.get()));
            }
            Colours colours = Colours.of(design);
            Work work = new BenchPlanner(design, colours).work(progress, () -> false);
            if (work instanceof Work.CannotBeMade impossible) {
                throw refusal(file, impossible.obstacles());
            }
            return new WorkedDesign(((Work.Worked) work).plan(), colours);
        }
    }

    private static Refusal refusal(Path file, List<Obstacle> obstacles) {
        return new Refusal(
                file + " can't be made as it is drawn:",
                obstacles.stream()
                        .map(o -> o.where() + ": " + o.reason() + "; " + o.change())
                        .toList());
    }
}
