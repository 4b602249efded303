package tideband.window.status;

import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;

/** What happened last, and what to do. */
public final class StatusModel {
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");

    /**
     * The last message.
     *
     * @return a property; empty before anything was said
     */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }

    /**
     * Says something.
     *
     * @param text what happened and what to do
     */
    public void say(String text) {
        message.set(text);
    }

    /**
     * Passes on what a part of the window has to say, and is silent again when that no longer holds.
     *
     * @param source its messages; an empty one takes the one before it back
     */
    public void follow(ObservableValue<String> source) {
        source.addListener((value, before, after) -> {
            if (after != null && !after.isEmpty()) {
                say(after);
            } else if (message.get().equals(before)) {
                say("");
            }
        });
    }
}
