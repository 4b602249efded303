package tideband.window;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import javafx.scene.Node;
import javafx.scene.Parent;
import javafx.scene.control.Labeled;
import javafx.scene.control.TextInputControl;
import javafx.scene.layout.Background;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.paint.LinearGradient;
import javafx.scene.paint.Paint;
import javafx.scene.paint.Stop;
import javafx.scene.text.Text;

/** Contrast of text as W3C, Web Content Accessibility Guidelines 2.2, defines it (relative luminance, contrast ratio). */
final class Contrast {
    /** Success criterion 1.4.3: text against its ground. */
    static final double LEAST = 4.5;
    /** What cannot be used is exempt there (inactive components); readable all the same, as large text has to be. */
    static final double LEAST_DISABLED = 3;

    private Contrast() {}

    static double ratio(Color first, Color second) {
        double a = luminance(first);
        double b = luminance(second);
        return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
    }

    private static double luminance(Color color) {
        return 0.2126 * linear(color.getRed()) + 0.7152 * linear(color.getGreen()) + 0.0722 * linear(color.getBlue());
    }

    private static double linear(double channel) {
        return channel <= 0.04045 ? channel / 12.92 : Math.pow((channel + 0.055) / 1.055, 2.4);
    }

    /** Texts of controls that are too faint on the ground they stand on. */
    static List<String> faint(Parent root) {
        List<String> found = new ArrayList<>();
        Manners.walk(root, node -> {
            if (node instanceof Labeled labeled
                    && labeled.getText() != null
                    && !labeled.getText().isBlank()
                    && labeled.getTextFill() instanceof Color ink) {
                judge(labeled, ink, found);
            } else if (node instanceof TextInputControl field) {
                // What is typed, or what prompts for it.
                for (Node inner : field.lookupAll(".text")) {
                    if (inner instanceof Text text
                            && text.isVisible()
                            && !text.getText().isBlank()
                            && text.getFill() instanceof Color ink) {
                        judge(field, ink, found);
                    }
                }
            }
        });
        return found;
    }

    private static void judge(Node node, Color ink, List<String> found) {
        double least = node.isDisabled() ? LEAST_DISABLED : LEAST;
        for (Color ground : grounds(node)) {
            Color seen = over(ink, ground, opacity(node));
            double ratio = ratio(seen, ground);
            if (ratio < least) {
                found.add(String.format(Locale.ROOT, "%.2f %s on %s: %s", ratio, seen, ground, Manners.path(node)));
                return;
            }
        }
    }

    private static double opacity(Node node) {
        double opacity = 1;
        for (Node at = node; at != null; at = at.getParent()) {
            opacity *= at.getOpacity();
        }
        return opacity;
    }

    private static Color over(Color ink, Color ground, double opacity) {
        double share = ink.getOpacity() * opacity;
        return new Color(
                ground.getRed() + (ink.getRed() - ground.getRed()) * share,
                ground.getGreen() + (ink.getGreen() - ground.getGreen()) * share,
                ground.getBlue() + (ink.getBlue() - ground.getBlue()) * share,
                1);
    }

    /** The grounds a node's text may stand on: more than one where the ground is a gradient. */
    private static List<Color> grounds(Node node) {
        for (Node at = node; at != null; at = at.getParent()) {
            if (at instanceof Region region) {
                Background background = region.getBackground();
                if (background != null && !background.getFills().isEmpty()) {
                    List<Color> solid = solid(background
                            .getFills()
                            .get(background.getFills().size() - 1)
                            .getFill());
                    if (!solid.isEmpty()) {
                        return solid;
                    }
                }
            }
        }
        return List.of();
    }

    private static List<Color> solid(Paint paint) {
        if (paint instanceof Color color) {
            return color.getOpacity() > 0.9 ? List.of(color) : List.of();
        }
        if (paint instanceof LinearGradient gradient) {
            return gradient.getStops().stream().map(Stop::getColor).toList();
        }
        return List.of();
    }
}
