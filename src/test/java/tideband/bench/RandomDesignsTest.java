package tideband.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;
import tideband.design.Design;
import tideband.piece.End;

/** Property: what holds of every design, held against designs drawn by lot. */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
final class RandomDesignsTest {
    private static final int DESIGNS = 800;
    private static final int SMALL = 6;
    private static final int MOST_CHANGES = 6;

    private final RandomDesigns random = new RandomDesigns();
    private final List<Design> designs = new ArrayList<>();
    private final List<Work> works = new ArrayList<>();

    @BeforeAll
    void workThemOut() {
        for (int number = 0; number < DESIGNS; number++) {
            designs.add(RandomDesigns.design(number));
            works.add(random.work(designs.get(number)));
        }
    }

    @Test
    void everyBandEndsAtItsFilmAsNearlyAsTheDialAllows() {
        List<String> faults = new ArrayList<>();
        for (Design design : designs) {
            if (workOf(design) instanceof Work.Worked worked) {
                new TrialCheck(worked.plan(), random.colours(design).palette())
                        .faults()
                        .forEach(fault -> faults.add(design.title() + ", " + fault));
            }
        }
        assertThat(faults).isEmpty();
    }

    @Test
    void everyPullKeepsToBathSupplyAndHand() {
        List<String> faults = new ArrayList<>();
        for (Design design : designs) {
            if (workOf(design) instanceof Work.Worked worked) {
                BenchPlan plan = worked.plan();
                for (int i = 0; i < plan.pulls().size(); i++) {
                    End down = plan.plan().immersions().get(i).endDown();
                    new PullCheck(design, down, plan.pulls().get(i))
                            .faults()
                            .forEach(fault -> faults.add(design.title() + ", " + fault));
                }
            }
        }
        assertThat(faults).isEmpty();
    }

    @Test
    void aRefusalGivesReasonsAndChanges() {
        for (Work work : works) {
            if (work instanceof Work.CannotBeMade refusal) {
                assertThat(refusal.obstacles()).isNotEmpty().allSatisfy(obstacle -> {
                    assertThat(obstacle.where()).isNotBlank();
                    assertThat(obstacle.reason()).isNotBlank();
                    assertThat(obstacle.change()).isNotBlank();
                });
            }
        }
    }

    /** Changes named are taken at their word; one may uncover the next obstacle, as ceilings come before holders and amps. */
    @Test
    void theChangesNamedWork() {
        List<String> stuck = new ArrayList<>();
        int refused = 0;
        for (Design design : designs) {
            Work work = workOf(design);
            if (design.bands().size() > SMALL || work instanceof Work.Worked) {
                continue;
            }
            refused++;
            Design changed = design;
            for (int again = 0; again < MOST_CHANGES && work instanceof Work.CannotBeMade refusal; again++) {
                changed = Advice.taken(changed, refusal.obstacles());
                work = random.work(changed);
            }
            if (work instanceof Work.CannotBeMade refusal) {
                stuck.add(design.title() + ": " + refusal.obstacles());
            }
        }
        assertThat(stuck).isEmpty();
        assertThat(refused).isGreaterThan(200);
    }

    @Test
    void theLotIsMixed() {
        assertThat(works).filteredOn(Work.Worked.class::isInstance).hasSizeBetween(DESIGNS / 3, DESIGNS - 100);
    }

    private Work workOf(Design design) {
        return works.get(designs.indexOf(design));
    }
}
