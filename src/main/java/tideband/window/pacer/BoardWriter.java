package tideband.window.pacer;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import tideband.bench.Colours;
import tideband.match.FilmColour;
import tideband.pacer.Interruption;
import tideband.pacer.LogEntry;
import tideband.pacer.Moment;
import tideband.pacer.PaceScript;
import tideband.pacer.PaceState;
import tideband.pacer.Pacer;
import tideband.pacer.Step;
import tideband.pacer.TouchLimit;
import tideband.plan.Run;
import tideband.sheet.Figures;

/** Writes the board for the state of a run. */
final class BoardWriter {
    private static final int LAST_ENTRIES = 6;

    private final Pacer pacer;
    private final PaceScript script;
    private final Colours colours;
    private Optional<Stop> lastStop = Optional.empty();

    // A stop worked out: it is asked for at every frame of a pause and takes a simulation.
    private record Stop(double elapsedS, Interruption interruption) {}

    BoardWriter(Pacer pacer, Colours colours) {
        this.pacer = pacer;
        this.script = pacer.script();
        this.colours = colours;
    }

    Board board(boolean more) {
        PaceState state = pacer.state();
        if (state instanceof PaceState.Preparing preparing) {
            return preparing(preparing);
        }
        if (state instanceof PaceState.CountIn counting) {
            return countIn(counting);
        }
        if (state instanceof PaceState.Running running) {
            return running(running);
        }
        if (state instanceof PaceState.Paused paused) {
            return paused(paused);
        }
        if (state instanceof PaceState.Aborted aborted) {
            return aborted(aborted);
        }
        return finished(more);
    }

    /** What is read out: changes only where there is something new to do. */
    String announcement() {
        PaceState state = pacer.state();
        if (state instanceof PaceState.Preparing preparing) {
            Step step = pacer.steps().get(preparing.step());
            return step.heading() + ". " + step.text();
        }
        if (state instanceof PaceState.CountIn counting) {
            return "Count-in, then " + script.at(counting.fromS()).now().line();
        }
        if (state instanceof PaceState.Running running) {
            Moment moment = script.at(running.elapsedS());
            return "Mark " + moment.now().mark().number() + ". " + moment.now().line() + ". Volts "
                    + moment.now().volts();
        }
        if (state instanceof PaceState.Paused paused) {
            return "Paused. " + String.join(" ", stopAt(paused.elapsedS()).pauseWords());
        }
        if (state instanceof PaceState.Aborted aborted) {
            return "Aborted. " + String.join(" ", stopAt(aborted.elapsedS()).abortWords());
        }
        return "Finished. Rinse.";
    }

    private Interruption stopAt(double elapsedS) {
        if (lastStop.isEmpty() || lastStop.get().elapsedS() != elapsedS) {
            lastStop = Optional.of(new Stop(elapsedS, new Interruption(script, elapsedS)));
        }
        return lastStop.get().interruption();
    }

    private String title(String state) {
        return "Immersion " + (script.immersion() + 1) + " of "
                + script.plan().pulls().size() + " \u00b7 end "
                + script.plan().plan().immersions().get(script.immersion()).endDown() + " down \u00b7 " + state;
    }

    private Board preparing(PaceState.Preparing preparing) {
        Step step = pacer.steps().get(preparing.step());
        String[] heading = step.heading().split(": ", 2);
        int count = pacer.steps().size();
        List<PacerAct> acts = new ArrayList<>(List.of(PacerAct.CONFIRM));
        if (preparing.step() > 0) {
            acts.add(PacerAct.BACK);
        }
        acts.addAll(List.of(PacerAct.MUTE, PacerAct.LIGHT, PacerAct.LEAVE));
        return new Board(
                title("getting ready"),
                heading[0],
                heading.length > 1 ? heading[1] : "",
                false,
                List.of(step.text().split("\n")),
                Optional.empty(),
                Optional.empty(),
                (double) preparing.step() / count,
                "step " + (preparing.step() + 1) + " of " + count,
                acts);
    }

    private Board countIn(PaceState.CountIn counting) {
        Moment moment = script.at(counting.fromS());
        long left = (long) Math.ceil(counting.leftS() - 1e-9);
        List<String> sentences = new ArrayList<>();
        boolean again = counting.fromS() > moment.now().dueS();
        if (again) {
            sentences.add(stopAt(counting.fromS()).resumeWords());
        }
        sentences.add(
                "Depth " + depth(moment) + " mm, volts " + moment.volts() + (moment.live() ? " V at nought." : "."));
        moment.limit().map(TouchLimit::words).ifPresent(sentences::add);
        return new Board(
                title("count-in"),
                "READY: " + left,
                again && moment.live() && !moment.now().words().startsWith("ON")
                        ? "ON \u00b7 " + moment.now().words()
                        : moment.now().words(),
                false,
                sentences,
                Optional.empty(),
                Optional.of(place(moment)),
                moment.wholeShare(),
                progress(moment),
                List.of(PacerAct.ABORT, PacerAct.STOP_COUNT, PacerAct.COUNT_AGAIN, PacerAct.MUTE, PacerAct.LIGHT));
    }

    private Board running(PaceState.Running running) {
        Moment moment = script.at(running.elapsedS());
        return new Board(
                title("mark " + moment.now().mark().number() + " of "
                        + script.calls().size()),
                moment.now().words(),
                moment.now().target(),
                false,
                List.of(),
                Optional.of(dials(moment)),
                Optional.of(place(moment)),
                moment.wholeShare(),
                progress(moment),
                List.of(PacerAct.ABORT, PacerAct.PAUSE, PacerAct.MUTE, PacerAct.LIGHT));
    }

