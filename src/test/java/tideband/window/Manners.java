package tideband.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.function.Consumer;
import javafx.geometry.Bounds;
import javafx.scene.AccessibleRole;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.ButtonBase;
import javafx.scene.control.ChoiceBox;
import javafx.scene.control.ComboBoxBase;
import javafx.scene.control.ContentDisplay;
import javafx.scene.control.Control;
import javafx.scene.control.Label;
import javafx.scene.control.Labeled;
import javafx.scene.control.ListView;
import javafx.scene.control.ScrollBar;
import javafx.scene.control.ScrollPane;
import javafx.scene.control.Slider;
import javafx.scene.control.Spinner;
import javafx.scene.control.TableView;
import javafx.scene.control.TextInputControl;
import javafx.scene.control.ToolBar;
import javafx.scene.image.ImageView;
import javafx.scene.layout.Region;
import javafx.scene.text.Text;
import javafx.scene.text.TextFlow;

/** Looks for bad manners in a scene: what has no name, what is cut off. */
final class Manners {
    /** Parts that a control of the toolkit makes for itself; the control speaks for them. */
    private static final Set<String> PARTS = Set.of(
            "arrow-button",
            "scroll-bar",
            "tab-header-area",
            "control-buttons-tab",
            "tab-header-background",
            "tool-bar-overflow-button",
            "show-hide-columns-button");

    /** One line that may be shortened, for its tooltip and what is read out say all of it: see {@link #summary}. */
    private static final Set<String> SUMMARIES = Set.of(
            // What is set inside a fold, beside the fold's title.
            "fold-summary",
            // What is pointed at in the field; one line, so that the field never jumps while it is drawn in.
            "field-strip");

    private static final double ROUNDING_PX = 1.5;

    private Manners() {}

    /** Calls for every node that is shown, parts of the toolkit's own controls left out. */
    static void walk(Node node, Consumer<Node> each) {
        boolean list = node instanceof ListView<?> && node.getParent() instanceof ComboBoxBase<?>;
        boolean part = list
                || node instanceof ScrollBar
                || node.getStyleClass().stream().anyMatch(PARTS::contains);
        boolean unseen = !node.isVisible() || node.getOpacity() == 0;
        if (unseen || (part && !node.getStyleClass().contains("tab-header-area"))) {
            return;
        }
        each.accept(node);
        boolean whole = node instanceof TextInputControl || node instanceof Slider || node instanceof Spinner<?>;
        if (node instanceof Parent parent && !whole) {
            List.copyOf(parent.getChildrenUnmodifiable()).forEach(child -> walk(child, each));
        }
    }

    /** What assistive technology could not name, or not say what it is. */
    static List<String> nameless(Parent root) {
        List<Node> named = new ArrayList<>();
        walk(root, node -> {
            if (node instanceof Label label && label.getLabelFor() != null) {
                named.add(label.getLabelFor());
            }
        });
        List<String> found = new ArrayList<>();
        walk(root, node -> {
            if (interactive(node)) {
                if (!said(node) && !named.contains(node)) {
                    found.add("no name: " + path(node));
                }
                if (Set.of(AccessibleRole.NODE, AccessibleRole.PARENT).contains(node.getAccessibleRole())) {
                    found.add("no role: " + path(node));
                }
            }
            boolean picture = node instanceof Canvas || node instanceof ImageView;
            if (picture && !spokenFor(node)) {
                found.add("picture without words: " + path(node));
            }
        });
        return found;
    }

    /** What can be acted on and does not say what it does when it is pointed at. */
    static List<String> withoutTooltip(Parent root) {
        List<String> found = new ArrayList<>();
        walk(root, node -> {
            // What a menu is for, its title says.
            boolean menu = node.getStyleClass().contains("menu");
            if (actedOn(node) && !menu && ((Control) node).getTooltip() == null) {
                found.add("no tooltip: " + path(node));
            }
        });
        return found;
    }

    private static boolean actedOn(Node node) {
        return node instanceof ButtonBase
                || node instanceof TextInputControl
                || node instanceof ComboBoxBase<?>
                || node instanceof ChoiceBox<?>
                || node instanceof Slider
                || node instanceof Spinner<?>;
    }

    private static boolean interactive(Node node) {
        boolean control = actedOn(node) || node instanceof ListView<?> || node instanceof TableView<?>;
        return control || node.isFocusTraversable();
    }

    private static boolean said(Node node) {
        String spoken = node.getAccessibleText();
        boolean text = node instanceof Labeled labeled
                && labeled.getText() != null
                && !labeled.getText().isBlank();
        return text || (spoken != null && !spoken.isBlank());
    }

