package tideband.window.entry;

import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringProperty;

/** Something that is on or off. */
public final class SwitchSetting implements Setting {
    private final About about;
    private final Terms terms;
    private final boolean usual;
    private final BooleanSupplier value;
    private final Consumer<Boolean> set;
    private final State state = new State();
    private final ReadOnlyBooleanWrapper on = new ReadOnlyBooleanWrapper();

    /**
     * A switch.
     *
     * @param about what it is called and what it means
     * @param terms when it can be changed
     * @param usual whether it is usually on
     * @param value whether it is on now
     * @param set switches it
     */
    public SwitchSetting(About about, Terms terms, boolean usual, BooleanSupplier value, Consumer<Boolean> set) {
        this.about = about;
        this.terms = terms;
        this.usual = usual;
        this.value = value;
        this.set = set;
        refresh();
    }

    /**
     * Whether it is on.
     *
     * @return a property
     */
    public ReadOnlyBooleanProperty onProperty() {
        return on.getReadOnlyProperty();
    }

    /**
     * Switches.
     *
     * @param to whether it is to be on
     */
    public void turn(boolean to) {
        if (state.lock.get().isEmpty() && to != on.get()) {
            set.accept(to);
        }
        refresh();
    }

    @Override
    public void backToUsual() {
        turn(usual);
    }

    @Override
    public void refresh() {
        state.keepTo(terms);
        on.set(value.getAsBoolean());
        state.unusual.set(on.get() != usual);
        state.bounds.set(usual ? "Usually on" : "Usually off");
    }

    @Override
    public About about() {
        return about;
    }

    @Override
    public ReadOnlyBooleanProperty placedProperty() {
        return state.placed.getReadOnlyProperty();
    }

    @Override
    public ReadOnlyStringProperty lockProperty() {
        return state.lock.getReadOnlyProperty();
    }

    @Override
    public ReadOnlyStringProperty boundsProperty() {
        return state.bounds.getReadOnlyProperty();
    }

    @Override
    public ReadOnlyStringProperty faultProperty() {
        return state.fault.getReadOnlyProperty();
    }

    @Override
    public ReadOnlyBooleanProperty unusualProperty() {
        return state.unusual.getReadOnlyProperty();
    }
}
