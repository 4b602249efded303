package tideband.window.entry;

import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringWrapper;

/** What every setting tells of itself. */
final class State {
    final ReadOnlyBooleanWrapper placed = new ReadOnlyBooleanWrapper(true);
    final ReadOnlyStringWrapper lock = new ReadOnlyStringWrapper("");
    final ReadOnlyStringWrapper bounds = new ReadOnlyStringWrapper("");
    final ReadOnlyStringWrapper fault = new ReadOnlyStringWrapper("");
    final ReadOnlyBooleanWrapper unusual = new ReadOnlyBooleanWrapper(false);

    void keepTo(Terms terms) {
        placed.set(terms.placed().getAsBoolean());
        lock.set(placed.get() ? terms.lock().get() : "");
    }
}
