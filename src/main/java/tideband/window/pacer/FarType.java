package tideband.window.pacer;

import java.util.Locale;
import javafx.scene.control.Label;
import javafx.scene.text.Font;
import javafx.scene.text.FontWeight;
import javafx.scene.text.Text;

/** Letters as large as the room allows. One for a view, for it keeps a text to measure by. */
final class FarType {
    private static final double MEASURED_PX = 100;

    private final Text measure = new Text();

    /** The size at which a text just fits a width, but no more than wanted. */
    double fitPx(String text, boolean bold, double wantedPx, double widthPx) {
        if (text.isEmpty()) {
            return wantedPx;
        }
        measure.setFont(Font.font(null, bold ? FontWeight.BOLD : FontWeight.NORMAL, MEASURED_PX));
        measure.setText(text);
        double widthAtMeasured = measure.getLayoutBounds().getWidth();
        // A hundredth is kept back, for letters are placed on whole pixels.
        return Math.min(wantedPx, 0.99 * widthPx / widthAtMeasured * MEASURED_PX);
    }

    /** Sets a label's size; a style, since the style of the root would win over a font. */
    static void size(Label label, double px) {
        String style = String.format(Locale.ROOT, "-fx-font-size: %.1fpx;", px);
        if (!style.equals(label.getStyle())) {
            label.setStyle(style);
        }
    }
}
