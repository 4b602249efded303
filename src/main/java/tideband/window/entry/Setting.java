package tideband.window.entry;

import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;

/** Something that can be set. */
public abstract sealed class Setting permits TypedSetting, ChoiceSetting, SwitchSetting {
    final ReadOnlyBooleanWrapper placed = new ReadOnlyBooleanWrapper(true);
    final ReadOnlyStringWrapper lock = new ReadOnlyStringWrapper("");
    final ReadOnlyStringWrapper limits = new ReadOnlyStringWrapper("");
    final ReadOnlyStringWrapper fault = new ReadOnlyStringWrapper("");
    final ReadOnlyBooleanWrapper unusual = new ReadOnlyBooleanWrapper(false);
    private final About about;
    private final Terms terms;

    Setting(About about, Terms terms) {
        this.about = about;
        this.terms = terms;
    }

    /** Takes over whether it has a place and can be changed. */
    final void keepToTerms() {
        placed.set(terms.placed().getAsBoolean());
        lock.set(placed.get() ? terms.lock().get() : "");
    }

    /**
     * What it is called and what it means.
     *
     * @return name and help
     */
    public final About about() {
        return about;
    }

    /**
     * Whether it has a place at the moment, as a bore has only in a tube.
     *
     * @return a property; what has none is not shown
     */
    public final ReadOnlyBooleanProperty placedProperty() {
        return placed.getReadOnlyProperty();
    }

    /**
     * Why it cannot be changed at the moment.
     *
     * @return a property; empty where it can be
     */
    public final ReadOnlyStringProperty lockProperty() {
        return lock.getReadOnlyProperty();
    }

    /**
     * What is usual and what is allowed, in words: "0 to 10000 ohm, usually 2".
     *
     * @return a property; empty where there is nothing to say
     */
    public final ReadOnlyStringProperty boundsProperty() {
        return limits.getReadOnlyProperty();
    }

    /**
     * Why what was entered was not accepted.
     *
     * @return a property; empty where nothing is wrong
     */
    public final ReadOnlyStringProperty faultProperty() {
        return fault.getReadOnlyProperty();
    }

    /**
     * Whether it differs from what is usual.
     *
     * @return a property; false where nothing is
     */
    public final ReadOnlyBooleanProperty unusualProperty() {
        return unusual.getReadOnlyProperty();
    }

    /** Sets what is usual, where something is. */
    public abstract void backToUsual();

    /** Takes over what it stands for now. What is being typed is kept unless its value has changed. */
    public abstract void refresh();
}
