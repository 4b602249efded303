package tideband.window.files;

import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.document.Leftover;

/** A user whose answers are known beforehand; what was asked and said is written down. */
public final class Answers implements Asks {
    public final List<String> heard = new ArrayList<>();
    private final Deque<Object> answers = new ArrayDeque<>();

    /** Answers to the next questions, in order. */
    public Answers will(Object... next) {
        answers.addAll(List.of(next));
        return this;
    }

    boolean allGiven() {
        return answers.isEmpty();
    }

    private <T> T answer(String question, Class<T> type) {
        heard.add(question);
        if (answers.isEmpty()) {
            throw new AssertionError("no answer to: " + question);
        }
        return type.cast(answers.remove());
    }

    @SuppressWarnings("unchecked")
    private <T> Optional<T> perhaps(String question) {
        return (Optional<T>) answer(question, Optional.class);
    }

    @Override
    public Unsaved unsaved(String name) {
        return answer("unsaved " + name, Unsaved.class);
    }

    @Override
    public Optional<Path> fileToOpen(Optional<Path> folder) {
        return perhaps("file to open");
    }

    @Override
    public Optional<Path> fileToSave(Optional<Path> folder, String name) {
        return perhaps("file to save " + name);
    }

    @Override
    public Optional<Design> newDrawing() {
        return perhaps("new drawing");
    }

    @Override
    public Elsewhere changedElsewhere(String name, boolean gone, boolean changedHere) {
        return answer((gone ? "gone " : "changed on disk ") + name, Elsewhere.class);
    }

    @Override
    public Overwrite overwrite(String name) {
        return answer("overwrite " + name, Overwrite.class);
    }

    @Override
    public BathChoice bathInTheWay(String bathFile, String ownName) {
        return answer("bath in the way " + bathFile + " or " + ownName, BathChoice.class);
    }

    @Override
    public Optional<LeftChoice> leftBehind(List<Leftover> drawings) {
        Object answer = answer("left behind " + drawings.size(), Object.class);
        return answer instanceof LeftChoice.Act act
                ? Optional.of(new LeftChoice(act, drawings.get(0)))
                : Optional.empty();
    }

    @Override
    public void faults(String what, List<Fault> faults) {
        heard.add(what + " " + faults.stream().map(Fault::text).toList());
    }

    @Override
    public void say(String what, String remedy) {
        heard.add(what + " " + remedy);
    }
}