    private static boolean spokenFor(Node node) {
        Node at = node;
        for (int up = 0; at != null && up < 5; up++) {
            boolean role = !Set.of(AccessibleRole.NODE, AccessibleRole.PARENT).contains(at.getAccessibleRole());
            if (said(at) && role) {
                return true;
            }
            at = at.getParent();
        }
        return false;
    }

    /** Text that is shortened, or that lies outside of what holds it, where no scrolling brings it back. */
    static List<String> cut(Parent root) {
        List<String> found = new ArrayList<>();
        walk(root, node -> {
            if (node instanceof Labeled labeled && shows(labeled)) {
                Text drawn = drawn(labeled);
                if (drawn == null) {
                    return;
                }
                if (!drawn.getText().equals(plain(labeled)) && !summary(labeled)) {
                    found.add("shortened to \"" + drawn.getText() + "\": " + path(labeled));
                } else if (drawn.getLayoutBounds().getHeight() > labeled.getHeight() + ROUNDING_PX) {
                    found.add("too low for its text, " + labeled.getHeight() + " for "
                            + drawn.getLayoutBounds().getHeight() + ": " + path(labeled));
                }
                outside(labeled, found);
            } else if (node instanceof Text text
                    && !text.getText().isBlank()
                    && !(text.getParent() instanceof Labeled)
                    && !(text.getParent() instanceof TextFlow)) {
                outside(text, found);
            } else if (node instanceof TextFlow flow
                    && flow.prefHeight(flow.getWidth()) > flow.getHeight() + ROUNDING_PX) {
                found.add("too low for its text: " + path(flow));
            } else if (node instanceof TextInputControl field) {
                Node inner = field.lookup(".text");
                boolean long1 = inner != null && inner.getLayoutBounds().getWidth() > field.getWidth();
                if (long1 && field.getStyleClass().contains("number")) {
                    found.add("number wider than its field: " + path(field));
                }
            }
        });
        return found;
    }

    private static boolean summary(Labeled labeled) {
        return labeled.getStyleClass().stream().anyMatch(SUMMARIES::contains);
    }

    private static boolean shows(Labeled labeled) {
        return labeled.getText() != null
                && !labeled.getText().isBlank()
                && labeled.getContentDisplay() != ContentDisplay.GRAPHIC_ONLY;
    }

    private static Text drawn(Labeled labeled) {
        return labeled.getChildrenUnmodifiable().stream()
                .filter(child ->
                        child instanceof Text text && text.getStyleClass().contains("text"))
                .map(Text.class::cast)
                .findFirst()
                .orElse(null);
    }

    private static String plain(Labeled labeled) {
        String text = labeled.getText();
        return labeled.isMnemonicParsing() ? text.replaceFirst("_(?=[^_])", "") : text;
    }

    private static void outside(Node node, List<String> found) {
        for (Parent at = node.getParent(); at != null; at = at.getParent()) {
            if (scrolls(at)) {
                return;
            }
            Bounds box = at.sceneToLocal(node.localToScene(node.getLayoutBounds()));
            if (at instanceof Region region && !(region instanceof Labeled)) {
                boolean out = box.getMinX() < -ROUNDING_PX
                        || box.getMinY() < -ROUNDING_PX
                        || box.getMaxX() > region.getWidth() + ROUNDING_PX
                        || box.getMaxY() > region.getHeight() + ROUNDING_PX;
                if (out) {
                    found.add("outside of " + at.getClass().getSimpleName() + at.getStyleClass() + ": " + path(node));
                    return;
                }
            }
        }
    }

    private static boolean scrolls(Node node) {
        return node instanceof ScrollPane
                || node instanceof ListView<?>
                || node instanceof TableView<?>
                || node instanceof ToolBar
                || node.getStyleClass().contains("clipped-container")
                || node.getStyleClass().contains("viewport")
                || (node.getParent() != null && node.getParent().getStyleClass().contains("viewport"));
    }

    /** Where a node is, for the one who has to mend it. */
    static String path(Node node) {
        StringBuilder path = new StringBuilder();
        Node at = node;
        for (int up = 0; at != null && up < 4; up++) {
            Class<?> kind = at.getClass();
            path.append(up == 0 ? "" : " < ");
            path.append(kind.getSimpleName().isEmpty() ? kind.getSuperclass().getSimpleName() : kind.getSimpleName());
            path.append(at.getId() == null ? "" : "#" + at.getId()).append(at.getStyleClass());
            if (up == 0 && at instanceof Labeled labeled) {
                path.append(" \"").append(labeled.getText()).append('"');
            }
            at = at.getParent();
        }
        return path.toString();
    }
}
