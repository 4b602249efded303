package tideband.window.settings;

import java.util.List;
import java.util.function.Supplier;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.window.entry.Setting;

/** Settings that belong together. */
public final class Group {
    private final String title;
    private final List<Setting> settings;
    private final Supplier<String> gist;
    private final ReadOnlyStringWrapper summary = new ReadOnlyStringWrapper("");

    Group(String title, Supplier<String> gist, List<Setting> settings) {
        this.title = title;
        this.gist = gist;
        this.settings = List.copyOf(settings);
        refresh();
    }

    /**
     * What the settings are about.
     *
     * @return a title
     */
    public String title() {
        return title;
    }

    /**
     * The settings.
     *
     * @return them in order
     */
    public List<Setting> settings() {
        return settings;
    }

    /**
     * The settings in a few words, for where they are folded away.
     *
     * @return a property
     */
    public ReadOnlyStringProperty summaryProperty() {
        return summary.getReadOnlyProperty();
    }

    void refresh() {
        settings.forEach(Setting::refresh);
        summary.set(gist.get());
    }
}
