package tideband.window.comfort;

import javafx.beans.property.BooleanProperty;
import javafx.beans.property.IntegerProperty;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleBooleanProperty;
import javafx.beans.property.SimpleIntegerProperty;
import javafx.beans.property.SimpleObjectProperty;

/** How the window suits its user. */
public final class ComfortModel {
    /** The smallest text, in per cent. */
    public static final int SMALLEST_TEXT = 100;
    /** The largest text, in per cent. */
    public static final int LARGEST_TEXT = 200;

    private final ObjectProperty<LengthUnit> unit = new SimpleObjectProperty<>(LengthUnit.MILLIMETRE);
    private final IntegerProperty textPercent = new SimpleIntegerProperty(SMALLEST_TEXT);
    private final BooleanProperty dark = new SimpleBooleanProperty(false);
    private final BooleanProperty muted = new SimpleBooleanProperty(false);

    /**
     * The unit lengths are shown in.
     *
     * @return a property
     */
    public ObjectProperty<LengthUnit> unitProperty() {
        return unit;
    }

    /**
     * The unit lengths are shown in.
     *
     * @return the unit
     */
    public LengthUnit unit() {
        return unit.get();
    }

    /**
     * The size of text in per cent.
     *
     * @return a property, {@link #SMALLEST_TEXT} to {@link #LARGEST_TEXT}
     */
    public IntegerProperty textPercentProperty() {
        return textPercent;
    }

    /**
     * Whether the window is dark.
     *
     * @return a property
     */
    public BooleanProperty darkProperty() {
        return dark;
    }

    /**
     * Whether sounds are off.
     *
     * @return a property
     */
    public BooleanProperty mutedProperty() {
        return muted;
    }
}
