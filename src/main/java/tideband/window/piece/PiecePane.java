package tideband.window.piece;

import java.nio.IntBuffer;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleRole;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.image.ImageView;
import javafx.scene.image.PixelBuffer;
import javafx.scene.image.PixelFormat;
import javafx.scene.image.WritableImage;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.layout.Region;
import javafx.scene.shape.Rectangle;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;

/** The picture itself: the piece painted into one image that is used again, marks over it, and a reading where it is pointed at. */
final class PiecePane extends Region {
    private static final double LEAST_PIECE_EMS = 1.85;
    private static final double LEAST_HEIGHT_EMS = 5;

    private final PieceModel model;
    private final ComfortModel comfort;
    private final ObservableValue<Viewport> viewport;
    private final PiecePainter painter = new PiecePainter();
    private final ImageView picture = new ImageView();
    private final Canvas over = new Canvas();
    private final Rectangle cursor = new Rectangle(1, 1);
    private final Label reading = new Label();
    private final ReadOnlyStringWrapper scaleWords = new ReadOnlyStringWrapper("");
    private PixelBuffer<IntBuffer> pixels;
    private boolean dirty = true;
    private double cursorMm = Double.NaN;

    PiecePane(PieceModel model, ComfortModel comfort, ObservableValue<Viewport> viewport) {
        this.model = model;
        this.comfort = comfort;
        this.viewport = viewport;
        getStyleClass().addAll("piece-pane", "focus-ring");
        setFocusTraversable(true);
        setAccessibleRole(AccessibleRole.IMAGE_VIEW);
        setAccessibleHelp("Left and right arrows read the piece off place by place, with Shift in long steps;"
                + " Home and End go to its ends; Enter selects the band.");
        cursor.getStyleClass().add("cursor");
        reading.getStyleClass().add("reading");
        picture.setSmooth(false);
        for (javafx.scene.Node node : new javafx.scene.Node[] {picture, over, cursor, reading}) {
            node.setManaged(false);
            node.setMouseTransparent(true);
            getChildren().add(node);
        }
        setOnMouseMoved(event -> point(event.getX()));
        setOnMouseExited(event -> point(Double.NaN));
        setOnMouseClicked(event -> {
            if (event.getButton() == MouseButton.PRIMARY && event.isStillSincePress()) {
                requestFocus();
                model.selectAt(viewport.getValue().mm(event.getX()));
            }
        });
        setOnKeyPressed(this::key);
        listen();
        pointAt(Double.NaN);
    }

    private void listen() {
        model.portraitProperty().addListener((value, before, after) -> soil());
        model.tableProperty().addListener((value, before, after) -> soil());
        model.tiltDegProperty().addListener((value, before, after) -> soil());
        model.lampsProperty().addListener((value, before, after) -> soil());
        model.differencesProperty().addListener((value, before, after) -> soil());
        model.selectionProperty().addListener((value, before, after) -> soil());
        model.summaryProperty().addListener((value, before, after) -> pointAt(cursorMm));
        viewport.addListener((value, before, after) -> soil());
        comfort.darkProperty().addListener((value, before, after) -> soil());
        comfort.textPercentProperty().addListener((value, before, after) -> soil());
        comfort.unitProperty().addListener((value, before, after) -> {
            soil();
            pointAt(cursorMm);
        });
    }

    /**
     * How the piece is scaled across, in words.
     *
     * @return a property
     */
    ReadOnlyStringProperty scaleWordsProperty() {
        return scaleWords.getReadOnlyProperty();
    }

    private void soil() {
        dirty = true;
        requestLayout();
    }

    @Override
    protected double computeMinHeight(double width) {
        return LEAST_HEIGHT_EMS * Look.of(comfort).emPx();
    }

    @Override
    protected double computePrefHeight(double width) {
        return 2 * LEAST_HEIGHT_EMS * Look.of(comfort).emPx();
    }

    @Override
    protected void layoutChildren() {
        int width = (int) Math.ceil(getWidth());
        int height = (int) Math.ceil(getHeight());
        if (width <= 0 || height <= 0) {
            return;
        }
        if (pixels == null || pixels.getWidth() != width || pixels.getHeight() != height) {
            pixels = new PixelBuffer<>(
                    width, height, IntBuffer.allocate(width * height), PixelFormat.getIntArgbPreInstance());
            picture.setImage(new WritableImage(pixels));
            over.setWidth(width);
            over.setHeight(height);
            dirty = true;
        }
        if (dirty) {
            dirty = false;
            paint(width, height);
        }
        placeReading();
    }

    private void paint(int width, int height) {
        Look look = Look.of(comfort);
        Portrait portrait = model.portraitProperty().get();
        Room room = Room.in(
                height,
                look.emPx(),
                portrait.split(),
                model.differenceShownProperty().get());
        Viewport view = viewport.getValue();
        AcrossScale scale = AcrossScale.fit(
                portrait.piece().largestSizeMm(0, portrait.piece().lengthMm()),
                view.pxPerMm(),
                LEAST_PIECE_EMS * look.emPx(),
                room.heightPx());
        scaleWords.set(scale.words());
        Frame frame = new Frame(
                view,
                room.centrePx(),
                scale.pxPerMm(),
                portrait.piece(),
                portrait.finish(),
                portrait.upper(),
                portrait.lower(),
                model.tableProperty().get(),
                model.tiltDegProperty().get(),
                model.lampsProperty().get());
        painter.paint(pixels.getBuffer().array(), width, height, frame);
        pixels.updateBuffer(buffer -> null);
        new PieceMarks(over.getGraphicsContext2D(), look, model, frame, room).draw(width, height);
    }

    private void point(double xPx) {
        pointAt(viewport.getValue().mm(xPx));
    }

    private void pointAt(double atMm) {
        cursorMm = atMm;
        String line = model.readingAt(atMm)
                .map(found -> found.line(model.length(atMm)))
                .orElse("");
        reading.setText(line);
        reading.setVisible(!line.isEmpty());
        cursor.setVisible(!line.isEmpty());
        setAccessibleText(line.isEmpty() ? model.summaryProperty().get() : line);
        requestLayout();
    }

    private void placeReading() {
        if (!reading.isVisible()) {
            return;
        }
        double x = Math.rint(viewport.getValue().px(cursorMm));
        cursor.setX(x);
        cursor.setHeight(getHeight());
        reading.autosize();
        double left = Math.max(0, Math.min(getWidth() - reading.getWidth(), x - reading.getWidth() / 2));
        reading.relocate(Math.rint(left), Math.rint(getHeight() - reading.getHeight() - 1));
    }

    private void key(KeyEvent event) {
        if (event.isAltDown() || event.isShortcutDown()) {
            return;
        }
        double lengthMm = model.portraitProperty().get().piece().lengthMm();
        double stepMm = comfort.unit().inMm() > 1 ? comfort.unit().inMm() / 32 : 1;
        double step = event.isShiftDown() ? 10 * stepMm : stepMm;
        double here = Double.isNaN(cursorMm) ? 0 : cursorMm;
        switch (event.getCode()) {
            case LEFT -> pointAt(Math.max(0, here - step));
            case RIGHT -> pointAt(Math.min(lengthMm, here + step));
            case HOME -> pointAt(0);
            case END -> pointAt(lengthMm);
            case ENTER, SPACE -> model.selectAt(here);
            case ESCAPE -> pointAt(Double.NaN);
            default -> {
                return;
            }
        }
        event.consume();
    }
}
