package tideband.window.colour;

import java.util.Optional;
import java.util.function.Consumer;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.beans.property.SimpleObjectProperty;
import tideband.colour.Srgb;

/** A picture that colours are taken from, with a crosshair on it. */
public final class ImageModel {
    private final Consumer<String> take;
    private final ReadOnlyObjectWrapper<Optional<Pixels>> pixels = new ReadOnlyObjectWrapper<>(Optional.empty());
    private final ReadOnlyIntegerWrapper xPx = new ReadOnlyIntegerWrapper();
    private final ReadOnlyIntegerWrapper yPx = new ReadOnlyIntegerWrapper();
    private final ObjectProperty<Averaging> averaging = new SimpleObjectProperty<>(Averaging.THREE);
    private final ReadOnlyStringWrapper message = new ReadOnlyStringWrapper("");
    private String name = "";

    ImageModel(Consumer<String> take) {
        this.take = take;
        averaging.addListener((value, before, after) -> read());
    }

    /**
     * Shows a picture, with the crosshair in its middle.
     *
     * @param pictureName what it is called
     * @param picture the picture
     */
    public void open(String pictureName, Pixels picture) {
        name = pictureName;
        pixels.set(Optional.of(picture));
        xPx.set(picture.widthPx() / 2);
        yPx.set(picture.heightPx() / 2);
        read();
    }

    /**
     * Says that a picture cannot be shown; the one shown stays.
     *
     * @param fault what happened and what to do
     */
    public void refuse(String fault) {
        message.set(fault);
    }

    /** Puts the picture away; the colour taken from it stays. */
    public void close() {
        name = "";
        pixels.set(Optional.empty());
        message.set("");
    }

    /**
     * Puts the crosshair at a place and takes the colour there.
     *
     * @param toXPx pixels from the left; kept inside the picture
     * @param toYPx pixels from the top; kept inside the picture
     */
    public void place(int toXPx, int toYPx) {
        pixels.get().ifPresent(picture -> {
            xPx.set(Math.min(Math.max(toXPx, 0), picture.widthPx() - 1));
            yPx.set(Math.min(Math.max(toYPx, 0), picture.heightPx() - 1));
            read();
        });
    }

    private void read() {
        pixels.get().ifPresent(picture -> {
            Optional<Srgb> colour = averaging.get().at(picture, xPx.get(), yPx.get());
            String where = name + " at " + xPx.get() + ", " + yPx.get();
            message.set(where
                    + colour.map(c -> ": " + c.hex())
                            .orElse(" is transparent, so there is no colour to take. Move the crosshair."));
            colour.ifPresent(c -> take.accept(c.hex()));
        });
    }

    /**
     * The picture.
     *
     * @return a property; empty while none is open
     */
    public ReadOnlyObjectProperty<Optional<Pixels>> pixelsProperty() {
        return pixels.getReadOnlyProperty();
    }

    /**
     * Where the crosshair is.
     *
     * @return a property: pixels from the left
     */
    public ReadOnlyIntegerProperty xPxProperty() {
        return xPx.getReadOnlyProperty();
    }

    /**
     * Where the crosshair is.
     *
     * @return a property: pixels from the top
     */
    public ReadOnlyIntegerProperty yPxProperty() {
        return yPx.getReadOnlyProperty();
    }

    /**
     * How much of the picture makes up the colour.
     *
     * @return a property
     */
    public ObjectProperty<Averaging> averagingProperty() {
        return averaging;
    }

    /**
     * What is taken, or why nothing is.
     *
     * @return a property; empty while no picture is open and nothing is wrong
     */
    public ReadOnlyStringProperty messageProperty() {
        return message.getReadOnlyProperty();
    }
}
