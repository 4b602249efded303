package tideband.window;

import java.util.Optional;
import java.util.function.Supplier;
import javafx.scene.Node;
import javafx.scene.control.Tab;

/**
 * A tab whose content is made when it is first brought to the front: what is not looked at costs nothing, when the window
 * opens and while a hand draws.
 *
 * @param <T> what is in it
 */
final class LateTab<T extends Node> {
    private final Tab tab;
    private final Supplier<T> maker;
    private Optional<T> content = Optional.empty();

    LateTab(Tab tab, Supplier<T> maker) {
        this.tab = tab;
        this.maker = maker;
        tab.selectedProperty().addListener((value, before, after) -> content());
    }

    Tab tab() {
        return tab;
    }

    boolean made() {
        return content.isPresent();
    }

    /** Makes it if need be. */
    T content() {
        if (content.isEmpty()) {
            content = Optional.of(maker.get());
            tab.setContent(content.get());
        }
        return content.get();
    }
}
