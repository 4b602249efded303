package tideband.window.colour;

import java.io.File;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import javafx.beans.InvalidationListener;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.control.Button;
import javafx.scene.control.ComboBox;
import javafx.scene.control.Label;
import javafx.scene.control.Tooltip;
import javafx.scene.image.Image;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.input.TransferMode;
import javafx.scene.layout.FlowPane;
import javafx.scene.layout.StackPane;
import javafx.scene.layout.VBox;
import javafx.scene.paint.Color;
import javafx.stage.FileChooser;
import javafx.util.StringConverter;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/** A picture to take a colour from, with a crosshair that hand and keys move; it can be enlarged around the crosshair. */
final class ImagePickView extends VBox {
    private static final double WIDE_EM = 18;
    private static final double HIGH_EM = 14;
    private static final double ZOOM_STEP = 1.5;
    private static final double LARGEST_ZOOM = 64;
    private static final int LEAP_PX = 10;

    private final ImageModel model;
    private final ComfortModel comfort;
    private final Canvas canvas = new Canvas();
    private final StackPane frame = new StackPane(canvas);
    private final Button larger = button("+", "Larger", "Shows the picture larger, around the crosshair (key +)");
    private final Button smaller = button("\u2212", "Smaller", "Shows the picture smaller (key \u2212)");
    private final Button whole = button("Whole", "Whole picture", "Shows the whole picture (key 0)");
    private final Button away = button("Close", "Close picture", "Puts the picture away; the colour stays");
    private final ComboBox<Averaging> averaging = new ComboBox<>();
    // Times the size at which the whole picture fits.
    private double zoom = 1;
    // The place of the picture in the middle of the view, in its pixels.
    private double middleX;
    private double middleY;

    ImagePickView(ImageModel model, ComfortModel comfort) {
        this.model = model;
        this.comfort = comfort;
        setStyle("-fx-spacing: 0.4em;");
        Button open =
                button("Open picture\u2026", "Open picture", "Opens a PNG, JPEG, GIF or BMP file; or drop one here");
        open.setOnAction(e -> ask());
        larger.setOnAction(e -> zoom(ZOOM_STEP));
        smaller.setOnAction(e -> zoom(1 / ZOOM_STEP));
        whole.setOnAction(e -> zoom(0));
        away.setOnAction(e -> {
            model.close();
            open.requestFocus();
        });
        FlowPane buttons = new FlowPane(open, larger, smaller, whole, averaging(), away);
        buttons.setStyle("-fx-hgap: 0.3em; -fx-vgap: 0.3em;");
        Label message = new Label();
        message.setWrapText(true);
        message.textProperty().bind(model.messageProperty());
        message.visibleProperty().bind(model.messageProperty().isNotEmpty());
        message.managedProperty().bind(message.visibleProperty());
        Label help =
                new Label("Click, or move the crosshair with the arrow keys (Shift: ten pixels). Colours are taken as"
                        + " sRGB; a photograph in warm light shows warm colours.");
        help.setWrapText(true);
        help.getStyleClass().add("faint");
        frame();
        getChildren().setAll(buttons, frame, message, help);
        setOnDragOver(e -> {
            if (e.getDragboard().hasFiles()) {
                e.acceptTransferModes(TransferMode.COPY);
                e.consume();
            }
        });
        setOnDragDropped(e -> {
            List<File> files = e.getDragboard().getFiles();
            if (!files.isEmpty()) {
                open(files.get(0).toPath());
            }
            e.setDropCompleted(!files.isEmpty());
            e.consume();
        });
        InvalidationListener repaint = o -> paint();
        model.pixelsProperty().addListener((value, before, after) -> {
            zoom = 1;
            centre();
            arrange();
        });
        model.xPxProperty().addListener(repaint);
        model.yPxProperty().addListener(repaint);
        model.averagingProperty().addListener(repaint);
        model.messageProperty()
                .addListener((value, before, after) -> frame.setAccessibleText("Picture, crosshair: " + after));
        comfort.darkProperty().addListener(repaint);
        comfort.textPercentProperty().addListener(o -> arrange());
        arrange();
    }

    private void frame() {
        frame.getStyleClass().add("colour-canvas");
        frame.setMaxWidth(USE_PREF_SIZE);
        frame.setFocusTraversable(true);
        frame.setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        frame.setAccessibleText("Picture");
        frame.setAccessibleHelp(
                "Arrow keys move the crosshair, with Shift by ten pixels; plus and minus enlarge; 0 shows all");
        Tooltip.install(frame, new Tooltip("Click to take the colour there; turn the wheel to enlarge"));
        frame.setOnMousePressed(e -> {
            frame.requestFocus();
            place(e.getX(), e.getY());
        });
        frame.setOnMouseDragged(e -> place(e.getX(), e.getY()));
        frame.setOnKeyPressed(this::key);
        frame.setOnScroll(this::scroll);
    }

    private ComboBox<Averaging> averaging() {
        averaging.getItems().setAll(Averaging.values());
        averaging.setConverter(new StringConverter<>() {
            @Override
            public String toString(Averaging one) {
                return "radius " + one.radiusPx() + " px";
            }

            @Override
            public Averaging fromString(String text) {
                throw new UnsupportedOperationException("the choice is not typed");
            }
        });
        averaging.valueProperty().bindBidirectional(model.averagingProperty());
        averaging.setAccessibleText("Averaging radius");
        averaging.setTooltip(new Tooltip("How many pixels around the crosshair make up the colour"));
        return averaging;
    }

    private static Button button(String text, String name, String help) {
        Button button = new Button(text);
        button.setAccessibleText(name);
        button.setTooltip(new Tooltip(help));
        return button;
    }

