package tideband.window.settings;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.DoubleFunction;
import java.util.function.Supplier;
import java.util.function.ToDoubleFunction;
import javafx.beans.binding.Bindings;
import javafx.beans.property.ReadOnlyBooleanProperty;
import javafx.beans.property.ReadOnlyBooleanWrapper;
import javafx.beans.property.ReadOnlyStringProperty;
import javafx.beans.property.ReadOnlyStringWrapper;
import javafx.collections.FXCollections;
import javafx.collections.ObservableList;
import tideband.design.BathFile;
import tideband.design.Design;
import tideband.design.Fault;
import tideband.design.Limits;
import tideband.design.Range;
import tideband.design.Reading;
import tideband.edit.DesignEdits;
import tideband.oxide.Bath;
import tideband.oxide.BathPresets;
import tideband.window.action.Command;
import tideband.window.entry.About;
import tideband.window.entry.Bounds;
import tideband.window.entry.Choice;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.Terms;
import tideband.window.entry.TextSetting;

/** The bath: a preset, one from a file, or the shop's own, which a preset becomes when a number of it is changed. */
public final class BathModel {
    private final DesignSettings make;
    private final Supplier<Optional<Path>> chooseBathFile;
    private final Group group;
    private final ReadOnlyStringWrapper origin = new ReadOnlyStringWrapper("");

    private final ReadOnlyBooleanWrapper own = new ReadOnlyBooleanWrapper(false);
    private final ReadOnlyStringWrapper preset = new ReadOnlyStringWrapper("");
    private final ReadOnlyStringWrapper source = new ReadOnlyStringWrapper("");
    private final ObservableList<String> fileFaults = FXCollections.observableArrayList();
    // Kept, as it would hear nothing once collected.
    private final ObservableList<String> shownFaults = FXCollections.unmodifiableObservableList(fileFaults);

    BathModel(DesignSettings make, Supplier<Optional<Path>> chooseBathFile) {
        this.make = make;
        this.chooseBathFile = chooseBathFile;
        List<Setting> settings = new ArrayList<>();
        settings.add(choice());
        settings.add(name());
        settings.addAll(numbers());
        group = new Group("Bath", () -> make.design().bath().name(), settings);
        refresh();
    }

    /**
     * What the bath is: a preset, or the file it stands in.
     *
     * @return a property, a sentence
     */
    public ReadOnlyStringProperty originProperty() {
        return origin.getReadOnlyProperty();
    }

    /**
     * Where its numbers come from, in full.
     *
     * @return a property
     */
    public ReadOnlyStringProperty sourceProperty() {
        return source.getReadOnlyProperty();
    }

    /**
     * What was wrong with the bath file last chosen.
     *
     * @return every fault in a sentence; empty if it was sound
     */
    public ObservableList<String> fileFaults() {
        return shownFaults;
    }

    /** Lets the user choose a bath file and takes the bath in it, or says everything that is wrong with the file. */
    public void load() {
        chooseBathFile.get().ifPresent(this::load);
    }

    private void load(Path file) {
        Reading<Bath> reading = BathFile.read(file);
        String name = String.valueOf(file.getFileName());
        if (reading instanceof Reading.Faulty<Bath> faulty) {
            fileFaults.setAll(faulty.faults().stream().map(Fault::text).toList());
            fileFaults.add(0, name + " was not taken; the bath stays as it was.");
            return;
        }
        Bath bath = ((Reading.Read<Bath>) reading).value();
        if (bath.metal() != make.design().metal()) {
            fileFaults.setAll(
                    name + " was not taken; the bath stays as it was.",
                    "It is for " + bath.metal().key() + ", and the design's metal is "
                            + make.design().metal().key() + ": choose a bath for that, or set the metal first.");
            return;
        }
        fileFaults.clear();
        make.drawing().change("Set bath from " + name, design -> DesignEdits.bath(design, bath, Optional.of(name)));
    }

    /** Goes back to the preset the bath was made from, or else to the metal's usual one. */
    public void backToPreset() {
        make.drawing()
                .change(
                        "Back to the preset bath",
                        design -> DesignEdits.bath(design, OwnBath.base(design.bath()), Optional.empty()));
    }

    /**
     * Whether the bath is the shop's own.
     *
     * @return a property; false for a preset
     */
    public ReadOnlyBooleanProperty ownProperty() {
        return own.getReadOnlyProperty();
    }

    /**
     * The preset {@link #backToPreset()} goes to.
     *
     * @return a property, its name
     */
    public ReadOnlyStringProperty presetProperty() {
        return preset.getReadOnlyProperty();
    }

    List<Command> commands() {
        return List.of(
                new Command(
                        "load-bath",
                        Command.Menu.BENCH,
                        new ReadOnlyStringWrapper("Bath from a file\u2026"),
                        "Shortcut+F7",
                        "Takes the bath in a tideband-bath file, as a fit to coupons leaves it.",
                        new ReadOnlyBooleanWrapper(true),
                        this::load),
                new Command(
                        "preset-bath",
                        Command.Menu.BENCH,
                        Bindings.concat("Back to the preset bath ", preset),
                        "Shortcut+Shift+F7",
                        "Gives the shop's own numbers up for those of the preset; undo brings them back.",
                        own,
                        this::backToPreset));
    }

