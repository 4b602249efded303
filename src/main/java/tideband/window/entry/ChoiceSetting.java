package tideband.window.entry;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;

/**
 * One of several things.
 *
 * @param <T> the kind of thing
 */
public final class ChoiceSetting<T> extends Setting {
    private final Supplier<List<Choice<T>>> offered;
    private final Supplier<Optional<T>> usual;
    private final Supplier<Optional<T>> value;
    private final Function<T, String> set;
    private final ObservableList<Choice<T>> choices = FXCollections.observableArrayList();
    // Kept, as it would hear nothing once collected.
    private final ObservableList<Choice<T>> offeredNow = FXCollections.unmodifiableObservableList(choices);
    private final ReadOnlyObjectWrapper<Optional<Choice<T>>> chosen = new ReadOnlyObjectWrapper<>(Optional.empty());

    /**
     * A choice.
     *
     * @param about what it is called and what it means
     * @param terms when it can be changed
     * @param offered what there is to choose from now
     * @param usual what is usual now; empty where nothing is
     * @param value what is chosen now; empty where the setting stands for several that differ
     * @param set puts what was chosen in its place, or gives the reason why it can't; empty where it can
     */
    public ChoiceSetting(
            About about,
            Terms terms,
            Supplier<List<Choice<T>>> offered,
            Supplier<Optional<T>> usual,
            Supplier<Optional<T>> value,
            Function<T, String> set) {
        super(about, terms);
        this.offered = offered;
        this.usual = usual;
        this.value = value;
        this.set = set;
        refresh();
    }

    /**
     * What there is to choose from.
     *
     * @return a list that changes with what it depends on
     */
    public ObservableList<Choice<T>> choices() {
        return offeredNow;
    }

    /**
     * What is chosen.
     *
     * @return a property; empty where the setting stands for several that differ
     */
    public ReadOnlyObjectProperty<Optional<Choice<T>>> chosenProperty() {
        return chosen.getReadOnlyProperty();
    }

    /**
     * Chooses.
     *
     * @param thing what is to be
     * @return whether it was accepted
     */
    public boolean choose(T thing) {
        String reason = lock.get().isEmpty() ? set.apply(thing) : lock.get();
        refresh();
        fault.set(reason);
        return reason.isEmpty();
    }

    @Override
    public void backToUsual() {
        if (unusual.get()) {
            choose(usual.get().orElseThrow());
        }
    }

    @Override
    public void refresh() {
        keepToTerms();
        List<Choice<T>> now = placed.get() ? offered.get() : List.of();
        if (!choices.equals(now)) {
            choices.setAll(now);
        }
        Optional<T> thing = placed.get() ? value.get() : Optional.empty();
        Optional<Choice<T>> one = now.stream()
                .filter(c -> thing.filter(c.value()::equals).isPresent())
                .findFirst();
        if (!chosen.get().equals(one)) {
            chosen.set(one);
            fault.set("");
        }
        Optional<T> plain = usual.get();
        unusual.set(plain.isPresent() && thing.isPresent() && !plain.equals(thing));
        limits.set(now.stream()
                .filter(c -> plain.filter(c.value()::equals).isPresent())
                .findFirst()
                .map(c -> "Usual: " + c.name())
                .orElse(""));
    }
}
