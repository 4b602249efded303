package tideband.window.bands;

import java.util.ArrayList;
import java.util.List;
import javafx.beans.value.ObservableValue;
import javafx.scene.AccessibleRole;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyEvent;
import javafx.scene.layout.Region;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.Viewport;
import tideband.window.look.Look;
import tideband.window.piece.BandReading;
import tideband.window.piece.PieceModel;

/**
 * What each band is, in words, under the band: number and name, colour and order, film, and how near the prediction comes.
 * Where a band is too narrow its number is left, and the rest is in its tooltip and in what is read out.
 *
 * <p>One of the labels takes the focus: the one selected, else the first. Left and right arrows go to the neighbours.
 */
public final class ReadoutView extends Region {
    private final PieceModel model;
    private final ComfortModel comfort;
    private final ObservableValue<Viewport> viewport;
    private final List<BandLabel> labels = new ArrayList<>();

    /**
     * The strip of labels.
     *
     * @param model what is said
     * @param comfort what suits the user
     * @param viewport which stretch is in view, and where, in px from this view's left
     */
    public ReadoutView(PieceModel model, ComfortModel comfort, ObservableValue<Viewport> viewport) {
        this.model = model;
        this.comfort = comfort;
        this.viewport = viewport;
        getStyleClass().add("readout");
        getStylesheets().add(ReadoutView.class.getResource("readout.css").toExternalForm());
        setAccessibleRole(AccessibleRole.PARENT);
        setAccessibleText("Bands in words");
        model.readingsProperty().addListener((value, before, after) -> fill());
        model.selectionProperty().addListener((value, before, after) -> mark());
        comfort.unitProperty().addListener((value, before, after) -> fill());
        comfort.textPercentProperty().addListener((value, before, after) -> requestLayout());
        viewport.addListener((value, before, after) -> requestLayout());
        addEventHandler(KeyEvent.KEY_PRESSED, this::go);
        fill();
    }

    private void fill() {
        List<BandReading> readings = model.readingsProperty().get();
        while (labels.size() < readings.size()) {
            int band = labels.size();
            labels.add(new BandLabel(() -> model.select(band)));
        }
        labels.subList(readings.size(), labels.size()).clear();
        for (int band = 0; band < readings.size(); band++) {
            BandReading reading = readings.get(band);
            labels.get(band).show(reading, model.length(reading.fromMm()), model.length(reading.toMm()));
        }
        if (!getChildren().equals(labels)) {
            getChildren().setAll(labels);
        }
        mark();
        requestLayout();
    }

    private void mark() {
        List<Integer> selected = model.selectionProperty().get().bands();
        int reached = selected.isEmpty() ? 0 : selected.get(0);
        for (int band = 0; band < labels.size(); band++) {
            labels.get(band).mark(selected.contains(band));
            labels.get(band).setFocusTraversable(band == reached);
        }
    }

    private void go(KeyEvent event) {
        int from = labels.indexOf(event.getTarget());
        int step = event.getCode() == KeyCode.RIGHT ? 1 : event.getCode() == KeyCode.LEFT ? -1 : 0;
        boolean plain = !event.isAltDown() && !event.isShortcutDown() && !event.isShiftDown();
        if (from >= 0 && step != 0 && plain) {
            int to = from + step;
            if (to >= 0 && to < labels.size()) {
                labels.get(to).requestFocus();
            }
            event.consume();
        }
    }

    private double emPx() {
        return Look.of(comfort).emPx();
    }

    @Override
    protected double computePrefHeight(double width) {
        return BandLabel.HEIGHT_EMS * emPx();
    }

    @Override
    protected double computeMinHeight(double width) {
        return computePrefHeight(width);
    }

    @Override
    protected void layoutChildren() {
        Viewport view = viewport.getValue();
        for (BandLabel label : labels) {
            double left = Math.rint(view.px(label.fromMm()));
            double right = Math.rint(view.px(label.toMm()));
            double shownLeft = Math.max(0, left);
            double shownWidth = Math.min(getWidth(), right) - shownLeft;
            label.setVisible(shownWidth >= 1);
            if (label.isVisible()) {
                label.fit(shownWidth, emPx());
                label.resizeRelocate(shownLeft, 0, shownWidth, getHeight());
            }
        }
    }
}
