package tideband.pacer;

import java.math.BigDecimal;
import java.math.MathContext;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import tideband.bench.BenchBand;
import tideband.bench.BenchPlan;
import tideband.piece.End;
import tideband.pull.Row;
import tideband.sheet.Figures;

/**
 * A run stopped at a moment: what holds then, computed from the pull and the growth law, and what to do.
 *
 * <p>Film never shrinks, and with the supply off it does not grow. So a run can go on where it stopped; and a run repeated from
 * its start adds to the bands that are done only what they creep when they are wet once more at their own volts.
 */
public final class Interruption {
    /** A repeat that adds more than this share of the film is advised against: common practice, no source. */
    public static final double MOST_GAIN_SHARE = 0.02;

    private static final double INSIDE_SHARE = 0.01;
    private static final double SAME_LINE_MM = 1e-6;

    private final PaceScript script;
    private final BenchPlan plan;
    private final Moment moment;
    private final List<BandOutcome> bands;

    /**
     * An interruption.
     *
     * @param script the immersion
     * @param elapsedS when the run was stopped, in s since the pull began
     */
    public Interruption(PaceScript script, double elapsedS) {
        this.script = script;
        this.plan = script.plan();
        this.moment = script.at(elapsedS);
        this.bands = plan.plan().immersions().get(script.immersion()).finishes().stream()
                .map(this::outcome)
                .toList();
    }

    /**
     * The bands that the immersion finishes.
     *
     * @return what it means for each, from end A to end B
     */
    public List<BandOutcome> bands() {
        return bands;
    }

    /**
     * Whether all that the immersion is to finish was finished.
     *
     * @return true if nothing is left to do
     */
    public boolean allDone() {
        return bands.stream().allMatch(BandOutcome::done);
    }

    /**
     * Whether the immersion may be repeated from its start without overgrowing a band.
     *
     * @return true if no band would gain more than {@link #MOST_GAIN_SHARE}
     */
    public boolean repeatable() {
        return bands.stream().allMatch(band -> band.repeatGainShare() <= MOST_GAIN_SHARE);
    }

    /**
     * Where the run may go on without a loss.
     *
     * @return seconds since the pull began; nothing where all is done, or where nothing was begun
     */
    public Optional<Double> goOnAtS() {
        return allDone() || moment.elapsedS() <= 0 ? Optional.empty() : Optional.of(moment.elapsedS());
    }

    private BandOutcome outcome(int index) {
        BenchBand band = plan.bands().get(index);
        double lengthMm = plan.design().piece().lengthMm();
        boolean fromA = plan.plan().immersions().get(script.immersion()).endDown() == End.A;
        double outerMm = fromA ? band.toMm() : lengthMm - band.fromMm();
        double innerMm = fromA ? band.fromMm() : lengthMm - band.toMm();
        double doneAtS = doneAtS(innerMm);
        boolean done = moment.elapsedS() >= doneAtS;
        double insideMm = INSIDE_SHARE * (outerMm - innerMm);
        double gainNm = 0;
        double gainShare = 0;
        for (double lineMm : new double[] {outerMm - insideMm, innerMm + insideMm}) {
            double plannedNm = new FilmLeft(plan, script.immersion()).filmNm(fromA ? lineMm : lengthMm - lineMm);
            double haveNm = moment.setting().lineMm() <= lineMm
                    ? plannedNm
                    : moment.setting().filmNm();
            double freshNm = plan.pulls().get(script.immersion()).rows().get(0).filmNm();
            double sideNm = script.lineFilm().filmWhenLeftNm(haveNm, lineMm)
                    - script.lineFilm().filmWhenLeftNm(freshNm, lineMm);
            gainNm = Math.max(gainNm, sideNm);
            gainShare = Math.max(gainShare, plannedNm > 0 ? sideNm / plannedNm : 0);
        }
        return new BandOutcome(index, (index + 1) + " " + band.name(), doneAtS, done, gainNm, gainShare);
    }

    /** The end of the last stretch with volts in which some of a band is still below the line. */
    private double doneAtS(double innerMm) {
        double doneS = 0;
        for (Stretch stretch : script.stretches()) {
            if (!stretch.live() || stretch.from().lineMm() <= innerMm + SAME_LINE_MM) {
                continue;
            }
            boolean passed = stretch.to().lineMm() < innerMm - SAME_LINE_MM;
            double share = passed ? stretch.shareAtLine(innerMm) : 1;
            doneS = Stretch.between(stretch.from().timeS(), stretch.to().timeS(), share);
        }
        return doneS;
    }

