package tideband.window.settings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import tideband.design.Design;
import tideband.design.Limits;
import tideband.design.Range;
import tideband.edit.DesignEdits;
import tideband.piece.Vessel;
import tideband.window.Desk;
import tideband.window.comfort.LengthUnit;
import tideband.window.entry.Choice;
import tideband.window.entry.ChoiceSetting;
import tideband.window.entry.Measure;
import tideband.window.entry.NumberSetting;
import tideband.window.entry.Setting;
import tideband.window.entry.SwitchSetting;
import tideband.window.entry.TextSetting;
import tideband.window.entry.TypedSetting;

class SettingsModelTest {
    private static final List<String> COMFORT = List.of("size of text");

    // Between them every setting has its place.
    private static Stream<Desk> desks() {
        Design tank = DesignEdits.vessel(Desk.shipped("vent-plate"), Optional.of(Vessel.rectangular(60, 90)));
        return Stream.of(Desk.with("wick-pin"), Desk.with("burner-tube"), Desk.with(tank));
    }

    private static SettingsModel model(Desk desk) {
        return new SettingsModel(desk.drawing(), desk.work(), desk.comfort(), Optional::empty);
    }

    private static List<Setting> placed(SettingsModel model) {
        List<Setting> all = new ArrayList<>();
        model.groups().forEach(group -> all.addAll(group.settings()));
        model.stations().rows().forEach(row -> all.addAll(List.of(row.at(), row.size())));
        return all.stream().filter(setting -> setting.placedProperty().get()).toList();
    }

    private static Setting setting(SettingsModel model, String thing) {
        return placed(model).stream()
                .filter(setting -> setting.about().thing().equals(thing))
                .findFirst()
                .orElseThrow();
    }

    private static NumberSetting type(SettingsModel model, String thing, String text) {
        NumberSetting number = (NumberSetting) setting(model, thing);
        number.typedProperty().set(text);
        number.commit();
        return number;
    }

    @ParameterizedTest
    @MethodSource("desks")
    void everyNumberIsSetInOneStepAndUndone(Desk desk) {
        SettingsModel model = model(desk);
        Design start = desk.drawing().design();
        int tried = 0;
        for (Setting setting : placed(model)) {
            if (!(setting instanceof NumberSetting number)
                    || !number.lockProperty().get().isEmpty()
                    || COMFORT.contains(number.about().thing())) {
                continue;
            }
            String thing = number.about().thing();
            OptionalDouble before = number.value();
            String shown = number.typedProperty().get();
            double other = Double.isInfinite(before.getAsDouble()) ? 5 : sensible(number, before.getAsDouble());
            number.typedProperty().set(String.valueOf(other));
            assertThat(desk.drawing().design())
                    .as("typing changes nothing: %s", thing)
                    .isEqualTo(start);
            assertThat(number.commit())
                    .as("%s: %s", thing, number.faultProperty().get())
                    .isTrue();
            assertThat(number.value()).as(thing).hasValue(other);
            assertThat(desk.drawing().undoNameProperty().get()).isEqualTo("Set " + thing);
            desk.drawing().undo();
            assertThat(desk.drawing().design()).as(thing).isEqualTo(start);
            assertThat(number.typedProperty().get()).as(thing).isEqualTo(shown);
            tried++;
        }
        assertThat(tried).isGreaterThan(20);
    }

    private static double sensible(NumberSetting number, double before) {
        Range range = number.bounds().range().get();
        double less = Math.rint(before * 98) / 100;
        return less >= range.low() && less != before ? less : before + 0.01;
    }

