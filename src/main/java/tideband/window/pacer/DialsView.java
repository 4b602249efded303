package tideband.window.pacer;

import java.util.List;
import javafx.geometry.Pos;
import javafx.scene.control.Label;
import javafx.scene.layout.Region;

/** The numbers of a pull under way: volts, depth, seconds with a shrinking bar, what comes next, what the line shows. */
final class DialsView extends Region {
    private static final double GAP_SHARE = 0.012;
    private static final String WIDEST_NUMBER = "(000.0)";
    private static final String WIDEST_SECONDS = "000.0";

    private final FarType type = new FarType();
    private final Label voltsCaption = label("pacer-small");
    private final Label volts = label("pacer-number");
    private final Label depthCaption = label("pacer-small");
    private final Label depth = label("pacer-number");
    private final Label secondsCaption = label("pacer-small");
    private final Label seconds = label("pacer-number");
    private final Region track = new Region();
    private final Region bar = new Region();
    private final Label next = label("pacer-text");
    private final Region chip = new Region();
    private final Label film = label("pacer-text");
    private final Label caution = label("pacer-caution");
    private double leftShare = 1;
    private String chipHex = "";
    private double screenHeight = 1;

    DialsView() {
        secondsCaption.setText("seconds left");
        track.getStyleClass().add("pacer-track");
        bar.getStyleClass().add("pacer-bar");
        chip.getStyleClass().add("pacer-chip");
        caution.setAlignment(Pos.CENTER);
        for (Region each : List.of(track, bar, chip)) {
            each.setManaged(false);
        }
        getChildren()
                .addAll(
                        voltsCaption,
                        volts,
                        depthCaption,
                        depth,
                        secondsCaption,
                        seconds,
                        track,
                        bar,
                        next,
                        chip,
                        film,
                        caution);
    }

    private static Label label(String styleClass) {
        Label label = new Label();
        label.getStyleClass().add(styleClass);
        label.setManaged(false);
        return label;
    }

    /** Lays everything out for a screen of a height. */
    void setScreenHeight(double px) {
        screenHeight = px;
        requestLayout();
    }

    void show(Board.Dials dials) {
        boolean changed = set(volts, dials.volts());
        changed |= set(depth, dials.depth());
        changed |= set(seconds, dials.seconds());
        changed |= set(depthCaption, dials.travel().isEmpty() ? "depth now, mm" : "depth, hand up " + dials.travel());
        changed |= set(next, dials.next());
        changed |= set(voltsCaption, dials.volts().startsWith("(") ? "meter shows, V" : "volts now, V");
        // With a hint there is no growth to watch, or it is the lesser matter.
        changed |= set(film, dials.hint().isEmpty() ? dials.film() : dials.hint());
        chip.setVisible(dials.hint().isEmpty());
        changed |= set(caution, dials.caution());
        if (changed) {
            requestLayout();
        }
        if (!chipHex.equals(dials.filmHex())) {
            chipHex = dials.filmHex();
            chip.setStyle("-fx-background-color: " + chipHex + ";");
        }
        boolean live = caution.getStyleClass().contains("pacer-live");
        if (dials.live() && !live) {
            caution.getStyleClass().add("pacer-live");
        } else if (!dials.live() && live) {
            caution.getStyleClass().remove("pacer-live");
        }
        leftShare = dials.leftShare();
        placeBar();
    }

    private static boolean set(Label label, String text) {
        boolean changed = !label.getText().equals(text);
        if (changed) {
            label.setText(text);
        }
        return changed;
    }

    private void placeBar() {
        bar.resizeRelocate(
                track.getLayoutX(), track.getLayoutY(), Math.rint(track.getWidth() * leftShare), track.getHeight());
    }

    @Override
    protected void layoutChildren() {
        double width = getWidth();
        double gap = screenHeight * GAP_SHARE;
        double captionPx = screenHeight / 25;
        double third = (width - 2 * gap) / 3;
        double numberPx = Math.min(
                type.fitPx(WIDEST_NUMBER, true, screenHeight / 8.5, third),
                type.fitPx(WIDEST_SECONDS, true, screenHeight / 8.5, third));
        double y = 0;
        column(voltsCaption, volts, 0, third, y, captionPx, numberPx);
        column(depthCaption, depth, third + gap, third, y, captionPx, numberPx);
        column(secondsCaption, seconds, 2 * (third + gap), third, y, captionPx, numberPx);
        y += captionPx * 1.35 + numberPx * 1.2 + gap;
        track.resizeRelocate(0, y, width, screenHeight / 36);
        placeBar();
        y += track.getHeight() + gap;
        double linePx = screenHeight / 20;
        y = line(next, 0, y, width, linePx) + gap / 2;
        double chipPx = linePx * 1.1;
        chip.resizeRelocate(0, y + linePx * 0.1, chipPx * 1.6, chipPx);
        double besideChip = chip.isVisible() ? chipPx * 1.6 + gap : 0;
        y = line(film, besideChip, y, width - besideChip, linePx) + gap;
        FarType.size(caution, type.fitPx(caution.getText(), true, linePx, width - 2 * gap));
        caution.resizeRelocate(0, y, width, linePx * 1.5);
    }

    private void column(
            Label caption, Label number, double x, double width, double y, double captionPx, double numberPx) {
        FarType.size(caption, type.fitPx(caption.getText(), false, captionPx, width));
        caption.resizeRelocate(x, y, width, captionPx * 1.35);
        FarType.size(number, numberPx);
        number.resizeRelocate(x, y + captionPx * 1.35, width, numberPx * 1.2);
    }

    private double line(Label label, double x, double y, double width, double px) {
        FarType.size(label, type.fitPx(label.getText(), false, px, width));
        label.resizeRelocate(x, y, width, px * 1.3);
        return y + px * 1.3;
    }
}