    private Board paused(PaceState.Paused paused) {
        Moment moment = script.at(paused.elapsedS());
        Interruption stop = stopAt(paused.elapsedS());
        List<String> sentences = new ArrayList<>(stop.pauseWords());
        sentences.add("Then: " + lowerFirst(stop.resumeWords()));
        return new Board(
                title("paused for " + Figures.clock(Math.floor(paused.sinceS()))),
                moment.live() ? "SUPPLY OFF" : "PAUSED",
                moment.live() ? "now, hold still" : "supply stays off",
                true,
                sentences,
                Optional.empty(),
                Optional.of(place(moment)),
                moment.wholeShare(),
                progress(moment),
                List.of(PacerAct.ABORT, PacerAct.RESUME, PacerAct.MUTE, PacerAct.LIGHT));
    }

    private static String lowerFirst(String sentence) {
        return Character.toLowerCase(sentence.charAt(0)) + sentence.substring(1);
    }

    private Board aborted(PaceState.Aborted aborted) {
        Interruption stop = stopAt(aborted.elapsedS());
        Moment moment = script.at(aborted.elapsedS());
        List<PacerAct> acts = new ArrayList<>();
        if (stop.goOnAtS().isPresent()) {
            acts.add(PacerAct.GO_ON);
        }
        acts.addAll(List.of(PacerAct.AGAIN, PacerAct.MUTE, PacerAct.LIGHT, PacerAct.LEAVE));
        return new Board(
                title("aborted"),
                "SUPPLY OFF",
                "0 V, lift out, rinse",
                true,
                stop.abortWords(),
                Optional.empty(),
                Optional.empty(),
                moment.wholeShare(),
                progress(moment),
                acts);
    }

    private Board finished(boolean more) {
        Moment moment = script.at(script.durationS());
        List<String> sentences = new ArrayList<>();
        sentences.add("Supply off, 0 V on its meter. Rinse twice in clean water, dry. Clean gloves.");
        sentences.add("Look at it dry, in " + script.plan().design().light().key()
                + " light or daylight, beside the step sheet.");
        if (!more) {
            for (Run run : script.plan().plan().strippedAtEnd()) {
                sentences.add("Last of all strip the mask of "
                        + (run.first() == run.last()
                                ? "band " + (run.first() + 1)
                                : "bands " + (run.first() + 1) + " to " + (run.last() + 1))
                        + ".");
            }
        }
        List<LogEntry> turns = pacer.log().stream()
                .filter(entry -> !entry.words().startsWith("mark "))
                .toList();
        for (LogEntry entry : turns.subList(Math.max(0, turns.size() - LAST_ENTRIES), turns.size())) {
            sentences.add("Log: " + entry.line() + ".");
        }
        List<PacerAct> acts = new ArrayList<>();
        if (more) {
            acts.add(PacerAct.NEXT);
        }
        acts.addAll(List.of(PacerAct.LEAVE, PacerAct.AGAIN, PacerAct.MUTE, PacerAct.LIGHT));
        return new Board(
                title("done"),
                "RINSE",
                "",
                false,
                sentences,
                Optional.empty(),
                Optional.empty(),
                1,
                progress(moment),
                acts);
    }

    private String progress(Moment moment) {
        boolean over = moment.elapsedS() >= script.durationS();
        return Figures.clock(over ? moment.elapsedS() : Math.floor(moment.elapsedS())) + " of "
                + Figures.clock(script.durationS());
    }

    private Board.Place place(Moment moment) {
        return new Board.Place(
                moment.setting().lineMm(),
                moment.setting().depthMm(),
                colours.ofFilm(moment.setting().filmNm()).srgbHex(),
                moment.markIndex());
    }

    private Board.Dials dials(Moment moment) {
        FilmColour colour = colours.ofFilm(moment.setting().filmNm());
        boolean narrow = script.plan().design().vessel().isPresent();
        String next = moment.next()
                .map(call -> "next " + call.clock() + " \u00b7 " + call.line()
                        + (call.volts().equals("off") ? "" : ", " + call.volts() + " V"))
                .orElse("");
        return new Board.Dials(
                moment.volts(),
                depth(moment),
                narrow ? Figures.fixed(moment.setting().travelMm(), 1) : "",
                seconds(moment.leftS()),
                1 - moment.doneShare(),
                next,
                script.supplyHint(moment.markIndex()),
                "at the line " + Figures.fixed(moment.setting().filmNm(), 1) + " nm, "
                        + colour.name().text() + " (" + colour.order() + ")",
                colour.srgbHex(),
                moment.live(),
                moment.live()
                        ? moment.limit().map(TouchLimit::words).orElse("VOLTS ON: hands clear")
                        : "supply off: check that the meter reads 0 V");
    }

    private static String depth(Moment moment) {
        return moment.setting().lineMm() == 0
                ? "out"
                : Figures.fixed(moment.setting().depthMm(), 1);
    }

    /** Whole seconds, and tenths at the last; never less than is left. */
    private static String seconds(double leftS) {
        int decimals = leftS < 10 ? 1 : 0;
        return BigDecimal.valueOf(leftS)
                .setScale(decimals, RoundingMode.CEILING)
                .toPlainString();
    }
}