    @ParameterizedTest
    @MethodSource("desks")
    void everyNumberRefusesWhatItCannotBeAndKeepsWhatWasTyped(Desk desk) {
        SettingsModel model = model(desk);
        Design start = desk.drawing().design();
        for (Setting setting : placed(model)) {
            if (!(setting instanceof NumberSetting number)
                    || !number.lockProperty().get().isEmpty()) {
                continue;
            }
            Range range = number.bounds().range().get();
            String shown = number.typedProperty().get();
            for (String wrong : List.of("", "abc", "1e999", "NaN", String.valueOf(range.low() - 1), "9999999")) {
                number.typedProperty().set(wrong);
                assertThat(number.commit())
                        .as("%s: %s", number.about().thing(), wrong)
                        .isFalse();
                assertThat(number.typedProperty().get()).isEqualTo(wrong);
                assertThat(number.faultProperty().get())
                        .contains("must be from ")
                        .contains(" to ");
                assertThat(desk.drawing().design()).isSameAs(start);
            }
            number.restore();
            assertThat(number.typedProperty().get()).isEqualTo(shown);
            assertThat(number.faultProperty().get()).isEmpty();
        }
        assertThat(desk.drawing().undoNameProperty().get()).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("desks")
    void everyChoiceCanBeMadeAndUndone(Desk desk) {
        SettingsModel model = model(desk);
        for (Setting setting : placed(model)) {
            if (setting instanceof ChoiceSetting<?> choice
                    && !setting.about().thing().equals("unit of length")) {
                tryAll(desk, choice);
            }
        }
    }

    private static <T> void tryAll(Desk desk, ChoiceSetting<T> choice) {
        Design start = desk.drawing().design();
        Optional<Choice<T>> before = choice.chosenProperty().get();
        assertThat(before).as(choice.about().thing()).isPresent();
        for (Choice<T> one : List.copyOf(choice.choices())) {
            boolean same = before.get().equals(one);
            assertThat(choice.choose(one.value()))
                    .as("%s: %s", choice.about().thing(), one)
                    .isTrue();
            assertThat(choice.chosenProperty().get()).contains(one);
            assertThat(desk.drawing().undoNameProperty().get())
                    .isEqualTo(same ? "" : "Set " + choice.about().thing());
            desk.drawing().undo();
            assertThat(desk.drawing().design()).isEqualTo(start);
            assertThat(choice.chosenProperty().get()).isEqualTo(before);
        }
    }

    @ParameterizedTest
    @MethodSource("desks")
    void whatDiffersFromUsualGoesBackToIt(Desk desk) {
        SettingsModel model = model(desk);
        for (Setting setting : placed(model)) {
            if (setting.unusualProperty().get() && setting.faultProperty().get().isEmpty()) {
                setting.backToUsual();
                assertThat(setting.unusualProperty().get())
                        .as(
                                "%s: %s",
                                setting.about().thing(), setting.faultProperty().get())
                        .isFalse();
            }
        }
    }

    @Test
    void whatIsWrongIsSaidInTheUsersUnit() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        desk.comfort().unitProperty().set(LengthUnit.INCH);
        NumberSetting bore = type(model, "vessel bore", "0.001");
        assertThat(bore.faultProperty().get()).isEqualTo("must be from 0.0394 to 393.7007 in");
        bore.typedProperty().set("0.5");
        assertThat(bore.commit()).isTrue();
        assertThat(desk.drawing().design().vessel()).contains(Vessel.round(12.7));
        bore.typedProperty().set("15 mm");
        assertThat(bore.commit()).isTrue();
        assertThat(desk.drawing().design().vessel()).contains(Vessel.round(15));
        assertThat(bore.typedProperty().get()).isEqualTo("0.5906");
        assertThat(bore.commit()).as("what is shown rounded changes nothing").isTrue();
        assertThat(desk.drawing().design().vessel()).contains(Vessel.round(15));
        NumberSetting hand = type(model, "slowest hand", "0.05 in/s");
        assertThat(desk.drawing().design().pull().slowestMmPerS()).isEqualTo(1.27);
        assertThat(hand.symbol()).isEqualTo("in/s");
    }

    @Test
    void theEndsOfARangeAsShownAreAllowedInBothUnits() {
        for (LengthUnit unit : LengthUnit.values()) {
            for (Range range : List.of(Limits.SIZE_MM, Limits.VESSEL_MM, Limits.LENGTH_MM, Limits.HAND_MM_PER_S)) {
                Measure length = new Measure.Length(() -> unit);
                assertThat(range.holds(length.read(length.lowest(range.low())).orElseThrow()))
                        .isTrue();
                assertThat(range.holds(length.read(length.highest(range.high())).orElseThrow()))
                        .isTrue();
            }
        }
    }

