package tideband.window.entry;

import java.util.Objects;
import java.util.Optional;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;

/** A setting that is typed: what is typed changes nothing until it is committed and found acceptable. */
public abstract sealed class TypedSetting extends Setting permits NumberSetting, TextSetting {
    private final StringProperty typed = new SimpleStringProperty("");
    private Object seen;
    private String shown = "";

    TypedSetting(About about, Terms terms) {
        super(about, terms);
    }

    /** What the setting stands for now; empty where it stands for several things that differ. */
    abstract Optional<?> now();

    /** What stands in the field for the value of now. */
    abstract String shownNow();

    /** Checks what was typed and sets it; gives the fault, or an empty text. */
    abstract String accept(String text);

    abstract String boundsNow();

    abstract boolean unusualNow();

    /** Sets what is usual; gives the fault, or an empty text. */
    abstract String setUsual();

    /**
     * What is typed.
     *
     * @return a property, to be bound to a field
     */
    public StringProperty typedProperty() {
        return typed;
    }

    /**
     * Whether the setting stands for several things that differ.
     *
     * @return true if nothing is shown for that reason
     */
    public boolean mixed() {
        return now().isEmpty();
    }

    /**
     * The unit beside the field.
     *
     * @return its symbol; empty where there is none
     */
    public String symbol() {
        return "";
    }

    /**
     * What stands where nothing is being typed.
     *
     * @return the value in words, without its unit; empty where the setting stands for several that differ
     */
    public String shown() {
        return shown;
    }

    /**
     * Accepts what is typed, or says what is wrong with it and keeps it.
     *
     * @return whether it was accepted
     */
    public boolean commit() {
        String text = typed.get().strip();
        if (text.equals(shown)) {
            restore();
            return true;
        }
        String reason = lock.get().isEmpty() ? accept(text) : lock.get();
        if (!reason.isEmpty()) {
            fault.set(reason);
            return false;
        }
        seen = null;
        refresh();
        return true;
    }

    /** Gives up what is typed and shows what stands. */
    public void restore() {
        seen = null;
        refresh();
    }

    @Override
    public void refresh() {
        keepToTerms();
        limits.set(boundsNow());
        unusual.set(unusualNow());
        Seen now = new Seen(now(), shownNow());
        if (!Objects.equals(seen, now)) {
            seen = now;
            shown = now.text;
            typed.set(now.text);
            fault.set("");
        }
    }

    // A value as it was last shown; the text alone may change with the unit.
    private record Seen(Optional<?> value, String text) {}

    @Override
    public void backToUsual() {
        if (unusual.get() && lock.get().isEmpty()) {
            String reason = setUsual();
            restore();
            fault.set(reason);
        }
    }
}
