package tideband.window.action;

import javafx.beans.value.ObservableBooleanValue;
import javafx.beans.value.ObservableValue;

/**
 * Something the user can do.
 *
 * @param id its name in code, such as {@code split-band}
 * @param menu the menu it stands in
 * @param name what it is called, short; it may change, as undo says what it would undo
 * @param key its key, as JavaFX writes key combinations: {@code Shortcut+Shift+S}
 * @param help a sentence that says what it does, for the tooltip and for assistive technology
 * @param possible whether it can be done now
 * @param act does it
 */
public record Command(
        String id,
        Menu menu,
        ObservableValue<String> name,
        String key,
        String help,
        ObservableBooleanValue possible,
        Runnable act) {

    /** The menus, in order. */
    public enum Menu {
        /** Designs and sheets. */
        FILE("File"),
        /** History and bands. */
        EDIT("Edit"),
        /** The bands of the drawing. */
        BAND("Band"),
        /** What is shown and how. */
        VIEW("View"),
        /** The plan and the bench. */
        BENCH("Bench"),
        /** How the program is used. */
        HELP("Help");

        private final String title;

        Menu(String title) {
            this.title = title;
        }

        /**
         * What stands in the menu bar.
         *
         * @return the title
         */
        public String title() {
            return title;
        }
    }
}
