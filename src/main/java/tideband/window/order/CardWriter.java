package tideband.window.order;

import java.util.ArrayList;
import java.util.List;
import tideband.bench.BenchPlan;
import tideband.piece.End;
import tideband.plan.Immersion;
import tideband.plan.Run;
import tideband.pull.Pull;
import tideband.window.comfort.LengthUnit;
import tideband.window.work.Glance;

/** Writes the cards of a plan, in the order in which a person does them. */
final class CardWriter {
    private final BenchPlan plan;
    private final FilmInks inks;
    private final CardWords words;
    private final FilmsSoFar films;
    private final List<Draft> drafts = new ArrayList<>();
    private int immersion;
    private End down = End.A;
    private List<Glance.Stretch> masked = List.of();

    // A card before it is known how many there are.
    private record Draft(
            int immersion,
            WorkCard.Kind kind,
            CardWords.Said said,
            List<Run> runs,
            Stage stage,
            BenchPicture picture) {}

    CardWriter(BenchPlan plan, FilmInks inks, LengthUnit unit) {
        this.plan = plan;
        this.inks = inks;
        this.words = new CardWords(plan, new BenchFigures(unit, plan.design().supply()));
        this.films = new FilmsSoFar(plan);
    }

    List<WorkCard> cards() {
        List<Immersion> immersions = plan.plan().immersions();
        for (immersion = 0; immersion < immersions.size(); immersion++) {
            beside(immersions.get(immersion));
            inTheBath(plan.pulls().get(immersion));
        }
        immersion = Math.max(0, immersions.size() - 1);
        if (!plan.plan().strippedAtEnd().isEmpty()) {
            masked = List.of();
            List<Run> runs = plan.plan().strippedAtEnd();
            add(WorkCard.Kind.STRIP_ALL, words.stripAll(runs), runs);
        }
        List<WorkCard> cards = new ArrayList<>();
        for (Draft d : drafts) {
            int number = cards.size() + 1;
            String place = "Step " + number + " of " + drafts.size() + ", immersion " + (d.immersion() + 1) + ": ";
            cards.add(new WorkCard(
                    number,
                    drafts.size(),
                    d.immersion(),
                    d.kind(),
                    d.said().headline(),
                    d.said().figures(),
                    place + d.said().sentence() + ".",
                    d.runs(),
                    d.stage(),
                    d.picture()));
        }
        return cards;
    }

    private void beside(Immersion now) {
        boolean turned = immersion > 0 && now.endDown() != down;
        down = now.endDown();
        if (turned) {
            add(WorkCard.Kind.TURN, words.turn(down), List.of());
        }
        List<Integer> bands = new ArrayList<>(
                immersion == 0
                        ? List.of()
                        : plan.plan().immersions().get(immersion - 1).masked());
        for (Run run : now.strippedBefore()) {
            bands.removeIf(band -> run.first() <= band && band <= run.last());
            maskedNow(bands);
            add(WorkCard.Kind.STRIP, words.strip(run), List.of(run));
        }
        for (Run run : now.maskedBefore()) {
            for (int band = run.first(); band <= run.last(); band++) {
                bands.add(band);
            }
            maskedNow(bands);
            add(WorkCard.Kind.MASK, words.mask(run), List.of(run));
        }
    }

    private void maskedNow(List<Integer> bands) {
        masked = Gives.stretches(
                plan.design().bands(), bands.stream().sorted().distinct().toList());
    }

    private void add(WorkCard.Kind kind, CardWords.Said said, List<Run> runs) {
        List<Glance.Stretch> touched = runs.stream()
                .map(run -> new Glance.Stretch(
                        plan.bands().get(run.first()).fromMm(),
                        plan.bands().get(run.last()).toMm()))
                .toList();
        BenchPicture picture = new BenchPicture(down, films.tints(inks), masked, touched, 0, 0);
        drafts.add(new Draft(immersion, kind, said, runs, Stage.NONE, picture));
    }

    private void inTheBath(Pull pull) {
        Gives gives = new Gives(plan, immersion);
        masked = gives.masked();
        for (Stage stage : Stages.of(pull)) {
            boolean dip = stage.kind() == WorkCard.Kind.DIP;
            BenchPicture picture = new BenchPicture(
                    down,
                    dip ? films.tints(inks) : films.tints(inks, gives, stage.lastRow()),
                    masked,
                    List.of(),
                    dip ? 0 : stage.fromLineMm(),
                    stage.toLineMm());
            CardWords.Said said = words.inTheBath(stage, pull, down);
            drafts.add(new Draft(immersion, stage.kind(), said, List.of(), stage, picture));
        }
        films.take(gives, pull.rows().size() - 1);
    }
}
