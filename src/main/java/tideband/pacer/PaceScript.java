package tideband.pacer;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.bench.BenchPlan;
import tideband.pull.Pull;
import tideband.pull.Row;
import tideband.sheet.Figures;
import tideband.sheet.HandMark;

/** One immersion as a function of time: the same marks, words and times as the printed timing table. */
public final class PaceScript {
    private final BenchPlan plan;
    private final int immersion;
    private final Pull pull;
    private final List<Call> calls;
    private final List<Stretch> stretches = new ArrayList<>();
    private final Calls words;
    private final LineFilm lineFilm;

    /**
     * The script of an immersion.
     *
     * @param plan the plan
     * @param immersion index of the immersion, 0-based
     */
    public PaceScript(BenchPlan plan, int immersion) {
        this.plan = plan;
        this.immersion = immersion;
        this.pull = plan.pulls().get(immersion);
        this.words = new Calls(plan.design().supply());
        List<HandMark> marks = HandMark.of(pull, plan.design().supply());
        List<Call> called = new ArrayList<>();
        for (int i = 0; i < marks.size(); i++) {
            boolean last = i + 1 == marks.size();
            Row here = marks.get(i).row();
            Stretch after = Stretch.between(marks.get(i), last ? here : arrival(marks.get(i + 1)));
            Row before = i == 0 ? pull.rows().get(0) : arrival(marks.get(i));
            called.add(words.call(marks.get(i), before, after, last));
            stretches.add(after);
        }
        this.calls = List.copyOf(called);
        this.lineFilm = new LineFilm(plan, immersion, stretches);
    }

    /** The state on arrival at a mark, before anything is done there. */
    private Row arrival(HandMark mark) {
        return pull.rows().stream()
                .filter(row -> row.timeS() == mark.row().timeS())
                .findFirst()
                .orElseThrow();
    }

    /**
     * The plan it is taken from.
     *
     * @return the plan
     */
    public BenchPlan plan() {
        return plan;
    }

    /**
     * Which immersion it is.
     *
     * @return its index, 0-based
     */
    public int immersion() {
        return immersion;
    }

    /**
     * The marks, in order.
     *
     * @return the marks; the last is the end of the pull
     */
    public List<Call> calls() {
        return calls;
    }

    /**
     * How long the pull lasts.
     *
     * @return seconds
     */
    public double durationS() {
        return pull.durationS();
    }

    /**
     * What to know of the pull before it begins: limits met, settings of fades at fixed volts.
     *
     * @return sentences, in order
     */
    public List<String> notes() {
        return pull.notes();
    }

    /**
     * What is to be done at a moment, and next.
     *
     * @param elapsedS seconds since the pull began; before its beginning and after its end it stands still
     * @return the moment
     */
    public Moment at(double elapsedS) {
        double timeS = Math.max(0, Math.min(durationS(), elapsedS));
        int index = markIndexAt(timeS);
        Call now = calls.get(index);
        Stretch stretch = stretches.get(index);
        double share = stretch.share(timeS);
        Row from = stretch.from();
        Row to = stretch.to();
        double volts = Stretch.between(from.volts(), to.volts(), share);
        Setting setting = new Setting(
                volts,
                Stretch.between(from.depthMm(), to.depthMm(), share),
                Stretch.between(from.travelMm(), to.travelMm(), share),
                Stretch.between(from.lineMm(), to.lineMm(), share),
                lineFilm.filmNm(index, share));
        return new Moment(
                timeS,
                index,
                now,
                index + 1 < calls.size() ? Optional.of(calls.get(index + 1)) : Optional.empty(),
                setting,
                words.volts(stretch, volts),
                Math.max(0, to.timeS() - timeS),
                share,
                durationS() > 0 ? timeS / durationS() : 1,
                stretch.live(),
                TouchLimit.exceededBy(Math.max(from.volts(), to.volts())));
    }

    /** The last mark that is due. */
    private int markIndexAt(double timeS) {
        int index = 0;
        while (index + 1 < calls.size() && calls.get(index + 1).dueS() <= timeS) {
            index++;
        }
        return index;
    }

    /**
     * How fast the film at the line grows at a moment.
     *
     * @param elapsedS seconds since the pull began
     * @return nm/s; 0 with the supply off
     */
    public double growthNmPerS(double elapsedS) {
        double timeS = Math.max(0, Math.min(durationS(), elapsedS));
        return lineFilm.growthNmPerS(markIndexAt(timeS), timeS);
    }

    /**
     * How the supply is to be set before the next mark, where its setting is not what the volts of the table say: for a fade at
     * fixed volts, and after one.
     *
     * @param markIndex index of the mark that holds, 0-based
     * @return a sentence without its full stop; empty where there is nothing to set
     */
    public String supplyHint(int markIndex) {
        int next = markIndex + 1;
        while (next < stretches.size() && !stretches.get(next).live()) {
            next++;
        }
        if (next >= stretches.size()
                || (next > markIndex + 1 && stretches.get(markIndex).live())) {
            return "";
        }
        Row row = stretches.get(next).from();
        if (row.act() == Row.Act.FOLLOW) {
            return followNote(row.lineMm()).orElse("");
        }
        int last = next - 1;
        while (last >= 0 && !stretches.get(last).live()) {
            last--;
        }
        boolean followed = last >= 0 && stretches.get(last).from().act() == Row.Act.FOLLOW;
        return followed ? "Set the current limit back to " + Figures.plain(pull.currentLimitAmps(), 3) + " A" : "";
    }

    /** What the pull says of the setting of a fade at fixed volts that begins at a line. */
    private Optional<String> followNote(double lineMm) {
        String opening = "Fade at " + Figures.fixed(lineMm, 0) + " mm: set";
        return pull.notes().stream()
                .filter(note -> note.startsWith(opening))
                .map(note -> "Set" + note.substring(opening.length()).split(";", 2)[0])
                .findFirst();
    }

    List<Stretch> stretches() {
        return stretches;
    }

    LineFilm lineFilm() {
        return lineFilm;
    }

    /**
     * The steps before the pull begins, each to be confirmed.
     *
     * @return the steps, in order
     */
    public List<Step> preparation() {
        return new Readying(this).steps();
    }

    /**
     * The steps before the pull is begun again, or gone on with where it was broken off.
     *
     * @param fromS where it goes on, in s; 0 for the beginning
     * @return the steps, in order
     */
    public List<Step> preparationAgain(double fromS) {
        return new Readying(this).stepsAgain(fromS);
    }
}
