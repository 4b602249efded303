package tideband.window.field;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import tideband.design.Design;
import tideband.edit.Part;
import tideband.match.Match;
import tideband.window.Desk;
import tideband.window.work.Glance;

/** A field over a design, with all that others plug into it. */
final class FieldDesk {
    final Desk desk;
    final FieldModel model;
    final ObjectProperty<List<Match>> matches = new SimpleObjectProperty<>(List.of());
    final ObjectProperty<Optional<Glance>> glance = new SimpleObjectProperty<>(Optional.empty());
    final ObjectProperty<List<Integer>> faulty = new SimpleObjectProperty<>(List.of());
    final List<Match> taken = new ArrayList<>();

    FieldDesk(Design design) {
        desk = Desk.with(design);
        model = new FieldModel(
                desk.drawing(), desk.work(), desk.tilt(), desk.comfort(), matches, taken::add, glance, faulty);
        model.sight().resize(new FieldArea(1000, 400, 13));
    }

    static FieldDesk over(String name) {
        return new FieldDesk(Desk.shipped(name));
    }

    Design design() {
        return desk.drawing().design();
    }

    Handle handle(Part part) {
        return model.shown().handles().stream()
                .filter(h -> h.part().equals(part))
                .findFirst()
                .orElseThrow();
    }

    double px(double mm) {
        return model.viewportProperty().get().px(mm);
    }

    double py(double nm) {
        return model.scaleProperty().get().px(nm);
    }

    /** Drags a part by px with keys held. */
    void drag(Part part, double byX, double byY, Modifiers keys) {
        Handle handle = handle(part);
        drag(handle.xPx(), handle.yPx(), byX, byY, keys);
    }

    void drag(double x, double y, double byX, double byY, Modifiers keys) {
        model.hand().press(x, y, keys);
        for (int i = 1; i <= 4; i++) {
            model.hand().drag(x + byX * i / 4, y + byY * i / 4, keys);
        }
        model.hand().release();
    }

    void click(double x, double y, Modifiers keys) {
        model.hand().press(x, y, keys);
        model.hand().release();
    }
}
