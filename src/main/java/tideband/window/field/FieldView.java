package tideband.window.field;

import java.util.EnumSet;
import java.util.Set;
import javafx.beans.binding.Bindings;
import javafx.scene.AccessibleAction;
import javafx.scene.AccessibleAttribute;
import javafx.scene.AccessibleRole;
import javafx.scene.Cursor;
import javafx.scene.canvas.Canvas;
import javafx.scene.control.Label;
import javafx.scene.control.OverrunStyle;
import javafx.scene.control.Tooltip;
import javafx.scene.input.KeyEvent;
import javafx.scene.input.MouseButton;
import javafx.scene.input.MouseEvent;
import javafx.scene.input.ScrollEvent;
import javafx.scene.input.ZoomEvent;
import javafx.scene.layout.Region;
import tideband.window.comfort.ComfortModel;
import tideband.window.look.Look;

/**
 * The field on the screen: three canvases over each other, each painted only when its layer changes and at most once a
 * frame, under a strip that reads out what is pointed at.
 */
public final class FieldView extends Region {
    private static final double STRIP_EMS = 1.8;
    private static final double WIDTH_EMS = 52;
    private static final double HEIGHT_EMS = 18;
    private static final double LEAST_WIDTH_EMS = 26;
    private static final double LEAST_HEIGHT_EMS = 12;
    private static final double ZOOM_A_NOTCH = 1.2;
    private static final String HELP = "Page Down and Page Up go from band to band, with Shift they select more; Ctrl"
            + " (Command on a Mac) with Right and Left goes from handle to handle. The arrow keys move what has the focus by 1 mm"
            + " or 1 nm, with Shift by 10, with Alt by a tenth; Ctrl with Up and Down moves a film by the supply's dial."
            + " Enter opens exact values, Delete deletes, Escape gives up. F2, F3 and F4 change how near it is looked at.";

    private static final String HOW_TO_DRAW =
            "Draw the films here: lines are bands, take them up and down; take edges sideways"
                    + " on the rail above. Double-click splits. F1 lists the keys.";

    private final FieldModel model;
    private final ComfortModel comfort;
    private final Label strip = new Label();
    private final Canvas ground = new Canvas();
    private final Canvas line = new Canvas();
    private final Canvas overlay = new Canvas();
    private final GroundPainter groundPainter = new GroundPainter(ground);
    private final LinePainter linePainter = new LinePainter(line);
    private final OverlayPainter overlayPainter = new OverlayPainter(overlay);
    private final Set<Layer> stale = EnumSet.allOf(Layer.class);
    private final FieldKeys keys;
    private Look look;

    /**
     * A view of a field.
     *
     * @param model the field
     * @param comfort what suits the user
     */
    public FieldView(FieldModel model, ComfortModel comfort) {
        this.model = model;
        this.comfort = comfort;
        this.look = Look.of(comfort);
        this.keys = new FieldKeys(model);
        getStylesheets().add(FieldView.class.getResource("field.css").toExternalForm());
        getStyleClass().add("field");
        strip.getStyleClass().add("field-strip");
        strip.setTextOverrun(OverrunStyle.ELLIPSIS);
        strip.setManaged(false);
        for (Canvas canvas : new Canvas[] {ground, line, overlay}) {
            canvas.setManaged(false);
            canvas.setMouseTransparent(true);
        }
        getChildren().addAll(ground, line, overlay, strip);
        setFocusTraversable(true);
        speak();
        for (Layer layer : Layer.values()) {
            model.changesProperty(layer).addListener((value, before, after) -> mark(layer));
        }
        comfort.darkProperty().addListener((value, before, after) -> redress());
        comfort.textPercentProperty().addListener((value, before, after) -> redress());
        focusedProperty().addListener((value, before, after) -> {
            keys.letGo();
            mark(Layer.OVERLAY);
        });
        model.readingProperty().addListener((value, before, after) -> tell());
        model.messageProperty().addListener((value, before, after) -> tell());
        listenToHand();
        addEventHandler(KeyEvent.KEY_PRESSED, keys::pressed);
        addEventHandler(KeyEvent.KEY_RELEASED, keys::released);
        tell();
    }

    private void speak() {
        setAccessibleRole(AccessibleRole.SLIDER);
        setAccessibleRoleDescription("drawing field");
        setAccessibleHelp(HELP);
        accessibleTextProperty().bind(model.spokenProperty());
        model.spokenProperty().addListener((value, before, after) -> {
            tell();
            notifyAccessibleAttributeChanged(AccessibleAttribute.VALUE);
        });
        Tooltip tip = new Tooltip();
        tip.textProperty().bind(Bindings.concat(strip.textProperty(), "\n", HOW_TO_DRAW));
        tip.setShowDelay(javafx.util.Duration.seconds(1.5));
        tip.setWrapText(true);
        tip.setMaxWidth(WIDTH_EMS / 2 * look.emPx());
        Tooltip.install(strip, tip);
    }

    private void mark(Layer layer) {
        stale.add(layer);
        requestLayout();
    }

    private void redress() {
        look = Look.of(comfort);
        stale.addAll(EnumSet.allOf(Layer.class));
        requestLayout();
    }

    private void tell() {
        String message = model.messageProperty().get();
        if (!message.isEmpty()) {
            strip.setText("! " + message);
        } else if (!model.readingProperty().get().isEmpty()) {
            strip.setText(model.readingProperty().get());
        } else {
            strip.setText(model.spokenProperty().getValue());
        }
        boolean warning = !message.isEmpty();
        if (warning != strip.getStyleClass().contains("warning")) {
            if (warning) {
                strip.getStyleClass().add("warning");
            } else {
                strip.getStyleClass().remove("warning");
            }
        }
    }