    void ask() {
        FileChooser chooser = new FileChooser();
        chooser.setTitle("Take a colour from a picture");
        chooser.getExtensionFilters()
                .add(new FileChooser.ExtensionFilter(
                        "Pictures", "*.png", "*.jpg", "*.jpeg", "*.gif", "*.bmp", "*.PNG", "*.JPG", "*.JPEG"));
        File file = chooser.showOpenDialog(getScene().getWindow());
        if (file != null) {
            open(file.toPath());
        }
    }

    void open(Path file) {
        try {
            model.open(file.getFileName().toString(), new ImagePixels(ImageReading.read(file)));
            frame.requestFocus();
        } catch (IOException e) {
            model.refuse(file.getFileName() + " cannot be shown: " + e.getMessage()
                    + ". Open a PNG, JPEG, GIF or BMP picture.");
        }
    }

    private void arrange() {
        boolean there = model.pixelsProperty().get().isPresent();
        for (var node : List.of(frame, larger, smaller, whole, averaging, away)) {
            node.setVisible(there);
            node.setManaged(there);
        }
        double em = Look.of(comfort).emPx();
        canvas.setWidth(WIDE_EM * em);
        canvas.setHeight(there ? Math.min(HIGH_EM * em, canvas.getWidth() / aspect()) : 0);
        paint();
    }

    private double aspect() {
        return model.pixelsProperty()
                .get()
                .map(p -> (double) p.widthPx() / p.heightPx())
                .orElse(1.0);
    }

    private double scale() {
        Pixels pixels = model.pixelsProperty().get().orElseThrow();
        return zoom * Math.min(canvas.getWidth() / pixels.widthPx(), canvas.getHeight() / pixels.heightPx());
    }

    private void zoom(double factor) {
        if (model.pixelsProperty().get().isPresent()) {
            zoom = factor == 0 ? 1 : Math.min(Math.max(zoom * factor, 1), LARGEST_ZOOM);
            centre();
            paint();
        }
    }

    private void centre() {
        middleX = model.xPxProperty().get() + 0.5;
        middleY = model.yPxProperty().get() + 0.5;
    }

    private void scroll(ScrollEvent e) {
        if (e.getDeltaY() != 0) {
            zoom(e.getDeltaY() > 0 ? ZOOM_STEP : 1 / ZOOM_STEP);
            e.consume();
        }
    }

    private void place(double x, double y) {
        model.place((int) Math.floor((x - canvas.getLayoutX() - left()) / scale()), (int)
                Math.floor((y - canvas.getLayoutY() - top()) / scale()));
    }

    private void key(KeyEvent e) {
        int by = e.isShiftDown() ? LEAP_PX : 1;
        int x = model.xPxProperty().get();
        int y = model.yPxProperty().get();
        switch (e.getCode()) {
            case LEFT -> model.place(x - by, y);
            case RIGHT -> model.place(x + by, y);
            case UP -> model.place(x, y - by);
            case DOWN -> model.place(x, y + by);
            case PLUS, ADD, EQUALS -> zoom(ZOOM_STEP);
            case MINUS, SUBTRACT -> zoom(1 / ZOOM_STEP);
            case DIGIT0, NUMPAD0 -> zoom(0);
            default -> {
                return;
            }
        }
        e.consume();
    }

    // Where the picture's left side lies in the view; where it is larger than the view it fills it.
    private double left() {
        return offset(middleX, model.pixelsProperty().get().orElseThrow().widthPx(), canvas.getWidth());
    }

    private double top() {
        return offset(middleY, model.pixelsProperty().get().orElseThrow().heightPx(), canvas.getHeight());
    }

    private double offset(double middle, double lengthPx, double viewPx) {
        double spare = viewPx - lengthPx * scale();
        return spare >= 0 ? spare / 2 : Math.min(0, Math.max(spare, viewPx / 2 - middle * scale()));
    }

    private void follow() {
        double scale = scale();
        double x = left() + (model.xPxProperty().get() + 0.5) * scale;
        double y = top() + (model.yPxProperty().get() + 0.5) * scale;
        if (x < 0 || y < 0 || x > canvas.getWidth() || y > canvas.getHeight()) {
            centre();
        }
    }

    private void paint() {
        if (!(model.pixelsProperty().get().orElse(null) instanceof ImagePixels pixels)) {
            return;
        }
        follow();
        Look look = Look.of(comfort);
        GraphicsContext g = canvas.getGraphicsContext2D();
        Image image = pixels.image();
        double scale = scale();
        g.setFill(look.panel());
        g.fillRect(0, 0, canvas.getWidth(), canvas.getHeight());
        g.setImageSmoothing(scale < 1);
        g.drawImage(image, left(), top(), image.getWidth() * scale, image.getHeight() * scale);
        double x = left() + (model.xPxProperty().get() + 0.5) * scale;
        double y = top() + (model.yPxProperty().get() + 0.5) * scale;
        double radius = Math.max(model.averagingProperty().get().radiusPx() * scale, look.emPx() * 0.35);
        cross(g, x, y, radius, look.emPx(), 3, Color.BLACK);
        cross(g, x, y, radius, look.emPx(), 1.2, Color.WHITE);
    }

    private static void cross(
            GraphicsContext g, double x, double y, double radius, double arm, double width, Color ink) {
        g.setStroke(ink);
        g.setLineWidth(width);
        g.strokeOval(x - radius, y - radius, 2 * radius, 2 * radius);
        g.strokeLine(x - radius - arm, y, x - radius, y);
        g.strokeLine(x + radius, y, x + radius + arm, y);
        g.strokeLine(x, y - radius - arm, x, y - radius);
        g.strokeLine(x, y + radius, x, y + radius + arm);
    }
}
