package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.TestFactory;
import tideband.design.Design;
import tideband.design.DesignFile;
import tideband.design.Reading;
import tideband.piece.End;
import tideband.piece.Meniscus;
import tideband.plan.Immersion;
import tideband.pull.Row;
import tideband.trial.TrialCell;

/** Reference: the trial's films, cell by cell, against the same law carried out by other code. */
final class TrialAgainstPlainSimulationTest {
    private static final double WITHIN_NM = 0.1;
    private static final double WITHIN_SHARE = 0.002;

    private final RandomDesigns random = new RandomDesigns();

    @TestFactory
    Stream<DynamicTest> everyDesignOfTheWorkshop() throws IOException {
        List<Design> designs = new ArrayList<>();
        try (Stream<Path> files = Files.list(Path.of("designs"))) {
            for (Path file : files.sorted().toList()) {
                if (DesignFile.read(file) instanceof Reading.Read<Design> read) {
                    designs.add(read.value());
                }
            }
        }
        assertThat(designs).hasSizeGreaterThan(5);
        return designs.stream().map(design -> DynamicTest.dynamicTest(design.title(), () -> compare(design)));
    }

    @TestFactory
    Stream<DynamicTest> designsByLot() {
        return IntStream.range(600, 640)
                .mapToObj(RandomDesigns::design)
                .filter(design -> design.bands().size() <= 6)
                .map(design -> DynamicTest.dynamicTest(design.title(), () -> compare(design)));
    }

    private void compare(Design design) {
        if (random.work(design) instanceof Work.Worked worked) {
            BenchPlan plan = worked.plan();
            PlainSimulation plain = new PlainSimulation(design);
            for (int i = 0; i < plan.pulls().size(); i++) {
                Immersion immersion = plan.plan().immersions().get(i);
                plain.dip(
                        immersion.endDown(),
                        immersion.masked(),
                        plan.pulls().get(i).rows());
            }
            int compared = 0;
            for (int cell = 0; cell < plain.cells(); cell++) {
                double atMm = plain.middleMm(cell);
                if (!blurred(plan, atMm)) {
                    double trialNm = filmNm(plan, atMm);
                    double within = Math.max(WITHIN_NM, WITHIN_SHARE * trialNm);
                    assertThat(plain.filmNm(cell))
                            .as("film at %.2f mm", atMm)
                            .isBetween(trialNm - within, trialNm + within);
                    compared++;
                }
            }
            assertThat(compared).isGreaterThan(plain.cells() / 4);
        }
    }

    /** The trial's film at a place, straight between the middles of its cells. */
    private static double filmNm(BenchPlan plan, double atMm) {
        List<TrialCell> cells = plan.trial().cells();
        int i = 1;
        while (i < cells.size() - 1 && middleMm(cells.get(i)) < atMm) {
            i++;
        }
        double share = (atMm - middleMm(cells.get(i - 1))) / (middleMm(cells.get(i)) - middleMm(cells.get(i - 1)));
        return cells.get(i - 1).filmNm()
                + share * (cells.get(i).filmNm() - cells.get(i - 1).filmNm());
    }

    private static double middleMm(TrialCell cell) {
        return (cell.fromMm() + cell.toMm()) / 2;
    }

    /** Whether a place lies within the blur of a mark, or near a band's edge. */
    private static boolean blurred(BenchPlan plan, double atMm) {
        boolean atEdge = plan.design().bands().stream().anyMatch(band -> Math.abs(band.toMm() - atMm) < 0.75);
        return atEdge
                || IntStream.range(0, plan.pulls().size())
                        .anyMatch(i -> blurred(
                                plan,
                                plan.plan().immersions().get(i).endDown(),
                                plan.pulls().get(i).rows(),
                                atMm));
    }

    private static boolean blurred(BenchPlan plan, End down, List<Row> rows, double atMm) {
        double fromDownMm = plan.design().piece().fromEnd(down, atMm);
        double blurMm = Meniscus.blurMm(plan.design().piece(), atMm);
        return IntStream.range(1, rows.size()).anyMatch(i -> {
            boolean stood = rows.get(i).lineMm() == rows.get(i - 1).lineMm();
            // Where the line stood there is a step, and elsewhere at most a bend.
            double clearMm = blurMm + (stood ? 0.75 : 0.3);
            return Math.abs(rows.get(i).lineMm() - fromDownMm) < clearMm;
        });
    }
}
