package tideband.window.files;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import javafx.beans.property.SimpleStringProperty;
import javafx.beans.property.StringProperty;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.design.Reading;
import tideband.document.StartingShape;
import tideband.document.StartingShape.Size;
import tideband.oxide.Metal;
import tideband.window.comfort.LengthUnit;

/** A new drawing as it is being described: shape, metal, title and sizes as typed. */
public final class NewDrawingModel {
    private final LengthUnit unit;
    private final ObjectProperty<StartingShape> shape = new SimpleObjectProperty<>(StartingShape.ROUND_ROD);
    private final ObjectProperty<Metal> metal = new SimpleObjectProperty<>(Metal.TITANIUM);
    private final StringProperty title = new SimpleStringProperty("New drawing");
    private final Map<Size, StringProperty> typed = new EnumMap<>(Size.class);

    /**
     * A round rod of titanium to begin with.
     *
     * @param unit the unit sizes are typed in
     */
    public NewDrawingModel(LengthUnit unit) {
        this.unit = unit;
        for (Size size : Size.values()) {
            typed.put(size, new SimpleStringProperty(unit.number(size.usualMm())));
        }
    }

    /**
     * The shape.
     *
     * @return a property
     */
    public ObjectProperty<StartingShape> shapeProperty() {
        return shape;
    }

    /**
     * The metal.
     *
     * @return a property
     */
    public ObjectProperty<Metal> metalProperty() {
        return metal;
    }

    /**
     * The title.
     *
     * @return a property
     */
    public StringProperty titleProperty() {
        return title;
    }

    /**
     * A size as typed; kept when another shape is chosen meanwhile.
     *
     * @param size which
     * @return a property
     */
    public StringProperty typedProperty(Size size) {
        return typed.get(size);
    }

    /**
     * The drawing described.
     *
     * @return the drawing, or everything that is wrong with the description
     */
    public Reading<Design> drawing() {
        Map<Size, Double> sizesMm = new EnumMap<>(Size.class);
        List<Fault> faults = new ArrayList<>();
        for (Size size : shape.get().sizes()) {
            String text = typed.get(size).get();
            OptionalDouble mm = unit.parseMm(text);
            if (mm.isPresent()) {
                sizesMm.put(size, mm.getAsDouble());
            } else {
                faults.add(new Fault(
                        size.title(),
                        text.isBlank() ? "is missing" : "is \"" + text.strip() + "\", which is no length",
                        "give a number in " + unit.symbol()));
            }
        }
        Reading<Design> reading = shape.get().design(title.get().strip(), metal.get(), sizesMm);
        if (reading instanceof Reading.Faulty<Design> faulty) {
            faulty.faults().stream()
                    .map(f -> f.at().equals("/title")
                            ? new Fault(
                                    "Title", "is blank, too long or holds signs no title can", "give 1 to 80 letters")
                            : f)
                    .forEach(faults::add);
        }
        return faults.isEmpty() ? reading : new Reading.Faulty<>(faults);
    }
}
