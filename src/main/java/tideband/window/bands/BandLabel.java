package tideband.window.bands;

import java.util.List;
import java.util.Optional;
import javafx.css.PseudoClass;
import javafx.geometry.VPos;
import javafx.scene.AccessibleAction;
import javafx.scene.AccessibleRole;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import javafx.scene.paint.Paint;
import javafx.scene.shape.Rectangle;
import javafx.scene.text.Text;
import tideband.window.piece.BandReading;

/** A band in words, as much of it as its width has room for. */
final class BandLabel extends Region {
    /** How tall a label is. */
    static final double HEIGHT_EMS = 6.1;

    private static final PseudoClass SELECTED = PseudoClass.getPseudoClass("selected");
    private static final double LINE_EMS = 1.3;
    private static final double PAD_EMS = 0.35;
    private static final double SWATCH_EMS = 0.45;

    private final Text title = text("title");
    private final List<Text> lines = List.of(title, text("line"), text("line"), text("line"));
    private final Rectangle wanted = new Rectangle();
    private final Rectangle predicted = new Rectangle();
    private final Tooltip tooltip = new Tooltip();
    private final Runnable select;
    private BandReading reading;
    private String shownFrom = "";
    private String shownTo = "";
    private double fittedPx = Double.NaN;
    private double fittedEmPx;

    BandLabel(Runnable select) {
        this.select = select;
        getStyleClass().addAll("band-label", "focus-ring");
        setAccessibleRole(AccessibleRole.BUTTON);
        setAccessibleHelp("Enter selects the band; left and right arrows go to its neighbours.");
        tooltip.setWrapText(true);
        tooltip.getStyleClass().add("band-tooltip");
        Tooltip.install(this, tooltip);
        getChildren().addAll(wanted, predicted);
        getChildren().addAll(lines);
        getChildren().forEach(child -> {
            child.setManaged(false);
            child.setMouseTransparent(true);
        });
        setOnMouseClicked(event -> {
            requestFocus();
            select.run();
        });
        setOnKeyPressed(this::key);
    }

    private static Text text(String style) {
        Text text = new Text();
        text.setTextOrigin(VPos.TOP);
        text.getStyleClass().add(style);
        return text;
    }

    private void key(KeyEvent event) {
        switch (event.getCode()) {
            case ENTER, SPACE -> {
                select.run();
                event.consume();
            }
            default -> {}
        }
    }

    @Override
    public void executeAccessibleAction(AccessibleAction action, Object... parameters) {
        if (action == AccessibleAction.FIRE) {
            select.run();
        } else {
            super.executeAccessibleAction(action, parameters);
        }
    }

    /** Takes another reading; lengths come as they are shown. */
    void show(BandReading next, String from, String to) {
        if (next.equals(reading) && from.equals(shownFrom) && to.equals(shownTo)) {
            return;
        }
        reading = next;
        shownFrom = from;
        shownTo = to;
        fittedPx = Double.NaN;
        String sentences = next.sentences(from, to);
        tooltip.setText(sentences);
        setAccessibleText(sentences);
        wanted.setFill(paint(Optional.of(next.wantedHex())));
        predicted.setFill(paint(next.predicted().map(BandReading.Predicted::hex)));
        requestLayout();
    }

    private static Paint paint(Optional<String> hex) {
        return hex.filter(text -> text.startsWith("#")).map(Color::web).orElse(Color.TRANSPARENT);
    }

    void mark(boolean selected) {
        pseudoClassStateChanged(SELECTED, selected);
    }

    double fromMm() {
        return reading.fromMm();
    }

    double toMm() {
        return reading.toMm();
    }

    /** Shows what fits: all, or all but the words, or the number, or, where not even that fits, nothing. */
    void fit(double widthPx, double emPx) {
        if (widthPx == fittedPx && emPx == fittedEmPx) {
            return;
        }
        fittedPx = widthPx;
        fittedEmPx = emPx;
        double pad = PAD_EMS * emPx;
        double room = widthPx - 2 * pad;
        String number = Integer.toString(reading.number());
        boolean words =
                say(room, reading.title(), reading.colourWords(), reading.filmWords(), reading.differenceWords())
                        || (fade()
                                ? say(
                                        room,
                                        number,
                                        reading.aSideColourWords(),
                                        "to " + reading.bSideColourWords(),
                                        reading.differenceNumber())
                                : say(
                                                room,
                                                reading.title(),
                                                reading.colourWords(),
                                                reading.filmWords(),
                                                reading.differenceNumber())
                                        || say(
                                                room,
                                                number,
                                                reading.colourWords(),
                                                reading.filmWords(),
                                                reading.differenceNumber()));
        boolean any = words || say(widthPx - 2, number, "", "", "");
        double left =
                words ? pad : Math.max(1, (widthPx - title.getLayoutBounds().getWidth()) / 2);
        double swatch = SWATCH_EMS * emPx;
        double top = swatch + 0.25 * emPx;
        for (Text line : lines) {
            line.setVisible(any);
            line.relocate(Math.rint(left), Math.rint(top));
            top += LINE_EMS * emPx;
        }
        boolean both = reading.predicted().isPresent();
        place(wanted, 1, both ? (widthPx - 2) / 2 : widthPx - 2, swatch);
        place(predicted, 1 + (widthPx - 2) / 2, (widthPx - 2) / 2, swatch);
    }

    private boolean fade() {
        return !reading.aSideColourWords().equals(reading.bSideColourWords());
    }

    /** Puts words into the lines and says whether all of them fit. */
    private boolean say(double roomPx, String... words) {
        boolean fits = true;
        for (int i = 0; i < words.length; i++) {
            Text line = lines.get(i);
            if (!line.getText().equals(words[i])) {
                line.setText(words[i]);
            }
            fits &= line.getLayoutBounds().getWidth() <= roomPx;
        }
        return fits;
    }

    private static void place(Rectangle swatch, double x, double width, double height) {
        swatch.setX(x);
        swatch.setY(1);
        swatch.setWidth(Math.max(0, width));
        swatch.setHeight(height);
    }
}