    @Test
    void whatIsBeingTypedOutlivesOtherEdits() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        NumberSetting hold = (NumberSetting) setting(model, "hold");
        hold.typedProperty().set("45 sec");
        type(model, "supply amps", "1.5");
        assertThat(hold.typedProperty().get()).isEqualTo("45 sec");
        hold.restore();
        type(model, "hold", "45");
        hold.typedProperty().set("12");
        desk.drawing().undo();
        assertThat(hold.typedProperty().get()).isEqualTo("30");
    }

    @Test
    void settingsThatHangTogetherAreHeldTogether() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        assertThat(fault(model, "dry length", "70"))
                .isEqualTo("must be less than the piece's length, 70 mm, for anything to get wet");
        assertThat(fault(model, "slowest hand", "10")).isEqualTo("must be below the fastest, 10 mm/s");
        assertThat(fault(model, "fastest hand", "0.3")).isEqualTo("must be above the slowest, 0.3 mm/s");
        assertThat(fault(model, "supply volts", "1")).isEmpty();
        assertThat(fault(model, "dial step", "2")).isEqualTo("must not be above the supply's highest volts, 1 V");
        assertThat(fault(model, "vessel bore", "1.5"))
                .startsWith("is too narrow")
                .contains("mm across");
        assertThat(fault(model, "length", "1")).startsWith("must be at least 1.5 mm for 3 bands");
        assertThat(fault(model, "size at station 2", "30")).startsWith("the piece would no longer go into the vessel");
        assertThat(fault(model, "supply slew", "JUMPS")).isEmpty();
    }

    private static String fault(SettingsModel model, String thing, String text) {
        return type(model, thing, text).faultProperty().get();
    }

    @Test
    void aTubeIsWiderThanItsBore() {
        SettingsModel model = model(Desk.with("burner-tube"));
        assertThat(fault(model, "bore", "9")).isEqualTo("must be less than the smallest outer diameter, 9 mm");
        assertThat(fault(model, "size at station 1", "7")).isEqualTo("must be larger than the bore, 7 mm");
    }

    @Test
    void stationsAreAddedMovedAndRemoved() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        StationsModel stations = model.stations();
        Design start = desk.drawing().design();
        stations.add();
        assertThat(stations.rows()).hasSize(3);
        assertThat(start.piece().sizeMm(20))
                .isCloseTo(desk.drawing().design().piece().sizeMm(20), within(1e-6));
        assertThat(fault(model, "position of station 2", "70")).startsWith("must lie between its neighbours");
        assertThat(fault(model, "position of station 2", "20")).isEmpty();
        assertThat(stations.removable(stations.rows().get(0))).isFalse();
        assertThat(setting(model, "position of station 3").lockProperty().get()).contains("end B");
        stations.remove(stations.rows().get(1));
        assertThat(desk.drawing().design()).isEqualTo(start);
        desk.drawing().undo();
        assertThat(stations.rows().get(1).at().typedProperty().get()).isEqualTo("20");
        for (int i = 0; i < 300; i++) {
            stations.add();
        }
        assertThat(stations.rows()).hasSize(200);
        assertThat(stations.noRoomProperty().get()).contains("the most there can be");
    }

    @Test
    void aPieceIsDrawnOutWithItsStations() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        model.stations().add();
        type(model, "length", "140");
        assertThat(desk.drawing().design().piece().stations().get(1).atMm()).isEqualTo(70);
        assertThat(desk.drawing().design().bands().get(0).toMm()).isEqualTo(36);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"", "   ", "01234567890123456789012345678901234567890123456789012345678901234567890123456789x"})
    void aTitleIsALine(String wrong) {
        Desk desk = Desk.with("wick-pin");
        TextSetting title = (TextSetting) setting(model(desk), "title");
        title.typedProperty().set(wrong);
        assertThat(title.commit()).isFalse();
        assertThat(title.typedProperty().get()).isEqualTo(wrong);
        title.typedProperty().set(" Wick pin, second ");
        assertThat(title.commit()).isTrue();
        assertThat(desk.drawing().design().title()).isEqualTo("Wick pin, second");
    }

    @Test
    void comfortIsNoStep() {
        Desk desk = Desk.with("wick-pin");
        SettingsModel model = model(desk);
        type(model, "size of text", "150 %");
        assertThat(desk.comfort().textPercentProperty().get()).isEqualTo(150);
        assertThat(fault(model, "size of text", "150.5")).isEqualTo("must be a whole number");
        ((SwitchSetting) setting(model, "dark window")).turn(true);
        ((SwitchSetting) setting(model, "sounds")).turn(false);
        assertThat(desk.comfort().darkProperty().get()).isTrue();
        assertThat(desk.comfort().mutedProperty().get()).isTrue();
        model.commands().stream()
                .filter(c -> c.id().equals("switch-unit"))
                .forEach(c -> c.act().run());
        assertThat(((TypedSetting) setting(model, "length")).typedProperty().get())
                .isEqualTo("2.7559");
        assertThat(desk.drawing().undoNameProperty().get()).isEmpty();
    }
}
