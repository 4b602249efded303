package tideband.window.settings;

import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.stream.Stream;
import javafx.beans.property.ReadOnlyIntegerProperty;
import javafx.beans.property.ReadOnlyIntegerWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import tideband.match.VoltScale;
import tideband.window.action.Command;
import tideband.window.comfort.ComfortModel;
import tideband.window.drawing.DrawingModel;
import tideband.window.work.WorkModel;

/** Everything about piece, metal, bath, supply, holder, vessel, hand, bench times and comfort, as settings in groups. */
public final class SettingsModel {
    private final BathModel bath;
    private final StationsModel stations;
    private final List<Group> groups;
    private final WorkModel work;
    private final ComfortCommands commands;
    private final ReadOnlyStringWrapper reach = new ReadOnlyStringWrapper("");
    private final ReadOnlyIntegerWrapper called = new ReadOnlyIntegerWrapper(0);

    /**
     * Settings of a drawing.
     *
     * @param drawing the drawing
     * @param work the work behind it
     * @param comfort what suits the user
     * @param chooseBathFile asks the user for a bath file; empty if none was chosen
     */
    public SettingsModel(
            DrawingModel drawing, WorkModel work, ComfortModel comfort, Supplier<Optional<Path>> chooseBathFile) {
        DesignSettings make = new DesignSettings(drawing, comfort);
        this.work = work;
        bath = new BathModel(make, chooseBathFile);
        stations = new StationsModel(make);
        groups = List.of(
                PieceSettings.of(make),
                LookSettings.of(make),
                bath.group(),
                SupplySettings.of(make),
                HoldingSettings.of(make),
                VesselSettings.of(make),
                HandSettings.of(make),
                BenchSettings.of(make),
                ComfortSettings.of(comfort));
        commands = new ComfortCommands(comfort, () -> called.set(called.get() + 1));
        drawing.designProperty().addListener((value, before, after) -> refresh());
        comfort.unitProperty().addListener((value, before, after) -> refresh());
        comfort.textPercentProperty().addListener((value, before, after) -> refresh());
        comfort.darkProperty().addListener((value, before, after) -> refresh());
        comfort.mutedProperty().addListener((value, before, after) -> refresh());
        work.coloursProperty().addListener((value, before, after) -> refreshReach());
        refreshReach();
    }

    /**
     * All settings.
     *
     * @return groups in the order they are shown
     */
    public List<Group> groups() {
        return groups;
    }

    /**
     * The group of the piece's shape; its stations stand below it.
     *
     * @return one of {@link #groups()}
     */
    public Group pieceGroup() {
        return groups.get(0);
    }

    /**
     * The group of the bath; where it comes from stands in it.
     *
     * @return one of {@link #groups()}
     */
    public Group bathGroup() {
        return bath.group();
    }

    /**
     * The bath beyond its numbers.
     *
     * @return its model
     */
    public BathModel bath() {
        return bath;
    }

    /**
     * The piece's sizes.
     *
     * @return their model
     */
    public StationsModel stations() {
        return stations;
    }

    /**
     * What bath and supply reach, in a sentence.
     *
     * @return a property
     */
    public ReadOnlyStringProperty reachProperty() {
        return reach.getReadOnlyProperty();
    }

    /**
     * How often the user has asked to go to the settings; a view takes the focus whenever it rises.
     *
     * @return a property
     */
    public ReadOnlyIntegerProperty calledProperty() {
        return called.getReadOnlyProperty();
    }

    /**
     * What the user can do here.
     *
     * @return commands for menus and keys
     */
    public List<Command> commands() {
        return Stream.concat(commands.all().stream(), bath.commands().stream()).toList();
    }

    private void refresh() {
        groups.forEach(Group::refresh);
        bath.refresh();
        stations.refresh();
    }

    private void refreshReach() {
        VoltScale scale = work.coloursProperty().get().scale();
        reach.set(String.format(
                Locale.ROOT,
                "Bath and supply reach films of %.0f nm, at %.1f V.",
                scale.ceilingNm(),
                scale.ceilingVolts()));
    }
}