    /** Takes the file's faults off the screen. */
    public void dismissFaults() {
        fileFaults.clear();
    }

    Group group() {
        return group;
    }

    void refresh() {
        group.refresh();
        Design design = make.design();
        origin.set(
                isPreset(design)
                        ? "A preset. Its numbers are starting points until a coupon has been run."
                        : "The shop's own, kept in the file "
                                + design.bathFile().orElseThrow() + " beside the design.");

        source.set(design.bath().source());
        own.set(!isPreset(design));
        preset.set(OwnBath.base(design.bath()).name());
    }

    private static boolean isPreset(Design design) {
        return design.bathFile().isEmpty();
    }

    private Setting choice() {
        return new ChoiceSetting<>(
                new About(
                        "bath",
                        "Bath",
                        "The electrolyte and all that is fitted to it. Changing a number makes it your own."),
                Terms.ALWAYS,
                () -> choices(make.design()),
                Optional::empty,
                () -> Optional.of(make.design().bath()),
                bath -> {
                    if (BathPresets.of(bath.metal()).contains(bath)) {
                        make.drawing().change("Set bath", design -> DesignEdits.bath(design, bath, Optional.empty()));
                    }
                    return "";
                });
    }

    private static List<Choice<Bath>> choices(Design design) {
        List<Choice<Bath>> choices = new ArrayList<>();
        for (Bath preset : BathPresets.of(design.metal())) {
            String name = preset.name();
            choices.add(new Choice<>(preset, Character.toUpperCase(name.charAt(0)) + name.substring(1), ""));
        }
        if (!isPreset(design)) {
            choices.add(0, new Choice<>(design.bath(), design.bath().name(), ""));
        }
        return choices;
    }

    private Setting name() {
        About about = new About("bath name", "Name", "What you call your own bath.");
        return new TextSetting(
                about,
                Terms.when(() -> !isPreset(make.design())),
                "1 to 80 characters",
                () -> Optional.of(make.design().bath().name()),
                text -> {
                    String fault = PieceSettings.wrongLine(text);
                    boolean taken =
                            BathPresets.named(make.design().metal(), text).isPresent();
                    return fault.isEmpty() && taken ? "is the name of a preset; choose another" : fault;
                },
                text -> make.drawing()
                        .change(
                                DesignSettings.stepName(about),
                                d -> DesignEdits.bath(d, OwnBath.named(d.bath(), text), Optional.empty())));
    }

    private List<Setting> numbers() {
        return List.of(
                number(
                        new About(
                                "bath ratio",
                                "Film a volt",
                                "The ratio at 0.1 mA/cm²: what decides the volts of a colour most of all."),
                        new Measure.Plain("nm/V", 4),
                        Limits.BATH_NM_PER_VOLT,
                        Bath::nmPerVolt,
                        OwnBath.Figure.RATIO),
                number(
                        new About(
                                "bath field slope",
                                "Field slope",
                                "How steeply current rises with the field, at 0.1 mA/cm². A steep one makes films depend less on"
                                        + " the time held."),
                        new Measure.Plain("", 4),
                        Limits.BATH_FIELD_SLOPE,
                        Bath::fieldSlope,
                        OwnBath.Figure.SLOPE),
                number(
                        new About("native film", "Native film", "The film the metal has before it is anodized."),
                        new Measure.Plain("nm", 3),
                        Limits.BATH_NATIVE_NM,
                        Bath::nativeNm,
                        OwnBath.Figure.NATIVE),
                number(
                        new About(
                                "current efficiency",
                                "Efficiency",
                                "The share of the current that grows oxide, 1 for all of it."),
                        new Measure.Plain("", 4),
                        Limits.BATH_EFFICIENCY,
                        Bath::efficiency,
                        OwnBath.Figure.EFFICIENCY),
                number(
                        new About(
                                "bath resistance",
                                "Resistance",
                                "Between the supply's terminals and the film: leads, contacts and electrolyte."),
                        new Measure.Plain("ohm", 3),
                        Limits.BATH_RESISTANCE_OHM,
                        Bath::resistanceOhm,
                        OwnBath.Figure.RESISTANCE),
                number(
                        new About(
                                "bath ceiling",
                                "Ceiling",
                                "Volts not to be passed in this bath: above, film cracks or sparks."),
                        new Measure.Plain("V", 2),
                        Limits.BATH_CEILING_VOLTS,
                        Bath::ceilingVolts,
                        OwnBath.Figure.CEILING),
                number(
                        new About(
                                "index scale",
                                "Index scale",
                                "Factor on the oxide's refractive index, 1 for the published constants."),
                        new Measure.Plain("", 4),
                        Limits.BATH_INDEX_SCALE,
                        Bath::indexScale,
                        OwnBath.Figure.INDEX));
    }

    private NumberSetting number(
            About about, Measure measure, Range range, ToDoubleFunction<Bath> value, OwnBath.Figure which) {
        DoubleFunction<String> fine = number -> "";
        return make.number(
                about,
                Terms.ALWAYS,
                measure,
                Bounds.with(
                        range,
                        () -> value.applyAsDouble(OwnBath.base(make.design().bath()))),
                design -> value.applyAsDouble(design.bath()),
                fine,
                (design, number) -> OwnBath.with(design, which, number));
    }
}
