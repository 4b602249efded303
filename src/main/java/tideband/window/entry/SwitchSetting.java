package tideband.window.entry;

import java.util.function.BooleanSupplier;
import java.util.function.Consumer;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;

/** Something that is on or off. */
public final class SwitchSetting extends Setting {
    private final boolean usual;
    private final BooleanSupplier value;
    private final Consumer<Boolean> set;
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
        super(about, terms);
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
        if (lock.get().isEmpty() && to != on.get()) {
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
        keepToTerms();
        on.set(value.getAsBoolean());
        unusual.set(on.get() != usual);
        limits.set(usual ? "Usually on" : "Usually off");
    }
}
