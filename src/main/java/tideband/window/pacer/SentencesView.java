package tideband.window.pacer;

import java.util.List;
import javafx.scene.control.Label;
import javafx.scene.control.ScrollPane;
import javafx.scene.layout.VBox;
import javafx.scene.text.Font;
import javafx.scene.text.Text;

/** Sentences, as large as fits and never smaller than can be read from near; then they scroll. */
final class SentencesView extends ScrollPane {
    private static final double SPACING = 0.35;
    private static final double LINE = 1.36;

    private final VBox box = new VBox();
    private final Text measure = new Text();
    private List<String> sentences = List.of();

    SentencesView() {
        setContent(box);
        setFitToWidth(true);
        setPannable(true);
        setFocusTraversable(false);
        setHbarPolicy(ScrollBarPolicy.NEVER);
        getStyleClass().add("pacer-scroll");
    }

    void show(List<String> said, double width, double height, double largestPx, double leastPx) {
        double px = Math.max(largestPx, leastPx);
        while (px > leastPx && heightAt(said, px, width) > height) {
            px = Math.max(leastPx, px * 0.94);
        }
        if (!said.equals(sentences)) {
            sentences = said;
            setVvalue(0);
        }
        while (box.getChildren().size() > said.size()) {
            box.getChildren().remove(box.getChildren().size() - 1);
        }
        while (box.getChildren().size() < said.size()) {
            Label label = new Label();
            label.setWrapText(true);
            label.getStyleClass().add("pacer-text");
            label.setMinHeight(USE_PREF_SIZE);
            box.getChildren().add(label);
        }
        for (int i = 0; i < said.size(); i++) {
            Label label = (Label) box.getChildren().get(i);
            label.setText(said.get(i));
            FarType.size(label, px);
        }
        box.setSpacing(px * SPACING);
        resize(width, height);
    }

    private double heightAt(List<String> said, double px, double width) {
        measure.setFont(Font.font(px));
        // Room for a scroll bar and for lines that break a little sooner in a label.
        measure.setWrappingWidth(width - px);
        double sum = 0;
        for (String sentence : said) {
            measure.setText(sentence);
            double lines = Math.ceil(measure.getLayoutBounds().getHeight() / (px * LINE));
            sum += lines * px * LINE + px * SPACING;
        }
        return sum;
    }

    /** Scrolls by a part of what is seen. */
    void scroll(double screens) {
        double room = box.getHeight() - getViewportBounds().getHeight();
        if (room > 0) {
            setVvalue(Math.max(
                    0, Math.min(1, getVvalue() + screens * getViewportBounds().getHeight() / room)));
        }
    }
}
