package tideband.window.entry;

import java.util.Optional;
import java.util.function.Consumer;
import java.util.function.Supplier;
import java.util.function.UnaryOperator;

/** A line of text. */
public final class TextSetting extends TypedSetting {
    private final Supplier<Optional<String>> value;
    private final String bounds;
    private final UnaryOperator<String> wrong;
    private final Consumer<String> set;

    /**
     * A line of text.
     *
     * @param about what it is called and what it means
     * @param terms when it can be changed
     * @param bounds what it may be, in words
     * @param value what it is now; empty where it stands for several that differ
     * @param wrong why a text cannot be taken; empty where it can
     * @param set puts a text that was accepted in its place
     */
    public TextSetting(
            About about,
            Terms terms,
            String bounds,
            Supplier<Optional<String>> value,
            UnaryOperator<String> wrong,
            Consumer<String> set) {
        super(about, terms);
        this.bounds = bounds;
        this.value = value;
        this.wrong = wrong;
        this.set = set;
        refresh();
    }

    @Override
    Optional<?> now() {
        return placedProperty().get() ? value.get() : Optional.empty();
    }

    @Override
    String shownNow() {
        return now().map(String::valueOf).orElse("");
    }

    @Override
    String accept(String text) {
        String fault = wrong.apply(text);
        if (fault.isEmpty()) {
            set.accept(text);
        }
        return fault;
    }

    @Override
    String boundsNow() {
        return bounds;
    }

    @Override
    boolean unusualNow() {
        return false;
    }

    @Override
    String setUsual() {
        throw new IllegalStateException("no text is usual");
    }
}
