package tideband.window.colour;

import java.util.Locale;
import javafx.beans.InvalidationListener;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Label;
import javafx.scene.control.Slider;
import javafx.scene.control.Tooltip;
import javafx.scene.image.PixelWriter;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.Priority;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.paint.Color;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** Chooses by hue (across) and lightness (up) at one chroma; what no film reaches is barred. */
final class PlaneView extends VBox {
    private static final int BAR_EVERY_PX = 6;
    // How much is left of a colour that no film reaches.
    private static final double LEFT_OF_IT = 0.5;
    private static final double WIDE_EM = 18;
    private static final double HIGH_EM = 11;
    private static final double STEP = 1;
    private static final double LEAP = 10;

    private final PlaneModel model;
    private final ComfortModel comfort;
    private final Canvas canvas = new Canvas();
    private final StackPane frame = new StackPane(canvas);
    private final Label where = new Label();
    private WritableImage image = new WritableImage(1, 1);

    PlaneView(PlaneModel model, ComfortModel comfort) {
        this.model = model;
        this.comfort = comfort;
        setStyle("-fx-spacing: 0.4em;");
        frame.getStyleClass().add("colour-canvas");
        frame.setFocusTraversable(true);
        frame.setAccessibleRole(AccessibleRole.SLIDER);
        frame.setAccessibleHelp("Left and right change the hue, up and down the lightness; with Shift in steps of ten");
        Tooltip.install(frame, new Tooltip("Hue across, lightness up. Barred: no film comes near."));
        frame.setMaxWidth(USE_PREF_SIZE);
        frame.setOnMousePressed(e -> {
            frame.requestFocus();
            choose(e.getX(), e.getY());
        });
        frame.setOnMouseDragged(e -> choose(e.getX(), e.getY()));
        frame.setOnKeyPressed(this::key);
        Label legend = new Label("Hue runs across, lightness up. Barred: no film comes near it.");
        legend.setWrapText(true);
        legend.getStyleClass().add("faint");
        where.setWrapText(true);
        getChildren().setAll(frame, chroma(), where, legend);
        InvalidationListener repaint = o -> paint();
        model.planeProperty().addListener((value, before, after) -> size());
        model.hueDegreesProperty().addListener(repaint);
        model.lightnessProperty().addListener(repaint);
        model.chromaProperty().addListener(repaint);
        comfort.textPercentProperty().addListener((value, before, after) -> size());
        comfort.darkProperty().addListener((value, before, after) -> size());
        size();
    }

    private HBox chroma() {
        Slider slider = new Slider(0, PlaneModel.STRONGEST, 0);
        slider.setBlockIncrement(5);
        slider.valueProperty().bindBidirectional(model.chromaProperty());
        slider.setAccessibleText("Chroma, how colourful");
        slider.setTooltip(new Tooltip("Chroma: 0 is grey, the strongest films reach about 60"));
        HBox.setHgrow(slider, Priority.ALWAYS);
        Label label = new Label("_Chroma");
        label.setMnemonicParsing(true);
        label.setLabelFor(slider);
        label.setMinWidth(USE_PREF_SIZE);
        HBox row = new HBox(label, slider);
        row.setStyle("-fx-spacing: 0.5em; -fx-alignment: center-left;");
        return row;
    }

    private void size() {
        double em = Look.of(comfort).emPx();
        canvas.setWidth(WIDE_EM * em);
        canvas.setHeight(HIGH_EM * em);
        image = drawn();
        paint();
    }

    private void choose(double x, double y) {
        double left = x - canvas.getLayoutX();
        double top = y - canvas.getLayoutY();
        double hue = Math.min(Math.max(left / canvas.getWidth(), 0), 0.9999) * 360;
        model.choose(Math.rint(hue), Math.rint((1 - top / canvas.getHeight()) * 100));
    }

    private void key(KeyEvent e) {
        double step = e.isShiftDown() ? LEAP : STEP;
        double hue = model.hueDegreesProperty().get();
        double lightness = model.lightnessProperty().get();
        switch (e.getCode()) {
            case LEFT -> model.choose(hue - step, lightness);
            case RIGHT -> model.choose(hue + step, lightness);
            case UP -> model.choose(hue, lightness + step);
            case DOWN -> model.choose(hue, lightness - step);
            default -> {
                return;
            }
        }
        e.consume();
    }

    private WritableImage drawn() {
        int wide = (int) Math.ceil(canvas.getWidth());
        int high = (int) Math.ceil(canvas.getHeight());
        WritableImage next = new WritableImage(wide, high);
        model.planeProperty().get().ifPresent(plane -> {
            Look look = Look.of(comfort);
            PixelWriter pixels = next.getPixelWriter();
            for (int y = 0; y < high; y++) {
                int row = (high - 1 - y) * ColourPlane.ROWS / high;
                for (int x = 0; x < wide; x++) {
                    int column = x * ColourPlane.COLUMNS / wide;
                    Color full = colour(plane.rgbAt(column, row));
                    boolean bar = (x + y) % BAR_EVERY_PX == 0;
                    // Faded towards the ground, so that bars in one ink are seen on every colour.
                    Color shown = plane.reachedAt(column, row)
                            ? full
                            : bar ? look.faint() : look.panel().interpolate(full, LEFT_OF_IT);
                    pixels.setColor(x, y, shown);
                }
            }
        });
        return next;
    }

    private static Color colour(int rgb) {
        return Color.rgb(rgb >> 16 & 0xff, rgb >> 8 & 0xff, rgb & 0xff);
    }

    private void paint() {
        GraphicsContext g = canvas.getGraphicsContext2D();
        double wide = canvas.getWidth();
        double high = canvas.getHeight();
        Look look = Look.of(comfort);
        g.setFill(look.panel());
        g.fillRect(0, 0, wide, high);
        g.drawImage(image, 0, 0);
        double x = model.hueDegreesProperty().get() / 360 * wide;
        double y = (1 - model.lightnessProperty().get() / 100) * high;
        ring(g, x, y, look.emPx() * 0.5);
        where.setText(String.format(
                Locale.ROOT,
                "hue %.0f\u00b0, lightness %.0f, chroma %.0f",
                model.hueDegreesProperty().get(),
                model.lightnessProperty().get(),
                model.chromaProperty().get()));
        frame.setAccessibleText("Colour chooser: " + where.getText());
    }

    private static void ring(GraphicsContext g, double x, double y, double radius) {
        g.setLineWidth(4);
        g.setStroke(Color.BLACK);
        g.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
        g.setLineWidth(2);
        g.setStroke(Color.WHITE);
        g.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
    }
}