    private void listenToHand() {
        addEventHandler(MouseEvent.MOUSE_PRESSED, this::press);
        addEventHandler(MouseEvent.MOUSE_DRAGGED, e -> {
            model.hand().drag(e.getX(), y(e), keysOf(e));
            e.consume();
        });
        addEventHandler(MouseEvent.MOUSE_RELEASED, e -> {
            model.hand().release();
            hover(e);
            e.consume();
        });
        addEventHandler(MouseEvent.MOUSE_MOVED, this::hover);
        addEventHandler(MouseEvent.MOUSE_EXITED, e -> model.hand().leave());
        addEventHandler(ScrollEvent.SCROLL, this::scroll);
        addEventHandler(ZoomEvent.ZOOM, e -> {
            model.sight().zoomAlong(e.getZoomFactor(), e.getX());
            e.consume();
        });
    }

    private double y(MouseEvent event) {
        return event.getY() - ground.getLayoutY();
    }

    private static Modifiers keysOf(MouseEvent event) {
        return new Modifiers(event.isShiftDown(), event.isShortcutDown(), event.isAltDown());
    }

    private void press(MouseEvent event) {
        requestFocus();
        if (event.getButton() == MouseButton.MIDDLE || (event.getButton() == MouseButton.PRIMARY && keys.panning())) {
            model.hand().pressToPan(event.getX(), y(event));
            setCursor(Cursor.CLOSED_HAND);
        } else if (event.getButton() == MouseButton.PRIMARY && event.getClickCount() == 2) {
            model.hand().pressTwice(event.getX(), y(event));
        } else if (event.getButton() == MouseButton.PRIMARY) {
            model.hand().press(event.getX(), y(event), keysOf(event));
        }
        event.consume();
    }

    private void hover(MouseEvent event) {
        model.hand().hover(event.getX(), y(event));
        setCursor(
                keys.panning()
                        ? Cursor.OPEN_HAND
                        : switch (model.hand().grip(event.getX(), y(event))) {
                            case ALONG -> Cursor.H_RESIZE;
                            case UP -> Cursor.V_RESIZE;
                            case TAKE -> Cursor.HAND;
                            case SELECT -> Cursor.CROSSHAIR;
                        });
    }

    private void scroll(ScrollEvent event) {
        double yPx = event.getY() - ground.getLayoutY();
        double notches = (event.getDeltaY() != 0 ? event.getDeltaY() : event.getDeltaX()) / 40;
        if (event.isShortcutDown()) {
            double factor = Math.pow(ZOOM_A_NOTCH, notches);
            if (event.isAltDown()
                    || event.isShiftDown()
                    || event.getX() < model.shown().area().leftPx()) {
                model.sight().zoomUp(factor, yPx);
            } else {
                model.sight().zoomAlong(factor, event.getX());
            }
            event.consume();
        } else if (model.sight().pan(-event.getDeltaX(), event.getDeltaY())
                || model.sight().pan(-event.getDeltaX() - event.getDeltaY(), 0)) {
            // Only where there was somewhere to go: else what surrounds the field may scroll.
            event.consume();
        }
    }

    @Override
    protected double computePrefWidth(double height) {
        return WIDTH_EMS * look.emPx();
    }

    @Override
    protected double computePrefHeight(double width) {
        return HEIGHT_EMS * look.emPx();
    }

    @Override
    protected double computeMinWidth(double height) {
        return LEAST_WIDTH_EMS * look.emPx();
    }

    @Override
    protected double computeMinHeight(double width) {
        return LEAST_HEIGHT_EMS * look.emPx();
    }

    @Override
    protected void layoutChildren() {
        double stripPx = Math.ceil(STRIP_EMS * look.emPx());
        double width = Math.floor(getWidth());
        double height = Math.floor(getHeight() - stripPx);
        if (width < 1 || height < 1) {
            return;
        }
        strip.resizeRelocate(0, 0, width, stripPx);
        if (ground.getWidth() != width || ground.getHeight() != height || ground.getLayoutY() != stripPx) {
            for (Canvas canvas : new Canvas[] {ground, line, overlay}) {
                canvas.setWidth(width);
                canvas.setHeight(height);
                canvas.setLayoutY(stripPx);
            }
            stale.addAll(EnumSet.allOf(Layer.class));
        }
        model.sight().resize(new FieldArea(width, height, look.emPx()));
        paint();
    }

    private void paint() {
        if (stale.remove(Layer.GROUND)) {
            groundPainter.paint(model.shown(), look);
        }
        if (stale.remove(Layer.DRAWING)) {
            linePainter.paint(model.shown(), look);
        }
        if (stale.remove(Layer.OVERLAY)) {
            overlayPainter.paint(model.shown(), model.hand(), isFocused(), look);
        }
    }

    @Override
    public Object queryAccessibleAttribute(AccessibleAttribute attribute, Object... parameters) {
        return switch (attribute) {
            case VALUE -> model.keyboard().value();
            case MIN_VALUE -> 0.0;
            case MAX_VALUE -> model.keyboard().mostValue();
            default -> super.queryAccessibleAttribute(attribute, parameters);
        };
    }

    @Override
    public void executeAccessibleAction(AccessibleAction action, Object... parameters) {
        switch (action) {
            case INCREMENT -> model.keyboard().nudge(1);
            case DECREMENT -> model.keyboard().nudge(-1);
            default -> super.executeAccessibleAction(action, parameters);
        }
    }
}