    /**
     * What a pause demands, the most urgent first.
     *
     * @return sentences
     */
    public List<String> pauseWords() {
        List<String> words = new ArrayList<>();
        if (!moment.live()) {
            words.add("The supply is off in this part of the pull: check that its meter reads 0 V.");
            words.add(
                    moment.now().mark().row().act() == Row.Act.LIFT_OUT
                            ? "All bands of this immersion are made. You may as well lift out and rinse."
                            : "Nothing grows. Keep the piece where it is, at " + depth() + ".");
            return words;
        }
        words.add("The clock stands, the film does not: until the supply is off it grows on, by about " + growthNmPerS()
                + " nm a second here.");
        words.add("With the supply off the film stops growing, and it never shrinks. Hold the piece still at " + depth()
                + ".");
        switch (moment.now().mark().row().act()) {
            case FADE, FOLLOW ->
                words.add("A fade that stands with volts on gets a step: switch off first, then rest.");
            case HOLD -> words.add("Of this hold " + Figures.fixed(moment.leftS(), 1) + " s are left; they count on.");
            case RAISE -> words.add("The raise goes on from " + moment.volts() + " V.");
            case LOWERED, OFF, WITHDRAW, LIFT_OUT -> words.add("The pull goes on from " + moment.volts() + " V.");
        }
        return words;
    }

    /**
     * What to do at nought when the clock goes on.
     *
     * @return a sentence
     */
    public String resumeWords() {
        String rest = Figures.fixed(moment.leftS(), 1) + " s";
        String next = moment.now().target().isEmpty() ? "" : " " + moment.now().target();
        if (!moment.live()) {
            return "At nought: supply still off, go on as called" + next + ", " + rest + ".";
        }
        String on = "At nought: supply ON "
                + (moment.now().mark().row().act() == Row.Act.FOLLOW
                        ? "at the setting of this fade, meter at "
                                + Figures.fixed(moment.setting().volts(), 1)
                        : "at " + moment.volts())
                + " V, ";
        return switch (moment.now().mark().row().act()) {
            case FADE, FOLLOW -> on + "and go on drawing" + next + ", " + rest + ".";
            case RAISE -> on + "and go on raising" + next + ", " + rest + ".";
            case HOLD -> on + "and hold for the " + rest + " left.";
            case LOWERED, OFF, WITHDRAW, LIFT_OUT -> on + rest + ".";
        };
    }

    /**
     * What to do after an abort, the most urgent first.
     *
     * @return sentences
     */
    public List<String> abortWords() {
        List<String> words = new ArrayList<>();
        words.add("Supply off. Wait until its meter reads 0 V; then lift out, rinse twice in clean water.");
        if (moment.elapsedS() <= 0) {
            words.add("The clock had not begun: nothing was grown. Begin again when you are ready.");
            return words;
        }
        words.add("Stopped at " + Figures.clock(moment.elapsedS()) + ", mark "
                + moment.now().mark().number() + ", depth " + depth() + ", volts " + moment.volts() + ".");
        words.add("Done: " + names(true) + ". Not done: " + names(false) + ".");
        if (allDone()) {
            words.add(
                    "Every band of this immersion has its film. Do not repeat it; go on with the next step of the plan.");
            return words;
        }
        words.add("Best: go on where it stopped. Film never shrinks, and without volts it does not grow. Lower again,"
                + " supply off, to " + depth() + "; bands that are done stay above the line.");
        if (moment.live()) {
            words.add("What grew after the clock stopped is there to stay: about "
                    + growthNmPerS()
                    + " nm at the line for each second until the supply was off.");
            if (moment.setting().lineMm() < moment.now().mark().row().lineMm()) {
                words.add("It stopped within a fade: bring the line back to the very place, or a step will show.");
            }
        }
        words.add(repeat());
        return words;
    }

    private String repeat() {
        BandOutcome worst = bands.get(0);
        for (BandOutcome band : bands) {
            worst = band.repeatGainShare() > worst.repeatGainShare() ? band : worst;
        }
        String gain = Figures.fixed(worst.repeatGainNm(), 1) + " nm (" + Figures.fixed(100 * worst.repeatGainShare(), 1)
                + " %) too thick, by the growth law";
        return repeatable()
                ? "Or repeat it from its start: at worst " + worst.name() + " comes out " + gain + "."
                : "Do not repeat it from its start: " + worst.name() + " would come out " + gain + ".";
    }

    private String names(boolean done) {
        String names = bands.stream()
                .filter(band -> band.done() == done)
                .map(BandOutcome::name)
                .collect(Collectors.joining(", "));
        return names.isEmpty() ? "none" : names;
    }

    private String depth() {
        return Figures.fixed(moment.setting().depthMm(), 1) + " mm";
    }

    /** To two figures: it is only to give an idea. */
    private String growthNmPerS() {
        return BigDecimal.valueOf(script.growthNmPerS(moment.elapsedS()))
                .round(new MathContext(2))
                .toPlainString();
    }
}
